/** How often a length was read and how far the takes lie apart: "3rd of 3, spread 0.003". */
import type { Words } from '$lib/i18n/context.svelte';
import { fixed } from '$lib/i18n/format';
import { takesOf, type Reading } from '$lib/records/reading';

/** Null for a single take. */
export function repeatWords(reading: Reading, { t, language }: Words): string | null {
	const { unit } = reading;
	if (!reading.earlier?.length || (unit !== 'in' && unit !== 'mm')) return null;
	const takes = takesOf(reading as Reading<'in' | 'mm'>);
	const spread = Math.max(...takes) - Math.min(...takes);
	return t('measure.repeats', { n: takes.length, spread: fixed(spread, unit === 'in' ? 3 : 2, language) });
}
