/**
 * Measuring: spans, measurement over pins, chordal values and outside diameters against published ones. "From memory"
 * stands where a table was not at hand; rows marked `independent` were written down before anything was computed.
 */
import { describe, expect, test } from 'vitest';
import { chordal, chordalPitch, constantChord, helixFromTips } from '$lib/gear/measure/chordal';
import { overPins, thicknessFromPins, usualPin } from '$lib/gear/measure/over-pins';
import {
	basePitch,
	pressureAngleFromSpans,
	spanOver,
	spanTeeth,
	thicknessFromSpan,
	type SpanGear
} from '$lib/gear/measure/span';
import { memberOf, tipDiameter } from '$lib/gear/member';
import { pitchHint } from '$lib/gear/pitch-hint';
import { nominalThickness } from '$lib/gear/thickness';
import { Working } from '$lib/gear/working';
import { diametral, module } from './spur-check';

const radians = (degrees: number) => (degrees * Math.PI) / 180;

const spur = (teeth: number, angle = 20, size = 1, profileShift = 0): SpanGear => ({
	teeth,
	normalModule: size,
	normalAngle: radians(angle),
	transverseAngle: radians(angle),
	profileShift
});

describe('span over k teeth, module 1, 20 degrees', () => {
	// Standard span tables for module 1 in metric gear handbooks (from memory; the last row not independent).
	test.each([
		[9, 2, 4.5542],
		[17, 2, 4.6663],
		[18, 3, 7.6324],
		[19, 3, 7.6464],
		[20, 3, 7.6604],
		[25, 3, 7.7305],
		[27, 4, 10.7106],
		[30, 4, 10.7526],
		[40, 5, 13.8448]
	])('%d teeth over %d: %d mm', (teeth, k, published) => {
		expect(Math.abs(spanOver(k, spur(teeth)) - published)).toBeLessThanOrEqual(0.00005 + 1e-9);
		// The table's k is the one that is recommended; at 9, 17, 18 and 27 teeth the rule lies on the edge.
		expect(Math.abs(spanTeeth(spur(teeth)) - k)).toBeLessThanOrEqual(1);
	});

	test.each([
		[12, 2],
		[20, 3],
		[30, 4],
		[40, 5],
		[50, 6],
		[60, 7]
	])('%d teeth are spanned over %d (Machinery’s Handbook rule, from memory)', (teeth, k) => {
		expect(spanTeeth(spur(teeth))).toBe(k);
	});
});

test('the working of a span can be followed', () => {
	const working = new Working();
	const span = spanOver(3, spur(20), working);
	expect(working.lines).toMatchObject([
		{
			symbol: 'W',
			numbers: '1 · cos(20) · (π · (3 - 0.5) + 20 · inv(20)) + 2 · 0 · 1 · sin(20)',
			value: span
		}
	]);
});

test('the teeth to span grow with the shift: k = N α / 180° + 0.5 + 2 x / (π tan α)', () => {
	// 43 teeth: 5.28, over 5; with x = 0.3: 5.80, over 6; with x = -0.5: 4.40, over 4. 28 teeth: 3.61, over 4.
	expect(spanTeeth(spur(43))).toBe(5);
	expect(spanTeeth(spur(43, 20, 1, 0.3))).toBe(6);
	expect(spanTeeth(spur(43, 20, 1, -0.5))).toBe(4);
	expect(spanTeeth(spur(28))).toBe(4);
	// Just under and just over the half: 2 x / (π tan α) decides.
	expect(spanTeeth(spur(43, 20, 1, 0.124))).toBe(5);
	expect(spanTeeth(spur(43, 20, 1, 0.128))).toBe(6);
	// 0.5 of the rule: 36 teeth give exactly 4.5, so 35 are spanned over 4 and 37 over 5.
	expect(spanTeeth(spur(35))).toBe(4);
	expect(spanTeeth(spur(37))).toBe(5);
});

