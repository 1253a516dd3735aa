/** Words of the office: machines ranked by the decision they need, checks, and a check's own page. */
export const office = {
	'office.skip': ['Skip to the page', 'Ir a la página'],
	'office.tabs': ['Office', 'Oficina'],
	'office.tab.machines': ['Machines', 'Máquinas'],
	'office.tab.checks': ['Checks', 'Verificaciones'],
	'office.tab.materials': ['Materials', 'Materiales'],
	'office.tab.rules': ['Rules', 'Reglas'],
	'office.your-plants': ['Plant: {plant}. Work at another', 'Planta: {plant}. Trabajar en otra'],
	'office.work-at': ['{plant}, {role}', '{plant}, {role}'],
	'office.home': ['Cogmark: machines', 'Cogmark: máquinas'],
	'office.low-figure': ['low {low}', 'bajo {low}'],
	'office.needs-figure': ['needs {needed}', 'requiere {needed}'],
	'office.by': ['{author}, {tablet}', '{author}, {tablet}'],
	'office.newest-first': ['newest first', 'las más recientes primero'],

	'standing.will-not-carry': ['Will not carry', 'No soporta'],
	'standing.not-permitted': ['Not permitted', 'No permitido'],
	'standing.close': ['Close', 'Justo'],
	'standing.cannot-say': ['Cannot say', 'Sin resultado'],
	'standing.no-check': ['No check yet', 'Sin verificación'],
	'standing.carries': ['Carries', 'Soporta'],

	'machines.title': ['Machines', 'Máquinas'],
	'machines.ranked': ['ranked by the decision they need', 'por la decisión que necesitan'],
	'machines.filter': ['Show', 'Mostrar'],
	'machines.all': ['All positions', 'Todas'],
	'machines.find': ['Find a machine, tag or gear', 'Máquina, etiqueta o engrane'],
	'machines.find.go': ['Find', 'Buscar'],
	'machines.find.clear': ['Clear', 'Quitar'],
	'machines.table': ['Gear positions by decision needed', 'Posiciones de engrane por decisión'],
	'machines.column.decision': ['Decision needed', 'Decisión'],
	'machines.column.machine': ['Machine and gear position', 'Máquina y posición'],
	'machines.column.margin': ['Margin, and what stands in the way', 'Margen, y qué lo impide'],
	'machines.column.gear': ['Gear', 'Engrane'],
	'machines.column.open': ['Open for', 'Desde hace'],
	'machines.column.next': ['Next step', 'Siguiente paso'],
	'machines.open-check': ['Open check', 'Verificación'],
	'machines.open-machine': ['Open machine', 'Máquina'],
	'machines.not-measured': ['not measured', 'sin medir'],
	'machines.just-arrived': ['just arrived', 'recién llegada'],
	'machines.no-check': ['A millwright has to measure it', 'Un mecánico tiene que medirla'],
	'machines.range': ['Positions {from} to {to} of {total}.', 'Posiciones {from} a {to} de {total}.'],
	'machines.next': ['Next {n}', 'Siguientes {n}'],
	'machines.first': ['Back to the first', 'Volver al inicio'],
	'machines.none': ['This plant has no machines yet.', 'Esta planta aún no tiene máquinas.'],
	'machines.none-text': [
		'Machines and their gear positions come with the set-up of the plant. Ask whoever runs Cogmark here to load them.',
		'Las máquinas y sus posiciones llegan con la configuración de la planta. Pida que las carguen a quien administra Cogmark aquí.'
	],
	'machines.no-match': ['No gear position fits this view.', 'Ninguna posición corresponde a esta vista.'],
	'machines.no-match-text': [
		'Take a filter away, or search with fewer words: a tag, a part of a name, a pitch.',
		'Quite un filtro o busque con menos palabras: una etiqueta, parte de un nombre, un paso.'
	],
	'machines.show-all': ['Show all positions', 'Mostrar todas'],

	'ledger.label': ['Tablets and arrivals', 'Tabletas y llegadas'],
	'ledger.tablets': ['Tablets with unsent records', 'Tabletas con registros sin enviar'],
	'ledger.waiting': ['{n} waiting', '{n} por enviar'],
	'ledger.missing': ['{n} missing', '{n} faltan'],
	'ledger.nothing': ['nothing waiting', 'nada pendiente'],
	'ledger.blocked': ['blocked', 'bloqueada'],
	'ledger.missing-records': [
		'Records {from} to {to} of {author} never arrived.',
		'Los registros {from} a {to} de {author} nunca llegaron.'
	],
	'ledger.missing-record': [
		'Record {from} of {author} never arrived.',
		'El registro {from} de {author} nunca llegó.'
	],
	'ledger.attention': ['{n} need attention.', '{n} requieren atención.'],
	'ledger.attention#one': ['{n} needs attention.', '{n} requiere atención.'],
	'ledger.heard': ['Last heard from', 'Último contacto'],
	'ledger.no-tablets': [
		'No tablet has been heard yet. It appears here when a millwright signs in on one.',
		'Aún no hay contacto con ninguna tableta. Aparece aquí cuando un mecánico inicia sesión en una.'
	],
	'ledger.arrivals': ['Last arrivals', 'Últimas llegadas'],
	'ledger.no-arrivals': [
		'No check has arrived yet. The first one appears here as soon as a tablet sends it.',
		'Aún no llega ninguna verificación. La primera aparece aquí en cuanto una tableta la envíe.'
	],

	'machine.origin.inch': ['inch gears', 'engranes en pulgadas'],
	'machine.origin.metric': ['metric gears', 'engranes métricos'],
	'machine.standing': ['Stands now', 'Estado actual'],
	'machine.known-gear': ['Gear on record', 'Engrane registrado'],
	'machine.known-as-of': ['as of {day}', 'al {day}'],
	'machine.known-nothing': ['No gear on record', 'Sin engrane registrado'],
	'machine.teeth-of-mate': ['Mate', 'Conjugado'],
	'machine.mate-not-known': ['not known', 'no se conoce'],
	'machine.drive-here': ['Drive', 'Accionamiento'],
	'machine.drive-not-known': ['not on record', 'sin registro'],
	'machine.history': ['Checks at this position', 'Verificaciones en esta posición'],
	'machine.no-history': [
		'No check yet. A millwright finds this position on the tablet under {tag}.',
		'Sin verificación. Un mecánico encuentra esta posición en la tableta con {tag}.'
	],
	'machine.no-positions': [
		'This machine has no gear positions yet. They come with the set-up of the plant.',
		'Esta máquina aún no tiene posiciones de engrane. Llegan con la configuración de la planta.'
	],

	'checks.title': ['Checks', 'Verificaciones'],
	'checks.all': ['All checks', 'Todas'],
	'checks.filter': ['Show', 'Mostrar'],
	'checks.table': ['Checks, newest received first', 'Verificaciones, las últimas recibidas primero'],
	'checks.column.verdict': ['Verdict', 'Resultado'],
	'checks.column.machine': ['Machine and gear position', 'Máquina y posición'],
	'checks.column.margin': ['Margin', 'Margen'],
	'checks.column.gear': ['Gear', 'Engrane'],
	'checks.column.performed': ['Made', 'Hecha'],
	'checks.column.received': ['Received', 'Recibida'],
	'checks.column.open': ['Check', 'Verificación'],
	'checks.open': ['Open', 'Abrir'],
	'checks.differs': ['tablet and server differ', 'tableta y servidor difieren'],
	'checks.corrected': ['corrected later', 'corregida después'],
	'checks.older': ['Older checks', 'Más antiguas'],
	'checks.newest': ['Back to the newest', 'Volver a las más recientes'],
	'checks.shown': ['{n} checks on this page.', '{n} verificaciones en esta página.'],
	'checks.shown#one': ['{n} check on this page.', '{n} verificación en esta página.'],
	'checks.none': ['No check has arrived yet.', 'Aún no llega ninguna verificación.'],
	'checks.none-text': [
		'A millwright makes one on a tablet; it appears here as soon as the tablet has a connection.',
		'Un mecánico la hace en una tableta; aparece aquí en cuanto la tableta tenga conexión.'
	],
	'checks.no-match': ['No check with this verdict here.', 'No hay verificaciones con este resultado.'],
	'checks.show-all': ['Show all checks', 'Mostrar todas'],

	'differences.lead': ['Tablet and server differ.', 'La tableta y el servidor difieren.'],
	'differences.text': [
		'The server worked the same readings out again. Its figures count here; find out why before you rely on either.',
		'El servidor volvió a calcular las mismas lecturas. Aquí cuentan sus cifras; averigüe la causa antes de confiar en cualquiera.'
	],
	'differences.agree': ['Tablet and server agree', 'Tableta y servidor coinciden'],
	'differences.agree-figures': [
		'{tablet} and {server}, core {core} on both',
		'{tablet} y {server}, núcleo {core} en ambos'
	],
	'differences.agree-verdict': [
		'same verdict, core {core} on both',
		'mismo resultado, núcleo {core} en ambos'
	],
	'differences.agree-cores': ['core {tablet} and core {server}', 'núcleo {tablet} y núcleo {server}'],
	'differences.table': ['Where tablet and server differ', 'En qué difieren tableta y servidor'],
	'differences.figure': ['Figure', 'Cifra'],
	'differences.tablet': ['Tablet', 'Tableta'],
	'differences.server': ['Server', 'Servidor'],
	'differences.verdict': ['verdict', 'resultado'],
	'differences.none': ['none', 'ninguna'],
	'differences.other': ['A detail that this page does not list', 'Un detalle que esta página no muestra'],
	'differences.core': ['version of the core', 'versión del núcleo']
} as const satisfies Record<string, readonly [string, string]>;
