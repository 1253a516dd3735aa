/**
 * The low end of the margin: first order, against the derivative of the check itself and against Monte Carlo.
 * Method: JCGM 100:2008 (GUM), 5.1.2.
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { EvaluateInput, Load, Outcome, Uncertainty } from '$lib/gear/contract';
import { evaluate } from '$lib/gear/evaluate';
import { figuresOf } from '$lib/gear/figures';
import { MOST_UNCERTAIN } from '$lib/gear/uncertainty';
import { unrecorded } from '$lib/gear/working';
import { parseEvaluate } from '$lib/records/evaluate';
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

describe('within 5 % of Monte Carlo over the whole range that the schema takes', () => {
	const most = MOST_UNCERTAIN;

	test('for any check and any doubt', { timeout: 120_000 }, () => {
		const uncertainty = fc.record({
			faceWidth: within(0, most.faceWidth),
			load: within(0, most.load),
			speed: within(0, most.speed)
		});
		const checks = realistic.filter((input) => evaluate(input).bendingMargin !== null);
		fc.assert(
			fc.property(checks, uncertainty, (drawn, doubt) => {
				const input = { ...drawn, mate: undefined, original: undefined, uncertainty: doubt };
				const outcome = evaluate(input);
				fc.pre(outcome.bendingMargin !== null);
				const low = outcome.bendingMarginLow ?? NaN;
				expect(Math.abs(low / fifthPercentile(input, doubt, outcome) - 1)).toBeLessThanOrEqual(0.05);
			}),
			{ numRuns: 500 }
		);
	});

	const shares = [0.02, 0.5, 1];
	const corners = shares.flatMap((faceWidth) =>
		shares.flatMap((load) =>
			shares.map((speed) => ({
				faceWidth: faceWidth * most.faceWidth,
				load: load * most.load,
				speed: speed * most.speed
			}))
		)
	);
	const finishes = ['cast', 'cut', 'hobbed', 'ground', 'non-metallic'] as const;
	test.each(finishes.flatMap((finish) => loads.map(([kind, load]) => ({ finish, kind, load }))))(
		'at the corners: $finish, load given as $kind',
		({ finish, load }) => {
			for (const rpm of [40, 900]) {
				for (const doubt of corners) {
					const metallic = finish !== 'non-metallic';
					const input = {
						...spurCheck({
							teeth: 24,
							pitch: { system: 'module', value: 4 },
							rpm,
							load,
							finish: metallic ? finish : 'cut',
							metallic
						}),
						uncertainty: doubt
					};
					const outcome = evaluate(input);
					const drawn = fifthPercentile(input, doubt, outcome);
					const off = Math.abs((outcome.bendingMarginLow ?? NaN) / drawn - 1);
					expect(off, JSON.stringify({ rpm, doubt })).toBeLessThanOrEqual(0.05);
				}
			}
		}
	);

	test.each(['faceWidth', 'load', 'speed'] as const)(
		'%s beyond it is refused, with the end named',
		(name) => {
			const input = check({ power: { value: 3, unit: 'kW' } }, { [name]: most[name] });
			expect(parseEvaluate(input).ok).toBe(true);
			const parsed = parseEvaluate({ ...input, uncertainty: { [name]: most[name] + 0.01 } });
			if (parsed.ok) throw new Error('it was taken');
			const [issue] = parsed.error.error.issues;
			expect(issue).toMatchObject({ path: `uncertainty.${name}` });
			expect(issue?.message).toContain(`between 0 and ${most[name]}`);
		}
	);
});

test('the bad end can be worked by hand from its point, which lies 1.645 standard uncertainties off', () => {
	const doubt = { faceWidth: 0.1, load: 0.3, speed: 0.1 };
	const { working } = evaluate(check({ torque: { value: 100, unit: 'N*m' } }, doubt));
	const value = (symbol: string) => working.find((line) => line.symbol === symbol)?.value ?? NaN;
	const [zF, zL, zn] = [value('zF'), value('zL'), value('zn')];
	expect(Math.sqrt(zF ** 2 + zL ** 2 + zn ** 2)).toBeCloseTo(1.645, 9);
	// No other point at that distance leaves less.
	const left = (f: number, l: number, n: number) =>
		(1 - f * doubt.faceWidth) / ((1 + l * doubt.load) * (1 + n * doubt.speed) ** value('sn'));
	expect(value('ke')).toBeCloseTo(left(zF, zL, zn), 12);
	for (let i = 0; i <= 90; i++) {
		for (let j = 0; j <= 90; j++) {
			const [up, round] = [(i * Math.PI) / 180, (j * Math.PI) / 180];
			const z = 1.645;
			const other = left(
				z * Math.cos(up) * Math.cos(round),
				z * Math.cos(up) * Math.sin(round),
				z * Math.sin(up)
			);
			expect(value('ke')).toBeLessThanOrEqual(other * (1 + 1e-9));
		}
	}
});

/** The 5th percentile of the margin over all draws of face width, load and speed, worked out by the laws alone. */
function fifthPercentile(input: EvaluateInput, doubt: Uncertainty, outcome: Outcome): number {
	const velocity = (outcome.pitchLineVelocity ?? NaN) / 0.00508;
	const factor = LAWS[outcome.velocityLaw as keyof typeof LAWS];
	const byPower = input.drive.load !== 'unknown' && 'power' in input.drive.load;
	const margins = Float64Array.from(DRAWS, ([face, load, speed]) => {
		const [f, l, n] = [1 + doubt.faceWidth * face, 1 + doubt.load * load, 1 + doubt.speed * speed];
		// A draw in which the load or the speed is gone has no bearing on the low end of the margin.
		if (l <= 0 || n <= 0) return Infinity;
		const stress = (factor(velocity * n) / factor(velocity)) * (l / f) * (byPower ? 1 / n : 1);
		return (outcome.bendingMargin ?? NaN) / stress;
	}).sort();
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

/**
 * Draws of three standard normal numbers. Even draws, each a golden step on from the last (in four dimensions), fill the
 * space as a million random ones would: at the widest doubts the noise of 20,000 random ones is as large as what is judged.
 */
const DRAWS = (() => {
	// The root of g^5 = g + 1; the steps are its inverse powers.
	const g = 1.1673039782614187;
	const even = (i: number, power: number) => (0.5 + i / g ** power) % 1;
	const normal = (u: number, v: number) => Math.sqrt(-2 * Math.log(1 - u)) * Math.cos(2 * Math.PI * v);
	const beside = (u: number, v: number) => Math.sqrt(-2 * Math.log(1 - u)) * Math.sin(2 * Math.PI * v);
	return Array.from({ length: 20_000 }, (_, i) => {
		const [a, b, c, d] = [even(i, 1), even(i, 2), even(i, 3), even(i, 4)];
		return [normal(a, b), beside(a, b), normal(c, d)] as const;
	});
})();
