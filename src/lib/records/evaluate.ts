/**
 * The question of the calculation contract as a schema, and the one way in: `parseEvaluate`. What it lets through
 * the core answers without an exception; what it refuses is named field by field. A field it does not know is
 * refused too, so that a misspelt one is never silently left out of a calculation.
 */
import { z } from 'zod';
import type { EvaluateInput, InvalidInput } from '$lib/gear/contract';
import { LENGTH_UNITS } from '$lib/gear/quantity';
import { MOST_UNCERTAIN } from '$lib/gear/uncertainty';
import { invalidInput } from './invalid-input';
import { must, oneOf, strictFields } from './plain-words';
import { force, length, modulus, power, speed, stress, torque, velocity } from './quantity';

const between = (name: string, from: number, to: number) => {
	const words = must(name, `a number between ${from} and ${to}`);
	return z.number(words).min(from, words).max(to, words);
};

const whole = (name: string, to: number) => {
	const words = must(name, 'a whole number of at least 1');
	return z
		.number(words)
		.refine((value) => Number.isInteger(value) && value >= 1, { ...words, abort: true })
		.max(to, `${name} must be at most ${to}.`);
};

const choice = <const Words extends readonly [string, ...string[]]>(name: string, words: Words) =>
	z.enum(words, oneOf(name, words));

const pitch = z.discriminatedUnion(
	'system',
	[
		strictFields('Pitch', { system: z.literal('diametral'), value: between('Diametral pitch', 0.1, 500) }),
		strictFields('Pitch', { system: z.literal('module'), value: between('Module (mm)', 0.05, 250) }),
		strictFields('Pitch', {
			system: z.literal('circular'),
			value: between('Circular pitch', 0.001, 800),
			unit: choice('Unit of circular pitch', LENGTH_UNITS)
		})
	],
	must('Pitch', 'an object whose system is diametral, module or circular, with its value')
);

const form = z.union(
	[
		z.literal(['full-depth', 'stub']),
		strictFields('Tooth form', {
			addendum: between('Addendum (in modules)', 0.1, 2),
			dedendum: between('Dedendum (in modules)', 0.1, 2.5),
			tipRadius: between('Tip radius (in modules)', 0, 1)
		})
	],
	must('Tooth form', 'full-depth, stub, or an object with addendum, dedendum and tipRadius')
);

const material = strictFields('Material', {
	name: z
		.string(must('Name of the material', 'text'))
		.min(1, 'Name of the material must not be empty.')
		.max(200, 'Name of the material must be at most 200 characters long.'),
	metallic: z.boolean(must('Metallic', 'true or false')),
	allowableBending: stress('Allowable bending stress'),
	brinell: between('Brinell hardness', 1, 1000).optional(),
	modulus: modulus('Modulus of elasticity').optional(),
	poisson: between("Poisson's ratio", 0, 0.5).optional(),
	permitted: z.boolean(must('Permitted', 'true or false'))
});

const finish = choice('Finish', ['cast', 'cut', 'hobbed', 'ground']);

const toothedPart = {
	kind: choice('Kind of gear', ['spur', 'helical', 'internal', 'rack']),
	teeth: whole('Teeth', 5000).optional(),
	pitch,
	plane: choice('Plane', ['normal', 'transverse']).optional(),
	pressureAngle: between('Pressure angle (degrees)', 5, 45),
	form,
	profileShift: between('Profile shift (in modules)', -2, 2).optional(),
	helixAngle: between('Helix angle (degrees)', 0, 60).optional(),
	tipWear: length('Wear of the tips').optional(),
	toothThickness: length('Tooth thickness').optional()
};

/** What must agree within one gear; `kind` decides. */
function agree(
	{
		kind,
		teeth,
		helixAngle = 0
	}: { kind: string; teeth?: number | undefined; helixAngle?: number | undefined },
	{ addIssue }: { addIssue(issue: { code: 'custom'; path: string[]; message: string }): void }
): void {
	const refuse = (path: string, message: string) => addIssue({ code: 'custom', path: [path], message });
	if (kind === 'rack' && teeth !== undefined)
		refuse('teeth', 'A rack has no number of teeth: leave teeth out.');
	if (kind === 'spur' && helixAngle !== 0) {
		refuse('helixAngle', 'A spur gear has no helix angle: set it to 0, or choose helical as the kind.');
	}
}

