/**
 * Where a span can be taken: over how many teeth the jaws still lie on the flanks, what they read past the tips, and on
 * how wide a gear. Lengths in mm, angles in radians; external gears.
 */
import { baseDiameter, tipDiameter, type Member } from '../member';
import { straightDepth } from '../rack';
import { arcThickness } from '../thickness';
import { involute } from '../involute';
import { basePitch } from './span';

/** Between which lengths from where the base tangent leaves the base circle a flank lies, in the transverse plane, mm. */
export interface Flank {
	from: number;
	to: number;
	baseRadius: number;
	/** cos βb; a span W touches at W cos βb / 2. */
	baseHelixCosine: number;
}

interface FlankGear {
	pitchRadius: number;
	tipRadius: number;
	/** How far below the reference circle the cutting rack's flank is straight, mm: (hs - x) mn. */
	depth: number;
	normalAngle: number;
	transverseAngle: number;
	helixAngle: number;
}

/**
 * The flank from the end of the fillet to the tip: from r sin αt - (hs - x) mn / sin αt to √(ra² - rb²);
 * sin βb = sin β cos αn. An undercut root begins somewhat higher. Source: DIN 3960 (from memory).
 * @example flankOf({ pitchRadius: 10, tipRadius: 11, depth: 1, normalAngle: Math.PI / 9, transverseAngle: Math.PI / 9, helixAngle: 0 }).to // 5.718197
 */
export function flankOf(gear: FlankGear): Flank {
	const { pitchRadius, tipRadius, depth, normalAngle, transverseAngle, helixAngle } = gear;
	const sine = Math.sin(transverseAngle);
	const baseRadius = pitchRadius * Math.cos(transverseAngle);
	return {
		from: Math.max(0, pitchRadius * sine - depth / sine),
		to: Math.sqrt(Math.max(0, tipRadius * tipRadius - baseRadius * baseRadius)),
		baseRadius,
		baseHelixCosine: Math.sqrt(1 - (Math.sin(helixAngle) * Math.cos(normalAngle)) ** 2)
	};
}

/**
 * By how much jaws that stand square on the corners of the tips read less than the base tangent W, mm; 0 where they
 * find flanks. Each jaw would touch at t = W cos βb / 2; the flank ends at te, a turn of Δ = (t - te) / rb before, and
 * the corner lies t - (rb sin Δ + te cos Δ) short of it. Twice that, over cos βb.
 * Source: geometry of an involute (derived here); exact for spur gears, near for helical ones, whose corner is a helix.
 * @example shortAtTips(13.5, { from: 0, to: 5.7182, baseRadius: 9.39693, baseHelixCosine: 1 }) // 0.073016
 */
export function shortAtTips(span: number, { to, baseRadius, baseHelixCosine }: Flank): number {
	const touch = (span * baseHelixCosine) / 2;
	if (touch <= to) return 0;
	const turn = (touch - to) / baseRadius;
	return (2 * (touch - baseRadius * Math.sin(turn) - to * Math.cos(turn))) / baseHelixCosine;
}

/**
 * By how much a span on the corners of the tips changes with the place of the corner along the base tangent, mm a mm:
 * the derivative of `shortAtTips`, 2 te / rb sin Δ, over cos βb; 0 where the jaws find flanks.
 * @example cornerSlope(13.5, { from: 0, to: 5.7182, baseRadius: 9.39693, baseHelixCosine: 1 }) // 0.133364
 */
export function cornerSlope(span: number, { to, baseRadius, baseHelixCosine }: Flank): number {
	const turn = Math.max(0, (span * baseHelixCosine) / 2 - to) / baseRadius;
	return (2 * (to / baseRadius) * Math.sin(turn)) / baseHelixCosine;
}

/**
 * Fewest and most teeth k, from 2, over which both jaws touch the involute between the end of the fillet and the tips.
 * W = (sb + (k - 1) pb) cos βb with tooth and pitch on the base circle; `flankOf` tells where the flank ends.
 * Null where no such span lies on the flanks, and for racks and internal gears.
 * Source: DIN 3960 (from memory).
 */
export function spansOnFlank(member: Member): { fewest: number; most: number } | null {
	const { kind, teeth, pitchDiameter: d, transverseModule, transverseAngle: angle } = member;
	const [base, tip] = [baseDiameter(member), tipDiameter(member)];
	if (kind === 'internal' || teeth === null || d === null || base === null || tip === null) return null;
	const { from, to, baseHelixCosine } = flankOf({
		pitchRadius: d / 2,
		tipRadius: tip / 2,
		depth: (straightDepth(member.rack) - member.profileShift) * member.normalModule,
		normalAngle: member.normalAngle,
		transverseAngle: angle,
		helixAngle: member.helixAngle
	});
	const pitch = basePitch(transverseModule, angle);
	const thickness = base * (arcThickness(member) / d + involute(angle));
	const over = (half: number) => ((2 * half) / baseHelixCosine ** 2 - thickness) / pitch + 1;
	const fewest = Math.max(2, Math.ceil(over(from) - ROUNDING));
	const most = Math.floor(over(to) + ROUNDING);
	return fewest <= most ? { fewest, most } : null;
}

/** A span that touches just at the end of a flank still touches it. */
const ROUNDING = 1e-9;

/**
 * Least face width in mm on which the jaws find both flanks of a helical gear: b > W sin βb, sin βb = sin β cos αn.
 * Source: ISO/TR 10064-2; DIN 3960 (from memory).
 * @example leastFaceForSpan(53.6, (24 * Math.PI) / 180, Math.PI / 9) // 20.4863
 */
export function leastFaceForSpan(span: number, helixAngle: number, normalAngle: number): number {
	return span * Math.sin(helixAngle) * Math.cos(normalAngle);
}
