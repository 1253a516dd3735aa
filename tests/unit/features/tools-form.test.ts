/** The form of the plant's tools: what is typed comes back as it was, whatever is wrong with it. */
import { expect, test } from 'vitest';
import { INSTRUMENTS, instrumentRules } from '$lib/records/instruments';
import { readToolsForm, typedFrom, usualGoodTo } from '$lib/features/rules/tools-form';

function form(fields: Record<string, string>): FormData {
	const data = new FormData();
	for (const [name, value] of Object.entries(fields)) data.set(name, value);
	return data;
}

test('an empty field is what is usual; a figure is twice the standard uncertainty', () => {
	const read = readToolsForm(form({ calliper: ' 0.08 ', rule: '', protractor: '2' }));
	expect(read).toMatchObject({ ok: true, instruments: { calliper: 0.04, protractor: 1 } });
	if (read.ok) expect(instrumentRules.safeParse(read.instruments).success).toBe(true);
});

test('what was stated reads back the same', () => {
	const stated = Object.fromEntries(INSTRUMENTS.map((name, i) => [name, 0.0007 * (i + 1)]));
	const read = readToolsForm(form(typedFrom(stated)));
	expect(read.ok && read.instruments).toEqual(stated);
	expect(usualGoodTo('calliper')).toBe('0.05');
});

test('each slip is named by its tool and nothing typed is lost', () => {
	const slips = { calliper: '0,05', rule: 'half', tape: '-1', micrometer: '0', 'pi-tape': '41' };
	const read = readToolsForm(form(slips));
	expect(read).toMatchObject({
		ok: false,
		typed: slips,
		problems: {
			calliper: 'comma',
			rule: 'not-a-number',
			tape: 'not-a-number',
			micrometer: 'out-of-range',
			'pi-tape': 'out-of-range'
		}
	});
});
