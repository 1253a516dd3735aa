/**
 * What must hold for every check, whatever the numbers: scaling laws, the same answer in both unit systems, the order
 * of margins, the verdict's agreement with them, and never a figure that is no number.
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { EvaluateInput, Outcome } from '$lib/gear/contract';
import { permittedPowerAt } from '$lib/gear/capacity';
import { evaluate } from '$lib/gear/evaluate';
import { fromSI, toSI, type Unit } from '$lib/gear/quantity';
import { parseEvaluate } from '$lib/records/evaluate';
import { MOST_UNCERTAIN } from '$lib/gear/uncertainty';
import * as drawn from './check-arbitrary';
import { allowed } from './schema-arbitrary';
import {
	LENGTH_UNITS,
	POWER_UNITS,
	STRESS_UNITS,
	TORQUE_UNITS,
	FORCE_UNITS,
	VELOCITY_UNITS
} from '$lib/gear/quantity';

const { within } = drawn;
/** The doubts that are drawn go beyond what the schema takes of the speed. */
const accepted = (input: EvaluateInput): EvaluateInput => {
	const { uncertainty } = input;
	if (uncertainty?.speed === undefined) return input;
	return {
		...input,
		uncertainty: { ...uncertainty, speed: Math.min(uncertainty.speed, MOST_UNCERTAIN.speed) }
	};
};
const realistic = drawn.realistic.map(accepted);
const realisticOfAllKinds = drawn.realisticOfAllKinds.map(accepted);

const RUNS = { numRuns: 1000 };
const of = (value: number | null) => value ?? NaN;

function expectSame(a: number, b: number, tolerance = 1e-9): void {
	expect(Math.abs(a / b - 1), `${a} and ${b}`).toBeLessThanOrEqual(tolerance);
}

/** Checks that come to a margin; the others are covered by the properties over `allowed`. */
const withMargin = realistic.filter((input) => {
	const { limitedBy } = evaluate(input);
	return limitedBy !== null && judged(input);
});

/** Whether nothing but the plant's list stands against a verdict. */
function judged({ gear, ...input }: EvaluateInput): boolean {
	const material = { ...gear.material, permitted: true };
	return evaluate({ ...input, gear: { ...gear, material } }).verdict !== 'cannot-say';
}

test('most realistic checks come to a margin', () => {
	const sample = fc.sample(realistic, { numRuns: 300, seed: 7 });
	const answered = sample.filter((input) => evaluate(input).bendingMargin !== null);
	expect(answered.length).toBeGreaterThan(150);
});

describe('scaling', () => {
	test('stress rises with the service factor and falls with the face width, in proportion', () => {
		fc.assert(
			fc.property(withMargin, fc.double({ min: 0.5, max: 2, noNaN: true }), (input, k) => {
				const before = of(evaluate(input).bendingStress);
				const { gear, drive } = input;
				const harder = { ...input, drive: { ...drive, serviceFactor: drive.serviceFactor * k } };
				expectSame(of(evaluate(harder).bendingStress), before * k);
				const wider = { ...input, mate: undefined, gear: { ...gear, faceWidth: times(gear.faceWidth, k) } };
				const alone = of(evaluate({ ...input, mate: undefined }).bendingStress);
				expectSame(of(evaluate(wider).bendingStress), alone / k);
			}),
			RUNS
		);
	});

	test('stress rises with the load in proportion', () => {
		fc.assert(
			fc.property(withMargin, fc.double({ min: 0.5, max: 2, noNaN: true }), (input, k) => {
				expectSame(of(evaluate(loaded(input, k)).bendingStress), of(evaluate(input).bendingStress) * k);
			}),
			RUNS
		);
	});

	test('under its permitted power or torque the answer that decides has just what it needs', () => {
		fc.assert(
			fc.property(withMargin, (input) => {
				const { permittedPower, permittedTorque } = evaluate(input);
				const power = { power: { value: of(permittedPower), unit: 'W' as const } };
				const torque = { torque: { value: of(permittedTorque), unit: 'N*m' as const } };
				for (const load of [power, torque]) {
					const outcome = evaluate({ ...input, drive: { ...input.drive, load } });
					const limit = deciding(outcome);
					expectSame(limit.margin, limit.needed);
					expect(outcome.verdict).not.toBe('will-not-carry');
				}
			}),
			RUNS
		);
	});

	test.each(['cast', 'cut', 'hobbed', 'ground', 'non-metallic'] as const)(
		'at a given torque the margin falls as the speed rises: %s',
		(law) => {
			const torque = withMargin.filter(({ drive }) => drive.load !== 'unknown' && !('power' in drive.load));
			fc.assert(
				fc.property(torque, within(1.01, 3), (input, k) => {
					const { gear, drive } = input;
					const finish = law === 'non-metallic' ? 'cut' : law;
					const material = { ...gear.material, metallic: law !== 'non-metallic' };
					const slow = { ...input, gear: { ...gear, finish, material } };
					const fast = { ...slow, drive: { ...drive, speed: drive.speed && times(drive.speed, k) } };
					const [before, after] = [evaluate(slow).bendingMargin, evaluate(fast).bendingMargin];
					fc.pre(before !== null && after !== null);
					expect(after).toBeLessThan(of(before));
				}),
				RUNS
			);
		}
	);
});

