/**
 * The working as a person reads it: names and the prose of sources in the language of the page, figures with their
 * unit, and the inch unit beside it where the machine is an inch one. Symbols and titles of books stay.
 */
import type { LimitName, WorkingLine } from '$lib/gear/contract';
import { fromSI, type Unit } from '$lib/gear/quantity';
import { isMessage } from '$lib/i18n/catalogue';
import type { Words } from '$lib/i18n/context.svelte';
import { figure } from '$lib/i18n/format';

export interface WorkingRow {
	symbol: string;
	name: string;
	/** With symbols, as the method is written. */
	expression: string;
	/** The same with figures put in. */
	numbers: string;
	value: string;
	unit: string;
	/** Figure and unit in inch units; empty where the line has none. */
	inch: string;
	source: string;
}

const INCH_UNIT: Readonly<Record<string, { unit: Unit; shown: string }>> = {
	mm: { unit: 'in', shown: 'in' },
	'm/s': { unit: 'ft/min', shown: 'ft/min' },
	N: { unit: 'lbf', shown: 'lbf' },
	MPa: { unit: 'psi', shown: 'psi' },
	W: { unit: 'hp', shown: 'hp' },
	'N·m': { unit: 'lbf*ft', shown: 'lbf·ft' }
};

export function workingRows(lines: readonly WorkingLine[], words: Words): WorkingRow[] {
	return lines.map(({ symbol, name, expression, numbers, value, unit, source, of }) => ({
		symbol,
		name: nameWords(name, of, words),
		expression: translated(`expression.${expression}`, expression, words),
		// A figure that is read, not computed, has no numbers to put in.
		numbers: numbers === expression ? '' : numbersWords(numbers, words),
		value: shown(value, words),
		unit: unit === '1' ? '' : unit,
		inch: inchWords(value, unit, words),
		source: sourceWords(source, words)
	}));
}

/**
 * Where the margin that decides stands among the lines; -1 where there is none. Wear is the lesser of its two
 * methods. An outcome of a core before 1.0.0 does not say what decides: bending of this gear, all that it knew.
 */
export function decidingLine(lines: readonly WorkingLine[], limitedBy?: LimitName | null): number {
	const among = (belongs: (line: WorkingLine) => boolean) =>
		lines.filter(belongs).sort((a, b) => a.value - b.value)[0];
	const line =
		limitedBy === 'wear'
			? among(({ symbol }) => symbol === 'Mc' || symbol === 'Mw')
			: among(({ symbol, of }) => symbol === 'M' && (of === 'mate') === (limitedBy === 'mate-bending'));
	return line ? lines.indexOf(line) : -1;
}

function nameWords(name: string, of: WorkingLine['of'], words: Words): string {
	const told = translated(`working.${name}`, name, words);
	return of ? words.t(`working-of.${of}`, { name: told }) : told;
}

/** "definition; Mott, Machine Elements …": what is prose is translated, a title is not. */
export function sourceWords(source: string, words: Words): string {
	return source
		.split('; ')
		.map((part) => translated(`source.${part}`, part, words))
		.join('; ')
		.replace(/(edition from memory|from memory)/g, (remark) => translated(`source.${remark}`, remark, words));
}

/** Figures read the same everywhere; only a line of a table is put in words. */
function numbersWords(numbers: string, words: Words): string {
	const entry = /^table at (.+)$/.exec(numbers)?.[1];
	return entry ? words.t('expression.table at N').replace('N', entry) : numbers;
}

function inchWords(value: number, unit: string, words: Words): string {
	const inch = INCH_UNIT[unit];
	return inch ? `${shown(fromSI(value, inch.unit), words)} ${inch.shown}` : '';
}

/** Five significant digits: enough to follow the working with a pocket calculator. */
function shown(value: number, { language }: Words): string {
	return figure(value, 5, language);
}

function translated(key: string, otherwise: string, { t }: Words): string {
	return isMessage(key) ? t(key) : otherwise;
}
