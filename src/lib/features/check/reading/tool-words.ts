/** How good a tool is, for people: twice its standard uncertainty, so that nineteen in twenty readings lie within. */
import { fromSI } from '$lib/gear/quantity';
import type { Words } from '$lib/i18n/context.svelte';
import { figure } from '$lib/i18n/format';

/** @param uncertainty standard, in mm or degrees */
export function toolWords(uncertainty: number, unit: 'in' | 'mm' | 'deg', { t, language }: Words): string {
	if (unit === 'deg') return t('tool.good-to-angle', { size: figure(2 * uncertainty, 2, language) });
	const size = figure(fromSI(2 * uncertainty, unit), unit === 'in' ? 1 : 2, language);
	return t('tool.good-to', { size, unit: t(`unit.${unit}`) });
}
