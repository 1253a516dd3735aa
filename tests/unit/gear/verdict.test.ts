/**
 * The verdict of every kind of check: what carries, what is close, what falls short, what is not permitted here, and
 * what cannot be said. Each has a coded reason, and what cannot be said says what to do.
 */
import { describe, expect, test } from 'vitest';
import type { EvaluateInput, Gear, Mate, Rules } from '$lib/gear/contract';
import { evaluate } from '$lib/gear/evaluate';
import { CORE_VERSION } from '$lib/gear/version';
import { spurCheck } from '../../reference/spur-check';

const base = spurCheck({ teeth: 24, pitch: { system: 'diametral', value: 6 }, rpm: 400 });
const withGear = (change: Partial<Gear>): EvaluateInput => ({ ...base, gear: { ...base.gear, ...change } });
const withDrive = (change: Partial<EvaluateInput['drive']>): EvaluateInput => ({
	...base,
	drive: { ...base.drive, ...change }
});
const withRules = (rules: Partial<Rules>): EvaluateInput => ({ ...base, rules });
const withMate = (mate: Mate): EvaluateInput => ({ ...base, mate });

/** A drive that leaves exactly this margin. */
function atMargin(margin: number, rules: Partial<Rules> = {}): EvaluateInput {
	const { bendingMargin } = evaluate(base);
	const serviceFactor = (base.drive.serviceFactor * (bendingMargin ?? NaN)) / margin;
	return { ...withDrive({ serviceFactor }), rules };
}

describe('by margin', () => {
	test.each([
		{ margin: 3, needed: 1.5, verdict: 'carries', code: 'bending-margin' },
		{ margin: 1.6, needed: 1.5, verdict: 'close', code: 'bending-margin-low' },
		{ margin: 1.5, needed: 1.5, verdict: 'close', code: 'bending-margin-low' },
		{ margin: 1.499, needed: 1.5, verdict: 'will-not-carry', code: 'bending-margin-short' }
	])('$margin where $needed is needed: $verdict', ({ margin, needed, verdict, code }) => {
		const outcome = evaluate(atMargin(margin, { bendingMargin: needed }));
		expect(outcome.verdict).toBe(verdict);
		expect(outcome.core).toBe(CORE_VERSION);
		const [reason] = outcome.reasons;
		expect(reason).toMatchObject({ code, values: { needed } });
		expect(reason?.values?.margin).toBeCloseTo(margin, 9);
		expect(reason?.values?.low).toBe(outcome.bendingMarginLow);
		expect(reason?.text).toContain(String(needed));
	});

	test('a margin a little short never reads as the needed one', () => {
		expect(evaluate(atMargin(0.9999)).reasons[0]?.text).toContain('0.99,');
	});

	test('carries and close say what this version leaves out', () => {
		expect(evaluate(atMargin(3)).reasons.map(({ code }) => code)).toEqual(['bending-margin', 'bending-only']);
	});

	test('exact readings make close impossible', () => {
		const exact = { ...atMargin(1), uncertainty: { faceWidth: 0, load: 0, speed: 0 } };
		expect(evaluate(exact)).toMatchObject({ verdict: 'carries' });
	});
});

describe('what the figures follow', () => {
	test('reversing multiplies the allowable by the factor of the rules', () => {
		const outcome = evaluate({ ...withDrive({ bending: 'reversing' }), rules: { reversingFactor: 0.6 } });
		expect(outcome.allowableBending).toBeCloseTo(0.6 * 150, 12);
		expect(evaluate(withDrive({ bending: 'reversing' })).allowableBending).toBeCloseTo(0.7 * 150, 12);
		expect(evaluate(base).allowableBending).toBe(150);
	});

	test('a narrower mate sets the face width, a wider one does not', () => {
		const margin = (value: number) =>
			evaluate(withMate({ kind: 'spur', faceWidth: { value, unit: 'mm' } })).bendingMargin ?? NaN;
		const alone = evaluate(base).bendingMargin ?? NaN;
		expect(margin(12.5)).toBeCloseTo(alone / 2, 9);
		expect(margin(60)).toBe(alone);
	});

	test('the law is named, by finish, by the rule for cut teeth and for non-metallic gears', () => {
		expect(evaluate(base).velocityLaw).toBe('cut');
		expect(evaluate(withRules({ cutLaw: 600 })).velocityLaw).toBe('cut-600');
		expect(evaluate(withGear({ finish: 'ground' })).velocityLaw).toBe('ground');
		const phenolic = { ...base.gear.material, metallic: false };
		expect(evaluate(withGear({ material: phenolic })).velocityLaw).toBe('non-metallic');
	});
});

