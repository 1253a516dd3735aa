/**
 * Wear: Buckingham's strength, K and limit load, and Hertz against Buckingham. Where a printed table and its own formula
 * disagree, or two sources do, both stand here. The elastic coefficient has a file of its own.
 */
import { describe, expect, test } from 'vitest';
import {
	buckinghamLoadStressFactor,
	buckinghamRatioFactor,
	buckinghamSurfaceStrength,
	buckinghamWearLoad
} from '$lib/gear/buckingham';
import { elasticCoefficient, hertzContactStress, hertzLoad, pitchPointCurvature } from '$lib/gear/hertz';
import { fromSI, toSI } from '$lib/gear/quantity';

const radians = (degrees: number) => (degrees * Math.PI) / 180;
const psi = (value: number) => toSI({ value, unit: 'psi' });

/** Steel as Buckingham's table takes it: 30 million psi. */
const STEEL = psi(30e6);

/** The formula in psi, as the book prints it. */
const strengthPsi = (mean: number) => 400 * mean - 10_000;

/** K in psi from a strength in psi and an angle in degrees, steel on `other`. */
const K = (strength: number, angle: number, other = STEEL) =>
	fromSI(buckinghamLoadStressFactor(psi(strength), radians(angle), STEEL, other), 'psi');

describe("Buckingham's surface strength", () => {
	test.each([150, 200, 250, 300, 350, 400])('mean Brinell %d: 400 HB - 10,000 psi', (mean) => {
		// 2.76 HB - 70 MPa is the book's metric rounding: within 0.25 %.
		const metric = buckinghamSurfaceStrength(mean, mean);
		expect(Math.abs(metric / psi(strengthPsi(mean)) - 1)).toBeLessThan(0.0025);
	});

	test('goes by the mean of the pair', () => {
		expect(buckinghamSurfaceStrength(200, 300)).toBeCloseTo(620, 9);
		expect(buckinghamSurfaceStrength(300, 200)).toBe(buckinghamSurfaceStrength(250, 250));
	});
});

