/** The next reading: how many more it takes to be clear, beside a fixed order of readings, on the same gears. */
import { describe, expect, test } from 'vitest';
import type { IdentifyInput, NextReading } from '$lib/gear/identify/contract';
import { identify } from '$lib/gear/identify/identify';
import {
	randomOf,
	readingsOf,
	syntheticGear,
	truth,
	type Random,
	type SyntheticGear
} from './synthetic-gears';

const NEVER = 9;

/** A person takes the reading that was asked for, with a calliper's or a rule's error. */
function taken(
	input: IdentifyInput,
	{ what, spanTeeth = 2 }: Pick<NextReading, 'what' | 'spanTeeth'>,
	gear: SyntheticGear,
	random: Random
): IdentifyInput {
	const unit = input.outsideDiameter?.unit === 'in' ? 'in' : 'mm';
	const per = unit === 'in' ? 25.4 : 1;
	const read = (millimetres: number, sigma: number) => {
		const normal = Math.sqrt(-2 * Math.log(1 - random())) * Math.cos(2 * Math.PI * random());
		return {
			value: (millimetres + sigma * normal) / per,
			unit: unit as 'in' | 'mm',
			uncertainty: sigma / per
		};
	};
	const { module, angle, shift, thinned } = gear;
	const { span, depth, root } = truth(gear);
	switch (what) {
		case 'spans':
			return {
				...input,
				spans: [...(input.spans ?? []), { teeth: spanTeeth, ...read(span(spanTeeth), 0.025) }]
			};
		case 'wholeDepth':
			return { ...input, wholeDepth: read(depth, 0.05) };
		case 'rootDiameter':
			return { ...input, rootDiameter: read(root, 0.05) };
		case 'circularPitch':
			return { ...input, circularPitch: read(Math.PI * module, 0.25) };
		case 'chordalThickness': {
			const arc = module * (Math.PI / 2 + 2 * shift * Math.tan((angle * Math.PI) / 180) - thinned);
			return { ...input, chordalThickness: read(arc, 0.025) };
		}
		default:
			return { ...input, cannotMeasure: [...(input.cannotMeasure ?? []), what] };
	}
}

test('from teeth and outside diameter: at most two further readings as a rule, fewer than in a fixed order', () => {
	const random = randomOf(5);
	const asked: number[] = [];
	const fixed: number[] = [];
	for (let n = 0; n < 300; n++) {
		const gear = syntheticGear(random);
		const start = {
			...readingsOf(gear, ['outsideDiameter'], random),
			cannotMeasure: ['overPins', 'centreDistance'] as IdentifyInput['cannotMeasure']
		};

		let input: IdentifyInput = start;
		let readings = 0;
		let answer = identify(input);
		while (answer.state !== 'clear' && answer.nextReading && readings < NEVER) {
			input = taken(input, answer.nextReading, gear, random);
			readings++;
			answer = identify(input);
		}
		asked.push(answer.state === 'clear' ? readings : NEVER);

		const k = truth(gear).spanTeeth;
		const order = [
			{ what: 'wholeDepth' },
			{ what: 'rootDiameter' },
			{ what: 'spans', spanTeeth: k },
			{ what: 'spans', spanTeeth: k + 1 },
			{ what: 'circularPitch' }
		] as const;
		input = start;
		let clear = identify(input).state === 'clear';
		let used = 0;
		for (const next of order) {
			if (clear) break;
			input = taken(input, next, gear, random);
			used++;
			clear = identify(input).state === 'clear';
		}
		fixed.push(clear ? used : NEVER);
	}
	const median = (of: number[]) => [...of].sort((a, b) => a - b)[of.length >> 1] ?? NaN;
	const mean = (of: number[]) => of.reduce((sum, one) => sum + one, 0) / of.length;
	console.log(
		`further readings to be clear: median ${median(asked)}, mean ${mean(asked).toFixed(2)}; ` +
			`in a fixed order median ${median(fixed)}, mean ${mean(fixed).toFixed(2)}`
	);
	expect(median(asked)).toBeLessThanOrEqual(2);
	expect(mean(asked)).toBeLessThan(mean(fixed));
	expect(asked.filter((count) => count === NEVER).length).toBeLessThan(0.1 * asked.length);
}, 180_000);

describe('what is asked for', () => {
	const start: IdentifyInput = {
		teeth: 30,
		prior: 'inch',
		outsideDiameter: { value: 4.995, unit: 'in', uncertainty: 0.001 }
	};

	test('spans first, over the recommended teeth, with what each candidate would show in the unit in use', () => {
		const { nextReading, candidates } = identify(start);
		expect(nextReading).toMatchObject({ what: 'spans' });
		expect([3, 4]).toContain(nextReading?.spanTeeth);
		const [first, second] = nextReading?.expected ?? [];
		expect(first).toMatchObject({ candidate: 0, unit: 'in' });
		expect(second?.value).not.toBeCloseTo(first?.value ?? NaN, 3);
		expect(candidates[second?.candidate ?? NaN]).toBeDefined();
	});

	test('never what cannot be measured, and never what was taken', () => {
		const all: IdentifyInput = { ...start, cannotMeasure: ['spans', 'overPins', 'chordalThickness'] };
		const asked: string[] = [];
		let input = all;
		for (let n = 0; n < 8; n++) {
			const { nextReading } = identify(input);
			if (!nextReading) break;
			expect(asked).not.toContain(nextReading.what);
			expect(all.cannotMeasure).not.toContain(nextReading.what);
			asked.push(nextReading.what);
			input = { ...input, cannotMeasure: [...(input.cannotMeasure ?? []), nextReading.what] };
		}
		expect(asked.length).toBeGreaterThan(0);
	});

	test('the second span is the neighbour of the first', () => {
		const { nextReading } = identify({
			...start,
			spans: [{ teeth: 4, value: 1.67, unit: 'in', uncertainty: 0.001 }]
		});
		if (nextReading?.what === 'spans') expect([3, 5]).toContain(nextReading.spanTeeth);
	});

	test('the centre distance only where the mate’s teeth are known', () => {
		const onlyThat: IdentifyInput['cannotMeasure'] = [
			'spans',
			'overPins',
			'chordalThickness',
			'rootDiameter',
			'wholeDepth',
			'circularPitch'
		];
		expect(identify({ ...start, cannotMeasure: onlyThat }).nextReading).toBeNull();
	});
});
