/** Words of the door: signing in and out, roles, and choosing the plant. */
export const door = {
	'door.sign-in': ['Sign in', 'Iniciar sesión'],
	'door.sign-in.busy': ['Signing in …', 'Iniciando sesión …'],
	'door.sign-out': ['Sign out', 'Cerrar sesión'],
	'door.purpose': [
		'What gear is it, and will the spare carry the load?',
		'¿Qué engrane es, y soportará la carga el repuesto?'
	],
	'door.tally.millwright': [
		'On a tablet at the machine, also for days without a network',
		'En una tableta junto a la máquina, también días sin red'
	],
	'door.tally.planner': [
		'In the office: which machine needs a decision',
		'En la oficina: qué máquina necesita una decisión'
	],
	'door.tally.supervisor': [
		"The plant's materials, with their sources",
		'Los materiales de la planta, con sus fuentes'
	],
	'door.email': ['E-mail', 'Correo electrónico'],
	'door.password': ['Password', 'Contraseña'],
	'door.email-missing': ['Type your e-mail address.', 'Escriba su correo electrónico.'],
	'door.password-missing': ['Type your password.', 'Escriba su contraseña.'],
	'door.incomplete': ['Something is missing. See the field below.', 'Falta algo. Vea el campo de abajo.'],
	'door.wrong': [
		'E-mail and password do not belong together. Check the e-mail and type the password again.',
		'El correo y la contraseña no corresponden. Revise el correo y escriba otra vez la contraseña.'
	],
	'door.no-plant': [
		'This account works at no plant here. Ask a supervisor of your plant to let you in.',
		'Esta cuenta no trabaja en ninguna planta aquí. Pida acceso a un supervisor de su planta.'
	],
	'door.busy': [
		'The plant cannot be reached just now. Wait a moment and sign in again. What this tablet keeps is not lost.',
		'No se puede contactar con la planta ahora. Espere un momento e inicie sesión otra vez. Lo guardado en esta tableta no se pierde.'
	],
	'door.signed-in-nowhere': [
		'{name}, you are signed in but work at no plant here any more. Ask a supervisor, or sign in as someone else.',
		'{name}, su sesión está abierta pero ya no trabaja en ninguna planta aquí. Pregunte a un supervisor o inicie sesión como otra persona.'
	],
	'role.millwright': ['Millwright', 'Mecánico'],
	'role.planner': ['Planner', 'Planificador'],
	'role.supervisor': ['Supervisor', 'Supervisor']
} as const satisfies Record<string, readonly [string, string]>;
