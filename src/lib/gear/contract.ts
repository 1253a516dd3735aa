/**
 * The question that `evaluate` answers and the shape of its answer: the same on the tablet, on the server
 * and from a shell. Quantities come in as typed, with their unit; every figure of the outcome is SI
 * (mm, N, MPa, W, N·m, m/s). Fields are added here, never renamed. The zod twin is records/evaluate.ts.
 */

export type LengthUnit = 'mm' | 'cm' | 'm' | 'in' | 'ft';
export type SpeedUnit = 'rpm';
export type VelocityUnit = 'm/s' | 'ft/min';
export type PowerUnit = 'W' | 'kW' | 'hp';
export type TorqueUnit = 'N*m' | 'lbf*ft' | 'lbf*in';
export type ForceUnit = 'N' | 'kN' | 'lbf';
export type StressUnit = 'MPa' | 'GPa' | 'psi' | 'ksi';

export interface Quantity<U extends string> {
	value: number;
	unit: U;
}

export type GearKind = 'spur' | 'helical' | 'internal' | 'rack';
export type Finish = 'cast' | 'cut' | 'hobbed' | 'ground';
export type CutLaw = 600 | 1200;

/** Pitch as the trade gives it. A module is in millimetres, a diametral pitch in teeth per inch. */
export type Pitch =
	| { system: 'diametral'; value: number }
	| { system: 'module'; value: number }
	| { system: 'circular'; value: number; unit: LengthUnit };

/** A named tooth form, or the basic rack itself in modules. */
export type ToothForm = 'full-depth' | 'stub' | { addendum: number; dedendum: number; tipRadius: number };

export interface Material {
	name: string;
	metallic: boolean;
	allowableBending: Quantity<StressUnit>;
	brinell?: number | undefined;
	modulus?: Quantity<StressUnit> | undefined;
	poisson?: number | undefined;
	permitted: boolean;
}

export interface ToothedPart {
	kind: GearKind;
	/** Absent on a rack. */
	teeth?: number | undefined;
	pitch: Pitch;
	plane?: 'normal' | 'transverse' | undefined;
	/** Degrees. */
	pressureAngle: number;
	form: ToothForm;
	/** In modules. */
	profileShift?: number | undefined;
	/** Degrees at the reference cylinder. */
	helixAngle?: number | undefined;
	finish?: Finish | undefined;
}

export interface Gear extends ToothedPart {
	finish: Finish;
	faceWidth: Quantity<LengthUnit>;
	material: Material;
}

export interface Mate extends Partial<ToothedPart> {
	kind: GearKind;
	faceWidth?: Quantity<LengthUnit> | undefined;
	material?: Material | undefined;
	centreDistance?: Quantity<LengthUnit> | undefined;
}

export type Load =
	| { power: Quantity<PowerUnit> }
	| { torque: Quantity<TorqueUnit> }
	| { tangentialForce: Quantity<ForceUnit> }
	| 'unknown';

export interface Drive {
	load: Load;
	/** Of this gear. A rack has a velocity instead. */
	speed?: Quantity<SpeedUnit> | undefined;
	velocity?: Quantity<VelocityUnit> | undefined;
	/** Multiplies the load, once. */
	serviceFactor: number;
	bending?: 'one-way' | 'reversing' | undefined;
}

export interface Rules {
	formFactor: 'handbook' | 'geometry' | 'lower-of-both';
	cutLaw: CutLaw;
	bendingMargin: number;
	wearMargin: number;
	reversingFactor: number;
	/** Highest pitch-line velocity the plant allows for each finish; null is the method's own limit. */
	speedLimit: Record<Finish, Quantity<VelocityUnit> | null>;
}

/** Standard uncertainties as fractions of the value. */
export interface Uncertainty {
	faceWidth: number;
	load: number;
	speed: number;
}

export interface EvaluateInput {
	gear: Gear;
	mate?: Mate | undefined;
	original?: Gear | undefined;
	drive: Drive;
	rules?: Partial<Rules> | undefined;
	permittedMaterials?: Material[] | undefined;
	uncertainty?: Partial<Uncertainty> | undefined;
}

export type Verdict = 'carries' | 'close' | 'will-not-carry' | 'not-permitted' | 'cannot-say';

export const VERDICTS: readonly Verdict[] = [
	'carries',
	'close',
	'will-not-carry',
	'not-permitted',
	'cannot-say'
];

/** A coded reason. `values` feed the words of other languages; `text` is the English sentence. */
export interface Reason {
	code: string;
	text: string;
	values?: Record<string, number | string> | undefined;
}

export interface Remedy {
	change: 'power' | 'speed' | 'faceWidth' | 'finish' | 'material';
	value: Quantity<string> | string;
	likeForLike: boolean;
	bendingMargin: number;
}

/** One line of the working: `expression` carries the symbols, `numbers` the same with figures put in. */
export interface WorkingLine {
	symbol: string;
	name: string;
	expression: string;
	numbers: string;
	value: number;
	unit: string;
	source: string;
}

export interface Outcome {
	/** Version of the calculation core that answered. */
	core: string;
	pitchDiameter: number | null;
	module: number | null;
	diametralPitch: number | null;
	circularPitch: number | null;
	pitchLineVelocity: number | null;
	velocityLaw: string | null;
	velocityFactor: number | null;
	formFactor: number | null;
	formFactorSource: 'handbook' | 'geometry' | null;
	formFactorHandbook: number | null;
	formFactorGeometry: number | null;
	tangentialForce: number | null;
	designForce: number | null;
	bendingStress: number | null;
	allowableBending: number | null;
	bendingMargin: number | null;
	bendingMarginLow: number | null;
	permittedPower: number | null;
	permittedTorque: number | null;
	wear: null | {
		contactStress: number;
		allowableContact: number;
		contactMargin: number;
		wearLoad: number;
		wearLoadMargin: number;
	};
	mateBending: null | { bendingStress: number; allowableBending: number; bendingMargin: number };
	mesh: null | {
		ratio: number;
		standardCentreDistance: number;
		operatingPressureAngle: number;
		contactRatio: number;
		normalBacklash: number | null;
		huntingTooth: boolean;
		undercut: { gear: boolean; mate: boolean };
		interference: boolean;
	};
	original: null | { bendingCapacityRatio: number; wearCapacityRatio: number | null };
	verdict: Verdict;
	reasons: Reason[];
	remedies: Remedy[];
	working: WorkingLine[];
}

/** What bad input is answered with, everywhere. `path` names the field, `message` says what to do. */
export interface InvalidInput {
	error: { code: 'invalid-input'; issues: { path: string; message: string }[] };
}
