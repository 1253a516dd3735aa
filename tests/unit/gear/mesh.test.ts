/** What does not mesh is refused by name, what runs badly is told, and what the figures of a mesh are. */
import { describe, expect, test } from 'vitest';
import { contactPath } from '$lib/gear/contact-path';
import type { ToothedPart } from '$lib/gear/contract';
import { memberOf, type Member } from '$lib/gear/member';
import { meshOf } from '$lib/gear/mesh';
import { operatingOf } from '$lib/gear/operating';
import { nominalThickness } from '$lib/gear/thickness';
import { unrecorded, Working } from '$lib/gear/working';

const radians = (degrees: number) => (degrees * Math.PI) / 180;
const mm = (value: number) => ({ value, unit: 'mm' as const });

const part = (of: Partial<ToothedPart> = {}): Member =>
	memberOf({
		kind: 'spur',
		teeth: of.kind === 'rack' ? undefined : 24,
		pitch: { system: 'module', value: 4 },
		pressureAngle: 20,
		form: 'full-depth',
		...of
	});

const meshed = (gear: Member, mate: Member, centreDistance: number | null = null) =>
	meshOf({ gear, mate, centreDistance, faceWidth: 40 }, unrecorded);
const codes = (reasons: { code: string }[]) => reasons.map(({ code }) => code);

describe('does not mesh', () => {
	const refusals = (gear: Member, mate: Member, centre: number | null = null) => {
		const { figures, refusals, warnings } = meshed(gear, mate, centre);
		expect(warnings).toEqual([]);
		return { figures, codes: codes(refusals) };
	};

	test('base pitches more than 0.2 % apart, in the normal plane', () => {
		const at = (value: number) => part({ teeth: 60, pitch: { system: 'module', value } });
		expect(refusals(part(), at(4 * 1.0021))).toEqual({ figures: null, codes: ['mate-pitch-differs'] });
		expect(refusals(part(), at(4 * 1.0019)).codes).toEqual([]);
		expect(refusals(part(), at(4 / 1.0019)).codes).toEqual([]);
		const helical = { kind: 'helical' as const, helixAngle: 25 };
		expect(
			refusals(part({ ...helical, plane: 'normal' }), part({ ...helical, plane: 'transverse' })).codes
		).toEqual(['mate-pitch-differs']);
	});

	test('helix angles more than half a degree apart', () => {
		const at = (helixAngle: number) => part({ kind: 'helical', plane: 'normal', helixAngle });
		expect(refusals(at(15), at(15.49)).codes).toEqual([]);
		expect(refusals(at(15), at(15.51))).toEqual({ figures: null, codes: ['mate-helix-differs'] });
		expect(refusals(part(), at(15)).codes).toEqual(['mate-helix-differs']);
	});

	test.each([
		['internal', 'internal'],
		['internal', 'rack'],
		['rack', 'internal'],
		['rack', 'rack']
	] as const)('%s in %s', (one, other) => {
		expect(refusals(part({ kind: one }), part({ kind: other }))).toEqual({
			figures: null,
			codes: ['kinds-do-not-mesh']
		});
	});

	test('an internal gear that is no larger than its pinion, on either side', () => {
		const ring = part({ kind: 'internal', teeth: 24 });
		expect(refusals(part(), ring).codes).toEqual(['internal-too-small']);
		expect(refusals(ring, part({ teeth: 30 })).codes).toEqual(['internal-too-small']);
	});

	test('centres nearer than the base circles allow', () => {
		const [pinion, wheel] = [part(), part({ teeth: 60 })];
		const least = (84 * 4 * Math.cos(radians(20))) / 2;
		expect(refusals(pinion, wheel, least * 0.999)).toEqual({ figures: null, codes: ['centres-too-close'] });
		expect(meshed(pinion, wheel, least * 1.001).figures).not.toBeNull();
		const ring = part({ kind: 'internal', teeth: 60 });
		const inside = (36 * 4 * Math.cos(radians(20))) / 2;
		expect(refusals(pinion, ring, inside * 0.999).codes).toEqual(['centres-too-close']);
		expect(meshed(pinion, ring, inside * 1.001).figures).not.toBeNull();
	});

	test('shifts so far inwards that nominal teeth never tighten', () => {
		const pair = [part({ teeth: 12, profileShift: -1 }), part({ teeth: 12, profileShift: -1 })] as const;
		expect(refusals(...pair)).toEqual({ figures: null, codes: ['shifts-do-not-mesh'] });
		expect(refusals(...pair, 45).codes).toEqual(['centres-too-close']);
	});

	test('tips that leave before the next pair meets; a helix can carry over', () => {
		const [pinion, wheel] = [part(), part({ teeth: 60 })];
		const apart = refusals(pinion, wheel, 174);
		expect(apart.codes).toEqual(['contact-ratio-below-one']);
		expect(apart.figures?.contactRatio).toBeLessThan(1);
		const helix = { kind: 'helical' as const, plane: 'transverse' as const, helixAngle: 25 };
		const { figures } = refusals(part(helix), part({ ...helix, teeth: 60 }), 174);
		expect(figures?.contactRatio).toBeLessThan(1);
		expect(figures?.overlapRatio).toBeCloseTo((40 * Math.tan(radians(25))) / (4 * Math.PI), 12);
	});

	test('tips that do not even reach each other have no contact, not less than none', () => {
		const { figures, refusals } = meshed(part(), part({ teeth: 60 }), 1e4);
		expect(figures?.contactRatio).toBe(0);
		expect(refusals[0]?.text).toContain('the contact ratio is 0.00');
	});
});

