/** The weakest of several gears decides; a doubt sends an answer to review and never makes it better. */
import { describe, expect, it } from 'vitest';
import type { Outcome, Verdict } from '$lib/gear/contract';
import { outcomeOfSeveral, reviewed, type Tried } from '$lib/gear/several';
import { cannotSay } from '$lib/gear/verdict';

const reason = { code: 'bending-margin', text: 'Invented.' };

function tried(verdict: Verdict, marginLow: number, probability = 0.5): Tried {
	const outcome: Outcome = {
		...cannotSay([reason]),
		verdict,
		limits: [{ answer: 'gear-bending', margin: marginLow * 1.1, marginLow, needed: 1.2 }]
	};
	const gear = {
		teeth: 20,
		pitch: { system: 'module', value: 4 } as const,
		pressureAngle: 20,
		form: 'full-depth' as const,
		profileShift: 0
	};
	return { gear, probability, outcome };
}

describe('of several gears', () => {
	it.each([
		[['carries', 'will-not-carry', 'cannot-say', 'close'], 'will-not-carry'],
		[['carries', 'cannot-say', 'close'], 'cannot-say'],
		[['carries', 'close'], 'close'],
		[['carries', 'carries'], 'carries'],
		[['will-not-carry', 'not-permitted'], 'not-permitted']
	] as [Verdict[], Verdict][])('%j come to %s', (verdicts, worst) => {
		expect(outcomeOfSeveral(verdicts.map((verdict) => tried(verdict, 1))).verdict).toBe(worst);
	});

	it('the lower one decides among equals, however unlikely it is', () => {
		const outcome = outcomeOfSeveral([tried('close', 1.1, 0.9), tried('close', 1.05, 0.02)]);
		expect(outcome.limits[0]?.marginLow).toBe(1.05);
		expect(outcome.gears?.map(({ decides }) => decides)).toEqual([false, true]);
		expect(outcome.reasons.map(({ code }) => code)).toEqual(['bending-margin', 'weakest-of-several']);
		expect(outcome.reasons[1]?.values).toEqual({ gears: 2 });
	});

	it('a single one stands for itself', () => {
		const outcome = outcomeOfSeveral([tried('carries', 2)]);
		expect(outcome.reasons).toEqual([reason]);
		expect(outcome.gears).toHaveLength(1);
	});

	it('none is no question', () => {
		expect(() => outcomeOfSeveral([])).toThrow(RangeError);
	});
});

describe('a doubt', () => {
	const doubt = { code: 'may-fit-no-gear', text: 'Invented.' };
	it.each([
		['carries', 'close', 0],
		['close', 'close', 1],
		['will-not-carry', 'will-not-carry', 1],
		['cannot-say', 'cannot-say', 1],
		['not-permitted', 'not-permitted', 1]
	] as [Verdict, Verdict, number][])('makes of %s %s', (before, after, place) => {
		const outcome = reviewed(tried(before, 1).outcome, doubt);
		expect(outcome.verdict).toBe(after);
		expect(outcome.reasons[place]).toBe(doubt);
		expect(outcome.reasons).toHaveLength(2);
	});
});
