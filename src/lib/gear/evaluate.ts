/**
 * The question and its answer: `evaluate` of the calculation contract. Pure: the same input gives the same outcome
 * on the tablet, on the server and from a shell. It never throws for an input that the schema lets through.
 */
import { compareWithOriginal } from './comparison';
import type { EvaluateInput, Outcome } from './contract';
import { figuresOf, type Figures } from './figures';
import { remediesFor } from './remedies';
import { OUT_OF_RANGE } from './refusals';
import { tipWearReviews } from './tip-wear';
import { verdictOf } from './verdict';
import { CORE_VERSION } from './version';
import { Working } from './working';

/** Figures in mm, N, MPa, W, N·m and m/s; what could not be worked out is null and has its reason. */
export function evaluate(input: EvaluateInput): Outcome {
	const working = new Working();
	const answer = figuresOf(input, working);
	const { figures, overflowed } = finiteOnly(answer.figures);
	const { original, reasons: compared } = compareWithOriginal(input, answer, working);
	const judged = verdictOf({
		permitted: input.gear.material.permitted,
		materialName: input.gear.material.name,
		limits: figures.limits,
		refusals: overflowed ? [...answer.refusals, OUT_OF_RANGE] : answer.refusals,
		reviews: [...answer.reviews, ...tipWearReviews(input)],
		warnings: [...compared, ...answer.warnings],
		scope: answer.scope
	});
	return {
		core: CORE_VERSION,
		...figures,
		original,
		...judged,
		remedies: remediesFor(input, answer, judged.verdict),
		working: working.lines
	};
}

/** Figures that left the range of numbers become null, a group of them as a whole. */
function finiteOnly(figures: Figures): { figures: Figures; overflowed: boolean } {
	if (isFiniteThroughout(figures)) return { figures, overflowed: false };
	const kept = Object.entries(figures).map(([name, value]: [string, unknown]) => [
		name,
		isFiniteThroughout(value) ? value : null
	]);
	const finite = { ...(Object.fromEntries(kept) as Figures), limits: [], limitedBy: null };
	return { figures: finite, overflowed: true };
}

function isFiniteThroughout(value: unknown): boolean {
	if (typeof value === 'number') return Number.isFinite(value);
	if (typeof value !== 'object' || value === null) return true;
	for (const name in value) {
		if (!isFiniteThroughout(value[name as keyof typeof value])) return false;
	}
	return true;
}
