/**
 * How far the readings' and the drive's uncertainties reach into the margin. First order: relative standard
 * uncertainties of face width, load and speed, independent of each other, add as squares; the bad end is taken where
 * that sum points to, so that a doubt in the load divides the margin and one in the face width takes from it.
 */
import type { Load, Uncertainty } from './contract';
import { SOURCES } from './sources';
import { unrecorded, type Recorder } from './working';

/** One-sided 95 % point of the normal distribution. */
const ONE_SIDED_95 = 1.645;

const source = SOURCES.propagation;

/** What a relative error in each quantity does to the stress: 1 for load and face width, `speed` for the speed. */
export interface MarginUncertainty {
	/** Relative standard uncertainty of the margin. */
	relative: number;
	/** What the bad end leaves of the margin: low end = `badEnd` x margin; from 0 (excluded) to 1. */
	badEnd: number;
}

/**
 * Relative standard uncertainty u of the margin, and the share of it that is left at its bad end, 95 % one-sided.
 * u² = uF² + uL² + (sn un)², where sn is what a relative error in speed does to the stress: through the velocity
 * factor (`share`), and, when the load is given as power, through the force P/V as well, which falls as the speed
 * rises (sn = share - 1). The bad end is the point at z = 1.645 standard uncertainties in the direction of steepest
 * fall: face width 1 - z uF²/u, load 1 + z uL²/u, speed 1 + z sn un²/u of their middles.
 * Source: JCGM 100:2008 (GUM), 5.1.2; the point of steepest fall: Hasofer and Lind (1974), first-order reliability
 * (from memory). Range: fractions up to 0.5; within 5 % of a Monte Carlo sample (tests).
 * @example marginUncertainty({ faceWidth: 0.03, load: 0.04, speed: 0 }, false, 0.5).relative // 0.05
 * @example marginUncertainty({ faceWidth: 0, load: 0.1, speed: 0 }, true, 0.5).badEnd // 0.858738
 */
export function marginUncertainty(
	uncertainty: Uncertainty,
	byPower: boolean,
	share: number,
	recorder: Recorder = unrecorded
): MarginUncertainty {
	const sn = recorder.step(
		{
			symbol: 'sn',
			name: 'share of a speed error that reaches the stress',
			expression: byPower ? 'sk - 1' : 'sk',
			unit: '1',
			source
		},
		{ sk: share },
		({ sk }) => (byPower ? sk - 1 : sk)
	);
	const { faceWidth: uF, load: uL, speed: un } = uncertainty;
	const relative = recorder.step(
		{
			symbol: 'u',
			name: 'relative standard uncertainty of the margin',
			expression: '√(uF² + uL² + (sn · un)²)',
			unit: '1',
			source
		},
		{ uF, uL, sn, un },
		({ uF, uL, sn, un }) => Math.sqrt(uF * uF + uL * uL + (sn * un) ** 2)
	);
	if (relative === 0) return { relative, badEnd: 1 };
	const badEnd = recorder.step(
		{
			symbol: 'ke',
			name: 'what the bad end leaves of the margin',
			expression: '(1 - z · uF² / u) / ((1 + z · uL² / u) · (1 + z · sn · un² / u)^sn)',
			unit: '1',
			source
		},
		{ z: ONE_SIDED_95, uF, uL, sn, un, u: relative },
		({ z, uF, uL, sn, un, u }) =>
			(1 - (z * uF * uF) / u) / ((1 + (z * uL * uL) / u) * (1 + (z * sn * un * un) / u) ** sn)
	);
	return { relative, badEnd };
}

/** Whether the load is a power, whose force falls as the speed rises; an unknown load is compared as a power. */
export function isPower(load: Load): boolean {
	return load === 'unknown' || 'power' in load;
}

/**
 * Low end of a margin, 95 % one-sided. Ml = ke M. Source: as of `marginUncertainty`.
 * @example lowEnd(2, 0.85) // 1.7
 */
export function lowEnd(margin: number, badEnd: number, recorder: Recorder = unrecorded): number {
	return recorder.step(
		{ symbol: 'Ml', name: 'low end of the margin', expression: 'ke · M', unit: '1', source },
		{ ke: badEnd, M: margin },
		({ ke, M }) => ke * M
	);
}
