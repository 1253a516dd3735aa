/** Words of the true-scale strip: matching the screen, comparing teeth, the printed page. */
export const strip = {
	'strip.title': ['Teeth at true scale', 'Dientes a tamaño real'],
	'strip.aid': ['Comparison aid only.', 'Solo ayuda para comparar.'],
	'strip.aid-rest': [
		'The eye tells apart what differs much, not a few hundredths: the readings decide.',
		'El ojo separa lo muy distinto, no unas centésimas: deciden las lecturas.'
	],
	'strip.back': ['Back to the gears', 'Volver a los engranes'],
	'strip.back-home': ['All machines', 'Todas las máquinas'],
	'strip.none': [
		'There is no gear to draw. Measure the gear first; the step "Which gear" then leads here with the gears that fit.',
		'No hay engrane que dibujar. Primero mida el engrane; el paso "Qué engrane" trae aquí los que coinciden.'
	],
	'strip.left-out': [
		'Left out, since it cannot be read: {name} ({parts}). Open the strip again from "Which gear".',
		'Omitido porque no se puede leer: {name} ({parts}). Abra de nuevo la tira desde "Qué engrane".'
	],
	'strip.part.label': ['name', 'nombre'],
	'strip.part.module': ['module', 'módulo'],
	'strip.part.teeth': ['number of teeth', 'número de dientes'],
	'strip.part.pressureAngle': ['pressure angle', 'ángulo de presión'],
	'strip.part.form': ['tooth form', 'forma del diente'],
	'strip.part.profileShift': ['profile shift', 'corrección de perfil'],

	'strip.hold': ['Hold the gear to the teeth', 'Acerque el engrane'],
	'strip.hold-text': [
		'Only a gear that is off its shaft. Look at flanks and gaps: tips are the first to wear.',
		'Solo un engrane desmontado. Mire flancos y huecos: las puntas se gastan primero.'
	],
	'strip.caption': [
		'First tip to last: {mm} mm ({in} in), {drawn} of {teeth} teeth',
		'Primera punta a última: {mm} mm ({in} in), {drawn} de {teeth} dientes'
	],
	'strip.drawing': ['{drawn} teeth of {name} at true scale', '{drawn} dientes de {name} a tamaño real'],
	'strip.scroll': ['Gears at true scale', 'Engranes a tamaño real'],
	'strip.to-left': ['To the left', 'A la izquierda'],
	'strip.to-right': ['To the right', 'A la derecha'],
	'strip.check': ['must be 50 mm by your rule', 'debe medir 50 mm con su regla'],
	'strip.check-name': ['Check line of 50 mm', 'Línea de control de 50 mm'],
	'strip.matched': ['Screen matched {date}', 'Pantalla ajustada el {date}'],
	'strip.match-again': ['Match again', 'Ajustar otra vez'],
	'strip.not-remembered': [
		'This device would not store the match: it holds until this page is closed.',
		'Este equipo no guardó el ajuste: vale hasta que se cierre esta página.'
	],
	'strip.reason.too-few-teeth': [
		'Teeth are drawn from {fewest} upwards, this gear has {teeth}. Count again.',
		'Se dibujan engranes desde {fewest} dientes; este tiene {teeth}. Cuente otra vez.'
	],

	'strip.match': ['Match the screen to a card', 'Ajuste la pantalla a una tarjeta'],
	'strip.match-text': [
		'Lay a bank card into the corner of the square. Make the drawn card larger or smaller until the white lines meet its edges.',
		'Ponga una tarjeta bancaria en la esquina de la escuadra. Agrande o reduzca el dibujo hasta que las líneas blancas toquen sus bordes.'
	],
	'strip.match-text-upright': [
		'Lay a bank card upright into the corner of the square. Make the drawn card larger or smaller until the white lines meet its edges.',
		'Ponga una tarjeta bancaria vertical en la esquina de la escuadra. Agrande o reduzca el dibujo hasta que las líneas blancas toquen sus bordes.'
	],
	'strip.card': ['Bank card', 'Tarjeta bancaria'],
	'strip.card-name': [
		'A bank card as large as this screen is taken to show it',
		'Una tarjeta bancaria con el tamaño que se supone en esta pantalla'
	],
	'strip.larger': ['larger', 'más grande'],
	'strip.smaller': ['smaller', 'más chica'],
	'strip.much-larger': ['much larger', 'mucho más'],
	'strip.much-smaller': ['much smaller', 'mucho menos'],
	'strip.scale': ['{value} pixels per mm', '{value} píxeles por mm'],
	'strip.matches': ['It matches', 'Coincide'],
	'strip.leave': ['Leave as it was', 'Dejar como estaba'],
	'strip.why.pinched': [
		'The page is enlarged by two fingers, so nothing here is true to scale. Bring it back to its normal size.',
		'La página está ampliada con dos dedos: nada aquí está a escala. Devuélvala a su tamaño normal.'
	],
	'strip.why.resolution': [
		'Zoom or resolution differ from when the screen was matched, so no teeth are drawn. Match it again, or undo the change.',
		'El zoom o la resolución difieren de cuando se ajustó la pantalla: no se dibujan dientes. Ajústela otra vez o deshaga el cambio.'
	],
	'strip.why.screen': [
		'This is another screen than the one that was matched, so no teeth are drawn. Match this one.',
		'Esta pantalla no es la que se ajustó: no se dibujan dientes. Ajuste esta.'
	],

	'strip.print': ['On paper', 'En papel'],
	'strip.print-make': ['Make the page', 'Hacer la hoja'],
	'strip.print-making': ['Making the page', 'Haciendo la hoja'],
	'strip.print-save': ['Download it', 'Descargarla'],
	'strip.print-failed': [
		'The page could not be made. Close other programs to free memory, then try again.',
		'No se pudo hacer la hoja. Cierre otros programas para liberar memoria e intente otra vez.'
	],
	'strip.paper.A4': ['A4', 'A4'],
	'strip.paper.Letter': ['Letter', 'Carta'],
	'strip.file': ['teeth-at-true-scale', 'dientes-a-tamano-real'],

	'strip.pdf.made': ['Made {date} with Cogmark', 'Hecho el {date} con Cogmark'],
	'strip.pdf.printing': [
		'In the print dialog choose 100 % or "actual size", never "fit to page".',
		'Al imprimir elija 100 % o "tamaño real", nunca "ajustar a la página".'
	],
	'strip.pdf.check': [
		'This line must measure 100 mm. If it does not, do not use this page.',
		'Esta línea debe medir 100 mm. Si no, no use esta hoja.'
	],
	'strip.pdf.caution': [
		"The site's isolation procedure, local codes, the drawing or maker's data, and a licensed engineer where required come first. Never hold this page to a gear that moves or can be jogged.",
		'Antes valen el procedimiento de bloqueo del sitio, los códigos locales, el plano o los datos del fabricante y, donde se exija, un ingeniero con licencia. Nunca acerque esta hoja a un engrane que se mueve o puede moverse a impulsos.'
	],
	'strip.pdf.left-out': [
		'{n} more gears have no room on this page. Print them from a strip of their own.',
		'{n} engranes más no caben en esta hoja. Imprímalos con su propia tira.'
	],
	'strip.pdf.left-out#one': [
		'One more gear has no room on this page. Print it from a strip of its own.',
		'Un engrane más no cabe en esta hoja. Imprímalo con su propia tira.'
	]
} as const satisfies Record<string, readonly [string, string]>;
