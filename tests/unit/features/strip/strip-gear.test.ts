/** The drawn teeth are those of the gear, in millimetres: measured on the outline, against formulas worked out here. */
import { describe, expect, test } from 'vitest';
import { stripDrawing, type StripDrawing, type StripGear } from '$lib/features/strip/strip-gear';

const GEAR: StripGear = {
	label: 'Module 5',
	teeth: 25,
	module: 5,
	pressureAngle: 20,
	form: 'full-depth',
	profileShift: 0
};

function drawn(change: Partial<StripGear> = {}, width = 140): StripDrawing {
	const drawing = stripDrawing({ ...GEAR, ...change }, width);
	if ('code' in drawing) throw new Error(drawing.text);
	return drawing;
}

type At = { x: number; y: number };

function points({ path }: StripDrawing): At[] {
	return path
		.replace(/[MLZ]/g, '')
		.trim()
		.split(/\s{2,}/)
		.map((pair) => {
			const [x, y] = pair.split(' ').map(Number);
			return { x: x!, y: y! };
		});
}

const radiusOf = ({ centre }: StripDrawing, { x, y }: At) => Math.hypot(x - centre.x, y - centre.y);

/** Where the outline crosses a circle about the gear's centre: angles from the upright, from the left. */
function crossings(drawing: StripDrawing, radius: number): number[] {
	const all = points(drawing);
	return all
		.flatMap((to, i) => {
			const from = all[(i || all.length) - 1]!;
			const [one, two] = [radiusOf(drawing, from) - radius, radiusOf(drawing, to) - radius];
			if (one * two >= 0) return [];
			const share = one / (one - two);
			const x = from.x + share * (to.x - from.x) - drawing.centre.x;
			const y = drawing.centre.y - (from.y + share * (to.y - from.y));
			return [Math.atan2(x, y)];
		})
		.sort((a, b) => a - b);
}

const radians = (degrees: number) => (degrees * Math.PI) / 180;
const inv = (angle: number) => Math.tan(angle) - angle;

describe.each<[string, Partial<StripGear>]>([
	['module 5, 25 teeth, 20 degrees', {}],
	['DP 5, 25 teeth, 14.5 degrees', { module: 25.4 / 5, pressureAngle: 14.5 }],
	['a stub gear', { form: 'stub', teeth: 18, module: 6 }],
	['shifted outwards', { teeth: 14, profileShift: 0.3 }],
	['fine, of many teeth', { module: 1, teeth: 180 }],
	['undercut, of few teeth', { teeth: 11, module: 4 }]
])('%s', (_name, change) => {
	const gear = { ...GEAR, ...change };
	const drawing = drawn(change);
	const { teeth, module, profileShift } = gear;
	const addendum = gear.form === 'stub' ? 0.8 : 1;

	test('reaches to the tip circle of d + 2 m (ha + x), and no further', () => {
		const tip = (module * (teeth + 2 * (addendum + profileShift))) / 2;
		expect(drawing.tipRadius).toBeCloseTo(tip, 9);
		expect(Math.max(...points(drawing).map((at) => radiusOf(drawing, at)))).toBeCloseTo(tip, 3);
		// The middle tooth is upright and touches the upper edge.
		const middle = drawing.tips[(drawing.drawn - 1) / 2]!;
		expect(middle.y).toBeCloseTo(0, 9);
		expect(middle.x).toBeCloseTo(drawing.width / 2, 6);
	});

	// s = m (π / 2 + 2 x tan α) on the pitch circle; at another radius R (inv α + s / d - inv αR) 2 R. Definition.
	test('has teeth as thick as the involute makes them, at the pitch circle and near the tip', () => {
		const alpha = radians(gear.pressureAngle);
		const pitch = (module * teeth) / 2;
		const arc = module * (Math.PI / 2 + 2 * profileShift * Math.tan(alpha));
		for (const radius of [pitch, pitch + 0.7 * addendum * module]) {
			const at = Math.acos((pitch * Math.cos(alpha)) / radius);
			const thickness = 2 * radius * (arc / (2 * pitch) + inv(alpha) - inv(at));
			const found = crossings(drawing, radius);
			expect(found).toHaveLength(2 * drawing.drawn);
			for (let i = 0; i < found.length; i += 2) {
				expect((found[i + 1]! - found[i]!) * radius).toBeCloseTo(thickness, 2);
			}
		}
	});

	test('has its tips a pitch apart, and the chord over them that it says', () => {
		const { tips, drawn: count } = drawing;
		expect(tips).toHaveLength(count);
		const [first, second] = tips;
		const apart = 2 * drawing.tipRadius * Math.sin(Math.PI / teeth);
		expect(Math.hypot(second!.x - first!.x, second!.y - first!.y)).toBeCloseTo(apart, 6);
		expect(tips.at(-1)!.x - first!.x).toBeCloseTo(drawing.overTips, 6);
	});

	test('lies within its width and height and fills them', () => {
		const all = points(drawing);
		const across = all.map(({ x }) => x);
		const down = all.map(({ y }) => y);
		expect(Math.min(...across)).toBeCloseTo(0, 3);
		expect(Math.max(...across)).toBeCloseTo(drawing.width, 3);
		expect(Math.min(...down)).toBeCloseTo(0, 3);
		expect(Math.max(...down)).toBeCloseTo(drawing.height, 3);
	});
});

describe('how many teeth', () => {
	test('at least five, also where the screen is too narrow for them', () => {
		const coarse = drawn({ module: 20 }, 140);
		expect(coarse.drawn).toBe(5);
		expect(coarse.width).toBeGreaterThan(140);
		expect(drawn({ teeth: 8, profileShift: 0.5 }).drawn).toBe(5);
	});

	test('more of a fine pitch: as many as fit, always an odd number', () => {
		const fine = drawn({ module: 1, teeth: 400 }, 100);
		expect(fine.drawn % 2).toBe(1);
		expect(fine.width).toBeLessThanOrEqual(100);
		// Two teeth more would not fit: less than two pitches are left over.
		expect(fine.width).toBeGreaterThan(100 - 2 * Math.PI);
	});

	test('never more than a quarter of the gear, unless five need it', () => {
		const small = drawn({ module: 1, teeth: 40 }, 500);
		expect(small.drawn).toBeGreaterThan(5);
		const { tips } = small;
		const turn = Math.asin((tips.at(-1)!.x - tips[0]!.x) / 2 / small.tipRadius);
		expect(turn).toBeLessThanOrEqual(Math.PI / 4);
	});

	test('no arc whose ends hang far below its middle, unless five need it', () => {
		const high = drawn({ module: 4, teeth: 60 }, 500);
		expect(high.drawn).toBeGreaterThan(5);
		expect(high.tips[0]!.y).toBeLessThanOrEqual(12);
	});
});

test.each<[string, Partial<StripGear>]>([
	['too-few-teeth', { teeth: 6 }],
	['angle-not-covered', { pressureAngle: 30 }],
	['shift-too-large', { profileShift: 1.5 }],
	['tooth-pointed', { teeth: 10, profileShift: 0.9 }]
])('a gear that cannot be drawn has a reason: %s', (code, change) => {
	const refused = stripDrawing({ ...GEAR, ...change }, 140);
	expect('code' in refused && refused.code).toBe(code);
});
