/**
 * The question that `identify` answers and the shape of its answer: which gear made these readings. Readings come in
 * as typed, with their unit and standard uncertainty. Fields are added here, never renamed. The zod twin is
 * records/identify.ts.
 */
import type { LengthUnit } from '../contract';

/** One reading, or repeats of it; `uncertainty` is standard, in the same unit. */
export interface IdentifyReading {
	value?: number | undefined;
	values?: number[] | undefined;
	unit: LengthUnit;
	uncertainty?: number | undefined;
}

export interface OutsideDiameterReading extends IdentifyReading {
	/** How it was taken; matters on an odd count. */
	taken?: 'over-tips' | 'tip-to-gap' | 'pi-tape' | undefined;
	tipWorn?: boolean | undefined;
}

export interface SpanReading extends IdentifyReading {
	teeth: number;
}

export interface OverPinsReading extends IdentifyReading {
	pinDiameter: { value: number; unit: LengthUnit };
}

export interface IdentifyInput {
	teeth: number;
	teethCertain?: boolean | undefined;
	outsideDiameter?: OutsideDiameterReading | undefined;
	rootDiameter?: IdentifyReading | undefined;
	wholeDepth?: IdentifyReading | undefined;
	spans?: SpanReading[] | undefined;
	overPins?: OverPinsReading | undefined;
	/** Across one tooth on the reference circle, by a gear-tooth vernier. */
	chordalThickness?: IdentifyReading | undefined;
	centreDistance?: IdentifyReading | undefined;
	mateTeeth?: number | undefined;
	/** Along the reference circle, or a rack, by a rule. */
	circularPitch?: IdentifyReading | undefined;
	/** Degrees. */
	helixAngle?: { value: number; uncertainty?: number | undefined } | undefined;
	flanksWorn?: boolean | undefined;
	/** Where the machine comes from. */
	prior?: 'inch' | 'metric' | 'either' | undefined;
	cannotMeasure?: ReadingName[] | undefined;
}

export const READING_NAMES = [
	'outsideDiameter',
	'rootDiameter',
	'wholeDepth',
	'spans',
	'overPins',
	'chordalThickness',
	'centreDistance',
	'circularPitch'
] as const;
export type ReadingName = (typeof READING_NAMES)[number];

/** How far a reading lies from what the candidate would give, in mm and in widths of its uncertainty. */
export interface Misfit {
	reading: ReadingName;
	/** Of a span: over how many teeth. */
	teeth?: number | undefined;
	residual: number;
	/** From what this gear would give new, without shift: what shift, worn tips and thin teeth explain is in here. */
	offNominal: number;
	unit: 'mm';
	sigmas: number;
	/** The reading does not fit what the others say: look again. */
	flagged: boolean;
}

export interface Candidate {
	system: 'diametral' | 'module' | 'circular';
	/** Teeth per inch, mm, or inches. */
	value: number;
	/** The same pitch by its other name. */
	module: number;
	diametralPitch: number;
	pressureAngle: number;
	form: 'full-depth' | 'stub';
	/** In modules; the middle of what the readings leave. */
	profileShift: number;
	/** How much the tips and the thickness of the teeth have lost, mm: the middle of what the readings leave. */
	tipLoss: number;
	thicknessLoss: number;
	/** As counted, or one more or less where the readings say so. */
	teeth: number;
	probability: number;
	misfits: Misfit[];
}

export interface NextReading {
	what: ReadingName;
	/** Over how many teeth, of a span. */
	spanTeeth?: number | undefined;
	/** Of two spans that tell by their difference: over how many the second is to be taken. */
	thenSpanTeeth?: number | undefined;
	why: string;
	/** What each leading candidate would show. */
	expected: { candidate: number; value: number; unit: LengthUnit }[];
}

export interface IdentifyAnswer {
	core: string;
	/** Likeliest first, down to one in a thousand, and three at least. */
	candidates: Candidate[];
	/** Probability that no involute gear of the candidate set made these readings. */
	noneFits: number;
	state: 'clear' | 'several' | 'none-fits';
	/** Null when nothing that can still be taken would help. */
	nextReading: NextReading | null;
}
