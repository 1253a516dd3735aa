/** Words of a check's page in the office: readings as typed, drive and spare, working, and the record itself. */
export const checkPage = {
	'check-page.line': [
		'Check of {performed}. {author}, {tablet}, record {number}.',
		'Verificación del {performed}. {author}, {tablet}, registro {number}.'
	],
	'check-page.readings': ['Readings as typed', 'Lecturas como se escribieron'],
	'check-page.readings-note': [
		'nothing is converted before it is kept',
		'nada se convierte antes de guardarse'
	],
	'check-page.drive': ['Drive and spare', 'Accionamiento y repuesto'],
	'recomputed.same': [
		'Recomputed with core {core}: the same verdict.',
		'Recalculada con el núcleo {core}: el mismo veredicto.'
	],
	'recomputed.changed': [
		'Recomputed with core {core}: another verdict.',
		'Recalculada con el núcleo {core}: otro veredicto.'
	],
	'recomputed.then-now': [
		'Core {old} said: {then}. Core {core} says: {now}.',
		'El núcleo {old} dijo: {then}. El núcleo {core} dice: {now}.'
	],
	'recomputed.said': ['{verdict}, margin in bending {margin}', '{verdict}, margen a flexión {margin}'],
	'check-page.figures': ['Tooth, flanks and mesh', 'Diente, flancos y engrane'],
	'figures.handbook': ['Form factor by the handbook', 'Factor de forma por el manual'],
	'figures.geometry': ['Form factor by geometry', 'Factor de forma por geometría'],
	'figures.counts': ['{value}, counts', '{value}, cuenta'],
	'figures.concentration': [
		'Stress concentration at the fillet, for information',
		'Concentración de esfuerzo en el filete, como información'
	],
	'figures.contact': ['Contact stress', 'Esfuerzo de contacto'],
	'figures.allowable-contact': ['Allowable contact stress', 'Esfuerzo de contacto admisible'],
	'figures.wear-load': ['Limit load for wear', 'Carga límite de desgaste'],
	'figures.ratio': ['Ratio', 'Relación'],
	'figures.centre': ['Standard centre distance', 'Distancia entre centros estándar'],
	'figures.angle': ['Operating pressure angle', 'Ángulo de presión de trabajo'],
	'figures.contact-ratio': ['Contact ratio', 'Relación de contacto'],
	'figures.contact-ratio-undercut': [
		'Contact ratio that the roots leave',
		'Relación de contacto que dejan las raíces'
	],
	'figures.backlash': ['Backlash across the flanks', 'Juego entre los flancos'],
	'figures.hunting': ['Every tooth meets every other', 'Cada diente se junta con todos'],
	'figures.undercut': ['Undercut', 'Socavado'],
	'figures.interference': ['Tip interference', 'Interferencia de puntas'],
	'figures.yes': ['yes', 'sí'],
	'figures.no': ['no', 'no'],
	'check-page.working': ['Working', 'Cálculo'],
	'check-page.working-note': ["the server's own", 'el del servidor'],
	'check-page.no-working': [
		'There is no working: the reasons above say what is missing.',
		'No hay cálculo: las razones de arriba dicen qué falta.'
	],
	'check-page.record': ['The record', 'El registro'],
	'check-page.number': ['Record', 'Registro'],
	'check-page.number-of': ['{number} of {author} on {tablet}', '{number} de {author} en {tablet}'],
	'check-page.made': ['Made', 'Hecha'],
	'check-page.received': ['Received', 'Recibida'],
	'check-page.sent-by': ['Sent by', 'Enviada por'],
	'check-page.clock': ["Tablet's clock", 'Reloj de la tableta'],
	'check-page.clock-unknown': ['not compared', 'sin comparar'],
	'check-page.clock-right': ['right within {n} s', 'correcto a {n} s'],
	'check-page.clock-fast': ['{time} fast', '{time} adelantado'],
	'check-page.clock-slow': ['{time} slow', '{time} atrasado'],
	'check-page.place': ['Arrival number', 'Número de llegada'],
	'check-page.hash': ['Fingerprint', 'Huella'],
	'check-page.permit': ['Isolation permit', 'Permiso de bloqueo'],
	'check-page.no-permit': ['none given', 'no se dio'],
	'check-page.cautions': ['Cautions shown', 'Precauciones mostradas'],
	'check-page.cautions-not': ['not confirmed', 'sin confirmar'],
	'check-page.note': ['Note', 'Nota'],
	'check-page.material': ['Material used', 'Material usado'],
	'check-page.no-material': ['No material was chosen.', 'No se eligió material.'],
	'check-page.revision': ['revision {n}', 'revisión {n}'],
	'check-page.revision-in-force': ['in force now', 'vigente ahora'],
	'check-page.revised-since': [
		'Revised since: revision {n} is in force, {stress}. This check keeps the revision it was made with.',
		'Revisado después: rige la revisión {n}, {stress}. Esta verificación conserva la revisión con que se hizo.'
	],
	'check-page.revised-permission': [
		'The material is not permitted any more.',
		'El material ya no está permitido.'
	],
	'check-page.rules': ["Plant's rules", 'Reglas de la planta'],
	'check-page.rules-since': ['revision {n} is in force now', 'ahora rige la revisión {n}'],
	'check-page.amends': ['This record corrects an earlier one.', 'Este registro corrige uno anterior.'],
	'check-page.amends-open': ['Open the earlier one', 'Abrir el anterior'],
	'check-page.amended': ['A later record corrects this one.', 'Un registro posterior corrige este.'],
	'check-page.amended-open': ['Open the later one', 'Abrir el posterior'],
	'check-page.print': ['Print', 'Imprimir'],
	'check-page.column.reading': ['Reading', 'Lectura'],
	'check-page.column.typed': ['As typed', 'Como se escribió'],
	'check-page.column.other': ['Other unit', 'Otra unidad'],
	'check-page.column.source': ['From', 'Origen'],
	'check-page.not-given': ['not given', 'no se dio'],
	'check-page.cannot-measure': ['cannot measure', 'no se puede medir'],
	'check-page.load-unknown': ['not known', 'no se conoce'],
	'check-page.one-way': ['loaded on one flank', 'carga en un flanco'],
	'check-page.loading': ['Loading', 'Sentido de carga'],
	'check-page.gear': ['Which gear', 'Qué engrane'],
	'check-page.left-open': ['left open between those that fit', 'abierto entre los que coinciden'],
	'check-page.how-taken': ['How taken', 'Cómo se midió'],
	'check-page.candidates': ['What the readings say', 'Lo que dicen las lecturas'],
	'check-page.candidates-note': ['worked out again by this page', 'calculado de nuevo por esta página'],
	'check-page.no-candidates': [
		'No reading tells the size of the teeth.',
		'Ninguna lectura dice el tamaño de los dientes.'
	],
	'check-page.none-fits': ['No involute gear fits: {percent} %', 'Ningún engrane de evolvente: {percent} %'],
	'check-page.from.keypad': ['keypad', 'teclado'],
	'check-page.from.typed': ['keyboard or calliper', 'escrito o calibrador'],
	'check-page.from.tally': ['counted by taps', 'contado por toques'],
	'check-page.from.position': ['from the record', 'del registro'],
	'check-page.from.rule': ['plant rule', 'regla de la planta'],
	'check-page.from.hand': ['chosen by hand', 'elegido a mano'],
	'check-page.from.list': ["plant's list", 'lista de la planta'],
	'caution.page.lead': [
		'A screening of tooth strength from the readings shown.',
		'Un examen de la resistencia del diente con las lecturas mostradas.'
	],
	'caution.page.defer': [
		"The site's isolation procedure, local codes, the drawing or maker's data, and a licensed engineer where required come first.",
		'Antes valen el procedimiento de bloqueo del sitio, los códigos locales, el plano o los datos del fabricante y, donde se exija, un ingeniero con licencia.'
	]
} as const satisfies Record<string, readonly [string, string]>;
