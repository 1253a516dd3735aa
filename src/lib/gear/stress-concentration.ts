/**
 * Stress concentration at the fillet, for information only: no stress and no verdict of this core contains it.
 */
import { SOURCES } from './sources';
import { unrecorded, type Recorder } from './working';
import type { WeakestSection } from './form-factor-geometry';

/**
 * Dolan and Broghamer's factor Kf at the weakest section; the pressure angle φ in radians, lengths in modules.
 * Kf = H + (t / rf)^L (t / h)^M, H = 0.331 - 0.436 φ, L = 0.324 - 0.492 φ, M = 0.261 + 0.545 φ, and the fillet's
 * least radius rf = rho + (b - rho)² / (d / 2 + b - rho). Null for a sharp fillet of a rack, which has no radius.
 * Range: 14.5 to 25 degrees. Source: Dolan and Broghamer (1942) in AGMA 908-B89 (from memory).
 */
export function stressConcentration(
	{ thickness, height, teeth, rack, profileShift }: WeakestSection,
	pressureAngle: number,
	recorder: Recorder = unrecorded
): number | null {
	const below = rack.dedendum - rack.tipRadius - profileShift;
	const curve = teeth === Infinity ? 0 : (below * below) / (teeth / 2 + below);
	if (!(rack.tipRadius + curve > 0)) return null;
	const filletRadius = recorder.step(
		{
			symbol: 'rf',
			name: 'least radius of the fillet, in modules',
			expression: teeth === Infinity ? 'ρ' : 'ρ + (hf - ρ - x)² / (N / 2 + hf - ρ - x)',
			unit: '1',
			source: SOURCES.stressConcentration
		},
		{ ρ: rack.tipRadius, hf: rack.dedendum, x: profileShift, N: teeth },
		({ ρ }) => ρ + curve
	);
	return recorder.step(
		{
			symbol: 'Kf',
			name: 'stress concentration at the fillet, for information',
			expression: '0.331 - 0.436 · φ + (tc / rf)^(0.324 - 0.492 · φ) · (tc / hc)^(0.261 + 0.545 · φ)',
			unit: '1',
			source: SOURCES.stressConcentration
		},
		{ φ: pressureAngle, tc: thickness, rf: filletRadius, hc: height },
		({ φ, tc, rf, hc }) =>
			0.331 - 0.436 * φ + (tc / rf) ** (0.324 - 0.492 * φ) * (tc / hc) ** (0.261 + 0.545 * φ)
	);
}
