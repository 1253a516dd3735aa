/**
 * The other explanation: a toothed wheel that is no involute gear of the set (a cycloidal one, a sprocket, a gear of a
 * pitch of its own), or readings that belong to no one gear. Its readings hang together only roughly.
 */
import { involute } from '../involute';
import type { Observation } from './observations';

/** From memory: of the wheels that are measured, one in fifty. */
export const NONE_FITS_PRIOR = 0.02;

/** A pitch of its own may be anything from half a millimetre to a hundred: uniform in the logarithm. */
const SIZES = Math.log(200);

/** How far such a wheel's readings stray from those of a gear of its size, in modules. */
const STRAY: Record<Observation['reading'], number> = {
	outsideDiameter: 0.3,
	wholeDepth: 0.25,
	rootDiameter: 0.3,
	spans: 0.25,
	overPins: 0.35,
	chordalThickness: 0.25,
	centreDistance: 0.4,
	circularPitch: 0.2
};

const ANGLE = (20 * Math.PI) / 180;

/** Log density of the readings, mm⁻ⁿ, the size of the wheel taken from the first. */
export function noneFitsEvidence(
	observations: readonly Observation[],
	teeth: number,
	mateTeeth: number | null
): number {
	const [first, ...rest] = observations;
	if (!first) return 0;
	const perModule = (observation: Observation) => sizeOf(observation, teeth, mateTeeth);
	const module = Math.abs(first.value) / perModule(first);
	return rest.reduce(
		(log, observation) => {
			const stray = Math.hypot(STRAY[observation.reading] * module, observation.sigma);
			const away = (observation.value - module * perModule(observation)) / stray;
			return log - (away * away) / 2 - Math.log(stray * Math.sqrt(2 * Math.PI));
		},
		-Math.log(Math.abs(first.value) * SIZES)
	);
}

/** What the reading is on a gear of module 1, roughly: within a third of it for any gear of the set. */
export function sizeOf(
	{ reading, spanTeeth, pin }: Observation,
	teeth: number,
	mateTeeth: number | null
): number {
	switch (reading) {
		case 'outsideDiameter':
			return teeth + 2;
		case 'rootDiameter':
			return Math.max(1, teeth - 2.4);
		case 'wholeDepth':
			return 2.2;
		case 'spans':
			return Math.cos(ANGLE) * (Math.PI * ((spanTeeth ?? 2) - 0.5) + teeth * involute(ANGLE));
		case 'overPins':
			return pin === undefined ? teeth + 2 : teeth + 2.4;
		case 'chordalThickness':
			return Math.PI / 2;
		case 'centreDistance':
			return (teeth + (mateTeeth ?? teeth)) / 2;
		case 'circularPitch':
			return Math.PI;
	}
}
