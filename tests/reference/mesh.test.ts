/** How gears mesh: contact ratios, counts that interfere or are undercut, backlash, against published values. */
import { describe, expect, test } from 'vitest';
import { recommendedBacklash } from '$lib/gear/backlash';
import { contactPath } from '$lib/gear/contact-path';
import type { ToothedPart } from '$lib/gear/contract';
import { isUndercut } from '$lib/gear/contact-on-flanks';
import { memberOf, type Member } from '$lib/gear/member';
import { meshOf } from '$lib/gear/mesh';
import { unrecorded } from '$lib/gear/working';

interface Textbook {
	module?: number;
	angle?: number;
	/** In modules. A rack whose flank is straight for just this depth, as textbooks assume. */
	addendum?: number;
	thickness?: number;
	kind?: ToothedPart['kind'];
}

const gear = (teeth: number | undefined, of: Textbook = {}): Member =>
	memberOf({
		kind: of.kind ?? 'spur',
		teeth,
		pitch: { system: 'module', value: of.module ?? 1 },
		pressureAngle: of.angle ?? 20,
		form: { addendum: of.addendum ?? 1, dedendum: of.addendum ?? 1, tipRadius: 0 },
		toothThickness: of.thickness === undefined ? undefined : { value: of.thickness, unit: 'mm' }
	});
const rack = (of: Textbook = {}) => gear(undefined, { ...of, kind: 'rack' });

function mesh(one: Member, other: Member, centreDistance: number | null = null) {
	const answer = meshOf({ gear: one, mate: other, centreDistance, faceWidth: 10 }, unrecorded);
	if (!answer.figures) throw new Error(JSON.stringify(answer.refusals));
	return answer.figures;
}

const pathOf = (one: Member, two: Member, angle: number) =>
	contactPath({
		pinion: one,
		wheel: two,
		ratio: null,
		standardCentre: null,
		centre: ((one.pitchDiameter ?? NaN) + (two.pitchDiameter ?? NaN)) / 2,
		operatingAngle: (angle * Math.PI) / 180
	});

describe('path and ratio of contact', () => {
	test('30 and 80 teeth, module 12, addendum 10 mm: Khurmi & Gupta, Theory of Machines, Ex. 12.3, p. 398', () => {
		const of = { module: 12, addendum: 10 / 12 };
		const [pinion, wheel] = [gear(30, of), gear(80, of)];
		expect(pathOf(pinion, wheel, 20)).toBeCloseTo(52.3, 1);
		// Arc of contact 55.61 mm; the printed contact ratio, 1.5, is rounded to one decimal.
		expect(pathOf(pinion, wheel, 20) / Math.cos(Math.PI / 9)).toBeCloseTo(55.61, 2);
		expect(mesh(pinion, wheel).contactRatio).toBeCloseTo(1.5, 1);
		expect(mesh(pinion, wheel).contactRatio).toBeCloseTo(1.47516, 5);
	});

	// Bevan, The Theory of Machines, Ex. 10.6, p. 338, as its public transcription runs it: 28 and 44 teeth.
	test.each([
		[20, 4.97, 1.685],
		[14.5, 6.092, 2]
	])('28 and 44 teeth at %d degrees: path %d modules, ratio %d', (angle, path, ratio) => {
		const [pinion, wheel] = [gear(28, { angle }), gear(44, { angle })];
		expect(Math.abs(pathOf(pinion, wheel, angle) - path)).toBeLessThanOrEqual(0.005);
		expect(Math.abs(mesh(pinion, wheel).contactRatio - ratio)).toBeLessThanOrEqual(0.003);
	});

	// The book's own pair, 28 and 45 teeth (recomputed).
	test.each([
		[20, 1.6869],
		[14.5, 2.0067]
	])('28 and 45 teeth at %d degrees: %d', (angle, ratio) => {
		expect(mesh(gear(28, { angle }), gear(45, { angle })).contactRatio).toBeCloseTo(ratio, 4);
	});

	test('no approach is longer than r sin α: Bevan, Ex. 10.4, p. 334', () => {
		// 12 and 60 teeth interfere, so contact begins where the line of action leaves the pinion's base circle.
		const [pinion, wheel] = [gear(12, { angle: 14.5 }), gear(60, { angle: 14.5 })];
		const angle = (14.5 * Math.PI) / 180;
		const recess = Math.sqrt(7 ** 2 - (6 * Math.cos(angle)) ** 2) - 6 * Math.sin(angle);
		expect(pathOf(pinion, wheel, 14.5)).toBeCloseTo(6 * Math.sin(angle) + recess, 12);
		// Tip to tip would be 1.88.
		expect(mesh(pinion, wheel).contactRatio).toBeCloseTo(1.2842, 4);
	});

	test('a rack has the ratio that a very large wheel tends to', () => {
		const wheel = mesh(gear(24), gear(5000)).contactRatio;
		expect(mesh(gear(24), rack()).contactRatio).toBeCloseTo(wheel, 2);
	});

	test('an internal wheel has more contact than an external one of the same count', () => {
		const inside = mesh(gear(20), gear(60, { kind: 'internal', addendum: 0.8 })).contactRatio;
		expect(inside).toBeGreaterThan(mesh(gear(20), gear(60, { addendum: 0.8 })).contactRatio);
	});
});

