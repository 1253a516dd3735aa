/**
 * Every gear that could have made the readings: the kinds of the set whose size fits them, the tooth count as counted
 * and one off, both kinds of dedendum and both ways of reading tip to gap. A kind at a time: there are a thousand and
 * more, and hardly any is kept.
 */
import { kindsFor, type Kind } from './candidates';
import type { IdentifyInput } from './contract';
import { helixOf } from './helix';
import { NONE_FITS_PRIOR, sizeOf } from './none-fits';
import type { Observation } from './observations';
import type { Hypothesis } from './hypothesis';
import { predict } from './prediction';

/** A count is one off now and then, even where it was counted twice; in doubt far more often. From memory. */
const COUNTS = {
	certain: [
		[0, 0.994],
		[-1, 0.003],
		[1, 0.003]
	],
	doubted: [
		[0, 0.8],
		[-1, 0.1],
		[1, 0.1]
	]
} as const;

/** Full depth is met with both; the older inch teeth with the shallower one. */
function dedenda({ form, system, pressureAngle }: Kind): [dedendum: number, share: number][] {
	if (form === 'stub') return [[1, 1]];
	const older = pressureAngle < 19 ? 0.95 : system === 'module' ? 0.04 : 0.5;
	return [
		[1 + Math.PI / 20, older],
		[1.25, 1 - older]
	];
}

export interface Hypothesised {
	hypothesis: Hypothesis;
	/** Natural logarithm of the prior probability. */
	logPrior: number;
}

/** What the readings leave open, whatever the kind. */
export interface Open {
	helixAngle: number;
	mateTeeth: number | null;
	counts: readonly (readonly [teeth: number, share: number])[];
	takings: readonly (readonly [taken: Hypothesis['taken'], share: number])[];
	/** Whether a reading sees how deep the teeth are. */
	depthIsSeen: boolean;
	/** The outside diameter, where it helps to tell whether a span lies on the flanks. */
	tips: Observation | null;
}

export function openIn(input: IdentifyInput, observations: readonly Observation[]): Open {
	const takings = takingsOf(input);
	const seen = new Set(observations.map(({ reading }) => reading));
	const counts = input.teethCertain === false ? COUNTS.doubted : COUNTS.certain;
	return {
		helixAngle: helixOf(input).angle,
		mateTeeth: input.mateTeeth ?? null,
		counts: counts.map(([off, share]) => [input.teeth + off, share] as const),
		takings,
		tips: (seen.has('spans') && observations.find(({ reading }) => reading === 'outsideDiameter')) || null,
		depthIsSeen: takings.length > 1 || seen.has('rootDiameter') || seen.has('wholeDepth')
	};
}

/** The gears of one kind. */
export function hypothesesOf(kind: Kind, open: Open): Hypothesised[] {
	const { helixAngle, mateTeeth, counts, takings, depthIsSeen, tips } = open;
	const depths = depthIsSeen ? dedenda(kind) : dedenda(kind).slice(-1).map(sure);
	const all: Hypothesised[] = [];
	for (const [teeth, share] of counts) {
		for (const [dedendum, often] of depths) {
			for (const [taken, way] of takings) {
				const hypothesis = { kind, teeth, helixAngle, mateTeeth, dedendum, taken, rise: 0 };
				if (tips) hypothesis.rise = riseOf(tips, hypothesis);
				all.push({
					hypothesis,
					logPrior: GIVEN + kind.logPrior + Math.log(share * often * way)
				});
			}
		}
	}
	return all;
}

/** Tips stand no further in or out than this, in modules, were they worn off or the teeth shifted: else it was misread. */
const MOST_RISE = 0.7;

function riseOf(tips: Observation, hypothesis: Hypothesis): number {
	const { nominal, shift } = predict(tips, hypothesis);
	const rise = (tips.value - nominal) / shift;
	return Math.abs(rise) <= MOST_RISE ? rise : 0;
}

const GIVEN = Math.log(1 - NONE_FITS_PRIOR);

/** Beyond this factor to either side no reading of a gear is of another module's size, were it shifted, worn or stub. */
const SAME_SIZE = Math.log(1.8);

/** Kinds whose size fits the readings, all but one of them: that one may be grossly wrong. */
export function plausibleKinds(
	{ teeth, mateTeeth, prior }: IdentifyInput,
	observations: readonly Observation[]
): readonly Kind[] {
	const sizes = observations.map((one) =>
		Math.log(Math.abs(one.value) / sizeOf(one, teeth, mateTeeth ?? null))
	);
	const needed = Math.max(Math.min(1, sizes.length), sizes.length - 1);
	return kindsFor(prior ?? 'either').filter(({ module }) => {
		const size = Math.log(module);
		return sizes.filter((one) => Math.abs(one - size) < SAME_SIZE).length >= needed;
	});
}

/** Where no reading sees the root, one dedendum stands for both. */
function sure([dedendum]: [number, number]): [number, number] {
	return [dedendum, 1];
}

/** "Tip to gap" is taken with a flat jaw over two tips, or with its point at the bottom: the readings tell which. */
function takingsOf({ outsideDiameter }: IdentifyInput): [Hypothesis['taken'], number][] {
	const taken = outsideDiameter?.taken ?? 'over-tips';
	if (taken !== 'tip-to-gap') return [[taken, 1]];
	return [
		['tip-to-gap', 0.5],
		['tip-to-bottom', 0.5]
	];
}
