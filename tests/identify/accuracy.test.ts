/**
 * How often the answer is right, and whether its probabilities mean what they say, on 5,000 invented gears with the
 * readings of a usual visit: teeth, outside diameter, whole depth and two spans.
 */
import { beforeAll, describe, expect, test } from 'vitest';
import { identify } from '$lib/gear/identify/identify';
import { pitchHint } from '$lib/gear/pitch-hint';
import { moduleOf } from '$lib/gear/pitch';
import { toSI } from '$lib/gear/quantity';
import { Calibration } from './calibration';
import { randomOf, readingsOf, syntheticGear, type Reading } from './synthetic-gears';

const GEARS = 5000;
const MINUTES = 60_000;

describe('with two spans', () => {
	const sound = new Calibration();
	const worn = new Calibration();
	const all = new Calibration();
	/** The rule of thumb beside it: (N + 2) / OD, rounded to the nearest standard pitch. */
	const byRule = { right: 0, pitchRightHere: 0 };

	beforeAll(() => {
		const random = randomOf(2026);
		const usual: Reading[] = ['outsideDiameter', 'wholeDepth', 'spans'];
		for (let n = 0; n < GEARS; n++) {
			const gear = syntheticGear(random);
			const readings = readingsOf(gear, usual, random);
			const answer = identify(readings);
			all.add(gear, answer);
			(gear.tipWorn || gear.flanksWorn ? worn : sound).add(gear, answer);

			const { outsideDiameter } = readings;
			const millimetres = toSI({ value: outsideDiameter?.value ?? NaN, unit: outsideDiameter?.unit ?? 'mm' });
			const hint = pitchHint({ teeth: gear.teeth, outsideDiameterMm: millimetres, form: 'full-depth' });
			const same = (module: number) => Math.abs(module / gear.module - 1) < 1e-4;
			if (hint?.nearest[0] && same(moduleOf(hint.nearest[0].pitch))) byRule.right++;
			if (same(answer.candidates[0]?.module ?? NaN)) byRule.pitchRightHere++;
		}
	}, 10 * MINUTES);

	test('pitch, angle and form are right in 98.5 % of sound gears', () => {
		expect(sound.answers).toBeGreaterThan(2500);
		expect(sound.rate(sound.right)).toBeGreaterThanOrEqual(0.985);
	});

	test('and in 96 % of those with worn tips or flanks', () => {
		expect(worn.answers).toBeGreaterThan(1000);
		expect(worn.rate(worn.right)).toBeGreaterThanOrEqual(0.96);
	});

	test('the true gear is among the survivors, over 1 %, in 99.5 %', () => {
		expect(all.rate(all.surviving)).toBeGreaterThanOrEqual(0.995);
	});

	test('probabilities mean what they say', () => {
		expect(all.error).toBeLessThanOrEqual(0.03);
		expect(all.high.told).toBeGreaterThan(3000);
		expect(Math.abs(all.high.claimed - all.high.right)).toBeLessThanOrEqual(0.03);
	});

	test('the rule of thumb names the wrong pitch far more often, and never an angle', () => {
		console.log(
			`identify: right ${(100 * all.rate(all.right)).toFixed(2)} %, sound ${(100 * sound.rate(sound.right)).toFixed(2)} %, ` +
				`worn ${(100 * worn.rate(worn.right)).toFixed(2)} %, surviving ${(100 * all.rate(all.surviving)).toFixed(2)} %, ` +
				`calibration error ${all.error.toFixed(4)}; told at 0.9 or more: claimed ${all.high.claimed.toFixed(4)}, ` +
				`true ${all.high.right.toFixed(4)}; pitch right ${(byRule.pitchRightHere / GEARS).toFixed(4)}, ` +
				`by (N + 2) / OD ${(byRule.right / GEARS).toFixed(4)}`
		);
		expect(byRule.right / GEARS).toBeLessThan(0.92);
		expect(byRule.pitchRightHere / GEARS).toBeGreaterThan(0.98);
	});
});

describe('without spans nothing is told above what the readings support', () => {
	test.each<[string, Reading[]]>([
		['outside diameter alone', ['outsideDiameter']],
		['outside and root diameter and depth', ['outsideDiameter', 'rootDiameter', 'wholeDepth']],
		['one span', ['outsideDiameter', 'one-span']]
	])(
		'%s',
		(_name, taken) => {
			const random = randomOf(4711);
			const calibration = new Calibration();
			for (let n = 0; n < 1500; n++) {
				const gear = syntheticGear(random);
				calibration.add(gear, identify(readingsOf(gear, taken, random)));
			}
			expect(calibration.error).toBeLessThanOrEqual(0.03);
			const { claimed, right } = calibration.high;
			expect(Math.abs(claimed - right)).toBeLessThanOrEqual(0.03);
			expect(calibration.rate(calibration.surviving)).toBeGreaterThan(0.98);
		},
		5 * MINUTES
	);
});
