/**
 * A material of the plant's list, in one revision. The form that makes a revision, the row that keeps it and
 * the mirror on the tablet use this one schema. A value without a source is refused.
 */
import { z } from 'zod';

const stress = (what: string) =>
	z.strictObject({
		value: z
			.number(`${what}: type a number.`)
			.positive(`${what} must be greater than zero.`)
			.max(1e7, `${what} is beyond any gear material: check the unit.`),
		unit: z.enum(['MPa', 'GPa', 'psi', 'ksi'], `${what}: choose MPa, GPa, psi or ksi.`)
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
