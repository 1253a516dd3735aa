/**
 * Bending of the tooth by Lewis with Barth's velocity factor, forwards (stress and margin under a load) and
 * backwards (the load at which the margin is the plant's). Lengths in mm, forces in N, stresses in MPa.
 */
import { SOURCES } from './sources';
import { unrecorded, type Recorder } from './working';

const source = SOURCES.lewis;

/** The tooth as the Lewis formula takes it: face width in mm, module in mm, form factor, velocity factor. */
export interface LewisTooth {
	faceWidth: number;
	module: number;
	formFactor: number;
	velocityFactor: number;
}

/**
 * Bending stress S in MPa under the design force Wd (service factor in). S = Kv Wd / (F m Y).
 * Range: that of the form factor and of the velocity law.
 * Source: Shigley, Mechanical Engineering Design, 8th ed., ch. 14 (edition from memory).
 * @example lewisBendingStress(16110, { faceWidth: 60, module: 5, formFactor: 0.358, velocityFactor: 1 }) // 150
 */
export function lewisBendingStress(
	force: number,
	tooth: LewisTooth,
	recorder: Recorder = unrecorded
): number {
	return recorder.step(
		{
			symbol: 'S',
			name: 'bending stress, velocity and service factors in',
			expression: 'Kv · Wd / (F · m · Y)',
			unit: 'MPa',
			source
		},
		{ Kv: tooth.velocityFactor, Wd: force, F: tooth.faceWidth, m: tooth.module, Y: tooth.formFactor },
		({ Kv, Wd, F, m, Y }) => (Kv * Wd) / (F * m * Y)
	);
}

/**
 * Allowable bending stress Sb in MPa of a tooth that is loaded on both flanks. Sb = Kr Sa.
 * Source: the plant's reversing factor; 0.7 is common practice.
 * @example reversingAllowable(100, 0.7) // 70
 */
export function reversingAllowable(
	allowable: number,
	factor: number,
	recorder: Recorder = unrecorded
): number {
	return recorder.step(
		{
			symbol: 'Sb',
			name: 'allowable bending stress, reversing',
			expression: 'Kr · Sa',
			unit: 'MPa',
			source: SOURCES.plantRule
		},
		{ Kr: factor, Sa: allowable },
		({ Kr, Sa }) => Kr * Sa
	);
}

/**
 * Margin M: how many times over the tooth carries the design load. M = Sb / S.
 * Source: definition; Wentzell, Machine Design, Ex. 12.6, p. 266 (there a factor of 2).
 * @example bendingMargin(150, 75) // 2
 */
export function bendingMargin(allowable: number, stress: number, recorder: Recorder = unrecorded): number {
	return recorder.step(
		{ symbol: 'M', name: 'margin in bending', expression: 'Sb / S', unit: '1', source },
		{ Sb: allowable, S: stress },
		({ Sb, S }) => Sb / S
	);
}

/**
 * Dynamic force WL in N (velocity and service factors in) that brings the tooth to its allowable stress.
 * WL = Sb F m Y. Source: the Lewis formula solved for the force; Wentzell, Machine Design, Ex. 12.3, p. 258.
 * @example lewisBeamStrength(150, { faceWidth: 60, module: 5, formFactor: 0.358 }) // 16110
 */
export function lewisBeamStrength(
	allowable: number,
	tooth: Omit<LewisTooth, 'velocityFactor'>,
	recorder: Recorder = unrecorded
): number {
	return recorder.step(
		{
			symbol: 'WL',
			name: 'dynamic force that the tooth bears in bending',
			expression: 'Sb · F · m · Y',
			unit: 'N',
			source
		},
		{ Sb: allowable, F: tooth.faceWidth, m: tooth.module, Y: tooth.formFactor },
		({ Sb, F, m, Y }) => Sb * F * m * Y
	);
}

/**
 * Tangential force Wp in N that the drive may put on the teeth at the plant's margin: velocity factor Kv, service
 * factor Ko and the needed margin taken off. Wp = Wb / (Mn Ko Kv), Wb the dynamic force that the answer that decides bears.
 * Source: Wentzell, Machine Design, Ex. 12.5, p. 263.
 * @example permittedForce(16110, { needed: 2, serviceFactor: 1.5, velocityFactor: 1 }) // 5370
 */
export function permittedForce(
	strength: number,
	{
		needed,
		serviceFactor,
		velocityFactor
	}: { needed: number; serviceFactor: number; velocityFactor: number },
	recorder: Recorder = unrecorded
): number {
	return recorder.step(
		{
			symbol: 'Wp',
			name: "tangential force at the plant's margin",
			expression: 'Wb / (Mn · Ko · Kv)',
			unit: 'N',
			source
		},
		{ Wb: strength, Mn: needed, Ko: serviceFactor, Kv: velocityFactor },
		({ Wb, Mn, Ko, Kv }) => Wb / (Mn * Ko * Kv)
	);
}

/**
 * Power Pp in W that a force in N carries at a velocity in m/s. Pp = Wp V. Source: mechanics.
 * @example permittedPowerOf(500, 4) // 2000
 */
export function permittedPowerOf(force: number, velocity: number, recorder: Recorder = unrecorded): number {
	return recorder.step(
		{
			symbol: 'Pp',
			name: "power at the plant's margin and this speed",
			expression: 'Wp · V',
			unit: 'W',
			source: SOURCES.mechanics
		},
		{ Wp: force, V: velocity },
		({ Wp, V }) => Wp * V
	);
}

/**
 * Torque Tp in N·m that a force in N makes on a pitch diameter in mm. Tp = Wp d / 2000. Source: mechanics.
 * @example permittedTorqueOf(1000, 200) // 100
 */
export function permittedTorqueOf(force: number, diameter: number, recorder: Recorder = unrecorded): number {
	return recorder.step(
		{
			symbol: 'Tp',
			name: "torque at the plant's margin and this speed",
			expression: 'Wp · d / 2000',
			unit: 'N·m',
			source: SOURCES.mechanics
		},
		{ Wp: force, d: diameter },
		({ Wp, d }) => (Wp * d) / 2000
	);
}
