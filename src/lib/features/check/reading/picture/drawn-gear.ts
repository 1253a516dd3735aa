/**
 * The gear in the pictures that show how a reading is taken: a 20 degree gear with the teeth that were counted, as far
 * as so many can be drawn, generated as every other tooth here. In pixels of the picture; nothing is computed from it.
 */
import { rackOf } from '$lib/gear/rack';
import { involute } from '$lib/gear/involute';
import { generateTooth, toothOutline } from '$lib/gear/tooth';

export interface DrawnGear {
	/** Outline, closed. */
	path: string;
	teeth: number;
	cx: number;
	cy: number;
	module: number;
	tip: number;
	root: number;
	pitch: number;
	base: number;
}

const ANGLE = Math.PI / 9;
const FEWEST = 12;
const MOST = 60;
/** Points on each curve of a tooth: at this size more cannot be seen. */
const STEPS = 3;

export function drawnTeeth(teeth: number | null): number {
	return Math.min(MOST, Math.max(FEWEST, teeth ?? 24));
}

/** @param spaceOnTop whether a space stands at twelve o'clock instead of a tooth */
export function drawnGear(
	count: number | null,
	{ cx, cy, tip, spaceOnTop = false }: { cx: number; cy: number; tip: number; spaceOnTop?: boolean }
): DrawnGear {
	const teeth = drawnTeeth(count);
	const tooth = generateTooth({ teeth, rack: rackOf('full-depth', ANGLE), profileShift: 0, tipWear: 0 });
	if (!('tipRadius' in tooth)) throw new RangeError(`No tooth to draw: ${tooth.text}`);
	const module = tip / tooth.tipRadius;
	const outline = toothOutline(tooth, STEPS);
	const points = Array.from({ length: teeth }, (_, i) => {
		const turn = ((i + (spaceOnTop ? 0.5 : 0)) * 2 * Math.PI) / teeth;
		const [sin, cos] = [Math.sin(turn), Math.cos(turn)];
		return outline.slice(1).map(({ x, y }) => {
			const across = cx + module * (x * cos + y * sin);
			const down = cy - module * (y * cos - x * sin);
			return `${across.toFixed(1)} ${down.toFixed(1)}`;
		});
	});
	return {
		path: `M ${points.flat().join(' L ')} Z`,
		teeth,
		cx,
		cy,
		module,
		tip,
		root: tooth.rootRadius * module,
		pitch: tooth.pitchRadius * module,
		base: tooth.baseRadius * module
	};
}

/** Half the span over k teeth of the drawn gear. */
export function halfSpan({ module, teeth }: DrawnGear, k: number): number {
	return (module * Math.cos(ANGLE) * (Math.PI * (k - 0.5) + teeth * involute(ANGLE))) / 2;
}

/** A point of the drawn gear at a radius and an angle in teeth, clockwise from twelve o'clock. */
export function pointAt(
	{ cx, cy, teeth }: DrawnGear,
	radius: number,
	tooth: number
): { x: number; y: number } {
	const turn = (tooth * 2 * Math.PI) / teeth;
	return { x: cx + radius * Math.sin(turn), y: cy - radius * Math.cos(turn) };
}