const ALL_UNITS = [
	...LENGTH_UNITS,
	...VELOCITY_UNITS,
	...POWER_UNITS,
	...TORQUE_UNITS,
	...FORCE_UNITS,
	...STRESS_UNITS
];

test('a quantity in the unit of the core and back is the same quantity', () => {
	fc.assert(
		fc.property(fc.constantFrom(...ALL_UNITS), within(1e-6, 1e9), (unit, value) => {
			expectSame(fromSI(toSI({ value, unit }), unit), value, 1e-15);
		}),
		RUNS
	);
});

test('a check stated in inches, horsepower and pounds gives the same outcome as in SI units', () => {
	fc.assert(
		fc.property(realisticOfAllKinds, (input) => {
			const [si, us] = [evaluate(input), evaluate(inInches(input))];
			const { working: _si, reasons: _siReasons, remedies: _siRemedies, ...figures } = si;
			expectSameFigures(figures, us);
			expect(us.verdict).toBe(si.verdict);
		}),
		RUNS
	);
});

describe('whatever the schema lets through', () => {
	test('is really sampled: every kind of mate meshes, every law counts, every verdict and most reasons are given', () => {
		const seen = new Set<string>();
		for (const input of fc.sample(allowed, { numRuns: 3000, seed: 1 })) {
			const outcome = evaluate(input);
			seen.add(outcome.verdict).add(`law ${outcome.velocityLaw}`);
			for (const { code } of outcome.reasons) seen.add(code);
			for (const { change } of outcome.remedies) seen.add(`remedy ${change}`);
			for (const { answer } of outcome.limits) seen.add(`limit ${answer}`);
			if (outcome.mesh) seen.add(`${input.gear.kind} on ${input.mate?.kind}`);
		}
		// prettier-ignore
		const meant = [
			'carries', 'close', 'will-not-carry', 'not-permitted', 'cannot-say',
			'law cast', 'law cut', 'law cut-600', 'law hobbed', 'law ground', 'law non-metallic',
			'limit gear-bending', 'limit mate-bending', 'limit wear',
			'remedy power', 'remedy speed', 'remedy faceWidth', 'remedy material',
			'spur on spur', 'helical on helical', 'spur on internal', 'internal on spur', 'spur on rack', 'rack on spur',
			'mate-law-counts', 'mate-speed-beyond-law', 'speed-beyond-law', 'mate-pitch-differs', 'mate-helix-differs',
			'mate-helix-missing', 'mate-teeth-missing', 'kinds-do-not-mesh', 'internal-too-small',
			'centres-too-close', 'contact-ratio-below-one', 'teeth-jam', 'interference', 'undercut', 'mate-worn',
			'wear-not-for-plastics', 'wear-out-of-range', 'wear-not-known', 'tip-worn-away', 'compared-bending',
			'speed-missing', 'load-unknown', 'torque-on-rack', 'velocity-missing'
		];
		expect(meant.filter((one) => !seen.has(one))).toEqual([]);
	});

	test('is answered in finite figures, the low margin never above the margin', () => {
		fc.assert(
			fc.property(fc.oneof(allowed, realistic, realisticOfAllKinds), (input) => {
				const parsed = parseEvaluate(input);
				if (!parsed.ok) throw new Error(JSON.stringify(parsed.error));
				const outcome = evaluate(parsed.input);
				expectFinite(outcome);
				expect(outcome.reasons.length).toBeGreaterThan(0);
				if (outcome.bendingMargin !== null && outcome.bendingMarginLow !== null) {
					expect(outcome.bendingMarginLow).toBeLessThanOrEqual(outcome.bendingMargin);
				}
				for (const { margin, marginLow } of outcome.limits) expect(marginLow).toBeLessThanOrEqual(margin);
				expectVerdictFits(outcome, parsed.input);
			}),
			RUNS
		);
	});

	test('has a curve that agrees with the permitted power at its own speed', () => {
		fc.assert(
			fc.property(withMargin, (input) => {
				const outcome = evaluate(input);
				const at = permittedPowerAt(input, input.drive.speed?.value ?? NaN);
				expect(at?.middle).toBe(outcome.permittedPower);
				const limit = deciding(outcome);
				expectSame(of(at?.low ?? null), (limit.marginLow / limit.margin) * of(outcome.permittedPower));
			}),
			RUNS
		);
	});
});

