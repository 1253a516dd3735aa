/**
 * The readings of the measuring step: their names in the address, where each has its answer, and which comes next. The
 * first four are asked of every gear; the others when they tell something, or when somebody looks for them.
 */
import type { IdentifyAnswer } from '$lib/gear/identify/contract';
import { FIELDS } from '$lib/features/check/reading/fields';
import type { PicturedReading } from '$lib/features/check/reading/picture/pictured';
import { readingId } from '$lib/features/check/reading/reading-id';
import type { CheckAnswers } from '$lib/records/check';
import { isReading, type AnsweredReading } from '$lib/records/reading';

export interface MeasureReading {
	/** In the address: the field's name, a span's with its teeth. */
	id: string;
	field: PicturedReading;
	/** Over how many teeth, of a span. */
	over: number | null;
}

const OF_EVERY_GEAR = ['teeth', 'secondCount', 'outsideDiameter', 'faceWidth'] as const;
const OF_SOME = [
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
export const FEWEST_SPANNED = 2;
export const MOST_SPANNED = 60;

const plain = (field: Exclude<PicturedReading, 'span'>): MeasureReading => ({ id: field, field, over: null });
export const spanReading = (over: number): MeasureReading => ({ id: `span-${over}`, field: 'span', over });

const PATH: readonly MeasureReading[] = OF_EVERY_GEAR.map(plain);
const REST: readonly MeasureReading[] = OF_SOME.map(plain);

/** The reading that an address names; null where it names none. */
export function namedReading(id: string | null): MeasureReading | null {
	const over = Number(/^span-(\d{1,2})$/.exec(id ?? '')?.[1]);
	if (over >= FEWEST_SPANNED && over <= MOST_SPANNED) return spanReading(over);
	return [...PATH, ...REST].find((reading) => reading.id === id) ?? null;
}

export function answerOf(answers: CheckAnswers, { field, over }: MeasureReading): AnsweredReading {
	if (field === 'span') return answers.spans.find(({ teeth }) => teeth === over)?.reading ?? null;
	return answers[field];
}

/** The change of the answers that keeps a reading. */
export function answered(
	answers: CheckAnswers,
	{ field, over }: MeasureReading,
	answer: AnsweredReading
): Partial<CheckAnswers> {
	if (field === 'span') {
		const others = answers.spans.filter(({ teeth }) => teeth !== over);
		const own = answer === null || over === null ? [] : [{ teeth: over, reading: answer }];
		return { spans: [...others, ...own].sort((a, b) => a.teeth - b.teeth) as CheckAnswers['spans'] };
	}
	if (field !== 'outsideDiameter') return { [field]: answer };
	const taped = answer !== null && isReading(answer) && answer.instrument === 'pi-tape';
	const { outsideDiameterTaken: taken } = answers;
	return {
		[field]: answer as CheckAnswers['outsideDiameter'],
		outsideDiameterTaken: taped ? 'pi-tape' : taken === 'pi-tape' ? 'over-tips' : taken
	};
}

/** Which readings the list offers: those of every gear, the spans kept and recommended, and the rest. */
export function listedReadings(
	answers: CheckAnswers,
	current: MeasureReading,
	teeth: number | null
): MeasureReading[] {
	const spans = new Set(answers.spans.map((span) => span.teeth));
	if (current.over !== null) spans.add(current.over);
	if (spans.size < 2) for (const over of usualSpans(teeth)) if (spans.size < 2) spans.add(over);
	return [...PATH, ...[...spans].sort((a, b) => a - b).map(spanReading), ...REST];
}

/** Of a 20 degree gear: the jaws near the middle of the flanks, and one tooth more. Before the count, 3 and 4. */
function usualSpans(teeth: number | null): [number, number] {
	const over =
		teeth === null ? 3 : Math.min(MOST_SPANNED - 1, Math.max(FEWEST_SPANNED, Math.round(teeth / 9 + 0.5)));
	return [over, over + 1];
}

/** The first reading of every gear that has no answer; a count that the record confirms needs no second one. */
export function openReading(answers: CheckAnswers, knownTeeth: number | null): MeasureReading | null {
	const { teeth } = answers;
	const confirmed = isReading(teeth) && teeth.value === knownTeeth;
	return (
		PATH.find(({ id, field }) => {
			if (id === 'secondCount' && (confirmed || !isReading(teeth))) return false;
			return field !== 'span' && answers[field] === null;
		}) ?? null
	);
}

/** After a reading is kept: the rest of its pair, the next of every gear, or null for the candidates. */
export function readingAfter(
	kept: MeasureReading,
	answers: CheckAnswers,
	knownTeeth: number | null,
	identified: IdentifyAnswer | null
): MeasureReading | null {
	if (kept.field === 'pinDiameter' && isReading(answers.pinDiameter) && answers.overPins === null)
		return plain('overPins');
	if (kept.field === 'mateTeeth' && isReading(answers.mateTeeth) && answers.centreDistance === null) {
		return plain('centreDistance');
	}
	const next = identified?.nextReading ?? null;
	if (kept.field === 'span' && answers.spans.length === 1 && next?.what === 'spans') {
		return namedReading(readingId(next, answers));
	}
	return PATH.some(({ id }) => id === kept.id) ? openReading(answers, knownTeeth) : null;
}

export function isCount(field: PicturedReading): boolean {
	return FIELDS[field].whole;
}
