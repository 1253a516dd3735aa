/** Where a span can be taken: against the flanks that a rack cuts, from its own geometry. */
import { describe, expect, test } from 'vitest';
import { spanOver, spanTeeth } from '$lib/gear/measure/span';
import { leastFaceForSpan, spansOnFlank } from '$lib/gear/measure/span-reach';
import { memberOf, tipDiameter } from '$lib/gear/member';
import { module } from './spur-check';

const radians = (degrees: number) => (degrees * Math.PI) / 180;

describe('where a span can be taken', () => {
	const member = (
		teeth: number,
		angle: number,
		form: 'full-depth' | 'stub',
		profileShift = 0,
		helixAngle = 0
	) =>
		memberOf({
			kind: helixAngle === 0 ? 'spur' : 'helical',
			teeth,
			pitch: module(4),
			plane: 'normal',
			pressureAngle: angle,
			form,
			profileShift,
			helixAngle
		});

	test('the recommended count is on the flanks of every ordinary gear, from 8 teeth', () => {
		for (const [angle, form] of [
			[14.5, 'full-depth'],
			[20, 'full-depth'],
			[20, 'stub'],
			[25, 'full-depth']
		] as const) {
			for (const shift of [-0.3, 0, 0.5]) {
				for (let teeth = 8; teeth <= 200; teeth++) {
					const gear = member(teeth, angle, form, shift);
					const { fewest, most } = spansOnFlank(gear) ?? { fewest: NaN, most: NaN };
					const k = spanTeeth({ ...gear, teeth });
					expect(k, `${teeth} teeth`).toBeGreaterThanOrEqual(fewest);
					expect(k, `${teeth} teeth`).toBeLessThanOrEqual(most);
				}
			}
		}
	});

	test.each([
		[0, 0],
		[0.3, 0],
		[0, 24],
		[-0.2, 15],
		[0.1, 45]
	])(
		'shift %d, helix %d: between fillet and tip the jaws touch, over one more or less not',
		(shift, helix) => {
			// The flank of a rack-cut tooth begins where the rack's straight flank ends: hs = 1.25 - 0.3 (1 - sin α).
			const depth = 4 * (1.25 - 0.3 * (1 - Math.sin(radians(20))) - shift);
			const acrossBase = Math.cos(Math.asin(Math.sin(radians(helix)) * Math.cos(radians(20))));
			for (let teeth = 24; teeth <= 80; teeth++) {
				const gear = member(teeth, 20, 'full-depth', shift, helix);
				const { fewest, most } = spansOnFlank(gear) ?? { fewest: NaN, most: NaN };
				const d = gear.pitchDiameter ?? NaN;
				const base = d * Math.cos(gear.transverseAngle);
				const touched = (k: number) => Math.hypot(base, spanOver(k, { ...gear, teeth }) * acrossBase);
				const begins = 2 * Math.hypot(d / 2 - depth, depth / Math.tan(gear.transverseAngle));
				const ends = tipDiameter(gear) ?? NaN;
				expect(touched(fewest)).toBeGreaterThanOrEqual(begins);
				expect(touched(most)).toBeLessThanOrEqual(ends);
				if (fewest > 2) expect(touched(fewest - 1)).toBeLessThan(begins);
				expect(touched(most + 1)).toBeGreaterThan(ends);
			}
		}
	);

	test('the jaws need two teeth at least, however few reach', () => {
		expect(spansOnFlank(member(20, 14.5, 'full-depth'))).toEqual({ fewest: 2, most: 3 });
	});

	test('no span on a rack, an internal gear, or tips worn below the flanks', () => {
		const of = { teeth: 30, pitch: module(4), pressureAngle: 20, form: 'full-depth' as const };
		expect(spansOnFlank(memberOf({ ...of, kind: 'internal' }))).toBeNull();
		expect(spansOnFlank(memberOf({ ...of, kind: 'rack', teeth: undefined }))).toBeNull();
		expect(spansOnFlank(memberOf({ ...of, kind: 'spur', tipWear: { value: 8, unit: 'mm' } }))).toBeNull();
	});

	test('a spur gear may be as narrow as it likes; a helical one leaves the jaws W sin βb', () => {
		expect(leastFaceForSpan(50, 0, radians(20))).toBe(0);
		const baseHelix = Math.atan(
			Math.tan(radians(24)) * Math.cos(Math.atan(Math.tan(radians(20)) / Math.cos(radians(24))))
		);
		expect(leastFaceForSpan(50, radians(24), radians(20))).toBeCloseTo(50 * Math.sin(baseHelix), 12);
	});
});
