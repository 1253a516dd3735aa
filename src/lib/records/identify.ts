/**
 * The question of identification as a schema, and the one way in: `parseIdentify`. What it lets through the core
 * answers without an exception; what it refuses is named field by field, and so is a field that it does not know.
 */
import { z } from 'zod';
import type { InvalidInput, LengthUnit } from '$lib/gear/contract';
import { READING_NAMES, type IdentifyInput } from '$lib/gear/identify/contract';
import { LENGTH_UNITS, toSI } from '$lib/gear/quantity';
import { invalidInput } from './invalid-input';
import { must, oneOf, strictFields } from './plain-words';
import { length } from './quantity';

const RANGE = 'between 0.1 mm and 20 m';
const inRange = (millimetres: number) => millimetres >= 0.1 && millimetres <= 20_000;

const whole = (name: string, from: number, to: number) => {
	const words = must(name, `a whole number between ${from} and ${to}`);
	return z.number(words).int(words).min(from, words).max(to, words);
};

const reading = <Shape extends z.core.$ZodShape>(name: string, more: Shape) =>
	strictFields(name, {
		value: z.number(must(name, `a number ${RANGE}`)).optional(),
		values: z
			.array(z.number(must(name, `a number ${RANGE}`)), must(`Repeats of ${name}`, 'a list of numbers'))
			.min(1, `Repeats of ${name} must be at least one number.`)
			.max(20, `Repeats of ${name} must be at most 20 numbers.`)
			.optional(),
		unit: z.enum(LENGTH_UNITS, oneOf(`Unit of ${name}`, LENGTH_UNITS)),
		uncertainty: z
			.number(must(`Uncertainty of ${name}`, 'a number above 0'))
			.positive(`Uncertainty of ${name} must be a number above 0.`)
			.optional(),
		...more
	}).superRefine((typed, context) => {
		const { value, values, uncertainty, unit } = typed as Reading;
		const refuse = (path: string, message: string) =>
			context.addIssue({ code: 'custom', path: [path], message });
		if ((value === undefined) === (values === undefined)) {
			refuse('value', `${name} must be either one value or a list of values.`);
		}
		const given = values ?? (value === undefined ? [] : [value]);
		if (!given.every((one) => inRange(toSI({ value: one, unit })))) {
			refuse(values ? 'values' : 'value', `${name} must be ${RANGE}.`);
		}
		const doubt = uncertainty === undefined ? 0.025 : toSI({ value: uncertainty, unit });
		if (!(doubt >= 1e-4 && doubt <= 100)) {
			refuse('uncertainty', `Uncertainty of ${name} must be between 0.0001 mm and 100 mm.`);
		}
	});

interface Reading {
	value?: number | undefined;
	values?: number[] | undefined;
	unit: LengthUnit;
	uncertainty?: number | undefined;
}

const flag = (name: string) => z.boolean(must(name, 'true or false')).optional();

export const identifyInput = strictFields('Readings', {
	teeth: whole('Teeth', 4, 2000),
	teethCertain: flag('Teeth certain'),
	outsideDiameter: reading('Outside diameter', {
		taken: z
			.enum(
				['over-tips', 'tip-to-gap', 'pi-tape'],
				oneOf('How the outside diameter was taken', ['over-tips', 'tip-to-gap', 'pi-tape'])
			)
			.optional(),
		tipWorn: flag('Tip worn')
	}).optional(),
	rootDiameter: reading('Root diameter', {}).optional(),
	wholeDepth: reading('Whole depth', {}).optional(),
	spans: z
		.array(
			reading('Span', { teeth: whole('Teeth in the span', 2, 500) }),
			must('Spans', 'a list of spans, each with teeth, value and unit')
		)
		.max(10, 'Spans must be at most 10.')
		.optional(),
	overPins: reading('Measurement over pins', { pinDiameter: length('Pin diameter') }).optional(),
	chordalThickness: reading('Chordal thickness', {}).optional(),
	centreDistance: reading('Centre distance', {}).optional(),
	mateTeeth: whole('Teeth of the mate', 4, 5000).optional(),
	circularPitch: reading('Circular pitch', {}).optional(),
	helixAngle: strictFields('Helix angle', {
		value: z
			.number(must('Helix angle (degrees)', 'a number between -60 and 60'))
			.min(-60, 'Helix angle (degrees) must be a number between -60 and 60.')
			.max(60, 'Helix angle (degrees) must be a number between -60 and 60.'),
		uncertainty: z
			.number(must('Uncertainty of the helix angle', 'a number above 0'))
			.positive('Uncertainty of the helix angle must be a number above 0.')
			.max(20, 'Uncertainty of the helix angle must be at most 20 degrees.')
			.optional()
	}).optional(),
	flanksWorn: flag('Flanks worn'),
	prior: z
		.enum(['inch', 'metric', 'either'], oneOf('Where the machine comes from', ['inch', 'metric', 'either']))
		.optional(),
	cannotMeasure: z
		.array(
			z.enum(READING_NAMES, oneOf('What cannot be measured', READING_NAMES)),
			must('What cannot be measured', 'a list of readings')
		)
		.max(20, 'What cannot be measured must be at most 20 readings.')
		.optional()
}).superRefine(({ centreDistance, mateTeeth }, { addIssue }) => {
	if (!centreDistance || mateTeeth !== undefined) return;
	const message =
		'Teeth of the mate is missing: it must be given with the centre distance, or the distance left out.';
	addIssue({ code: 'custom', path: ['mateTeeth'], message });
});

export type ParsedIdentify = { ok: true; input: IdentifyInput } | { ok: false; error: InvalidInput };

/** Reads readings from anything: a parsed JSON body, a form, a stored record. Never throws. */
export function parseIdentify(json: unknown): ParsedIdentify {
	const parsed = identifyInput.safeParse(json, { reportInput: true });
	return parsed.success
		? { ok: true, input: parsed.data as IdentifyInput }
		: { ok: false, error: invalidInput(parsed.error.issues, json) };
}