describe('two spans tell base pitch and angle, whatever the teeth have lost', () => {
	// How to measure the pressure angle of a spur gear: the difference of two spans is the base pitch. Module 3:
	// 9.1246, 8.8564 and 8.5417 mm at 14.5, 20 and 25 degrees (recomputed).
	test.each([
		[14.5, 9.1246],
		[20, 8.8564],
		[25, 8.5417]
	])('%d degrees: %d mm', (angle, published) => {
		const gear = spur(30, angle, 3);
		const thinned = 0.11;
		const difference = spanOver(5, gear) - thinned - (spanOver(4, gear) - thinned);
		expect(difference).toBeCloseTo(published, 4);
		expect(basePitch(3, radians(angle))).toBeCloseTo(published, 4);
		expect(pressureAngleFromSpans(difference, 3)).toBeCloseTo(radians(angle), 9);
	});

	test('a difference longer than the pitch itself has no angle', () => {
		expect(pressureAngleFromSpans(9.5, 3)).toBeNull();
		expect(pressureAngleFromSpans(0, 3)).toBeNull();
	});

	test('a shift of x makes the span 2 x m sin α longer, and its thickness is found again', () => {
		const [plain, shifted] = [spur(24, 20, 5), spur(24, 20, 5, 0.3)];
		expect(spanOver(3, shifted) - spanOver(3, plain)).toBeCloseTo(2 * 0.3 * 5 * Math.sin(radians(20)), 12);
		const thickness = thicknessFromSpan(spanOver(3, shifted), 3, shifted);
		expect(thickness).toBeCloseTo(5 * (Math.PI / 2 + 2 * 0.3 * Math.tan(radians(20))), 12);
	});

	test('a helical gear is spanned in the normal plane, with the involute of its transverse angle', () => {
		const helix = radians(24);
		const transverse = Math.atan(Math.tan(radians(20)) / Math.cos(helix));
		const helical = { ...spur(24, 20, 5), transverseAngle: transverse };
		const inv = Math.tan(transverse) - transverse;
		// DIN 3960 (from memory): W = mn cos αn (π (k - 0.5) + N inv αt).
		expect(spanOver(4, helical)).toBeCloseTo(5 * Math.cos(radians(20)) * (Math.PI * 3.5 + 24 * inv), 12);
		expect(spanTeeth(helical)).toBeGreaterThanOrEqual(spanTeeth(spur(24, 20, 5)));
	});
});

describe('over pins of 1.728 / P, 1 diametral pitch', () => {
	// Machinery's Handbook, Van Keuren wires (from memory; 20 degree rows independent, 14.5 degree rows not).
	test.each([
		[6, 20, 8.3032],
		[8, 20, 10.3271],
		[10, 20, 12.3445],
		[20, 20, 22.39],
		[24, 20, 26.3997],
		[30, 20, 32.4102],
		[6, 14.5, 8.2846],
		[8, 14.5, 10.316],
		[10, 14.5, 12.3399],
		[16, 14.5, 18.3877],
		[20, 14.5, 22.4087],
		[24, 14.5, 26.4247]
	])('%d teeth at %d degrees: %d in', (teeth, angle, published) => {
		const gear = { teeth, module: 1, pressureAngle: radians(angle), thickness: Math.PI / 2 };
		const over = overPins(gear, usualPin(1));
		expect(Math.abs(over - published)).toBeLessThanOrEqual(0.00005 + 1e-9);
		expect(thicknessFromPins(over, gear, usualPin(1))).toBeCloseTo(Math.PI / 2, 9);
	});

	// No table was at hand for odd counts and shifted teeth: the pin is laid against a flank drawn point by point.
	test.each([
		[24, 20, 0, 1.728],
		[25, 20, 0, 1.728],
		[25, 20, 0.4, 1.92],
		[17, 14.5, 0.2, 1.728],
		[41, 25, -0.3, 1.68]
	])(
		'%d teeth at %d degrees, shift %d, pins of %d: as a pin that touches the flank',
		(teeth, angle, shift, pin) => {
			const alpha = radians(angle);
			const thickness = nominalThickness(1, shift, alpha);
			const over = overPins({ teeth, module: 1, pressureAngle: alpha, thickness }, pin);
			const opposite = teeth % 2 === 0 ? 1 : Math.cos(radians(90 / teeth));
			const centre = (over - pin) / (2 * opposite);
			// The middle of the space is the y axis; the involute unwinds from the base circle, away from it.
			const base = (teeth / 2) * Math.cos(alpha);
			const spaceAtBase = Math.PI / teeth - thickness / teeth - (Math.tan(alpha) - alpha);
			const away = Array.from({ length: 200_001 }, (_, i) => (i / 200_000) * 1.2).map((roll) => {
				const radius = base * Math.hypot(1, roll);
				const turned = spaceAtBase + roll - Math.atan(roll);
				return Math.hypot(radius * Math.sin(turned), radius * Math.cos(turned) - centre);
			});
			expect(Math.min(...chunked(away))).toBeCloseTo(pin / 2, 7);
		}
	);

	test('the working of a measurement over pins can be followed', () => {
		const working = new Working();
		const gear = { teeth: 30, module: 1, pressureAngle: radians(20), thickness: Math.PI / 2 };
		const over = overPins(gear, 1.728, working);
		const [line] = working.lines;
		expect(line).toMatchObject({ symbol: 'M', value: over });
		const [base = NaN, angle = NaN, factor = NaN, pin = NaN] = (line?.numbers.match(/[\d.]+/g) ?? []).map(
			Number
		);
		expect((base / Math.cos(radians(angle))) * factor + pin).toBeCloseTo(32.4102, 4);
	});

	test('pins that would sink to the base circle lie on it, and none inside it has a thickness', () => {
		const gear = { teeth: 20, module: 1, pressureAngle: radians(20) };
		expect(overPins({ ...gear, thickness: Math.PI / 2 }, 1)).toBeCloseTo(20 * Math.cos(radians(20)) + 1, 12);
		expect(thicknessFromPins(15, gear, 1.728)).toBeNull();
		// Base diameter 18.794, so 18.4 under the pins is just inside it.
		expect(thicknessFromPins(18.4 + 1.728, gear, 1.728)).toBeNull();
	});
});

