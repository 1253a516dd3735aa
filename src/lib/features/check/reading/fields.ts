/**
 * The readings of a check: in which units each is taken, whether fractions make sense, and what is impossible.
 * Limits catch slips of the finger (a missing point, the wrong unit); they say nothing about strength.
 */
import type { Unit } from '$lib/gear/quantity';
import { toSI } from '$lib/gear/quantity';
import type { CheckAnswers } from '$lib/records/check';
import type { ReadingUnit } from '$lib/records/reading';

export type FieldName =
	'teeth' | 'outsideDiameter' | 'faceWidth' | 'power' | 'torque' | 'speed' | 'serviceFactor';

export interface Field {
	name: FieldName;
	units: readonly ReadingUnit[];
	/** Whole numbers only: counts. */
	whole: boolean;
	/** Halves to sixty-fourths: lengths in inches. */
	fractions: boolean;
	/** Smallest and largest possible, in the core's own unit (mm, W, N·m, rpm) or as counted. */
	least: number;
	most: number;
}

export const FIELDS: Record<FieldName, Field> = {
	teeth: { name: 'teeth', units: ['teeth'], whole: true, fractions: false, least: 4, most: 1000 },
	outsideDiameter: {
		name: 'outsideDiameter',
		units: ['in', 'mm'],
		whole: false,
		fractions: true,
		least: 3,
		most: 8000
	},
	faceWidth: { name: 'faceWidth', units: ['in', 'mm'], whole: false, fractions: true, least: 1, most: 2000 },
	power: {
		name: 'power',
		units: ['hp', 'kW', 'W'],
		whole: false,
		fractions: true,
		least: 1,
		most: 50_000_000
	},
	torque: {
		name: 'torque',
		units: ['lbf*ft', 'lbf*in', 'N*m'],
		whole: false,
		fractions: false,
		least: 0.01,
		most: 10_000_000
	},
	speed: { name: 'speed', units: ['rpm'], whole: false, fractions: false, least: 0.01, most: 60_000 },
	serviceFactor: {
		name: 'serviceFactor',
		units: ['x'],
		whole: false,
		fractions: false,
		least: 0.5,
		most: 5
	}
};

export const MEASURED: readonly (FieldName & keyof CheckAnswers)[] = [
	'teeth',
	'outsideDiameter',
	'faceWidth'
];

/** A figure in the unit in which the limits stand. */
export function inLimitUnit(value: number, unit: ReadingUnit): number {
	return unit === 'teeth' || unit === 'x' ? value : toSI({ value, unit: unit satisfies Unit });
}

/** The other unit of a length or power, to stand smaller beside the reading; null where there is none. */
export function otherUnit(unit: ReadingUnit): Unit | null {
	switch (unit) {
		case 'in':
			return 'mm';
		case 'mm':
			return 'in';
		case 'hp':
			return 'kW';
		case 'kW':
		case 'W':
			return 'hp';
		case 'lbf*ft':
		case 'lbf*in':
			return 'N*m';
		case 'N*m':
			return 'lbf*ft';
		default:
			return null;
	}
}
