/**
 * Units in and out of the core. Inside, everything is mm, rpm, m/s, W, N·m, N and MPa.
 * The factors are exact by definition: 1 in = 25.4 mm, 1 lbf = 4.4482216152605 N, 1 hp = 550 ft·lbf/s.
 * Source: NIST Special Publication 811 (2008), appendix B (from memory).
 */
import type {
	ForceUnit,
	LengthUnit,
	PowerUnit,
	Quantity,
	SpeedUnit,
	StressUnit,
	TorqueUnit,
	VelocityUnit
} from './contract';

export type Unit = LengthUnit | SpeedUnit | VelocityUnit | PowerUnit | TorqueUnit | ForceUnit | StressUnit;

export const LENGTH_UNITS = ['mm', 'cm', 'm', 'in', 'ft'] as const satisfies readonly LengthUnit[];
export const SPEED_UNITS = ['rpm'] as const satisfies readonly SpeedUnit[];
export const VELOCITY_UNITS = ['m/s', 'ft/min'] as const satisfies readonly VelocityUnit[];
export const POWER_UNITS = ['W', 'kW', 'hp'] as const satisfies readonly PowerUnit[];
export const TORQUE_UNITS = ['N*m', 'lbf*ft', 'lbf*in'] as const satisfies readonly TorqueUnit[];
export const FORCE_UNITS = ['N', 'kN', 'lbf'] as const satisfies readonly ForceUnit[];
export const STRESS_UNITS = ['MPa', 'GPa', 'psi', 'ksi'] as const satisfies readonly StressUnit[];

const METRES_PER_FOOT = 0.3048;
const MILLIMETRES_PER_INCH = 25.4;
const NEWTONS_PER_POUND = 4.4482216152605;

const SI_PER_UNIT: Record<Unit, number> = {
	mm: 1,
	cm: 10,
	m: 1000,
	in: MILLIMETRES_PER_INCH,
	ft: METRES_PER_FOOT * 1000,
	rpm: 1,
	'm/s': 1,
	'ft/min': METRES_PER_FOOT / 60,
	W: 1,
	kW: 1000,
	hp: 550 * METRES_PER_FOOT * NEWTONS_PER_POUND,
	'N*m': 1,
	'lbf*ft': METRES_PER_FOOT * NEWTONS_PER_POUND,
	'lbf*in': (METRES_PER_FOOT / 12) * NEWTONS_PER_POUND,
	N: 1,
	kN: 1000,
	lbf: NEWTONS_PER_POUND,
	MPa: 1,
	GPa: 1000,
	psi: NEWTONS_PER_POUND / (MILLIMETRES_PER_INCH * MILLIMETRES_PER_INCH),
	ksi: (1000 * NEWTONS_PER_POUND) / (MILLIMETRES_PER_INCH * MILLIMETRES_PER_INCH)
};

/**
 * A quantity as typed, in the core's own unit: mm, rpm, m/s, W, N·m, N or MPa.
 * @example toSI({ value: 1.5, unit: 'in' }) // 38.1
 * @example toSI({ value: 1, unit: 'hp' }) // 745.699872
 * @example toSI({ value: 1, unit: 'ksi' }) // 6.894757
 */
export function toSI({ value, unit }: Quantity<Unit>): number {
	return value * SI_PER_UNIT[unit];
}

/**
 * A figure of the core (mm, rpm, m/s, W, N·m, N or MPa) in the unit that a screen shows.
 * The unit must be of the same kind as the figure: nothing here can know that it is not.
 * @example fromSI(38.1, 'in') // 1.5
 * @example fromSI(745.6998716, 'hp') // 1.00000000
 */
export function fromSI(value: number, unit: Unit): number {
	return value / SI_PER_UNIT[unit];
}
