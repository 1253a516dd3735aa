/** Why a text was refused, and what to do: with the field's limits in the unit that is being typed. */
import type { Words } from '$lib/i18n/context.svelte';
import { figure } from '$lib/i18n/format';
import { fromSI } from '$lib/gear/quantity';
import { isPlain, type ReadingUnit } from '$lib/records/reading';
import type { Field } from './fields';
import type { EntryProblem } from './number-entry';

export function limitWords(
	problem: EntryProblem,
	field: Field,
	unit: ReadingUnit,
	{ t, language }: Words
): string {
	const shown = (limit: number) =>
		`${figure(isPlain(unit) ? limit : fromSI(limit, unit), 3, language)} ${t(`unit.${unit}`)}`;
	return t(`entry.${problem}`, {
		field: t(`field.${field.name}`),
		least: shown(field.least),
		most: shown(field.most)
	});
}
