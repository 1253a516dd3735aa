/**
 * A coded reason of the core in the language of the page. A code that the catalogue does not hold yet is shown in
 * the core's own English sentence, so that no reason is ever swallowed.
 */
import type { Outcome, Reason } from '$lib/gear/contract';
import { fromSI } from '$lib/gear/quantity';
import { isMessage, type Values } from '$lib/i18n/catalogue';
import type { Words } from '$lib/i18n/context.svelte';
import { figure, fixed, margin } from '$lib/i18n/format';

/** Values that are codes themselves, and where their words stand. */
const CODED: Record<string, string> = {
	field: 'missing',
	law: 'gear.law',
	kind: 'gear.kind'
};

export function reasonWords(reason: Reason, words: Words): string {
	const key = `reason.${reason.code}`;
	return isMessage(key) ? words.t(key, valuesOf(reason, words)) : reason.text;
}

/** For a row of a table: a few words where the catalogue has them, the whole sentence where it has not. */
export function reasonInShort(reason: Reason, words: Words): string {
	const key = `reason-short.${reason.code}`;
	return isMessage(key) ? words.t(key, valuesOf(reason, words)) : reasonWords(reason, words);
}

function valuesOf(reason: Reason, words: Words): Values {
	const values: Values = {};
	for (const [name, value] of Object.entries(reason.values ?? {})) {
		values[name] =
			typeof value === 'number' ? numberWords(name, value, words) : codeWords(name, value, words);
	}
	return values;
}

function numberWords(name: string, value: number, { language }: Words): string {
	switch (name) {
		case 'margin':
		case 'low':
			return margin(value, language);
		case 'needed':
			return fixed(value, 2, language);
		case 'gear':
		case 'mate':
			return fixed(value, 3, language);
		case 'backlash':
		case 'jam':
		case 'least':
		case 'most':
		case 'contactRatio':
		case 'left':
		case 'whole':
		case 'wear':
			return fixed(value, 2, language);
		case 'velocity':
		case 'end':
			return `${fixed(value, 2, language)} m/s (${fixed(fromSI(value, 'ft/min'), 0, language)} ft/min)`;
		default:
			return figure(value, 4, language);
	}
}

function codeWords(name: string, value: string, { t }: Words): string {
	const key = `${CODED[name]}.${value}`;
	return isMessage(key) ? t(key) : value;
}

/** The one sentence under the verdict. Figures stand beside it already, so a margin is not told twice. */
export function verdictSentence({ verdict, reasons, limitedBy }: Outcome, words: Words): string {
	const [first] = reasons;
	if (verdict === 'not-permitted') {
		return words.t('verdict.say.not-permitted', { material: String(first?.values?.material ?? '') });
	}
	if (first?.code === 'missing') return words.t('verdict.say.missing');
	if (verdict === 'cannot-say') return first ? reasonWords(first, words) : '';
	if (verdict === 'will-not-carry') return words.t(`verdict.decides.${limitedBy ?? 'gear-bending'}`);
	// Sent to review by a rule, not by its low end.
	if (verdict === 'close' && first && !isMargin(first)) return reasonWords(first, words);
	return words.t(`verdict.say.${verdict}`);
}

/** The margin that decided: its figures stand in the panel and the table. */
function isMargin({ code }: Reason): boolean {
	return /^(mate-bending|bending|wear)-margin/.test(code);
}

/** What stands below: every reason that the sentence and the figures do not tell. */
export function otherReasons({ reasons }: Outcome): Reason[] {
	return reasons.slice(1).filter((reason) => reason.code !== 'missing' && !isMargin(reason));
}

/** The answers that are still missing, by the codes of records/assemble.ts. */
export function missingFields({ reasons }: Outcome): string[] {
	return reasons.filter(({ code }) => code === 'missing').map(({ values }) => String(values?.field));
}
