/** What a millwright is told of hardness and wear of the two members, and what is usual enough to say nothing. */
import { describe, expect, test } from 'vitest';
import type { Gear, Material, Mate } from '$lib/gear/contract';
import { pairingWarnings } from '$lib/gear/hardness-pairing';

const steel = (brinell: number | undefined): Material => ({
	name: 'steel',
	metallic: true,
	allowableBending: { value: 200, unit: 'MPa' },
	brinell,
	permitted: true
});

describe('a millwright is told', () => {
	const gear: Gear = {
		kind: 'spur',
		teeth: 24,
		pitch: { system: 'module', value: 4 },
		pressureAngle: 20,
		form: 'full-depth',
		faceWidth: { value: 40, unit: 'mm' },
		finish: 'cut',
		material: steel(300)
	};
	const mate: Mate = { kind: 'spur', teeth: 60, material: steel(250) };
	const told = (of: Partial<Gear>, from: Partial<Mate>) =>
		pairingWarnings({ ...gear, ...of }, { ...mate, ...from });
	const codes = (of: Partial<Gear>, from: Partial<Mate>) => told(of, from).map(({ code }) => code);

	test('nothing of a usual pair', () => {
		expect(told({}, {})).toEqual([]);
		expect(told({}, { kind: 'spur', material: undefined, teeth: undefined })).toEqual([]);
	});

	test.each<[string, Partial<Gear>, Partial<Mate>, boolean]>([
		['a wheel that is harder, as the mate', {}, { material: steel(340) }, true],
		['a wheel that is harder, as the gear', { teeth: 60 }, { teeth: 24, material: steel(250) }, true],
		['a pinion that is harder, as the mate', { teeth: 60 }, { teeth: 24, material: steel(340) }, false],
		['two as hard', {}, { material: steel(300) }, false],
		['two that differ by less than is told', {}, { material: steel(300.4) }, false],
		['a harder mate of as many teeth', {}, { teeth: 24, material: steel(340) }, false],
		['a softer mate of as many teeth', {}, { teeth: 24, material: steel(250) }, false],
		['a pinion of unknown hardness', { material: steel(undefined) }, {}, false],
		['an internal gear that is harder', {}, { kind: 'internal', material: steel(340) }, true]
	])('of %s', (_what, of, from, reversed) => {
		expect(codes(of, from)).toEqual(reversed ? ['hardness-reversed'] : []);
	});

	test('both hardnesses, the right way round', () => {
		expect(told({}, { material: steel(340) })[0]?.values).toEqual({ pinion: 300, wheel: 340 });
		expect(told({ teeth: 60 }, { teeth: 24, material: steel(250) })[0]?.values).toEqual({
			pinion: 250,
			wheel: 300
		});
	});

	test('of a worn mate, and all that there is to tell at once', () => {
		expect(codes({}, { worn: true })).toEqual(['mate-worn']);
		expect(codes({}, { worn: false })).toEqual([]);
		expect(codes({}, { worn: true, material: steel(340) })).toEqual(['hardness-reversed', 'mate-worn']);
	});
});
