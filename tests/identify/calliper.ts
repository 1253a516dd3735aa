/**
 * What the parallel jaws of a calliper read across k teeth, whether they find flanks or not: the widest that lies
 * between them, on a tooth drawn point by point. Knows the cutting rack and nothing of spans. Spur gears; mm.
 */
import type { Random, SyntheticGear } from './synthetic-gears';

interface Point {
	radius: number;
	/** From the middle of the tooth, radians. */
	angle: number;
}

const POINTS = 240;
const inv = (angle: number) => Math.tan(angle) - angle;
const steps = (from: number, to: number) =>
	Array.from({ length: POINTS + 1 }, (_, i) => from + ((to - from) * i) / POINTS);

/** One side of a tooth from the root to the tip, in modules: the trace of the rack's rounded corner and the involute. */
function profile({
	teeth: N,
	angle,
	shift: x,
	dedendum: hf,
	form,
	tipLoss,
	thinned
}: SyntheticGear): Point[] {
	const alpha = (angle * Math.PI) / 180;
	const r = N / 2;
	const addendum = form === 'stub' ? 0.8 : 1;
	const tip = r + addendum + x - tipLoss;
	const rho = Math.min(0.3, (hf - addendum) / (1 - Math.sin(alpha)));
	// The corner's centre: from the middle of the rack's tooth, and below the pitch point.
	const aside = Math.PI / 4 - (hf - rho) * Math.tan(alpha) - rho / Math.cos(alpha);
	const below = hf - rho - x;
	const corner = steps(0, below / Math.tan(alpha)).map((ahead): Point => {
		const away = Math.hypot(ahead, below);
		const [px, py] = [ahead + (rho * ahead) / away, r - below - (rho * below) / away];
		// Rolling on by `ahead - aside` turns the gear; seen from the gear the rack's tooth stays in its space.
		return { radius: Math.hypot(px, py), angle: Math.PI / N - (Math.atan2(px, py) - (ahead - aside) / r) };
	});
	const base = r * Math.cos(alpha);
	const half = (Math.PI / 2 + 2 * x * Math.tan(alpha)) / N + inv(alpha);
	const involute = (radius: number) => half - inv(Math.acos(base / radius));
	const ends = corner.at(-1)?.radius ?? base;
	// Where the corner cut into the flank, what it left counts; below the base circle there is nothing else.
	return steps(corner[0]?.radius ?? base, tip).map((radius) => ({
		radius,
		angle:
			Math.min(
				radius < ends ? between(corner, radius) : Infinity,
				radius >= base ? involute(radius) : Infinity
			) -
			thinned / N
	}));
}

function between(points: readonly Point[], radius: number): number {
	const after = Math.max(
		1,
		points.findIndex((point) => point.radius > radius)
	);
	const [one, two] = [points[after - 1], points[after]];
	if (!one || !two) return NaN;
	return one.angle + ((two.angle - one.angle) * (radius - one.radius)) / (two.radius - one.radius);
}

/** A calliper across teeth: over how many, held how far askew, its jaws how far above the root. */
interface Hold {
	k: number;
	/** Radians. */
	askew: number;
	/** Modules. */
	aboveRoot: number;
}

/** mm. */
export function reading(gear: SyntheticGear, { k, askew, aboveRoot }: Hold): number {
	const side = profile(gear);
	const middle = ((k - 1) * Math.PI) / gear.teeth;
	const root = gear.teeth / 2 + gear.shift - gear.dedendum;
	const jaw = (turned: number) => {
		const deepest = (root + aboveRoot) * Math.cos(middle + turned);
		return side.reduce((widest, { radius, angle }) => {
			const at = middle + angle + turned;
			return radius * Math.cos(at) >= deepest ? Math.max(widest, radius * Math.sin(at)) : widest;
		}, 0);
	};
	return gear.module * (jaw(askew) + jaw(-askew));
}

/** As a person holds it: within a degree of square, the jaws anywhere between the bottom and half a module above. */
export function held(k: number, random: Random): Hold {
	return { k, askew: ((2 * random() - 1) * Math.PI) / 180, aboveRoot: 0.05 + 0.5 * random() };
}
