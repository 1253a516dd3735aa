/** Words of the plant's list of materials: what is stated, by whom, and what a form that cannot be used needs. */
export const materials = {
	'materials.title': ['Materials', 'Materiales'],
	'materials.lead': [
		"the plant's list, with allowable stresses and their sources",
		'la lista de la planta, con esfuerzos admisibles y sus fuentes'
	],
	'materials.permitted': ['Permitted', 'Permitidos'],
	'materials.not-permitted': ['Not permitted', 'No permitidos'],
	'materials.is-permitted': ['permitted', 'permitido'],
	'materials.is-not-permitted': ['not permitted', 'no permitido'],
	'materials.permitted-from': ['permitted from {day}', 'permitido desde {day}'],
	'materials.none-permitted': [
		'No material is permitted. Every check will say so until a supervisor permits one.',
		'Ningún material está permitido. Toda verificación lo dirá hasta que un supervisor permita uno.'
	],
	'materials.none': ['The list is empty.', 'La lista está vacía.'],
	'materials.none-supervisor': [
		'Add the first material: its allowable stress needs a source and an edition.',
		'Agregue el primer material: su esfuerzo admisible necesita fuente y edición.'
	],
	'materials.none-planner': [
		'A supervisor adds the first material. Until then no check can carry.',
		'Un supervisor agrega el primer material. Hasta entonces ninguna verificación puede soportar.'
	],
	'materials.add': ['Add a material', 'Agregar material'],
	'materials.revise': ['Revise', 'Revisar'],
	'materials.open': ['Open', 'Abrir'],
	'materials.column.name': ['Material', 'Material'],
	'materials.column.allowable': ['Allowable bending', 'Flexión admisible'],
	'materials.column.hardness': ['Brinell', 'Brinell'],
	'materials.column.source': ['Source and edition', 'Fuente y edición'],
	'materials.column.revision': ['Revision', 'Revisión'],

	'material.read-only': [
		'Only a supervisor changes this list. Ask one if a value or a permission is wrong.',
		'Solo un supervisor cambia esta lista. Pregunte a uno si un valor o un permiso está mal.'
	],
	'material.in-force': ['In force: revision {n}', 'Vigente: revisión {n}'],
	'material.revisions': ['All revisions', 'Todas las revisiones'],
	'material.revision': ['Revision {n}', 'Revisión {n}'],
	'material.made-by': ['Made by {name}', 'Hecha por {name}'],
	'material.new': ['A new material', 'Un material nuevo'],
	'material.new-text': [
		'It becomes revision 1. Tablets take it with their next pull.',
		'Será la revisión 1. Las tabletas la reciben en su próxima consulta.'
	],
	'material.revise': ['Make revision {n}', 'Hacer la revisión {n}'],
	'material.revise-text': [
		'Past checks keep the revision they were made with. Tablets take the new one with their next pull.',
		'Las verificaciones pasadas conservan su revisión. Las tabletas reciben la nueva en su próxima consulta.'
	],
	'material.keep': ['Put revision {n} in force', 'Poner en vigor la revisión {n}'],
	'material.keeping': ['Keeping …', 'Guardando …'],
	'material.kept': [
		'Revision {n} is in force. Tablets take it with their next pull.',
		'La revisión {n} está vigente. Las tabletas la reciben en su próxima consulta.'
	],
	'material.leave': ['Back without changing', 'Volver sin cambiar'],
	'material.stale': [
		'{name} made revision {n} while this form was open. What you typed is kept. Fields that differ show what revision {n} says; compare, then put yours in force as revision {next}.',
		'{name} hizo la revisión {n} mientras este formulario estaba abierto. Lo escrito se conserva. Los campos que difieren muestran lo que dice la revisión {n}; compare y ponga en vigor la suya como revisión {next}.'
	],
	'material.now-says': ['Revision {n} says: {text}', 'La revisión {n} dice: {text}'],
	'material.says-nothing': ['nothing', 'nada'],
	'material.problems': ['{n} fields need a change.', '{n} campos necesitan un cambio.'],
	'material.problems#one': ['{n} field needs a change.', '{n} campo necesita un cambio.'],
	'material.nothing-lost': [
		'Nothing was kept in the plant yet, and nothing you typed is lost.',
		'Aún no se guardó nada en la planta, y nada de lo escrito se pierde.'
	],
	'material.unreachable': [
		'The server could not be reached. What you typed is still here: try again in a moment.',
		'No se pudo contactar con el servidor. Lo escrito sigue aquí: intente de nuevo en un momento.'
	],
	'material.signed-out': [
		'You were signed out. What you typed is still here: sign in in another window, then try again.',
		'Su sesión se cerró. Lo escrito sigue aquí: inicie sesión en otra ventana e intente de nuevo.'
	],
	'material.not-allowed': [
		'Your role at this plant may not change materials any more. What you typed is still here: show it to a supervisor.',
		'Su función en esta planta ya no puede cambiar materiales. Lo escrito sigue aquí: muéstrelo a un supervisor.'
	],
	'material.sign-in': ['Sign in in another window', 'Iniciar sesión en otra ventana'],
	'material.required': [
		'All fields are needed, unless they say optional.',
		'Todos los campos son necesarios, salvo los opcionales.'
	],
	'material.optional': ['optional', 'opcional'],
	'material.yes': ['yes', 'sí'],
	'material.no': ['no', 'no'],

	'material.group.what': ['What it is', 'Qué es'],
	'material.group.allowable': ['What it may carry', 'Qué puede soportar'],
	'material.group.more': ['Hardness and stiffness', 'Dureza y rigidez'],
	'material.group.source': ['Where the values come from', 'De dónde vienen los valores'],
	'material.group.permission': ['Permission', 'Permiso'],
	'material.field.name': ['Name and grade', 'Nombre y grado'],
	'material.field.condition': ['Condition', 'Condición'],
	'material.field.metallic': ['Is it a metal?', '¿Es un metal?'],
	'material.field.permitted': ['Permitted at this plant?', '¿Permitido en esta planta?'],
	'material.field.allowableBending': ['Allowable bending stress', 'Esfuerzo de flexión admisible'],
	'material.field.allowableBendingUnit': ['Unit of the allowable stress', 'Unidad del esfuerzo admisible'],
	'material.field.basis': ['Basis of the allowable stress', 'Base del esfuerzo admisible'],
	'material.field.brinellLow': ['Brinell hardness, lowest', 'Dureza Brinell, mínima'],
	'material.field.brinellHigh': ['Brinell hardness, highest', 'Dureza Brinell, máxima'],
	'material.field.modulus': ['Modulus of elasticity', 'Módulo de elasticidad'],
	'material.field.modulusUnit': ['Unit of the modulus', 'Unidad del módulo'],
	'material.field.poisson': ["Poisson's ratio", 'Relación de Poisson'],
	'material.field.source': ['Source', 'Fuente'],
	'material.field.edition': ['Edition', 'Edición'],
	'material.field.validFrom': ['Valid from', 'Válido desde'],
	'material.hint.condition': ['Such as normalised, or as cast.', 'Por ejemplo normalizado, o de fundición.'],
	'material.hint.metallic': ['Decides which velocity law applies.', 'Decide qué ley de velocidad se aplica.'],
	'material.hint.allowableBending': [
		'For one-way loading, without velocity or service factor. Write 8500, not 8,500.',
		'Para carga en un sentido, sin factor de velocidad ni de servicio. Escriba 8500, no 8,500.'
	],
	'material.hint.basis': ['How the value was come by.', 'Cómo se obtuvo el valor.'],
	'material.hint.brinell': ['At 3,000 kgf, between 20 and 750.', 'Con 3,000 kgf, entre 20 y 750.'],
	'material.hint.poisson': ['Between 0 and 0.5.', 'Entre 0 y 0.5.'],
	'material.hint.source': [
		'Standard, book, certificate or test report.',
		'Norma, libro, certificado o informe de ensayo.'
	],
	'material.hint.edition': ['Year or edition of the source.', 'Año o edición de la fuente.'],
	'material.hint.validFrom': [
		'A check made before this day does not count it as permitted.',
		'Una verificación anterior a este día no lo cuenta como permitido.'
	],
	'material.problem.missing': ['{field} is missing: type it.', 'Falta: {field}. Escríbalo.'],
	'material.problem.too-long': [
		'{field}: at most {most} characters. Shorten it.',
		'{field}: no más de {most} caracteres. Acórtelo.'
	],
	'material.problem.choose': ['{field}: choose one.', '{field}: elija una opción.'],
	'material.problem.comma': [
		'{field}: write the number without a comma, and with a point for decimals.',
		'{field}: escriba el número sin coma, y con punto para los decimales.'
	],
	'material.problem.not-a-number': [
		'{field}: write one plain number, such as 8500 or 0.3.',
		'{field}: escriba un solo número, como 8500 o 0.3.'
	],
	'material.problem.not-positive': [
		'{field}: the value must be greater than zero.',
		'{field}: el valor debe ser mayor que cero.'
	],
	'material.problem.too-large': [
		'{field} is beyond any gear material: check the unit.',
		'{field}: supera cualquier material de engrane. Revise la unidad.'
	],
	'material.problem.not-whole': [
		'{field}: write a whole Brinell number.',
		'{field}: escriba un número Brinell entero.'
	],
	'material.problem.brinell-range': [
		'{field}: a Brinell number lies between 20 and 750.',
		'{field}: un número Brinell está entre 20 y 750.'
	],
	'material.problem.upper-below-lower': [
		'{field} must not be below the lowest: exchange the two.',
		'{field}: no debe ser menor que la mínima. Intercámbielas.'
	],
	'material.problem.poisson-range': ['{field} lies between 0 and 0.5.', '{field}: está entre 0 y 0.5.'],
	'material.problem.no-date': [
		'{field}: choose a day of the calendar (year-month-day).',
		'{field}: elija un día del calendario (año-mes-día).'
	]
} as const satisfies Record<string, readonly [string, string]>;
