/** Where two members run: ratio, standard centre distance, and the angle on their operating pitch circles. */
import type { MeshGeometry } from './contact-path';
import { cosine, tangent, toDegrees, toRadians } from './degrees';
import { inverseInvolute } from './involute';
import { involuteOf } from './involute-line';
import type { Member } from './member';
import { SOURCES } from './sources';
import type { Recorder } from './working';

interface Question {
	gear: Member;
	mate: Member;
	/** Measured, mm; null where it is not known. */
	centreDistance: number | null;
}

/** Two members with teeth, the pinion with the fewer; `sign` is -1 for an internal wheel. */
interface Pair {
	pinion: Member;
	wheel: Member;
	counts: { N1: number; N2: number };
	sign: 1 | -1;
}

const source = SOURCES.mesh;

/**
 * Where the two run: at the measured centre distance, else where nominal teeth have no backlash; a rack at its own angle.
 * Angles and modules of the two differ only where a pair agrees in base pitch alone. Null where no mesh can be.
 */
export function operatingOf(
	{ gear, mate, centreDistance }: Question,
	recorder: Recorder
): MeshGeometry | null {
	const [pinion, wheel] = [gear, mate].sort((a, b) => sizeOf(a) - sizeOf(b)) as [Member, Member];
	transverseAngleLine(pinion, recorder);
	if (pinion.teeth === null) return null;
	if (wheel.teeth === null) {
		const operatingAngle = ownAngle(wheel, 2, recorder);
		return { pinion, wheel, ratio: null, standardCentre: null, centre: null, operatingAngle };
	}
	const counts = { N1: pinion.teeth, N2: wheel.teeth };
	const pair: Pair = { pinion, wheel, counts, sign: wheel.kind === 'internal' ? -1 : 1 };
	const ratio = recorder.step(
		{ symbol: 'i', name: 'ratio', expression: 'N2 / N1', unit: '1', source },
		counts,
		({ N1, N2 }) => N2 / N1
	);
	const standardCentre = standardCentreOf(pair, recorder);
	const bases = sumOverTeeth(
		pair,
		(member) => (member.transverseModule / 2) * Math.cos(member.transverseAngle)
	);
	if (!(bases > 0)) return null;
	const operatingAngle =
		centreDistance === null
			? unmeasuredAngle(pair, recorder)
			: measuredAngle(pair, { bases, standardCentre, centreDistance }, recorder);
	if (operatingAngle === null) return null;
	const centre = centreDistance ?? unmeasuredCentre(pair, { bases, operatingAngle }, recorder);
	return { pinion, wheel, ratio, standardCentre, centre, operatingAngle };
}

function sizeOf({ teeth }: Member): number {
	return teeth ?? Infinity;
}

/** Of both members, each times its teeth; of an internal pair the wheel's less the pinion's. */
function sumOverTeeth({ pinion, wheel, counts, sign }: Pair, of: (member: Member) => number): number {
	return counts.N2 * of(wheel) + sign * counts.N1 * of(pinion);
}

/** C0 = (m2 N2 + m1 N1) / 2 in mm: the reference circles touch. Internal: with a minus. Source: definition. */
function standardCentreOf({ pinion, wheel, counts, sign }: Pair, recorder: Recorder): number {
	return recorder.step(
		{
			symbol: 'C0',
			name: 'standard centre distance',
			expression: `(m2 · N2 ${sign === 1 ? '+' : '-'} m1 · N1) / 2`,
			unit: 'mm',
			source
		},
		{ ...counts, m1: pinion.transverseModule, m2: wheel.transverseModule },
		({ m1, m2, N1, N2 }) => (m2 * N2 + sign * (m1 * N1)) / 2
	);
}

/**
 * cos αw = (rb2 + rb1) / C, internal with a minus; null where the base circles leave no room for the line of action.
 * Source: Shigley, Mechanical Engineering Design, 8th ed., ch. 13 (edition from memory).
 */
function measuredAngle(
	{ pinion, wheel, counts, sign }: Pair,
	{
		bases,
		standardCentre,
		centreDistance
	}: { bases: number; standardCentre: number; centreDistance: number },
	recorder: Recorder
): number | null {
	if (!(bases / centreDistance < 1)) return null;
	const angle = recorder.step(
		{
			symbol: 'αw',
			name: 'operating pressure angle at the measured centre distance',
			expression: `arccos((m2 · N2 · cos(α2) ${sign === 1 ? '+' : '-'} m1 · N1 · cos(α1)) / (2 · C))`,
			unit: '°',
			source
		},
		{
			...counts,
			m1: pinion.transverseModule,
			m2: wheel.transverseModule,
			α1: toDegrees(pinion.transverseAngle),
			α2: toDegrees(wheel.transverseAngle),
			C: centreDistance
		},
		({ m1, m2, N1, N2, α1, α2, C }) =>
			toDegrees(Math.acos(Math.min(1, (m2 * N2 * cosine(α2) + sign * (m1 * N1 * cosine(α1))) / (2 * C))))
	);
	// At the standard distance the angle is the standard one, to the last digit.
	const standard = areAlike(pinion, wheel) && centreDistance === standardCentre;
	return standard ? pinion.transverseAngle : toRadians(angle);
}

