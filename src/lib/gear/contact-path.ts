/** The path along which two members touch, and whether a tip reaches beyond where the other's involute begins. */
import { baseDiameter, tipDiameter, type Member } from './member';

/** Two members as they run; the pinion is the smaller, the wheel may be internal or a rack. mm, radians. */
export interface MeshGeometry {
	pinion: Member;
	wheel: Member;
	ratio: number | null;
	standardCentre: number | null;
	/** Measured, or that of the shifts; null with a rack. */
	centre: number | null;
	/** Transverse. */
	operatingAngle: number;
}

/**
 * Length of the path of contact in mm, from tip circle to tip circle along the line of action.
 * External: Z = √(ra1² - rb1²) + √(ra2² - rb2²) - C sin αw; internal: the wheel's root with a minus, C sin αw with a
 * plus; rack: Z = √(ra1² - rb1²) - rb1 tan α + (ha + x2 - x1) m / sin α.
 * Source: Shigley, Mechanical Engineering Design, 8th ed., sec. 13-6 (edition from memory); Bevan, The Theory of
 * Machines, Ex. 10.6, p. 338. Range: tips beyond the base circles; the path is not cut short by undercut.
 */
export function contactPath({ pinion, wheel, centre, operatingAngle }: MeshGeometry): number {
	const own = tangentToTip(pinion);
	if (centre === null) return own + rackReach(pinion, wheel) - toTangentPoint(pinion);
	const mates = tangentToTip(wheel);
	const between = centre * Math.sin(operatingAngle);
	return wheel.kind === 'internal' ? own - mates + between : own + mates - between;
}

/**
 * Whether a tip reaches beyond the point where the other's line of action leaves its base circle: there it meets no
 * involute and digs in, unless the root is undercut to make room. External: √(ra² - rb²) > C sin αw for either.
 * Source: Bevan, The Theory of Machines, Ex. 10.4, p. 334.
 */
export function interferes({ pinion, wheel, centre, operatingAngle }: MeshGeometry): boolean {
	const slack = 1 + 1e-9;
	if (centre === null) return rackReach(pinion, wheel) > toTangentPoint(pinion) * slack;
	const between = centre * Math.sin(operatingAngle);
	// An internal wheel's tips point inwards: they must stay outside the pinion's tangent point.
	if (wheel.kind === 'internal') return tangentToTip(wheel) * slack < between;
	return Math.max(tangentToTip(pinion), tangentToTip(wheel)) > between * slack;
}

/** √(ra² - rb²): from the point of tangency to the tip circle, 0 where the tips do not reach the base circle. */
function tangentToTip(member: Member): number {
	const tip = (tipDiameter(member) ?? 0) / 2;
	const base = (baseDiameter(member) ?? 0) / 2;
	return Math.sqrt(Math.max(0, (tip - base) * (tip + base)));
}

/** From the pitch point to the rack's tip line, along the line of action; the rack stands without backlash. */
function rackReach(
	pinion: Member,
	{ rack, normalModule, profileShift, tipWear, transverseAngle }: Member
): number {
	const depth = (rack.addendum + profileShift - pinion.profileShift) * normalModule - tipWear;
	return depth / Math.sin(transverseAngle);
}

/** From the pitch point to where the line of action leaves the base circle, on the reference circle. */
function toTangentPoint(member: Member): number {
	return ((baseDiameter(member) ?? 0) / 2) * Math.tan(member.transverseAngle);
}
