/**
 * The low end of the margin: first order, against the derivative of the check itself and against Monte Carlo.
 * Method: JCGM 100:2008 (GUM), 5.1.2.
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { EvaluateInput, Load, Outcome, Uncertainty } from '$lib/gear/contract';
import { evaluate } from '$lib/gear/evaluate';
import { figuresOf } from '$lib/gear/figures';
import { unrecorded } from '$lib/gear/working';
import { spurCheck } from '../../reference/spur-check';
import { realistic, within } from './check-arbitrary';

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

describe('the low end where one quantity is in doubt is its exact 95 % end', () => {
	const power: Load = { power: { value: 3, unit: 'kW' } };
	test('a load of 1.645 x 20 % more', () => {
		const input = check(power, { faceWidth: 0, load: 0.2, speed: 0 });
		expect(evaluate(input).bendingMarginLow).toBeCloseTo(margin(input) / (1 + 1.645 * 0.2), 9);
	});
	test('a face width of 1.645 x 10 % less', () => {
		const input = check(power, { faceWidth: 0.1, load: 0, speed: 0 });
		expect(evaluate(input).bendingMarginLow).toBeCloseTo(margin(input) * (1 - 1.645 * 0.1), 9);
	});
	test('nothing in doubt: the margin itself', () => {
		const input = check(power, { faceWidth: 0, load: 0, speed: 0 });
		expect(evaluate(input).bendingMarginLow).toBe(margin(input));
	});
});

test('within 5 % of Monte Carlo for any check, uncertainties of face width and speed to 10 %, of load to 30 %', () => {
	const uncertainty = fc.record({ faceWidth: within(0, 0.1), load: within(0, 0.3), speed: within(0, 0.1) });
	const checks = realistic.filter((input) => evaluate(input).bendingMargin !== null);
	fc.assert(
		fc.property(checks, uncertainty, (drawn, doubt) => {
			const input = { ...drawn, mate: undefined, original: undefined, uncertainty: doubt };
			const outcome = evaluate(input);
			fc.pre(outcome.bendingMargin !== null);
			const low = outcome.bendingMarginLow ?? NaN;
			expect(Math.abs(low / fifthPercentile(input, doubt, outcome) - 1)).toBeLessThanOrEqual(0.05);
		}),
		{ numRuns: 1000 }
	);
});

/** The 5th percentile of the margin over 4,000 draws of face width, load and speed, worked out by the laws alone. */
function fifthPercentile(input: EvaluateInput, doubt: Uncertainty, outcome: Outcome): number {
	const velocity = (outcome.pitchLineVelocity ?? NaN) / 0.00508;
	const factor = LAWS[outcome.velocityLaw as keyof typeof LAWS];
	const byPower = input.drive.load !== 'unknown' && 'power' in input.drive.load;
	const margins = DRAWS.map(([face, load, speed]) => {
		const [f, l, n] = [1 + doubt.faceWidth * face, 1 + doubt.load * load, 1 + doubt.speed * speed];
		// A draw in which the load or the speed is gone has no bearing on the low end of the margin.
		if (l <= 0 || n <= 0) return Infinity;
		const stress = (factor(velocity * n) / factor(velocity)) * (l / f) * (byPower ? 1 / n : 1);
		return (outcome.bendingMargin ?? NaN) / stress;
	}).sort((a, b) => a - b);
	return margins[Math.round(0.05 * margins.length)] ?? NaN;
}

/** Kv of Barth by V in ft/min, typed again here: Shigley, Mechanical Engineering Design, ch. 14. */
const LAWS = {
	cast: (V: number) => (600 + V) / 600,
	cut: (V: number) => (1200 + V) / 1200,
	'cut-600': (V: number) => (600 + V) / 600,
	hobbed: (V: number) => (50 + Math.sqrt(V)) / 50,
	ground: (V: number) => Math.sqrt((78 + Math.sqrt(V)) / 78),
	'non-metallic': (V: number) => 1 / (150 / (200 + V) + 0.25)
};

/** Standard normal numbers that are the same in every run (linear congruence and Box-Muller). */
function normalDraws(seed: number): () => number {
	let state = seed;
	const uniform = () => {
		state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
		return (state + 0.5) / 2 ** 32;
	};
	return () => Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform());
}

/** Draws of three standard normal numbers, mirrored so that their middle is exact. */
const DRAWS = (() => {
	const draw = normalDraws(2026);
	const drawn = Array.from({ length: 2000 }, () => [draw(), draw(), draw()] as const);
	return [...drawn, ...drawn.map(([a, b, c]) => [-a, -b, -c] as const)];
})();
