/**
 * Spans over too many or too few teeth, whose jaws touch tips or roots instead of flanks: the true gear must not be
 * excluded by them, and what is told must still mean what it says.
 */
import { expect, test } from 'vitest';
import type { IdentifyInput } from '$lib/gear/identify/contract';
import { identify } from '$lib/gear/identify/identify';
import { Calibration } from './calibration';
import { held, reading } from './calliper';
import {
	randomOf,
	readingsOf,
	syntheticGear,
	truth,
	type Random,
	type SyntheticGear
} from './synthetic-gears';

const GEARS = 600;
const MINUTES = 60_000;

/** The readings of a usual visit, with both spans over `off` teeth more than they should be. */
function misplaced(gear: SyntheticGear, off: number, random: Random): IdentifyInput {
	const input = readingsOf(gear, ['outsideDiameter', 'wholeDepth', 'spans'], random);
	const spans = (input.spans ?? []).map((span) => {
		const per = span.unit === 'in' ? 25.4 : 1;
		const teeth = Math.max(2, span.teeth + off);
		// The tool's error of the usual reading goes with it.
		const error = (span.value ?? NaN) * per - truth(gear).span(span.teeth);
		const value = (reading(gear, held(teeth, random)) + error) / per;
		return { ...span, teeth, value };
	});
	// Two spans that became the same one are one.
	return { ...input, spans: spans[0]?.teeth === spans[1]?.teeth ? spans.slice(1) : spans };
}

function visit(off: number): Calibration {
	const random = randomOf(77);
	const calibration = new Calibration();
	for (let n = 0; n < GEARS; n++) {
		const gear = syntheticGear(random);
		// The jaws cannot be put across more than half of the teeth.
		if (truth(gear).spanTeeth + 1 + off >= gear.teeth / 2) continue;
		calibration.add(gear, identify(misplaced(gear, off, random)));
	}
	return calibration;
}

test('the drawn tooth gives the formula’s span where the jaws find flanks', () => {
	const random = randomOf(9);
	for (let n = 0; n < 200; n++) {
		const gear = syntheticGear(random, { tipLoss: 0, shift: 0 });
		const { span, spanTeeth } = truth(gear);
		const square = reading(gear, { k: spanTeeth, askew: 0, aboveRoot: 0.3 });
		expect(Math.abs(square - span(spanTeeth)) / gear.module).toBeLessThan(0.002);
	}
});

/**
 * Two teeth too many leave the jaws plainly on corners, where cycloidal wheels read alike: there "none fits" may come
 * first, with the flags that say look again.
 */
test.each([
	[-4, 0.98, 0.03, 0.03],
	[-3, 0.98, 0.03, 0.03],
	[-2, 0.985, 0.03, 0.03],
	[-1, 0.985, 0.03, 0.03],
	[0, 0.995, 0.03, 0.03],
	[1, 0.98, 0.03, 0.03],
	[2, 0.95, 0.03, 0.03],
	[3, 0.94, 0.06, 0.05]
])(
	'spans over %d teeth more than they should be',
	(off, surviving, error, gap) => {
		const told = visit(off);
		const { claimed, right } = told.high;
		console.log(
			`spans ${off} off, of ${told.answers}: right ${(100 * told.rate(told.right)).toFixed(1)} %, surviving ` +
				`${(100 * told.rate(told.surviving)).toFixed(1)} %, calibration error ${told.error.toFixed(4)}; ` +
				`told at 0.9 or more ${told.high.told}: claimed ${claimed.toFixed(4)}, true ${right.toFixed(4)}`
		);
		expect(told.answers).toBeGreaterThan(500);
		expect(told.rate(told.surviving)).toBeGreaterThanOrEqual(surviving);
		expect(told.rate(told.right)).toBeGreaterThan(0.8);
		expect(told.error).toBeLessThanOrEqual(error);
		expect(told.high.told).toBeGreaterThan(150);
		expect(Math.abs(claimed - right)).toBeLessThanOrEqual(gap);
	},
	3 * MINUTES
);
