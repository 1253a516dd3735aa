/**
 * One member of a mesh with its pitch and angle known in both planes: what strength, wear, mesh and remedies take.
 * Lengths in mm, angles in radians. A member without teeth is a rack.
 */
import type { GearKind, LengthUnit, Quantity, ToothedPart } from './contract';
import { moduleOf } from './pitch';
import { toSI } from './quantity';
import { rackOf, type BasicRack } from './rack';
import { SOURCES } from './sources';
import { unrecorded, type Recorder } from './working';

export interface Member {
	kind: GearKind;
	/** Null on a rack. */
	teeth: number | null;
	normalModule: number;
	transverseModule: number;
	normalAngle: number;
	transverseAngle: number;
	helixAngle: number;
	/** Normal plane, in normal modules. */
	rack: BasicRack;
	/** In normal modules. */
	profileShift: number;
	/** Radial, mm. */
	tipWear: number;
	/** Measured arc thickness on the reference cylinder in the normal plane, mm; null where it is nominal. */
	toothThickness: number | null;
	/** mm; null on a rack. */
	pitchDiameter: number | null;
}

const radians = (degrees: number) => (degrees * Math.PI) / 180;
const source = SOURCES.geometry;

/**
 * Pitch and angle of a part in both planes. With helix angle β: mn = mt cos β, tan αn = tan αt cos β.
 * d = mt N, in the transverse plane. A part that does not name its plane is taken as stated in the transverse one.
 * Source: Shigley, Mechanical Engineering Design, 8th ed., ch. 13 (edition from memory).
 */
export function memberOf(part: ToothedPart, recorder: Recorder = unrecorded): Member {
	const stated = moduleOf(part.pitch, recorder);
	const helixAngle = radians(part.helixAngle ?? 0);
	const planes = planesOf(part, stated, helixAngle, recorder);
	const teeth = part.teeth ?? null;
	return {
		kind: part.kind,
		teeth,
		...planes,
		helixAngle,
		rack: rackOf(part.form, planes.normalAngle),
		profileShift: part.profileShift ?? 0,
		tipWear: millimetres(part.tipWear) ?? 0,
		toothThickness: millimetres(part.toothThickness),
		pitchDiameter: teeth === null ? null : planes.transverseModule * teeth
	};
}

type Planes = Pick<Member, 'normalModule' | 'transverseModule' | 'normalAngle' | 'transverseAngle'>;

function planesOf(part: ToothedPart, stated: number, helixAngle: number, recorder: Recorder): Planes {
	const angle = radians(part.pressureAngle);
	if (helixAngle === 0) {
		return { normalModule: stated, transverseModule: stated, normalAngle: angle, transverseAngle: angle };
	}
	const cosine = Math.cos(helixAngle);
	if (part.plane === 'normal') {
		const transverseModule = recorder.step(
			{ symbol: 'mt', name: 'transverse module', expression: 'm / cos(β)', unit: 'mm', source },
			{ m: stated, β: part.helixAngle ?? 0 },
			({ m }) => m / cosine
		);
		return {
			normalModule: stated,
			transverseModule,
			normalAngle: angle,
			transverseAngle: Math.atan(Math.tan(angle) / cosine)
		};
	}
	const normalModule = recorder.step(
		{ symbol: 'mn', name: 'normal module', expression: 'm · cos(β)', unit: 'mm', source },
		{ m: stated, β: part.helixAngle ?? 0 },
		({ m }) => m * cosine
	);
	return {
		normalModule,
		transverseModule: stated,
		normalAngle: Math.atan(Math.tan(angle) * cosine),
		transverseAngle: angle
	};
}

function millimetres(quantity: Quantity<LengthUnit> | undefined): number | null {
	return quantity ? toSI(quantity) : null;
}

/** Base diameter in mm. db = d cos αt. Null on a rack. */
export function baseDiameter({ pitchDiameter, transverseAngle }: Member): number | null {
	return pitchDiameter === null ? null : pitchDiameter * Math.cos(transverseAngle);
}

/**
 * Tip diameter in mm: da = d + 2 (ha + x) mn - 2 w outside, d - 2 (ha - x) mn + 2 w of an internal gear, whose tips
 * point inwards (x positive moves the teeth outwards). w is the wear of the tip. Null on a rack.
 * Source: definition; Mott, Machine Elements in Mechanical Design, 4th ed., p. 319.
 */
export function tipDiameter(member: Member): number | null {
	const { kind, pitchDiameter, normalModule, rack, profileShift, tipWear } = member;
	if (pitchDiameter === null) return null;
	return kind === 'internal'
		? pitchDiameter - 2 * (rack.addendum - profileShift) * normalModule + 2 * tipWear
		: pitchDiameter + 2 * (rack.addendum + profileShift) * normalModule - 2 * tipWear;
}

/**
 * Number of teeth Nv of the spur tooth that a helical one is like in its normal plane. Nv = N / cos³ β.
 * Source: Shigley, Mechanical Engineering Design, 8th ed., ch. 13 (edition from memory); Jindal, Machine Design,
 * Ex. 26-3, p. 699 (24 teeth at 24 degrees: 31.48).
 * @example virtualTeeth(24, (24 * Math.PI) / 180) // 31.48
 */
export function virtualTeeth(teeth: number, helixAngle: number, recorder: Recorder = unrecorded): number {
	if (helixAngle === 0) return teeth;
	return recorder.step(
		{ symbol: 'Nv', name: 'virtual teeth in the normal plane', expression: 'N / cos(β)³', unit: '1', source },
		{ N: teeth, β: (helixAngle * 180) / Math.PI },
		({ N }) => N / Math.cos(helixAngle) ** 3
	);
}
