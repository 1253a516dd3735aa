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
	/** How much of each tooth's height is worn away at the tip (radial). */
	tipWear?: Quantity<LengthUnit> | undefined;
	/** Measured arc thickness of a tooth on the reference cylinder, in the normal plane: decides the backlash. */
	toothThickness?: Quantity<LengthUnit> | undefined;
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
	/** Its flanks show wear: a new gear on them is a warning. */
	worn?: boolean | undefined;
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

/**
 * One change that helps. A power, speed or face width is solved: where the middle falls short, `value` brings the
 * deciding answer to the plant's margin, and `carriesAt` does so at the bad end of the uncertainty too; where only
 * the bad end falls short, both are the latter. A finish or material is one that reaches the plant's margin.
 */
export interface Remedy {
	change: 'power' | 'speed' | 'faceWidth' | 'finish' | 'material';
	value: Quantity<string> | string;
	/** The spare then is in this what the original gear was; anything else is a change that needs review. */
	likeForLike: boolean;
	/** Margin in bending of this gear with `value` applied. */
	bendingMargin: number;
	bendingMarginLow: number;
	carriesAt: Quantity<string> | string | null;
}

/** One answer of the pair: what the margin is, at the middle and at the bad end, and what the plant needs. */
export interface Limit {
	answer: LimitName;
	margin: number;
	marginLow: number;
	needed: number;
}

/** Wear is one answer of both flanks: its published limit goes by the mean hardness of the pair. */
export type LimitName = 'gear-bending' | 'mate-bending' | 'wear';

/** One line of the working: `expression` carries the symbols, `numbers` the same with figures put in. */
export interface WorkingLine {
	symbol: string;
	name: string;
	expression: string;
	numbers: string;
	value: number;
	unit: string;
	source: string;
	/** Whose figure it is, where it is not this gear's. */
	of?: 'mate' | undefined;
}

/** A gear that the readings left standing, and what was found for it. */
export interface TriedGear {
	teeth: number;
	pitch: Pitch;
	pressureAngle: number;
	form: 'full-depth' | 'stub';
	/** In modules. */
	profileShift: number;
	probability: number;
	verdict: Verdict;
	limitedBy: LimitName | null;
	/** Of the answer that decides for this gear. */
	margin: number | null;
	marginLow: number | null;
	/** Whether this is the gear whose figures the outcome shows. */
	decides: boolean;
}

export interface Outcome {
	/** Version of the calculation core that answered. */
	core: string;
	pitchDiameter: number | null;
	/** In the transverse plane, as `pitchDiameter` = `module` x teeth; `normalModule` is what the cutter had. */
	module: number | null;
	normalModule: number | null;
	diametralPitch: number | null;
	circularPitch: number | null;
	pitchLineVelocity: number | null;
	/** Of the pair: the mate's where it gives the higher factor; null where that hangs on a velocity that is not known. */
	velocityLaw: string | null;
	velocityFactor: number | null;
	formFactor: number | null;
	formFactorSource: 'handbook' | 'geometry' | null;
	formFactorHandbook: number | null;
	formFactorGeometry: number | null;
	/** Dolan and Broghamer's factor at the fillet. For information: it is in no stress and no verdict. */
	stressConcentration: number | null;
	tangentialForce: number | null;
	designForce: number | null;
	bendingStress: number | null;
	allowableBending: number | null;
	bendingMargin: number | null;
	bendingMarginLow: number | null;
	/** What this gear's drive may carry at the plant's margins: the lowest of all answers that were computed. */
	permittedPower: number | null;
	permittedTorque: number | null;
	/** The answers that were computed, and which of them decides: the least of what the plant needs. */
	limits: Limit[];
	limitedBy: LimitName | null;
	wear: null | {
		contactStress: number;
		allowableContact: number;
		contactMargin: number;
		wearLoad: number;
		wearLoadMargin: number;
	};
	mateBending: null | { bendingStress: number; allowableBending: number; bendingMargin: number };
	mesh: null | {
		/** Teeth of the larger over teeth of the smaller; null with a rack, as is the centre distance. */
		ratio: number | null;
		standardCentreDistance: number | null;
		/** Transverse, degrees. */
		operatingPressureAngle: number;
		/** In the transverse plane; `overlapRatio` is what a helix adds. */
		contactRatio: number;
		/** Where both have a flank: shorter by what undercut and fillets take, and judged. Null where that is not known. */
		contactRatioUndercut: number | null;
		overlapRatio: number;
		normalBacklash: number | null;
		huntingTooth: boolean;
		undercut: { gear: boolean; mate: boolean };
		interference: boolean;
	};
	/** Spare over original at the same drive. */
	original: null | { bendingCapacityRatio: number; wearCapacityRatio: number | null };
	verdict: Verdict;
	reasons: Reason[];
	remedies: Remedy[];
	working: WorkingLine[];
	/** Of a check that was left open between several gears: each of them, likeliest first. */
	gears?: TriedGear[] | undefined;
}

/** What bad input is answered with, everywhere. `path` names the field, `message` says what to do. */
export interface InvalidInput {
	error: { code: 'invalid-input'; issues: { path: string; message: string }[] };
}
