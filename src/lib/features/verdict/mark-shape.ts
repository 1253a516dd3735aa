/**
 * The verdict marks as paths: a thin, finely toothed gear rim seen face-on, in a box of 100 x 100. Whole, with one
 * open gap, with a sheared-off piece, or as dots. Cuts fall in tooth spaces, so that an end looks broken, not sawn.
 */

const CENTRE = 50;
const TIP = 49;
const ROOT = 42;
const BORE = 32;

/** Fewer teeth on small marks, so that they are still seen as teeth: to 20 px 8, to 40 px 12, above 24. */
export function teethFor(size: number): number {
	return size <= 20 ? 8 : size <= 40 ? 12 : 24;
}

/**
 * A piece of the rim from one tooth space to another, clockwise, counted in teeth from twelve o'clock.
 * With `from` and `to` a whole turn apart it closes.
 */
export function rimPiece(teeth: number, from: number, to: number, bore: number = BORE): string {
	const small = teeth <= 8;
	const tip = TIP;
	const root = small ? 38 : ROOT;
	const inner = small ? Math.min(bore, 26) : bore;
	const out: string[] = [`M ${point(root, from, teeth)}`];
	for (let tooth = from; tooth < to; tooth++) {
		// Thickness at the root and at the tip, as parts of the pitch.
		out.push(arc(root, tooth + 0.2, teeth));
		out.push(`L ${point(tip, tooth + 0.32, teeth)}`);
		out.push(arc(tip, tooth + 0.68, teeth));
		out.push(`L ${point(root, tooth + 0.8, teeth)}`);
		out.push(arc(root, tooth + 1, teeth));
	}
	const whole = to - from >= teeth;
	const large = (to - from) / teeth > 0.5 ? 1 : 0;
	if (whole) {
		const top = CENTRE - inner;
		out.push(`Z M ${CENTRE} ${top} A ${inner} ${inner} 0 1 0 ${CENTRE} ${CENTRE + inner}`);
		out.push(`A ${inner} ${inner} 0 1 0 ${CENTRE} ${top} Z`);
	} else {
		// Ends run a little aslant, as a break does.
		out.push(`L ${point(inner, to - 0.25, teeth)}`);
		out.push(`A ${inner} ${inner} 0 ${large} 0 ${point(inner, from + 0.25, teeth)} Z`);
	}
	return out.join(' ');
}

/** Dots of the rim that cannot be said: centres in the same box. */
export function rimDots(teeth: number): { x: number; y: number; r: number }[] {
	const count = teeth <= 8 ? 10 : teeth <= 12 ? 14 : 22;
	const r = teeth <= 8 ? 6.5 : teeth <= 12 ? 4.8 : 3.2;
	return Array.from({ length: count }, (_, i) => {
		const [x, y] = place(44, (i / count) * teeth, teeth);
		return { x, y, r };
	});
}

function place(radius: number, tooth: number, teeth: number): [number, number] {
	const angle = (tooth / teeth) * 2 * Math.PI - Math.PI / 2;
	return [round(CENTRE + radius * Math.cos(angle)), round(CENTRE + radius * Math.sin(angle))];
}

function point(radius: number, tooth: number, teeth: number): string {
	return place(radius, tooth, teeth).join(' ');
}

function arc(radius: number, tooth: number, teeth: number): string {
	return `A ${radius} ${radius} 0 0 1 ${point(radius, tooth, teeth)}`;
}

function round(value: number): number {
	return Math.round(value * 100) / 100;
}
