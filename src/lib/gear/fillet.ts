/**
 * The fillet that a rack's rounded tip cuts at the root of a tooth: a trochoid. Module 1; the tooth's centre line is
 * the y axis, the gear's centre the origin, the fillet that of the right flank.
 */
import type { BasicRack } from './rack';

export interface Point {
	x: number;
	y: number;
}

/** A point of the fillet with the direction of its normal, which points out of the tool into the tooth. */
export interface FilletPoint extends Point {
	normal: Point;
}

/**
 * Fillet point by the angle ψ (radians) of the tool's normal below the pitch line: from the pressure angle, where the
 * tool's flank ends, to π/2, where the root begins. The tool's tip circle, of radius rho around a centre b below the
 * pitch line, touches the tooth where its normal passes through the pitch point:
 * Q - P = (b / sin ψ + rho) (-cos ψ, -sin ψ), turned back by φ = -(b cot ψ + xc) / r with the gear.
 * Source: envelope of a rolling rack (definition); Litvin, Gear Geometry and Applied Theory (from memory).
 */
export function filletPoint(rack: BasicRack, teeth: number, profileShift: number, psi: number): FilletPoint {
	const { tipRadius } = rack;
	const radius = teeth / 2;
	const centre = tipCentre(rack);
	const below = centre.depth - profileShift;
	const sine = Math.sin(psi);
	const cosine = Math.cos(psi);
	const turned = -((below * cosine) / sine + centre.x) / radius;
	const reach = below / sine + tipRadius;
	const normal = turnedBy(turned, -cosine, -sine);
	const pitchPoint = turnedBy(turned, 0, radius);
	return { x: pitchPoint.x + reach * normal.x, y: pitchPoint.y + reach * normal.y, normal };
}

/** The same on a rack's own tooth, whose fillet is the tool's tip circle itself; y = 0 is the reference line. */
export function rackFilletPoint(rack: BasicRack, psi: number): FilletPoint {
	const centre = tipCentre(rack);
	const normal = { x: -Math.cos(psi), y: -Math.sin(psi) };
	return { x: centre.x + rack.tipRadius * normal.x, y: -centre.depth + rack.tipRadius * normal.y, normal };
}

/** Centre of the tool's tip circle: from the tooth's centre line, and below the tool's reference line. */
export function tipCentre({ dedendum, tipRadius, pressureAngle }: BasicRack): { x: number; depth: number } {
	const depth = dedendum - tipRadius;
	const x = Math.PI / 4 + depth * Math.tan(pressureAngle) + tipRadius / Math.cos(pressureAngle);
	return { x, depth };
}

function turnedBy(angle: number, x: number, y: number): Point {
	const sine = Math.sin(angle);
	const cosine = Math.cos(angle);
	return { x: x * cosine - y * sine, y: x * sine + y * cosine };
}
