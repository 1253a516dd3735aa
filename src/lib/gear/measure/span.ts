/**
 * Span over k teeth: what a calliper or disc micrometer reads across several teeth, along the base tangent. Two spans
 * differ by the base pitch, whatever the teeth have lost in thickness. Lengths in mm, angles in radians.
 */
import { involute } from '../involute';
import type { Member } from '../member';
import { SOURCES } from '../sources';
import { unrecorded, type Recorder } from '../working';

/** What a span depends on; a spur gear has no helix, and both angles the same. */
export type SpanGear = Pick<Member, 'normalModule' | 'normalAngle' | 'transverseAngle' | 'profileShift'> & {
	teeth: number;
};

const source = SOURCES.span;

/**
 * Span W in mm over k teeth. W = mn cos αn (π (k - 0.5) + N inv αt) + 2 x mn sin αn.
 * Range: external teeth whose flanks the jaws reach (`spanTeeth`). Source: ISO/TR 10064-2; DIN 3960 (from memory).
 * @example spanOver(3, { teeth: 20, normalModule: 1, normalAngle: Math.PI / 9, transverseAngle: Math.PI / 9, profileShift: 0 }) // 7.66044
 */
export function spanOver(k: number, gear: SpanGear, recorder: Recorder = unrecorded): number {
	return recorder.step(
		{
			symbol: 'W',
			name: 'span over k teeth',
			expression: 'mn · cos(αn) · (π · (k - 0.5) + N · inv(αt)) + 2 · x · mn · sin(αn)',
			unit: 'mm',
			source
		},
		{
			mn: gear.normalModule,
			αn: (gear.normalAngle * 180) / Math.PI,
			k,
			N: gear.teeth,
			αt: (gear.transverseAngle * 180) / Math.PI,
			x: gear.profileShift
		},
		({ mn, k, N, x }) =>
			mn * Math.cos(gear.normalAngle) * (Math.PI * (k - 0.5) + N * involute(gear.transverseAngle)) +
			2 * x * mn * Math.sin(gear.normalAngle)
	);
}

/**
 * Number of teeth to span, so that the jaws touch near the middle of the flanks, at least 2.
 * k = Nv α / 180° + 0.5, rounded, with Nv the virtual teeth N inv αt / inv αn; a shift moves it by 2 x / (π tan α).
 * Source: Machinery's Handbook (from memory).
 * @example spanTeeth({ teeth: 30, normalModule: 1, normalAngle: Math.PI / 9, transverseAngle: Math.PI / 9, profileShift: 0 }) // 4
 */
export function spanTeeth({ teeth, normalAngle, transverseAngle, profileShift }: SpanGear): number {
	const virtual = (teeth * involute(transverseAngle)) / involute(normalAngle);
	const k = (virtual * normalAngle) / Math.PI + 0.5 + (2 * profileShift) / (Math.PI * Math.tan(normalAngle));
	return Math.max(2, Math.round(k));
}

/**
 * Base pitch pb in mm, which two gears must share to mesh and by which spans over k and k + 1 teeth differ.
 * pb = π m cos α. Source: involute geometry (definition).
 * @example basePitch(3, Math.PI / 9) // 8.8564
 */
export function basePitch(module: number, angle: number): number {
	return Math.PI * module * Math.cos(angle);
}

/**
 * Pressure angle in radians from the difference of two spans in mm; null where it is longer than the pitch itself.
 * cos α = (W(k+1) - W(k)) / (π m). Source: `basePitch` solved for the angle.
 * @example pressureAngleFromSpans(9.124573, 3) // 0.253074
 */
export function pressureAngleFromSpans(difference: number, module: number): number | null {
	const cosine = difference / (Math.PI * module);
	return cosine > 0 && cosine <= 1 ? Math.acos(cosine) : null;
}

/**
 * Arc thickness sn in mm on the reference cylinder, in the normal plane, from a measured span over k teeth.
 * sn = W / cos αn - mn (π (k - 1) + N inv αt). Source: `spanOver` solved for the thickness, sn = mn (π/2 + 2 x tan αn).
 * @example thicknessFromSpan(7.66044, 3, { teeth: 20, normalModule: 1, normalAngle: Math.PI / 9, transverseAngle: Math.PI / 9, profileShift: 0 }) // 1.5708
 */
export function thicknessFromSpan(span: number, k: number, gear: SpanGear): number {
	const { normalModule, normalAngle, transverseAngle, teeth } = gear;
	return (
		span / Math.cos(normalAngle) - normalModule * (Math.PI * (k - 1) + teeth * involute(transverseAngle))
	);
}
