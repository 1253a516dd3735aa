/**
 * The probability of each hypothesis: every gear of the set, the tooth count as counted and one off, and both kinds of
 * dedendum. A first look in wide steps leaves those that could matter; they are worked out exactly.
 */
import type { IdentifyInput } from './contract';
import { evidenceOf, type Evidence } from './evidence';
import { helixOf } from './helix';
import { hypothesesOf, openIn, plausibleKinds, type Hypothesised } from './hypotheses';
import { NONE_FITS_PRIOR, noneFitsEvidence } from './none-fits';
import { nuisancesOf, whole, type Nuisances } from './nuisances';
import type { Observation } from './observations';
import type { Hypothesis, Prediction } from './hypothesis';
import { predict } from './prediction';

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

/** Beyond this, in natural logarithms, a hypothesis cannot come back; the looks themselves are rougher than that. */
const FAR_AT_A_GLANCE = 22;
const FAR_AT_A_LOOK = 11;

export function posteriorOf(input: IdentifyInput, observations: readonly Observation[]): Posterior {
	const mateTeeth = input.mateTeeth ?? null;
	const nuisances = new Map<number, { full: Nuisances; rough: Nuisances }>();
	const nuisancesAt = (teeth: number) => {
		const known = nuisances.get(teeth);
		if (known) return known;
		const full = nuisancesOf(input, teeth);
		const made = { full, rough: { ...full, tip: [whole(full.tip)], thickness: [whole(full.thickness)] } };
		nuisances.set(teeth, made);
		return made;
	};
	const weighed = likely(input, observations, (teeth) => nuisancesAt(teeth).rough).map(
		({ hypothesis, logPrior }): Weighed => {
			const { full } = nuisancesAt(hypothesis.teeth);
			const evidence = evidenceOf(observations, predictionsOf(observations, hypothesis), full);
			return { hypothesis, evidence, log: logPrior + evidence.log, probability: 0 };
		}
	);
	const none = Math.log(NONE_FITS_PRIOR) + noneFitsEvidence(observations, input.teeth, mateTeeth);
	const most = highest([none, ...weighed.map(({ log }) => log)]);
	const all = Math.exp(none - most) + weighed.reduce((sum, { log }) => sum + Math.exp(log - most), 0);
	for (const one of weighed) one.probability = Math.exp(one.log - most) / all;
	weighed.sort((a, b) => b.probability - a.probability);
	return { weighed, noneFits: Math.exp(none - most) / all };
}

/**
 * Those that two looks leave. Between the looks only kinds are kept, which are there anyway: a thousand hypotheses and
 * predictions alive at once outlive the engine's young generation, and an engine that has learned this puts all later
 * ones among the old, where collecting them makes an answer three times as slow.
 */
function likely(
	input: IdentifyInput,
	observations: readonly Observation[],
	roughAt: (teeth: number) => Nuisances
): Hypothesised[] {
	const open = openIn(input, observations);
	const kinds = plausibleKinds(input, observations);
	const helixSpread = helixOf(input).spread;
	const glances = kinds.map((kind) =>
		hypothesesOf(kind, open).reduce(
			(most, one) => Math.max(most, glance(observations, one, helixSpread)),
			-Infinity
		)
	);
	const least = highest(glances) - FAR_AT_A_GLANCE;
	const looked: { one: Hypothesised; look: number }[] = [];
	let best = -Infinity;
	kinds.forEach((kind, place) => {
		if ((glances[place] as number) <= least) return;
		for (const one of hypothesesOf(kind, open)) {
			if (glance(observations, one, helixSpread) <= least) continue;
			const { hypothesis, logPrior } = one;
			const predictions = predictionsOf(observations, hypothesis);
			const look = logPrior + evidenceOf(observations, predictions, roughAt(hypothesis.teeth)).log;
			if (look <= best - FAR_AT_A_LOOK) continue;
			best = Math.max(best, look);
			looked.push({ one, look });
		}
	});
	return looked.filter(({ look }) => look > best - FAR_AT_A_LOOK).map(({ one }) => one);
}

function highest(of: readonly number[]): number {
	return of.reduce((most, one) => Math.max(most, one), -Infinity);
}

function predictionsOf(observations: readonly Observation[], hypothesis: Hypothesis): Prediction[] {
	return observations.map((one) => predict(one, hypothesis));
}

/** Widths of all that is unseen, in modules, for a glance: nearly every gear is within three of them. */
const WIDE = { shift: 0.2, tip: 0.1, thickness: 0.08 };

/** Each reading by itself, with all that is unseen as one wide doubt, and no worse than a gross error. */
function glance(
	observations: readonly Observation[],
	{ hypothesis, logPrior }: Hypothesised,
	helixSpread: number
): number {
	let log = logPrior;
	for (const observation of observations) {
		const { value, sigma } = observation;
		const of = predict(observation, hypothesis);
		const width2 =
			sigma * sigma +
			of.own * of.own +
			(of.shift * WIDE.shift) ** 2 +
			(of.tip * WIDE.tip) ** 2 +
			(of.thickness * WIDE.thickness) ** 2 +
			(of.helix * helixSpread) ** 2;
		const away = value - of.nominal;
		const fits = -(away * away) / (2 * width2) - Math.log(width2) / 2 + of.logChance;
		log += Math.max(fits, Math.log(0.01 / Math.abs(value)));
	}
	return log;
}