describe('load-stress factor K of steel on steel, psi', () => {
	interface Row {
		pair: [pinion: number, wheel: number];
		strength: number;
		/** At 14.5 and 20 degrees. */
		recomputed: [number, number];
		printed: [number, number];
	}
	// Printed: Buckingham's table as in Faires and in Doughtie & Vallance (from memory). Recomputed: from the formula.
	// prettier-ignore
	const TABLE: Row[] = [
		{ pair: [150, 150], strength: 50_000, recomputed: [29.8, 40.7], printed: [30, 41] },
		{ pair: [200, 150], strength: 60_000, recomputed: [42.9, 58.6], printed: [43, 58] },
		{ pair: [250, 150], strength: 70_000, recomputed: [58.4, 79.8], printed: [58, 79] },
		{ pair: [200, 200], strength: 70_000, recomputed: [58.4, 79.8], printed: [58, 79] },
		{ pair: [250, 200], strength: 80_000, recomputed: [76.3, 104.2], printed: [76, 103] },
		{ pair: [300, 200], strength: 90_000, recomputed: [96.6, 131.9], printed: [96, 131] },
		{ pair: [250, 250], strength: 90_000, recomputed: [96.6, 131.9], printed: [96, 131] },
		{ pair: [300, 250], strength: 100_000, recomputed: [119.2, 162.9], printed: [119, 162] },
		{ pair: [350, 250], strength: 110_000, recomputed: [144.3, 197.1], printed: [144, 196] },
		{ pair: [300, 300], strength: 110_000, recomputed: [144.3, 197.1], printed: [144, 196] },
		{ pair: [350, 300], strength: 120_000, recomputed: [171.7, 234.5], printed: [171, 233] },
		{ pair: [400, 300], strength: 130_000, recomputed: [201.5, 275.2], printed: [196, 268] },
		{ pair: [350, 350], strength: 130_000, recomputed: [201.5, 275.2], printed: [196, 275] },
		{ pair: [400, 350], strength: 140_000, recomputed: [233.7, 319.2], printed: [233, 318] },
		{ pair: [400, 400], strength: 150_000, recomputed: [268.3, 366.5], printed: [268, 366] }
	];
	const ANGLES = [14.5, 20];
	const entries = TABLE.flatMap(({ pair: [pinion, wheel], strength, recomputed, printed }) =>
		ANGLES.map((angle, column) => ({
			pair: `${pinion}/${wheel}`,
			mean: (pinion + wheel) / 2,
			strength,
			angle,
			recomputed: recomputed[column] ?? NaN,
			printed: printed[column] ?? NaN
		}))
	);
	// These three are 2.7 to 2.8 % under the table's own formula, which gives 350 on 350 and 400 on 300 the same K. Only
	// the fourth of the group, 275 for 350 on 350 at 20 degrees, agrees with it.
	const DISAGREE = ['400/300 at 14.5', '400/300 at 20', '350/350 at 14.5'];

	test.each(entries)('$pair HB at $angle degrees: recomputed $recomputed', (entry) => {
		expect(strengthPsi(entry.mean)).toBe(entry.strength);
		expect(Math.abs(K(entry.strength, entry.angle) - entry.recomputed)).toBeLessThanOrEqual(0.051);
	});

	test.each(entries)('$pair HB at $angle degrees: printed $printed', ({ pair, strength, angle, printed }) => {
		const over = K(strength, angle) / printed - 1;
		if (DISAGREE.includes(`${pair} at ${angle}`)) {
			expect(over).toBeGreaterThan(0.026);
			expect(over).toBeLessThan(0.029);
		} else {
			// The printed integers are cut as often as rounded, by 1.5 psi and 1.2 % at most.
			expect(Math.abs(over)).toBeLessThan(0.0125);
		}
	});

	// A public table of K at 20 degrees (Roymech, gear tables): psi, MPa.
	// prettier-ignore
	test.each([
		[150, 41, 0.281], [175, 59, 0.404], [200, 80, 0.55], [225, 104, 0.719], [250, 132, 0.91], [275, 163, 1.123],
		[300, 197, 1.359], [325, 235, 1.617], [350, 275, 1.898], [375, 319, 2.201], [400, 366, 2.527]
	])('mean Brinell %d at 20 degrees: %d psi, %d MPa', (mean, inPsi, inMPa) => {
		expect(Math.abs(K(strengthPsi(mean), 20) - inPsi)).toBeLessThanOrEqual(0.5);
		expect(Math.abs(psi(K(strengthPsi(mean), 20)) - inMPa)).toBeLessThanOrEqual(0.0005);
	});

	test.each([150, 200, 250, 300, 350, 400])('mean Brinell %d in metric constants: within 0.5 %%', (mean) => {
		const strength = buckinghamSurfaceStrength(mean, mean);
		const metric = buckinghamLoadStressFactor(strength, radians(20), STEEL, STEEL);
		expect(Math.abs(metric / psi(K(strengthPsi(mean), 20)) - 1)).toBeLessThan(0.005);
	});
});

describe('K of a steel pinion on cast iron: the sources contradict each other, because they take different moduli', () => {
	const BUCKINGHAM_IRON = psi(15e6);
	const ROYMECH_IRON = psi(22e6);

	// Roymech, gear tables, 20 degrees: 22 million psi; its rows for 150 and 250 HB have strengths of 50,000 and
	// 70,000 psi.
	test.each([
		[150, 50_000, 48],
		[250, 70_000, 94]
	])('Roymech, pinion of %d HB (%d psi): %d psi', (_brinell, strength, published) => {
		expect(Math.abs(K(strength, 20, ROYMECH_IRON) - published)).toBeLessThanOrEqual(0.5);
	});

	// Buckingham (from memory): 15 million psi. His row for 250 HB stands for a strength of 79,000 psi, not for the
	// 90,000 that steel on steel of that hardness would have: the iron limits it.
	test.each([
		[150, 50_000, 44, 60],
		[200, 70_000, 87, 119],
		[250, 79_000, 112, 152]
	])('Buckingham, pinion of %d HB (%d psi): %d and %d psi', (_brinell, strength, at14, at20) => {
		expect(Math.abs(K(strength, 14.5, BUCKINGHAM_IRON) / at14 - 1)).toBeLessThan(0.02);
		expect(Math.abs(K(strength, 20, BUCKINGHAM_IRON) / at20 - 1)).toBeLessThan(0.02);
	});

	test('at one strength the two moduli are 27 % of K apart, so a K without its moduli says nothing', () => {
		// Recomputed: 61.08 and 48.12 psi at 50,000 psi.
		expect(K(50_000, 20, BUCKINGHAM_IRON)).toBeCloseTo(61.08, 2);
		expect(K(50_000, 20, ROYMECH_IRON)).toBeCloseTo(48.12, 2);
	});
});

