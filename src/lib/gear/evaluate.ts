/**
 * The question and its answer: `evaluate` of the calculation contract. Pure: the same input gives the same outcome
 * on the tablet, on the server and from a shell. It never throws for an input that the schema lets through.
 */
import type { EvaluateInput, Outcome } from './contract';
import { figuresOf, type Figures } from './figures';
import { rulesOf } from './rules';
import { cannotSay, OUT_OF_RANGE, verdictOf } from './verdict';
import { Working } from './working';

/** Figures in mm, N, MPa, W, N·m and m/s; what could not be worked out is null and has its reason. */
export function evaluate(input: EvaluateInput): Outcome {
	const working = new Working();
	const { figures: computed, refusals } = figuresOf(input, working);
	const figures = finiteOnly(computed);
	const overflowed = Object.values(computed).some(
		(value) => typeof value === 'number' && !Number.isFinite(value)
	);
	const { name, permitted } = input.gear.material;
	return {
		...cannotSay([]),
		...figures,
		formFactorSource: figures.formFactor === null ? null : 'handbook',
		...verdictOf({
			permitted,
			materialName: name,
			refusals: overflowed ? [...refusals, OUT_OF_RANGE] : refusals,
			margin: figures.bendingMargin,
			low: figures.bendingMarginLow,
			needed: rulesOf(input.rules).bendingMargin
		}),
		working: working.lines
	};
}

function finiteOnly(figures: Figures): Figures {
	const checked = { ...figures };
	for (const name of Object.keys(checked) as (keyof Figures)[]) {
		if (name !== 'velocityLaw' && !Number.isFinite(checked[name])) checked[name] = null;
	}
	return checked;
}