describe('fewest teeth that the rack does not undercut', () => {
	// 2 ha / sin² α: 31.9, 17.1, 11.2 and 13.7 for stub; Bevan, Ex. 10.4, p. 334 (18 at 20 degrees), others recomputed.
	test.each([
		[14.5, 1, 32],
		[20, 1, 18],
		[25, 1, 12],
		[20, 0.8, 14]
	])('%d degrees, addendum %d: %d', (angle, addendum, fewest) => {
		const cut = (teeth: number) => {
			const member = gear(teeth, { angle, addendum });
			return isUndercut(member);
		};
		expect(cut(fewest)).toBe(false);
		expect(cut(fewest - 1)).toBe(true);
	});
});

describe('fewest pinion teeth that a wheel of a ratio does not interfere with', () => {
	// Limit of interference of full depth teeth; at 20 degrees 13 for an equal pair, 15 for 3:1 and 18 for a rack: Bevan,
	// Ex. 10.4, p. 334; others recomputed.
	const table: [angle: number, counts: [ratio: number, fewest: number][]][] = [
		[
			14.5,
			[
				[1, 23],
				[1.5, 25],
				[2, 27],
				[3, 28],
				[4, 29],
				[5, 30],
				[10, 31],
				[Infinity, 32]
			]
		],
		[
			20,
			[
				[1, 13],
				[1.5, 14],
				[2, 15],
				[3, 15],
				[4, 16],
				[5, 16],
				[10, 17],
				[Infinity, 18]
			]
		],
		[
			25,
			[
				[1, 9],
				[1.5, 10],
				[2, 10],
				[3, 10],
				[4, 11],
				[5, 11],
				[10, 11],
				[Infinity, 12]
			]
		]
	];
	const cases = table.flatMap(([angle, counts]) =>
		counts.map(([ratio, fewest]) => ({ angle, ratio, fewest }))
	);

	test.each(cases)('$angle degrees, ratio $ratio: $fewest', ({ angle, ratio, fewest }) => {
		// A wheel of a whole count: for a ratio that gives none, the next above, which is the harder case.
		const interferes = (teeth: number) =>
			mesh(
				gear(teeth, { angle }),
				ratio === Infinity ? rack({ angle }) : gear(Math.ceil(teeth * ratio), { angle })
			).interference;
		expect(interferes(fewest)).toBe(false);
		expect(interferes(fewest - 1)).toBe(true);
	});
});

