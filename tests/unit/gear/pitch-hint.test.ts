/**
 * The hint of a pitch from outside diameter and tooth count. Relation: Mott, Machine Elements in Mechanical Design,
 * 4th ed., p. 319; stub addendum 0.8: AGMA 201.02A (from memory).
 */
import { describe, expect, test } from 'vitest';
import { pitchHint } from '$lib/gear/pitch-hint';

const hint = (teeth: number, outsideDiameterMm: number, form: 'full-depth' | 'stub' = 'full-depth') =>
	pitchHint({ teeth, outsideDiameterMm, form });

describe('pitch hint', () => {
	test('Mott p. 319 the other way round: 18 teeth, 1.6667 in over the tips', () => {
		const answer = hint(18, 1.6667 * 25.4);
		expect(answer?.diametralPitch).toBeCloseTo(12, 3);
		expect(answer?.module).toBeCloseTo(25.4 / 12, 4);
		expect(answer?.nearest).toHaveLength(3);
		expect(answer?.nearest[0]).toMatchObject({ pitch: { system: 'diametral', value: 12 } });
		expect(answer?.nearest[0]?.difference).toBeCloseTo((20 / 12 - 1.6667) * 25.4, 9);
	});

	test('module 2.5 and 10 diametral pitch, 20 teeth, are 0.88 mm apart and both offered', () => {
		const nearest = hint(20, 55)?.nearest ?? [];
		expect(nearest[0]).toEqual({
			pitch: { system: 'module', value: 2.5 },
			outsideDiameter: 55,
			difference: 0
		});
		expect(nearest[1]?.pitch).toEqual({ system: 'diametral', value: 10 });
		expect(nearest[1]?.outsideDiameter).toBeCloseTo(55.88, 9);
		expect(nearest[1]?.difference).toBeCloseTo(0.88, 9);
	});

	test('a stub gear taken for full depth reads about 2 % too fine at 20 teeth', () => {
		const overTips = (21.6 / 5) * 25.4;
		expect(hint(20, overTips, 'stub')?.diametralPitch).toBeCloseTo(5, 9);
		expect(hint(20, overTips)?.diametralPitch).toBeCloseTo(5 * (22 / 21.6), 9);
	});

	test('is nothing while teeth or diameter are no measurement yet', () => {
		for (const [teeth, diameter] of [
			[0, 50],
			[2.5, 50],
			[NaN, 50],
			[20, 0],
			[20, -1],
			[20, NaN],
			[20, Infinity]
		] as const) {
			expect(hint(teeth, diameter)).toBeNull();
		}
	});
});
