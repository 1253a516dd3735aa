/**
 * Helical gears whose helix was read with a protractor, a degree off as a rule. The angle enters the diameter and every
 * span, so an answer that took it as exact would be sure of the wrong gear.
 */
import { describe, expect, test } from 'vitest';
import type { IdentifyInput } from '$lib/gear/identify/contract';
import { identify } from '$lib/gear/identify/identify';
import { Calibration } from './calibration';
import { randomOf, readingsOf, syntheticGear, type Reading } from './synthetic-gears';

const GEARS = 800;
const MINUTES = 60_000;

const normal = (random: () => number) =>
	Math.sqrt(-2 * Math.log(1 - random())) * Math.cos(2 * Math.PI * random());

/** Shares of the gears that must be right, and among the survivors. */
interface Least {
	right: number;
	surviving: number;
}

interface Visit {
	/** Of the helix as read; `told` is what the answer is told of it, undefined for the usual doubt. */
	doubt: number;
	told?: number;
}

function helicalGears(taken: readonly Reading[], { doubt, told }: Visit): Calibration & { clear: number } {
	const random = randomOf(1620);
	const calibration = Object.assign(new Calibration(), { clear: 0 });
	for (let n = 0; n < GEARS; n++) {
		const gear = syntheticGear(random, { helix: 10 + 20 * random() });
		const read = Math.round((gear.helix + doubt * normal(random)) * 10) / 10;
		const helixAngle: IdentifyInput['helixAngle'] = {
			value: read,
			...(told === undefined ? {} : { uncertainty: told })
		};
		const answer = identify({ ...readingsOf(gear, taken, random), helixAngle });
		calibration.add(gear, answer);
		if (answer.state === 'clear') calibration.clear++;
	}
	return calibration;
}

describe.each<[string, Reading[], Visit, Least]>([
	[
		'two spans, depth and diameter; the usual doubt of a degree',
		['outsideDiameter', 'wholeDepth', 'spans'],
		{ doubt: 1 },
		{ right: 0.965, surviving: 0.995 }
	],
	[
		'the same read to a third of a degree',
		['outsideDiameter', 'wholeDepth', 'spans'],
		{ doubt: 0.3, told: 0.3 },
		{ right: 0.97, surviving: 0.995 }
	],
	['diameter and one span', ['outsideDiameter', 'one-span'], { doubt: 1 }, { right: 0.78, surviving: 0.98 }],
	['diameter and depth', ['outsideDiameter', 'wholeDepth'], { doubt: 1 }, { right: 0.73, surviving: 0.98 }]
])('%s', (name, taken, visit, least) => {
	test(
		'probabilities mean what they say, and the true gear is among the survivors',
		() => {
			const told = helicalGears(taken, visit);
			const { claimed, right } = told.high;
			console.log(
				`helical, ${name}: right ${(100 * told.rate(told.right)).toFixed(1)} %, surviving ` +
					`${(100 * told.rate(told.surviving)).toFixed(1)} %, clear ${(100 * told.rate(told.clear)).toFixed(1)} %, ` +
					`calibration error ${told.error.toFixed(4)}; told at 0.9 or more ${told.high.told}: ` +
					`claimed ${claimed.toFixed(4)}, true ${right.toFixed(4)}`
			);
			expect(told.error).toBeLessThanOrEqual(0.03);
			expect(told.high.told).toBeGreaterThan(250);
			expect(Math.abs(claimed - right)).toBeLessThanOrEqual(0.03);
			expect(told.rate(told.surviving)).toBeGreaterThanOrEqual(least.surviving);
			expect(told.rate(told.right)).toBeGreaterThanOrEqual(least.right);
		},
		3 * MINUTES
	);
});
