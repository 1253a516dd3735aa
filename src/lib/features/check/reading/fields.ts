/**
 * The readings of a check: in which units each is taken, whether fractions make sense, and what is impossible.
 * Limits catch slips of the finger (a missing point, the wrong unit); they say nothing about strength.
 */
import type { Unit } from '$lib/gear/quantity';
import { toSI } from '$lib/gear/quantity';
import type { Instrument } from '$lib/records/instruments';
import { isPlain, type ReadingUnit } from '$lib/records/reading';

export const FIELD_NAMES = [
	'teeth',
	'secondCount',
	'outsideDiameter',
	'faceWidth',
	'span',
	'wholeDepth',
	'rootDiameter',
	'chordalThickness',
	'overPins',
	'pinDiameter',
	'centreDistance',
	'mateTeeth',
	'circularPitch',
	'helixAngle',
	'power',
	'torque',
	'speed',
	'serviceFactor'
] as const;
export type FieldName = (typeof FIELD_NAMES)[number];

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
	/** What it can be taken with, the usual one first. */
	instruments: readonly Instrument[];
}

type FieldOf<N extends FieldName> = Field & { name: N };

function counted<N extends FieldName>(name: N, least: number, most: number): FieldOf<N> {
	return { name, units: ['teeth'], whole: true, fractions: false, least, most, instruments: [] };
}

function length<N extends FieldName>(
	name: N,
	least: number,
	most: number,
	instruments: readonly Instrument[]
): FieldOf<N> {
	return { name, units: ['in', 'mm'], whole: false, fractions: true, least, most, instruments };
}

function other<N extends FieldName>(
	name: N,
	units: readonly ReadingUnit[],
	[least, most]: readonly [number, number],
	fractions = false
): FieldOf<N> {
	return { name, units, whole: false, fractions, least, most, instruments: [] };
}

export const FIELDS: { [N in FieldName]: FieldOf<N> } = {
	teeth: counted('teeth', 4, 1000),
	secondCount: counted('secondCount', 4, 1000),
	outsideDiameter: length('outsideDiameter', 3, 8000, [
		'calliper',
		'long-calliper',
		'micrometer',
		'pi-tape',
		'rule',
		'tape'
	]),
	faceWidth: length('faceWidth', 1, 2000, ['rule', 'calliper', 'tape']),
	span: length('span', 1, 4000, ['calliper', 'disc-micrometer', 'long-calliper']),
	wholeDepth: length('wholeDepth', 0.3, 300, ['calliper-tips', 'rule']),
	rootDiameter: length('rootDiameter', 2, 8000, ['calliper-tips', 'rule']),
	chordalThickness: length('chordalThickness', 0.2, 200, ['tooth-calliper', 'calliper-tips', 'rule']),
	overPins: length('overPins', 3, 8000, ['calliper', 'micrometer', 'long-calliper']),
	pinDiameter: length('pinDiameter', 0.3, 200, ['micrometer', 'calliper']),
	centreDistance: length('centreDistance', 3, 10_000, ['rule-over-shafts', 'long-calliper', 'tape']),
	mateTeeth: counted('mateTeeth', 4, 5000),
	circularPitch: length('circularPitch', 0.5, 400, ['rule', 'calliper']),
	helixAngle: { ...other('helixAngle', ['deg'], [0, 60]), instruments: ['protractor'] },
	power: other('power', ['hp', 'kW', 'W'], [1, 50_000_000], true),
	torque: other('torque', ['lbf*ft', 'lbf*in', 'N*m'], [0.01, 10_000_000]),
	speed: other('speed', ['rpm'], [0.01, 60_000]),
	serviceFactor: other('serviceFactor', ['x'], [0.5, 5])
};

/** A figure in the unit in which the limits stand. */
export function inLimitUnit(value: number, unit: ReadingUnit): number {
	return isPlain(unit) ? value : toSI({ value, unit: unit satisfies Unit });
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
