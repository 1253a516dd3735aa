/** Words of the plant's rules. */
export const rules = {
	'rules.title': ['Rules of the plant', 'Reglas de la planta'],
	'rules.tools': ['Tools', 'Herramientas'],
	'rules.tools-text': [
		'How far nineteen in twenty readings by each tool can be trusted. It decides how sharply a gear is told from its look-alikes. An empty field is what is usual in a shop, from memory. A record keeps the figures it was made with.',
		'Hasta dónde se puede confiar en diecinueve de veinte lecturas de cada herramienta. Decide con qué nitidez se distingue un engrane de sus parecidos. Un campo vacío es lo usual en un taller, de memoria. Un registro conserva las cifras con que se hizo.'
	],
	'rules.tool': ['Tool', 'Herramienta'],
	'rules.good-to': ['Good to', 'Confiable hasta'],
	'rules.in-inches': ['In inches', 'En pulgadas'],
	'rules.usual': ['Usual', 'Usual'],
	'rules.keep': ['Make revision {n}', 'Hacer la revisión {n}'],
	'rules.kept': [
		'Revision {n} is in force. Tablets take it over when they next hear from the plant.',
		'La revisión {n} está en vigor. Las tabletas la toman en su próximo contacto con la planta.'
	],
	'rules.stale': [
		'Someone made revision {n} while this form was open. What you typed is still here: compare it, then make the next revision.',
		'Alguien hizo la revisión {n} mientras este formulario estaba abierto. Lo escrito sigue aquí: compárelo y haga la siguiente.'
	],
	'rules.tool.comma': [
		'{tool}: a comma can mean two things. Type a point for decimals.',
		'{tool}: una coma puede significar dos cosas. Use un punto para decimales.'
	],
	'rules.tool.not-a-number': [
		'{tool}: type a figure, or leave it empty for what is usual.',
		'{tool}: escriba una cifra o déjelo vacío para lo usual.'
	],
	'rules.tool.out-of-range': [
		'{tool}: between {least} and {most}. Check the point.',
		'{tool}: entre {least} y {most}. Revise el punto.'
	]
} as const satisfies Record<string, readonly [string, string]>;
