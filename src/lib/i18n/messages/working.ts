/**
 * Words for the working of the calculation core: the names of its lines, and the parts of a source that are prose.
 * Titles of books stay as they are printed.
 */
export const working = {
	'working.dynamic force that the answer that decides bears': [
		'dynamic force that the answer that decides bears',
		'fuerza dinámica que soporta la respuesta que decide'
	],
	'working.dynamic force that the flanks bear, the lower of both': [
		'dynamic force that the flanks bear, the lower of both',
		'fuerza dinámica que los flancos soportan, la menor de ambas'
	],
	'working-of.mate': ['mate: {name}', 'conjugado: {name}'],
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
	'working.velocity factor of the pair, the higher of both': [
		'velocity factor of the pair, the higher of both',
		'factor de velocidad del par, el mayor de ambos'
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
	'working.backlash on the operating pitch circle': [
		'backlash on the operating pitch circle',
		'juego en el círculo de paso de trabajo'
	],
	'working.backlash across the flanks': ['backlash across the flanks', 'juego entre los flancos'],
	'working.transverse module': ['transverse module', 'módulo transversal'],
	'working.normal module': ['normal module', 'módulo normal'],
	'working.virtual teeth in the normal plane': [
		'virtual teeth in the normal plane',
		'dientes virtuales en el plano normal'
	],
	'working.surface strength by the mean hardness of the pair': [
		'surface strength by the mean hardness of the pair',
		'resistencia superficial por la dureza media del par'
	],
	'working.ratio factor': ['ratio factor', 'factor de relación'],
	'working.load-stress factor for these moduli': [
		'load-stress factor for these moduli',
		'factor de carga y esfuerzo para estos módulos'
	],
	'working.limit load for wear': ['limit load for wear', 'carga límite de desgaste'],
	'working.Lewis form factor by geometry, load at the tip': [
		'Lewis form factor by geometry, load at the tip',
		'factor de forma de Lewis por geometría, carga en la punta'
	],
	'working.Lewis form factor by the handbook, load at the tip': [
		'Lewis form factor by the handbook, load at the tip',
		'factor de forma de Lewis por el manual, carga en la punta'
	],
	'working.Lewis form factor that counts, by the rule of the plant': [
		'Lewis form factor that counts, by the rule of the plant',
		'factor de forma de Lewis que cuenta, por la regla de la planta'
	],
	'working.thickness of the tooth at its weakest section, in modules': [
		'thickness of the tooth at its weakest section, in modules',
		'espesor del diente en su sección más débil, en módulos'
	],
	'working.height of the load above its weakest section, in modules': [
		'height of the load above its weakest section, in modules',
		'altura de la carga sobre su sección más débil, en módulos'
	],
	'working.what the bad end leaves of the margin': [
		'what the bad end leaves of the margin',
		'lo que el extremo malo deja del margen'
	],
	'working.what the bad end leaves of the margin, by the law that falls faster here': [
		'what the bad end leaves of the margin, by the law that falls faster here',
		'lo que el extremo malo deja del margen, por la ley que aquí cae más rápido'
	],
	'working.ratio': ['ratio', 'relación'],
	'working.standard centre distance': ['standard centre distance', 'distancia entre centros estándar'],
	'working.operating pressure angle at the measured centre distance': [
		'operating pressure angle at the measured centre distance',
		'ángulo de presión de trabajo a la distancia entre centros medida'
	],
	'working.involute of the operating pressure angle, by the shifts': [
		'involute of the operating pressure angle, by the shifts',
		'involuta del ángulo de presión de operación, por las correcciones'
	],
	'working.contact ratio, path of contact over base pitch': [
		'contact ratio, path of contact over base pitch',
		'relación de contacto, línea de contacto entre paso base'
	],
	'working.overlap ratio': ['overlap ratio', 'relación de traslape'],
	'working.dynamic force that the tooth bears in bending': [
		'dynamic force that the tooth bears in bending',
		'fuerza dinámica que el diente soporta a flexión'
	],
	'working.velocity of the rack': ['velocity of the rack', 'velocidad de la cremallera'],
	'working.stress concentration at the fillet, for information': [
		'stress concentration at the fillet, for information',
		'concentración de esfuerzo en el filete, como información'
	],
	'working.elastic coefficient of the pair': [
		'elastic coefficient of the pair',
		'coeficiente elástico del par'
	],
	'working.curvature of the flanks at the pitch point': [
		'curvature of the flanks at the pitch point',
		'curvatura de los flancos en el punto de paso'
	],
	'working.contact stress at the pitch point': [
		'contact stress at the pitch point',
		'esfuerzo de contacto en el punto de paso'
	],
	'working.dynamic force that the flanks bear, by contact stress': [
		'dynamic force that the flanks bear, by contact stress',
		'fuerza dinámica que los flancos soportan, por esfuerzo de contacto'
	],
	"working.Poisson's ratio, taken as common for metals": [
		"Poisson's ratio, taken as common for metals",
		'relación de Poisson, tomada como común en metales'
	],
	'working.margin in wear by contact stress': [
		'margin in wear by contact stress',
		'margen a desgaste por esfuerzo de contacto'
	],
	'working.margin in wear by limit load': [
		'margin in wear by limit load',
		'margen a desgaste por carga límite'
	],
	'working.capacity in bending, spare over original': [
		'capacity in bending, spare over original',
		'capacidad a flexión, repuesto entre original'
	],
	'working.capacity in wear, spare over original': [
		'capacity in wear, spare over original',
		'capacidad a desgaste, repuesto entre original'
	],
	'working.measurement over two pins': ['measurement over two pins', 'medida sobre dos rodillos'],
	'working.tip radius of the pinion': ['tip radius of the pinion', 'radio de punta del piñón'],
	'working.base radius of the pinion': ['base radius of the pinion', 'radio base del piñón'],
	'working.from the base circle to the tips of the pinion, along the line of action': [
		'from the base circle to the tips of the pinion, along the line of action',
		'del círculo base a las puntas del piñón, sobre la línea de acción'
	],
	'working.radius where the flank begins of the pinion': [
		'radius where the flank begins of the pinion',
		'radio donde empieza el flanco del piñón'
	],
	'working.from the base circle to where the flank begins of the pinion, along the line of action': [
		'from the base circle to where the flank begins of the pinion, along the line of action',
		'del círculo base al inicio del flanco del piñón, sobre la línea de acción'
	],
	'working.operating pitch radius of the pinion': [
		'operating pitch radius of the pinion',
		'radio de paso de trabajo del piñón'
	],
	'working.arc thickness on the reference circle of the pinion': [
		'arc thickness on the reference circle of the pinion',
		'espesor de arco en el círculo de referencia del piñón'
	],
	'working.arc thickness on the operating pitch circle of the pinion': [
		'arc thickness on the operating pitch circle of the pinion',
		'espesor de arco en el círculo de paso de trabajo del piñón'
	],
	"working.involute of the pinion's pressure angle": [
		"involute of the pinion's pressure angle",
		'involuta del ángulo de presión del piñón'
	],
	"working.radius of the pinion's flank at the pitch point": [
		"radius of the pinion's flank at the pitch point",
		'radio del flanco del piñón en el punto de paso'
	],
	'working.tip radius of the wheel': ['tip radius of the wheel', 'radio de punta de la rueda'],
	'working.base radius of the wheel': ['base radius of the wheel', 'radio base de la rueda'],
	'working.from the base circle to the tips of the wheel, along the line of action': [
		'from the base circle to the tips of the wheel, along the line of action',
		'del círculo base a las puntas de la rueda, sobre la línea de acción'
	],
	'working.radius where the flank begins of the wheel': [
		'radius where the flank begins of the wheel',
		'radio donde empieza el flanco de la rueda'
	],
	'working.from the base circle to where the flank begins of the wheel, along the line of action': [
		'from the base circle to where the flank begins of the wheel, along the line of action',
		'del círculo base al inicio del flanco de la rueda, sobre la línea de acción'
	],
	'working.operating pitch radius of the wheel': [
		'operating pitch radius of the wheel',
		'radio de paso de trabajo de la rueda'
	],
	'working.arc thickness on the reference circle of the wheel': [
		'arc thickness on the reference circle of the wheel',
		'espesor de arco en el círculo de referencia de la rueda'
	],
	'working.arc thickness on the operating pitch circle of the wheel': [
		'arc thickness on the operating pitch circle of the wheel',
		'espesor de arco en el círculo de paso de trabajo de la rueda'
	],
	"working.involute of the wheel's pressure angle": [
		"involute of the wheel's pressure angle",
		'involuta del ángulo de presión de la rueda'
	],
	"working.radius of the wheel's flank at the pitch point": [
		"radius of the wheel's flank at the pitch point",
		'radio del flanco de la rueda en el punto de paso'
	],
	'working.involute of the operating pressure angle': [
		'involute of the operating pressure angle',
		'involuta del ángulo de presión de trabajo'
	],
	'working.line of action between the base circles': [
		'line of action between the base circles',
		'línea de acción entre los círculos base'
	],
	"working.pitch point, from where the line of action leaves the pinion's base circle": [
		"pitch point, from where the line of action leaves the pinion's base circle",
		'punto de paso, desde donde la línea de acción deja el círculo base del piñón'
	],
	"working.where contact begins, from where the line of action leaves the pinion's base circle": [
		"where contact begins, from where the line of action leaves the pinion's base circle",
		'inicio del contacto, desde donde la línea de acción deja el círculo base del piñón'
	],
	"working.where contact ends, from where the line of action leaves the pinion's base circle": [
		"where contact ends, from where the line of action leaves the pinion's base circle",
		'fin del contacto, desde donde la línea de acción deja el círculo base del piñón'
	],
	'working.path of contact': ['path of contact', 'línea de contacto'],
	'working.base pitch': ['base pitch', 'paso base'],
	'working.path of contact between the beginnings of the flanks': [
		'path of contact between the beginnings of the flanks',
		'línea de contacto entre los inicios de los flancos'
	],
	'working.contact ratio between the beginnings of the flanks: it is judged': [
		'contact ratio between the beginnings of the flanks: it is judged',
		'relación de contacto entre los inicios de los flancos: es la que se juzga'
	],
	"working.from the pinion's rolling circle to the rack's tips": [
		"from the pinion's rolling circle to the rack's tips",
		'del círculo de rodadura del piñón a las puntas de la cremallera'
	],
	"working.from the pinion's rolling circle to the rack's reference line": [
		"from the pinion's rolling circle to the rack's reference line",
		'del círculo de rodadura del piñón a la línea de referencia de la cremallera'
	],
	"working.thickness of the pinion's teeth on its rolling circle": [
		"thickness of the pinion's teeth on its rolling circle",
		'espesor de los dientes del piñón en su círculo de rodadura'
	],
	'working.transverse pressure angle': ['transverse pressure angle', 'ángulo de presión transversal'],
	'working.operating pressure angle, by the shifts': [
		'operating pressure angle, by the shifts',
		'ángulo de presión de trabajo, por las correcciones'
	],
	'working.centre distance without backlash, by the shifts': [
		'centre distance without backlash, by the shifts',
		'distancia entre centros sin juego, por las correcciones'
	],
	'working.pitch on the operating pitch circle': [
		'pitch on the operating pitch circle',
		'paso en el círculo de paso de trabajo'
	],
	'working.least radius of the fillet, in modules': [
		'least radius of the fillet, in modules',
		'radio mínimo del filete, en módulos'
	],
	'working.face width at the bad end, standard uncertainties below': [
		'face width at the bad end, standard uncertainties below',
		'ancho de cara en el extremo malo, incertidumbres típicas por debajo'
	],
	'working.load at the bad end, standard uncertainties above': [
		'load at the bad end, standard uncertainties above',
		'carga en el extremo malo, incertidumbres típicas por encima'
	],
	'working.speed at the bad end, standard uncertainties off': [
		'speed at the bad end, standard uncertainties off',
		'velocidad en el extremo malo, incertidumbres típicas de diferencia'
	],
	'working.operating pressure angle, that of the teeth': [
		'operating pressure angle, that of the teeth',
		'ángulo de presión de trabajo, el de los dientes'
	],
	'working.span over k teeth': ['span over k teeth', 'medida sobre k dientes'],

	'expression.as given': ['as given', 'como se dio'],
	'expression.table at N': ['table at N', 'tabla en N'],
	'expression.table, rack': ['table, rack', 'tabla, cremallera'],
	'expression.from the generated tooth': ['from the generated tooth', 'del diente generado'],
	'expression.from the point of the least margin': [
		'from the point of the least margin',
		'del punto de menor margen'
	],
	'expression.from the involute: tan(αw) - π · αw / 180 = invw': [
		'from the involute: tan(αw) - π · αw / 180 = invw',
		'de la involuta: tan(αw) - π · αw / 180 = invw'
	],

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
	'source.first-order reliability': ['first-order reliability', 'fiabilidad de primer orden'],
	'source.first-order propagation': ['first-order propagation', 'propagación de primer orden'],
	'source.95 % one-sided, normal distribution': [
		'95 % one-sided, normal distribution',
		'95 % de un lado, distribución normal'
	],
	'source.Lewis parabola on the generated tooth': [
		'Lewis parabola on the generated tooth',
		'parábola de Lewis en el diente generado'
	],
	'source.as in the AGMA 225 tables (from memory)': [
		'as in the AGMA 225 tables (from memory)',
		'como en las tablas AGMA 225 (de memoria)'
	],
	'source.contact stress by Hertz': ['contact stress by Hertz', 'esfuerzo de contacto de Hertz'],
	"source.Buckingham's limit load for wear": [
		"Buckingham's limit load for wear",
		'carga límite de desgaste de Buckingham'
	],
	'source.involute geometry': ['involute geometry', 'geometría de la evolvente'],
	'source.span over teeth': ['span over teeth', 'medida sobre dientes'],
	'source.measurement over wires': ['measurement over wires', 'medida sobre alambres'],
	'source.common practice': ['common practice', 'práctica común'],
	'source.edition from memory': ['edition from memory', 'edición de memoria'],
	'source.from memory': ['from memory', 'de memoria']
} as const satisfies Record<string, readonly [string, string]>;
