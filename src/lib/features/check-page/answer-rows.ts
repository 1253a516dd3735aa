/**
 * The answers of a check as rows of a page: the text as typed with its own unit, the other unit smaller, and where
 * it came from. What was not given says so; nothing is filled in.
 */
import { otherUnit } from '$lib/features/check/reading/fields';
import { fromSI, toSI } from '$lib/gear/quantity';
import { isMessage } from '$lib/i18n/catalogue';
import type { Words } from '$lib/i18n/context.svelte';
import { figure } from '$lib/i18n/format';
import { pitchWords } from '$lib/i18n/gear-words';
import type { CheckAnswers } from '$lib/records/check';
import { isReading, type AnsweredReading, type ReadingUnit } from '$lib/records/reading';

export interface AnswerRow {
	label: string;
	/** As typed, with its unit; or the words for what was not given. */
	typed: string;
	/** Whether there is an answer to read at all. */
	given: boolean;
	other: string;
	source: string;
}

const MEASURED = ['teeth', 'outsideDiameter', 'faceWidth'] as const;
const LOADS = ['power', 'torque'] as const;

export function readingRows(answers: CheckAnswers, words: Words): AnswerRow[] {
	const { t } = words;
	const byHand = t('check-page.from.hand');
	return [
		...MEASURED.map((name) => readingRow(t(`field.${name}`), answers[name], words)),
		chosenRow(t('field.pitch'), answers.pitch ? pitchWords(answers.pitch, words) : '', byHand, words),
		chosenRow(
			t('field.pressureAngle'),
			answers.pressureAngle === null ? '' : `${answers.pressureAngle}°`,
			byHand,
			words
		),
		chosenRow(t('field.form'), answers.form ? t(`gear.form.${answers.form}`) : '', byHand, words)
	];
}

/** @param material the spare's, with its allowable stress in words; null where none was chosen */
export function driveRows(
	answers: CheckAnswers,
	words: Words,
	material: { name: string; stress: string } | null
): AnswerRow[] {
	const { t } = words;
	const basis = answers.loadBasis ? t(`drive.basis.${answers.loadBasis}`) : '';
	const loads = LOADS.filter((name) => answers.loadKind === name).map((name) => ({
		...readingRow(t(`field.${name}`), answers[name], words),
		...(basis ? { source: basis } : {})
	}));
	const unknown: AnswerRow[] =
		answers.loadKind === 'unknown'
			? [plainRow(t('field.load'), t('check-page.load-unknown'), '')]
			: answers.loadKind === null
				? [chosenRow(t('field.load'), '', '', words)]
				: [];
	const factor = readingRow(t('field.serviceFactor'), answers.serviceFactor, words);
	return [
		...loads,
		...unknown,
		readingRow(t('field.speed'), answers.speed, words),
		{ ...factor, other: answers.duty ? t(`drive.duty.${answers.duty}`) : '' },
		plainRow(t('check-page.loading'), t(answers.reversing ? 'drive.reversing' : 'check-page.one-way'), ''),
		{
			...chosenRow(t('field.material'), material?.name ?? '', t('check-page.from.list'), words),
			other: material?.stress ?? ''
		},
		chosenRow(t('field.finish'), answers.finish ? t(`gear.finish.${answers.finish}`) : '', '', words)
	];
}

function readingRow(label: string, answer: AnsweredReading, words: Words): AnswerRow {
	const { t } = words;
	if (!isReading(answer)) {
		return plainRow(label, t(answer ? 'check-page.cannot-measure' : 'check-page.not-given'), '', false);
	}
	return {
		label,
		typed: withUnit(answer.typed, answer.unit, words),
		given: true,
		other: otherWords(answer.value, answer.unit, words),
		source: t(`check-page.from.${answer.source}`)
	};
}

function chosenRow(label: string, text: string, source: string, { t }: Words): AnswerRow {
	return text ? plainRow(label, text, source) : plainRow(label, t('check-page.not-given'), '', false);
}

function plainRow(label: string, typed: string, source: string, given = true): AnswerRow {
	return { label, typed, given, other: '', source };
}

/** A count and a factor need no unit behind them; a text that carries its own is left as it is. */
function withUnit(typed: string, unit: ReadingUnit, { t }: Words): string {
	if (unit === 'teeth' || unit === 'x' || /[a-z"″]\.?\s*$/i.test(typed)) return typed;
	return `${typed} ${t(`unit.${unit}`)}`;
}

function otherWords(value: number, unit: ReadingUnit, { t, language }: Words): string {
	const other = otherUnit(unit);
	if (other === null || unit === 'teeth' || unit === 'x') return '';
	const key = `unit.${other}`;
	const shown = figure(fromSI(toSI({ value, unit }), other), 5, language);
	return `${shown} ${isMessage(key) ? t(key) : other}`;
}
