/** What is said of a drawn gear, of one that cannot be drawn, and on the printed page. */
import type { Reason } from '$lib/gear/contract';
import { isMessage, type Values } from '$lib/i18n/catalogue';
import type { Words } from '$lib/i18n/context.svelte';
import { day, figure, fixed } from '$lib/i18n/format';
import type { StripDrawing } from './strip-gear';
import type { PdfWords } from './strip-pdf';

/** "First tip to last: 73.20 mm (2.882 in), 5 of 25 teeth" */
export function captionWords({ overTips, drawn, teeth }: StripDrawing, { t, language }: Words): string {
	return t('strip.caption', {
		mm: fixed(overTips, 2, language),
		in: fixed(overTips / 25.4, 3, language),
		drawn,
		teeth
	});
}

/** The catalogue speaks of strength where a code has no words of its own for drawing. */
export function refusalWords({ code, text, values = {} }: Reason, { t, language }: Words): string {
	const key = [`strip.reason.${code}`, `reason.${code}`].find(isMessage);
	const said: Values = Object.fromEntries(
		Object.entries(values).map(([name, value]) => [
			name,
			typeof value === 'number' ? figure(value, 4, language) : value
		])
	);
	return key ? t(key, said) : text;
}

export function pdfWords(words: Words, madeAt: Date): PdfWords {
	const { t, language } = words;
	return {
		title: t('strip.title'),
		date: t('strip.pdf.made', { date: day(madeAt, language) }),
		aid: `${t('strip.aid')} ${t('strip.aid-rest')}`,
		printing: t('strip.pdf.printing'),
		check: t('strip.pdf.check'),
		caution: `${t('strip.pdf.caution')} ${t('caution.page')}`,
		caption: (drawing) => captionWords(drawing, words),
		refused: (reason) => refusalWords(reason, words),
		leftOut: (n) => t('strip.pdf.left-out', { n })
	};
}
