/** Words of verdicts and of the core's coded reasons. Never "safe", "approved" or "certified". */
export const verdict = {
	'verdict.carries': ['Carries the load', 'Soporta la carga'],
	'verdict.close': ['Close: needs review', 'Justo: requiere revisión'],
	'verdict.will-not-carry': ['Will not carry the load', 'No soporta la carga'],
	'verdict.not-permitted': ['Material not permitted here', 'Material no permitido aquí'],
	'verdict.cannot-say': ['Cannot say yet', 'Aún no se puede decir'],
	'verdict.none': ['No check yet', 'Sin verificación'],
	'verdict.say.carries': [
		'Carries also at the bad end of the readings.',
		'Soporta también en el extremo malo de las lecturas.'
	],
	'verdict.say.close': [
		'The middle carries, the bad end does not.',
		'El valor medio soporta, el extremo malo no.'
	],
	'verdict.decides.gear-bending': ['Bending of this gear decides.', 'Decide la flexión de este engrane.'],
	'verdict.decides.mate-bending': ['Bending of the mate decides.', 'Decide la flexión del conjugado.'],
	'verdict.decides.wear': ['Wear of the pair decides.', 'Decide el desgaste del par.'],
	'verdict.say.missing': [
		'Something is missing. Go to its step and give it:',
		'Falta algo. Vaya a su paso y dé el dato:'
	],
	'verdict.say.not-permitted': [
		"{material} is not on the plant's list.",
		'{material} no está en la lista de la planta.'
	],
	'verdict.margin': ['margin', 'margen'],
	'verdict.low': ['low end', 'extremo bajo'],
	'verdict.needs': ['needs', 'requiere'],
	'verdict.needs-figure': ['needs {needed}', 'requiere {needed}'],
	'verdict.plant-needs': ['plant needs', 'la planta requiere'],
	'verdict.what-limits': ['What limits it', 'Qué lo limita'],
	'verdict.limit.gear-bending': ['Bending, this gear', 'Flexión, este engrane'],
	'verdict.limit.mate-bending': ['Bending, the mate', 'Flexión, el conjugado'],
	'verdict.limit.wear': ['Wear, the pair', 'Desgaste, el par'],
	'remedy.carries.most': ['It would pass at {what} or less.', 'Pasaría con {what} o menos.'],
	'remedy.carries.least': ['It would pass at {what} or more.', 'Pasaría con {what} o más.'],
	'remedy.carries.slower': [
		'It would pass at {what} or less, with the same torque.',
		'Pasaría a {what} o menos, con el mismo par.'
	],
	'remedy.carries.faster': [
		'It would pass at {what} or more, with the same power.',
		'Pasaría a {what} o más, con la misma potencia.'
	],
	'remedy.carries.with': ['It would pass with teeth {what}.', 'Pasaría con dientes {what}.'],
	'remedy.carries.in': ['It would pass in {what}.', 'Pasaría en {what}.'],
	'remedy.review.most': [
		'At {what} or less it would still need review.',
		'Con {what} o menos aún requeriría revisión.'
	],
	'remedy.review.least': [
		'At {what} or more it would still need review.',
		'Con {what} o más aún requeriría revisión.'
	],
	'remedy.review.slower': [
		'At {what} or less, with the same torque, it would still need review.',
		'A {what} o menos, con el mismo par, aún requeriría revisión.'
	],
	'remedy.review.faster': [
		'At {what} or more, with the same power, it would still need review.',
		'A {what} o más, con la misma potencia, aún requeriría revisión.'
	],
	'remedy.review.with': [
		'With teeth {what} it would still need review.',
		'Con dientes {what} aún requeriría revisión.'
	],
	'remedy.review.in': ['In {what} it would still need review.', 'En {what} aún requeriría revisión.'],
	'remedy.margins': [
		'Margin in bending {margin}, low end {low}.',
		'Margen a flexión {margin}, extremo bajo {low}.'
	],
	'remedy.review-from': ['Between that and {what} it needs review.', 'Entre eso y {what} requiere revisión.'],
	'remedy.face': ['a face of {width}', 'una cara de {width}'],
	'remedy.change': ['Change: needs review', 'Cambio: requiere revisión'],
	'remedy.like-for-like': ['As the original was', 'Como era el original'],
	'remedy.more': ['{n} more', '{n} más'],
	'remedy.more#one': ['1 more', '1 más'],
	'remedy.fewer': ['fewer', 'menos'],
	'verdict.by-speed': ['What it carries, by speed', 'Lo que soporta, según la velocidad'],
	'verdict.beyond': ["beyond the plant's margin", 'fuera del margen de la planta'],
	'verdict.this-drive': ['this drive, {power}', 'este mando, {power}'],
	'verdict.nothing-to-change': ['Nothing to change.', 'Nada que cambiar.'],
	'verdict.carries-up-to': [
		"At this speed it would carry up to {first} ({second}) with the plant's margin.",
		'A esta velocidad soportaría hasta {first} ({second}) con el margen de la planta.'
	],
	'verdict.would-carry': ['It carries {first}', 'Soporta {first}'],
	'verdict.would-carry-rest': [
		"({second}) at this speed with the plant's margin. More than that needs another gear or review.",
		'({second}) a esta velocidad con el margen de la planta. Más que eso exige otro engrane o revisión.'
	],
	'verdict.reason': ['Why', 'Por qué'],
	'verdict.working': ['Working', 'Cálculo'],
	'verdict.working-lines': ['line by line, {n} lines', 'línea por línea, {n} líneas'],
	'verdict.hide-working': ['Hide the working', 'Ocultar el cálculo'],
	'verdict.keep': ['Keep this check', 'Guardar esta verificación'],
	'tried.caption': [
		'Gears that fit, and what each carries',
		'Engranes que coinciden y lo que soporta cada uno'
	],
	'tried.decides-of': [
		'The weakest of {n} gears decides: {name}',
		'Decide el más débil de {n} engranes: {name}'
	],
	'tried.gear': ['Gear', 'Engrane'],
	'tried.share': ['Likely', 'Probable'],
	'tried.decides': ['decides', 'decide']
} as const satisfies Record<string, readonly [string, string]>;
