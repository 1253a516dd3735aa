/**
 * Gears as plants have them, with the readings that a millwright takes of them: drawn from trade frequencies, cut thin
 * for backlash, worn at tips and flanks, shifted, measured with real tools. Its own geometry and its own seed: it knows
 * nothing of the code that has to find them again. All gears are invented.
 */
import type { IdentifyInput } from '$lib/gear/identify/contract';

export type Random = () => number;

/** The same numbers in every run (mulberry32). */
export function randomOf(seed: number): Random {
	let state = seed >>> 0;
	return () => {
		state = (state + 0x6d2b79f5) >>> 0;
		let t = state;
		t = Math.imul(t ^ (t >>> 15), t | 1);
		t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
		return ((t ^ (t >>> 14)) >>> 0) / 2 ** 32;
	};
}

export interface SyntheticGear {
	origin: 'inch' | 'metric' | 'either';
	module: number;
	/** Degrees. */
	angle: number;
	form: 'full-depth' | 'stub';
	teeth: number;
	shift: number;
	dedendum: number;
	/** In modules: of thickness on the reference circle, and of height. */
	thinned: number;
	tipLoss: number;
	tipWorn: boolean;
	flanksWorn: boolean;
	/** Degrees. */
	helix: number;
}

const normal = (random: Random) => Math.sqrt(-2 * Math.log(1 - random())) * Math.cos(2 * Math.PI * random());
const between = (random: Random, from: number, to: number) => from + (to - from) * random();
const exponential = (random: Random, mean: number) => -mean * Math.log(1 - random());

function drawn<T>(random: Random, of: readonly (readonly [T, number])[]): T {
	let left = random() * of.reduce((sum, [, weight]) => sum + weight, 0);
	for (const [value, weight] of of) {
		left -= weight;
		if (left <= 0) return value;
	}
	return (of.at(-1) as readonly [T, number])[0];
}

// prettier-ignore
const DIAMETRAL: [number, number][] = [
	[1, 0.3], [1.5, 0.3], [2, 1], [2.5, 1], [3, 1], [3.5, 0.3], [4, 1.5], [5, 0.9], [6, 1.5], [7, 0.3], [8, 1.5], [9, 0.2],
	[10, 1.2], [12, 1.2], [14, 0.3], [16, 1], [20, 0.5], [24, 0.3]
];
// prettier-ignore
const MODULES: [number, number][] = [
	[1, 0.8], [1.25, 0.4], [1.5, 1], [2, 1.4], [2.5, 1.2], [3, 1.4], [4, 1.4], [5, 1.3], [6, 1.2], [8, 1], [10, 0.8],
	[12, 0.5], [16, 0.3], [20, 0.2], [1.75, 0.15], [2.25, 0.15], [2.75, 0.15], [3.5, 0.2], [4.5, 0.2], [5.5, 0.15],
	[7, 0.2], [9, 0.15], [14, 0.1]
];
// prettier-ignore
const CIRCULAR: [number, number][] = [
	[0.5, 1], [0.625, 1], [0.75, 1], [0.875, 0.6], [1, 1], [1.125, 0.5], [1.25, 0.7], [1.375, 0.3], [1.5, 0.7], [1.75, 0.4],
	[2, 0.5], [0.6875, 0.05], [0.9375, 0.05]
];

function pitchOf(random: Random, origin: SyntheticGear['origin']): { module: number; system: string } {
	const system = drawn(
		random,
		{
			inch: [
				['diametral', 0.86],
				['module', 0.06],
				['circular', 0.08]
			] as const,
			metric: [
				['diametral', 0.06],
				['module', 0.92],
				['circular', 0.02]
			] as const,
			either: [
				['diametral', 0.46],
				['module', 0.48],
				['circular', 0.06]
			] as const
		}[origin]
	);
	if (system === 'diametral') return { system, module: 25.4 / drawn(random, DIAMETRAL) };
	if (system === 'module') return { system, module: drawn(random, MODULES) };
	return { system, module: (drawn(random, CIRCULAR) * 25.4) / Math.PI };
}

