/** One member of a mesh: pitch and angle in both planes, tips, undercut; by the definitions, worked by hand. */
import { describe, expect, test } from 'vitest';
import { isUndercut } from '$lib/gear/contact-on-flanks';
import type { ToothedPart } from '$lib/gear/contract';
import { baseDiameter, memberOf, tipDiameter } from '$lib/gear/member';

const part = (of: Partial<ToothedPart>) =>
	memberOf({
		kind: 'spur',
		teeth: 40,
		pitch: { system: 'module', value: 5 },
		pressureAngle: 20,
		form: 'full-depth',
		...of
	});

describe('tips stand one addendum and the shift off the pitch circle, less what is worn', () => {
	const shifted = { profileShift: 0.3, tipWear: { value: 0.5, unit: 'mm' as const } };
	test.each<[string, Partial<ToothedPart>, number]>([
		['plain', {}, 200 + 10],
		['shifted and worn', shifted, 200 + 2 * 1.3 * 5 - 1],
		['internal', { kind: 'internal' }, 200 - 10],
		['internal, shifted outwards and worn', { kind: 'internal', ...shifted }, 200 - 2 * 0.7 * 5 + 1]
	])('%s', (_what, of, diameter) => {
		expect(tipDiameter(part(of))).toBeCloseTo(diameter, 9);
	});

	test('a rack has no tip circle, and no base circle', () => {
		const rack = part({ kind: 'rack', teeth: undefined });
		expect([tipDiameter(rack), baseDiameter(rack)]).toEqual([null, null]);
	});
});

test('a base circle by the transverse angle', () => {
	expect(baseDiameter(part({}))).toBeCloseTo(200 * Math.cos(Math.PI / 9), 9);
});

test.each([
	// The generating rack of 20 degrees undercuts below 17.1 teeth, of 14.5 degrees below 31.9: 2 / sin² α.
	[17, 20, true],
	[18, 20, false],
	[31, 14.5, true],
	[32, 14.5, false]
])('%d teeth of %d degrees are undercut: %s', (teeth, pressureAngle, undercut) => {
	expect(isUndercut(part({ teeth, pressureAngle }))).toBe(undercut);
});
