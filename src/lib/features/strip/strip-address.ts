/**
 * What the strip's address says: `gear=<module>,<teeth>,<angle>,<form>,<shift>,<label>` for each gear, and `back`. A
 * gear that cannot be read is named and left out; the others are drawn.
 */
import { z } from 'zod';
import type { StripGear } from './strip-gear';

export type Part = keyof StripGear & string;

export interface StripAddress {
	gears: StripGear[];
	/** What was left out: as it was named, and the parts that are wrong. */
	refused: { name: string; parts: Part[] }[];
	back: string;
}

/** An empty part is not nothing times something. */
const figure = z
	.string()
	.regex(/^[+-]?\d*\.?\d+(e[+-]?\d+)?$/i)
	.transform(Number);

const gearSchema = z.object({
	label: z.string().trim().min(1).max(80),
	// From the finest tabulated pitches to the coarsest gears that are met, with room on both sides.
	module: figure.pipe(z.number().min(0.1).max(60)),
	teeth: figure.pipe(z.number().int().min(1).max(2000)),
	pressureAngle: figure.pipe(z.number().gt(0).lt(45)),
	form: z.enum(['full-depth', 'stub']),
	profileShift: figure.pipe(z.number().min(-3).max(3))
});

const HOME = '/tablet';

export function readStripAddress(query: URLSearchParams): StripAddress {
	const gears: StripGear[] = [];
	const refused: StripAddress['refused'] = [];
	for (const text of query.getAll('gear')) {
		const [module, teeth, pressureAngle, form, profileShift, ...label] = text.split(',');
		const read = gearSchema.safeParse({
			module,
			teeth,
			pressureAngle,
			form,
			profileShift,
			// A label holds commas of its own.
			label: label.join(',')
		});
		if (read.success) gears.push(read.data);
		else {
			const parts = read.error.issues.map(({ path }) => path[0] as Part);
			refused.push({ name: label.join(',').trim() || text, parts: [...new Set(parts)] });
		}
	}
	return { gears, refused, back: backWithin(query.get('back')) };
}

/** Only to the tablet's own pages, whatever dots and slashes an address holds. */
function backWithin(back: string | null): string {
	if (!back?.startsWith('/tablet/')) return HOME;
	const own = 'http://tablet.invalid';
	const { origin, pathname, search } = new URL(back, own);
	return origin === own && pathname.startsWith('/tablet/') ? pathname + search : HOME;
}