describe('is told', () => {
	const warnings = (gear: Member, mate: Member, centre: number | null = null) => {
		const { refusals, warnings } = meshed(gear, mate, centre);
		expect(refusals).toEqual([]);
		return codes(warnings);
	};

	test('a good pair at its distance: nothing', () => {
		expect(warnings(part(), part({ teeth: 61 }))).toEqual([]);
		expect(warnings(part(), part({ teeth: 61 }), 170)).toEqual([]);
	});

	test('contact between 1.2 and 1.4, and below 1.2', () => {
		const [pinion, wheel] = [part(), part({ teeth: 60 })];
		const contactAt = (centre: number) => meshed(pinion, wheel, centre).figures?.contactRatio ?? NaN;
		expect(contactAt(169.5)).toBeGreaterThan(1.2);
		expect(contactAt(169.5)).toBeLessThan(1.4);
		expect(warnings(pinion, wheel, 169.5)).toEqual(['contact-ratio-modest']);
		expect(contactAt(170.5)).toBeGreaterThan(1);
		expect(contactAt(170.5)).toBeLessThan(1.2);
		expect(warnings(pinion, wheel, 170.5)).toEqual(['contact-ratio-low']);
	});

	test('tips below the base circle: undercut makes room for them, on an external wheel only', () => {
		expect(warnings(part({ teeth: 12 }), part({ teeth: 60 }))).toContain('undercut');
		const straight = { addendum: 1, dedendum: 1, tipRadius: 0 };
		const long = { addendum: 1.2, dedendum: 1.2, tipRadius: 0 };
		expect(warnings(part({ teeth: 18, form: straight }), part({ teeth: 60, form: long }))).toEqual([
			'contact-shortened',
			'interference'
		]);
		const ring = part({ kind: 'internal', teeth: 30 });
		expect(warnings(part({ teeth: 14 }), ring)).toContain('interference');
		expect(warnings(part({ teeth: 14 }), ring)).not.toContain('undercut');
	});

	test('backlash only of measured teeth against the range, a jam of nominal teeth too', () => {
		const [nominal, wheel] = [part(), part({ teeth: 61 })];
		const thick = (value: number) => part({ toothThickness: mm(value) });
		// Module 4 at 170 mm: at least 0.177 mm (ISO/TR 10064-2), at most 0.025 in (Machinery's Handbook).
		expect(warnings(nominal, wheel, 170.1)).toEqual([]);
		expect(warnings(thick(6.25), wheel, 170)).toEqual(['backlash-below-range']);
		expect(warnings(thick(6.0), wheel, 170)).toEqual([]);
		expect(warnings(thick(5.5), wheel, 170)).toEqual(['backlash-above-range']);
		expect(warnings(thick(6.4), wheel, 170)).toEqual(['no-backlash']);
		expect(warnings(nominal, wheel, 169.9)).toEqual(['no-backlash']);
	});
});

