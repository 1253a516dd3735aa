/** The cautions in their order of deference, and the duties that are not for this screening: codes, words elsewhere. */
export const CAUTIONS = [
	'isolation',
	'energy',
	'moving',
	'guards',
	'hazards',
	'codes',
	'drawing',
	'engineer'
] as const;
export const STOP_AND_REFER = ['people', 'hoists', 'pressure', 'vehicles', 'cracked', 'unknown'] as const;
