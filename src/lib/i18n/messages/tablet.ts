/** Words of the tablet: short sentences, the trade's words. */
export const tablet = {
	'step.label': ['Steps of this check', 'Pasos de esta verificación'],
	'step.answered': ['answered', 'respondido'],
	'step.next': ['Next: {step}', 'Sigue: {step}'],
	'step.machine': ['Machine', 'Máquina'],
	'step.before': ['Before', 'Antes'],
	'step.look': ['Look', 'Mirar'],
	'step.measure': ['Measure', 'Medir'],
	'step.which-gear': ['Which gear', 'Qué engrane'],
	'step.drive': ['Drive', 'Mando'],
	'step.spare': ['Spare', 'Repuesto'],
	'step.result': ['Result', 'Resultado'],
	'step.keep': ['Keep', 'Guardar'],
	'step.before.title': ['Before you measure', 'Antes de medir'],
	'step.before.permit': ["Number of the site's isolation permit", 'Número del permiso de bloqueo del sitio'],
	'step.look.title': ['Look at the teeth', 'Mire los dientes'],
	'step.look.hint': [
		'What is wrong, and where on the face? In your own words: worn, pitted, chipped, broken at the root, one end or all along.',
		'¿Qué está mal y en qué parte de la cara? Con sus palabras: gastado, picado, astillado, roto en la raíz, un extremo o todo el ancho.'
	],

	'caution.isolation.lead': [
		"The site's isolation (lockout/tagout) procedure comes first.",
		'Primero, el procedimiento de bloqueo y etiquetado del sitio.'
	],
	'caution.isolation.rest': ['Nothing here replaces it.', 'Nada de aquí lo reemplaza.'],
	'caution.energy.lead': [
		'Stored energy released and verified:',
		'Energía almacenada liberada y comprobada:'
	],
	'caution.energy.rest': [
		'springs, pressure, suspended loads, counterweights (29 CFR 1910.147).',
		'resortes, presión, cargas suspendidas, contrapesos (29 CFR 1910.147).'
	],
	'caution.moving.lead': [
		'Never count or measure on a gear that moves or is jogged.',
		'Nunca cuente ni mida en un engrane en movimiento o a impulsos.'
	],
	'caution.moving.rest': ['Keep gloves away from rotating parts.', 'Guantes lejos de piezas que giran.'],
	'caution.guards.lead': ['Guards back on before running', 'Guardas en su lugar antes de arrancar'],
	'caution.guards.rest': ['(29 CFR 1910.219).', '(29 CFR 1910.219).'],
	'caution.hazards.lead': [
		'Hot parts, sharp worn teeth, heavy gears:',
		'Piezas calientes, dientes filosos, engranes pesados:'
	],
	'caution.hazards.rest': ['look before you touch or lift.', 'mire antes de tocar o levantar.'],
	'caution.codes.lead': ['Local codes', 'Los códigos locales'],
	'caution.codes.rest': ['go before anything this tablet says.', 'van antes que lo que diga esta tableta.'],
	'caution.drawing.lead': ["The drawing or the maker's data", 'El plano o los datos del fabricante'],
	'caution.drawing.rest': ['go before a measured figure.', 'van antes que una cifra medida.'],
	'caution.engineer.lead': ['A licensed engineer', 'Un ingeniero con licencia'],
	'caution.engineer.rest': ['decides where one is required.', 'decide donde se requiera.'],
	'caution.refer.lead': ['Stop, and refer to an engineer:', 'Pare y consulte a un ingeniero:'],
	'caution.refer.people': ['drives that carry people', 'mandos que transportan personas'],
	'caution.refer.hoists': ['hoists and cranes', 'polipastos y grúas'],
	'caution.refer.pressure': ['pressure-critical drives', 'mandos críticos por presión'],
	'caution.refer.vehicles': ['vehicle drives', 'mandos de vehículos'],
	'caution.refer.cracked': ['cracked parts', 'piezas agrietadas'],
	'caution.refer.unknown': ['unknown material', 'material desconocido'],
	'caution.limits': [
		'The result is a screening of tooth strength from the readings shown. It is no rating to AGMA or ISO and no permission to run. Shaft, key, rim, bearings, lubrication and life are not covered.',
		'El resultado es un examen de la resistencia del diente con las lecturas mostradas. No es clasificación AGMA ni ISO ni permiso para operar. No cubre eje, chaveta, llanta, rodamientos, lubricación ni vida.'
	],

	'tablet.machines': ['Find the machine', 'Busque la máquina'],
	'tablet.search': ['Tag, name or area', 'Etiqueta, nombre o área'],
	'tablet.positions': ['{n} gear positions', '{n} posiciones'],
	'tablet.positions#one': ['1 gear position', '1 posición'],
	'tablet.no-machines': [
		'This plant has no machines yet. A planner adds them in the office.',
		'Esta planta aún no tiene máquinas. Un planificador las agrega en la oficina.'
	],
	'tablet.never-pulled': [
		'This tablet has not heard from the plant yet, so it has no machines and no materials. Connect it once; after that it works without a network.',
		'Esta tableta aún no ha tenido contacto con la planta: no tiene máquinas ni materiales. Conéctela una vez; después trabaja sin red.'
	],
	'tablet.no-match': [
		'No machine matches "{search}". Try the tag alone, or fewer letters.',
		'Ninguna máquina coincide con "{search}". Pruebe solo la etiqueta o menos letras.'
	],
	'tablet.gear-unknown': ['No gear on record here', 'Sin engrane registrado aquí'],
	'tablet.start-check': ['Start a check', 'Verificar'],
	'tablet.no-positions': [
		'No gear positions are recorded for this machine. A planner adds them in the office.',
		'Esta máquina no tiene posiciones registradas. Un planificador las agrega en la oficina.'
	],
	'tablet.machine-unknown': ['This machine is not on this tablet', 'Esta máquina no está en la tableta'],
	'tablet.machine-unknown-text': [
		'It may have been added since the last contact with the plant, or belong to another plant.',
		'Quizá se agregó después del último contacto con la planta, o pertenece a otra planta.'
	],
	'tablet.all-machines': ['All machines', 'Todas las máquinas'],
	'tablet.other-machine': ['Another machine', 'Otra máquina'],
	'tablet.drafts': ['Drafts, kept on this tablet', 'Borradores, guardados en esta tableta'],
	'tablet.draft-at': ['at {step}, {time}', 'en {step}, {time}'],
	'tablet.discard': ['Throw away', 'Descartar'],
	'tablet.discarded': ['The draft was thrown away.', 'El borrador se descartó.'],
	'tablet.nobody': ['Nobody is signed in on this tablet', 'Nadie ha iniciado sesión en esta tableta'],
	'tablet.nobody-text': [
		'Signing in needs a connection to the plant, once. After that the tablet works without a network. Records that were kept here are still here.',
		'Iniciar sesión requiere conexión con la planta, una vez. Después la tableta trabaja sin red. Los registros guardados aquí siguen aquí.'
	],

	'tablet.sign-in': ['Sign in', 'Iniciar sesión'],
	'tablet.sign-out-offline': [
		'Signing out needs a connection to the plant. Nothing was changed. Leave the tablet signed in, or try again at a better place.',
		'Cerrar sesión requiere conexión con la planta. Nada cambió. Deje la sesión abierta o intente en un lugar con señal.'
	],
	'tablet.sign-out': ['Sign out {name}', 'Cerrar sesión de {name}'],

	'check.not-here': ['This check is not on this tablet', 'Esta verificación no está en la tableta'],
	'check.not-here-text': [
		'It was thrown away, kept by another person, or made on another tablet. The office shows what the plant has received.',
		'Se descartó, la guardó otra persona o se hizo en otra tableta. La oficina muestra lo que la planta recibió.'
	],
	'check.save-failed': [
		'The last entry could not be stored on this tablet. Free some storage, then type it again.',
		'La última entrada no se pudo guardar en la tableta. Libere espacio y escríbala de nuevo.'
	],

	'machine.known': ['What is known here', 'Lo que se sabe aquí'],
	'machine.last-gear': ['Last gear', 'Último engrane'],
	'machine.as-of': ['recorded {date}', 'registrado {date}'],
	'machine.mate': ['Mate', 'Par'],
	'machine.mate-unknown': ['No mate on record', 'Sin par registrado'],
	'machine.drive': ['Drive', 'Mando'],
	'machine.drive-unknown': ['No drive on record', 'Sin mando registrado'],
	'machine.past': ['Past checks', 'Verificaciones anteriores'],

	'measure.keep-reading': ['Keep this reading', 'Guardar esta lectura'],
	'measure.cannot': ['Cannot measure this', 'No se puede medir'],
	'measure.cannot-answered': ['Answered: cannot be measured', 'Respondido: no se puede medir'],
	'measure.undo': ['Undo', 'Deshacer'],
	'measure.of': ['{at} of {of} readings', 'Lectura {at} de {of}'],
	'measure.on-record': ['On record: {value}', 'Registrado: {value}'],
	'measure.on-record-date': ['{date}. Not a reading', '{date}. No es lectura'],
	'measure.nothing-on-record': ['Nothing on record here', 'Nada registrado aquí'],
	'measure.again': ['Measure again', 'Medir otra vez'],
	'measure.repeats': ['last of {n}, spread {spread}', 'última de {n}, dispersión {spread}'],
	'measure.count-blind': ['Do not look at the first', 'Sin ver el primero'],
	'count.differ': [
		'{first} first, {second} now. Count once more and correct the wrong one.',
		'Primero {first}, ahora {second}. Cuente otra vez y corrija el equivocado.'
	],
	'count.correct-first': ['Correct the first count', 'Corregir el primer conteo'],
	'count.go-on': ['Go on, in doubt of one', 'Seguir, con duda de uno'],
	'how.tip-to-gap': ['Read tip to gap', 'Leído de punta a hueco'],
	'how.pi-tape': ['By pi tape', 'Con cinta pi'],
	'how.tips-worn': ['Tips are worn', 'Puntas gastadas'],
	'how.flanks-worn': ['Flanks are worn', 'Flancos gastados'],
	'how.over-teeth': ['{n} teeth', '{n} dientes'],
	'how.one-tooth-less': ['One tooth less', 'Un diente menos'],
	'how.one-tooth-more': ['One tooth more', 'Un diente más'],
	'tally.by-taps': ['Count by taps', 'Contar por toques'],
	'tally.tap': ['Touch once for each tooth', 'Toque una vez por diente'],
	'tally.one-back': ['One back', 'Uno atrás'],
	'tally.from-start': ['From the start', 'Desde el inicio'],
	'tool.label': ['Taken with: {tool}, {good}. Change it', 'Medido con: {tool}, {good}. Cambiarlo'],
	'tool.good-to': ['good to {size} {unit}', 'hasta {size} {unit}'],
	'tool.good-to-angle': ['good to {size}°', 'hasta {size}°'],
	'tool.calliper': ['Calliper', 'Calibrador'],
	'tool.long-calliper': ['Long calliper', 'Calibrador largo'],
	'tool.calliper-tips': ['Calliper, tips or rod', 'Calibrador, puntas o varilla'],
	'tool.micrometer': ['Micrometer', 'Micrómetro'],
	'tool.disc-micrometer': ['Disc micrometer', 'Micrómetro de platillos'],
	'tool.tooth-calliper': ['Gear-tooth calliper', 'Calibrador de dientes'],
	'tool.pi-tape': ['Pi tape', 'Cinta pi'],
	'tool.rule': ['Steel rule', 'Regla de acero'],
	'tool.tape': ['Steel tape', 'Cinta métrica'],
	'tool.rule-over-shafts': ['Rule over the shafts', 'Regla sobre los ejes'],
	'tool.protractor': ['Protractor', 'Transportador'],
	'measure.kept-here': ['kept on this tablet', 'guardada en la tableta'],
	'measure.source.keypad': ['from the keypad', 'del teclado'],
	'measure.source.typed': ['typed, or by calliper', 'escrito o del calibrador'],
	'measure.source.tally': ['counted by taps', 'contado por toques'],
	'measure.source.position': ["from the position's record", 'del registro de la posición'],
	'measure.source.rule': ["from the plant's rule", 'de la regla de la planta'],
	'key.erase': ['Erase', 'Borrar'],
	'key.and': ['and', 'y'],
	'key.fraction': ['fraction', 'fracción'],
	'key.or-unit': ['or {unit}', 'o {unit}'],
	'key.unit-label': ['Unit: {unit}. Change it', 'Unidad: {unit}. Cambiarla'],

	'entry.empty': ['{field}: type it first.', '{field}: escríbalo primero.'],
	'entry.two-points': ['{field} has two points: erase one.', '{field} tiene dos puntos: borre uno.'],
	'entry.bare-point': [
		'A point alone is no figure: type digits.',
		'Un punto solo no es cifra: escriba dígitos.'
	],
	'entry.comma': [
		'A comma can mean two things: type a point for decimals, nothing for thousands.',
		'Una coma puede significar dos cosas: use punto para decimales, nada para miles.'
	],
	'entry.not-whole': ['{field}: a whole number is counted.', '{field}: se cuenta un número entero.'],
	'entry.half-fraction': [
		'The fraction is not complete: numerator, then /2 to /64.',
		'La fracción no está completa: numerador y luego /2 a /64.'
	],
	'entry.fraction-over-one': ['The fraction must be below one.', 'La fracción debe ser menor que uno.'],
	'entry.no-fractions': [
		'{field} takes no fraction: type a point.',
		'{field} no usa fracción: escriba un punto.'
	],
	'entry.not-a-number': ['This is not a figure: use the digits.', 'Esto no es una cifra: use los dígitos.'],
	'entry.wrong-unit': [
		'{field} is not measured in that unit: type the figure alone.',
		'{field} no se mide en esa unidad: escriba solo la cifra.'
	],
	'entry.too-small': [
		'{field}: at least {least}. Check the point and the unit.',
		'{field}: al menos {least}. Revise el punto y la unidad.'
	],
	'entry.too-large': [
		'{field}: at most {most}. Check the point and the unit.',
		'{field}: máximo {most}. Revise el punto y la unidad.'
	],

	'picture.teeth.lead': ['Mark one tooth', 'Marque un diente'],
	'picture.teeth.text': [
		'Chalk it, count round to it, then count once more',
		'Con tiza, cuente la vuelta y cuente otra vez'
	],
	'picture.outsideDiameter.lead': ['Tip to tip', 'Punta a punta'],
	'picture.outsideDiameter.text': [
		'Rock the jaws, keep the largest reading',
		'Mueva las puntas, guarde la lectura mayor'
	],
	'picture.odd': [
		'{n} is odd: this reads {low} low, allowed for',
		'{n} es impar: lee {low} de menos, ya corregido'
	],
	'picture.secondCount.lead': ['Count once more', 'Cuente otra vez'],
	'picture.secondCount.text': [
		'From another tooth, the other way round',
		'Desde otro diente y en sentido contrario'
	],
	'picture.mateTeeth.lead': ['The other gear', 'El otro engrane'],
	'picture.mateTeeth.text': ['Mark one tooth and count round to it', 'Marque un diente y cuente la vuelta'],
	'picture.span.lead': ['Flat on the flanks', 'Plano en los flancos'],
	'picture.span.text': [
		'Rock the jaws, keep the smallest reading',
		'Mueva las puntas, guarde la lectura menor'
	],
	'picture.wholeDepth.lead': ['Tip to root', 'Punta a raíz'],
	'picture.wholeDepth.text': [
		'Depth rod down to the root, from two tips',
		'Varilla hasta la raíz, desde dos puntas'
	],
	'picture.rootDiameter.lead': ['Root to root', 'Raíz a raíz'],
	'picture.rootDiameter.text': [
		'Narrow jaws down in two opposite spaces',
		'Puntas finas en dos huecos opuestos'
	],
	'picture.chordalThickness.lead': ['Across one tooth', 'A través de un diente'],
	'picture.chordalThickness.text': [
		'Tongue on the tip, one addendum deep',
		'Lengua en la punta, a un addendum'
	],
	'picture.pinDiameter.lead': ['One pin first', 'Primero un rodillo'],
	'picture.pinDiameter.text': [
		'It must rest on both flanks of a space',
		'Debe apoyar en ambos flancos del hueco'
	],
	'picture.overPins.lead': ['Over both pins', 'Sobre ambos rodillos'],
	'picture.overPins.text': [
		'In opposite spaces; odd count: the nearest to opposite',
		'En huecos opuestos; si es impar, los más opuestos'
	],
	'picture.centreDistance.lead': ['Shaft to shaft', 'Eje a eje'],
	'picture.centreDistance.text': [
		'Outside to outside, less half of both shafts',
		'De fuera a fuera, menos la mitad de cada eje'
	],
	'picture.circularPitch.lead': ['Tooth to tooth', 'Diente a diente'],
	'picture.circularPitch.text': [
		'Over several teeth halfway up, divided by them',
		'Sobre varios dientes a media altura, dividido'
	],
	'picture.helixAngle.lead': ['Tooth to shaft', 'Diente a eje'],
	'picture.helixAngle.text': [
		'Ink the tips, roll them on paper; 0 for straight',
		'Entinte, ruede en papel; 0 si es recto'
	],
	'picture.faceWidth.lead': ['Across the teeth', 'A lo ancho del diente'],
	'picture.faceWidth.text': [
		'Along the shaft, without hub or burr',
		'A lo largo del eje, sin cubo ni rebaba'
	],

	'which.pitch': ['Pitch', 'Paso'],
	'which.hint-full': [
		'(teeth + 2) / outside diameter gives DP {pitch}, module {module}. A hint only: a worn tip shifts it.',
		'(dientes + 2) / diámetro exterior da DP {pitch}, módulo {module}. Solo un indicio: una punta gastada lo cambia.'
	],
	'which.hint-stub': [
		'(teeth + 1.6) / outside diameter gives DP {pitch}, module {module}. A hint only: a worn tip shifts it.',
		'(dientes + 1.6) / diámetro exterior da DP {pitch}, módulo {module}. Solo un indicio: una punta gastada lo cambia.'
	],
	'which.no-hint': [
		'With teeth and outside diameter measured, the nearest pitches stand here.',
		'Con dientes y diámetro exterior medidos, aquí aparecen los pasos más cercanos.'
	],
	'which.fits': ['fits the outside diameter', 'coincide con el diámetro exterior'],
	'which.reads-low': ['reads {size} {unit} low', 'lectura {size} {unit} menor'],
	'which.reads-high': ['reads {size} {unit} high', 'lectura {size} {unit} mayor'],
	'which.from-list': ['from the list', 'de la lista'],
	'which.other-pitch': ['Another pitch', 'Otro paso'],
	'which.close': ['Close', 'Cerrar'],
	'which.diametral-pitches': ['Diametral pitches', 'Pasos diametrales'],
	'which.modules': ['Modules (mm)', 'Módulos (mm)'],
	'which.form': ['Pressure angle and form', 'Ángulo de presión y forma'],
	'which.form-hint': [
		'An outside diameter cannot tell the pressure angle. Take it from the drawing, the stamp, or a gauge.',
		'El diámetro exterior no dice el ángulo de presión. Tómelo del plano, del sello o de una galga.'
	],
	'which.form.full-depth': ['most gears cut today', 'la mayoría de los actuales'],
	'which.form.old': ['usual on old inch lines', 'usual en líneas antiguas'],
	'which.form.rare': ['seldom met', 'poco frecuente'],
	'which.form.stub': ['short, broad teeth', 'dientes cortos y anchos'],
	'which.on-record': ['on record here', 'registrado aquí'],

	'drive.part.load': ['Load', 'Carga'],
	'drive.part.speed': ['Speed', 'Velocidad'],
	'drive.part.service': ['Service factor', 'Factor de servicio'],
	'drive.how-known': ['How the load is known', 'Cómo se conoce la carga'],
	'drive.basis': ['Where is the figure from?', '¿De dónde es la cifra?'],
	'drive.take': ['Take {value}', 'Tomar {value}'],
	'drive.on-record': ['on record here', 'registrado aquí'],
	'drive.unknown-text': [
		'Without a load there is no stress to compare, and the answer will be "cannot say yet". The check can be kept all the same: what was measured is not lost.',
		'Sin carga no hay esfuerzo que comparar y la respuesta será "aún no se puede decir". La verificación se puede guardar igual: lo medido no se pierde.'
	],
	'drive.speed-text': [
		'The speed of this gear, not of the motor. Read it from the nameplate of the drive, or with a tachometer before the machine is isolated.',
		'La velocidad de este engrane, no la del motor. Léala en la placa del mando o con un tacómetro antes de aislar la máquina.'
	],
	'drive.duty-on-record': ['On record here: {duty}', 'Registrado aquí: {duty}'],

	'drive.factor-source': ['From: {source}', 'Fuente: {source}'],

	'spare.finish': ['How were its teeth made?', '¿Cómo se hicieron sus dientes?'],
	'spare.finish-text': [
		'A rougher finish makes the moving load heavier. If you are not sure, choose the rougher one.',
		'Un acabado más tosco aumenta la carga en movimiento. Si no está seguro, elija el más tosco.'
	],
	'spare.material': ['Material', 'Material'],
	'spare.permitted': ['Permitted at this plant', 'Permitidos en esta planta'],
	'spare.not-permitted': ['On the list, but not permitted', 'En la lista, pero no permitidos'],
	'spare.none-permitted': [
		'No material is permitted at this plant yet. A supervisor permits them in the office.',
		'Aún no hay materiales permitidos. Un supervisor los permite en la oficina.'
	],
	'spare.revision': ['revision {n}', 'revisión {n}'],

	'keep.number': ['Record {n}.', 'Registro {n}.'],
	'keep.when': ['Kept {time}.', 'Guardado {time}.'],
	'keep.unchangeable': [
		'A kept check is not changed any more. If something was wrong, make a new check at the same position.',
		'Una verificación guardada ya no cambia. Si algo estaba mal, haga una nueva en la misma posición.'
	],
	'keep.show-result': ['Result', 'Resultado'],
	'keep.next-check': ['Next machine', 'Otra máquina'],
	'keep.draft-text': [
		'Everything typed so far is on this tablet. The check becomes a record when you keep it beside its result.',
		'Todo lo escrito está en esta tableta. La verificación se vuelve registro al guardarla junto a su resultado.'
	],
	'keep.to-result': ['See the result and keep it', 'Ver el resultado y guardarlo'],
	'keep.none': ['No records are kept on this tablet.', 'No hay registros guardados en esta tableta.'],
	'keep.storage-full': [
		'The storage of this tablet is full. The draft is still here. Send what waits or free some storage, then keep it again.',
		'El almacenamiento está lleno. El borrador sigue aquí. Envíe lo pendiente o libere espacio y guarde de nuevo.'
	],
	'keep.failed': [
		'The check could not be kept. The draft is still here: try again.',
		'No se pudo guardar. El borrador sigue aquí: intente de nuevo.'
	],

	'working-head.symbol': ['Symbol', 'Símbolo'],
	'working-head.name': ['Name', 'Nombre'],
	'working-head.expression': ['Expression', 'Expresión'],
	'working-head.value': ['Value', 'Valor'],
	'working-head.source': ['Source', 'Fuente']
} as const satisfies Record<string, readonly [string, string]>;
