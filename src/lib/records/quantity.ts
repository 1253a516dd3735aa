/**
 * Quantities as they are typed, with their unit: the zod twin of the core's `Quantity`. NaN, infinities, zero and
 * negative sizes are refused, and so is what no gear or drive has; each message names the field and the remedy.
 */
import { z } from 'zod';
import {
	FORCE_UNITS,
	LENGTH_UNITS,
	POWER_UNITS,
	SPEED_UNITS,
	STRESS_UNITS,
	toSI,
	TORQUE_UNITS,
	VELOCITY_UNITS,
	type Unit
} from '$lib/gear/quantity';
import { fields, must, oneOf } from './plain-words';

interface Bounds {
	/** In the core's own unit, with the words for people. */
	from: [number, string];
	to: [number, string];
}

function quantity<const Units extends readonly [Unit, ...Unit[]]>(
	name: string,
	units: Units,
	bounds: Bounds
) {
	const range = `between ${bounds.from[1]} and ${bounds.to[1]}`;
	return z
		.strictObject(
			{
				value: z.number(must(name, `a number ${range}`)),
				unit: z.enum(units, oneOf(`Unit of ${lower(name)}`, units))
			},
			fields(name, ['value', 'unit'])
		)
		.superRefine((typed, context) => {
			const size = toSI({ value: typed.value, unit: typed.unit });
			if (size >= bounds.from[0] && size <= bounds.to[0]) return;
			context.addIssue({ code: 'custom', path: ['value'], message: `${name} must be ${range}.` });
		});
}

function lower(name: string): string {
	return name.charAt(0).toLowerCase() + name.slice(1);
}

export const length = (name: string) =>
	quantity(name, LENGTH_UNITS, { from: [0.1, '0.1 mm'], to: [20_000, '20 m'] });

export const speed = (name: string) =>
	quantity(name, SPEED_UNITS, { from: [0.001, '0.001 rpm'], to: [200_000, '200,000 rpm'] });

export const velocity = (name: string) =>
	quantity(name, VELOCITY_UNITS, { from: [1e-6, '0.000001 m/s'], to: [500, '500 m/s'] });

export const power = (name: string) =>
	quantity(name, POWER_UNITS, { from: [0.001, '0.001 W'], to: [1e9, '1,000,000 kW'] });

export const torque = (name: string) =>
	quantity(name, TORQUE_UNITS, { from: [1e-6, '0.000001 N*m'], to: [1e9, '1,000,000,000 N*m'] });

export const force = (name: string) =>
	quantity(name, FORCE_UNITS, { from: [1e-6, '0.000001 N'], to: [1e9, '1,000,000 kN'] });

/** An allowable stress. */
export const stress = (name: string) =>
	quantity(name, STRESS_UNITS, { from: [0.01, '0.01 MPa'], to: [10_000, '10 GPa'] });

/** A modulus of elasticity. */
export const modulus = (name: string) =>
	quantity(name, STRESS_UNITS, { from: [1, '1 MPa'], to: [2_000_000, '2,000 GPa'] });