export function syntheticGear(random: Random, change: Partial<SyntheticGear> = {}): SyntheticGear {
	const origin =
		change.origin ??
		drawn(random, [
			['inch', 0.45],
			['metric', 0.45],
			['either', 0.1]
		]);
	const { system, module } = pitchOf(random, origin);
	const [angle, form] = drawn<readonly [number, SyntheticGear['form']]>(
		random,
		system === 'module'
			? [
					[[20, 'full-depth'], 0.9],
					[[15, 'full-depth'], 0.02],
					[[20, 'stub'], 0.03],
					[[25, 'full-depth'], 0.02],
					[[14.5, 'full-depth'], 0.02],
					[[22.5, 'full-depth'], 0.01]
				]
			: system === 'diametral'
				? [
						[[20, 'full-depth'], 0.5],
						[[14.5, 'full-depth'], 0.37],
						[[20, 'stub'], 0.07],
						[[25, 'full-depth'], 0.03],
						[[22.5, 'full-depth'], 0.01],
						[[17.5, 'full-depth'], 0.01]
					]
				: [
						[[14.5, 'full-depth'], 0.62],
						[[15, 'full-depth'], 0.06],
						[[20, 'full-depth'], 0.26],
						[[20, 'stub'], 0.06]
					]
	);
	const teeth = Math.round(10 * 12 ** random());
	const few = teeth < 17 && form === 'full-depth';
	const shift =
		few && random() < 0.4
			? Math.max(0, (17 - teeth) / 17 + between(random, 0, 0.25))
			: random() < 0.1
				? 0.08 + 0.25 * normal(random)
				: 0;
	const tipWorn = random() < 0.2;
	const flanksWorn = random() < 0.2;
	const older = angle < 19 ? 0.95 : system === 'module' ? 0.04 : 0.5;
	return {
		origin,
		module,
		angle,
		form,
		teeth,
		shift: Math.max(-0.5, Math.min(0.7, shift)),
		dedendum: form === 'stub' ? 1 : random() < older ? 1.157 : 1.25,
		thinned: between(random, 0.01, 0.06) + (flanksWorn ? 0.02 + exponential(random, 0.1) : 0),
		tipLoss: between(random, 0, 0.016) + (tipWorn ? 0.02 + exponential(random, 0.12) : 0),
		tipWorn,
		flanksWorn,
		helix: 0,
		...change
	};
}

const radians = (degrees: number) => (degrees * Math.PI) / 180;
const inv = (angle: number) => Math.tan(angle) - angle;

/** What the gear truly measures, mm, by geometry written anew. */
export function truth(gear: SyntheticGear) {
	const { module: m, teeth: N, shift: x, helix, form, dedendum, tipLoss, thinned } = gear;
	const addendum = form === 'stub' ? 0.8 : 1;
	const alpha = radians(gear.angle);
	const beta = radians(helix);
	const pitch = (m * N) / Math.cos(beta);
	const tip = pitch + 2 * m * (addendum + x - tipLoss);
	const root = pitch + 2 * m * (x - dedendum);
	const transverse = Math.atan(Math.tan(alpha) / Math.cos(beta));
	return {
		tip,
		root,
		depth: (tip - root) / 2,
		span: (k: number) =>
			m * (Math.cos(alpha) * (Math.PI * (k - 0.5) + N * inv(transverse)) + 2 * x * Math.sin(alpha)) -
			thinned * m * Math.cos(alpha),
		/** How many teeth a person would span: the jaws near mid-height. */
		spanTeeth: Math.max(2, Math.round((N / Math.cos(beta) ** 3) * (gear.angle / 180) + 0.5))
	};
}

export type Reading = 'outsideDiameter' | 'rootDiameter' | 'wholeDepth' | 'spans' | 'one-span';

/** Readings as typed: a tool's error on each, rounded to what the tool shows, in the unit of the plant. */
export function readingsOf(
	gear: SyntheticGear,
	taken: readonly Reading[],
	random: Random,
	{ told = 0.85 }: { told?: number } = {}
): IdentifyInput {
	const { tip, root, depth, span, spanTeeth } = truth(gear);
	const unit = gear.origin === 'metric' || (gear.origin === 'either' && random() < 0.5) ? 'mm' : 'in';
	const per = unit === 'in' ? 25.4 : 1;
	const shown = (value: number, sigma: number) => {
		const step = unit === 'in' ? 0.001 : 0.01;
		return {
			value: Math.round((value + sigma * normal(random)) / per / step) * step,
			unit: unit as 'in' | 'mm',
			uncertainty: sigma / per
		};
	};
	const odd = gear.teeth % 2 === 1;
	const way = odd
		? drawn(random, [
				['over-tips', 0.6],
				['tip-to-gap', 0.2],
				['pi-tape', 0.2]
			] as const)
		: 'over-tips';
	const chord = Math.cos(Math.PI / (2 * gear.teeth));
	const read = way === 'pi-tape' || !odd ? tip : way === 'over-tips' ? tip * chord : tip * chord * chord;
	const calliper = tip > 150 ? 0.04 : 0.025;
	// Half of the shops have a disc micrometer for spans; it reaches 50 mm.
	const micrometer = random() < 0.5;
	const acrossTeeth = (value: number) => shown(value, micrometer && value < 50 ? 0.006 : 0.025);
	return {
		teeth: gear.teeth,
		prior: gear.origin,
		...(taken.includes('outsideDiameter')
			? {
					outsideDiameter: {
						...shown(read, calliper),
						taken: way,
						tipWorn: gear.tipWorn && random() < told
					}
				}
			: {}),
		...(taken.includes('rootDiameter') ? { rootDiameter: shown(root, 0.05) } : {}),
		...(taken.includes('wholeDepth') ? { wholeDepth: shown(depth, 0.05) } : {}),
		...(taken.includes('spans') || taken.includes('one-span')
			? {
					spans: [spanTeeth, spanTeeth + 1]
						.slice(0, taken.includes('one-span') ? 1 : 2)
						.map((k) => ({ teeth: k, ...acrossTeeth(span(k)) }))
				}
			: {}),
		...(gear.flanksWorn && random() < told ? { flanksWorn: true } : {})
	};
}
