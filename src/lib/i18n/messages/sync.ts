/** Where a record is. Never a bare "Saved". */
export const sync = {
	'sync.draft': ['Draft, kept on this tablet', 'Borrador, guardado en esta tableta'],
	'sync.kept-here': ['Kept on this tablet.', 'Guardado en esta tableta.'],
	'sync.waiting': ['Waiting to send ({n})', 'Por enviar ({n})'],
	'sync.waiting-oldest': ['Waiting to send ({n}), oldest {age}', 'Por enviar ({n}), el más antiguo {age}'],
	'sync.sending': ['Sending {at} of {of}', 'Enviando {at} de {of}'],
	'sync.nothing-waits': ['Nothing waits to be sent', 'Nada pendiente de envío'],
	'sync.contact': ['Last heard from the plant {time}', 'Último contacto con la planta {time}'],
	'sync.contact-never': ['Not heard from the plant yet', 'Aún sin contacto con la planta'],
	'sync.signed-out': ['Sign in to send.', 'Inicie sesión para enviar.'],
	'sync.kept-count': ['{n} kept', '{n} guardados'],
	'sync.kept-count#one': ['1 kept', '1 guardado'],
	'sync.blocked': [
		'Tablet blocked. Hand it to a supervisor',
		'Tableta bloqueada. Entréguela a un supervisor'
	],
	'sync.not-allowed': ['No right to send here. Ask a supervisor', 'Sin permiso para enviar. Pida ayuda'],
	'sync.update': ['Update needed to send.', 'Se necesita actualizar para enviar.'],
	'sync.attention': ['Needs attention ({n})', 'Requiere atención ({n})'],
	'sync.nothing-lost': ['Nothing is lost', 'Nada se pierde'],
	'sync.clock-hours': [
		'Tablet clock is {n} h off: times will be marked',
		'El reloj difiere {n} h: las horas se marcarán'
	],
	'sync.clock-minutes': [
		'Tablet clock is {n} min off: times will be marked',
		'El reloj difiere {n} min: las horas se marcarán'
	],
	'sync.received': ['Received by the plant {time}', 'Recibido por la planta {time}'],
	'sync.record-waiting': ['Kept on this tablet. Waiting to send', 'Guardado en esta tableta. Por enviar'],
	'sync.record-attention': [
		'Needs attention: {reason} Nothing is lost',
		'Requiere atención: {reason} Nada se pierde'
	],
	'sync.unprotected': ['Storage not protected: send now', 'Almacenamiento sin proteger: envíe ahora'],
	'sync.nearly-full': ['Storage nearly full: send now', 'Almacenamiento casi lleno: envíe ahora'],
	'sync.send-now': ['Send now', 'Enviar ahora'],
	'sync.open-kept': ['Records kept on this tablet', 'Registros guardados en esta tableta'],
	'sync.trouble.blocked': [
		'Another page of Cogmark is open with an older version. Close it, then reload this one.',
		'Otra página de Cogmark está abierta con una versión anterior. Ciérrela y recargue esta.'
	],
	'sync.trouble.outdated': [
		'A newer version runs in another page. Reload this one. What you typed is kept.',
		'Una versión más nueva está abierta en otra página. Recargue esta. Lo escrito está guardado.'
	],
	'sync.trouble.terminated': [
		'The browser closed the store of this page. Reload it. What you typed is kept.',
		'El navegador cerró el almacén de esta página. Recárguela. Lo escrito está guardado.'
	],
	'sync.trouble.unavailable': [
		'This browser refuses to keep records here (private window, or storage turned off). Open Cogmark in a normal window.',
		'Este navegador no permite guardar registros aquí (ventana privada o almacenamiento apagado). Abra Cogmark en una ventana normal.'
	]
} as const satisfies Record<string, readonly [string, string]>;
