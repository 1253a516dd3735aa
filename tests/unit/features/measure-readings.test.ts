/** The order of readings: what is asked of every gear, what follows what, and what an address names. */
import { describe, expect, it } from 'vitest';
import {
	answered,
	answerOf,
	listedReadings,
	namedReading,
	openReading,
	readingAfter,
	spanReading
} from '$lib/features/measure/readings';
import type { IdentifyAnswer } from '$lib/gear/identify/contract';
import { noAnswers, type CheckAnswers } from '$lib/records/check';

const read = <U extends string>(value: number, unit: U, more: object = {}) => ({
	typed: String(value),
	value,
	unit,
	source: 'keypad' as const,
	...more
});
const CANNOT = { cannotMeasure: true } as const;
const counted: CheckAnswers = { ...noAnswers, teeth: read(25, 'teeth') };
const asks = (next: Partial<NonNullable<IdentifyAnswer['nextReading']>> | null): IdentifyAnswer => ({
	core: 'x',
	candidates: [],
	noneFits: 0,
	state: 'several',
	nextReading: next && { what: 'spans', why: '', expected: [], ...next }
});

describe('an address', () => {
	it('names a reading or none', () => {
		expect(namedReading('span-4')).toEqual(spanReading(4));
		expect(namedReading('wholeDepth')).toMatchObject({ field: 'wholeDepth' });
		for (const bad of [null, '', 'span-1', 'span-61', 'span-x', 'power', 'constructor']) {
			expect(namedReading(bad)).toBeNull();
		}
	});
});

describe('what comes first', () => {
	it('is asked of every gear in order, a second count too', () => {
		expect(openReading(noAnswers, null)?.id).toBe('teeth');
		expect(openReading(counted, null)?.id).toBe('secondCount');
		expect(openReading({ ...counted, secondCount: CANNOT }, null)?.id).toBe('outsideDiameter');
	});

	it('needs no second count where the record confirms the first, or there is none', () => {
		expect(openReading(counted, 25)?.id).toBe('outsideDiameter');
		expect(openReading(counted, 24)?.id).toBe('secondCount');
		expect(openReading({ ...noAnswers, teeth: CANNOT }, null)?.id).toBe('outsideDiameter');
	});
});

describe('what comes next', () => {
	const after = (id: string, answers: CheckAnswers, identified: IdentifyAnswer | null = null) =>
		readingAfter(namedReading(id)!, answers, null, identified)?.id ?? null;

	it('is the other half of a pair', () => {
		expect(after('pinDiameter', { ...counted, pinDiameter: read(0.35, 'in') })).toBe('overPins');
		expect(after('mateTeeth', { ...counted, mateTeeth: read(60, 'teeth') })).toBe('centreDistance');
		expect(after('mateTeeth', { ...counted, mateTeeth: CANNOT })).toBeNull();
		const one: CheckAnswers = { ...counted, spans: [{ teeth: 3, reading: read(1.5, 'in') }] };
		expect(after('span-3', one, asks({ spanTeeth: 4 }))).toBe('span-4');
		expect(after('span-3', one, asks({ what: 'wholeDepth' }))).toBeNull();
	});

	it('is what is still asked of every gear, and then the candidates', () => {
		expect(after('teeth', counted)).toBe('secondCount');
		const rest: CheckAnswers = {
			...counted,
			secondCount: read(25, 'teeth'),
			outsideDiameter: read(5.4, 'in'),
			faceWidth: CANNOT
		};
		expect(after('faceWidth', rest)).toBeNull();
		expect(after('wholeDepth', counted)).toBeNull();
	});
});

describe('an answer', () => {
	it('of a span has its place by its teeth, and can be taken back', () => {
		const four = { ...counted, ...answered(counted, spanReading(4), read(2.1, 'in')) };
		const both = { ...four, ...answered(four, spanReading(3), read(1.5, 'in')) };
		expect(both.spans.map(({ teeth }) => teeth)).toEqual([3, 4]);
		expect(answerOf(both, spanReading(3))).toMatchObject({ value: 1.5 });
		const again = { ...both, ...answered(both, spanReading(3), read(1.55, 'in')) };
		expect(again.spans).toHaveLength(2);
		expect(answered(again, spanReading(3), null).spans).toHaveLength(1);
	});

	it('by pi tape says how it was taken, and says so no longer with another tool', () => {
		const outside = namedReading('outsideDiameter')!;
		const taped = answered(counted, outside, read(5.4, 'in', { instrument: 'pi-tape' }));
		expect(taped.outsideDiameterTaken).toBe('pi-tape');
		const again = answered({ ...counted, ...taped }, outside, read(5.4, 'in', { instrument: 'calliper' }));
		expect(again.outsideDiameterTaken).toBe('over-tips');
		const gap: CheckAnswers = { ...counted, outsideDiameterTaken: 'tip-to-gap' };
		expect(answered(gap, outside, read(5.4, 'in')).outsideDiameterTaken).toBe('tip-to-gap');
	});
});

describe('the list', () => {
	it('offers two spans of the usual teeth, or those that are kept', () => {
		const spansIn = (answers: CheckAnswers, current = 'teeth') =>
			listedReadings(answers, namedReading(current)!, 25).flatMap(({ over }) => over ?? []);
		expect(spansIn(counted)).toEqual([3, 4]);
		expect(spansIn(counted, 'span-5')).toEqual([3, 5]);
		const kept: CheckAnswers = {
			...counted,
			spans: [
				{ teeth: 2, reading: read(1, 'in') },
				{ teeth: 3, reading: read(1.5, 'in') }
			]
		};
		expect(spansIn(kept)).toEqual([2, 3]);
		expect(spansIn(kept, 'span-6')).toEqual([2, 3, 6]);
	});
});
