/** One grossly wrong reading among five must not turn the answer silently; wheels that are no involute gear say so. */
import { expect, test } from 'vitest';
import type { IdentifyInput } from '$lib/gear/identify/contract';
import { identify } from '$lib/gear/identify/identify';
import { isRight } from './calibration';
import { cycloidalReadings } from './cycloidal-gears';
import { randomOf, readingsOf, syntheticGear, type Random } from './synthetic-gears';

/** Two neighbouring digits the wrong way round, by more than 2 % of the reading. */
function swapped(value: number, random: Random): number {
	const digits = [...value.toFixed(3)];
	const places = digits.flatMap((digit, place) => (digit === '.' ? [] : [place]));
	for (let tries = 0; tries < 40; tries++) {
		const n = Math.floor(random() * (places.length - 1));
		const [a, b] = [places[n] ?? 0, places[n + 1] ?? 0];
		const wrong = [...digits];
		[wrong[a], wrong[b]] = [digits[b] ?? '0', digits[a] ?? '0'];
		const read = Number(wrong.join(''));
		if (read > 0 && Math.abs(read - value) > 0.02 * value) return read;
	}
	return value * 1.1;
}

function withGrossError(input: IdentifyInput, random: Random): IdentifyInput {
	const kind = Math.floor(random() * 3);
	if (kind === 0) return { ...input, teeth: input.teeth + (random() < 0.5 ? 1 : -1) };
	const wrong = <R extends { value?: number | undefined; unit: string }>(reading: R): R => {
		const value = reading.value ?? NaN;
		if (kind === 1) return { ...reading, value: swapped(value, random) };
		return { ...reading, value: reading.unit === 'in' ? value * 25.4 : value / 25.4 };
	};
	const place = Math.floor(random() * 4);
	if (place === 0 && input.outsideDiameter) {
		return { ...input, outsideDiameter: wrong(input.outsideDiameter) };
	}
	if (place === 1 && input.wholeDepth) return { ...input, wholeDepth: wrong(input.wholeDepth) };
	return { ...input, spans: input.spans?.map((span, n) => (n === place - 2 ? wrong(span) : span)) };
}

test('of 1,000 with one gross error 99 % are right, or say which reading does not fit', () => {
	const random = randomOf(11);
	let right = 0;
	let flagged = 0;
	for (let n = 0; n < 1000; n++) {
		const gear = syntheticGear(random);
		const input = withGrossError(
			readingsOf(gear, ['outsideDiameter', 'wholeDepth', 'spans'], random),
			random
		);
		const { candidates, state } = identify(input);
		const [first] = candidates;
		const isFlagged =
			state === 'none-fits' || first?.teeth !== input.teeth || first.misfits.some((misfit) => misfit.flagged);
		if (isRight(gear, first)) right++;
		else if (isFlagged) flagged++;
	}
	console.log(`one gross error: right ${right / 10} %, flagged ${flagged / 10} %`);
	expect(right + flagged).toBeGreaterThanOrEqual(990);
	expect(right).toBeGreaterThan(900);
}, 120_000);

test('a wrong reading is flagged on the right gear, with how far it lies off', () => {
	const answer = identify({
		teeth: 24,
		prior: 'inch',
		outsideDiameter: { value: 4.327, unit: 'in', uncertainty: 0.001 },
		wholeDepth: { value: 0.375, unit: 'in', uncertainty: 0.002 },
		spans: [
			{ teeth: 3, value: 1.279, unit: 'in', uncertainty: 0.001 },
			// 1.771, with two digits the wrong way round.
			{ teeth: 4, value: 1.717, unit: 'in', uncertainty: 0.001 }
		]
	});
	const flags = answer.candidates[0]?.misfits.filter(({ flagged }) => flagged) ?? [];
	expect(flags).toHaveLength(1);
	expect(flags[0]).toMatchObject({ reading: 'spans', teeth: 4 });
	expect(flags[0]?.residual).toBeLessThan(-1);
});

test('cast wheels with cycloidal teeth end in "none fits" in 95 %', () => {
	const random = randomOf(3);
	let none = 0;
	const wheels = 300;
	for (let n = 0; n < wheels; n++) {
		if (identify(cycloidalReadings(random)).state === 'none-fits') none++;
	}
	console.log(`cycloidal: none fits in ${((100 * none) / wheels).toFixed(1)} %`);
	expect(none / wheels).toBeGreaterThanOrEqual(0.95);
}, 120_000);