describe('material not permitted', () => {
	const material = { ...base.gear.material, name: 'Iron 17', permitted: false };

	test('comes before the margin, which is still worked out', () => {
		const outcome = evaluate(withGear({ material }));
		expect(outcome.verdict).toBe('not-permitted');
		expect(outcome.reasons.map(({ code }) => code).slice(0, 2)).toEqual([
			'material-not-permitted',
			'bending-margin'
		]);
		expect(outcome.reasons[0]?.text).toContain('Iron 17');
		expect(outcome.bendingMargin).toBe(evaluate(base).bendingMargin);
	});

	test('comes before what cannot be said', () => {
		const outcome = evaluate(withGear({ material, teeth: 8 }));
		expect(outcome.verdict).toBe('not-permitted');
		expect(outcome.reasons.map(({ code }) => code)).toEqual(['material-not-permitted', 'too-few-teeth']);
	});
});

describe('cannot say', () => {
	const rack = { addendum: 1, dedendum: 1.25, tipRadius: 0.3 };
	const onRack = (load: EvaluateInput['drive']['load']): EvaluateInput => ({
		...withGear({ kind: 'rack', teeth: undefined }),
		drive: { load, velocity: { value: 1, unit: 'm/s' }, serviceFactor: 1 }
	});
	const refused: [code: string, input: EvaluateInput][] = [
		['angle-not-covered', withGear({ pressureAngle: 30 })],
		['tooth-pointed', withGear({ teeth: 12, profileShift: 0.9 })],
		[
			'undercut-too-deep',
			withGear({ teeth: 10, pressureAngle: 15, profileShift: -0.5, form: { ...rack, addendum: 1.4 } })
		],
		['shift-too-large', withGear({ profileShift: 1.4 })],
		['tip-below-pitch-circle', withGear({ tipWear: { value: 4.5, unit: 'mm' } })],
		['tip-worn-away', withGear({ tipWear: { value: 30, unit: 'mm' } })],
		['rack-tip-too-round', withGear({ form: { ...rack, tipRadius: 0.5 } })],
		['velocity-missing', withGear({ kind: 'rack', teeth: undefined })],
		['torque-on-rack', onRack({ torque: { value: 50, unit: 'N*m' } })],
		['too-few-teeth', withGear({ teeth: 9 })],
		['teeth-missing', withGear({ teeth: undefined })],
		['speed-missing', withDrive({ speed: undefined })],
		['load-unknown', withDrive({ load: 'unknown' })],
		['speed-beyond-law', withDrive({ speed: { value: 4000, unit: 'rpm' } })],
		['speed-beyond-law', withDrive({ speed: { value: -1, unit: 'rpm' } })],
		['mate-pitch-differs', withMate({ kind: 'spur', pitch: { system: 'module', value: 4 } })],
		['mate-pitch-differs', withMate({ kind: 'spur', pitch: base.gear.pitch, pressureAngle: 14.5 })],
		['out-of-range', withDrive({ load: { power: { value: 1e308, unit: 'hp' } } })],
		['out-of-range', withGear({ faceWidth: { value: 1e-320, unit: 'mm' } })]
	];

	test.each(refused)('%s', (code, input) => {
		const outcome = evaluate(input);
		expect(outcome.verdict).toBe('cannot-say');
		expect(outcome.reasons.map((reason) => reason.code)).toContain(code);
		const reason = outcome.reasons.find((candidate) => candidate.code === code);
		expect(reason?.text).toMatch(/\b(Check|Give|Count|Have|have|can set)\b/);
		expect(JSON.stringify(outcome)).not.toContain('NaN');
	});

	test('a mate of the same pitch, said in another way, is no obstacle', () => {
		const outcome = evaluate(withMate({ kind: 'spur', pitch: { system: 'module', value: 4.2333 } }));
		expect(outcome.verdict).toBe('carries');
	});

	test('what the missing piece does not touch is still worked out', () => {
		const outcome = evaluate(withDrive({ load: 'unknown' }));
		expect(outcome).toMatchObject({
			pitchDiameter: 101.6,
			formFactor: 0.337,
			bendingStress: null,
			bendingMargin: null
		});
		expect(outcome.permittedPower).toBe(evaluate(base).permittedPower);
		const tooFast = evaluate(withDrive({ speed: { value: 4000, unit: 'rpm' } }));
		expect(tooFast.pitchLineVelocity).toBeGreaterThan(20);
		expect(tooFast).toMatchObject({ velocityFactor: null, bendingMargin: null, permittedPower: null });
	});
});

