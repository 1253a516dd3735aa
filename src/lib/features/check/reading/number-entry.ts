/**
 * From keys to a reading. The text stays as typed; what it means is worked out here, and what it cannot mean is
 * refused with a code that the words for people explain. A space parts the whole number from its fraction.
 */
import type { PadKey } from '$lib/ui/keypad/keys';
import type { ReadingUnit } from '$lib/records/reading';
import { inLimitUnit, type Field } from './fields';

export type EntryProblem =
	| 'empty'
	| 'two-points'
	| 'bare-point'
	| 'comma'
	| 'not-whole'
	| 'half-fraction'
	| 'fraction-over-one'
	| 'no-fractions'
	| 'not-a-number'
	| 'wrong-unit'
	| 'too-small'
	| 'too-large';

export type Entry = { ok: true; value: number; unit: ReadingUnit } | { ok: false; problem: EntryProblem };

/** What a key makes of the text. A key that cannot go on from here leaves the text as it is. */
export function afterKey(text: string, key: PadKey): string {
	// A fraction's line and its number came with one key and go with one.
	if (key === 'erase') return /\/\d+$/.test(text) ? text.replace(/\/\d+$/, '') : text.slice(0, -1);
	if (key === 'unit') return text;
	if (key === 'and') return /^\d+$/.test(text) ? `${text} ` : text;
	if (key.startsWith('/')) return /(^| )\d+$/.test(text) ? text + key : text;
	if (text.includes('/') || text.length >= 12) return text;
	return text + key;
}

const FRACTION = /^(?:(\d+) )?(\d+)\/(2|4|8|16|32|64)$/;
/** Units that a calliper or a habit puts behind the figure. What stands there counts before the unit of the field. */
const SUFFIXES: readonly [RegExp, ReadingUnit][] = [
	[/mm\.?$/i, 'mm'],
	[/(in|inch|inches)\.?$|["″]$/i, 'in'],
	[/hp$/i, 'hp'],
	[/kw$/i, 'kW'],
	[/w$/i, 'W'],
	[/rpm$/i, 'rpm'],
	[/n[·*]?m$/i, 'N*m'],
	[/lbf?[·*-]?ft$/i, 'lbf*ft'],
	[/lbf?[·*-]?in$/i, 'lbf*in'],
	[/(°|deg)$/i, 'deg'],
	[/teeth$/i, 'teeth']
];

function apart(text: string): { figure: string; unit: ReadingUnit | null } {
	const clean = text.trim().replace(/\s+/g, ' ');
	// "lbf·in" ends in "in" too: the longest match is the unit that was meant.
	const found = SUFFIXES.map(([pattern, unit]) => ({ unit, at: clean.search(pattern) }))
		.filter(({ at }) => at >= 0)
		.sort((a, b) => a.at - b.at)[0];
	return found
		? { figure: clean.slice(0, found.at).trim(), unit: found.unit }
		: { figure: clean, unit: null };
}

/** The figure a text means, within what is possible for the field. */
export function readEntry(text: string, field: Field, unit: ReadingUnit): Entry {
	const { figure, unit: typed } = apart(text);
	if (typed && !field.units.includes(typed)) return { ok: false, problem: 'wrong-unit' };
	const meant = typed ?? unit;
	const parsed = parse(figure, field);
	if (!parsed.ok) return parsed;
	const value = inLimitUnit(parsed.value, meant);
	if (value < field.least) return { ok: false, problem: 'too-small' };
	if (value > field.most) return { ok: false, problem: 'too-large' };
	return { ...parsed, unit: meant };
}

function parse(
	text: string,
	field: Field
): { ok: true; value: number } | { ok: false; problem: EntryProblem } {
	if (text === '') return { ok: false, problem: 'empty' };
	if (text.includes('/')) {
		if (!field.fractions) return { ok: false, problem: 'no-fractions' };
		const match = FRACTION.exec(text);
		if (!match) return { ok: false, problem: 'half-fraction' };
		const [, whole = '0', over, under] = match;
		if (Number(over) >= Number(under)) return { ok: false, problem: 'fraction-over-one' };
		return { ok: true, value: Number(whole) + Number(over) / Number(under) };
	}
	// "1,250" is one and a quarter here and twelve hundred and fifty there: asked about, never guessed.
	if (text.includes(',')) return { ok: false, problem: 'comma' };
	if ((text.match(/\./g) ?? []).length > 1) return { ok: false, problem: 'two-points' };
	if (text === '.') return { ok: false, problem: 'bare-point' };
	if (/^\d+ \d+$/.test(text) || /^\d+ $/.test(text)) return { ok: false, problem: 'half-fraction' };
	if (!/^(\d+\.?\d*|\.\d+)$/.test(text)) return { ok: false, problem: 'not-a-number' };
	const value = Number(text);
	if (field.whole && !Number.isInteger(value)) return { ok: false, problem: 'not-whole' };
	return { ok: true, value };
}

/** How the text is echoed: the space before a fraction shows, an open fraction too. */
export function shownEntry(text: string): string {
	return text.replace(/ $/, ' _');
}