test('a field overwritten with rubbish is refused, or answered without a number that is none', () => {
	const rubbish = fc.constantFrom<unknown>(
		...[1e308, -1e308, 5e-324, NaN, Infinity, 0, -1, 'x', '', null, [], {}, true, undefined]
	);
	// prettier-ignore
	const place = fc.constantFrom(
		'gear', 'gear.teeth', 'gear.pitch', 'gear.pitch.value', 'gear.faceWidth', 'gear.faceWidth.value',
		'gear.faceWidth.unit', 'gear.pressureAngle', 'gear.form', 'gear.finish', 'gear.kind', 'gear.material',
		'gear.material.allowableBending.value', 'drive', 'drive.load', 'drive.speed', 'drive.speed.value',
		'drive.serviceFactor', 'mate', 'rules', 'uncertainty'
	);
	fc.assert(
		fc.property(realistic, place, rubbish, (input, path, value) => {
			const parsed = parseEvaluate(replaced(input, path, value));
			if (parsed.ok) return expectFinite(evaluate(parsed.input));
			expect(parsed.error.error.issues.length).toBeGreaterThan(0);
			for (const issue of parsed.error.error.issues) {
				expect(issue.path === path || issue.path.startsWith(`${path}.`) || path.startsWith(issue.path)).toBe(
					true
				);
				expect(issue.message).toMatch(/\b(must|known|leave)\b/);
			}
		}),
		RUNS
	);
});

const REVIEWED = [
	'kind-needs-review',
	'contact-ratio-low',
	'no-backlash',
	'interference',
	'wear-out-of-range',
	'wear-not-for-plastics',
	'mate-too-few-teeth',
	'mate-angle-not-covered',
	'mate-rack-tip-too-round',
	'mate-shift-too-large',
	'mate-undercut-too-deep',
	'mate-tip-worn-away',
	'mate-tip-below-pitch-circle',
	'tips-worn',
	'mate-tips-worn',
	'mate-tooth-pointed',
	'mate-tooth-too-short'
];

function expectVerdictFits(outcome: Outcome, input: EvaluateInput): void {
	const { verdict, reasons } = outcome;
	if (!input.gear.material.permitted) return expect(verdict).toBe('not-permitted');
	if (verdict === 'cannot-say') return;
	const { margin, marginLow, needed } = deciding(outcome);
	const least = needed * (1 - 1e-9);
	const review = reasons.some(({ code }) => REVIEWED.includes(code));
	expect(verdict).toBe(margin < least ? 'will-not-carry' : marginLow < least || review ? 'close' : 'carries');
}

/** The answer with the least of what it needs, found again. */
function deciding({ limits, limitedBy }: Outcome): Outcome['limits'][number] {
	const [least] = [...limits].sort((a, b) => a.margin / a.needed - b.margin / b.needed);
	if (!least) throw new Error('a check with a margin was needed');
	expect(limitedBy).toBe(least.answer);
	return least;
}

function expectSameFigures(a: unknown, b: unknown): void {
	if (typeof a === 'number' && typeof b === 'number') {
		if (Math.abs(a - b) > 1e-12) expectSame(a, b);
	} else if (typeof a === 'object' && a !== null && typeof b === 'object' && b !== null) {
		for (const [name, value] of Object.entries(a)) {
			expectSameFigures(value, (b as Record<string, unknown>)[name]);
		}
	} else expect(b).toBe(a);
}

function expectFinite(value: unknown): void {
	if (typeof value === 'number') return expect(Number.isFinite(value)).toBe(true);
	if (typeof value === 'object' && value !== null) Object.values(value).forEach(expectFinite);
}

function times<Q extends { value: number }>(quantity: Q, k: number): Q {
	return { ...quantity, value: quantity.value * k };
}

function loaded(input: EvaluateInput, k: number): EvaluateInput {
	const { load } = input.drive;
	if (load === 'unknown') return input;
	const more = Object.fromEntries(Object.entries(load).map(([kind, quantity]) => [kind, times(quantity, k)]));
	return { ...input, drive: { ...input.drive, load: more as typeof load } };
}

function inInches(input: EvaluateInput): EvaluateInput {
	const US: Partial<Record<Unit, Unit>> = { mm: 'in', kW: 'hp', 'N*m': 'lbf*ft', N: 'lbf', MPa: 'psi' };
	return JSON.parse(JSON.stringify(input), (_key, value: unknown) => {
		if (typeof value !== 'object' || value === null) return value;
		if ('system' in value && value.system === 'module' && 'value' in value) {
			return { system: 'diametral', value: 25.4 / Number(value.value) };
		}
		if (!('unit' in value && 'value' in value)) return value;
		const unit = US[value.unit as Unit];
		const typed = { value: Number(value.value), unit: value.unit as Unit };
		return unit ? { value: fromSI(toSI(typed), unit), unit } : value;
	}) as EvaluateInput;
}

function replaced(input: unknown, path: string, value: unknown): unknown {
	const [key = '', ...rest] = path.split('.');
	if (typeof input !== 'object' || input === null) return input;
	const inner = (input as Record<string, unknown>)[key];
	return { ...input, [key]: rest.length === 0 ? value : replaced(inner, rest.join('.'), value) };
}