describe('end of a velocity law', () => {
	// Usual ends in ft/min: Faires, Doughtie & Vallance (from memory); ground and non-metallic are common practice.
	test.each([
		{ finish: 'cast', cutLaw: 1200, metallic: true, end: 1000 },
		{ finish: 'cut', cutLaw: 1200, metallic: true, end: 4000 },
		{ finish: 'cut', cutLaw: 600, metallic: true, end: 2000 },
		{ finish: 'hobbed', cutLaw: 1200, metallic: true, end: 4000 },
		{ finish: 'ground', cutLaw: 1200, metallic: true, end: 10000 },
		{ finish: 'cut', cutLaw: 1200, metallic: false, end: 3000 }
	] as const)(
		'$finish, cut law $cutLaw, metallic $metallic: $end ft/min',
		({ finish, cutLaw, metallic, end }) => {
			const at = (feetPerMinute: number): EvaluateInput => ({
				...withGear({ finish, material: { ...base.gear.material, metallic } }),
				drive: { ...base.drive, speed: { value: (feetPerMinute * 12) / (Math.PI * 4), unit: 'rpm' } },
				rules: { cutLaw }
			});
			expect(evaluate(at(end)).bendingMargin).not.toBeNull();
			expect(evaluate(at(end * 1.001)).reasons.map(({ code }) => code)).toEqual(['speed-beyond-law']);
		}
	);

	const limitedTo = (finish: 'cast' | 'cut', limit: number, velocity: number): EvaluateInput => {
		const none = { cast: null, cut: null, hobbed: null, ground: null };
		const { teeth, module } = { teeth: base.gear.teeth ?? NaN, module: evaluate(base).module ?? NaN };
		const rpm = (velocity * 60000) / (Math.PI * module * teeth);
		return {
			...base,
			gear: { ...base.gear, finish },
			drive: { ...base.drive, speed: { value: rpm, unit: 'rpm' } },
			rules: { speedLimit: { ...none, [finish]: { value: limit, unit: 'm/s' as const } } }
		};
	};

	test("the plant's own limit counts instead where it is lower", () => {
		expect(evaluate(limitedTo('cut', 2, 1.99)).bendingMargin).not.toBeNull();
		const beyond = evaluate(limitedTo('cut', 2, 2.01));
		expect(beyond.bendingMargin).toBeNull();
		expect(beyond.reasons[0]?.text).toContain('the plant allows for cut or milled teeth');
	});

	// The furthest that a text takes the law, from memory: cast 2,000 ft/min (10.16 m/s), cut 4,000 ft/min (20.32 m/s).
	test.each([
		{ finish: 'cast', furthest: 10.16 },
		{ finish: 'cut', furthest: 20.32 }
	] as const)('a higher one takes the $finish law no further than any text does', ({ finish, furthest }) => {
		expect(evaluate(limitedTo(finish, 500, furthest)).bendingMargin).not.toBeNull();
		for (const velocity of [furthest * 1.001, 25, 400]) {
			const outcome = evaluate(limitedTo(finish, 500, velocity));
			expect(outcome.verdict).toBe('cannot-say');
			expect(outcome.reasons[0]).toMatchObject({ code: 'speed-beyond-law' });
			expect(outcome.reasons[0]?.values?.end).toBeCloseTo(furthest, 9);
		}
	});
});
