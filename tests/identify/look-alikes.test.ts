/**
 * Pairs that callipers confuse, by hand: same or nearly the same outside diameter, same base pitch, another name for
 * one pitch. Readings are computed here, exact to the digits typed.
 */
import { describe, expect, test } from 'vitest';
import type { Candidate, IdentifyInput } from '$lib/gear/identify/contract';
import { identify } from '$lib/gear/identify/identify';

interface Gear {
	module: number;
	angle: number;
	teeth: number;
	addendum?: number;
	dedendum?: number;
	shift?: number;
}

const radians = (degrees: number) => (degrees * Math.PI) / 180;

/** A sound gear, cut 0.03 m thin, its tips 0.008 m under. */
function readings(gear: Gear, unit: 'in' | 'mm', change: Partial<IdentifyInput> = {}): IdentifyInput {
	const { module: m, angle, teeth: N, addendum = 1, dedendum = 1.25, shift = 0 } = gear;
	const a = radians(angle);
	const per = unit === 'in' ? 25.4 : 1;
	const typed = (millimetres: number) => ({
		value: Number((millimetres / per).toFixed(unit === 'in' ? 4 : 3)),
		unit,
		uncertainty: 0.02 / per
	});
	const span = (k: number) =>
		m * Math.cos(a) * (Math.PI * (k - 0.5) + N * (Math.tan(a) - a)) +
		2 * shift * m * Math.sin(a) -
		0.03 * m * Math.cos(a);
	const k = Math.max(2, Math.round((N * angle) / 180 + 0.5));
	const chord = N % 2 ? Math.cos(Math.PI / (2 * N)) : 1;
	return {
		teeth: N,
		outsideDiameter: typed(chord * m * (N + 2 * (addendum + shift - 0.008))),
		wholeDepth: typed(m * (addendum + dedendum - 0.008)),
		spans: [k, k + 1].map((n) => ({ teeth: n, ...typed(span(n)) })),
		...change
	};
}

const dp = (value: number) => 25.4 / value;
const first = (input: IdentifyInput): Candidate => {
	const [candidate] = identify(input).candidates;
	if (!candidate) throw new Error('a candidate was expected');
	return candidate;
};

describe('near pitches', () => {
	// DP 5 is module 5.08, and so on: between 1.6 and 2 % apart.
	test.each([
		[dp(5), 5, 5],
		[dp(2.5), 2.5, 10],
		[dp(10), 10, 2.5],
		[dp(20), 20, 1.25]
	])('module %d as DP %d, and module %d beside it', (module, diametral, near) => {
		for (const prior of ['inch', 'metric', 'either'] as const) {
			const inch = first(readings({ module, angle: 20, teeth: 26 }, 'mm', { prior }));
			expect(inch).toMatchObject({ system: 'diametral', value: diametral, pressureAngle: 20 });
			const metric = first(readings({ module: near, angle: 20, teeth: 26 }, 'mm', { prior }));
			expect(metric).toMatchObject({ system: 'module', value: near, pressureAngle: 20 });
		}
	});
});

test('DP 3.5 at 25 degrees and module 7 at 20 have one base pitch; the outside diameter tells them apart', () => {
	// π 7.2571 cos 25° = 20.664 mm, π 7 cos 20° = 20.665 mm.
	const [inch, metric] = [
		{ module: dp(3.5), angle: 25, teeth: 24 },
		{ module: 7, angle: 20, teeth: 24 }
	];
	expect(inch.module * Math.cos(radians(25))).toBeCloseTo(7 * Math.cos(radians(20)), 2);
	expect(first(readings(inch, 'mm', { prior: 'either' }))).toMatchObject({
		system: 'diametral',
		value: 3.5,
		pressureAngle: 25
	});
	expect(first(readings(metric, 'mm', { prior: 'either' }))).toMatchObject({
		system: 'module',
		value: 7,
		pressureAngle: 20
	});
});

test('5/8 in circular pitch, which is neither DP 5 nor module 5', () => {
	const gear = { module: (0.625 * 25.4) / Math.PI, angle: 14.5, teeth: 36, dedendum: 1.157 };
	expect(first(readings(gear, 'in', { prior: 'inch' }))).toMatchObject({
		system: 'circular',
		value: 0.625,
		pressureAngle: 14.5
	});
});

test.each([18, 19, 20, 21, 22, 23, 24])(
	'stub DP 5 of %d teeth, where (N + 2) / OD reads a finer pitch',
	(teeth) => {
		const gear = { module: dp(5), angle: 20, teeth, addendum: 0.8, dedendum: 1 };
		expect(first(readings(gear, 'in', { prior: 'inch' }))).toMatchObject({
			system: 'diametral',
			value: 5,
			pressureAngle: 20,
			form: 'stub'
		});
	}
);

