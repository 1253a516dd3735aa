/**
 * From figures to a verdict with its reasons. Material not permitted comes first, then what cannot be said, then
 * the answer that decides; a verdict is never better than what was worked out supports.
 */
import type { Limit, LimitName, Outcome, Reason, Verdict } from './contract';
import { decidingOf, NO_FIGURES } from './figures';
import { OUT_OF_RANGE } from './refusals';
import { CORE_VERSION } from './version';

export interface VerdictAnswer {
	verdict: Verdict;
	reasons: Reason[];
}

export interface VerdictQuestion {
	permitted: boolean;
	materialName: string;
	limits: Limit[];
	/** Make it `cannot-say`. */
	refusals: Reason[];
	/** Send it to review at best. */
	reviews: Reason[];
	/** Are told beside every verdict that has figures. */
	warnings: Reason[];
	/** What a verdict that carries, now or after a review, does not cover. */
	scope: Reason[];
}

/** A margin set to the needed one by arithmetic (a permitted power, a remedy) meets it. */
const ROUNDING = 1e-9;

export function meets(margin: number, needed: number): boolean {
	return margin >= needed * (1 - ROUNDING);
}

/** Verdict and reasons; the first reason is the one that decided. */
export function verdictOf(question: VerdictQuestion): VerdictAnswer {
	const { permitted, materialName, refusals } = question;
	const judged = judge(question);
	if (permitted) return judged;
	const notPermitted: Reason = {
		code: 'material-not-permitted',
		text: `${materialName} is not on the plant's list of permitted materials. Choose a permitted one, or ask the supervisor.`,
		values: { material: materialName }
	};
	const others = refusals.length > 0 ? refusals : judged.reasons;
	return { verdict: 'not-permitted', reasons: [notPermitted, ...others] };
}

function judge({ limits, refusals, reviews, warnings, scope }: VerdictQuestion): VerdictAnswer {
	if (refusals.length > 0) return { verdict: 'cannot-say', reasons: [...refusals, ...warnings] };
	const deciding = decidingOf(limits);
	if (!deciding) return { verdict: 'cannot-say', reasons: [OUT_OF_RANGE, ...warnings] };

	const { margin, marginLow: low, needed } = deciding;
	const say = SENTENCES[deciding.answer];
	const values = { margin, low, needed };
	if (!meets(margin, needed)) {
		const text = `The margin in ${say.of} is ${shown(margin)}, the plant needs ${needed}: ${say.short}.`;
		const short = { code: say.codes.short, text, values };
		return { verdict: 'will-not-carry', reasons: [short, ...reviews, ...warnings] };
	}
	if (!meets(low, needed)) {
		const text = `The margin in ${say.of} is ${shown(margin)} and meets the needed ${needed}, but at the bad end of the uncertainty it is ${shown(low)}.`;
		const close = { code: say.codes.low, text, values };
		return { verdict: 'close', reasons: [close, ...reviews, ...scope, ...warnings] };
	}
	const text = `The margin in ${say.of} is ${shown(margin)}, and ${shown(low)} at the bad end of the uncertainty; the plant needs ${needed}.`;
	const enough = { code: say.codes.enough, text, values };
	return reviews.length > 0
		? { verdict: 'close', reasons: [...reviews, enough, ...scope, ...warnings] }
		: { verdict: 'carries', reasons: [enough, ...scope, ...warnings] };
}

interface Sentence {
	of: string;
	short: string;
	codes: { short: string; low: string; enough: string };
}

const SENTENCES: Record<LimitName, Sentence> = {
	'gear-bending': {
		of: 'bending',
		short: 'this gear falls short',
		codes: { short: 'bending-margin-short', low: 'bending-margin-low', enough: 'bending-margin' }
	},
	wear: {
		of: 'wear',
		short: 'the flanks of the pair fall short',
		codes: { short: 'wear-margin-short', low: 'wear-margin-low', enough: 'wear-margin' }
	},
	'mate-bending': {
		of: "bending of the mate's teeth",
		short: 'the mate falls short',
		codes: {
			short: 'mate-bending-margin-short',
			low: 'mate-bending-margin-low',
			enough: 'mate-bending-margin'
		}
	}
};

/** The outcome of a check that gives no figures: every field empty, the reasons say why. */
export function cannotSay(reasons: Reason[]): Outcome {
	return {
		core: CORE_VERSION,
		...NO_FIGURES,
		original: null,
		verdict: 'cannot-say',
		reasons,
		remedies: [],
		working: []
	};
}

/** Two decimals, rounded down: a margin that falls short never reads as if it did not. */
function shown(margin: number): string {
	return (Math.floor(margin * (1 + ROUNDING) * 100) / 100).toFixed(2);
}
