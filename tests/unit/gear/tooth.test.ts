/** The generated tooth: its curves meet, its thickness is that of its rack, and what no rack cuts is refused. */
import { describe, expect, test } from 'vitest';
import { filletPoint, type FilletPoint } from '$lib/gear/fillet';
import { lewisFormFactorByGeometry } from '$lib/gear/form-factor-geometry';
import { isUndercut } from '$lib/gear/contact-on-flanks';
import { memberOf } from '$lib/gear/member';
import { rackOf, straightDepth, type BasicRack } from '$lib/gear/rack';
import {
	generateTooth,
	halfThicknessAngle,
	toothOutline,
	type Tooth,
	type ToothShape
} from '$lib/gear/tooth';

const radians = (degrees: number) => (degrees * Math.PI) / 180;
const FULL = rackOf('full-depth', radians(20));

const shape = (teeth: number, change: Partial<ToothShape> & { rack?: BasicRack } = {}): ToothShape => ({
	teeth,
	rack: FULL,
	profileShift: 0,
	tipWear: 0,
	...change
});

function tooth(teeth: number, change: Partial<ToothShape> = {}): Tooth {
	const made = generateTooth(shape(teeth, change));
	if ('code' in made) throw new Error(made.text);
	return made;
}

describe.each([
	['plain', shape(24)],
	['undercut', shape(11)],
	['undercut, 14.5 degrees', shape(12, { rack: rackOf('full-depth', radians(14.5)) })],
	['shifted outwards', shape(12, { profileShift: 0.4 })],
	['shifted inwards', shape(40, { profileShift: -0.3 })],
	['stub', shape(18, { rack: rackOf('stub', radians(20)) })],
	['25 degrees', shape(10, { rack: rackOf('full-depth', radians(25)) })],
	['with a sharp rack', shape(30, { rack: { ...FULL, tipRadius: 0 } })],
	['worn at the tip', shape(20, { tipWear: 0.3 })],
	['of very many teeth', shape(4000)],
	['of a fraction of a tooth more', shape(31.48)]
])('a tooth %s', (_name, of) => {
	const made = tooth(of.teeth, of);

	test('is as thick at the pitch circle as the space of its rack: π / 2 + 2 x tan α', () => {
		const thickness = 2 * made.pitchRadius * halfThicknessAngle(made, made.pitchRadius);
		expect(thickness).toBeCloseTo(Math.PI / 2 + 2 * of.profileShift * Math.tan(of.rack.pressureAngle), 9);
	});

	test('has a fillet that ends on the flank and at the root', () => {
		const { rack, teeth, profileShift, formAngle, formRadius, rootRadius } = made;
		const end = filletPoint(rack, teeth, profileShift, formAngle);
		expect(Math.hypot(end.x, end.y)).toBeCloseTo(formRadius, 9);
		expect(Math.atan2(end.x, end.y)).toBeCloseTo(halfThicknessAngle(made, formRadius), 9);
		const bottom = filletPoint(rack, teeth, profileShift, Math.PI / 2);
		expect(Math.hypot(bottom.x, bottom.y)).toBeCloseTo(rootRadius, 9);
	});

	test('has a fillet whose normal is square to its run', () => {
		const { rack, teeth, profileShift, formAngle } = made;
		const small = 1e-4;
		for (const share of [0.1, 0.5, 0.9]) {
			const psi = formAngle + share * (Math.PI / 2 - formAngle);
			const [before, at, after] = [psi - small, psi, psi + small].map((angle) =>
				filletPoint(rack, teeth, profileShift, angle)
			) as [FilletPoint, FilletPoint, FilletPoint];
			const run = { x: after.x - before.x, y: after.y - before.y };
			const along = (run.x * at.normal.x + run.y * at.normal.y) / Math.hypot(run.x, run.y);
			expect(Math.abs(along)).toBeLessThan(1e-5);
			expect(Math.hypot(at.normal.x, at.normal.y)).toBeCloseTo(1, 12);
		}
	});

	test('passes from fillet to flank without a corner, unless it is undercut', () => {
		const { rack, teeth, profileShift, formAngle, baseRadius, undercut } = made;
		const { x, y, normal } = filletPoint(rack, teeth, profileShift, formAngle);
		// The normal of an involute is tangent to the base circle.
		const fromCentre = Math.abs(x * normal.y - y * normal.x);
		if (undercut) expect(fromCentre).toBeLessThan(baseRadius);
		else expect(fromCentre / baseRadius).toBeCloseTo(1, 12);
	});

	test('has an outline without gaps, the same on both sides, from space to space', () => {
		const points = toothOutline(made, 400);
		const half = Math.PI / made.teeth;
		const [first, last] = [points[0], points.at(-1)];
		expect(Math.atan2(last?.x ?? NaN, last?.y ?? NaN)).toBeCloseTo(half, 9);
		expect(first?.x).toBeCloseTo(-(last?.x ?? NaN), 12);
		points.slice(1).forEach(({ x, y }, i) => {
			const before = points[i];
			expect(Math.hypot(x - (before?.x ?? NaN), y - (before?.y ?? NaN))).toBeLessThan(0.02);
		});
		const radii = points.map(({ x, y }) => Math.hypot(x, y));
		expect(Math.max(...radii)).toBeCloseTo(made.tipRadius, 9);
		expect(Math.min(...radii)).toBeCloseTo(made.rootRadius, 9);
	});

	test('leaves the rack’s flank where that is tangent, unless it is undercut', () => {
		const depth = straightDepth(of.rack) - of.profileShift;
		const deep = depth > (of.teeth / 2) * Math.sin(of.rack.pressureAngle) ** 2;
		expect(made.undercut).toBe(deep);
		if (!deep) expect(made.formAngle).toBe(of.rack.pressureAngle);
		else expect(made.formRadius).toBeGreaterThan(made.baseRadius);
	});
});