describe('backlash', () => {
	// Change of backlash along the pitch circle per change of centre distance, 2 tan α (from memory).
	test.each([
		[14.5, 0.517],
		[20, 0.728],
		[25, 0.933]
	])('%d degrees: %d a unit', (angle, perUnit) => {
		const [pinion, wheel] = [gear(40, { angle, module: 4 }), gear(60, { angle, module: 4 })];
		const step = 0.01;
		const normal = mesh(pinion, wheel, 200 + step).normalBacklash ?? NaN;
		expect(normal / Math.cos((angle * Math.PI) / 180) / step).toBeCloseTo(perUnit, 2);
	});

	test('20 and 40 teeth, module 2, at 60.1 mm: 0.07337 mm on the operating circle (from memory, recomputed)', () => {
		const { normalBacklash, operatingPressureAngle } = mesh(
			gear(20, { module: 2 }),
			gear(40, { module: 2 }),
			60.1
		);
		const transverse = (normalBacklash ?? NaN) / Math.cos((operatingPressureAngle * Math.PI) / 180);
		expect(transverse).toBeCloseTo(0.07337, 5);
	});

	test('teeth thinner by s have s cos α more of it, at the standard distance', () => {
		const nominal = Math.PI / 2;
		const pinion = gear(20, { thickness: nominal - 0.04 });
		const { normalBacklash } = mesh(pinion, gear(40, { thickness: nominal - 0.06 }), 30 + 1e-9);
		expect(normalBacklash).toBeCloseTo(0.1 * Math.cos(Math.PI / 9), 5);
	});

	test('an internal pair at its own distance has none, and more when the pinion moves inwards', () => {
		const [pinion, ring] = [gear(20), gear(60, { kind: 'internal' })];
		expect(mesh(pinion, ring, 20 + 1e-9).normalBacklash).toBeCloseTo(0, 6);
		expect(mesh(pinion, ring, 19.9).normalBacklash).toBeGreaterThan(0.06);
		expect(mesh(pinion, ring, 20.1).normalBacklash).toBeLessThan(-0.06);
	});

	// AGMA 2002-B88 (Mott, Table 8-5; from memory), inches: its closed form is 1.5 times that of ISO/TR 10064-2.
	// prettier-ignore
	test.each([
		[18, 2, 0.005], [18, 4, 0.006], [12, 2, 0.006], [12, 4, 0.007], [12, 8, 0.009], [8, 2, 0.007], [8, 4, 0.008],
		[8, 8, 0.01], [8, 16, 0.014], [5, 4, 0.01], [5, 8, 0.012], [5, 16, 0.016], [3, 4, 0.014], [3, 8, 0.016],
		[3, 16, 0.02], [3, 32, 0.028], [2, 8, 0.021], [2, 16, 0.025], [2, 32, 0.033], [1.25, 16, 0.034],
		[1.25, 32, 0.042]
	])('least for %d DP at %d in: %d in by AGMA, two thirds of it by ISO/TR 10064-2', (pitch, centre, published) => {
		const { least } = recommendedBacklash(25.4 / pitch, centre * 25.4);
		expect(Math.abs((least * 1.5) / 25.4 - published)).toBeLessThanOrEqual(0.00045);
	});

	// ISO/TR 10064-2 (from memory).
	test.each([
		[3, 100, 0.133],
		[5, 200, 0.207]
	])('least for module %d at %d mm: %d mm', (module, centre, published) => {
		expect(recommendedBacklash(module, centre).least).toBeCloseTo(published, 3);
	});

	// Machinery's Handbook, recommended backlash of coarse pitch (from memory), inches: the end of each range.
	// prettier-ignore
	test.each([
		[10, 5, 0.015], [19.9, 4, 0.015],
		[6, 7, 0.02], [9.9, 10, 0.02], [12, 7, 0.02],
		[4, 15, 0.03], [8, 15, 0.025], [12, 20, 0.02],
		[3, 25, 0.04], [3.5, 25, 0.03], [8, 30, 0.03],
		[1, 35, 0.06], [2, 35, 0.045], [5.9, 35, 0.04], [6, 35, 0.035],
		[0.5, 45, 0.07], [3.4, 45, 0.055], [4, 45, 0.05], [8, 45, 0.04],
		[1.9, 60, 0.08], [3, 60, 0.065], [4, 80, 0.06],
		[1, 90, 0.095], [2, 100, 0.08]
	])('most for %d DP at %d in: %d in', (pitch, centre, published) => {
		expect((recommendedBacklash(25.4 / pitch, centre * 25.4).most ?? NaN) / 25.4).toBeCloseTo(published, 9);
	});

	test('where the table has no entry there is no upper end', () => {
		expect(recommendedBacklash(25.4 / 4, 4 * 25.4).most).toBeNull();
		expect(recommendedBacklash(0.5, 100).most).toBeNull();
		expect(recommendedBacklash(25.4, 101 * 25.4).most).toBeNull();
	});
});

describe('ratio and centre distance', () => {
	test('25 and 60 teeth of module 5: 212.5 mm, Jindal, Machine Design, Ex. 25-1, p. 669', () => {
		expect(mesh(gear(25, { module: 5 }), gear(60, { module: 5 }))).toMatchObject({
			standardCentreDistance: 212.5,
			ratio: 2.4,
			huntingTooth: false
		});
	});

	test('16 and 32 teeth of 8 DP: 3 in, Wentzell, Machine Design, Ex. 11.3, p. 231', () => {
		const { standardCentreDistance } = mesh(gear(16, { module: 25.4 / 8 }), gear(32, { module: 25.4 / 8 }));
		expect((standardCentreDistance ?? NaN) / 25.4).toBeCloseTo(3, 12);
	});

	test('counts without a common factor meet in every pairing', () => {
		expect(mesh(gear(24), gear(60)).huntingTooth).toBe(false);
		expect(mesh(gear(24), gear(61)).huntingTooth).toBe(true);
		expect(mesh(gear(61), gear(24)).huntingTooth).toBe(true);
	});

	test('the operating angle at a measured distance: cos αw = m (N1 + N2) cos α / (2 C)', () => {
		const { operatingPressureAngle } = mesh(gear(20, { module: 2 }), gear(40, { module: 2 }), 61);
		expect(Math.cos((operatingPressureAngle * Math.PI) / 180)).toBeCloseTo(
			(60 * Math.cos(Math.PI / 9)) / 61,
			12
		);
	});
});
