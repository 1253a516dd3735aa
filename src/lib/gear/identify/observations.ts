/** Readings as typed, in mm with their standard uncertainty: repeats become their mean, and their spread counts. */
import { toSI } from '../quantity';
import type { IdentifyInput, IdentifyReading, ReadingName } from './contract';

export interface Observation {
	reading: ReadingName;
	/** mm. */
	value: number;
	/** Standard uncertainty, mm. */
	sigma: number;
	/** Of a span: over how many teeth. Over pins: the pin's diameter in mm. */
	spanTeeth?: number;
	pin?: number;
}

/**
 * Standard uncertainty in mm where none is given, by the tool that is usual for the reading: a calliper, a gear-tooth
 * vernier, a rule over the shafts, a rule along the teeth. Half of what shop practice states at k = 2 (from memory).
 */
const USUAL: Record<ReadingName, number> = {
	outsideDiameter: 0.025,
	rootDiameter: 0.05,
	wholeDepth: 0.05,
	spans: 0.025,
	overPins: 0.025,
	chordalThickness: 0.025,
	centreDistance: 0.5,
	circularPitch: 0.25
};

/** In the order in which they explain each other: the first tells the size of the teeth. */
export function observationsOf(input: IdentifyInput): Observation[] {
	const { overPins } = input;
	const one = (reading: ReadingName, given: IdentifyReading | undefined): Observation[] =>
		given ? [observation(reading, given)] : [];
	return [
		...one('outsideDiameter', input.outsideDiameter),
		...one('wholeDepth', input.wholeDepth),
		...one('rootDiameter', input.rootDiameter),
		...(input.spans ?? []).map((span) => ({ ...observation('spans', span), spanTeeth: span.teeth })),
		...(overPins ? [{ ...observation('overPins', overPins), pin: toSI(overPins.pinDiameter) }] : []),
		...one('chordalThickness', input.chordalThickness),
		...(input.mateTeeth ? one('centreDistance', input.centreDistance) : []),
		...one('circularPitch', input.circularPitch)
	];
}

function observation(reading: ReadingName, given: IdentifyReading): Observation {
	const { unit } = given;
	const repeats = given.values ?? (given.value === undefined ? [] : [given.value]);
	const count = repeats.length;
	const mean = repeats.reduce((sum, value) => sum + value, 0) / count;
	const spread = repeats.reduce((sum, value) => sum + (value - mean) ** 2, 0) / Math.max(1, count - 1);
	const tool = given.uncertainty === undefined ? USUAL[reading] : toSI({ value: given.uncertainty, unit });
	const ofMean = toSI({ value: Math.sqrt(spread / count), unit });
	return { reading, value: toSI({ value: mean, unit }), sigma: Math.hypot(tool, ofMean) };
}
