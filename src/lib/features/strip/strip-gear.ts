/**
 * Several neighbouring teeth of one gear at 1:1, as an outline in millimetres: an arc of the real gear, its middle
 * tooth upright. The teeth are those of the core; a gear that no rack cuts comes back as the core's reason.
 */
import type { Reason } from '$lib/gear/contract';
import type { Point } from '$lib/gear/fillet';
import { rackOf } from '$lib/gear/rack';
import { generateTooth, halfThicknessAngle, toothOutline, type Tooth } from '$lib/gear/tooth';

export interface StripGear {
	label: string;
	teeth: number;
	/** mm. */
	module: number;
	/** Degrees. */
	pressureAngle: number;
	form: 'full-depth' | 'stub';
	/** In modules. */
	profileShift: number;
}

/** Lengths in mm; points from the upper left corner, x to the right, y downwards. */
export interface StripDrawing {
	/** Closed SVG path. */
	path: string;
	width: number;
	height: number;
	/** How many teeth are drawn, always an odd number. */
	drawn: number;
	/** Of how many. */
	teeth: number;
	/** Middle of each tip, from the left. */
	tips: Point[];
	/** The gear's own centre, which lies below the drawing or in its arch. */
	centre: Point;
	tipRadius: number;
	pitchRadius: number;
	rootRadius: number;
	/** From the middle of the first tip to the middle of the last. */
	overTips: number;
}

const FEWEST = 5;
/**
 * Beyond the fewest, no more of the gear is drawn than a quarter, and no tip lies lower than this below the upright one
 * (mm): the arc would grow higher rather than longer, and fewer gears could be seen together.
 */
const LARGEST_HALF_ANGLE = Math.PI / 4;
const LARGEST_DROP = 12;
/** Points on each curve of a tooth by module (mm): a flank is then true to less than 0.005 mm, in any size. */
const stepsOf = (module: number) => Math.min(48, Math.max(12, Math.ceil(4 * module)));
/** Points on the rim below each tooth. */
const RIM_STEPS = 8;
/** Rim below the root in modules, where the gear is large enough. */
const RIM = 1.25;

/** @param width what is to be filled, mm; five teeth are drawn also where they need more. */
export function stripDrawing(gear: StripGear, width: number): StripDrawing | Reason {
	const { teeth, module, profileShift } = gear;
	const rack = rackOf(gear.form, (gear.pressureAngle * Math.PI) / 180);
	const tooth = generateTooth({ teeth, rack, profileShift, tipWear: 0 });
	if ('code' in tooth) return tooth;

	const drawn = teethWithin(tooth, width / module, LARGEST_DROP / module);
	const turns = Array.from({ length: drawn }, (_, i) => ((i - (drawn - 1) / 2) * 2 * Math.PI) / teeth);
	const outline = toothOutline(tooth, stepsOf(module));
	const edge = turns.flatMap((turn, i) => (i === 0 ? outline : outline.slice(1)).map(turnedBy(turn)));
	const all = [...edge, ...rimBelow(tooth, drawn)];

	const left = Math.min(...all.map(({ x }) => x));
	const lowest = Math.min(...all.map(({ y }) => y));
	const place = ({ x, y }: Point): Point => ({
		x: module * (x - left),
		y: module * (tooth.tipRadius - y)
	});
	const points = all.map(place).map(({ x, y }) => `${x.toFixed(4)} ${y.toFixed(4)}`);
	return {
		path: `M ${points.join(' L ')} Z`,
		width: -2 * left * module,
		height: module * (tooth.tipRadius - lowest),
		drawn,
		teeth,
		tips: turns.map((turn) => place(turnedBy(turn)({ x: 0, y: tooth.tipRadius }))),
		centre: place({ x: 0, y: 0 }),
		tipRadius: module * tooth.tipRadius,
		pitchRadius: module * tooth.pitchRadius,
		rootRadius: module * tooth.rootRadius,
		overTips: 2 * module * tooth.tipRadius * Math.sin(((drawn - 1) * Math.PI) / teeth)
	};
}

/** The largest odd number whose arc is no wider, no lower at its ends (modules) and no longer than a quarter. */
function teethWithin(tooth: Tooth, width: number, drop: number): number {
	const { teeth, tipRadius, rootRadius } = tooth;
	const atTip = halfThicknessAngle(tooth, tipRadius);
	const fits = (count: number) => {
		const lastTip = ((count - 1) * Math.PI) / teeth;
		if (lastTip > LARGEST_HALF_ANGLE || tipRadius * (1 - Math.cos(lastTip)) > drop) return false;
		/** Half of it: to the outer corner of the last tip, or to the end of the space beside it. */
		const across = [tipRadius * Math.sin(lastTip + atTip), rootRadius * Math.sin((count * Math.PI) / teeth)];
		return 2 * Math.max(...across) <= width;
	};
	let count = FEWEST;
	while (fits(count + 2)) count += 2;
	return count;
}

/** The inner edge, from the right end of the arc back to its left. */
function rimBelow({ teeth, rootRadius }: Tooth, drawn: number): Point[] {
	const inner = rootRadius - Math.min(RIM, rootRadius / 2);
	const half = (drawn * Math.PI) / teeth;
	const steps = RIM_STEPS * drawn;
	return Array.from({ length: steps + 1 }, (_, i) => {
		const angle = half * (1 - (2 * i) / steps);
		return { x: inner * Math.sin(angle), y: inner * Math.cos(angle) };
	});
}

function turnedBy(turn: number): (point: Point) => Point {
	const [sine, cosine] = [Math.sin(turn), Math.cos(turn)];
	return ({ x, y }) => ({ x: x * cosine + y * sine, y: y * cosine - x * sine });
}
