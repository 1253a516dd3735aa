/** The plant's rules in one revision: what margin is needed, which laws apply, what a service factor is taken from. */
import { z } from 'zod';
import { MOST_UNCERTAIN } from '$lib/gear/uncertainty';
import { instrumentRules } from './instruments';

/** As far as the low end of a margin is proven. */
const fraction = (of: string, most: number) => {
	const error = `Uncertainty of the ${of} must be a fraction between 0 and ${most}.`;
	return z.number({ error }).min(0, { error }).max(most, { error });
};

const limit = z.strictObject({ value: z.number().positive(), unit: z.enum(['m/s', 'ft/min']) }).nullable();

export const serviceFactor = z.strictObject({
	/** Key of the words for it: uniform, light-shock, medium-shock, heavy-shock. */
	duty: z.enum(['uniform', 'light-shock', 'medium-shock', 'heavy-shock']),
	factor: z.number().min(0.5).max(5),
	source: z.string().min(1)
});

export const plantRules = z.strictObject({
	bendingMargin: z.number().min(0.5).max(20),
	wearMargin: z.number().min(0.5).max(20),
	reversingFactor: z.number().min(0.3).max(1),
	cutLaw: z.union([z.literal(600), z.literal(1200)]),
	formFactor: z.enum(['handbook', 'geometry', 'lower-of-both']),
	speedLimit: z.strictObject({ cast: limit, cut: limit, hobbed: limit, ground: limit }),
	uncertainty: z.strictObject({
		faceWidth: fraction('face width', MOST_UNCERTAIN.faceWidth),
		load: fraction('load', MOST_UNCERTAIN.load),
		speed: fraction('speed', MOST_UNCERTAIN.speed)
	}),
	serviceFactors: z.array(serviceFactor).min(1),
	/** How far the plant trusts its tools, where it differs from what is usual. */
	instruments: instrumentRules.optional()
});
export type PlantRules = z.infer<typeof plantRules>;
