import { describe, expect, it } from 'vitest';
import { FIELDS } from '$lib/features/check/reading/fields';
import { afterKey, readEntry } from '$lib/features/check/reading/number-entry';
import type { PadKey } from '$lib/ui/keypad/keys';

const press = (...keys: PadKey[]) => keys.reduce((text, key) => afterKey(text, key), '');
const { outsideDiameter, teeth, faceWidth, torque } = FIELDS;

describe('keys', () => {
	it('types decimals', () => {
		expect(press('5', '.', '3', '8', '9')).toBe('5.389');
	});

	it('types a whole number and a fraction', () => {
		const text = press('4', 'and', '6', '3', '/64');
		expect(text).toBe('4 63/64');
		expect(readEntry(text, outsideDiameter, 'in')).toEqual({ ok: true, value: 4 + 63 / 64, unit: 'in' });
	});

	it('takes a fraction back with one key', () => {
		expect(press('3', '/16', 'erase')).toBe('3');
	});

	it('leaves the text where a key makes no sense', () => {
		expect(press('/64')).toBe('');
		expect(press('and')).toBe('');
		expect(press('3', '/4', '7')).toBe('3/4');
		expect(press('1', '.', '5', '/2')).toBe('1.5');
	});
});

describe('what a text means', () => {
	it('takes a bare fraction and a leading point', () => {
		expect(readEntry('.54', faceWidth, 'in')).toEqual({ ok: true, value: 0.54, unit: 'in' });
		expect(readEntry('1/2', faceWidth, 'in')).toEqual({ ok: true, value: 0.5, unit: 'in' });
	});

	it.each([
		['2', 2],
		['5.', 5],
		['1 1/2', 1.5]
	])('%s', (text, value) => {
		expect(readEntry(text, faceWidth, 'mm')).toEqual({ ok: true, value, unit: 'mm' });
	});

	it.each([
		['', 'empty'],
		['1.2.3', 'two-points'],
		['.', 'bare-point'],
		['1,250', 'comma'],
		['4 63', 'half-fraction'],
		['4 63/', 'half-fraction'],
		['3/3', 'half-fraction'],
		['5/4', 'fraction-over-one'],
		['four', 'not-a-number'],
		['-3', 'not-a-number'],
		['1e3', 'not-a-number'],
		['0', 'too-small'],
		['99999', 'too-large']
	])('refuses "%s" as %s', (text, problem) => {
		expect(readEntry(text, outsideDiameter, 'mm')).toEqual({ ok: false, problem });
	});

	it('takes the unit that is typed behind the figure before that of the field', () => {
		expect(readEntry('136.9 mm', outsideDiameter, 'in')).toEqual({ ok: true, value: 136.9, unit: 'mm' });
		expect(readEntry('5 3/8"', outsideDiameter, 'mm')).toEqual({ ok: true, value: 5.375, unit: 'in' });
		expect(readEntry('60 lbf·in', torque, 'N*m')).toEqual({ ok: true, value: 60, unit: 'lbf*in' });
		expect(readEntry('7.5 hp', outsideDiameter, 'in')).toEqual({ ok: false, problem: 'wrong-unit' });
		expect(readEntry('mm', outsideDiameter, 'in')).toEqual({ ok: false, problem: 'empty' });
	});

	it('counts teeth in whole numbers, without fractions', () => {
		expect(readEntry('25', teeth, 'teeth')).toEqual({ ok: true, value: 25, unit: 'teeth' });
		expect(readEntry('25.5', teeth, 'teeth')).toEqual({ ok: false, problem: 'not-whole' });
		expect(readEntry('3', teeth, 'teeth')).toEqual({ ok: false, problem: 'too-small' });
		expect(readEntry('1/2', torque, 'N*m')).toEqual({ ok: false, problem: 'no-fractions' });
	});

	it('knows limits in the unit of the reading', () => {
		expect(readEntry('300', outsideDiameter, 'in')).toEqual({ ok: true, value: 300, unit: 'in' });
		expect(readEntry('8001', outsideDiameter, 'mm')).toEqual({ ok: false, problem: 'too-large' });
	});
});
