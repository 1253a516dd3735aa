/** The outcome of a check as it travels in a record: the zod twin of the core's `Outcome`. */
import { z } from 'zod';
import type { Outcome } from '$lib/gear/contract';
import { pitch } from './mirror';

const figure = z.number().nullable();
const text = z.string().max(2000);
const verdict = z.enum(['carries', 'close', 'will-not-carry', 'not-permitted', 'cannot-say']);
const limitName = z.enum(['gear-bending', 'mate-bending', 'wear']);
/** A value with its unit, or the name of a finish or material. */
const remedyValue = z.union([z.string().max(200), z.object({ value: z.number(), unit: z.string().max(20) })]);

export const outcome: z.ZodType<Outcome> = z.object({
	core: z.string().max(40),
	pitchDiameter: figure,
	module: figure,
	normalModule: figure,
	diametralPitch: figure,
	circularPitch: figure,
	pitchLineVelocity: figure,
	velocityLaw: z.string().max(80).nullable(),
	velocityFactor: figure,
	formFactor: figure,
	formFactorSource: z.enum(['handbook', 'geometry']).nullable(),
	formFactorHandbook: figure,
	formFactorGeometry: figure,
	stressConcentration: figure,
	tangentialForce: figure,
	designForce: figure,
	bendingStress: figure,
	allowableBending: figure,
	bendingMargin: figure,
	bendingMarginLow: figure,
	permittedPower: figure,
	permittedTorque: figure,
	limits: z
		.array(z.object({ answer: limitName, margin: z.number(), marginLow: z.number(), needed: z.number() }))
		.max(3),
	limitedBy: limitName.nullable(),
	wear: z
		.object({
			contactStress: z.number(),
			allowableContact: z.number(),
			contactMargin: z.number(),
			wearLoad: z.number(),
			wearLoadMargin: z.number()
		})
		.nullable(),
	mateBending: z
		.object({ bendingStress: z.number(), allowableBending: z.number(), bendingMargin: z.number() })
		.nullable(),
	mesh: z
		.object({
			ratio: figure,
			standardCentreDistance: figure,
			operatingPressureAngle: z.number(),
			contactRatio: z.number(),
			contactRatioUndercut: figure,
			overlapRatio: z.number(),
			normalBacklash: figure,
			huntingTooth: z.boolean(),
			undercut: z.object({ gear: z.boolean(), mate: z.boolean() }),
			interference: z.boolean()
		})
		.nullable(),
	original: z.object({ bendingCapacityRatio: z.number(), wearCapacityRatio: figure }).nullable(),
	verdict,
	reasons: z
		.array(
			z.object({
				code: z.string().max(80),
				text,
				values: z.record(z.string(), z.union([z.number(), z.string().max(500)])).optional()
			})
		)
		.max(50),
	remedies: z
		.array(
			z.object({
				change: z.enum(['power', 'speed', 'faceWidth', 'finish', 'material']),
				value: remedyValue,
				likeForLike: z.boolean(),
				bendingMargin: z.number(),
				bendingMarginLow: z.number(),
				carriesAt: remedyValue.nullable()
			})
		)
		.max(50),
	working: z
		.array(
			z.object({
				symbol: z.string().max(20),
				name: z.string().max(120),
				expression: z.string().max(400),
				numbers: z.string().max(400),
				value: z.number(),
				unit: z.string().max(20),
				source: z.string().max(400),
				of: z.literal('mate').optional()
			})
		)
		.max(200),
	gears: z
		.array(
			z.object({
				teeth: z.number(),
				pitch,
				pressureAngle: z.number(),
				form: z.enum(['full-depth', 'stub']),
				profileShift: z.number(),
				probability: z.number(),
				verdict,
				limitedBy: limitName.nullable(),
				margin: figure,
				marginLow: figure,
				decides: z.boolean()
			})
		)
		.max(100)
		.optional()
});
