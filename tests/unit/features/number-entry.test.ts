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
		expect(readEntry(text, outsideDiameter, 'in')).toEqual({ ok: true, value: 4 + 63 / 64 });
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
		expect(readEntry('.54', faceWidth, 'in')).toEqual({ ok: true, value: 0.54 });
		expect(readEntry('1/2', faceWidth, 'in')).toEqual({ ok: true, value: 0.5 });
	});

	it.each([
		['2', 2],
		['5.', 5],
		['1 1/2', 1.5],
		['25.4 mm', 25.4],
		['12.7"', 12.7]
	])('%s', (text, value) => {
		expect(readEntry(text, faceWidth, 'mm')).toEqual({ ok: true, value });
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

	it('counts teeth in whole numbers, without fractions', () => {
		expect(readEntry('25', teeth, 'teeth')).toEqual({ ok: true, value: 25 });
		expect(readEntry('25.5', teeth, 'teeth')).toEqual({ ok: false, problem: 'not-whole' });
		expect(readEntry('3', teeth, 'teeth')).toEqual({ ok: false, problem: 'too-small' });
		expect(readEntry('1/2', torque, 'N*m')).toEqual({ ok: false, problem: 'no-fractions' });
	});

	it('knows limits in the unit of the reading', () => {
		expect(readEntry('300', outsideDiameter, 'in')).toEqual({ ok: true, value: 300 });
		expect(readEntry('8001', outsideDiameter, 'mm')).toEqual({ ok: false, problem: 'too-large' });
	});
});
