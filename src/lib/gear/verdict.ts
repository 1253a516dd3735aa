/**
 * From figures to a verdict with its reasons. Material not permitted comes first, then what cannot be said, then
 * the margin; a verdict is never better than what was worked out supports.
 */
import type { Outcome, Reason, Verdict } from './contract';
import { NO_FIGURES } from './figures';
import { CORE_VERSION } from './version';

export interface VerdictAnswer {
	verdict: Verdict;
	reasons: Reason[];
}

export interface VerdictQuestion {
	permitted: boolean;
	materialName: string;
	refusals: Reason[];
	margin: number | null;
	low: number | null;
	needed: number;
}

/** A margin set to the needed one by arithmetic (a permitted power, a remedy) meets it. */
const ROUNDING = 1e-9;

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

function judge({ refusals, margin, low, needed }: VerdictQuestion): VerdictAnswer {
	if (refusals.length > 0) return { verdict: 'cannot-say', reasons: refusals };
	if (margin === null || low === null) return { verdict: 'cannot-say', reasons: [OUT_OF_RANGE] };

	const values = { margin, low, needed };
	if (!meets(margin, needed)) {
		const text = `The margin in bending is ${shown(margin)}, the plant needs ${needed}: this gear falls short.`;
		return { verdict: 'will-not-carry', reasons: [{ code: 'bending-margin-short', text, values }] };
	}
	if (!meets(low, needed)) {
		const text = `The margin in bending is ${shown(margin)} and meets the needed ${needed}, but at the bad end of the uncertainty it is ${shown(low)}.`;
		return { verdict: 'close', reasons: [{ code: 'bending-margin-low', text, values }, BENDING_ONLY] };
	}
	const text = `The margin in bending is ${shown(margin)}, and ${shown(low)} at the bad end of the uncertainty; the plant needs ${needed}.`;
	return { verdict: 'carries', reasons: [{ code: 'bending-margin', text, values }, BENDING_ONLY] };
}

export const OUT_OF_RANGE: Reason = {
	code: 'out-of-range',
	text: 'These values lead to a figure too large or too small to compute with. Check the readings and their units.'
};

const BENDING_ONLY: Reason = {
	code: 'bending-only',
	text: "This version works out bending of this gear's teeth. Wear, and the mate's teeth, are not in it."
};

/** The outcome of a check that gives no figures: every field empty, the reasons say why. */
export function cannotSay(reasons: Reason[]): Outcome {
	return {
		core: CORE_VERSION,
		...NO_FIGURES,
		formFactorSource: null,
		formFactorGeometry: null,
		wear: null,
		mateBending: null,
		mesh: null,
		original: null,
		verdict: 'cannot-say',
		reasons,
		remedies: [],
		working: []
	};
}

function meets(margin: number, needed: number): boolean {
	return margin >= needed * (1 - ROUNDING);
}

/** Two decimals, rounded down: a margin that falls short never reads as if it did not. */
function shown(margin: number): string {
	return (Math.floor(margin * (1 + ROUNDING) * 100) / 100).toFixed(2);
}
