/**
 * How much shift, tip loss and thickness loss gears have, in modules: mixtures of normal distributions, so that they
 * can be integrated out exactly. From memory of shop practice: a sound outside diameter sits a little under nominal and
 * a worn one anywhere below; teeth are cut 0.01 to 0.06 thin for backlash, and wear takes more.
 */
import type { IdentifyInput } from './contract';
import { helixOf } from './helix';

export interface Part {
	weight: number;
	mean: number;
	spread: number;
}

export interface Nuisances {
	shift: readonly Part[];
	tip: readonly Part[];
	thickness: readonly Part[];
	/** Standard uncertainty of the helix as it was read, radians; no mixture, since a protractor is off to both sides. */
	helix: number;
}

/** Of a number of teeth: few are enlarged more often, to keep their roots. */
function shiftParts(teeth: number): Part[] {
	const few = teeth < 17 ? 0.4 : 0;
	const plain = teeth < 17 ? 0.52 : 0.88;
	return [
		{ weight: plain, mean: 0, spread: 0.003 },
		...(few > 0 ? [{ weight: few, mean: Math.min(0.5, (17 - teeth) / 17 + 0.12), spread: 0.13 }] : []),
		{ weight: 1 - plain - few, mean: 0.08, spread: 0.28 }
	];
}

const SOUND_TIP: readonly Part[] = [
	{ weight: 0.82, mean: 0.008, spread: 0.007 },
	{ weight: 0.1, mean: 0.05, spread: 0.03 },
	{ weight: 0.08, mean: 0.16, spread: 0.09 }
];
const WORN_TIP: readonly Part[] = [
	{ weight: 0.3, mean: 0.04, spread: 0.03 },
	{ weight: 0.4, mean: 0.12, spread: 0.06 },
	{ weight: 0.3, mean: 0.26, spread: 0.12 }
];
const SOUND_FLANK: readonly Part[] = [
	{ weight: 0.9, mean: 0.033, spread: 0.015 },
	{ weight: 0.07, mean: 0.08, spread: 0.03 },
	{ weight: 0.03, mean: 0.18, spread: 0.07 }
];
const WORN_FLANK: readonly Part[] = [
	{ weight: 0.35, mean: 0.07, spread: 0.03 },
	{ weight: 0.4, mean: 0.14, spread: 0.05 },
	{ weight: 0.25, mean: 0.26, spread: 0.09 }
];

export function nuisancesOf(input: IdentifyInput, teeth: number): Nuisances {
	return {
		shift: shiftParts(teeth),
		tip: input.outsideDiameter?.tipWorn ? WORN_TIP : SOUND_TIP,
		thickness: input.flanksWorn ? WORN_FLANK : SOUND_FLANK,
		helix: helixOf(input).spread
	};
}

/** One part that stands for a mixture, where no reading depends on it or only a first look is wanted. */
export function whole(parts: readonly Part[]): Part {
	const mean = parts.reduce((sum, part) => sum + part.weight * part.mean, 0);
	const square = parts.reduce((sum, part) => sum + part.weight * (part.spread ** 2 + part.mean ** 2), 0);
	return { weight: 1, mean, spread: Math.sqrt(square - mean * mean) };
}
