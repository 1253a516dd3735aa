/**
 * Which gear made these readings: `identify` of the calculation contract. A Bayesian answer over the finite set of
 * gears that the trade made. Probabilities mean what they say: of gears that are told at 0.9, nine in ten are it.
 * Pure: the same readings give the same answer on the tablet, on the server and from a shell.
 */
import { CORE_VERSION } from '../version';
import type { Candidate, IdentifyAnswer, IdentifyInput, Misfit } from './contract';
import { nextReadingOf } from './next-reading';
import { observationsOf, type Observation } from './observations';
import { posteriorOf, type Weighed } from './posterior';
import { predict } from './prediction';

/** Told from here up; one in a thousand is still shown, less is noise. */
const LEAST_TOLD = 0.001;

/** Where no gear fits, the least bad ones tell which reading to look at again. */
const ALWAYS_TOLD = 3;

/** Where hardly anything was measured, hundreds are possible. */
const MOST_TOLD = 40;

/** One answer stands where it is this likely. */
const CLEAR = 0.95;
const NONE = 0.5;

/** A reading this many widths away is flagged even where it was not taken as a gross error. */
const FAR = 4;

export function identify(input: IdentifyInput): IdentifyAnswer {
	const observations = observationsOf(input);
	const { weighed, noneFits } = posteriorOf(input, observations);
	const groups = grouped(weighed);
	const candidates = groups.map(({ best, probability }) => candidateOf(best, probability, observations));
	const told = candidates
		.filter(({ probability }, i) => probability >= LEAST_TOLD || i < ALWAYS_TOLD)
		.slice(0, MOST_TOLD);
	const places = new Map(groups.map(({ key }, place) => [key, place]));
	const place = (one: Weighed) => {
		const found = places.get(keyOf(one));
		return found !== undefined && found < told.length ? found : null;
	};
	const top = told[0]?.probability ?? 0;
	const state = noneFits > NONE ? 'none-fits' : top >= CLEAR ? 'clear' : 'several';
	return {
		core: CORE_VERSION,
		candidates: told,
		noneFits,
		state,
		nextReading: state === 'clear' ? null : nextReadingOf(input, weighed, place)
	};
}

/** One gear is one candidate, whatever its count, dedendum or way of taking a reading turned out to be. */
function grouped(weighed: readonly Weighed[]): { key: string; best: Weighed; probability: number }[] {
	const groups = new Map<string, { key: string; best: Weighed; probability: number }>();
	for (const one of weighed) {
		const key = keyOf(one);
		const group = groups.get(key);
		if (group) group.probability += one.probability;
		else groups.set(key, { key, best: one, probability: one.probability });
	}
	return [...groups.values()].sort((a, b) => b.probability - a.probability);
}

/** Pitches that are the same to one part in ten thousand are one gear by two names. */
function keyOf({ hypothesis: { kind } }: Weighed): string {
	return `${Math.round(Math.log(kind.module) * 5000)} ${kind.pressureAngle} ${kind.form}`;
}

function candidateOf(
	{ hypothesis, evidence }: Weighed,
	probability: number,
	observations: readonly Observation[]
): Candidate {
	const { kind, teeth } = hypothesis;
	return {
		system: kind.system,
		value: kind.value,
		module: kind.module,
		diametralPitch: 25.4 / kind.module,
		pressureAngle: kind.pressureAngle,
		form: kind.form,
		profileShift: Math.abs(evidence.shift) < 0.01 ? 0 : evidence.shift,
		tipLoss: evidence.tip * kind.module,
		thicknessLoss: evidence.thickness * kind.module,
		teeth,
		probability,
		misfits: observations.map((observation, i): Misfit => {
			const of = predict(observation, hypothesis);
			const expected =
				of.nominal +
				of.shift * evidence.shift +
				of.tip * evidence.tip +
				of.thickness * evidence.thickness +
				of.helix * evidence.helix;
			const residual = observation.value - expected;
			const sigmas = residual / Math.hypot(observation.sigma, of.own);
			return {
				reading: observation.reading,
				...(observation.spanTeeth === undefined ? {} : { teeth: observation.spanTeeth }),
				residual,
				offNominal: observation.value - of.nominal,
				unit: 'mm',
				sigmas,
				flagged: evidence.gross === i || Math.abs(sigmas) > FAR
			};
		})
	};
}
