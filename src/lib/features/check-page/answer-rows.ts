/**
 * The answers of a check as rows of a page: the text as typed with its own unit, the other unit smaller, and where
 * it came from. What was not given says so; nothing is filled in.
 */
import { otherUnit } from '$lib/features/check/reading/fields';
import { repeatWords } from '$lib/features/check/reading/repeat-words';
import { fromSI, toSI } from '$lib/gear/quantity';
import { isMessage } from '$lib/i18n/catalogue';
import type { Words } from '$lib/i18n/context.svelte';
import { figure } from '$lib/i18n/format';
import { pitchWords } from '$lib/i18n/gear-words';
import type { CheckAnswers } from '$lib/records/check';
import { isPlain, isReading, type AnsweredReading, type ReadingUnit } from '$lib/records/reading';

export interface AnswerRow {
	label: string;
	/** As typed, with its unit; or the words for what was not given. */
	typed: string;
	/** Whether there is an answer to read at all. */
	given: boolean;
	other: string;
	source: string;
}

/** Asked of every gear: a gap shows. */
const MEASURED = ['teeth', 'outsideDiameter', 'faceWidth'] as const;
/** Taken where they tell something: shown where there is an answer. */
const MORE = [
	'secondCount',
	'wholeDepth',
	'rootDiameter',
	'helixAngle',
	'mateTeeth',
	'centreDistance',
	'chordalThickness',
	'pinDiameter',
	'overPins',
	'circularPitch'
] as const;
const LOADS = ['power', 'torque'] as const;

export function readingRows(answers: CheckAnswers, words: Words): AnswerRow[] {
	const { t } = words;
	const byHand = t('check-page.from.hand');
	const read = [
		...MEASURED.map((name) => readingRow(t(`field.${name}`), answers[name], words)),
		...answers.spans.map(({ teeth, reading }) =>
			readingRow(t('field.span-over', { n: teeth }), reading, words)
		),
		...MORE.flatMap((name) => {
			const answer: AnsweredReading = answers[name];
			return answer === null ? [] : [readingRow(t(`field.${name}`), answer, words)];
		}),
		...worn(answers, words)
	];
	if (answers.severalGears) return [...read, plainRow(t('check-page.gear'), t('check-page.left-open'), '')];
	return [
		...read,
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

/** How the outside diameter was taken, and what is worn: where it is not the usual case. */
function worn({ outsideDiameterTaken, tipWorn, flanksWorn }: CheckAnswers, { t }: Words): AnswerRow[] {
	const said = [
		...(outsideDiameterTaken === 'over-tips' ? [] : [t(`how.${outsideDiameterTaken}`)]),
		...(tipWorn ? [t('how.tips-worn')] : []),
		...(flanksWorn ? [t('how.flanks-worn')] : [])
	];
	return said.length === 0 ? [] : [plainRow(t('check-page.how-taken'), said.join('; '), '')];
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
	const { typed, value, unit, source, instrument } = answer;
	const repeats = repeatWords(answer, words);
	return {
		label,
		typed: withUnit(typed, unit, words),
		given: true,
		other: [otherWords(value, unit, words), repeats].filter(Boolean).join('; '),
		source: instrument ? t(`tool.${instrument}`) : t(`check-page.from.${source}`)
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
	if (other === null || isPlain(unit)) return '';
	const key = `unit.${other}`;
	const shown = figure(fromSI(toSI({ value, unit }), other), 5, language);
	return `${shown} ${isMessage(key) ? t(key) : other}`;
}
