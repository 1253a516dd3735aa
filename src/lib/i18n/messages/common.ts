/** Words of every screen. */
export const common = {
	'app.name': ['Cogmark', 'Cogmark'],
	'language.other': ['Español', 'English'],
	'language.other.code': ['es', 'en'],
	'theme.to-night': ['Night', 'Noche'],
	'theme.to-day': ['Day', 'Día'],
	'wipe.start': ['Wipe screen', 'Limpiar'],
	'wipe.locked': [
		'Wipe the screen. Touch is off for {n} s',
		'Limpie la pantalla. El toque está apagado {n} s'
	],
	'unit.teeth': ['teeth', 'dientes'],
	'unit.in': ['in', 'in'],
	'unit.mm': ['mm', 'mm'],
	'unit.hp': ['hp', 'hp'],
	'unit.kW': ['kW', 'kW'],
	'unit.W': ['W', 'W'],
	'unit.lbf*ft': ['lbf·ft', 'lbf·ft'],
	'unit.lbf*in': ['lbf·in', 'lbf·in'],
	'unit.N*m': ['N·m', 'N·m'],
	'unit.rpm': ['rpm', 'rpm'],
	'unit.deg': ['°', '°'],
	'unit.x': ['times', 'veces'],
	'caution.strip.lead': [
		'A screening of tooth strength from these readings.',
		'Un examen de la resistencia del diente con estas lecturas.'
	],
	'caution.strip.rest': [
		'No rating, no permission to run. Site isolation comes first.',
		'No clasifica ni permite operar. Primero, el bloqueo del sitio.'
	],
	'caution.page': [
		'No rating to AGMA or ISO, no permission to run. Shaft, key, rim, bearings, lubrication and life are not covered.',
		'No es clasificación AGMA ni ISO, ni permiso para operar. No cubre eje, chaveta, llanta, rodamientos, lubricación ni vida.'
	],
	'offline.title': ['No connection to the plant', 'Sin conexión con la planta'],
	'offline.text': [
		'This page needs the network. The tablet works without it, and nothing that was kept is lost.',
		'Esta página necesita la red. La tableta funciona sin ella, y nada de lo guardado se pierde.'
	],
	'offline.tablet': ['Go to the tablet', 'Ir a la tableta'],
	'error.title': ['This did not work', 'Esto no funcionó'],
	'error.not-found': [
		'There is no such page, or it belongs to another plant.',
		'No existe esa página, o pertenece a otra planta.'
	],
	'error.not-allowed': [
		'Your role at this plant may not open this page. Ask a supervisor.',
		'Su función en esta planta no puede abrir esta página. Pregunte a un supervisor.'
	],
	'error.failed': [
		'The server could not answer. Try again in a moment. Nothing that was kept is lost.',
		'El servidor no pudo responder. Intente de nuevo en un momento. Nada de lo guardado se pierde.'
	],
	'error.home': ['Back to the start', 'Volver al inicio']
} as const satisfies Record<string, readonly [string, string]>;
