/** The involute of an angle as a line of the working: operating angle and backlash both go by it. */
import { tangent, toDegrees, toRadians } from './degrees';
import { SOURCES } from './sources';
import type { Recorder } from './working';

const NAMES = {
	1: "involute of the pinion's pressure angle",
	2: "involute of the wheel's pressure angle",
	w: 'involute of the operating pressure angle'
};

/** inv α = tan α - α, α in radians; the pinion's (1), the wheel's (2) or that on the operating pitch circle (w). */
export function involuteOf(angle: number, whose: keyof typeof NAMES, recorder: Recorder): number {
	const symbol = `α${whose}`;
	return recorder.step(
		{
			symbol: `inv${whose}`,
			name: NAMES[whose],
			expression: `tan(${symbol}) - π · ${symbol} / 180`,
			unit: '1',
			source: SOURCES.definition
		},
		{ [symbol]: toDegrees(angle) },
		(terms) => tangent(terms[symbol] ?? NaN) - toRadians(terms[symbol] ?? NaN)
	);
}
