/** The generated tooth: its curves meet, its thickness is that of its rack, and what no rack cuts is refused. */
import { describe, expect, test } from 'vitest';
import { filletPoint } from '$lib/gear/fillet';
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

	test('has an outline without gaps, the same on both sides, from space to space', () => {
		const points = toothOutline(made, 40);
		const half = Math.PI / made.teeth;
		const [first, last] = [points[0], points.at(-1)];
		expect(Math.atan2(last?.x ?? NaN, last?.y ?? NaN)).toBeCloseTo(half, 9);
		expect(first?.x).toBeCloseTo(-(last?.x ?? NaN), 12);
		points.slice(1).forEach(({ x, y }, i) => {
			const before = points[i];
			expect(Math.hypot(x - (before?.x ?? NaN), y - (before?.y ?? NaN))).toBeLessThan(0.2);
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
