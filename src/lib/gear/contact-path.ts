/** The path along which two members touch, and whether a tip reaches beyond where the other's involute begins. */
import { sine, tangent, toDegrees } from './degrees';
import { baseDiameter, tipDiameter, type Member } from './member';
import { rackReach } from './rack-reach';
import { SOURCES } from './sources';
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

/** Places on the line of action, in mm from where it leaves the pinion's base circle. */
export interface PathEnds {
	begins: number;
	ends: number;
	/** The other end of the line of action, where it leaves an external wheel's base circle; Infinity where there is none. */
	wheelTangent: number;
	pitchPoint: number;
}

const source = SOURCES.mesh;

/**
 * Length of the path of contact in mm, from tip circle to tip circle along the line of action, but not beyond the
 * points where that line leaves the base circles: within them there is no involute to touch.
 * External: Z = √(ra1² - rb1²) + √(ra2² - rb2²) - C sin αw; internal: the wheel's root with a minus, C sin αw with a
 * plus; rack: Z = √(ra1² - rb1²) - rb1 tan αw + h / sin αw, h from the pitch line to the rack's tips; 0 where the tips
 * do not reach each other.
 * Source: Shigley, Mechanical Engineering Design, 8th ed., sec. 13-6 (edition from memory); Bevan, The Theory of
 * Machines, Ex. 10.6, p. 338, and for the ends Ex. 10.4, p. 334. Undercut shortens the path further: `pathOnFlanks`.
 */
export function contactPath(geometry: MeshGeometry, recorder: Recorder = unrecorded): number {
	const { begins, ends } = pathEnds(geometry, recorder);
	return recorder.step(
		{ symbol: 'Z', name: 'path of contact', expression: 'Ze - Zb', unit: 'mm', source },
		{ Ze: ends, Zb: begins },
		({ Ze, Zb }) => Ze - Zb
	);
}

/** Where contact begins at the wheel's tips and ends at the pinion's. */
export function pathEnds(geometry: MeshGeometry, recorder: Recorder = unrecorded): PathEnds {
	const { pinionTip, wheelTip, wheelTangent, pitchPoint, expression, terms } = lineOfAction(
		geometry,
		recorder
	);
	const begins = recorder.step(
		{
			symbol: 'Zb',
			name: "where contact begins, from where the line of action leaves the pinion's base circle",
			expression: `max(0, ${expression})`,
			unit: 'mm',
			source
		},
		terms,
		() => Math.max(0, wheelTip)
	);
	// Tips that do not reach each other would end before they begin.
	const ends = recorder.step(
		{
			symbol: 'Ze',
			name: "where contact ends, from where the line of action leaves the pinion's base circle",
			expression: wheelTangent === Infinity ? 'max(Zb, Z1)' : 'max(Zb, min(Z1, A))',
			unit: 'mm',
			source
		},
		{ Zb: begins, Z1: pinionTip, A: wheelTangent },
		({ Zb, Z1, A }) => Math.max(Zb, Math.min(Z1, A))
	);
	return { begins, ends, wheelTangent, pitchPoint };
}

/**
 * Whether a tip reaches beyond the point where the other's line of action leaves its base circle: there it meets no
 * involute and digs in, unless the root is undercut to make room. External: √(ra² - rb²) > C sin αw for either.
 * Source: Bevan, The Theory of Machines, Ex. 10.4, p. 334.
 */
export function interferes(geometry: MeshGeometry): boolean {
	const { pinionTip, wheelTip, wheelTangent, pitchPoint } = lineOfAction(geometry, unrecorded);
	const slack = 1e-9 * pitchPoint;
	return wheelTip < -slack || pinionTip > wheelTangent + slack;
}

interface LineOfAction {
	pitchPoint: number;
	pinionTip: number;
	wheelTip: number;
	wheelTangent: number;
	/** How `wheelTip` comes about, for the working. */
	expression: string;
	terms: Record<string, number>;
}

