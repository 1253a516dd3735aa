/**
 * The form that states a material: from what was typed to a statement, and back. Promise: every text comes back as
 * it was typed, whatever is wrong with it, and each field that cannot be used is named with a code whose words say
 * what to do. The command checks the result again with the schema of records.
 */
import { STRESS_UNITS, toSI } from '$lib/gear/quantity';
import { MOST_STRESS_MPA, type MaterialStatement } from '$lib/records/material';

export const STATEMENT_FIELDS = [
	'name',
	'condition',
	'metallic',
	'permitted',
	'allowableBending',
	'allowableBendingUnit',
	'basis',
	'brinellLow',
	'brinellHigh',
	'modulus',
	'modulusUnit',
	'poisson',
	'source',
	'edition',
	'validFrom'
] as const;
export type StatementField = (typeof STATEMENT_FIELDS)[number];
export type TypedStatement = Record<StatementField, string>;

export type StatementProblem =
	| 'missing'
	| 'too-long'
	| 'choose'
	| 'comma'
	| 'not-a-number'
	| 'not-positive'
	| 'too-large'
	| 'not-whole'
	| 'brinell-range'
	| 'upper-below-lower'
	| 'poisson-range'
	| 'no-date';
export type StatementProblems = Partial<Record<StatementField, StatementProblem>>;

export type ReadStatement =
	| { ok: true; typed: TypedStatement; statement: MaterialStatement }
	| { ok: false; typed: TypedStatement; problems: StatementProblems };

/** Longest text of each prose field, as the schema has it. */
export const LONGEST = { name: 80, condition: 80, basis: 200, source: 200, edition: 80 } as const;
type Prose = keyof typeof LONGEST;

export function readStatementForm(form: FormData): ReadStatement {
	const typed = typedOf(form);
	const problems: StatementProblems = {};
	const refuse = (field: StatementField, problem: StatementProblem | null) => {
		if (problem) problems[field] ??= problem;
	};

	for (const field of Object.keys(LONGEST) as Prose[]) refuse(field, proseProblem(field, typed[field]));
	for (const field of ['metallic', 'permitted'] as const) {
		if (!['yes', 'no'].includes(typed[field])) refuse(field, 'choose');
	}

	const bending = numberOf(typed.allowableBending);
	refuse(
		'allowableBending',
		bending.problem ?? stressProblem(bending.value ?? 0, typed.allowableBendingUnit)
	);
	refuse('allowableBendingUnit', unitOf(typed.allowableBendingUnit) ? null : 'choose');

	const modulus = optional(typed.modulus);
	refuse(
		'modulus',
		modulus.problem ?? (modulus.value === null ? null : stressProblem(modulus.value, typed.modulusUnit))
	);
	if (modulus.value !== null) refuse('modulusUnit', unitOf(typed.modulusUnit) ? null : 'choose');

	const low = optional(typed.brinellLow);
	const high = optional(typed.brinellHigh);
	refuse('brinellLow', low.problem ?? brinellProblem(low.value));
	refuse('brinellHigh', high.problem ?? brinellProblem(high.value));
	if (low.value !== null && high.value !== null && low.value > high.value) {
		refuse('brinellHigh', 'upper-below-lower');
	}

	const poisson = optional(typed.poisson);
	const outside = poisson.value !== null && (poisson.value < 0 || poisson.value > 0.5);
	refuse('poisson', poisson.problem ?? (outside ? 'poisson-range' : null));
	refuse('validFrom', isDay(typed.validFrom) ? null : 'no-date');

	const bendingUnit = unitOf(typed.allowableBendingUnit);
	const modulusUnit = unitOf(typed.modulusUnit);
	if (Object.keys(problems).length > 0 || bending.value === null || !bendingUnit) {
		return { ok: false, typed, problems };
	}
	return {
		ok: true,
		typed,
		statement: {
			name: typed.name.trim(),
			condition: typed.condition.trim(),
			metallic: typed.metallic === 'yes',
			allowableBending: { value: bending.value, unit: bendingUnit },
			basis: typed.basis.trim(),
			brinellLow: low.value,
			brinellHigh: high.value,
			modulus: modulus.value !== null && modulusUnit ? { value: modulus.value, unit: modulusUnit } : null,
			poisson: poisson.value,
			source: typed.source.trim(),
			edition: typed.edition.trim(),
			validFrom: typed.validFrom,
			permitted: typed.permitted === 'yes'
		}
	};
}

