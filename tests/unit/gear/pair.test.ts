/** Gear and mate together: the three answers, what decides, what the mate does not tell, and what a person is told. */
import { describe, expect, test } from 'vitest';
import type { Mate, Outcome } from '$lib/gear/contract';
import { evaluate } from '$lib/gear/evaluate';
import { check, gear, mate, steel } from './pair-check';

const withMate = (change: Partial<Mate>) => evaluate(check({ mate: { ...mate, ...change } }));
const codes = ({ reasons }: Outcome) => reasons.map(({ code }) => code);

describe('three answers', () => {
	const outcome = evaluate(check());

	test('all that the input allows are computed, with what the plant needs of each', () => {
		expect(outcome.limits.map(({ answer }) => answer)).toEqual(['gear-bending', 'wear', 'mate-bending']);
		const { limits } = evaluate(check({ rules: { bendingMargin: 1.5, wearMargin: 1.2 } }));
		expect(limits.map(({ needed }) => needed)).toEqual([1.5, 1.2, 1.5]);
	});

	test('the one with the least of what it needs decides, and is named', () => {
		expect(outcome.limitedBy).toBe('wear');
		expect(codes(outcome)[0]).toBe('wear-margin-low');
		const soft = withMate({ material: steel(220, 40) });
		expect(soft.limitedBy).toBe('mate-bending');
		expect(codes(soft)[0]).toMatch(/^mate-bending-margin/);
		const weak = evaluate(check({ gear: { ...gear, material: steel(300, 20) } }));
		expect(weak.limitedBy).toBe('gear-bending');
	});

	test('a lower needed margin in wear can hand the decision to bending', () => {
		const relaxed = evaluate(check({ rules: { wearMargin: 0.1 } }));
		expect(relaxed.limitedBy).toBe('gear-bending');
	});

	test('wear is the lower of Hertz and Buckingham, against the dynamic load', () => {
		const { wear, limits, designForce, velocityFactor } = outcome;
		const dynamic = (designForce ?? NaN) * (velocityFactor ?? NaN);
		expect(wear?.wearLoadMargin).toBeCloseTo((wear?.wearLoad ?? NaN) / dynamic, 12);
		expect(wear?.contactMargin).toBeCloseTo(
			((wear?.allowableContact ?? NaN) / (wear?.contactStress ?? NaN)) ** 2,
			9
		);
		expect(limits[1]?.margin).toBe(Math.min(wear?.contactMargin ?? NaN, wear?.wearLoadMargin ?? NaN));
		expect(wear?.allowableContact).toBeCloseTo(2.76 * 260 - 70, 9);
	});

	test('a pair says the same from either side', () => {
		const other = evaluate(
			check({
				gear: { ...gear, teeth: 61, faceWidth: { value: 36, unit: 'mm' }, material: steel(220) },
				mate: { ...mate, teeth: 24, faceWidth: { value: 40, unit: 'mm' }, material: steel(300) },
				drive: {
					load: { power: { value: 5, unit: 'kW' } },
					speed: { value: (400 * 24) / 61, unit: 'rpm' },
					serviceFactor: 1.25
				}
			})
		);
		expect(other.bendingMargin).toBeCloseTo(outcome.mateBending?.bendingMargin ?? NaN, 9);
		expect(other.mateBending?.bendingMargin).toBeCloseTo(outcome.bendingMargin ?? NaN, 9);
		expect(other.wear?.contactMargin).toBeCloseTo(outcome.wear?.contactMargin ?? NaN, 9);
		expect(other.wear?.wearLoadMargin).toBeCloseTo(outcome.wear?.wearLoadMargin ?? NaN, 9);
		expect(other.mesh).toEqual(outcome.mesh);
	});
});

describe('what the mate does not tell', () => {
	test.each<[string, Partial<Mate>, string]>([
		['no teeth', { teeth: undefined }, 'mate-teeth-missing'],
		[
			'nothing but its face',
			{ teeth: undefined, form: undefined, material: undefined },
			'mate-teeth-missing'
		],
		['nothing but its teeth', { form: undefined, material: undefined }, 'bending-only'],
		['no form', { form: undefined }, 'mate-bending-not-known'],
		['no hardness', { material: { ...steel(220), brinell: undefined } }, 'wear-not-known'],
		['no modulus', { material: { ...steel(220), modulus: undefined } }, 'wear-not-known']
	])('%s: %s', (_what, change, code) => {
		const light = check({ mate: { ...mate, ...change } });
		const drive = { ...light.drive, load: { power: { value: 0.5, unit: 'kW' as const } } };
		const outcome = evaluate({ ...light, drive });
		expect(outcome.verdict).toBe('carries');
		expect(codes(outcome).filter((told) => /missing|not-known|only/.test(told))).toEqual([code]);
	});

	test("Poisson's ratio is taken as 0.3 for metals, and the working says so", () => {
		const outcome = withMate({ material: { ...steel(220), poisson: undefined } });
		expect(outcome.wear?.contactStress).toBe(evaluate(check()).wear?.contactStress);
		const line = outcome.working.find(({ symbol, of }) => symbol === 'ν' && of === 'mate');
		expect(line).toMatchObject({ value: 0.3, source: 'common practice' });
	});
});

