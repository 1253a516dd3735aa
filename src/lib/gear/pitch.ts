/**
 * Pitch and reference diameter. Module, diametral pitch and circular pitch say the same thing in three ways;
 * the core works in modules (mm).
 */
import type { Pitch } from './contract';
import { toSI } from './quantity';
import { SOURCES } from './sources';
import { unrecorded, type Recorder } from './working';

const source = SOURCES.geometry;

const LINE = { symbol: 'm', name: 'module', unit: 'mm' };
const BY_DIAMETRAL = { ...LINE, expression: '25.4 / Pd', source };
const BY_CIRCULAR = { ...LINE, expression: 'p / π', source };

/**
 * Module m in mm. m = 25.4 / Pd (Pd in teeth per inch) or m = p / π (p in mm).
 * Source: definitions; Mott, Machine Elements in Mechanical Design, 4th ed., p. 319.
 * @example moduleOf({ system: 'diametral', value: 4 }) // 6.35
 * @example moduleOf({ system: 'circular', value: 0.75, unit: 'in' }) // 6.06380
 */
export function moduleOf(pitch: Pitch, recorder: Recorder = unrecorded): number {
	switch (pitch.system) {
		case 'module':
			return recorder.given(LINE, { value: pitch.value, unit: 'mm' });
		case 'diametral':
			return recorder.step(BY_DIAMETRAL, { Pd: pitch.value }, ({ Pd }) => 25.4 / Pd);
		case 'circular':
			return recorder.step(BY_CIRCULAR, { p: toSI(pitch) }, ({ p }) => p / Math.PI);
	}
}

/**
 * Diametral pitch Pd in teeth per inch from the module in mm. Pd = 25.4 / m.
 * Source: definition; Mott, Machine Elements in Mechanical Design, 4th ed., p. 319.
 * @example diametralPitchOf(6.35) // 4
 */
export function diametralPitchOf(module: number): number {
	return 25.4 / module;
}

/**
 * Circular pitch p in mm, along the reference circle. p = π m.
 * Source: definition; Bevan, The Theory of Machines, Ex. 10.1-10.3, p. 320: 4 Pd has 0.7854 in.
 * @example circularPitchOf(6.35) // 19.9491
 */
export function circularPitchOf(module: number): number {
	return Math.PI * module;
}

/**
 * Pitch (reference) diameter d in mm of a spur gear. d = m N.
 * Source: definition; Jindal, Machine Design, Ex. 25-1, p. 669.
 * @example pitchDiameter(5, 25) // 125
 */
export function pitchDiameter(module: number, teeth: number, recorder: Recorder = unrecorded): number {
	return recorder.step(
		{ symbol: 'd', name: 'pitch diameter', expression: 'm · N', unit: 'mm', source },
		{ m: module, N: teeth },
		({ m, N }) => m * N
	);
}
