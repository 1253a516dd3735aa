/** The curve of power over speed: it passes through the check, and stops where the method stops. */
import { describe, expect, test } from 'vitest';
import { permittedPowerAt } from '$lib/gear/capacity';
import type { EvaluateInput } from '$lib/gear/contract';
import { evaluate } from '$lib/gear/evaluate';
import { spurCheck } from '../../reference/spur-check';

const input = spurCheck({ teeth: 24, pitch: { system: 'diametral', value: 6 }, rpm: 400 });
const at = (rpm: number, check: EvaluateInput = input) => permittedPowerAt(check, rpm);

describe('permitted power at a speed', () => {
	test('a drive on the lower curve has its low margin at the needed one, a drive on the upper its margin', () => {
		for (const rpm of [20, 400, 3000]) {
			const power = at(rpm);
			const drawing = (value: number) =>
				evaluate({
					...input,
					drive: { ...input.drive, load: { power: { value, unit: 'W' } }, speed: { value: rpm, unit: 'rpm' } }
				});
			expect(drawing(power?.low ?? NaN).bendingMargin).toBeGreaterThan(1);
			expect(drawing((power?.low ?? NaN) * 0.999).verdict).toBe('carries');
			expect(drawing((power?.low ?? NaN) * 1.001).verdict).toBe('close');
			expect(drawing((power?.middle ?? NaN) * 0.999).verdict).toBe('close');
			expect(drawing((power?.middle ?? NaN) * 1.001).verdict).toBe('will-not-carry');
		}
	});

	test('rises with the speed along the cut law, towards its limit', () => {
		const powers = [10, 100, 500, 1000, 2000, 3500].map((rpm) => at(rpm)?.middle ?? NaN);
		powers.slice(1).forEach((power, i) => expect(power).toBeGreaterThan(powers[i] ?? NaN));
	});

	test('needs no load', () => {
		expect(at(400, { ...input, drive: { ...input.drive, load: 'unknown' } })).toEqual(at(400));
	});

	test('ends with the law, and has nothing at a speed that is none', () => {
		expect(at(3800)).not.toBeNull();
		for (const rpm of [3900, 0, -5, NaN, Infinity, 1e308]) expect(at(rpm)).toBeNull();
	});

	test('is empty where the check cannot be worked out', () => {
		expect(at(400, { ...input, gear: { ...input.gear, pressureAngle: 30 } })).toBeNull();
		expect(at(400, { ...input, mate: { kind: 'spur', pitch: { system: 'module', value: 3 } } })).toBeNull();
	});
});
