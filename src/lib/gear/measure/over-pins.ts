/**
 * Measurement over two pins in opposite spaces (nearly opposite, for an odd count) of an external spur gear. Lengths
 * in mm, angles in radians.
 */
import { inverseInvolute, involute } from '../involute';
import { SOURCES } from '../sources';
import { unrecorded, type Recorder } from '../working';

export interface PinGear {
	teeth: number;
	module: number;
	pressureAngle: number;
	/** Arc thickness on the reference circle, mm; `nominalThickness` for teeth that are not thinned. */
	thickness: number;
}

/**
 * Pin diameter in mm that touches near the middle of the flanks: 1.728 m.
 * Source: Machinery's Handbook, Van Keuren wires (from memory).
 * @example usualPin(25.4) // 43.8912
 */
export function usualPin(module: number): number {
	return 1.728 * module;
}

/**
 * Measurement M over two pins in mm. inv αM = s / d + inv α + dp / (d cos α) - π / N; M = d cos α / cos αM + dp, and
 * the first term times cos(90° / N) for an odd count.
 * Range: pins that rest on the flanks. One so thin that it would sink to the base circle is taken to lie on it, which is
 * the least that could be read.
 * Source: Machinery's Handbook, checking gear size by measurement over wires (from memory).
 * @example overPins({ teeth: 30, module: 1, pressureAngle: Math.PI / 9, thickness: Math.PI / 2 }, 1.728) // 32.4102
 */
export function overPins(gear: PinGear, pin: number, recorder: Recorder = unrecorded): number {
	const { teeth, module, pressureAngle, thickness } = gear;
	const d = module * teeth;
	const base = d * Math.cos(pressureAngle);
	const centre = inverseInvolute(thickness / d + involute(pressureAngle) + pin / base - Math.PI / teeth);
	return recorder.step(
		{
			symbol: 'M',
			name: 'measurement over two pins',
			expression: 'db / cos(αM) · co + dp',
			unit: 'mm',
			source: SOURCES.overPins
		},
		{ db: base, αM: (centre * 180) / Math.PI, co: chordOf(teeth), dp: pin },
		({ db, co, dp }) => (db / Math.cos(centre)) * co + dp
	);
}

/**
 * Arc thickness s in mm on the reference circle from a measurement over two pins: `overPins` solved for s. Null where
 * the pins would lie inside the base circle.
 * @example thicknessFromPins(32.4102, { teeth: 30, module: 1, pressureAngle: Math.PI / 9 }, 1.728) // 1.5708
 */
export function thicknessFromPins(
	over: number,
	{ teeth, module, pressureAngle }: Omit<PinGear, 'thickness'>,
	pin: number
): number | null {
	const d = module * teeth;
	const base = d * Math.cos(pressureAngle);
	const cosine = (base * chordOf(teeth)) / (over - pin);
	if (!(cosine > 0 && cosine <= 1)) return null;
	const centre = involute(Math.acos(cosine));
	return d * (centre - involute(pressureAngle) - pin / base + Math.PI / teeth);
}

/** Opposite spaces of an odd count stand half a pitch apart. */
function chordOf(teeth: number): number {
	return teeth % 2 === 0 ? 1 : Math.cos(Math.PI / (2 * teeth));
}
