import { describe, expect, it } from 'vitest';
import {
	differingFields,
	emptyStatement,
	readStatementForm,
	STATEMENT_FIELDS,
	typedFrom,
	type StatementField,
	type TypedStatement
} from '$lib/features/materials/statement-form';
import { materialStatement, type MaterialStatement } from '$lib/records/material';

const iron: MaterialStatement = {
	name: 'Iron, class 30',
	condition: 'as cast',
	metallic: true,
	allowableBending: { value: 8500, unit: 'psi' },
	basis: 'a third of the tensile strength',
	brinellLow: 180,
	brinellHigh: 220,
	modulus: { value: 14500, unit: 'ksi' },
	poisson: 0.21,
	source: 'Invented list of the plant',
	edition: '2nd',
	validFrom: '2026-01-15',
	permitted: true
};

function form(change: Partial<Record<StatementField, string>> = {}): FormData {
	const data = new FormData();
	for (const [field, text] of Object.entries({ ...typedFrom(iron), ...change })) data.set(field, text);
	return data;
}

function problemsOf(change: Partial<Record<StatementField, string>>) {
	const read = readStatementForm(form(change));
	return read.ok ? {} : read.problems;
}

describe('a form that is in order', () => {
	it('comes back as the statement it was filled from, and the schema takes it', () => {
		const read = readStatementForm(form());
		expect(read).toMatchObject({ ok: true, statement: iron });
		expect(materialStatement.safeParse(read.ok && read.statement).success).toBe(true);
	});

	it('may leave hardness, modulus and ratio empty', () => {
		const read = readStatementForm(
			form({ brinellLow: '', brinellHigh: ' ', modulus: '', modulusUnit: '', poisson: '' })
		);
		expect(read).toMatchObject({
			ok: true,
			statement: { brinellLow: null, brinellHigh: null, modulus: null, poisson: null }
		});
		expect(materialStatement.safeParse(read.ok && read.statement).success).toBe(true);
	});

	it('takes spaces around a number and a point without a leading nought', () => {
		expect(readStatementForm(form({ allowableBending: ' 8500 ', poisson: '.3' }))).toMatchObject({
			ok: true,
			statement: { allowableBending: { value: 8500, unit: 'psi' }, poisson: 0.3 }
		});
	});

	it('permits nothing unless it was said', () => {
		expect(emptyStatement('2026-03-01')).toMatchObject({ permitted: 'no', validFrom: '2026-03-01' });
		expect(readStatementForm(form({ permitted: 'no' }))).toMatchObject({
			ok: true,
			statement: { permitted: false }
		});
	});
});

describe('what cannot be used is named', () => {
	it.each([
		['source', '', 'missing'],
		['source', '   ', 'missing'],
		['edition', '', 'missing'],
		['name', '', 'missing'],
		['name', 'x'.repeat(81), 'too-long'],
		['basis', '', 'missing'],
		['basis', 'x'.repeat(201), 'too-long'],
		['condition', '', 'missing'],
		['metallic', 'perhaps', 'choose'],
		['permitted', '', 'choose'],
		['allowableBending', '', 'missing'],
		['allowableBending', '8,500', 'comma'],
		['allowableBending', '8 500', 'not-a-number'],
		['allowableBending', '8.5.0', 'not-a-number'],
		['allowableBending', '1e4', 'not-a-number'],
		['allowableBending', 'NaN', 'not-a-number'],
		['allowableBending', 'Infinity', 'not-a-number'],
		['allowableBending', '0', 'not-positive'],
		['allowableBending', '-8500', 'not-positive'],
		['allowableBending', '999999999999', 'too-large'],
		['allowableBendingUnit', 'bar', 'choose'],
		['brinellLow', '180.5', 'not-whole'],
		['brinellLow', '5', 'brinell-range'],
		['brinellHigh', '900', 'brinell-range'],
		['brinellHigh', '170', 'upper-below-lower'],
		['modulus', 'stiff', 'not-a-number'],
		['modulus', '0', 'not-positive'],
		['modulusUnit', '', 'choose'],
		['poisson', '0.6', 'poisson-range'],
		['poisson', '-0.1', 'poisson-range'],
		['poisson', '0,3', 'comma'],
		['validFrom', '', 'no-date'],
		['validFrom', '15/01/2026', 'no-date'],
		['validFrom', '2026-02-31', 'no-date']
	] as const)('%s "%s" is %s', (field, text, problem) => {
		expect(problemsOf({ [field]: text })).toEqual({ [field]: problem });
	});

	it('names every field of an empty form that must be filled', () => {
		const read = readStatementForm(new FormData());
		expect(read.ok).toBe(false);
		expect(Object.keys(read.ok ? {} : read.problems).sort()).toEqual(
			[
				'allowableBending',
				'allowableBendingUnit',
				'basis',
				'condition',
				'edition',
				'metallic',
				'name',
				'permitted',
				'source',
				'validFrom'
			].sort()
		);
	});

	it('keeps every text as it was typed, right or wrong', () => {
		const wrong: TypedStatement = {
			...typedFrom(iron),
			allowableBending: ' 8,500 psi?',
			source: '',
			poisson: 'about a third'
		};
		const read = readStatementForm(form(wrong));
		expect(read.ok).toBe(false);
		expect(read.typed).toEqual(wrong);
	});

	it('takes no file in place of a text', () => {
		const data = form();
		data.set('name', new File(['x'], 'x.txt'));
		expect(readStatementForm(data)).toMatchObject({ ok: false, problems: { name: 'missing' } });
	});
});

describe('two statements', () => {
	it('differ in the fields whose text differs', () => {
		expect(
			differingFields(typedFrom(iron), { ...typedFrom(iron), poisson: '0.25', name: ' Iron, class 30' })
		).toEqual(['poisson']);
		expect(differingFields(typedFrom(iron), typedFrom(iron))).toEqual([]);
		expect(STATEMENT_FIELDS).toContain('source');
	});
});
