/** Basic racks against the standards' figures, the forms that are given by their rack, and Dolan and Broghamer. */
import { describe, expect, test } from 'vitest';
import { lewisFormFactorByGeometry } from '$lib/gear/form-factor-geometry';
import { memberOf, tipDiameter } from '$lib/gear/member';
import { largestTipRadius, rackOf, straightDepth, type BasicRack } from '$lib/gear/rack';
import { stressConcentration } from '$lib/gear/stress-concentration';

const radians = (degrees: number) => (degrees * Math.PI) / 180;

describe('named forms', () => {
	test('14.5 degree full depth: dedendum 1.157, fillet 0.209 (ANSI B6.1; US Navy, Machinery Repairman)', () => {
		const rack = rackOf('full-depth', radians(14.5));
		expect(rack.addendum).toBe(1);
		expect(rack.dedendum).toBeCloseTo(1.15708, 5);
		expect(rack.tipRadius).toBeCloseTo(0.20955, 5);
		expect(straightDepth(rack)).toBeCloseTo(1, 12);
	});

	test('20 and 25 degree full depth: dedendum 1.25, fillet 0.3 (Mott, p. 319; ANSI B6.1-1968; ISO 53:1998 B)', () => {
		for (const angle of [20, 22.5, 25]) {
			expect(rackOf('full-depth', radians(angle))).toMatchObject({
				addendum: 1,
				dedendum: 1.25,
				tipRadius: 0.3
			});
		}
	});

	test('20 degree stub: 0.8 and 1.0, fillet 0.3 (AGMA 201.02A, from memory)', () => {
		const rack = rackOf('stub', radians(20));
		expect(rack).toMatchObject({ addendum: 0.8, dedendum: 1 });
		expect(rack.tipRadius).toBeCloseTo(0.30396, 5);
	});
});

describe('largest tip radius that leaves the rack a land', () => {
	// Recomputed for the standards' racks: ISO 53:1998 A to D, the older full depth, stub and 25 degrees.
	test.each([
		[14.5, 1.15708, 0.62788],
		[20, 1.15708, 0.52021],
		[20, 1.25, 0.47191],
		[20, 1.4, 0.39394],
		[20, 1, 0.60186],
		[25, 1.25, 0.31788]
	])('%d degrees, dedendum %d: %d', (angle, dedendum, published) => {
		const rack: BasicRack = { addendum: 1, dedendum, tipRadius: 0, pressureAngle: radians(angle) };
		expect(largestTipRadius(rack)).toBeCloseTo(published, 4);
	});

	test('the profile of ISO 53:1998 D, 0.39 at 1.4, has just room', () => {
		const rack = { addendum: 1, dedendum: 1.4, tipRadius: 0.39, pressureAngle: radians(20) };
		expect(largestTipRadius(rack)).toBeGreaterThan(rack.tipRadius);
		expect(lewisFormFactorByGeometry({ teeth: 20, rack, profileShift: 0, tipWear: 0 })).toHaveProperty('Y');
	});
});

test('a stub by two pitches, 5/7 with 20 teeth: 4 in pitch diameter, 4.2857 in outside (Machinery’s Handbook)', () => {
	// From memory: pitch by the first figure, addendum 1/7 in and dedendum 1.25/7 in by the second.
	const form = { addendum: 5 / 7, dedendum: (1.25 * 5) / 7, tipRadius: 0.2 };
	const member = memberOf({
		kind: 'spur',
		teeth: 20,
		pitch: { system: 'diametral', value: 5 },
		pressureAngle: 20,
		form
	});
	expect((member.pitchDiameter ?? NaN) / 25.4).toBeCloseTo(4, 12);
	expect((tipDiameter(member) ?? NaN) / 25.4).toBeCloseTo(4.2857, 4);
});

describe('Dolan and Broghamer', () => {
	// Classic constants H, L, M of Kf = H + (t / rf)^L (t / h)^M (from memory); AGMA 908-B89 fits them.
	test.each([
		[14.5, 0.22, 0.2, 0.4],
		[20, 0.18, 0.15, 0.45],
		[25, 0.14, 0.11, 0.5]
	])('%d degrees: %d, %d, %d', (angle, H, L, M) => {
		const rack = { addendum: 1, dedendum: 1.25, tipRadius: 0.3, pressureAngle: radians(angle) };
		for (const [thickness, height, teeth] of [
			[1.9, 1.75, 24],
			[2.2, 1.9, 60]
		] as const) {
			const section = { thickness, height, teeth, rack, profileShift: 0 };
			// rf = rho + (b - rho)² / (d / 2 + b - rho), with b - rho = 0.95.
			const radius = 0.3 + 0.95 ** 2 / (teeth / 2 + 0.95);
			const classic = H + (thickness / radius) ** L * (thickness / height) ** M;
			expect((stressConcentration(section, radians(angle)) ?? NaN) / classic).toBeCloseTo(1, 2);
		}
	});

	test('a sharp fillet of a rack has no radius, so no factor', () => {
		const rack = { addendum: 1, dedendum: 1.25, tipRadius: 0, pressureAngle: radians(20) };
		const section = { thickness: 2, height: 2, teeth: Infinity, rack, profileShift: 0 };
		expect(stressConcentration(section, radians(20))).toBeNull();
	});
});
