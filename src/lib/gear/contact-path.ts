/** The path along which two members touch, and whether a tip reaches beyond where the other's involute begins. */
import { involute } from './involute';
import { baseDiameter, tipDiameter, type Member } from './member';
import { SOURCES } from './sources';
import { nominalThickness } from './thickness';
import { unrecorded, type Recorder } from './working';

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
 * Length of the path of contact in mm, from tip circle to tip circle along the line of action, but not beyond the
 * points where that line leaves the base circles: within them there is no involute to touch.
 * External: Z = √(ra1² - rb1²) + √(ra2² - rb2²) - C sin αw; internal: the wheel's root with a minus, C sin αw with a
 * plus; rack: Z = √(ra1² - rb1²) - rb1 tan αw + h / sin αw, h from the pitch line to the rack's tips; 0 where the tips
 * do not reach each other.
 * Source: Shigley, Mechanical Engineering Design, 8th ed., sec. 13-6 (edition from memory); Bevan, The Theory of
 * Machines, Ex. 10.6, p. 338, and for the ends Ex. 10.4, p. 334. Undercut shortens the path further: not counted.
 */
export function contactPath(geometry: MeshGeometry, recorder: Recorder = unrecorded): number {
	const { pinionTip, wheelTip, wheelTangent } = lineOfAction(geometry);
	const begins = Math.max(0, wheelTip);
	// Tips that do not reach each other would end before they begin.
	const ends = Math.max(begins, Math.min(pinionTip, wheelTangent));
	return recorder.step(
		{
			symbol: 'Z',
			name: "path of contact, from where it leaves the pinion's base circle",
			expression: 'Ze - Zb',
			unit: 'mm',
			source: SOURCES.mesh
		},
		{ Ze: ends, Zb: begins },
		({ Ze, Zb }) => Ze - Zb
	);
}

/**
 * Whether a tip reaches beyond the point where the other's line of action leaves its base circle: there it meets no
 * involute and digs in, unless the root is undercut to make room. External: √(ra² - rb²) > C sin αw for either.
 * Source: Bevan, The Theory of Machines, Ex. 10.4, p. 334.
 */
export function interferes(geometry: MeshGeometry): boolean {
	const { pinionTip, wheelTip, wheelTangent, pitchPoint } = lineOfAction(geometry);
	const slack = 1e-9 * pitchPoint;
	return wheelTip < -slack || pinionTip > wheelTangent + slack;
}

/**
 * Places on the line of action, in mm from where it leaves the pinion's base circle: the pitch point, where contact
 * begins at the wheel's tips and ends at the pinion's, and where the line leaves the base circle of an external wheel.
 */
function lineOfAction({ pinion, wheel, centre, operatingAngle }: MeshGeometry): {
	pitchPoint: number;
	pinionTip: number;
	wheelTip: number;
	wheelTangent: number;
} {
	const pinionTip = tangentToTip(pinion);
	const pitchPoint = baseRadius(pinion) * Math.tan(operatingAngle);
	if (centre === null) {
		const wheelTip = pitchPoint - rackReach(pinion, wheel) / Math.sin(operatingAngle);
		return { pitchPoint, pinionTip, wheelTip, wheelTangent: Infinity };
	}
	const between = centre * Math.sin(operatingAngle);
	if (wheel.kind === 'internal') {
		return { pitchPoint, pinionTip, wheelTip: tangentToTip(wheel) - between, wheelTangent: Infinity };
	}
	return { pitchPoint, pinionTip, wheelTip: between - tangentToTip(wheel), wheelTangent: between };
}

/** √(ra² - rb²): from the point of tangency to the tip circle, 0 where the tips do not reach the base circle. */
function tangentToTip(member: Member): number {
	const tip = (tipDiameter(member) ?? 0) / 2;
	const base = baseRadius(member);
	return Math.sqrt(Math.max(0, (tip - base) * (tip + base)));
}

function baseRadius(member: Member): number {
	return (baseDiameter(member) ?? 0) / 2;
}

/**
 * From the pinion's rolling circle to the rack's tips. The rack stands without backlash: its space, which widens
 * towards the tips, is as wide at the rolling circle as the pinion's tooth. So a shift of the rack itself moves nothing.
 */
function rackReach(pinion: Member, rack: Member): number {
	const angle = rack.transverseAngle;
	const rolling = baseRadius(pinion) / Math.cos(angle);
	const nominal = nominalThickness(pinion.normalModule, pinion.profileShift, pinion.normalAngle);
	const onReference = nominal / Math.cos(pinion.helixAngle) / (pinion.pitchDiameter ?? NaN);
	const thickness = 2 * rolling * (onReference + involute(pinion.transverseAngle) - involute(angle));
	const middle = (thickness - (Math.PI / 2) * rack.transverseModule) / (2 * Math.tan(angle));
	return rack.rack.addendum * rack.normalModule - rack.tipWear - middle;
}
