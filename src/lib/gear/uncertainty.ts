/**
 * How far the readings' and the drive's uncertainties reach into the margin. First order: relative standard
 * uncertainties of face width, load and speed, independent of each other, add as squares.
 */
import type { Load, Uncertainty } from './contract';
import { SOURCES } from './sources';
import { unrecorded, type Recorder } from './working';

/** One-sided 95 % point of the normal distribution. */
const ONE_SIDED_95 = 1.645;

const source = SOURCES.propagation;

/**
 * Relative standard uncertainty u of the stress, and so of the margin. u² = uF² + uL² + (sn un)², where sn is what
 * a relative error in speed does to the stress: through the velocity factor (`share`), and, when the load is
 * given as power, through the force P/V as well, which falls as the speed rises (sn = share - 1).
 * Source: JCGM 100:2008 (GUM), 5.1.2. Range: small uncertainties, a few tens of per cent at most.
 * @example stressUncertainty({ faceWidth: 0.03, load: 0.04, speed: 0 }, { power: { value: 1, unit: 'W' } }, 0.5) // 0.05
 */
export function stressUncertainty(
	uncertainty: Uncertainty,
	load: Load,
	share: number,
	recorder: Recorder = unrecorded
): number {
	const byPower = load === 'unknown' || 'power' in load;
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
	return recorder.step(
		{
			symbol: 'u',
			name: 'relative standard uncertainty of the margin',
			expression: '√(uF² + uL² + (sn · un)²)',
			unit: '1',
			source
		},
		{ uF: uncertainty.faceWidth, uL: uncertainty.load, sn, un: uncertainty.speed },
		({ uF, uL, sn, un }) => Math.sqrt(uF * uF + uL * uL + (sn * un) ** 2)
	);
}

/**
 * Low end of the margin, 95 % one-sided. Ml = M (1 - 1.645 u), and 0 where u is so large that nothing is left:
 * no margin can be claimed then.
 * Source: JCGM 100:2008 (GUM), 5.1.2 and annex G, normal distribution.
 * @example lowEnd(2, 0.1) // 1.671
 */
export function lowEnd(margin: number, relative: number, recorder: Recorder = unrecorded): number {
	return recorder.step(
		{
			symbol: 'Ml',
			name: 'low end of the margin',
			expression: 'max(0, M · (1 - 1.645 · u))',
			unit: '1',
			source
		},
		{ M: margin, u: relative },
		({ M, u }) => Math.max(0, M * (1 - ONE_SIDED_95 * u))
	);
}