const gear = strictFields('Gear', {
	...toothedPart,
	faceWidth: length('Face width'),
	finish,
	material
}).superRefine((value, context) => {
	agree(value, context);
	if (value.kind !== 'rack' && value.teeth === undefined) {
		const message = 'Teeth is missing: it must be a whole number of at least 1.';
		context.addIssue({ code: 'custom', path: ['teeth'], message });
	}
});

const mate = strictFields('Mate', {
	kind: toothedPart.kind,
	teeth: toothedPart.teeth,
	pitch: pitch.optional(),
	plane: toothedPart.plane,
	pressureAngle: toothedPart.pressureAngle.optional(),
	form: form.optional(),
	profileShift: toothedPart.profileShift,
	helixAngle: toothedPart.helixAngle,
	tipWear: toothedPart.tipWear,
	toothThickness: toothedPart.toothThickness,
	worn: z.boolean(must('Worn', 'true or false')).optional(),
	finish: finish.optional(),
	faceWidth: length('Face width of the mate').optional(),
	material: material.optional(),
	centreDistance: length('Centre distance').optional()
}).superRefine(agree);

const load = z.union(
	[
		z.literal('unknown'),
		strictFields('Load', { power: power('Power') }),
		strictFields('Load', { torque: torque('Torque') }),
		strictFields('Load', { tangentialForce: force('Tangential force') })
	],
	must(
		'Load',
		'exactly one of power, torque or tangentialForce, each with value and unit, or the word unknown'
	)
);

const drive = strictFields('Drive', {
	load,
	speed: speed('Speed').optional(),
	velocity: velocity('Velocity').optional(),
	serviceFactor: between('Service factor', 0.1, 10),
	bending: choice('Bending', ['one-way', 'reversing']).optional()
});

const limit = (of: string) => velocity(`Speed limit for ${of} teeth`).nullable().default(null);

const rules = strictFields('Rules', {
	formFactor: choice('Form factor rule', ['handbook', 'geometry', 'lower-of-both']),
	cutLaw: z.literal([600, 1200], oneOf('Law for cut teeth', [600, 1200])),
	bendingMargin: between('Needed margin in bending', 0.1, 100),
	wearMargin: between('Needed margin in wear', 0.1, 100),
	reversingFactor: between('Reversing factor', 0.1, 1),
	speedLimit: strictFields('Speed limits', {
		cast: limit('cast'),
		cut: limit('cut'),
		hobbed: limit('hobbed'),
		ground: limit('ground')
	})
}).partial();

const fraction = (of: string, most: number) => between(`Uncertainty of the ${of} (a fraction)`, 0, most);

const uncertainty = strictFields('Uncertainty', {
	faceWidth: fraction('face width', MOST_UNCERTAIN.faceWidth),
	load: fraction('load', MOST_UNCERTAIN.load),
	speed: fraction('speed', MOST_UNCERTAIN.speed)
}).partial();

export const evaluateInput = strictFields('Check', {
	gear,
	mate: mate.optional(),
	original: gear.optional(),
	drive,
	rules: rules.optional(),
	permittedMaterials: z
		.array(material, must('Permitted materials', 'a list of materials'))
		.max(500, 'Permitted materials must be at most 500.')
		.optional(),
	uncertainty: uncertainty.optional()
}).superRefine(({ gear, original, drive }, { addIssue }) => {
	const refuse = (path: string[], message: string) => addIssue({ code: 'custom', path, message });
	if (gear.kind !== 'rack' && drive.velocity !== undefined) {
		refuse(
			['drive', 'velocity'],
			'Velocity is for a rack: leave it out and give the speed of this gear in rpm.'
		);
	}
	if (gear.kind === 'rack' && drive.speed !== undefined) {
		refuse(['drive', 'speed'], 'A rack has no speed in rpm: leave it out and give its velocity.');
	}
	if (original && (original.kind === 'rack') !== (gear.kind === 'rack')) {
		refuse(['original', 'kind'], 'A rack can only stand in for a rack: check the kind of both.');
	}
});

export type ParsedEvaluate = { ok: true; input: EvaluateInput } | { ok: false; error: InvalidInput };

/** Reads a question from anything: a parsed JSON body, a form, a stored record. Never throws. */
export function parseEvaluate(json: unknown): ParsedEvaluate {
	const parsed = evaluateInput.safeParse(json, { reportInput: true });
	return parsed.success
		? { ok: true, input: parsed.data }
		: { ok: false, error: invalidInput(parsed.error.issues, json) };
}
