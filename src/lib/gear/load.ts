/**
 * The force that the drive puts on the teeth, along the pitch line. The service factor enters here, once.
 * Power needs the velocity, torque the diameter; a load that is not known gives no force.
 */
import type { Load } from './contract';
import { toSI } from './quantity';
import { SOURCES } from './sources';
import { unrecorded, type Recorder } from './working';

const line = { symbol: 'Wt', name: 'tangential force', unit: 'N', source: SOURCES.mechanics };
const BY_TORQUE = { ...line, expression: '2000 · T / d' };
const BY_POWER = { ...line, expression: 'P / V' };

/**
 * Tangential force Wt in N; null where the load is unknown, or the velocity of a power or the diameter of a torque is.
 * Wt = P / V (W, m/s), Wt = 2000 T / d (N·m, mm), or as given.
 * Source: mechanics; Wentzell, Machine Design, Ex. 12.1, p. 254 and Ex. 12.6, p. 266.
 * @example tangentialForce({ torque: { value: 100, unit: 'N*m' } }, 200, null) // 1000
 * @example tangentialForce({ power: { value: 2, unit: 'kW' } }, 200, 4) // 500
 */
export function tangentialForce(
	load: Load,
	diameter: number | null,
	velocity: number | null,
	recorder: Recorder = unrecorded
): number | null {
	if (load === 'unknown') return null;
	if ('tangentialForce' in load) {
		return recorder.given({ symbol: 'Wt', name: 'tangential force', unit: 'N' }, load.tangentialForce);
	}
	if ('torque' in load) {
		if (diameter === null) return null;
		const torque = recorder.given({ symbol: 'T', name: 'torque on this gear', unit: 'N·m' }, load.torque);
		return recorder.step(BY_TORQUE, { T: torque, d: diameter }, ({ T, d }) => (2000 * T) / d);
	}
	if (velocity === null) return null;
	const power = recorder.given({ symbol: 'P', name: 'power through this gear', unit: 'W' }, load.power);
	return recorder.step(BY_POWER, { P: power, V: velocity }, ({ P, V }) => P / V);
}

/**
 * Design force Wd in N, the tangential force times the service factor. Wd = Ko Wt.
 * Source: Jindal, Machine Design, Ex. 25-3, p. 670.
 * @example designForce(1000, 1.25) // 1250
 */
export function designForce(force: number, serviceFactor: number, recorder: Recorder = unrecorded): number {
	return recorder.step(
		{ symbol: 'Wd', name: 'design force', expression: 'Ko · Wt', unit: 'N', source: SOURCES.mechanics },
		{ Ko: serviceFactor, Wt: force },
		({ Ko, Wt }) => Ko * Wt
	);
}

/**
 * Power P in W that the drive takes at a speed n in rpm; null where the load is unknown, is a bare force, or its
 * torque has no speed. P as given, or P = π n T / 30 (N·m, rpm).
 * Source: mechanics (definition of power).
 * @example drivePower({ torque: { value: 100, unit: 'N*m' } }, 300) // 3141.592654
 * @example drivePower({ power: { value: 2, unit: 'kW' } }, null) // 2000
 */
export function drivePower(load: Load, speed: number | null): number | null {
	if (load === 'unknown' || 'tangentialForce' in load) return null;
	if ('power' in load) return toSI(load.power);
	return speed === null ? null : (Math.PI * speed * toSI(load.torque)) / 30;
}