test('12 teeth, enlarged by 0.4: the shift is told with the pitch', () => {
	const gear = { module: 4, angle: 20, teeth: 12, shift: 0.4 };
	const found = first(readings(gear, 'mm', { prior: 'metric' }));
	expect(found).toMatchObject({ system: 'module', value: 4, pressureAngle: 20, form: 'full-depth' });
	expect(found.profileShift).toBeCloseTo(0.4, 1);
});

describe('an odd count', () => {
	const gear = { module: dp(6), angle: 20, teeth: 23 };
	const tip = gear.module * (23 + 2 - 0.016);
	const chord = Math.cos(Math.PI / 46);
	test.each([
		['over-tips', tip * chord],
		['tip-to-gap', tip * chord * chord],
		['pi-tape', tip]
	] as const)('taken %s', (taken, millimetres) => {
		const input = readings(gear, 'in', { prior: 'inch' });
		const outsideDiameter = {
			value: Number((millimetres / 25.4).toFixed(4)),
			unit: 'in' as const,
			uncertainty: 0.001,
			taken
		};
		const found = first({ ...input, outsideDiameter });
		expect(found).toMatchObject({ system: 'diametral', value: 6, pressureAngle: 20 });
		expect(Math.abs(found.misfits[0]?.sigmas ?? NaN)).toBeLessThan(1.5);
	});

	test('down to the bottom of the gap opposite: known from the other readings', () => {
		const bottom = (tip + gear.module * (23 - 2.5)) / 2;
		const outsideDiameter = {
			value: Number((bottom / 25.4).toFixed(4)),
			unit: 'in' as const,
			uncertainty: 0.001,
			taken: 'tip-to-gap' as const
		};
		expect(first({ ...readings(gear, 'in', { prior: 'inch' }), outsideDiameter })).toMatchObject({
			system: 'diametral',
			value: 6
		});
	});
});

test('DP 4 is module 6.35: one candidate with both names', () => {
	const answer = identify(readings({ module: 6.35, angle: 20, teeth: 30 }, 'in', { prior: 'inch' }));
	expect(answer.state).toBe('clear');
	expect(answer.candidates[0]).toMatchObject({
		system: 'diametral',
		value: 4,
		module: 6.35,
		diametralPitch: 4
	});
	const pitches = answer.candidates.map(
		({ module, pressureAngle, form }) => `${module.toFixed(3)} ${pressureAngle} ${form}`
	);
	expect(new Set(pitches).size).toBe(pitches.length);
});

test('a count in doubt is settled by the readings', () => {
	const input = readings({ module: 4, angle: 20, teeth: 24 }, 'mm', { prior: 'metric' });
	const answer = identify({ ...input, teeth: 25, teethCertain: false });
	expect(answer.candidates[0]).toMatchObject({ value: 4, teeth: 24 });
});

test('repeats count by their mean, and their spread adds to the doubt', () => {
	const input = readings({ module: 4, angle: 20, teeth: 24 }, 'mm', { prior: 'metric' });
	const steady = { values: [103.93, 103.94, 103.94], unit: 'mm' as const, uncertainty: 0.02 };
	const wild = { values: [103.5, 103.9, 104.4], unit: 'mm' as const, uncertainty: 0.02 };
	const sigmas = (outsideDiameter: typeof steady) => {
		const misfit = first({ ...input, outsideDiameter }).misfits[0];
		return Math.abs((misfit?.residual ?? NaN) / (misfit?.sigmas ?? NaN));
	};
	expect(sigmas(wild)).toBeGreaterThan(5 * sigmas(steady));
});

test('a helical gear is found by its normal module, with its helix', () => {
	const [mn, N, beta, a] = [4, 28, radians(20), radians(20)];
	const transverse = Math.atan(Math.tan(a) / Math.cos(beta));
	const span = (k: number) =>
		mn * Math.cos(a) * (Math.PI * (k - 0.5) + N * (Math.tan(transverse) - transverse)) -
		0.03 * mn * Math.cos(a);
	const reading = (value: number) => ({
		value: Number(value.toFixed(3)),
		unit: 'mm' as const,
		uncertainty: 0.025
	});
	const answer = identify({
		teeth: N,
		prior: 'metric',
		outsideDiameter: reading((mn * N) / Math.cos(beta) + 2 * mn - 0.06),
		wholeDepth: reading(2.24 * mn),
		spans: [4, 5].map((k) => ({ teeth: k, ...reading(span(k)) })),
		helixAngle: { value: 20, uncertainty: 0.1 }
	});
	expect(answer.candidates[0]).toMatchObject({ system: 'module', value: 4, pressureAngle: 20 });
});
