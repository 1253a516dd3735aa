/**
 * Words for what the calculation core says: its reasons by code, the names of its working lines, and the parts of
 * a source that are prose. Titles of books stay as they are printed. Never "safe", "approved" or "certified".
 */
export const working = {
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
	'reason.bending-only': [
		"This version works out bending of this gear's teeth. Wear, and the mate's teeth, are not in it.",
		'Esta versión calcula la flexión de los dientes de este engrane. No incluye el desgaste ni los dientes del engrane conjugado.'
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
	'reason.kind-not-covered': [
		'This version works out spur gears, not a {kind}. Have it rated by an engineer.',
		'Esta versión calcula engranes rectos; este es otro tipo: {kind}. Pida a un ingeniero que lo evalúe.'
	],
	'reason.form-rule-not-covered': [
		"The plant's rule asks for the form factor by {formFactor}; this version has the handbook table only. A supervisor can set the rule to the handbook table.",
		'La regla de la planta pide el factor de forma por {formFactor}; esta versión solo tiene la tabla del manual. Un supervisor puede fijar la regla en la tabla del manual.'
	],
	'reason.mate-pitch-differs': [
		'Gear and mate do not mesh: their base pitches are {gear} mm and {mate} mm. Check pitch and pressure angle of both.',
		'El engrane y su conjugado no engranan: sus pasos base son {gear} mm y {mate} mm. Revise el paso y el ángulo de presión de ambos.'
	],
	'reason.speed-beyond-law': [
		'The pitch-line velocity of {velocity} is beyond {end}, the limit for {law}. Check speed and finish, or have the gear rated by an engineer.',
		'La velocidad en la línea de paso, {velocity}, supera {end}, el límite para {law}. Revise la velocidad y el acabado, o pida a un ingeniero que lo evalúe.'
	],
	'reason.profile-shift-not-covered': [
		'The handbook table holds teeth without profile shift, this gear has {profileShift} x module. Check the shift, or have the gear rated by an engineer.',
		'La tabla del manual es para dientes sin corrección de perfil; este engrane tiene {profileShift} x módulo. Revise la corrección, o pida a un ingeniero que lo evalúe.'
	],
	'reason.form-not-in-table': [
		'The handbook table holds full depth at 14.5 and 20 degrees and stub at 20 degrees, not this form at {pressureAngle} degrees. Check angle and form, or have the gear rated by an engineer.',
		'La tabla del manual tiene profundidad completa a 14.5 y 20 grados y truncado a 20 grados, no esta forma a {pressureAngle} grados. Revise ángulo y forma, o pida a un ingeniero que lo evalúe.'
	],
	'reason.too-few-teeth': [
		'The Lewis method starts at {fewest} teeth, this gear has {teeth}. Count again, or have the gear rated by an engineer.',
		'El método de Lewis empieza en {fewest} dientes; este engrane tiene {teeth}. Cuente otra vez, o pida a un ingeniero que lo evalúe.'
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
	'reason-short.kind-not-covered': ['Not a spur gear: {kind}', 'No es engrane recto: {kind}'],
	'reason-short.mate-pitch-differs': ['Gear and mate do not mesh', 'El engrane y su conjugado no engranan'],
	'reason-short.speed-beyond-law': [
		'Too fast for {law}: {velocity}',
		'Demasiado rápido para {law}: {velocity}'
	],
	'reason-short.profile-shift-not-covered': ['Has a profile shift', 'Tiene corrección de perfil'],
	'reason-short.form-not-in-table': ['Tooth form not in the table', 'Forma del diente fuera de la tabla'],
	'reason-short.too-few-teeth': [
		'{teeth} teeth; the method starts at {fewest}',
		'{teeth} dientes; el método empieza en {fewest}'
	],
	'form-rule.geometry': ['geometry', 'geometría'],
	'form-rule.lower-of-both': ['the lower of both methods', 'el menor de ambos métodos'],

	'working.module': ['module', 'módulo'],
	'working.pitch diameter': ['pitch diameter', 'diámetro de paso'],
	'working.speed of this gear': ['speed of this gear', 'velocidad de este engrane'],
	'working.pitch-line velocity': ['pitch-line velocity', 'velocidad en la línea de paso'],
	'working.pitch-line velocity in ft/min, for the law': [
		'pitch-line velocity in ft/min, for the law',
		'velocidad en la línea de paso en ft/min, para la ley'
	],
	'working.power through this gear': ['power through this gear', 'potencia que pasa por este engrane'],
	'working.torque on this gear': ['torque on this gear', 'par en este engrane'],
	'working.tangential force': ['tangential force', 'fuerza tangencial'],
	'working.design force': ['design force', 'fuerza de diseño'],
	'working.velocity factor': ['velocity factor', 'factor de velocidad'],
	'working.velocity factor, cast law': ['velocity factor, cast', 'factor de velocidad, fundidos'],
	'working.velocity factor, cut law': ['velocity factor, cut', 'factor de velocidad, cortados'],
	'working.velocity factor, cut-600 law': [
		'velocity factor, commercial cut',
		'factor de velocidad, cortados comerciales'
	],
	'working.velocity factor, hobbed law': ['velocity factor, hobbed', 'factor de velocidad, tallados'],
	'working.velocity factor, ground law': ['velocity factor, ground', 'factor de velocidad, rectificados'],
	'working.velocity factor, non-metallic law': [
		'velocity factor, non-metallic',
		'factor de velocidad, no metálicos'
	],
	'working.Lewis form factor, load at the tip': [
		'Lewis form factor, load at the tip',
		'factor de forma de Lewis, carga en la punta'
	],
	'working.face width': ['face width', 'ancho de cara'],
	'working.face width of this gear': ['face width of this gear', 'ancho de cara de este engrane'],
	'working.face width of the mate': ['face width of the mate', 'ancho de cara del conjugado'],
	'working.face width that carries, the smaller of the pair': [
		'face width that carries, the smaller of the pair',
		'ancho de cara que soporta, el menor del par'
	],
	'working.allowable bending stress of the material': [
		'allowable bending stress of the material',
		'esfuerzo de flexión admisible del material'
	],
	'working.allowable bending stress, reversing': [
		'allowable bending stress, reversing',
		'esfuerzo de flexión admisible, carga alternante'
	],
	'working.share of a speed error that reaches the velocity factor': [
		'share of a speed error that reaches the velocity factor',
		'parte de un error de velocidad que llega al factor de velocidad'
	],
	'working.share of a speed error that reaches the stress': [
		'share of a speed error that reaches the stress',
		'parte de un error de velocidad que llega al esfuerzo'
	],
	'working.relative standard uncertainty of the margin': [
		'relative standard uncertainty of the margin',
		'incertidumbre típica relativa del margen'
	],
	'working.bending stress, velocity and service factors in': [
		'bending stress, velocity and service factors in',
		'esfuerzo de flexión, con factores de velocidad y de servicio'
	],
	'working.margin in bending': ['margin in bending', 'margen a flexión'],
	'working.low end of the margin': ['low end of the margin', 'extremo bajo del margen'],
	"working.tangential force at the plant's margin": [
		"tangential force at the plant's margin",
		'fuerza tangencial con el margen de la planta'
	],
	"working.power at the plant's margin and this speed": [
		"power at the plant's margin and this speed",
		'potencia con el margen de la planta y esta velocidad'
	],
	"working.torque at the plant's margin and this speed": [
		"torque at the plant's margin and this speed",
		'par con el margen de la planta y esta velocidad'
	],

	'expression.as given': ['as given', 'como se dio'],
	'expression.table at N': ['table at N', 'tabla en N'],

	'source.as given': ['as given', 'como se dio'],
	'source.definition': ['definition', 'definición'],
	'source.mechanics': ['mechanics', 'mecánica'],
	'source.rule of the plant': ['rule of the plant', 'regla de la planta'],
	'source.exact: 1 ft/min = 0.00508 m/s': ['exact: 1 ft/min = 0.00508 m/s', 'exacto: 1 ft/min = 0.00508 m/s'],
	"source.Barth's velocity factor": ["Barth's velocity factor", 'factor de velocidad de Barth'],
	"source.Barth's velocity factor, commercial cut teeth": [
		"Barth's velocity factor, commercial cut teeth",
		'factor de velocidad de Barth, dientes cortados comerciales'
	],
	'source.velocity factor of non-metallic gears': [
		'velocity factor of non-metallic gears',
		'factor de velocidad de engranes no metálicos'
	],
	'source.Lewis bending stress': ['Lewis bending stress', 'esfuerzo de flexión de Lewis'],
	'source.first-order propagation': ['first-order propagation', 'propagación de primer orden'],
	'source.95 % one-sided, normal distribution': [
		'95 % one-sided, normal distribution',
		'95 % de un lado, distribución normal'
	],
	'source.edition from memory': ['edition from memory', 'edición de memoria'],
	'source.from memory': ['from memory', 'de memoria']
} as const satisfies Record<string, readonly [string, string]>;
