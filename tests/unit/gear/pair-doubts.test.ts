/** What of a pair goes to review at best, and what does not mesh at all: each with its own reason, and no figure too many. */
import { describe, expect, test } from 'vitest';
import type { EvaluateInput, Mate, Outcome } from '$lib/gear/contract';
import { evaluate } from '$lib/gear/evaluate';
import { mateToothRefusal } from '$lib/gear/mate-refusals';
import { memberOf } from '$lib/gear/member';
import { formFactorOf } from '$lib/gear/strength';
import { unrecorded } from '$lib/gear/working';
import { check, gear, mate, steel } from './pair-check';

const withMate = (change: Partial<Mate>) => evaluate(check({ mate: { ...mate, ...change } }));
const codes = ({ reasons }: Outcome) => reasons.map(({ code }) => code);

describe('goes to review at best', () => {
	const light = { load: { power: { value: 0.2, unit: 'kW' as const } }, serviceFactor: 1 };
	const speed = { value: 400, unit: 'rpm' as const };
	const helix = { kind: 'helical' as const, helixAngle: 20, plane: 'normal' as const };
	test.each<[string, string, EvaluateInput]>([
		[
			'a helical pair',
			'kind-needs-review',
			check({ gear: { ...gear, ...helix }, mate: { ...mate, ...helix } })
		],
		['an internal gear', 'kind-needs-review', check({ gear: { ...gear, kind: 'internal', teeth: 90 } })],
		['a pinion in an internal gear', 'kind-needs-review', check({ mate: { ...mate, kind: 'internal' } })],
		['a pinion on a rack', 'kind-needs-review', check({ mate: { ...mate, kind: 'rack', teeth: undefined } })],
		['a hardness beyond the table', 'wear-out-of-range', check({ mate: { ...mate, material: steel(600) } })],
		[
			'a non-metallic mate',
			'wear-not-for-plastics',
			check({ mate: { ...mate, material: { ...steel(220), metallic: false } } })
		],
		[
			'a non-metallic mate of no hardness',
			'wear-not-for-plastics',
			check({ mate: { ...mate, material: { ...steel(220), metallic: false, brinell: undefined } } })
		],
		[
			'a hardness beyond the table, of no modulus',
			'wear-out-of-range',
			check({ mate: { ...mate, material: { ...steel(600), modulus: undefined } } })
		],
		[
			'a mean hardness below the table',
			'wear-out-of-range',
			check({ gear: { ...gear, material: steel(120) }, mate: { ...mate, material: steel(120) } })
		],
		[
			'little contact',
			'contact-ratio-low',
			check({ mate: { ...mate, centreDistance: { value: 172.8, unit: 'mm' } } })
		],
		[
			'teeth that jam a little',
			'no-backlash',
			check({ mate: { ...mate, centreDistance: { value: 169.5, unit: 'mm' } } })
		],
		[
			'tips that dig in',
			'interference',
			check({
				gear: { ...gear, teeth: 18, form: { addendum: 1, dedendum: 1, tipRadius: 0 } },
				mate: { ...mate, form: { addendum: 1.2, dedendum: 1.2, tipRadius: 0 } }
			})
		]
	])('%s: %s', (_what, code, input) => {
		const outcome = evaluate({ ...input, drive: { ...light, speed } });
		expect(outcome.verdict).toBe('close');
		expect(codes(outcome)[0]).toBe(code);
		expect(outcome.remedies).toEqual([]);
		// What is given, or would not help, is not asked for.
		expect(codes(outcome)).not.toContain('wear-not-known');
		expect(codes(outcome)).not.toContain('bending-only');
	});

	const tooth = { addendum: 1, dedendum: 1.25, tipRadius: 0.3 };
	test.each<[string, Partial<Mate>]>([
		['mate-too-few-teeth', { teeth: 9 }],
		['mate-angle-not-covered', { pressureAngle: 28 }],
		['mate-rack-tip-too-round', { form: { ...tooth, tipRadius: 0.5 } }],
		['mate-shift-too-large', { profileShift: 1.4 }],
		['mate-tip-worn-away', { tipWear: { value: 9.5, unit: 'mm' } }],
		['mate-tip-below-pitch-circle', { tipWear: { value: 5, unit: 'mm' } }],
		['mate-tooth-pointed', { teeth: 12, profileShift: 0.9 }],
		['mate-tooth-too-short', { form: { addendum: 0.1, dedendum: 0.1, tipRadius: 0 } }],
		['mate-undercut-too-deep', { teeth: 10, profileShift: -0.5, form: { ...tooth, addendum: 1.4 } }]
	])("teeth of the mate that the method does not cover, in the mate's own words: %s", (code, change) => {
		// Straight from the teeth: most such ones do not mesh with a gear that the method covers.
		const pressureAngle = change.pressureAngle ?? (code === 'mate-undercut-too-deep' ? 15 : 20);
		const part = { ...gear, ...change, pressureAngle };
		const { refusal } = formFactorOf(memberOf(part), part.form, 'geometry', unrecorded);
		expect(refusal?.code).toBe(code.replace('mate-', ''));
		const told = mateToothRefusal(refusal ?? { code: '', text: '' });
		expect(told.code).toBe(code);
		expect(told.text).toMatch(/\bmate\b.*not in this verdict\.$/);
		expect(told.text).not.toContain('undefined');
	});

	test("a mate of nine teeth: close, and its form and material aren't asked for again", () => {
		const weak = { ...steel(300), allowableBending: { value: 1, unit: 'MPa' as const } };
		const outcome = evaluate({
			gear: { ...gear, teeth: 60, pressureAngle: 25 },
			mate: { ...mate, teeth: 9, material: weak },
			drive: {
				load: { power: { value: 1, unit: 'kW' } },
				speed: { value: 100, unit: 'rpm' },
				serviceFactor: 1
			}
		});
		expect(outcome.verdict).toBe('close');
		const told = outcome.reasons.find(({ code }) => code === 'mate-too-few-teeth');
		expect(told?.text).toContain('the mate has 9');
		expect(codes(outcome)).not.toContain('mate-bending-not-known');
	});

	test('a rack alone, by its velocity', () => {
		const { teeth: _teeth, ...toothed } = gear;
		const outcome = evaluate({
			gear: { ...toothed, kind: 'rack' },
			drive: {
				load: { tangentialForce: { value: 1, unit: 'kN' } },
				velocity: { value: 0.3, unit: 'm/s' },
				serviceFactor: 1
			}
		});
		expect(outcome).toMatchObject({
			verdict: 'close',
			pitchDiameter: null,
			permittedTorque: null,
			formFactor: 0.484
		});
		expect(outcome.permittedPower).toBeGreaterThan(300);
	});

	test('an internal gear has the form factor of the rack, which its own teeth exceed', () => {
		const outcome = evaluate(check({ gear: { ...gear, kind: 'internal', teeth: 90 } }));
		expect(outcome.formFactor).toBe(0.484);
		expect(outcome.mesh?.standardCentreDistance).toBe(((90 - 61) * 4) / 2);
	});
});