/** Least of each thousand: more arguments than that are too many for one call. */
function chunked(values: number[]): number[] {
	return Array.from({ length: Math.ceil(values.length / 1000) }, (_, i) =>
		Math.min(...values.slice(i * 1000, (i + 1) * 1000))
	);
}

describe('chordal thickness and addendum, 1 diametral pitch', () => {
	// Machinery's Handbook, gear-tooth calliper table (from memory; older tables differ by 1 in the fourth place).
	test.each([
		[12, 1.5663, 1.0514],
		[13, 1.567, 1.0474],
		[15, 1.5679, 1.0411],
		[17, 1.5686, 1.0362],
		[20, 1.5692, 1.0308],
		[21, 1.5694, 1.0294],
		[26, 1.5698, 1.0237],
		[35, 1.5702, 1.0176],
		[55, 1.5706, 1.0112],
		[135, 1.5707, 1.0047]
	])('%d teeth: %d and %d', (teeth, thickness, addendum) => {
		const read = chordal({ teeth, module: 1, profileShift: 0, pressureAngle: radians(20), addendum: 1 });
		expect(Math.abs(read.thickness - thickness)).toBeLessThanOrEqual(0.00015);
		expect(Math.abs(read.addendum - addendum)).toBeLessThanOrEqual(0.00015);
	});

	test('34 teeth, module 5: P. C. Sharma, Production Engineering, Ex. 16.1, p. 648', () => {
		const gear = { teeth: 34, module: 5, profileShift: 0, pressureAngle: radians(20), addendum: 1 };
		expect(chordal(gear).thickness).toBeCloseTo(7.851, 3);
		expect(chordal(gear).addendum).toBeCloseTo(5.091, 3);
	});

	test('constant chord at module 1, 20 degrees: 1.38705 and 0.74758 (metric handbooks, from memory)', () => {
		const { chord, height } = constantChord({
			module: 1,
			profileShift: 0,
			pressureAngle: radians(20),
			addendum: 1
		});
		expect(chord).toBeCloseTo(1.38705, 5);
		expect(height).toBeCloseTo(0.74758, 5);
	});

	test.each([0, 0.3, -0.2])(
		'the constant chord at a shift of %d is where a rack’s flank touches',
		(shift) => {
			const [alpha, teeth] = [radians(20), 30];
			const { chord, height } = constantChord({
				module: 1,
				profileShift: shift,
				pressureAngle: alpha,
				addendum: 1
			});
			// A rack whose space is centred on the tooth, turned with it from its middle until its flank touches in the
			// normal through the pitch point: half of the arc s cos² α away, and half of it s sin α cos α towards the tip.
			const half = nominalThickness(1, shift, alpha) / 2;
			expect(chord / 2).toBeCloseTo(half * Math.cos(alpha) ** 2, 12);
			expect(1 + shift - height).toBeCloseTo(half * Math.sin(alpha) * Math.cos(alpha), 12);
			// That point lies on the involute: at its radius the tooth is as wide as the chord.
			const y = teeth / 2 + 1 + shift - height;
			const radius = Math.hypot(chord / 2, y);
			const at = Math.acos(((teeth / 2) * Math.cos(alpha)) / radius);
			const inv = (angle: number) => Math.tan(angle) - angle;
			expect(Math.atan2(chord / 2, y)).toBeCloseTo(half / (teeth / 2) + inv(alpha) - inv(at), 6);
		}
	);

	test('a wide gear’s chordal thickness tends to the arc', () => {
		const gear = { teeth: 1e6, module: 1, profileShift: 0.2, pressureAngle: radians(20), addendum: 1 };
		expect(chordal(gear).thickness).toBeCloseTo(Math.PI / 2 + 0.4 * Math.tan(radians(20)), 9);
		expect(chordal(gear).addendum).toBeCloseTo(1.2, 5);
	});
});