describe('undercut takes contact away', () => {
	// The path cut at √(rf² - rb²) of both members; recomputed by layout of the generated teeth.
	const pairs: [teeth: number, mates: number, angle: number, published: number, left: number][] = [
		[15, 15, 14.5, 1.235, 0.702],
		[12, 60, 14.5, 1.284, 0.994],
		[14, 100, 14.5, 1.398, 1.122],
		[10, 60, 20, 1.264, 1.075],
		[16, 200, 14.5, 1.507, 1.251]
	];
	const pairOf = (teeth: number, mates: number, pressureAngle: number) =>
		meshed(part({ teeth, pressureAngle }), part({ teeth: mates, pressureAngle }));

	test.each(pairs)('%d in %d teeth at %d degrees: %d becomes %d', (teeth, mates, angle, published, left) => {
		const { figures } = pairOf(teeth, mates, angle);
		expect(figures?.contactRatio).toBeCloseTo(published, 3);
		expect(figures?.contactRatioUndercut).toBeCloseTo(left, 3);
	});

	test('the limits are judged by what is left, and both figures are told', () => {
		const verdict = pairs.map(([teeth, mates, angle]) => {
			const { refusals, warnings } = pairOf(teeth, mates, angle);
			return [...codes(refusals), ...codes(warnings)].filter((code) => code !== 'undercut');
		});
		expect(verdict).toEqual([
			['contact-ratio-below-one', 'contact-shortened'],
			['contact-ratio-below-one', 'contact-shortened'],
			['contact-ratio-low', 'contact-shortened'],
			['contact-ratio-low', 'contact-shortened'],
			['contact-ratio-modest', 'contact-shortened']
		]);
		const [told] = pairOf(14, 100, 14.5).warnings.filter(({ code }) => code === 'contact-shortened');
		expect(told?.text).toContain('1.12 instead of 1.40');
	});

	test('a pair without undercut keeps the published figure', () => {
		const { figures, warnings } = meshed(part(), part({ teeth: 61 }));
		expect(figures?.contactRatioUndercut).toBe(figures?.contactRatio);
		expect(warnings).toEqual([]);
	});

	test('undercut so deep that nothing is left to work out is refused, whichever of the two it is', () => {
		const deep = part({ teeth: 6, pressureAngle: 14.5 });
		const wheel = part({ teeth: 60, pressureAngle: 14.5 });
		for (const { figures, refusals } of [meshed(deep, wheel), meshed(wheel, deep)]) {
			expect(codes(refusals)).toEqual(['contact-not-known']);
			expect(figures?.contactRatioUndercut).toBeNull();
		}
	});

	test('on a rack it is what a very large wheel tends to', () => {
		const left = (mate: Member) =>
			meshed(part({ teeth: 14, pressureAngle: 14.5 }), mate).figures?.contactRatioUndercut;
		const rack = left(part({ kind: 'rack', pressureAngle: 14.5 }));
		expect(rack).toBeLessThan(1.3);
		expect(rack).toBeCloseTo(left(part({ teeth: 5000, pressureAngle: 14.5 })) ?? NaN, 2);
	});

	test('a helical pair without undercut, and one that is undercut in its transverse plane', () => {
		const helix = { kind: 'helical' as const, plane: 'normal' as const, helixAngle: 20, pressureAngle: 14.5 };
		const whole = meshed(part({ ...helix, teeth: 32 }), part({ ...helix, teeth: 60 })).figures;
		expect(whole?.contactRatioUndercut).toBe(whole?.contactRatio);
		const cut = meshed(part({ ...helix, teeth: 14 }), part({ ...helix, teeth: 60 })).figures;
		expect(cut?.contactRatioUndercut).toBeLessThan(cut?.contactRatio ?? NaN);
	});
});

describe('worn tips', () => {
	test('that leave nothing above the pitch circle end the mesh, of either member', () => {
		const wheel = (wear: number) => part({ teeth: 48, tipWear: mm(wear) });
		for (const wear of [4, 9, 500]) {
			for (const pair of [
				[part(), wheel(wear)],
				[wheel(wear), part()]
			] as const) {
				expect(meshed(...pair)).toMatchObject({ figures: null, warnings: [] });
				expect(codes(meshed(...pair).refusals)).toEqual(['tips-of-pair-worn-away']);
			}
		}
		expect(codes(meshed(part(), wheel(0.5)).refusals)).toEqual([]);
	});

	test('beyond the whole depth, though a shift would leave them above the pitch circle', () => {
		const shifted = part({ profileShift: 1.9, tipWear: mm(9.1) });
		expect(codes(meshed(part({ teeth: 60 }), shifted).refusals)).toEqual(['tips-of-pair-worn-away']);
	});

	test('that do not reach their base circle reach no involute: no contact from nowhere', () => {
		const [gear, mate] = [part(), part({ teeth: 48, tipWear: mm(500) })];
		const geometry = operatingOf({ gear, mate, centreDistance: null }, unrecorded);
		if (!geometry) throw new Error('nominal members have a distance');
		expect(contactPath(geometry)).toBe(0);
	});
});

