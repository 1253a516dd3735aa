/**
 * The other explanation: a toothed wheel that is no involute gear of the set (a cycloidal one, a sprocket, a gear of a
 * pitch of its own), or readings that belong to no one gear. Its readings hang together only roughly.
 */
import { involute } from '../involute';
import type { Observation } from './observations';

/** From memory: of the wheels that are measured, one in fifty. */
export const NONE_FITS_PRIOR = 0.02;

/** A pitch of its own may be anything from half a millimetre to a hundred: uniform in the logarithm. */
const SIZES = Math.log(200);

interface Wheel {
	/** Its share of the wheels that are no involute gear of the set, from memory. */
	share: number;
	/** What differs from a gear's sizes, in modules: added to the teeth across, and the depth itself. */
	sizes: { tips: number; roots: number; depth: number };
	/** How far its readings stray from those sizes, in modules. */
	stray: Record<Observation['reading'], number>;
}

const ANY_STRAY: Wheel['stray'] = {
	outsideDiameter: 0.3,
	wholeDepth: 0.15,
	rootDiameter: 0.3,
	spans: 0.08,
	overPins: 0.35,
	chordalThickness: 0.25,
	centreDistance: 0.4,
	circularPitch: 0.2
};

/**
 * Anything, and the cast wheels of the old cycloidal system, whose height is known: addendum 0.3 p, dedendum 0.35 p
 * (Machinery's Handbook, from memory), cast roughly.
 */
const WHEELS: readonly Wheel[] = [
	{ share: 0.5, sizes: { tips: 2, roots: -2.4, depth: 2.2 }, stray: ANY_STRAY },
	{
		share: 0.5,
		sizes: { tips: 0.6 * Math.PI, roots: -0.7 * Math.PI, depth: 0.65 * Math.PI },
		stray: { ...ANY_STRAY, outsideDiameter: 0.04, wholeDepth: 0.03, rootDiameter: 0.04 }
	}
];

/** Spans over neighbouring counts stray alike, and each by itself only as its wheel does, in modules. */
const SPANS_TOGETHER = 0.15;

const ANGLE = (20 * Math.PI) / 180;

/** Log density of the readings, mm⁻ⁿ, the size of the wheel taken from the first. */
export function noneFitsEvidence(
	observations: readonly Observation[],
	teeth: number,
	mateTeeth: number | null
): number {
	const logs = WHEELS.map(
		(wheel) => Math.log(wheel.share) + wheelEvidence(wheel, observations, teeth, mateTeeth)
	);
	const highest = Math.max(...logs);
	return highest + Math.log(logs.reduce((sum, log) => sum + Math.exp(log - highest), 0));
}

function wheelEvidence(
	{ sizes, stray }: Wheel,
	observations: readonly Observation[],
	teeth: number,
	mateTeeth: number | null
): number {
	const [first, ...rest] = observations;
	if (!first) return 0;
	const perModule = (observation: Observation) => {
		switch (observation.reading) {
			case 'outsideDiameter':
				return teeth + sizes.tips;
			case 'rootDiameter':
				return Math.max(1, teeth + sizes.roots);
			case 'wholeDepth':
				return sizes.depth;
			default:
				return sizeOf(observation, teeth, mateTeeth);
		}
	};
	const module = Math.abs(first.value) / perModule(first);
	/** How far all spans stray together, mm: as known before any of them, then from each to the next. */
	let together = { middle: 0, variance: (SPANS_TOGETHER * module) ** 2 };
	let log = -Math.log(Math.abs(first.value) * SIZES);
	for (const observation of rest) {
		const { reading, sigma, value } = observation;
		const own2 = (stray[reading] * module) ** 2 + sigma * sigma;
		const shared = reading === 'spans' ? together : { middle: 0, variance: 0 };
		const variance = own2 + shared.variance;
		const away = value - module * perModule(observation) - shared.middle;
		log -= (away * away) / variance / 2 + Math.log(2 * Math.PI * variance) / 2;
		if (reading === 'spans') {
			together = {
				middle: shared.middle + (away * shared.variance) / variance,
				variance: (own2 * shared.variance) / variance
			};
		}
	}
	return log;
}

/** What the reading is on a gear of module 1, roughly: within a third of it for any gear of the set. */
export function sizeOf(
	{ reading, spanTeeth, pin }: Observation,
	teeth: number,
	mateTeeth: number | null
): number {
	switch (reading) {
		case 'outsideDiameter':
			return teeth + 2;
		case 'rootDiameter':
			return Math.max(1, teeth - 2.4);
		case 'wholeDepth':
			return 2.2;
		case 'spans':
			return Math.cos(ANGLE) * (Math.PI * ((spanTeeth ?? 2) - 0.5) + teeth * involute(ANGLE));
		case 'overPins':
			return pin === undefined ? teeth + 2 : teeth + 2.4;
		case 'chordalThickness':
			return Math.PI / 2;
		case 'centreDistance':
			return (teeth + (mateTeeth ?? teeth)) / 2;
		case 'circularPitch':
			return Math.PI;
	}
}