/** A statement as the form shows it when it is opened. */
export function typedFrom(statement: MaterialStatement): TypedStatement {
	const text = (value: number | null | undefined) =>
		value === null || value === undefined ? '' : String(value);
	return {
		name: statement.name,
		condition: statement.condition,
		metallic: statement.metallic ? 'yes' : 'no',
		permitted: statement.permitted ? 'yes' : 'no',
		allowableBending: text(statement.allowableBending.value),
		allowableBendingUnit: statement.allowableBending.unit,
		basis: statement.basis,
		brinellLow: text(statement.brinellLow),
		brinellHigh: text(statement.brinellHigh),
		modulus: text(statement.modulus?.value),
		modulusUnit: statement.modulus?.unit ?? statement.allowableBending.unit,
		poisson: text(statement.poisson),
		source: statement.source,
		edition: statement.edition,
		validFrom: statement.validFrom
	};
}

/** An empty form; nothing is permitted until someone says so. */
export function emptyStatement(today: string): TypedStatement {
	const empty = Object.fromEntries(STATEMENT_FIELDS.map((field) => [field, ''])) as TypedStatement;
	return { ...empty, metallic: 'yes', permitted: 'no', validFrom: today };
}

/** The fields of the form in which two statements differ. */
export function differingFields(a: TypedStatement, b: TypedStatement): StatementField[] {
	return STATEMENT_FIELDS.filter((field) => a[field].trim() !== b[field].trim());
}

function typedOf(form: FormData): TypedStatement {
	return Object.fromEntries(
		STATEMENT_FIELDS.map((field) => {
			const value = form.get(field);
			return [field, typeof value === 'string' ? value : ''];
		})
	) as TypedStatement;
}

function proseProblem(field: Prose, text: string): StatementProblem | null {
	const length = text.trim().length;
	return length === 0 ? 'missing' : length > LONGEST[field] ? 'too-long' : null;
}

type ReadNumber = { value: number; problem?: undefined } | { value: null; problem: StatementProblem | null };

function numberOf(text: string): ReadNumber {
	const clean = text.trim();
	if (clean === '') return { value: null, problem: 'missing' };
	// "8,500" is eighty-five hundred here and eight and a half there: asked about, never guessed.
	if (clean.includes(',')) return { value: null, problem: 'comma' };
	if (!/^[+-]?(\d+\.?\d*|\.\d+)$/.test(clean)) return { value: null, problem: 'not-a-number' };
	return { value: Number(clean) };
}

function optional(text: string): ReadNumber {
	return text.trim() === '' ? { value: null, problem: null } : numberOf(text);
}

function stressProblem(value: number, unit: string): StatementProblem | null {
	if (value <= 0) return 'not-positive';
	const known = unitOf(unit);
	return known && toSI({ value, unit: known }) > MOST_STRESS_MPA ? 'too-large' : null;
}

function brinellProblem(value: number | null): StatementProblem | null {
	if (value === null) return null;
	if (!Number.isInteger(value)) return 'not-whole';
	return value < 20 || value > 750 ? 'brinell-range' : null;
}

function unitOf(text: string): (typeof STRESS_UNITS)[number] | null {
	return STRESS_UNITS.find((unit) => unit === text) ?? null;
}

/** A day of the calendar in ISO form: not the 31st of February. */
function isDay(text: string): boolean {
	if (!/^\d{4}-\d{2}-\d{2}$/.test(text)) return false;
	const day = new Date(`${text}T00:00:00Z`);
	return !Number.isNaN(day.getTime()) && day.toISOString().startsWith(text);
}