describe('outside diameter and pitch', () => {
	// Mott, Machine Elements in Mechanical Design, 4th ed., p. 319: 12 DP, 11 and 18 teeth.
	test.each([
		[11, 0.9167, 1.0833],
		[18, 1.5, 1.6667]
	])('%d teeth, 12 DP: pitch diameter %d in, outside %d in', (teeth, pitchDiameter, outside) => {
		const member = memberOf({
			kind: 'spur',
			teeth,
			pitch: diametral(12),
			pressureAngle: 20,
			form: 'full-depth'
		});
		expect((member.pitchDiameter ?? NaN) / 25.4).toBeCloseTo(pitchDiameter, 4);
		expect((tipDiameter(member) ?? NaN) / 25.4).toBeCloseTo(outside, 4);
	});

	// The same page: circular pitch, addendum, dedendum, clearance, root diameters, whole and working depth, inches.
	test('12 DP, 11 and 18 teeth: the tooth of Mott, p. 319', () => {
		const inches = (modules: number) => modules / 12;
		const { rack } = memberOf({
			kind: 'spur',
			teeth: 11,
			pitch: diametral(12),
			pressureAngle: 20,
			form: 'full-depth'
		});
		expect(inches(rack.addendum)).toBeCloseTo(0.0833, 4);
		expect(inches(rack.dedendum)).toBeCloseTo(0.1042, 4);
		expect(inches(rack.dedendum - rack.addendum)).toBeCloseTo(0.0208, 4);
		expect(inches(rack.addendum + rack.dedendum)).toBeCloseTo(0.1875, 4);
		expect(inches(2 * rack.addendum)).toBeCloseTo(0.1667, 4);
		expect(inches(11 - 2 * rack.dedendum)).toBeCloseTo(0.7083, 4);
		expect(inches(18 - 2 * rack.dedendum)).toBeCloseTo(1.2917, 4);
		expect(inches(basePitch(1, 0))).toBeCloseTo(0.2618, 4);
	});

	test('1.6667 in outside with 18 teeth is 12 DP (Mott, p. 319)', () => {
		const hint = pitchHint({ teeth: 18, outsideDiameterMm: 1.6667 * 25.4, form: 'full-depth' });
		expect(hint?.diametralPitch).toBeCloseTo(12, 2);
	});

	test('the stub’s rule P = (N + 1.6) / OD (Machinery’s Handbook, from memory)', () => {
		const member = memberOf({
			kind: 'spur',
			teeth: 20,
			pitch: diametral(1),
			pressureAngle: 20,
			form: 'stub'
		});
		expect((tipDiameter(member) ?? NaN) / 25.4).toBeCloseTo(21.6, 9);
	});

	test('25 and 60 teeth of module 5: Jindal, Machine Design, Ex. 25-1, p. 669', () => {
		const diameter = (teeth: number) =>
			memberOf({ kind: 'spur', teeth, pitch: module(5), pressureAngle: 20, form: 'full-depth' });
		expect(diameter(25).pitchDiameter).toBe(125);
		expect(diameter(60).pitchDiameter).toBe(300);
		expect(diameter(25).rack).toMatchObject({ addendum: 1, dedendum: 1.25 });
	});
});

test('a chord of the pitch circle is shorter than the pitch along it, and nearly it on a large wheel', () => {
	// Bevan, The Theory of Machines, Ex. 10.1, p. 320: 48 teeth of 3/4 in circular pitch, 11.459 in.
	const chord = chordalPitch(11.459, 48);
	expect(chord).toBeLessThan(0.75);
	expect(chord).toBeCloseTo(0.7495, 4);
});

test('ink from the tips leaves a steeper angle than the helix at the reference cylinder', () => {
	const [helix, d, da] = [radians(23), 132.6, 142.6];
	const atTips = Math.atan((da / d) * Math.tan(helix));
	expect(helixFromTips(atTips, d, da)).toBeCloseTo(helix, 12);
	expect(atTips).toBeGreaterThan(helix);
});
