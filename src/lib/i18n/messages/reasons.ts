/**
 * Words for the reasons that the calculation core gives, by code: the whole sentence, and a short one for a row of a
 * table. Never "safe", "approved" or "certified".
 */
export const reasons = {
	'reason.material-not-permitted': [
		"{material} is not on the plant's list of permitted materials. Choose a permitted one, or ask the supervisor.",
		'{material} no está en la lista de materiales permitidos de la planta. Elija uno permitido o pregunte al supervisor.'
	],
	'reason.bending-margin-short': [
		'The margin in bending is {margin}, the plant needs {needed}: this gear falls short.',
		'El margen a flexión es {margin} y la planta requiere {needed}: este engrane no alcanza.'
	],
	'reason.bending-margin-low': [
		'The margin in bending is {margin} and meets the needed {needed}, but at the bad end of the uncertainty it is {low}.',
		'El margen a flexión es {margin} y cumple el {needed} requerido, pero en el extremo malo de la incertidumbre es {low}.'
	],
	'reason.bending-margin': [
		'The margin in bending is {margin}, and {low} at the bad end of the uncertainty; the plant needs {needed}.',
		'El margen a flexión es {margin}, y {low} en el extremo malo de la incertidumbre; la planta requiere {needed}.'
	],
	'reason.weakest-of-several': [
		'{gears} gears fit the readings; the weakest of them decides. One more reading may leave fewer.',
		'{gears} engranes coinciden con las lecturas; decide el más débil. Una lectura más puede dejar menos.'
	],
	'reason.no-gear-fits': [
		'No involute gear of the known pitches makes these readings. Look again at the count and the flagged reading, or have the gear identified by the gear shop.',
		'Ningún engrane de evolvente de los pasos conocidos da estas lecturas. Revise el conteo y la lectura señalada, o pida al taller de engranes que lo identifique.'
	],
	'reason.may-fit-no-gear': [
		'The readings may be of no involute gear at all. Take one more reading, or have a second person measure.',
		'Las lecturas podrían no ser de ningún engrane de evolvente. Tome una lectura más o pida a otra persona que mida.'
	],
	'reason.choice-against-readings': [
		'The chosen gear does not fit the readings: less than one in a hundred. Measure again, or say in the note where the choice comes from.',
		'El engrane elegido no coincide con las lecturas: menos de uno en cien. Mida otra vez o anote de dónde viene la elección.'
	],
	'reason.out-of-range': [
		'These values lead to a figure too large or too small to compute with. Check the readings and their units.',
		'Estos valores llevan a una cifra demasiado grande o pequeña para calcular. Revise las lecturas y sus unidades.'
	],
	'reason.missing': [
		'The {field} is missing: go back to its step and give it.',
		'Falta este dato: {field}. Vuelva a su paso y proporciónelo.'
	],
	'reason.teeth-missing': [
		'The number of teeth is missing. Count them and give it.',
		'Falta el número de dientes. Cuéntelos y proporciónelo.'
	],
	'reason.speed-missing': [
		'The speed of this gear is missing. Give it in rpm.',
		'Falta la velocidad de este engrane. Proporciónela en rpm.'
	],
	'reason.load-unknown': [
		'The load is not known, so there is no stress to compare. Give power or torque, from the nameplate or measured.',
		'No se conoce la carga, así que no hay esfuerzo que comparar. Dé la potencia o el par, de la placa o medidos.'
	],
	'reason.mate-pitch-differs': [
		'Gear and mate do not mesh: their base pitches are {gear} mm and {mate} mm. Check pitch and pressure angle of both.',
		'El engrane y su conjugado no engranan: sus pasos base son {gear} mm y {mate} mm. Revise el paso y el ángulo de presión de ambos.'
	],
	'reason.speed-beyond-law': [
		'The pitch-line velocity of {velocity} is beyond {end}, the limit for {law}. Check speed and finish, or have the gear rated by an engineer.',
		'La velocidad en la línea de paso, {velocity}, supera {end}, el límite para {law}. Revise la velocidad y el acabado, o pida a un ingeniero que lo evalúe.'
	],
	'reason.too-few-teeth': [
		'The Lewis method starts at {fewest} teeth, this gear has {teeth}. Count again, or have the gear rated by an engineer.',
		'El método de Lewis empieza en {fewest} dientes; este engrane tiene {teeth}. Cuente otra vez, o pida a un ingeniero que lo evalúe.'
	],
	'reason.kind-needs-review': [
		'The method is for spur gears; for this kind ({kind}) it gives a first look only. An engineer should review it.',
		'El método es para engranes rectos; para este tipo ({kind}) da solo una primera idea. Un ingeniero debe revisarlo.'
	],
	'reason.bending-only': [
		"This is bending of this gear's teeth only. For wear and for the mate's teeth, give the mate with its form, material and hardness.",
		'Esto es solo la flexión de los dientes de este engrane. Para el desgaste y los dientes del conjugado, dé el conjugado con su forma, material y dureza.'
	],
	'reason.wear-not-known': [
		'Wear is not in this verdict: give modulus and hardness of both materials.',
		'El desgaste no entra en este veredicto: dé módulo y dureza de ambos materiales.'
	],
	'reason.mate-bending-not-known': [
		"Bending of the mate's teeth is not in this verdict: give its tooth form and material.",
		'La flexión de los dientes del conjugado no entra en este veredicto: dé su forma de diente y su material.'
	],
	'reason.wear-margin-short': [
		'The margin in wear is {margin}, the plant needs {needed}: the flanks of the pair fall short.',
		'El margen a desgaste es {margin} y la planta requiere {needed}: los flancos del par no alcanzan.'
	],
	'reason.wear-margin-low': [
		'The margin in wear is {margin} and meets the needed {needed}, but at the bad end of the uncertainty it is {low}.',
		'El margen a desgaste es {margin} y cumple el {needed} requerido, pero en el extremo malo de la incertidumbre es {low}.'
	],
	'reason.wear-margin': [
		'The margin in wear is {margin}, and {low} at the bad end of the uncertainty; the plant needs {needed}.',
		'El margen a desgaste es {margin}, y {low} en el extremo malo de la incertidumbre; la planta requiere {needed}.'
	],
	'reason.mate-bending-margin-short': [
		"The margin in bending of the mate's teeth is {margin}, the plant needs {needed}: the mate falls short.",
		'El margen a flexión de los dientes del conjugado es {margin} y la planta requiere {needed}: el conjugado no alcanza.'
	],
	'reason.mate-bending-margin-low': [
		"The margin in bending of the mate's teeth is {margin} and meets the needed {needed}, but at the bad end of the uncertainty it is {low}.",
		'El margen a flexión de los dientes del conjugado es {margin} y cumple el {needed} requerido, pero en el extremo malo de la incertidumbre es {low}.'
	],
	'reason.mate-bending-margin': [
		"The margin in bending of the mate's teeth is {margin}, and {low} at the bad end of the uncertainty; the plant needs {needed}.",
		'El margen a flexión de los dientes del conjugado es {margin}, y {low} en el extremo malo de la incertidumbre; la planta requiere {needed}.'
	],
	'reason.compared': [
		'The spare carries {bending} % of what the original gear carried in bending and {wear} % in wear.',
		'El repuesto soporta el {bending} % de lo que soportaba el engrane original a flexión y el {wear} % a desgaste.'
	],
	'reason.compared-bending': [
		'The spare carries {bending} % of what the original gear carried in bending.',
		'El repuesto soporta el {bending} % de lo que soportaba el engrane original a flexión.'
	],
	'reason.original-not-comparable': [
		'The original gear cannot be compared: one of the two is outside the method, or the speed is missing and their finish or size differs. Check what is given of the original.',
		'El engrane original no se puede comparar: uno de los dos queda fuera del método, o falta la velocidad y difieren en acabado o tamaño. Revise los datos del original.'
	],
	'reason.velocity-missing': [
		'The velocity of the rack is missing. Give it in m/s or ft/min.',
		'Falta la velocidad de la cremallera. Proporciónela en m/s o ft/min.'
	],
	'reason.torque-on-rack': [
		'A rack turns no shaft, so a torque gives no force on it. Give the power, or the force along the rack.',
		'Una cremallera no gira ningún eje, así que un par no le da fuerza. Dé la potencia o la fuerza a lo largo de la cremallera.'
	],
	'reason.angle-not-covered': [
		'The form factor by geometry reaches from 14.5 to 25 degrees, this tooth has {pressureAngle} in its normal plane. Check the pressure angle, or have the gear rated by an engineer.',
		'El factor de forma por geometría llega de 14.5 a 25 grados; este diente tiene {pressureAngle} en su plano normal. Revise el ángulo de presión, o pida a un ingeniero que lo evalúe.'
	],
	'reason.rack-tip-too-round': [
		"The tooth form's tip radius and dedendum leave its rack no tip. Check addendum, dedendum and tip radius.",
		'El radio de punta y el dedendo de esta forma no dejan punta a su cremallera. Revise adendo, dedendo y radio de punta.'
	],
	'reason.shift-too-large': [
		'With this profile shift the rack no longer reaches below the pitch circle. Check the shift.',
		'Con esta corrección de perfil la cremallera ya no llega por debajo del círculo de paso. Revise la corrección.'
	],
	'reason.undercut-too-deep': [
		'The teeth are undercut so deep that no flank is left below the pitch circle: the method ends. Check teeth, angle and shift, or have the gear rated by an engineer.',
		'Los dientes están tan socavados que no queda flanco bajo el círculo de paso: el método termina. Revise dientes, ángulo y corrección, o pida a un ingeniero que lo evalúe.'
	],
	'reason.tip-worn-away': [
		'The tips are worn below the beginning of the flank: no tooth is left to work out. Check the wear of the tips.',
		'Las puntas están gastadas por debajo del inicio del flanco: no queda diente que calcular. Revise el desgaste de las puntas.'
	],
	'reason.tooth-pointed': [
		'The flanks of these teeth meet below the tip circle. Check addendum and profile shift.',
		'Los flancos de estos dientes se juntan antes del círculo exterior. Revise el adendo y la corrección de perfil.'
	],
	'reason.tooth-too-short': [
		'These teeth are so short that the load at the tip does not bend them: the method ends. Check addendum and dedendum.',
		'Estos dientes son tan cortos que la carga en la punta no los flexiona: el método termina. Revise adendo y dedendo.'
	],
	'reason.mate-helix-differs': [
		'Gear and mate do not mesh on parallel shafts: their helix angles differ. Check the helix angle of both.',
		'El engrane y su conjugado no engranan en ejes paralelos: sus ángulos de hélice difieren. Revise el ángulo de hélice de ambos.'
	],
	'reason.kinds-do-not-mesh': [
		'Racks and internal gears mesh with an external gear only. Check the kind of both.',
		'Las cremalleras y los engranes interiores solo engranan con un engrane exterior. Revise el tipo de ambos.'
	],
	'reason.internal-too-small': [
		'An internal gear has more teeth than the pinion that runs in it. Check both counts.',
		'Un engrane interior tiene más dientes que el piñón que gira en él. Revise ambos conteos.'
	],
	'reason.centres-too-close': [
		'At this centre distance the two cannot stand: their base circles overlap. Check the centre distance and both counts.',
		'A esta distancia entre centros no caben: sus círculos base se traslapan. Revise la distancia entre centros y ambos conteos.'
	],
	'reason.shifts-do-not-mesh': [
		'With these profile shifts there is no centre distance at which the two run. Check both shifts and counts, or measure the centre distance.',
		'Con estas correcciones no hay distancia entre centros en la que ambos trabajen. Revise las correcciones y los conteos, o mida la distancia entre centros.'
	],
	'reason.contact-ratio-below-one': [
		'One pair of teeth leaves before the next meets: the contact ratio is {contactRatio}, it must be above 1. Check centre distance, tooth form and wear of the tips.',
		'Un par de dientes se separa antes de que se junte el siguiente: la relación de contacto es {contactRatio} y debe pasar de 1. Revise la distancia entre centros, la forma y el desgaste de las puntas.'
	],
	'reason.contact-ratio-low': [
		'The contact ratio is {contactRatio}; below 1.2 the teeth take over badly. Check the centre distance and the wear of the tips; an engineer should review it.',
		'La relación de contacto es {contactRatio}; por debajo de 1.2 los dientes se relevan mal. Revise la distancia entre centros y el desgaste de las puntas; un ingeniero debe revisarlo.'
	],
	'reason.contact-ratio-modest': [
		'The contact ratio is {contactRatio}; 1.4 or more is preferred.',
		'La relación de contacto es {contactRatio}; se prefiere 1.4 o más.'
	],
	'reason.undercut': [
		'The teeth of the smaller gear are undercut at the root, where the tips of its mate reach. A hobbed gear has room there; one of another make may not.',
		'Los dientes del engrane menor están socavados en la raíz, hasta donde llegan las puntas de su conjugado. Un engrane tallado por fresa madre tiene espacio ahí; otro quizá no.'
	],
	'reason.interference': [
		'The tips of one gear reach below the flank of the other: they dig in unless the tips are relieved. Check counts, tooth form and centre distance.',
		'Las puntas de un engrane llegan por debajo del flanco del otro: se clavan si no están rebajadas. Revise conteos, forma y distancia entre centros.'
	],
	'reason.no-backlash': [
		'The teeth are {jam} mm too thick for this centre distance: they jam. Check the centre distance and the tooth thicknesses.',
		'Los dientes son {jam} mm demasiado gruesos para esta distancia entre centros: se traban. Revise la distancia entre centros y los espesores.'
	],
	'reason.backlash-below-range': [
		'The backlash is {backlash} mm; at least {least} mm is recommended. Check the centre distance.',
		'El juego es de {backlash} mm; se recomienda al menos {least} mm. Revise la distancia entre centros.'
	],
	'reason.backlash-above-range': [
		'The backlash is {backlash} mm; at most {most} mm is recommended. Look for wear of the flanks and the bearings.',
		'El juego es de {backlash} mm; se recomienda como máximo {most} mm. Busque desgaste en los flancos y los rodamientos.'
	],
	'reason.hardness-reversed': [
		'The wheel is harder ({wheel} HB) than the pinion ({pinion} HB). Usual is a hard pinion on a softer wheel: check which is which.',
		'La rueda es más dura ({wheel} HB) que el piñón ({pinion} HB). Lo usual es un piñón duro con una rueda más blanda: revise cuál es cuál.'
	],
	'reason.mate-worn': [
		'The mate is worn: a new gear on worn flanks wears fast and runs rough. Consider renewing both.',
		'El conjugado está gastado: un engrane nuevo sobre flancos gastados se desgasta pronto y marcha áspero. Considere renovar ambos.'
	],
	'reason.mate-law-counts': [
		"The velocity factor is that of the mate's teeth ({law}): both bear one dynamic load, and the mate's law gives the higher.",
		'El factor de velocidad es el de los dientes del conjugado ({law}): ambos soportan una misma carga dinámica, y su ley da el mayor.'
	],
	'reason.mate-speed-beyond-law': [
		"The pitch-line velocity of {velocity} is beyond {end}, the limit for the mate: {law}. Check the speed and the mate's finish, or have the pair rated by an engineer.",
		'La velocidad en la línea de paso, {velocity}, supera {end}, el límite para el conjugado: {law}. Revise la velocidad y el acabado del conjugado, o pida a un ingeniero que evalúe el par.'
	],
	'reason.mate-teeth-missing': [
		"The mate's number of teeth is missing, so this is bending of this gear's teeth only. For mesh, wear and the mate's teeth, count them and give it.",
		'Falta el número de dientes del conjugado, así que esto es solo la flexión de los dientes de este engrane. Para el engranaje, el desgaste y los dientes del conjugado, cuéntelos y proporciónelo.'
	],
	'reason.mate-helix-missing': [
		'The mate is helical, and neither its helix angle nor one of this gear is given. Measure the helix angle of the mate and give it.',
		'El conjugado es helicoidal y no se dio su ángulo de hélice ni el de este engrane. Mida el ángulo de hélice del conjugado y proporciónelo.'
	],
	'reason.teeth-jam': [
		'The teeth are {jam} mm too thick for this centre distance, more than any usual thinning makes up: they do not go into each other. Check the centre distance, the pitch and the tooth thicknesses.',
		'Los dientes son {jam} mm demasiado gruesos para esta distancia entre centros, más de lo que compensa cualquier adelgazamiento usual: no entran unos en otros. Revise la distancia entre centros, el paso y los espesores.'
	],
	'reason.mate-tooth-not-covered': [
		"The mate's teeth are outside the method. Have the mate rated by an engineer. Bending of the mate's teeth is not in this verdict.",
		'Los dientes del conjugado quedan fuera del método. Pida a un ingeniero que lo evalúe. La flexión de los dientes del conjugado no entra en este veredicto.'
	],
	'reason.mate-too-few-teeth': [
		"The Lewis method starts at {fewest} teeth, the mate has {teeth}. Count them again, or have the mate rated by an engineer. Bending of the mate's teeth is not in this verdict.",
		'El método de Lewis empieza en {fewest} dientes; el conjugado tiene {teeth}. Cuéntelos otra vez, o pida a un ingeniero que lo evalúe. La flexión de los dientes del conjugado no entra en este veredicto.'
	],
	'reason.mate-angle-not-covered': [
		"The mate's pressure angle of {pressureAngle} degrees in its normal plane is outside what the form factor covers. Check it, or have the mate rated by an engineer. Bending of the mate's teeth is not in this verdict.",
		'El ángulo de presión del conjugado, {pressureAngle} grados en su plano normal, queda fuera de lo que cubre el factor de forma. Revíselo, o pida a un ingeniero que lo evalúe. La flexión de los dientes del conjugado no entra en este veredicto.'
	],
	'reason.mate-rack-tip-too-round': [
		"The tip radius and dedendum of the mate's tooth form leave its rack no tip. Check them. Bending of the mate's teeth is not in this verdict.",
		'El radio de punta y el dedendo de la forma del conjugado no dejan punta a su cremallera. Revíselos. La flexión de los dientes del conjugado no entra en este veredicto.'
	],
	'reason.mate-shift-too-large': [
		"With the mate's profile shift its rack no longer reaches below the pitch circle. Check the mate's shift. Bending of the mate's teeth is not in this verdict.",
		'Con la corrección de perfil del conjugado su cremallera ya no llega por debajo del círculo de paso. Revise esa corrección. La flexión de los dientes del conjugado no entra en este veredicto.'
	],
	'reason.mate-undercut-too-deep': [
		"The mate's teeth are undercut so deep that no flank is left below the pitch circle. Check the mate's teeth, angle and shift, or have it rated by an engineer. Bending of the mate's teeth is not in this verdict.",
		'Los dientes del conjugado están tan socavados que no queda flanco bajo el círculo de paso. Revise sus dientes, ángulo y corrección, o pida a un ingeniero que lo evalúe. La flexión de los dientes del conjugado no entra en este veredicto.'
	],
	'reason.mate-tip-worn-away': [
		"The mate's tips are worn below the beginning of the flank. Check the wear of the mate's tips. Bending of the mate's teeth is not in this verdict.",
		'Las puntas del conjugado están gastadas por debajo del inicio del flanco. Revise ese desgaste. La flexión de los dientes del conjugado no entra en este veredicto.'
	],
	'reason.mate-tip-below-pitch-circle': [
		"The mate's tips do not stand above its pitch circle: the Lewis method does not hold for such stubs. Check the wear of the mate's tips, its addendum and its shift. Bending of the mate's teeth is not in this verdict.",
		'Las puntas del conjugado no sobresalen de su círculo de paso: el método de Lewis no vale para dientes así. Revise el desgaste de sus puntas, su adendo y su corrección. La flexión de los dientes del conjugado no entra en este veredicto.'
	],
	'reason.mate-tooth-pointed': [
		"The flanks of the mate's teeth meet below the tip circle. Check the mate's addendum and profile shift. Bending of the mate's teeth is not in this verdict.",
		'Los flancos de los dientes del conjugado se juntan antes del círculo exterior. Revise su adendo y su corrección de perfil. La flexión de los dientes del conjugado no entra en este veredicto.'
	],
	'reason.mate-tooth-too-short': [
		"The mate's teeth are so short that the load at the tip does not bend them. Check the mate's addendum and dedendum. Bending of the mate's teeth is not in this verdict.",
		'Los dientes del conjugado son tan cortos que la carga en la punta no los flexiona. Revise su adendo y su dedendo. La flexión de los dientes del conjugado no entra en este veredicto.'
	],
	// Given until core 1.1.0: outcomes that were kept with it are still shown.
	'reason.mate-finish-rougher': [
		"The mate's teeth are rougher than this gear's: the dynamic load is then nearer to that of the mate's finish. Answer the check with the mate's finish as well.",
		'Los dientes del conjugado son más bastos que los de este engrane: la carga dinámica se acerca entonces a la del acabado del conjugado. Responda la revisión también con ese acabado.'
	],
	'reason.wear-not-for-plastics': [
		'The wear limit is for metal on metal; one of these is not metallic. Have the wear judged by an engineer.',
		'El límite de desgaste es para metal con metal; uno de estos no es metálico. Pida a un ingeniero que juzgue el desgaste.'
	],
	'reason.wear-out-of-range': [
		'The wear limit holds for a mean Brinell hardness of {from} to {to}; of this pair it is {brinell}. Check both hardnesses, or have the wear judged by an engineer.',
		'El límite de desgaste vale para una dureza Brinell media de {from} a {to}; la de este par es {brinell}. Revise ambas durezas, o pida a un ingeniero que juzgue el desgaste.'
	],
	'reason.contact-shortened': [
		'The roots shorten the contact: the flanks begin so high that the contact ratio is {left} instead of {whole}.',
		'Las raíces acortan el contacto: los flancos empiezan tan arriba que la relación de contacto es {left} en vez de {whole}.'
	],
	'reason.contact-not-known': [
		'The teeth of one of the two are undercut so deep that no flank is left below its pitch circle: what contact remains cannot be worked out. Check counts, angle and shifts of both, or have the pair rated by an engineer.',
		'Los dientes de uno de los dos están tan socavados que no queda flanco bajo su círculo de paso: no se puede calcular qué contacto queda. Revise conteos, ángulo y correcciones de ambos, o pida a un ingeniero que evalúe el par.'
	],
	'reason.tips-worn': [
		'The tips of this gear are worn by {wear} mm. It is given the strength of unworn teeth, never more; what has worn the tips may have worn the flanks too. An engineer should review it.',
		'Las puntas de este engrane están gastadas {wear} mm. Se le da la resistencia de dientes sin desgaste, nunca más; lo que gastó las puntas pudo gastar también los flancos. Un ingeniero debe revisarlo.'
	],
	'reason.mate-tips-worn': [
		'The tips of the mate are worn by {wear} mm. It is given the strength of unworn teeth, never more; what has worn the tips may have worn the flanks too. An engineer should review it.',
		'Las puntas del conjugado están gastadas {wear} mm. Se le da la resistencia de dientes sin desgaste, nunca más; lo que gastó las puntas pudo gastar también los flancos. Un ingeniero debe revisarlo.'
	],
	'reason.tip-below-pitch-circle': [
		'The tips of these teeth do not stand above the pitch circle: the Lewis method does not hold for such stubs. Check the wear of the tips, the addendum and the profile shift.',
		'Las puntas de estos dientes no sobresalen del círculo de paso: el método de Lewis no vale para muñones así. Revise el desgaste de las puntas, el adendo y la corrección de perfil.'
	],
	'reason.tips-of-pair-worn-away': [
		'The tips of the gear or of its mate are worn down to the pitch circle or below: no mesh is left to work out. Check the wear of the tips of both.',
		'Las puntas del engrane o de su conjugado están gastadas hasta el círculo de paso o más abajo: no queda engrane que calcular. Revise el desgaste de las puntas de ambos.'
	],
	'reason-short.material-not-permitted': [
		"{material} is not on the plant's list",
		'{material} no está en la lista de la planta'
	],
	'reason-short.out-of-range': ['Readings or units out of range', 'Lecturas o unidades fuera de rango'],
	'reason-short.missing': ['Missing: {field}', 'Falta: {field}'],
	'reason-short.teeth-missing': ['Missing: number of teeth', 'Falta: número de dientes'],
	'reason-short.speed-missing': ['Missing: speed of this gear', 'Falta: velocidad de este engrane'],
	'reason-short.load-unknown': ['The load is not known', 'No se conoce la carga'],
	'reason-short.mate-pitch-differs': ['Gear and mate do not mesh', 'El engrane y su conjugado no engranan'],
	'reason-short.speed-beyond-law': [
		'Too fast for {law}: {velocity}',
		'Demasiado rápido para {law}: {velocity}'
	],
	'reason-short.mate-speed-beyond-law': [
		"Too fast for the mate's {law}: {velocity}",
		'Demasiado rápido para el conjugado, {law}: {velocity}'
	],
	'reason-short.mate-helix-missing': [
		'Missing: helix angle of the mate',
		'Falta: ángulo de hélice del conjugado'
	],
	'reason-short.teeth-jam': ['The teeth jam by {jam} mm', 'Los dientes se traban por {jam} mm'],
	'reason-short.too-few-teeth': [
		'{teeth} teeth; the method starts at {fewest}',
		'{teeth} dientes; el método empieza en {fewest}'
	],
	'reason-short.kind-needs-review': ['First look only: {kind}', 'Solo una primera idea: {kind}'],
	'reason-short.velocity-missing': ['Missing: velocity of the rack', 'Falta: velocidad de la cremallera'],
	'reason-short.torque-on-rack': [
		'A torque gives no force on a rack',
		'Un par no da fuerza en una cremallera'
	],
	'reason-short.angle-not-covered': [
		'Pressure angle of {pressureAngle}° out of range',
		'Ángulo de presión de {pressureAngle}° fuera de rango'
	],
	'reason-short.mate-helix-differs': [
		'Gear and mate do not mesh: helix',
		'El engrane y su conjugado no engranan: hélice'
	],
	'reason-short.kinds-do-not-mesh': ['These kinds do not mesh', 'Estos tipos no engranan'],
	'reason-short.internal-too-small': [
		'Internal gear smaller than its pinion',
		'Engrane interior menor que su piñón'
	],
	'reason-short.centres-too-close': ['Centre distance too small', 'Distancia entre centros demasiado corta'],
	'reason-short.shifts-do-not-mesh': ['Shifts do not mesh', 'Las correcciones no engranan'],
	'reason-short.contact-ratio-below-one': ['Contact ratio below 1', 'Relación de contacto menor que 1'],
	'reason-short.undercut-too-deep': ['Undercut too deep', 'Socavado demasiado profundo'],
	'reason-short.tooth-pointed': ['Pointed teeth', 'Dientes en punta'],
	'reason-short.tip-worn-away': ['Tips worn away', 'Puntas gastadas'],
	'reason-short.tip-below-pitch-circle': ['Tips worn to stubs', 'Puntas reducidas a muñones'],
	'reason-short.tips-of-pair-worn-away': ['Tips of the pair worn away', 'Puntas del par gastadas'],
	'reason-short.tips-worn': ['Tips worn: {wear} mm', 'Puntas gastadas: {wear} mm'],
	'reason-short.mate-tips-worn': ["Mate's tips worn: {wear} mm", 'Puntas del conjugado gastadas: {wear} mm'],
	'reason-short.contact-not-known': ['Undercut too deep to mesh', 'Socavado demasiado profundo para engranar']
} as const satisfies Record<string, readonly [string, string]>;
