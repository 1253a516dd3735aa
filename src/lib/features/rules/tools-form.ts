/**
 * The form that states how far the plant trusts its tools: from what was typed to the rule, and back. People state what
 * nineteen in twenty readings keep to, twice the standard uncertainty; an empty field is what is usual.
 */
import {
	INSTRUMENTS,
	LEAST_UNCERTAINTY,
	MOST_UNCERTAINTY,
	USUAL_UNCERTAINTY,
	type Instrument,
	type InstrumentRules
} from '$lib/records/instruments';

export type TypedTools = Record<Instrument, string>;
export type ToolProblem = 'comma' | 'not-a-number' | 'out-of-range';
export type ToolProblems = Partial<Record<Instrument, ToolProblem>>;

export const COVERAGE = 2;
/** What can be typed, mm or degrees. */
export const LEAST_TYPED = LEAST_UNCERTAINTY * COVERAGE;
export const MOST_TYPED = MOST_UNCERTAINTY * COVERAGE;

export type ReadTools =
	| { ok: true; typed: TypedTools; instruments: InstrumentRules }
	| { ok: false; typed: TypedTools; problems: ToolProblems };

export function readToolsForm(form: FormData): ReadTools {
	const typed = Object.fromEntries(
		INSTRUMENTS.map((instrument) => [instrument, String(form.get(instrument) ?? '').trim()])
	) as TypedTools;
	const problems: ToolProblems = {};
	const instruments: InstrumentRules = {};
	for (const instrument of INSTRUMENTS) {
		const text = typed[instrument];
		if (text === '') continue;
		const problem = problemOf(text);
		if (problem) problems[instrument] = problem;
		else instruments[instrument] = Number(text) / COVERAGE;
	}
	return Object.keys(problems).length > 0 ? { ok: false, typed, problems } : { ok: true, typed, instruments };
}

export function typedFrom(rules: InstrumentRules | undefined): TypedTools {
	return Object.fromEntries(
		INSTRUMENTS.map((instrument) => {
			const stated = rules?.[instrument];
			return [instrument, stated === undefined ? '' : goodTo(stated)];
		})
	) as TypedTools;
}

/** What nineteen in twenty readings keep to, as a text that reads back to the same figure. */
export function goodTo(uncertainty: number): string {
	return String(Number((uncertainty * COVERAGE).toPrecision(12)));
}

export function usualGoodTo(instrument: Instrument): string {
	return goodTo(USUAL_UNCERTAINTY[instrument]);
}

function problemOf(text: string): ToolProblem | null {
	if (text.includes(',')) return 'comma';
	if (!/^(\d+\.?\d*|\.\d+)$/.test(text)) return 'not-a-number';
	const value = Number(text);
	return value >= LEAST_TYPED && value <= MOST_TYPED ? null : 'out-of-range';
}
