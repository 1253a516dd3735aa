/**
 * One outcome for a check that several gears still fit: the weakest of them decides, and a doubt of the readings
 * themselves sends an answer to review. Promises that no doubt ever makes a verdict better.
 */
import type { Outcome, Pitch, Reason, TriedGear, Verdict } from './contract';
import { decidingOf } from './figures';

/** A gear that survived the readings, with what the core says of it. */
export interface Tried {
	gear: {
		teeth: number;
		pitch: Pitch;
		pressureAngle: number;
		form: 'full-depth' | 'stub';
		profileShift: number;
	};
	probability: number;
	outcome: Outcome;
}

/** Weakest first. A gear that falls short says more than one of which nothing can be said. */
const WEAKEST_FIRST: readonly Verdict[] = [
	'not-permitted',
	'will-not-carry',
	'cannot-say',
	'close',
	'carries'
];

/**
 * The outcome of the weakest gear, with all that were tried beside it, likeliest first. Of one gear it is that gear's
 * own. Throws a RangeError without any gear.
 */
export function outcomeOfSeveral(tried: readonly Tried[]): Outcome {
	const weakest = tried.reduce<Tried | null>(
		(worst, one) => (worst === null || isWeaker(one.outcome, worst.outcome) ? one : worst),
		null
	);
	if (!weakest) throw new RangeError('No gear was tried.');
	const gears = tried.map(({ gear, probability, outcome }): TriedGear => ({
		...gear,
		probability,
		verdict: outcome.verdict,
		limitedBy: outcome.limitedBy,
		margin: decidingOf(outcome.limits)?.margin ?? null,
		marginLow: decidingOf(outcome.limits)?.marginLow ?? null,
		decides: outcome === weakest.outcome
	}));
	if (tried.length === 1) return { ...weakest.outcome, gears };
	const { verdict, reasons } = weakest.outcome;
	const told: Reason = {
		code: 'weakest-of-several',
		text: `${tried.length} gears fit the readings; the weakest of them decides. One more reading may leave fewer.`,
		values: { gears: tried.length }
	};
	return { ...weakest.outcome, verdict, reasons: [...reasons.slice(0, 1), told, ...reasons.slice(1)], gears };
}

function isWeaker(one: Outcome, other: Outcome): boolean {
	const order = WEAKEST_FIRST.indexOf(one.verdict) - WEAKEST_FIRST.indexOf(other.verdict);
	return order !== 0 ? order < 0 : ofNeeded(one) < ofNeeded(other);
}

/** How much of what it needs the deciding answer has, at the bad end; without figures it is the weakest. */
function ofNeeded({ limits }: Outcome): number {
	const deciding = decidingOf(limits);
	return deciding ? deciding.marginLow / deciding.needed : -Infinity;
}

/** An outcome with a doubt that no figure of it holds: it carries at best after a review. */
export function reviewed(outcome: Outcome, doubt: Reason): Outcome {
	const { verdict, reasons } = outcome;
	return verdict === 'carries'
		? { ...outcome, verdict: 'close', reasons: [doubt, ...reasons] }
		: { ...outcome, reasons: [...reasons.slice(0, 1), doubt, ...reasons.slice(1)] };
}
