/** Worn tips: never a stronger gear, always a review, and an end of the method. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { EvaluateInput, Gear, Mate } from '$lib/gear/contract';
import { evaluate } from '$lib/gear/evaluate';
import { within } from './check-arbitrary';

const mm = (value: number) => ({ value, unit: 'mm' as const });
const steel: Gear['material'] = {
	name: 'steel',
	metallic: true,
	allowableBending: { value: 138, unit: 'MPa' },
	brinell: 200,
	modulus: { value: 207, unit: 'GPa' },
	poisson: 0.3,
	permitted: true
};
const base: EvaluateInput = {
	gear: {
		kind: 'spur',
		teeth: 24,
		pitch: { system: 'module', value: 4 },
		pressureAngle: 20,
		form: 'full-depth',
		faceWidth: mm(40),
		finish: 'hobbed',
		material: steel
	},
	drive: {
		load: { power: { value: 5, unit: 'kW' } },
		speed: { value: 1000, unit: 'rpm' },
		serviceFactor: 1
	}
};
const withGear = (change: Partial<Gear>): EvaluateInput => ({ ...base, gear: { ...base.gear, ...change } });
const withMate = (change: Partial<Mate>): EvaluateInput => ({
	...base,
	mate: { kind: 'spur', teeth: 48, form: 'full-depth', faceWidth: mm(40), material: steel, ...change }
});
const codes = (input: EvaluateInput) => evaluate(input).reasons.map(({ code }) => code);

describe('a worn gear', () => {
	const unworn = evaluate(base);

	test.each([0.01, 0.5, 2, 3.99])(
		'of %d mm has no more than its unworn form factor, and goes to review',
		(wear) => {
			const worn = evaluate(withGear({ tipWear: mm(wear) }));
			expect(unworn.verdict).toBe('carries');
			expect(worn.formFactor).toBeLessThanOrEqual(unworn.formFactor ?? NaN);
			expect(worn.formFactor).toBeCloseTo(
				Math.min(unworn.formFactorHandbook ?? NaN, unworn.formFactorGeometry ?? NaN),
				12
			);
			expect(worn.verdict).toBe('close');
			expect(worn.reasons[0]).toMatchObject({ code: 'tips-worn', values: { wear } });
		}
	);

	test.each([4, 6.5, 30])('of %d mm, at the pitch circle or below, is not answered', (wear) => {
		const worn = evaluate(withGear({ tipWear: mm(wear) }));
		expect(worn).toMatchObject({ verdict: 'cannot-say', formFactor: null, bendingMargin: null });
	});

	test('that falls short still falls short', () => {
		const heavy = { ...withGear({ tipWear: mm(1) }), drive: { ...base.drive, serviceFactor: 10 } };
		expect(evaluate(heavy).verdict).toBe('will-not-carry');
	});

	test('of any form, kind and rule never has a larger margin than unworn', () => {
		const gears = fc.record({
			kind: fc.constantFrom('spur' as const, 'helical' as const, 'internal' as const, 'rack' as const),
			teeth: fc.integer({ min: 10, max: 300 }),
			pressureAngle: fc.constantFrom(14.5, 17.5, 20, 25),
			form: fc.constantFrom('full-depth' as const, 'stub' as const),
			profileShift: fc.constantFrom(0, 0.2),
			formFactor: fc.constantFrom('handbook' as const, 'geometry' as const, 'lower-of-both' as const),
			wear: within(0.001, 5)
		});
		fc.assert(
			fc.property(gears, ({ kind, teeth, formFactor, wear, ...shape }) => {
				const rack = kind === 'rack';
				const input = (tipWear?: Gear['tipWear']): EvaluateInput => ({
					...withGear({
						...shape,
						kind,
						teeth: rack ? undefined : teeth,
						helixAngle: kind === 'helical' ? 15 : 0,
						tipWear
					}),
					drive: rack
						? { load: base.drive.load, velocity: { value: 2, unit: 'm/s' }, serviceFactor: 1 }
						: { ...base.drive, speed: { value: 50, unit: 'rpm' } },
					rules: { formFactor }
				});
				const [whole, worn] = [evaluate(input()), evaluate(input(mm(wear)))];
				expect(worn.verdict).not.toBe('carries');
				if (worn.bendingMargin === null) expect(worn.verdict).toBe('cannot-say');
				else expect(worn.bendingMargin).toBeLessThanOrEqual((whole.bendingMargin ?? NaN) * (1 + 1e-12));
			}),
			{ numRuns: 1000 }
		);
	});
});

describe('a worn mate', () => {
	test('goes to review and bears no more', () => {
		const worn = evaluate(withMate({ tipWear: mm(0.5) }));
		expect(worn.verdict).toBe('close');
		expect(worn.reasons[0]).toMatchObject({ code: 'mate-tips-worn', values: { wear: 0.5 } });
		const whole = evaluate(withMate({})).mateBending?.bendingMargin ?? NaN;
		expect(worn.mateBending?.bendingMargin).toBeLessThanOrEqual(whole);
	});

	test.each([4, 9.1, 500])('of %d mm gives no contact from nowhere: it cannot be said', (wear) => {
		const worn = evaluate(withMate({ tipWear: mm(wear) }));
		expect(worn).toMatchObject({ verdict: 'cannot-say', mesh: null });
		expect(worn.reasons[0]?.code).toBe('tips-of-pair-worn-away');
	});
});

test('nothing is said of tips that are not worn', () => {
	for (const input of [base, withMate({})])
		expect(codes(input).filter((code) => code.includes('tip'))).toEqual([]);
});
