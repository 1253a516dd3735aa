/**
 * Cast wheels with cycloidal teeth, as old mills have them, and what a calliper reads of them: no involute gear. Made
 * with the describing circle of a 15 tooth pinion with radial flanks and the proportions of the old cast-tooth system
 * (addendum 0.3 p, dedendum 0.35 p; Machinery's Handbook, from memory). All invented.
 */
import type { IdentifyInput } from '$lib/gear/identify/contract';
import type { Random } from './synthetic-gears';

const DESCRIBING = 15 / 4;

/** Half the tooth's thickness as an angle at a radius; module 1, pitch radius r. Found by halving, not by formula. */
function halfAngle(r: number, radius: number): number {
	const outside = radius >= r;
	const sign = outside ? 1 : -1;
	const centre = r + sign * DESCRIBING;
	const at = (rolled: number) => {
		// The describing circle rolls by an angle on the pitch circle; its point leaves it.
		const turned = (rolled * DESCRIBING) / r;
		const x = centre * Math.cos(turned) - sign * DESCRIBING * Math.cos(rolled + sign * turned);
		const y = centre * Math.sin(turned) - DESCRIBING * Math.sin(rolled + sign * turned) * 1;
		return { radius: Math.hypot(x, y), angle: Math.atan2(y, x) };
	};
	let [low, high] = [0, Math.PI];
	for (let halving = 0; halving < 50; halving++) {
		const middle = (low + high) / 2;
		if (Math.abs(at(middle).radius - r) < Math.abs(radius - r)) low = middle;
		else high = middle;
	}
	const away = Math.abs(at(low).angle);
	const atPitch = Math.PI / (2 * 2 * r);
	return outside ? atPitch - away : atPitch + away;
}

/** What parallel jaws read over k teeth: the widest that the two outer flanks reach. */
function span(teeth: number, k: number): number {
	const r = teeth / 2;
	const [root, tip] = [r - 0.35 * Math.PI, r + 0.3 * Math.PI];
	let widest = 0;
	for (let i = 0; i <= 200; i++) {
		const radius = root + ((tip - root) * i) / 200;
		widest = Math.max(widest, radius * Math.sin(((k - 1) * Math.PI) / teeth + halfAngle(r, radius)));
	}
	return 2 * widest;
}

export function cycloidalReadings(random: Random): IdentifyInput {
	const teeth = Math.round(16 * 5 ** random());
	const pitches = [0.75, 0.875, 1, 1.125, 1.25, 1.5, 1.75, 2, 2.5];
	const module = ((pitches[Math.floor(random() * pitches.length)] ?? 1) * 25.4) / Math.PI;
	const normal = () => Math.sqrt(-2 * Math.log(1 - random())) * Math.cos(2 * Math.PI * random());
	// Cast flanks are rough, and were cast thin.
	const rough = () => 0.004 * module * normal();
	const thin = 0.02 + 0.04 * random();
	const k = Math.max(2, Math.round(teeth / 9 + 0.5));
	const inches = (value: number, sigma: number) => ({
		value: Math.round((value + sigma * normal()) / 0.0254) / 1000,
		unit: 'in' as const,
		uncertainty: sigma / 25.4
	});
	return {
		teeth,
		prior: 'inch',
		outsideDiameter: { ...inches(module * (teeth + 0.6 * Math.PI) + rough(), 0.04), taken: 'pi-tape' },
		wholeDepth: inches(module * 0.65 * Math.PI + rough(), 0.05),
		spans: [k - 1, k, k + 1, k + 2]
			.filter((n) => n >= 2)
			.map((n) => ({
				teeth: n,
				...inches(module * (span(teeth, n) - thin) + rough(), 0.03)
			}))
	};
}
