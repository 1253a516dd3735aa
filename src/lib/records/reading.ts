/**
 * One reading as the person gave it: the text as typed, the figure it means, its own unit, and where it came
 * from. Nothing is converted before it is kept. "Cannot measure this" is an answer too.
 */
import { z } from 'zod';

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
	'x'
] as const;
export type ReadingUnit = (typeof READING_UNITS)[number];

const typed = z
	.string()
	.min(1, 'Keep the text as it was typed.')
	.max(40, 'At most 40 characters can be typed.');

const positive = z
	.number('A reading is a number.')
	.positive('A reading must be greater than zero.')
	.max(1e9, 'This is beyond anything a gear drive has: check the unit.');

export const cannotMeasure = z.strictObject({ cannotMeasure: z.literal(true) });

/** The schema of one field: a reading in one of its units, "cannot measure this", or null while open. */
export function answeredIn<const U extends readonly ReadingUnit[]>(units: U, value: z.ZodNumber = positive) {
	const reading = z.strictObject({
		typed,
		value,
		unit: z.enum(units, `The unit must be one of: ${units.join(', ')}.`),
		/** Own keypad, a keyboard or calliper, taken over from the position's record, or taken from a plant rule. */
		source: z.enum(['keypad', 'typed', 'position', 'rule'], 'The source is keypad, typed, position or rule.')
	});
	return z.union([reading, cannotMeasure]).nullable();
}

export interface Reading<U extends ReadingUnit = ReadingUnit> {
	typed: string;
	value: number;
	unit: U;
	source: 'keypad' | 'typed' | 'position' | 'rule';
}
export type AnsweredReading<U extends ReadingUnit = ReadingUnit> =
	Reading<U> | { cannotMeasure: true } | null;

export function isReading<U extends ReadingUnit>(answer: AnsweredReading<U>): answer is Reading<U> {
	return answer !== null && 'value' in answer;
}