test.each([
	[150, 150, true],
	[100, 200, true],
	[149, 150, false],
	[400, 400, true],
	[401, 400, false]
])('%d on %d HB: within the range of the wear limit %s', (own, mates, within) => {
	const outcome = evaluate(
		check({ gear: { ...gear, material: steel(own) }, mate: { ...mate, material: steel(mates) } })
	);
	expect(outcome.wear !== null).toBe(within);
	expect(codes(outcome).includes('wear-out-of-range')).toBe(!within);
});

describe('is told', () => {
	test.each<[string, Partial<Mate>]>([
		['hardness-reversed', { material: steel(340) }],
		['mate-worn', { worn: true }],
		['mate-law-counts', { finish: 'cast' }],
		['no-backlash', { centreDistance: { value: 169.5, unit: 'mm' } }],
		[
			'backlash-below-range',
			{ centreDistance: { value: 170, unit: 'mm' }, toothThickness: { value: 6.27, unit: 'mm' } }
		],
		[
			'backlash-above-range',
			{ centreDistance: { value: 170, unit: 'mm' }, toothThickness: { value: 5, unit: 'mm' } }
		],
		['contact-ratio-modest', { centreDistance: { value: 172, unit: 'mm' } }]
	])('%s', (code, change) => {
		expect(codes(withMate(change))).toContain(code);
	});

	test('tips that reach below the flank of a small pinion', () => {
		const small = { ...gear, teeth: 14 };
		expect(codes(evaluate(check({ gear: small })))).toContain('undercut');
		const rack = { addendum: 1, dedendum: 1, tipRadius: 0 };
		const relieved = evaluate(
			check({
				gear: { ...gear, teeth: 18, form: rack },
				mate: { ...mate, form: { addendum: 1.2, dedendum: 1.2, tipRadius: 0 } }
			})
		);
		expect(codes(relieved)).toContain('interference');
	});
});

describe('an unknown load', () => {
	const unknown = { load: 'unknown' as const, speed: { value: 400, unit: 'rpm' as const }, serviceFactor: 1 };

	test('leaves the comparison with the original, in bending and in wear', () => {
		const original = { ...gear, material: steel(200, 150), finish: 'hobbed' as const };
		const outcome = evaluate(check({ drive: unknown, original }));
		expect(outcome.verdict).toBe('cannot-say');
		expect(codes(outcome).slice(0, 2)).toEqual(['load-unknown', 'compared']);
		const hobbed = evaluate(check({ gear: original }));
		const cut = evaluate(check());
		expect(outcome.original?.bendingCapacityRatio).toBeCloseTo(
			(cut.bendingMargin ?? NaN) / (hobbed.bendingMargin ?? NaN),
			9
		);
		expect(outcome.original?.wearCapacityRatio).toBeCloseTo(
			(cut.limits[1]?.margin ?? NaN) / (hobbed.limits[1]?.margin ?? NaN),
			9
		);
	});

	test('needs no speed where finish and size are the same', () => {
		const original = { ...gear, material: steel(200, 100) };
		const outcome = evaluate(check({ drive: { load: 'unknown', serviceFactor: 1 }, original }));
		expect(outcome.original?.bendingCapacityRatio).toBeCloseTo(2, 12);
		const hobbed = { ...original, finish: 'hobbed' as const };
		const other = evaluate(check({ drive: { load: 'unknown', serviceFactor: 1 }, original: hobbed }));
		expect(other.original).toBeNull();
		expect(codes(other)).toContain('original-not-comparable');
	});

	test('without an original there is nothing to say', () => {
		const outcome = evaluate(check({ drive: unknown }));
		expect(outcome).toMatchObject({ verdict: 'cannot-say', original: null, bendingStress: null });
	});
});