describe('the short form K = 0.16 (BHN / 100)² MPa of later texts, steel on steel at 20 degrees', () => {
	const short = (brinell: number) => 0.16 * (brinell / 100) ** 2;

	// Recomputed: how far it lies over Buckingham's K, in percent. Nothing to be held to: a documented difference.
	test.each([
		[150, 28.2],
		[200, 16.3],
		[250, 9.9],
		[300, 6.0],
		[350, 3.3],
		[400, 1.3],
		[450, -0.2]
	])('%d HB: %d %% over', (brinell, percent) => {
		const over = short(brinell) / psi(K(strengthPsi(brinell), 20)) - 1;
		expect(Math.abs(100 * over - percent)).toBeLessThanOrEqual(0.051);
	});

	test('30 and 75 teeth, module 5, 60 mm, 350 HB: Jindal, Machine Design, Ex. 25-3, p. 670', () => {
		const wear = {
			pinion: 150,
			faceWidth: 60,
			ratioFactor: buckinghamRatioFactor(30, 75, false),
			helixAngle: 0
		};
		// Printed: 25,200 N, with the short form's K of 1.96.
		expect(buckinghamWearLoad({ ...wear, loadStress: short(350) })).toBeCloseTo(25_200, 6);
		// By Buckingham's K, 1.8964 in metric constants, it is 24,382 N (recomputed): 3.2 % less.
		const loadStress = buckinghamLoadStressFactor(
			buckinghamSurfaceStrength(350, 350),
			radians(20),
			STEEL,
			STEEL
		);
		expect(25_200 / buckinghamWearLoad({ ...wear, loadStress })).toBeCloseTo(1.0335, 4);
	});
});

describe('limit load', () => {
	describe('24 and 42 teeth of 16 diametral pitch, 1 in wide: Wentzell, Machine Design, Ex. 12.8, p. 272', () => {
		const ratioFactor = buckinghamRatioFactor(24, 42, false);
		const pounds = (published: number) =>
			fromSI(
				buckinghamWearLoad({
					pinion: toSI({ value: 1.5, unit: 'in' }),
					faceWidth: toSI({ value: 1, unit: 'in' }),
					ratioFactor,
					loadStress: psi(published),
					helixAngle: 0
				}),
				'lbf'
			);

		test('with K of 270 psi and a safety factor of 1.2 it falls short of the 699 lb of dynamic load', () => {
			// The book compares and prints no load; recomputed 515.45 lb.
			expect(pounds(270)).toBeCloseTo(515.45, 2);
			expect(pounds(270) / 1.2).toBeLessThan(699);
		});

		test('with K of 470 psi, for 450 HB, it bears it', () => {
			// Recomputed 897.27 lb. The formula gives K = 470.7 there, though 450 HB is beyond Buckingham's table.
			expect(pounds(470)).toBeCloseTo(897.27, 2);
			expect(pounds(470) / 1.2).toBeGreaterThan(699);
			expect(Math.abs(K(strengthPsi(450), 20) / 470 - 1)).toBeLessThan(0.002);
		});
	});

	test('helical, 80 and 320 mm at 45 degrees, 31.25 mm: Khurmi & Gupta, helical gears, 15 kW at 10,000 rpm', () => {
		// Inputs of the example: surface strength 618 MPa, 200 GPa, normal angle 14.4 degrees (printed, from 14.43).
		// Printed K 0.678 MPa and limit load 5,424 N (from memory); recomputed 0.67843 and 5,427.5 N.
		const loadStress = buckinghamLoadStressFactor(618, radians(14.4), 200_000, 200_000);
		expect(Math.abs(loadStress - 0.678)).toBeLessThanOrEqual(0.0005);
		const load = buckinghamWearLoad({
			pinion: 80,
			faceWidth: 31.25,
			ratioFactor: buckinghamRatioFactor(80, 320, false),
			loadStress,
			helixAngle: radians(45)
		});
		expect(load).toBeCloseTo(5427.5, 1);
		expect(Math.abs(load / 5424 - 1)).toBeLessThan(0.001);
	});

	test('an internal wheel raises Q, a rack is the wheel without end', () => {
		expect(buckinghamRatioFactor(20, 60, true)).toBe(3);
		expect(buckinghamRatioFactor(20, null, false)).toBe(2);
		expect(buckinghamRatioFactor(20, 1e9, false)).toBeCloseTo(2, 6);
		expect(buckinghamRatioFactor(20, 1e9, true)).toBeCloseTo(2, 6);
	});
});

