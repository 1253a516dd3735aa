/**
 * Tooth thickness along the arc of the reference circle: nominal from the shift, or as measured. Lengths in mm, angles
 * in radians.
 */
import type { Member } from './member';

/**
 * Nominal arc thickness s in mm, without backlash. s = m (π / 2 + 2 x tan α), x the shift in modules; all of one plane.
 * Source: involute geometry (definition).
 * @example nominalThickness(5, 0.3, Math.PI / 9) // 8.945892
 */
export function nominalThickness(module: number, profileShift: number, pressureAngle: number): number {
	return module * (Math.PI / 2 + 2 * profileShift * Math.tan(pressureAngle));
}

/** Transverse arc thickness in mm: measured, or nominal; a shift outwards makes an internal gear's teeth thinner. */
export function arcThickness(member: Member): number {
	const { toothThickness, normalModule, normalAngle, profileShift, helixAngle, kind } = member;
	const shift = kind === 'internal' ? -profileShift : profileShift;
	return (toothThickness ?? nominalThickness(normalModule, shift, normalAngle)) / Math.cos(helixAngle);
}
