/** What a strip's address may say: good gears are read, bad ones are named, and nobody is led out of the tablet. */
import { describe, expect, test } from 'vitest';
import { readStripAddress } from '$lib/features/strip/strip-address';

function read(...pairs: [name: string, value: string][]) {
	return readStripAddress(new URLSearchParams(pairs));
}

test('a gear with commas in its name', () => {
	expect(read(['gear', '5.08,25,14.5,full-depth,-0.1,DP 5, 14.5°, full depth'])).toEqual({
		gears: [
			{
				label: 'DP 5, 14.5°, full depth',
				module: 5.08,
				teeth: 25,
				pressureAngle: 14.5,
				form: 'full-depth',
				profileShift: -0.1
			}
		],
		refused: [],
		back: '/tablet'
	});
});

test.each([
	['0,25,20,full-depth,0,Named', 'Named', ['module']],
	['5,25.5,20,full-depth,0,Named', 'Named', ['teeth']],
	['5,,20,full-depth,0,Named', 'Named', ['teeth']],
	['5,25,90,round,0,Named', 'Named', ['pressureAngle', 'form']],
	['5,25,20,stub,much,Named', 'Named', ['profileShift']],
	['5,25,20,stub,0,', '5,25,20,stub,0,', ['label']],
	['nothing', 'nothing', ['label', 'teeth', 'pressureAngle', 'form', 'profileShift', 'module']]
])('a bad gear is named with what is wrong, and the good one stays: %s', (text, name, parts) => {
	const { gears, refused } = read(['gear', text], ['gear', '5,25,20,stub,0,Good']);
	expect(gears.map(({ label }) => label)).toEqual(['Good']);
	expect(refused).toHaveLength(1);
	expect(refused[0]!.name).toBe(name);
	expect([...refused[0]!.parts].sort()).toEqual([...parts].sort());
});

describe('the way back', () => {
	test.each([
		['/tablet/check/1/which-gear', '/tablet/check/1/which-gear'],
		['/tablet/check/1/measure?reading=span-3', '/tablet/check/1/measure?reading=span-3'],
		['/sign-out', '/tablet'],
		['/tablet/../sign-out', '/tablet'],
		['/tablet/..//elsewhere.example/', '/tablet'],
		['//elsewhere.example/tablet/', '/tablet'],
		['https://elsewhere.example/tablet/', '/tablet'],
		['javascript:alert(1)', '/tablet']
	])('%s', (asked, led) => expect(read(['back', asked]).back).toBe(led));
});
