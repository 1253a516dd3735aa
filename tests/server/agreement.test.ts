/** When tablet and server are said to agree: same verdict and figures to 1 part in 10^9, whatever the wording. */
import { expect, test } from 'vitest';
import type { Outcome } from '$lib/gear/contract';
import { cannotSay } from '$lib/gear/verdict';
import { outcomesAgree } from '$lib/server/commands/agreement';

const outcome: Outcome = {
	...cannotSay([]),
	bendingMargin: 1.6,
	module: 5,
	verdict: 'carries',
	wear: {
		contactStress: 480,
		allowableContact: 620,
		contactMargin: 1.67,
		wearLoad: 1270,
		wearLoadMargin: 1.6
	}
};

test('the same figures agree, also in their last digits', () => {
	expect(outcomesAgree(outcome, { ...outcome })).toBe(true);
	expect(outcomesAgree(outcome, { ...outcome, bendingMargin: 1.6 * (1 + 5e-10) })).toBe(true);
});

test('words, remedies and the version of the core do not matter', () => {
	const reworded = { ...outcome, core: '9.9.9', reasons: [{ code: 'x', text: 'Other words.' }], working: [] };
	expect(outcomesAgree(outcome, reworded)).toBe(true);
});

test.each<[string, Partial<Outcome>]>([
	['another verdict', { verdict: 'close' }],
	['another margin', { bendingMargin: 1.6 * (1 + 2e-9) }],
	['a figure that one side lacks', { bendingMargin: null }],
	['a figure inside a part', { wear: { ...outcome.wear!, wearLoad: 1271 } }],
	['a part that one side lacks', { wear: null }],
	['another law', { velocityLaw: 'cut' }],
	['another sign', { module: -5 }]
])('%s does', (_what, change) => {
	expect(outcomesAgree(outcome, { ...outcome, ...change })).toBe(false);
	expect(outcomesAgree({ ...outcome, ...change }, outcome)).toBe(false);
});

test('of two versions of the core, what only one of them knows does not matter', () => {
	const older = { ...outcome, core: '0.0.1', wear: null };
	expect(outcomesAgree(older, outcome)).toBe(true);
	expect(outcomesAgree({ ...older, bendingMargin: 1.7 }, outcome)).toBe(false);
	expect(outcomesAgree({ ...older, verdict: 'close' }, outcome)).toBe(false);
});

test('a field that one core does not know counts as null', () => {
	const { original: _original, ...older } = outcome;
	expect(outcomesAgree(older as Outcome, outcome)).toBe(true);
});
