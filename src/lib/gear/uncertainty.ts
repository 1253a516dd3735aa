/**
 * How far the readings' and the drive's uncertainties reach into the margin. Relative standard uncertainties of face width,
 * load and speed, independent of each other; the bad end is taken at the likeliest of the points that leave one margin in
 * twenty below them, so that a doubt in the load divides the margin and one in the face width takes from it.
 */
import type { Load, Uncertainty } from './contract';
import { SOURCES } from './sources';
import { unrecorded, type Recorder } from './working';

/** One-sided 95 % point of the normal distribution. */
const ONE_SIDED_95 = 1.645;

const source = SOURCES.propagation;

/** What the doubts may be at most for the low end to be within 5 % of a Monte Carlo sample (tests). */
export const MOST_UNCERTAIN: Readonly<Uncertainty> = { faceWidth: 0.5, load: 0.5, speed: 0.15 };

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
 * rises (sn = share - 1). The bad end is the least margin at z = 1.645 standard uncertainties in all: face width
 * 1 - zF uF, load 1 + zL uL, speed 1 + zn un of their middles, zF² + zL² + zn² = z².
 * Source: JCGM 100:2008 (GUM), 5.1.2; the least margin at a distance z: Hasofer and Lind (1974), first-order reliability
 * (from memory). Range: `MOST_UNCERTAIN`; there within 5 % of a Monte Carlo sample (tests).
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
	const point = worstPoint({ uF, uL, un }, sn);
	for (const { symbol, name } of POINT) {
		recorder.step({ ...READ, symbol, name }, point, () => point[symbol]);
	}
	const badEnd = recorder.step(
		{
			symbol: 'ke',
			name: 'what the bad end leaves of the margin',
			expression: '(1 - zF · uF) / ((1 + zL · uL) · (1 + zn · un)^sn)',
			unit: '1',
			source: SOURCES.reliability
		},
		{ ...point, uF, uL, sn, un },
		({ zF, zL, zn, uF, uL, sn, un }) => (1 - zF * uF) / ((1 + zL * uL) * (1 + zn * un) ** sn)
	);
	return { relative, badEnd };
}

/** Where the bad end lies, in standard uncertainties of each: face width below, load above, speed off its middle. */
interface Point extends Record<string, number> {
	zF: number;
	zL: number;
	zn: number;
}

const READ = { expression: 'from the point of the least margin', unit: '1', source: SOURCES.reliability };
const POINT = [
	{ symbol: 'zF', name: 'face width at the bad end, standard uncertainties below' },
	{ symbol: 'zL', name: 'load at the bad end, standard uncertainties above' },
	{ symbol: 'zn', name: 'speed at the bad end, standard uncertainties off' }
] as const;

interface Doubt {
	uF: number;
	uL: number;
	un: number;
}

/**
 * The least margin at the distance z. For a given zn what remains of z is face width over load, whose worst point is
 * known. At the worst point of all, z points along the steepest fall of ln(margin): each step takes the fall where it
 * stands as the next direction, and a few steps settle it, since the falls change little from point to point.
 */
function worstPoint(doubt: Doubt, sn: number): Point {
	const { uF, un } = doubt;
	const sense = Math.sign(sn);
	let along = 0;
	for (let step = 0; step < MOST_STEPS; step++) {
		const { size, zF } = faceOverLoad(doubt, along);
		const fall = (Math.abs(sn) * un) / (1 + sense * along * un);
		const rest = size / (1 - zF * uF);
		if (fall === 0) break;
		const next = (ONE_SIDED_95 * fall) / Math.sqrt(fall * fall + rest * rest);
		const settled = Math.abs(next - along) < SETTLED;
		along = next;
		if (settled) break;
	}
	const { zF, zL } = faceOverLoad(doubt, along);
	return { zF, zL, zn: sense * along };
}

/** At its least the margin hardly changes with the point: what is left of a step is not seen in ten digits of it. */
const SETTLED = 1e-6;
const MOST_STEPS = 20;

/** The least of (1 - zF uF) / (1 + zL uL) where zF² + zL² = z² - zn²: a line through the origin that touches the circle. */
function faceOverLoad({ uF, uL }: Doubt, zn: number): { size: number; zF: number; zL: number } {
	const radius = Math.sqrt(Math.max(0, ONE_SIDED_95 ** 2 - zn * zn));
	const [face, load] = [1 - (radius * uF) ** 2, 1 - (radius * uL) ** 2];
	const ratio = (1 - Math.sqrt(1 - face * load)) / load;
	const size = Math.sqrt(uF ** 2 + (ratio * uL) ** 2);
	if (size === 0) return { size, zF: 0, zL: 0 };
	return { size, zF: (radius * uF) / size, zL: (radius * ratio * uL) / size };
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
