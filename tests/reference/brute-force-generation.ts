/**
 * A tooth generated without any formula of involute or trochoid: the rack's outline is rolled past the blank in small
 * steps, and at each radius the deepest cut counts. The parabola is then found on the points alone. Kept to check the
 * core against; it is slow and knows nothing of it.
 */

export interface Cut {
	teeth: number;
	addendum: number;
	dedendum: number;
	tipRadius: number;
	/** Radians. */
	pressureAngle: number;
	profileShift: number;
	tipWear: number;
}

interface Vertex {
	x: number;
	/** Above the rolling line. */
	y: number;
	/** Whether the point lies on the rounded tip or its land, not on the straight flank. */
	tip: boolean;
}

const ROLLS = 1500;
const LEVELS = 700;

/** The tool's outline on the side that cuts the tooth's right flank, from above the tip circle down to its land. */
function toolOutline({ addendum, dedendum, tipRadius, pressureAngle, profileShift }: Cut): Vertex[] {
	const tangent = Math.tan(pressureAngle);
	const flankEnd = dedendum - tipRadius * (1 - Math.sin(pressureAngle));
	const outline: Vertex[] = [];
	const add = (x: number, depth: number, tip: boolean) => outline.push({ x, y: profileShift - depth, tip });
	const steps = 260;
	const top = -addendum - 0.6;
	for (let i = 0; i <= steps; i++) {
		const depth = top + ((flankEnd - top) * i) / steps;
		add(Math.PI / 4 + depth * tangent, depth, false);
	}
	const centreX = Math.PI / 4 + flankEnd * tangent + tipRadius * Math.cos(pressureAngle);
	const centreDepth = dedendum - tipRadius;
	for (let i = 0; i <= 160; i++) {
		const angle = pressureAngle + ((Math.PI / 2 - pressureAngle) * i) / 160;
		add(centreX - tipRadius * Math.cos(angle), centreDepth + tipRadius * Math.sin(angle), true);
	}
	for (let i = 1; i <= 20; i++) add(centreX + ((Math.PI / 2 - centreX) * i) / 20, dedendum, true);
	return outline;
}

/** Half thickness angle at each level from root to tip, and whether the tool's tip cut it; the rack rolls in from `reach`. */
function sweep(cut: Cut, reach = 5) {
	const { teeth, addendum, dedendum, profileShift, tipWear } = cut;
	const radius = teeth / 2;
	const root = radius - dedendum + profileShift;
	const tip = radius + addendum + profileShift - tipWear;
	const level = (i: number) => root + ((tip - root) * i) / LEVELS;
	const angles = new Float64Array(LEVELS + 1).fill(Infinity);
	const byTip = new Uint8Array(LEVELS + 1);
	const outline = toolOutline(cut);
	for (let roll = 0; roll <= ROLLS; roll++) {
		const moved = -reach + ((reach + 4) * roll) / ROLLS;
		let last: { radius: number; angle: number } | null = null;
		for (const { x, y, tip: onTip } of outline) {
			const at = {
				radius: Math.hypot(x + moved, radius + y),
				angle: Math.atan2(x + moved, radius + y) - moved / radius
			};
			if (last) {
				const scale = LEVELS / (tip - root);
				const low = Math.min(last.radius, at.radius);
				const high = Math.max(last.radius, at.radius);
				const from = Math.max(0, Math.ceil((low - root) * scale));
				const to = Math.min(LEVELS, Math.floor((high - root) * scale));
				for (let i = from; i <= to; i++) {
					const share = high === low ? 0 : (level(i) - last.radius) / (at.radius - last.radius);
					const angle = last.angle + share * (at.angle - last.angle);
					if (angle < (angles[i] ?? Infinity)) {
						angles[i] = angle;
						byTip[i] = onTip ? 1 : 0;
					}
				}
			}
			last = at;
		}
	}
	return { level, angles, byTip };
}

/** Lewis's Y at the tip of the swept tooth, from its points: tangent parabola on the part that the tool's tip cut. */
export function bruteForceFormFactor(cut: Cut): number {
	const { level, angles, byTip } = sweep(cut);
	const point = (i: number) => ({
		x: level(i) * Math.sin(angles[i] ?? NaN),
		y: level(i) * Math.cos(angles[i] ?? NaN)
	});
	// The flank's direction at the tip from three points: a parabola through them, its slope at the last.
	const step = 20;
	const [a, b, c] = [point(LEVELS - 2 * step), point(LEVELS - step), point(LEVELS)];
	const slope = (3 * c.x - 4 * b.x + a.x) / (3 * c.y - 4 * b.y + a.y);
	// The load is square to the flank: it meets the centre line at x = 0.
	const vertex = c.y + slope * c.x;
	let least = Infinity;
	for (let i = 1; i < LEVELS; i++) {
		const { x, y } = point(i);
		if (byTip[i] && y < vertex && Number.isFinite(x)) least = Math.min(least, (x * x) / (vertex - y));
	}
	return (2 / 3) * least;
}

/** What the swept tooth shows to be wrong with it, if anything: flanks that meet, or none left at the pitch circle. */
export function sweptFault(cut: Cut): 'pointed' | 'no-flank-at-pitch-circle' | null {
	// A rack that is shifted far inwards touches early.
	const { level, angles, byTip } = sweep(cut, 10);
	const atPitch = angles.findIndex((_, i) => level(i) >= cut.teeth / 2);
	if (byTip[atPitch]) return 'no-flank-at-pitch-circle';
	return (angles[LEVELS] ?? NaN) <= 0 ? 'pointed' : null;
}
