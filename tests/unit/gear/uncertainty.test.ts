/**
 * The low end of the margin: first order, against the derivative of the check itself and against Monte Carlo.
 * Method: JCGM 100:2008 (GUM), 5.1.2.
 */
import { describe, expect, test } from 'vitest';
import type { EvaluateInput, Load, Uncertainty } from '$lib/gear/contract';
import { evaluate } from '$lib/gear/evaluate';
import { figuresOf } from '$lib/gear/figures';
import { unrecorded } from '$lib/gear/working';
import { spurCheck } from '../../reference/spur-check';

const loads: [string, Load][] = [
	['power', { power: { value: 3, unit: 'kW' } }],
	['torque', { torque: { value: 100, unit: 'N*m' } }],
	['force', { tangentialForce: { value: 2, unit: 'kN' } }]
];

const check = (load: Load, uncertainty?: Partial<Uncertainty>): EvaluateInput => ({
	...spurCheck({ teeth: 24, pitch: { system: 'module', value: 4 }, rpm: 1000, load }),
	uncertainty
});

/** The same check with its true values a little off from the readings. */
function off(input: EvaluateInput, by: Uncertainty): EvaluateInput {
	const { gear, drive } = input;
	if (drive.load === 'unknown' || !drive.speed) throw new Error('a loaded drive is needed');
	const load = Object.fromEntries(
		Object.entries(drive.load).map(([kind, quantity]) => [
			kind,
			{ ...quantity, value: quantity.value * (1 + by.load) }
		])
	);
	return {
		...input,
		gear: { ...gear, faceWidth: { ...gear.faceWidth, value: gear.faceWidth.value * (1 + by.faceWidth) } },
		drive: {
			...drive,
			load: load as Load,
			speed: { ...drive.speed, value: drive.speed.value * (1 + by.speed) }
		}
	};
}

const relative = (input: EvaluateInput) =>
	evaluate(input).working.find(({ symbol }) => symbol === 'u')?.value ?? NaN;
const margin = (input: EvaluateInput) => evaluate(input).bendingMargin ?? NaN;

describe.each(loads)('load given as %s', (_kind, load) => {
	test.each(['faceWidth', 'load', 'speed'] as const)('%s alone: the derivative of the margin', (name) => {
		const none = { faceWidth: 0, load: 0, speed: 0 };
		const step = 1e-5;
		const [up, down] = [step, -step].map((by) => Math.log(margin(off(check(load), { ...none, [name]: by }))));
		const slope = ((up ?? NaN) - (down ?? NaN)) / (2 * step);
		expect(relative(check(load, { ...none, [name]: 0.03 }))).toBeCloseTo(0.03 * Math.abs(slope), 8);
	});

	test('the defaults of the contract count where none are given', () => {
		expect(relative(check(load))).toBe(relative(check(load, { faceWidth: 0.01, load: 0.1, speed: 0.01 })));
	});

	test('within 5 % of the 5th percentile of 20,000 drawn margins', () => {
		const draw = normalDraws(12345);
		const drawn = Array.from({ length: 20_000 }, () => {
			const errors = { faceWidth: 0.01 * draw(), load: 0.1 * draw(), speed: 0.01 * draw() };
			return figuresOf(off(check(load), errors), unrecorded).figures.bendingMargin ?? NaN;
		}).sort((a, b) => a - b);
		const low = evaluate(check(load)).bendingMarginLow ?? NaN;
		expect(Math.abs(low / (drawn[1000] ?? NaN) - 1)).toBeLessThanOrEqual(0.05);
	});
});

test('the low end is margin (1 - 1.645 u), and never below 0', () => {
	const [, load] = loads[0] ?? ['', 'unknown' as const];
	const input = check(load, { faceWidth: 0, load: 0.2, speed: 0 });
	expect(evaluate(input).bendingMarginLow).toBeCloseTo(margin(input) * (1 - 1.645 * 0.2), 9);
	expect(evaluate(check(load, { faceWidth: 0.5, load: 0.5, speed: 0 })).bendingMarginLow).toBe(0);
});

/** Standard normal numbers that are the same in every run (linear congruence and Box-Muller). */
function normalDraws(seed: number): () => number {
	let state = seed;
	const uniform = () => {
		state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
		return (state + 0.5) / 2 ** 32;
	};
	return () => Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform());
}