/**
 * inv αw = (N2 inv α2 + N1 inv α1 + 2 (x2 tan αn2 + x1 tan αn1)) / (N2 + N1), internal with a minus; between alike members
 * it is inv αw = inv αt + 2 (x1 + x2) tan αn / (N1 + N2). Null where the shifts leave no such angle.
 * Source: Shigley, Mechanical Engineering Design, 8th ed., ch. 13; DIN 3960 (both from memory).
 */
function unmeasuredAngle(pair: Pair, recorder: Recorder): number | null {
	const { pinion, wheel, counts, sign } = pair;
	const [x1, x2] = [pinion.profileShift, wheel.profileShift];
	if (areAlike(pinion, wheel) && x2 + sign * x1 === 0) return ownAngle(pinion, 1, recorder);
	const both = sign === 1 ? '+' : '-';
	const inv = recorder.step(
		{
			symbol: 'invw',
			name: 'involute of the operating pressure angle, by the shifts',
			expression: `(N2 · inv2 ${both} N1 · inv1 + 2 · (x2 · tan(αn2) ${both} x1 · tan(αn1))) / (N2 ${both} N1)`,
			unit: '1',
			source
		},
		{
			...counts,
			inv1: involuteOf(pinion.transverseAngle, 1, recorder),
			inv2: involuteOf(wheel.transverseAngle, 2, recorder),
			x1,
			x2,
			αn1: toDegrees(pinion.normalAngle),
			αn2: toDegrees(wheel.normalAngle)
		},
		({ N1, N2, inv1, inv2, αn1, αn2 }) =>
			(N2 * inv2 + sign * (N1 * inv1) + 2 * (x2 * tangent(αn2) + sign * (x1 * tangent(αn1)))) /
			(N2 + sign * N1)
	);
	if (!(inv > 0)) return null;
	const angle = recorder.step(
		{
			symbol: 'αw',
			name: 'operating pressure angle, by the shifts',
			expression: 'from the involute: tan(αw) - π · αw / 180 = invw',
			unit: '°',
			source
		},
		{ invw: inv },
		({ invw }) => toDegrees(inverseInvolute(invw))
	);
	return toRadians(angle);
}

/** C = (rb2 + rb1) / cos αw in mm, internal with a minus: where nominal teeth have no backlash. Source: definition. */
function unmeasuredCentre(
	{ pinion, wheel, counts, sign }: Pair,
	{ bases, operatingAngle }: { bases: number; operatingAngle: number },
	recorder: Recorder
): number {
	return recorder.step(
		{
			symbol: 'C',
			name: 'centre distance without backlash, by the shifts',
			expression: `(m2 · N2 · cos(α2) ${sign === 1 ? '+' : '-'} m1 · N1 · cos(α1)) / (2 · cos(αw))`,
			unit: 'mm',
			source
		},
		{
			...counts,
			m1: pinion.transverseModule,
			m2: wheel.transverseModule,
			α1: toDegrees(pinion.transverseAngle),
			α2: toDegrees(wheel.transverseAngle),
			αw: toDegrees(operatingAngle)
		},
		() => bases / Math.cos(operatingAngle)
	);
}

/** A rack, and members whose shifts make up for each other, run at the angle of the teeth themselves. */
function ownAngle({ transverseAngle }: Member, place: 1 | 2, recorder: Recorder): number {
	recorder.step(
		{
			symbol: 'αw',
			name: 'operating pressure angle, that of the teeth',
			expression: `α${place}`,
			unit: '°',
			source
		},
		{ [`α${place}`]: toDegrees(transverseAngle) },
		() => toDegrees(transverseAngle)
	);
	return transverseAngle;
}

/** A helical pair runs in its transverse plane. Source: as of `memberOf`. */
function transverseAngleLine({ helixAngle, normalAngle, transverseAngle }: Member, recorder: Recorder): void {
	if (helixAngle === 0) return;
	recorder.step(
		{
			symbol: 'αt',
			name: 'transverse pressure angle',
			expression: 'arctan(tan(αn) / cos(β))',
			unit: '°',
			source
		},
		{ αn: toDegrees(normalAngle), β: toDegrees(helixAngle) },
		() => toDegrees(transverseAngle)
	);
}

function areAlike(one: Member, other: Member): boolean {
	return one.transverseAngle === other.transverseAngle && one.transverseModule === other.transverseModule;
}
