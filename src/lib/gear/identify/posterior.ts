/**
 * The probability of each hypothesis: every gear of the set, the tooth count as counted and one off, and both kinds of
 * dedendum. A first look in wide steps leaves those that could matter; they are worked out exactly.
 */
import { kindsFor, type Kind } from './candidates';
import type { IdentifyInput } from './contract';
import { evidenceOf, type Evidence } from './evidence';
import { NONE_FITS_PRIOR, noneFitsEvidence, sizeOf } from './none-fits';
import { nuisancesOf, whole, type Nuisances } from './nuisances';
import type { Observation } from './observations';
import { predict, type Hypothesis, type Prediction } from './prediction';

export interface Weighed {
	hypothesis: Hypothesis;
	evidence: Evidence;
	/** Log of prior times evidence. */
	log: number;
	probability: number;
}

export interface Posterior {
	/** Likeliest first. */
	weighed: Weighed[];
	noneFits: number;
}

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

/** Beyond this, in natural logarithms, a hypothesis cannot come back; the looks themselves are rougher than that. */
const FAR_AT_A_GLANCE = 22;
const FAR_AT_A_LOOK = 11;

export function posteriorOf(input: IdentifyInput, observations: readonly Observation[]): Posterior {
	const mateTeeth = input.mateTeeth ?? null;
	const possible = hypothesesOf(input, observations).map(({ hypothesis, logPrior }) => {
		const predictions = observations.map((one) => predict(one, hypothesis));
		return { hypothesis, logPrior, predictions, look: logPrior + glance(observations, predictions) };
	});
	const nuisances = new Map<number, { full: Nuisances; rough: Nuisances }>();
	const nuisancesAt = (teeth: number) => {
		const known = nuisances.get(teeth);
		if (known) return known;
		const full = nuisancesOf(input, teeth);
		const made = { full, rough: { ...full, tip: [whole(full.tip)], thickness: [whole(full.thickness)] } };
		nuisances.set(teeth, made);
		return made;
	};
	const glanced = nearest(possible, FAR_AT_A_GLANCE);
	for (const one of glanced) {
		const { rough } = nuisancesAt(one.hypothesis.teeth);
		one.look = one.logPrior + evidenceOf(observations, one.predictions, rough).log;
	}
	const weighed = nearest(glanced, FAR_AT_A_LOOK).map(({ hypothesis, logPrior, predictions }) => {
		const evidence = evidenceOf(observations, predictions, nuisancesAt(hypothesis.teeth).full);
		return { hypothesis, evidence, log: logPrior + evidence.log, probability: 0 };
	});
	const none = Math.log(NONE_FITS_PRIOR) + noneFitsEvidence(observations, input.teeth, mateTeeth);
	const highest = Math.max(none, ...weighed.map(({ log }) => log));
	const all = Math.exp(none - highest) + weighed.reduce((sum, { log }) => sum + Math.exp(log - highest), 0);
	for (const one of weighed) one.probability = Math.exp(one.log - highest) / all;
	weighed.sort((a, b) => b.probability - a.probability);
	return { weighed, noneFits: Math.exp(none - highest) / all };
}

function nearest<T extends { look: number }>(of: readonly T[], far: number): T[] {
	const best = of.reduce((most, { look }) => Math.max(most, look), -Infinity);
	return of.filter(({ look }) => look > best - far);
}

function hypothesesOf(
	input: IdentifyInput,
	observations: readonly Observation[]
): { hypothesis: Hypothesis; logPrior: number }[] {
	const helixAngle = helixOf(input);
	const counts = input.teethCertain === false ? COUNTS.doubted : COUNTS.certain;
	const takings = takingsOf(input);
	const given = Math.log(1 - NONE_FITS_PRIOR);
	const depthIsSeen =
		takings.length > 1 ||
		observations.some(({ reading }) => reading === 'rootDiameter' || reading === 'wholeDepth');
	return plausible(kindsFor(input.prior ?? 'either'), input, observations).flatMap((kind) =>
		counts.flatMap(([off, share]) =>
			(depthIsSeen ? dedenda(kind) : dedenda(kind).slice(-1).map(sure)).flatMap(([dedendum, often]) =>
				takings.map(([taken, way]) => ({
					hypothesis: {
						kind,
						teeth: input.teeth + off,
						helixAngle,
						mateTeeth: input.mateTeeth ?? null,
						dedendum,
						taken
					},
					logPrior: given + kind.logPrior + Math.log(share * often * way)
				}))
			)
		)
	);
}

/** Beyond this factor to either side no reading of a gear is of another module's size, were it shifted, worn or stub. */
const SAME_SIZE = Math.log(1.8);

/** Kinds whose size fits the readings, all but one of them: that one may be grossly wrong. */
function plausible(
	kinds: readonly Kind[],
	{ teeth, mateTeeth }: IdentifyInput,
	observations: readonly Observation[]
): readonly Kind[] {
	const sizes = observations.map((one) =>
		Math.log(Math.abs(one.value) / sizeOf(one, teeth, mateTeeth ?? null))
	);
	const needed = Math.max(Math.min(1, sizes.length), sizes.length - 1);
	return kinds.filter(({ module }) => {
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

/** A helix is there when its reading says so by more than its doubt. */
function helixOf({ helixAngle }: IdentifyInput): number {
	if (!helixAngle || Math.abs(helixAngle.value) <= 2 * (helixAngle.uncertainty ?? 1)) return 0;
	return (Math.abs(helixAngle.value) * Math.PI) / 180;
}

/** Widths of all that is unseen, in modules, for a glance: nearly every gear is within three of them. */
const WIDE = { shift: 0.2, tip: 0.1, thickness: 0.08 };

/** Each reading by itself, with all that is unseen as one wide doubt, and no worse than a gross error. */
function glance(observations: readonly Observation[], predictions: readonly Prediction[]): number {
	let log = 0;
	for (let i = 0; i < observations.length; i++) {
		const { value, sigma } = observations[i] as Observation;
		const of = predictions[i] as Prediction;
		const width2 =
			sigma * sigma +
			of.own * of.own +
			(of.shift * WIDE.shift) ** 2 +
			(of.tip * WIDE.tip) ** 2 +
			(of.thickness * WIDE.thickness) ** 2;
		const away = value - of.nominal;
		const fits = -(away * away) / (2 * width2) - Math.log(width2) / 2;
		log += Math.max(fits, Math.log(0.01 / Math.abs(value)));
	}
	return log;
}
