/**
 * Where a span can be taken: over how many teeth the jaws still lie on the flanks, and on how wide a gear. Lengths in mm,
 * angles in radians; external gears.
 */
import { baseDiameter, tipDiameter, type Member } from '../member';
import { straightDepth } from '../rack';
import { arcThickness } from '../thickness';
import { involute } from '../involute';

/**
 * Fewest and most teeth k, from 2, over which both jaws touch the involute between the end of the fillet and the tips.
 * The jaws touch at W cos βb / 2 from where the span leaves the base circle, W = (sb + (k - 1) pb) cos βb with tooth and
 * pitch on the base circle; the flank reaches there from r sin αt - (hs - x) mn / sin αt to √(ra² - rb²).
 * Null where no such span lies on the flanks, and for racks and internal gears. An undercut root begins somewhat higher.
 * Source: DIN 3960 (from memory).
 */
export function spansOnFlank(member: Member): { fewest: number; most: number } | null {
	const { kind, teeth, pitchDiameter: d, transverseModule, transverseAngle: angle } = member;
	const [base, tip] = [baseDiameter(member), tipDiameter(member)];
	if (kind === 'internal' || teeth === null || d === null || base === null || tip === null) return null;
	const depth = (straightDepth(member.rack) - member.profileShift) * member.normalModule;
	const from = Math.max(0, (d / 2) * Math.sin(angle) - depth / Math.sin(angle));
	const to = Math.sqrt(Math.max(0, (tip / 2) ** 2 - (base / 2) ** 2));
	const pitch = Math.PI * transverseModule * Math.cos(angle);
	const thickness = base * (arcThickness(member) / d + involute(angle));
	const acrossBase = 1 - (Math.sin(member.helixAngle) * Math.cos(member.normalAngle)) ** 2;
	const over = (half: number) => ((2 * half) / acrossBase - thickness) / pitch + 1;
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
