/** Buckingham's limit load for wear. Lengths in mm, forces in N, stresses and moduli in MPa, angles in radians. */
import { SOURCES } from './sources';
import { unrecorded, type Recorder } from './working';

/** Mean Brinell hardness of the pair for which Buckingham's table of K stands. */
export const BRINELL_RANGE = { from: 150, to: 400 } as const;

const source = SOURCES.buckingham;

/**
 * Surface strength S in MPa of a pair by the mean of its Brinell hardnesses. S = 2.76 HB - 70 (400 HB - 10,000 psi).
 * Range: mean Brinell 150 to 400, both members of metal.
 * Source: Buckingham, Analytical Mechanics of Gears; Shigley, sec. 6-16 (editions from memory).
 * @example buckinghamSurfaceStrength(200, 300) // 620
 */
export function buckinghamSurfaceStrength(
	one: number,
	other: number,
	recorder: Recorder = unrecorded
): number {
	return recorder.step(
		{
			symbol: 'Sh',
			name: 'surface strength by the mean hardness of the pair',
			expression: '2.76 · (H1 + H2) / 2 - 70',
			unit: 'MPa',
			source
		},
		{ H1: one, H2: other },
		({ H1, H2 }) => (2.76 * (H1 + H2)) / 2 - 70
	);
}

/**
 * Ratio factor Q. Q = 2 N2 / (N1 + N2) with N2 the wheel's teeth; 2 N2 / (N2 - N1) for an internal wheel; 2 on a rack.
 * Source: Buckingham, Analytical Mechanics of Gears (edition from memory); Wentzell, Machine Design, Ex. 12.8, p. 272
 * (24 and 42 teeth: 1.2727).
 * @example buckinghamRatioFactor(24, 42, false) // 1.2727
 * @example buckinghamRatioFactor(20, 60, true) // 3
 */
export function buckinghamRatioFactor(
	pinion: number,
	wheel: number | null,
	internal: boolean,
	recorder: Recorder = unrecorded
): number {
	const head = { symbol: 'Q', name: 'ratio factor', unit: '1', source };
	if (wheel === null) return recorder.step({ ...head, expression: '2' }, {}, () => 2);
	return recorder.step(
		{ ...head, expression: internal ? '2 · N2 / (N2 - N1)' : '2 · N2 / (N1 + N2)' },
		{ N1: pinion, N2: wheel },
		({ N1, N2 }) => (2 * N2) / (internal ? N2 - N1 : N1 + N2)
	);
}

/**
 * Load-stress factor K in MPa, stated with the moduli it holds for. K = S² sin α / 1.4 (1 / E1 + 1 / E2).
 * Source: Buckingham, Analytical Mechanics of Gears; Shigley, sec. 6-16 (editions from memory).
 * @example buckinghamLoadStressFactor(620, Math.PI / 9, 207000, 207000) // 0.907333
 */
export function buckinghamLoadStressFactor(
	strength: number,
	angle: number,
	one: number,
	other: number,
	recorder: Recorder = unrecorded
): number {
	return recorder.step(
		{
			symbol: 'K',
			name: 'load-stress factor for these moduli',
			expression: 'Sh² · sin(α) / 1.4 · (1 / E1 + 1 / E2)',
			unit: 'MPa',
			source
		},
		{ Sh: strength, α: (angle * 180) / Math.PI, E1: one, E2: other },
		({ Sh, E1, E2 }) => ((Sh * Sh * Math.sin(angle)) / 1.4) * (1 / E1 + 1 / E2)
	);
}

/**
 * Limit load for wear Fw in N, to be set against the dynamic force. Fw = d F Q K, d the pinion's pitch diameter;
 * helical: over cos² β, with the normal angle in K.
 * Source: Buckingham, Analytical Mechanics of Gears; Shigley, sec. 6-16 (editions from memory); helical: Khurmi and
 * Gupta, A Textbook of Machine Design, helical gears, 15 kW at 10,000 rpm (edition from memory).
 * @example buckinghamWearLoad({ pinion: 60, faceWidth: 40, ratioFactor: 1.5, loadStress: 0.5, helixAngle: 0 }) // 1800
 */
export function buckinghamWearLoad(
	wear: { pinion: number; faceWidth: number; ratioFactor: number; loadStress: number; helixAngle: number },
	recorder: Recorder = unrecorded
): number {
	const { helixAngle } = wear;
	return recorder.step(
		{
			symbol: 'Fw',
			name: 'limit load for wear',
			expression: helixAngle === 0 ? 'd1 · F · Q · K' : 'd1 · F · Q · K / cos(β)²',
			unit: 'N',
			source
		},
		{
			d1: wear.pinion,
			F: wear.faceWidth,
			Q: wear.ratioFactor,
			K: wear.loadStress,
			β: (helixAngle * 180) / Math.PI
		},
		({ d1, F, Q, K }) => (d1 * F * Q * K) / Math.cos(helixAngle) ** 2
	);
}
