/**
 * Unit conversion: exact definitions (NIST Special Publication 811, 2008, appendix B, from memory) and the way back.
 */
import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
	FORCE_UNITS,
	fromSI,
	LENGTH_UNITS,
	POWER_UNITS,
	SPEED_UNITS,
	STRESS_UNITS,
	toSI,
	TORQUE_UNITS,
	VELOCITY_UNITS,
	type Unit
} from '$lib/gear/quantity';

test.each<[number, Unit, number]>([
	[1, 'in', 25.4],
	[1, 'ft', 304.8],
	[1, 'ft/min', 0.00508],
	[1, 'hp', 745.69987158227],
	[1, 'lbf', 4.4482216152605],
	[1, 'lbf*ft', 1.3558179483314],
	[1, 'lbf*in', 0.1129848290276167],
	[1, 'psi', 0.006894757293168361],
	[1, 'ksi', 6.894757293168361],
	[1, 'GPa', 1000],
	[1, 'kN', 1000],
	[1, 'kW', 1000],
	[1, 'cm', 10],
	[1, 'm', 1000]
])('%d %s is %d in the unit of the core', (value, unit, si) => {
	expect(Math.abs(toSI({ value, unit }) / si - 1)).toBeLessThan(1e-15);
});

test('33,000 ft·lbf/min are one horsepower', () => {
	expect(fromSI(toSI({ value: 33_000, unit: 'lbf*ft' }) / 60, 'hp')).toBeCloseTo(1, 14);
});

test('there and back again in every unit', () => {
	const units = [
		...LENGTH_UNITS,
		...SPEED_UNITS,
		...VELOCITY_UNITS,
		...POWER_UNITS,
		...TORQUE_UNITS,
		...FORCE_UNITS,
		...STRESS_UNITS
	];
	fc.assert(
		fc.property(
			fc.constantFrom<Unit>(...units),
			fc.double({ min: 1e-9, max: 1e9, noNaN: true }),
			(unit, value) => {
				expect(Math.abs(fromSI(toSI({ value, unit }), unit) / value - 1)).toBeLessThan(1e-14);
			}
		),
		{ numRuns: 1000 }
	);
});