/**
 * Places on the line of action, in mm from where it leaves the pinion's base circle: the pitch point, where contact
 * begins at the wheel's tips and ends at the pinion's, and where the line leaves the base circle of an external wheel.
 */
function lineOfAction(
	{ pinion, wheel, centre, operatingAngle }: MeshGeometry,
	recorder: Recorder
): LineOfAction {
	const own = tangentToTip(pinion, 1, recorder);
	const pinionTip = own.reach;
	const pitchPoint = own.base * Math.tan(operatingAngle);
	const αw = toDegrees(operatingAngle);
	if (centre === null) {
		const A = recorder.step(
			{
				symbol: 'A',
				name: "pitch point, from where the line of action leaves the pinion's base circle",
				expression: 'rb1 · tan(αw)',
				unit: 'mm',
				source
			},
			{ rb1: own.base, αw },
			({ rb1, αw }) => rb1 * tangent(αw)
		);
		const h = rackReach(pinion, wheel, recorder);
		const wheelTip = A - h / sine(αw);
		const expression = 'A - h / sin(αw)';
		return { pitchPoint, pinionTip, wheelTip, wheelTangent: Infinity, expression, terms: { A, h, αw } };
	}
	const Z2 = tangentToTip(wheel, 2, recorder).reach;
	const A = recorder.step(
		{
			symbol: 'A',
			name: 'line of action between the base circles',
			expression: 'C · sin(αw)',
			unit: 'mm',
			source
		},
		{ C: centre, αw },
		({ C, αw }) => C * sine(αw)
	);
	const terms = { A, Z2 };
	return wheel.kind === 'internal'
		? { pitchPoint, pinionTip, wheelTip: Z2 - A, wheelTangent: Infinity, expression: 'Z2 - A', terms }
		: { pitchPoint, pinionTip, wheelTip: A - Z2, wheelTangent: A, expression: 'A - Z2', terms };
}

/** √(ra² - rb²): from the point of tangency to the tip circle, 0 where the tips do not reach the base circle. */
function tangentToTip(member: Member, place: 1 | 2, recorder: Recorder): { reach: number; base: number } {
	const { kind, teeth, transverseModule, transverseAngle, normalModule, rack, profileShift, tipWear } =
		member;
	const who = place === 1 ? 'of the pinion' : 'of the wheel';
	const line = { unit: 'mm', source };
	const counted = { [`m${place}`]: transverseModule, [`N${place}`]: teeth ?? NaN };
	const size = `m${place} · N${place}`;
	const inwards = kind === 'internal';
	const tip = recorder.step(
		{
			...line,
			symbol: `ra${place}`,
			name: `tip radius ${who}`,
			expression: inwards
				? `${size} / 2 - (ha - x${place}) · mn + w`
				: `${size} / 2 + (ha + x${place}) · mn - w`
		},
		{ ...counted, ha: rack.addendum, [`x${place}`]: profileShift, mn: normalModule, w: tipWear },
		() => (tipDiameter(member) ?? 0) / 2
	);
	const base = recorder.step(
		{
			...line,
			symbol: `rb${place}`,
			name: `base radius ${who}`,
			expression: `${size} · cos(α${place}) / 2`
		},
		{ ...counted, [`α${place}`]: toDegrees(transverseAngle) },
		() => (baseDiameter(member) ?? 0) / 2
	);
	const reach = recorder.step(
		{
			...line,
			symbol: `Z${place}`,
			name: `from the base circle to the tips ${who}, along the line of action`,
			expression: `√(max(0, ra${place} - rb${place}) · (ra${place} + rb${place}))`
		},
		{ [`ra${place}`]: tip, [`rb${place}`]: base },
		// A tip within the base circle, or worn away altogether, reaches no involute.
		() => Math.sqrt(Math.max(0, tip - base) * (tip + base))
	);
	return { reach, base };
}