describe('Hertz at the pitch point', () => {
	const elastic = (poisson: number) =>
		elasticCoefficient({ modulus: STEEL, poisson }, { modulus: STEEL, poisson });
	const line = {
		elastic: elastic(0.3),
		faceWidth: 40,
		angle: radians(20),
		curvature: pitchPointCurvature(80, 200, { angle: radians(20), helixAngle: 0, internal: false })
	};

	test('the load that brings the stress to the allowable one is found again', () => {
		expect(hertzContactStress(hertzLoad(620, line), line)).toBeCloseTo(620, 9);
	});

	test('twice the load is √2 of the stress', () => {
		expect(hertzContactStress(2000, line) / hertzContactStress(1000, line)).toBeCloseTo(Math.SQRT2, 12);
	});

	// Both are one law. Buckingham leaves out the cos α of the normal force, and his 1.4 stands for the
	// 4 / (π (1 - ν²)) of Hertz, 1.3992 with ν = 0.3. Shigley, Mechanical Engineering Design, p. 328.
	const cases = [14.5, 20, 25].flatMap((angle) =>
		[0, 24].flatMap((helix) =>
			(['external', 'internal', 'rack'] as const).map((mate) => ({ angle, helix, mate }))
		)
	);
	test.each(cases)(
		'$angle degrees, helix $helix, $mate: Buckingham times cos α',
		({ angle, helix, mate }) => {
			const [internal, helixAngle] = [mate === 'internal', radians(helix)];
			const wheel = mate === 'rack' ? null : { teeth: 50, diameter: 200 };
			const plane = { angle: radians(angle), helixAngle, internal };
			const byHertz = hertzLoad(620, {
				...line,
				angle: radians(angle),
				curvature: pitchPointCurvature(80, wheel?.diameter ?? null, plane)
			});
			const byBuckingham = buckinghamWearLoad({
				pinion: 80,
				faceWidth: 40,
				ratioFactor: buckinghamRatioFactor(20, wheel?.teeth ?? null, internal),
				loadStress: buckinghamLoadStressFactor(620, radians(angle), STEEL, STEEL),
				helixAngle
			});
			const ratio = byHertz / (byBuckingham * Math.cos(radians(angle)));
			expect(Math.abs(ratio - 1)).toBeLessThan(0.002);
			// Recomputed: 1.4 π (1 - 0.3²) / 4.
			expect(ratio).toBeCloseTo(1.000597, 6);
		}
	);

	test('with ν = 0.292 the two are 0.6 % apart', () => {
		// Recomputed: 1.4 π (1 - 0.292²) / 4 = 1.005805.
		const softer = hertzLoad(620, { ...line, elastic: elastic(0.292) });
		expect(softer / hertzLoad(620, line)).toBeCloseTo(1.005805 / 1.000597, 6);
	});

	test('a helix flattens the flanks in its normal plane: r = d sin αn / (2 cos² β)', () => {
		// 100 mm and 200 mm at αn = 20 and β = 24 degrees: r1 = 20.4910, r2 = 40.9820 mm (recomputed by hand).
		const helical = { angle: radians(20), helixAngle: radians(24), internal: false };
		expect(pitchPointCurvature(100, 200, helical)).toBeCloseTo(1 / 20.491 + 1 / 40.982, 5);
		const cosine = Math.cos(radians(24));
		expect(pitchPointCurvature(100, 200, helical)).toBeCloseTo(
			cosine ** 2 * pitchPointCurvature(100, 200, { ...helical, helixAngle: 0 }),
			12
		);
	});

	test('an internal wheel wraps round the pinion, a rack is flat', () => {
		const at = (internal: boolean) =>
			pitchPointCurvature(80, 200, { angle: radians(20), helixAngle: 0, internal });
		const flat = pitchPointCurvature(80, null, { angle: radians(20), helixAngle: 0, internal: false });
		expect(at(true)).toBeLessThan(flat);
		expect(at(false)).toBeGreaterThan(flat);
		expect((at(true) + at(false)) / 2).toBeCloseTo(flat, 12);
	});
});
