/**
 * A material of the plant's list, in one revision. The form that makes a revision, the row that keeps it and
 * the mirror on the tablet use this one schema. A value without a source is refused.
 */
import { STRESS_UNITS, toSI } from '$lib/gear/quantity';
import { z } from 'zod';

/** No gear material is stiffer or stronger than this, in MPa: diamond's modulus is about 1,200 GPa. */
export const MOST_STRESS_MPA = 2e6;

const stress = (what: string) =>
	z
		.strictObject({
			value: z.number(`${what}: type a number.`).positive(`${what} must be greater than zero.`),
			unit: z.enum(STRESS_UNITS, `${what}: choose MPa, GPa, psi or ksi.`)
		})
		.refine((quantity) => toSI(quantity) <= MOST_STRESS_MPA, {
			path: ['value'],
			message: `${what} is beyond any gear material: check the unit.`
		});

const words = (what: string, most: number) =>
	z
		.string(`${what}: type it.`)
		.trim()
		.min(1, `${what} is missing: type it.`)
		.max(most, `${what}: at most ${most} characters.`);

/** What the supervisor states about a material. Hardness is Brinell (3,000 kgf), as a range. */
export const materialStatement = z
	.strictObject({
		name: words('Name', 80),
		condition: words('Condition', 80),
		metallic: z.boolean(),
		allowableBending: stress('Allowable bending stress'),
		basis: words('Basis of the allowable', 200),
		brinellLow: z.number().int('Hardness: a whole Brinell number.').min(20).max(750).nullable(),
		brinellHigh: z.number().int('Hardness: a whole Brinell number.').min(20).max(750).nullable(),
		modulus: stress('Modulus of elasticity').nullable(),
		poisson: z.number().min(0).max(0.5, "Poisson's ratio lies between 0 and 0.5.").nullable(),
		source: words('Source', 200),
		edition: words('Edition', 80),
		validFrom: z.iso.date('From which date: choose a day.'),
		permitted: z.boolean()
	})
	.refine((m) => m.brinellLow === null || m.brinellHigh === null || m.brinellLow <= m.brinellHigh, {
		path: ['brinellHigh'],
		message: 'The upper hardness must not be below the lower one.'
	});
export type MaterialStatement = z.infer<typeof materialStatement>;