describe('undercut', () => {
	// 2 hs / sin² α: 31.9, 17.1, 11.2 and 13.7 for stub; Bevan, Ex. 10.4, p. 334 (18 at 20 degrees), others recomputed.
	test.each([
		[14.5, 1, 32],
		[20, 1, 18],
		[25, 1, 12],
		[20, 0.8, 14]
	])('%d degrees, straight to %d: from %d teeth on there is none', (angle, addendum, fewest) => {
		const dedendum = addendum + 0.15;
		const form = { addendum, dedendum, tipRadius: 0.15 / (1 - Math.sin(radians(angle))) };
		const rack = rackOf(form, radians(angle));
		expect(straightDepth(rack)).toBeCloseTo(addendum, 12);
		const deep = (teeth: number) => {
			const made = tooth(teeth, { rack });
			const member = memberOf({
				kind: 'spur',
				teeth,
				pitch: { system: 'module', value: 1 },
				pressureAngle: angle,
				form
			});
			expect(isUndercut(member)).toBe(made.undercut);
			return made.undercut;
		};
		expect(deep(fewest)).toBe(false);
		expect(deep(fewest - 1)).toBe(true);
	});

	// A shift that just avoids undercut is a usual choice, and rounded to a few decimals it leaves a trace of it.
	test.each([
		[14.5, 'full-depth'],
		[20, 'full-depth'],
		[25, 'full-depth'],
		[20, 'stub']
	] as const)('however slight, costs a tooth nothing: %d degrees %s', (angle, form) => {
		const rack = rackOf(form, radians(angle));
		for (let teeth = 10; teeth <= 30; teeth++) {
			const limit = straightDepth(rack) - (teeth / 2) * Math.sin(radians(angle)) ** 2;
			const plain = lewisFormFactorByGeometry(shape(teeth, { rack, profileShift: limit }));
			for (const trace of [1e-8, 1e-7, 1e-6, 1e-5, 1e-4]) {
				const of = { rack, profileShift: limit - trace };
				const made = tooth(teeth, of);
				expect(made.undercut).toBe(true);
				expect(made.formRadius / made.baseRadius).toBeCloseTo(1, 5);
				const traced = lewisFormFactorByGeometry(shape(teeth, of));
				if ('code' in plain || 'code' in traced) expect(traced).toEqual(plain);
				else expect(Math.abs(traced.Y - plain.Y)).toBeLessThan(2 * trace);
			}
		}
	});

	test('starts the flank where the fillet crosses it, outside the base circle', () => {
		for (let teeth = 8; teeth <= 17; teeth++) {
			for (let profileShift = -0.3; profileShift < 0.5; profileShift += 0.0137) {
				const made = generateTooth(shape(teeth, { profileShift }));
				if ('code' in made || !made.undercut) continue;
				const { x, y } = filletPoint(FULL, teeth, profileShift, made.formAngle);
				expect(made.formRadius).toBeGreaterThanOrEqual(made.baseRadius);
				expect(Math.atan2(x, y)).toBeCloseTo(halfThicknessAngle(made, made.formRadius), 9);
			}
		}
	});
});

test('a shape that its owner changes is worked out anew', () => {
	const mine = shape(20);
	const before = lewisFormFactorByGeometry(mine);
	mine.teeth = 40;
	mine.rack = { ...mine.rack, pressureAngle: radians(25) };
	expect(lewisFormFactorByGeometry(mine)).toEqual(lewisFormFactorByGeometry({ ...mine }));
	expect(lewisFormFactorByGeometry(mine)).not.toEqual(before);
	expect(lewisFormFactorByGeometry(shape(20))).toEqual(before);
});

test('an angle that comes from another plane is not refused for its rounding', () => {
	for (const degrees of [14.5 - 5e-7, 25 + 5e-7]) {
		expect(tooth(30, { rack: { ...FULL, pressureAngle: radians(degrees) } }).undercut).toBe(degrees < 20);
	}
});

describe('is refused', () => {
	test.each<[string, ToothShape]>([
		['too-few-teeth', shape(7)],
		['angle-not-covered', shape(20, { rack: { ...FULL, pressureAngle: radians(14) } })],
		['angle-not-covered', shape(20, { rack: { ...FULL, pressureAngle: radians(25.5) } })],
		['rack-tip-too-round', shape(20, { rack: { ...FULL, tipRadius: 0.48 } })],
		['shift-too-large', shape(20, { profileShift: 1 })],
		['undercut-too-deep', shape(8, { rack: { ...FULL, pressureAngle: radians(14.5), tipRadius: 0.2 } })],
		['tip-worn-away', shape(20, { tipWear: 2.1 })],
		['tooth-pointed', shape(10, { profileShift: 0.9 })]
	])('%s', (code, of) => {
		expect(generateTooth(of)).toMatchObject({ code });
	});

	test('eight teeth at 20 degrees are drawn, though the Lewis method begins at ten', () => {
		expect(tooth(8, { profileShift: 0.3 }).tipRadius).toBeCloseTo(5.3, 12);
	});
});