describe('figures', () => {
	test('no backlash where neither centre distance nor thickness was measured, nor with a rack', () => {
		expect(meshed(part(), part({ teeth: 61 })).figures?.normalBacklash).toBeNull();
		const rack = meshed(part({ toothThickness: mm(6) }), part({ kind: 'rack' }), 50).figures;
		expect(rack).toMatchObject({ ratio: null, standardCentreDistance: null, normalBacklash: null });
	});

	test('a measured thickness tells the backlash at the distance of the shifts', () => {
		const thin = part({ toothThickness: mm(nominalThickness(4, 0.2, radians(20)) - 0.1), profileShift: 0.2 });
		const { figures } = meshed(thin, part({ teeth: 61, profileShift: 0.1 }));
		const angle = radians(figures?.operatingPressureAngle ?? NaN);
		const rolling = Math.cos(radians(20)) / Math.cos(angle);
		expect(figures?.normalBacklash).toBeCloseTo(0.1 * rolling * Math.cos(angle), 12);
	});

	test('undercut is told of each, from the side it is asked', () => {
		const pair = [part({ teeth: 12 }), part({ teeth: 60 })] as const;
		expect(meshed(...pair).figures?.undercut).toEqual({ gear: true, mate: false });
		expect(meshed(pair[1], pair[0]).figures?.undercut).toEqual({ gear: false, mate: true });
	});

	test('no hunting tooth on a rack', () => {
		expect(
			meshed(part({ teeth: 1, pressureAngle: 45 }), part({ kind: 'rack', pressureAngle: 45 }))
		).not.toMatchObject({ figures: { huntingTooth: true } });
		expect(meshed(part(), part({ kind: 'rack' })).figures?.huntingTooth).toBe(false);
	});

	test('a pair that agrees in base pitch alone: module 5 at 20 degrees, 5 DP at 22.5', () => {
		const module5 = (teeth: number) => part({ teeth, pitch: { system: 'module', value: 5 } });
		const five = (teeth: number) =>
			part({ teeth, pitch: { system: 'diametral', value: 5 }, pressureAngle: 22.5 });
		const [one, other] = [meshed(module5(30), five(70)).figures, meshed(five(70), module5(30)).figures];
		expect(one).toEqual(other);
		expect(one?.standardCentreDistance).toBeCloseTo((30 * 5 + 70 * 5.08) / 2, 12);
		// Nominal teeth fill the operating pitch, so the angle lies between the two.
		expect(one?.operatingPressureAngle).toBeGreaterThan(21);
		expect(one?.operatingPressureAngle).toBeLessThan(22.5);
		const pair = { gear: module5(30), mate: five(70), centreDistance: null };
		const centre = operatingOf(pair, unrecorded)?.centre ?? null;
		expect(meshed(module5(30), five(70), centre).figures?.normalBacklash).toBeCloseTo(0, 9);
	});

	test('without a measured distance the working tells how the shifts set the angle', () => {
		const working = new Working();
		const question = { gear: part({ teeth: 61, profileShift: 0.1 }), mate: part({ profileShift: 0.2 }) };
		const { figures } = meshOf({ ...question, centreDistance: null, faceWidth: 40 }, working);
		// The textbook form for alike members: inv αw = inv αt + 2 (x1 + x2) tan α / (N1 + N2).
		const inv = (angle: number) => Math.tan(angle) - angle;
		const expected = inv(radians(20)) + (2 * 0.3 * Math.tan(radians(20))) / 85;
		expect(working.lines.find(({ symbol }) => symbol === 'invw')?.value).toBeCloseTo(expected, 12);
		expect(inv(radians(figures?.operatingPressureAngle ?? NaN))).toBeCloseTo(expected, 12);
	});

	test('the working tells ratio, distance, angle, contact and backlash', () => {
		const working = new Working();
		meshOf({ gear: part({ teeth: 61 }), mate: part(), centreDistance: 170.1, faceWidth: 40 }, working);
		const numbers = Object.fromEntries(working.lines.map((line) => [line.symbol, line.numbers]));
		expect(numbers).toMatchObject({
			i: '61 / 24',
			C0: '(4 · 61 + 4 · 24) / 2',
			αw: 'arccos((4 · 61 · cos(20) + 4 · 24 · cos(20)) / (2 · 170.1))'
		});
		expect(working.lines.map(({ symbol }) => symbol).join(' ')).toBe(
			'i C0 αw ra1 rb1 Z1 ra2 rb2 Z2 A Zb Ze Z pb mp rw1 rw2 pw invw st1 inv1 s1 st2 inv2 s2 jt jn'
		);
	});
});