describe('does not mesh', () => {
	test.each<[string, Partial<Mate>]>([
		['mate-pitch-differs', { pitch: { system: 'module', value: 4.5 } }],
		['mate-pitch-differs', { pressureAngle: 14.5 }],
		['mate-pitch-differs', { teeth: undefined, pitch: { system: 'module', value: 4.5 } }],
		['mate-helix-differs', { kind: 'helical', helixAngle: 15, plane: 'normal' }],
		['mate-helix-differs', { kind: 'helical', helixAngle: 15, teeth: undefined, plane: 'normal' }],
		['mate-helix-missing', { kind: 'helical' }],
		['teeth-jam', { centreDistance: { value: 168.5, unit: 'mm' } }],
		['teeth-jam', { toothThickness: { value: 7, unit: 'mm' } }],
		['internal-too-small', { kind: 'internal', teeth: 20 }],
		['centres-too-close', { centreDistance: { value: 150, unit: 'mm' } }],
		['contact-ratio-below-one', { centreDistance: { value: 176, unit: 'mm' } }]
	])('%s', (code, change) => {
		const outcome = withMate(change);
		expect(outcome.verdict).toBe('cannot-say');
		expect(codes(outcome)[0]).toBe(code);
		// Nothing is carried by two that do not mesh.
		expect(outcome).toMatchObject({
			permittedPower: null,
			permittedTorque: null,
			limitedBy: null,
			limits: []
		});
		expect(outcome.remedies).toEqual([]);
		expect(outcome.working.some(({ symbol }) => symbol === 'Pp')).toBe(false);
	});

	test.each(['normal', 'transverse'] as const)(
		'a spur mate on a helical gear, whose pitch it takes over in the %s plane',
		(plane) => {
			const helical = { ...gear, kind: 'helical' as const, helixAngle: 24, plane };
			const outcome = evaluate(check({ gear: helical }));
			expect(outcome.verdict).toBe('cannot-say');
			expect(codes(outcome)[0]).toBe('mate-helix-differs');
			expect(codes(outcome)).not.toContain('mate-pitch-differs');
			// A helical mate that states no angle has that of its gear.
			const meshing = evaluate(check({ gear: helical, mate: { ...mate, kind: 'helical' } }));
			expect(meshing.mesh).not.toBeNull();
		}
	);

	test('48 teeth at 142.5 mm where 144 is standard: more than teeth give', () => {
		const at = (value: number) =>
			evaluate(check({ mate: { ...mate, teeth: 48, centreDistance: { value, unit: 'mm' } } }));
		expect(codes(at(142.5))[0]).toBe('teeth-jam');
		expect(at(142.5).mesh?.normalBacklash).toBeLessThan(-0.4);
		expect(codes(at(142.5))).not.toContain('no-backlash');
		expect(at(143.5).verdict).not.toBe('cannot-say');
		expect(codes(at(143.5))).toContain('no-backlash');
	});

	test('a missing count of an internal gear or its pinion is no sign of its size', () => {
		const outcome = withMate({ kind: 'internal', teeth: undefined });
		expect(codes(outcome)).not.toContain('internal-too-small');
		expect(codes(outcome)).toContain('mate-teeth-missing');
	});

	test('a rack with an internal gear', () => {
		const outcome = evaluate(
			check({ gear: { ...gear, kind: 'internal', teeth: 90 }, mate: { kind: 'rack' } })
		);
		expect(codes(outcome)[0]).toBe('kinds-do-not-mesh');
	});

	test('4 diametral pitch and module 6.35 are one pitch by two names', () => {
		const pitch = { system: 'diametral' as const, value: 4 };
		const outcome = evaluate(
			check({ gear: { ...gear, pitch }, mate: { ...mate, pitch: { system: 'module', value: 6.35 } } })
		);
		expect(outcome.mesh).not.toBeNull();
	});
});
