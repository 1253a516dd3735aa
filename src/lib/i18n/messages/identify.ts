/** Words of the candidates: what fits, how each reading lies against it, and what to read next. */
export const identify = {
	'gears.label': ['Gears that fit the readings', 'Engranes que coinciden con las lecturas'],
	'gears.row': ['{name}, {percent} per cent', '{name}, {percent} por ciento'],
	'gears.several': ['{n} gears fit what you measured', '{n} engranes coinciden con lo medido'],
	'gears.one': ['One gear fits what you measured', 'Un engrane coincide con lo medido'],
	'gears.none': ['No involute gear fits this', 'Ningún engrane de evolvente coincide'],
	'gears.nothing': ['Which gear is it?', '¿Qué engrane es?'],
	'gears.nothing-text': [
		'The readings do not tell its size yet. Measure the teeth and the outside diameter, or choose it by hand from the drawing or the stamp.',
		'Las lecturas aún no dicen su tamaño. Mida los dientes y el diámetro exterior, o elíjalo a mano según el plano o el sello.'
	],
	'gears.none-of-these': ['No involute gear fits', 'Ningún engrane coincide'],
	'gears.true-scale': ['True scale', 'Tamaño real'],
	'gears.by-hand': ['Choose by hand', 'Elegir a mano'],
	'gears.go-on': ['Go on: the weakest of the {n} decides', 'Seguir: decide el más débil de los {n}'],
	'gears.go-on#one': ['Go on with this gear', 'Seguir con este engrane'],
	'gears.go-on-with': ['Go on with {name}', 'Seguir con {name}'],
	'gears.go-on-without': ['Go on without a gear', 'Seguir sin engrane'],
	'gears.more': ['{n} more, {percent} % together', '{n} más, {percent} % en total'],
	'gears.fewer': ['The likeliest only', 'Solo los más probables'],
	'gears.other-count': ['{teeth} teeth, counted {counted}', '{teeth} dientes, contados {counted}'],
	'gears.clear-lead': ['The readings tell it', 'Las lecturas lo dicen'],
	'gears.clear-text': [
		'A drawing, a stamp or the mate still goes before the readings.',
		'Un plano, un sello o el par van antes que las lecturas.'
	],
	'gears.take': ['Take this gear', 'Tomar este engrane'],
	'gears.look-again': ['Look at this reading again', 'Revise esta lectura'],
	'gears.look-again-text': [
		'It speaks against all others. A count off by one, the wrong unit or two digits swapped are the usual reasons; teeth that are no involute are another.',
		'Contradice a las demás. Un conteo errado por uno, la unidad equivocada o dos cifras cambiadas son lo usual; dientes que no son de evolvente también.'
	],

	'misfit.fits': ['{reading}: fits', '{reading}: coincide'],
	'misfit.low': ['{size} low', '{size} de menos'],
	'misfit.high': ['{size} high', '{size} de más'],
	'misfit.off': ['{reading}: reads {way}', '{reading}: lee {way}'],
	'misfit.look-again': ['{reading}: reads {way}, look again', '{reading}: lee {way}, revise'],
	'misfit.tip': ['{reading}: reads {way}: worn tip?', '{reading}: lee {way}: ¿punta gastada?'],
	'misfit.flank': ['{reading}: reads {way}: worn flanks?', '{reading}: lee {way}: ¿flancos gastados?'],
	'misfit.shift': ['{reading}: fits only with the shift', '{reading}: coincide solo con la corrección'],

	'next.best': ['Next best reading', 'La mejor lectura siguiente'],
	'next.tells': ['Next best reading: tells {a} from {b}', 'Mejor lectura: separa {a} de {b}'],
	'next.expected': ['It would read ({unit})', 'Leería ({unit})'],
	'next.expected-difference': ['The second less the first ({unit})', 'La segunda menos la primera ({unit})'],
	'next.two-spans': ['Span over {one}, then {two} teeth', 'Sobre {one} y luego {two} dientes'],
	'next.measure': ['Measure it', 'Medirla'],
	'next.measure-first': ['Measure', 'Medir'],
	'next.measure-again': ['Measure it again', 'Medir otra vez'],
	'next.nothing': ['Nothing more would tell', 'Nada más los separa'],
	'next.nothing-text': [
		'What can still be measured would not tell these gears apart. Go on with all of them, or look for a drawing, a stamp or the mate.',
		'Lo que aún se puede medir no separa estos engranes. Siga con todos, o busque un plano, un sello o el par.'
	]
} as const satisfies Record<string, readonly [string, string]>;
