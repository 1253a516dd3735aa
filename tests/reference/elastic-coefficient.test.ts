/**
 * The elastic coefficient of pairs of metals against published tables, in √psi and √MPa. The tables do not print
 * their moduli and Poisson's ratios with the coefficients; which ones give them is held here too.
 */
import { describe, expect, test } from 'vitest';
import { elasticCoefficient } from '$lib/gear/hertz';
import { toSI } from '$lib/gear/quantity';

const psi = (value: number) => toSI({ value, unit: 'psi' });

/** Million psi. AGMA 2001 and Shigley, Mechanical Engineering Design, sec. 14-2 (from memory). */
const MILLION = {
	steel: 30,
	'malleable iron': 25,
	'nodular iron': 24,
	'cast iron': 22,
	'aluminium bronze': 17.5,
	'tin bronze': 16
};
type Metal = keyof typeof MILLION;

const metal = (name: Metal, poisson = 0.3) => ({ modulus: psi(MILLION[name] * 1e6), poisson });
const rootPsi = (rootMPa: number) => rootMPa / Math.sqrt(psi(1));

// The table: AGMA 2001 and Shigley, sec. 14-2 (from memory). The recomputed values are those of the formula with the
// moduli above and Poisson's ratio 0.3 for every metal.
// prettier-ignore
const PAIRS: [one: Metal, other: Metal, table: number, recomputedPsi: number, recomputedMPa: number][] = [
	['steel', 'steel', 2300, 2291, 190.2],
	['steel', 'malleable iron', 2180, 2184, 181.3],
	['steel', 'nodular iron', 2160, 2160, 179.3],
	['steel', 'cast iron', 2100, 2107, 175],
	['steel', 'aluminium bronze', 1950, 1966, 163.3],
	['steel', 'tin bronze', 1900, 1910, 158.6],
	['malleable iron', 'malleable iron', 2090, 2091, 173.6],
	['nodular iron', 'nodular iron', 2050, 2049, 170.1],
	['cast iron', 'cast iron', 1960, 1962, 162.9],
	['aluminium bronze', 'aluminium bronze', 1750, 1749, 145.3],
	['tin bronze', 'tin bronze', 1670, 1673, 138.9]
];

describe.each(PAIRS)('%s on %s', (one, other, table, recomputedPsi, recomputedMPa) => {
	const Cp = elasticCoefficient(metal(one), metal(other));

	test(`recomputed: ${recomputedPsi} √psi, ${recomputedMPa} √MPa`, () => {
		// Half of the last digit; 0.1 % at most.
		expect(Math.abs(rootPsi(Cp) - recomputedPsi)).toBeLessThanOrEqual(0.501);
		expect(Math.abs(Cp - recomputedMPa)).toBeLessThanOrEqual(0.0501);
		expect(Math.abs(rootPsi(Cp) / recomputedPsi - 1)).toBeLessThan(0.001);
	});

	test(`table: ${table} √psi`, () => {
		// Printed to three digits, with steel on itself rounded up and on bronze rounded down. Farthest from its own
		// moduli is aluminium bronze on steel, 0.8 % low.
		const tolerance = other === 'aluminium bronze' && one === 'steel' ? 16.5 : 10.6;
		expect(Math.abs(rootPsi(Cp) - table)).toBeLessThanOrEqual(tolerance);
	});

	test('is the same from either side', () => {
		expect(elasticCoefficient(metal(other), metal(one))).toBeCloseTo(Cp, 10);
	});
});

describe("which Poisson's ratio the published coefficients have", () => {
	// Seen in a public table (Roymech, gear tables): steel on steel 2291 √psi, 190 √MPa.
	test('0.3 for steel gives the 2291 √psi and 190 √MPa of steel on steel; 0.292 does not', () => {
		const onSteel = (poisson: number) => elasticCoefficient(metal('steel', poisson), metal('steel', poisson));
		expect(Math.abs(rootPsi(onSteel(0.3)) - 2291)).toBeLessThanOrEqual(0.5);
		expect(Math.abs(onSteel(0.3) - 190)).toBeLessThanOrEqual(0.5);
		// Recomputed: 2284.7, 0.28 % less.
		expect(rootPsi(onSteel(0.292))).toBeCloseTo(2284.67, 2);
	});

	test('0.211 for cast iron gives the 2077 √psi and 172 √MPa of the same table, 1.4 % under the 2107 with 0.3', () => {
		const grey = elasticCoefficient(metal('steel'), metal('cast iron', 0.211));
		expect(Math.abs(rootPsi(grey) - 2077)).toBeLessThanOrEqual(0.5);
		// Printed 172, cut from 172.49.
		expect(Math.floor(grey)).toBe(172);
	});

	test('taking 0.3 where it is not known costs 2.5 % at most, over what metals have', () => {
		// Grey iron 0.211 to bronze 0.35 (from memory).
		const known = (poisson: number) => elasticCoefficient(metal('steel', poisson), metal('steel', poisson));
		for (const poisson of [0.211, 0.26, 0.28, 0.33, 0.35]) {
			expect(Math.abs(known(0.3) / known(poisson) - 1)).toBeLessThan(0.025);
		}
	});
});
