/**
 * One reading as the person gave it: the text as typed, the figure it means, its own unit, and where it came
 * from, with its repeats. Nothing is converted before it is kept. "Cannot measure this" is an answer too.
 */
import { fromSI, toSI } from '$lib/gear/quantity';
import { z } from 'zod';
import { INSTRUMENTS, type Instrument } from './instruments';

export const READING_UNITS = [
	'teeth',
	'in',
	'mm',
	'hp',
	'kW',
	'W',
	'lbf*ft',
	'lbf*in',
	'N*m',
	'rpm',
	'deg',
	'x'
] as const;
export type ReadingUnit = (typeof READING_UNITS)[number];

/** Counts, angles and factors: they have no other unit, and the core takes them as they stand. */
export type PlainUnit = 'teeth' | 'deg' | 'x';
export function isPlain(unit: ReadingUnit): unit is PlainUnit {
	return unit === 'teeth' || unit === 'deg' || unit === 'x';
}

const typed = z
	.string()
	.min(1, 'Keep the text as it was typed.')
	.max(40, 'At most 40 characters can be typed.');

const positive = z
	.number('A reading is a number.')
	.positive('A reading must be greater than zero.')
	.max(1e9, 'This is beyond anything a gear drive has: check the unit.');

/** Own keypad, a keyboard or calliper, counted by taps, the position's record, a rule of the plant. */
const SOURCES = ['keypad', 'typed', 'tally', 'position', 'rule'] as const;

export const cannotMeasure = z.strictObject({ cannotMeasure: z.literal(true) });

/** An angle between teeth and shaft may well be none. */
export const orNone = z
	.number('A reading is a number.')
	.min(0, 'A reading must not be below zero.')
	.max(1e9, 'This is beyond anything a gear drive has: check the unit.');

/** More repeats than this tell nothing new at a machine. */
const MOST_EARLIER = 9;

/** The schema of one reading in one of its units. */
export function readingIn<const U extends readonly ReadingUnit[]>(units: U, value: z.ZodNumber = positive) {
	const take = {
		typed,
		value,
		unit: z.enum(units, `The unit must be one of: ${units.join(', ')}.`),
		source: z.enum(SOURCES, 'The source is keypad, typed, tally, position or rule.')
	};
	return z.strictObject({
		...take,
		/** The tool it was taken with, where one was said. */
		instrument: z.enum(INSTRUMENTS, `The tool must be one of: ${INSTRUMENTS.join(', ')}.`).optional(),
		/** What the same reading showed before, oldest first. */
		earlier: z
			.array(z.strictObject(take))
			.max(MOST_EARLIER, `At most ${MOST_EARLIER} repeats can be kept.`)
			.optional()
	});
}

/** The schema of one field: a reading in one of its units, "cannot measure this", or null while open. */
export function answeredIn<const U extends readonly ReadingUnit[]>(units: U, value: z.ZodNumber = positive) {
	return z.union([readingIn(units, value), cannotMeasure]).nullable();
}

/** One time that a reading was taken. */
export interface Take<U extends ReadingUnit = ReadingUnit> {
	typed: string;
	value: number;
	unit: U;
	source: (typeof SOURCES)[number];
}

/** The last take, with those before it. */
export interface Reading<U extends ReadingUnit = ReadingUnit> extends Take<U> {
	instrument?: Instrument | undefined;
	earlier?: Take<U>[] | undefined;
}
export type AnsweredReading<U extends ReadingUnit = ReadingUnit> =
	Reading<U> | { cannotMeasure: true } | null;

export function isReading<U extends ReadingUnit>(answer: AnsweredReading<U>): answer is Reading<U> {
	return answer !== null && 'value' in answer;
}

/** All takes of a length in the unit of the last one, oldest first. */
export function takesOf<U extends 'in' | 'mm'>({ earlier = [], value, unit }: Reading<U>): number[] {
	const inUnit = (take: Take<U>) => (take.unit === unit ? take.value : fromSI(toSI(take), unit));
	return [...earlier.map(inUnit), value];
}

/** The mean of all takes of a length, in the unit of the last one. */
export function meanOf<U extends 'in' | 'mm'>(reading: Reading<U>): { value: number; unit: U } {
	const takes = takesOf(reading);
	return { value: takes.reduce((sum, take) => sum + take, 0) / takes.length, unit: reading.unit };
}
