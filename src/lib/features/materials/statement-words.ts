/** A material's statement in words: its stress, its hardness, and the words for what a form field cannot use. */
import type { MessageKey } from '$lib/i18n/catalogue';
import type { Words } from '$lib/i18n/context.svelte';
import { figure } from '$lib/i18n/format';
import type { MaterialStatement } from '$lib/records/material';
import { LONGEST, type StatementField, type StatementProblem, type TypedStatement } from './statement-form';

export function stressWords(stress: { value: number; unit: string }, { language }: Words): string {
	return `${figure(stress.value, 6, language)} ${stress.unit}`;
}

/** "180 to 220" as a range, one figure where only one is stated, nothing where none is. */
export function hardnessWords({ brinellLow, brinellHigh }: MaterialStatement): string {
	if (brinellLow === null && brinellHigh === null) return '';
	if (brinellLow === brinellHigh || brinellHigh === null) return String(brinellLow);
	return brinellLow === null ? String(brinellHigh) : `${brinellLow}–${brinellHigh}`;
}

export function problemWords(field: StatementField, problem: StatementProblem, { t }: Words): string {
	const most = field in LONGEST ? LONGEST[field as keyof typeof LONGEST] : 0;
	return t(`material.problem.${problem}`, { field: t(`material.field.${field}`), most });
}

/** What a field of another revision says, as the form would show it. */
export function typedWords(typed: TypedStatement, field: StatementField, { t }: Words): string {
	const text = typed[field].trim();
	if (field === 'metallic' || field === 'permitted')
		return t(text === 'yes' ? 'material.yes' : 'material.no');
	return text || t('material.says-nothing');
}

export interface StatementFact {
	name: MessageKey;
	text: string;
}

/** Every fact of a statement, for people who read it; what is not stated is left out. */
export function statementFacts(
	statement: MaterialStatement,
	words: Words,
	day: (date: string) => string
): StatementFact[] {
	const { t } = words;
	const facts: StatementFact[] = [
		{ name: 'material.field.condition', text: statement.condition },
		{ name: 'material.field.metallic', text: t(statement.metallic ? 'material.yes' : 'material.no') },
		{
			name: 'material.field.allowableBending',
			text: `${stressWords(statement.allowableBending, words)}, ${statement.basis}`
		},
		{ name: 'materials.column.hardness', text: hardnessWords(statement) },
		{
			name: 'material.field.modulus',
			text: statement.modulus ? stressWords(statement.modulus, words) : ''
		},
		{
			name: 'material.field.poisson',
			text: statement.poisson === null ? '' : figure(statement.poisson, 3, words.language)
		},
		{ name: 'material.field.source', text: `${statement.source}, ${statement.edition}` },
		{ name: 'material.field.validFrom', text: day(statement.validFrom) }
	];
	return facts.filter(({ text }) => text !== '');
}
