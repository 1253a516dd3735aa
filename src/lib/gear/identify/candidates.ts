/**
 * The finite set of gears that the trade made, with how often each is met. Frequencies are from memory of what is
 * found in plants, not from a survey; a machine's origin moves them.
 */
import { COARSE_PITCHES, FINE_PITCHES, STOCK_CUTTER_PITCHES } from '../tables/ansi-b6-1-1968';
import { MODULES_BELOW_1, MODULES_SERIES_I, MODULES_SERIES_II } from '../tables/iso-54-1996';
import type { Candidate, IdentifyInput } from './contract';

export interface Kind {
	system: Candidate['system'];
	value: number;
	/** mm. */
	module: number;
	/** Degrees. */
	pressureAngle: number;
	form: Candidate['form'];
	/** Natural logarithm of the prior probability. */
	logPrior: number;
}

interface PitchEntry {
	system: Candidate['system'];
	value: number;
	module: number;
	weight: number;
}

const pitches = (
	system: Candidate['system'],
	values: readonly number[],
	weight: number,
	moduleOf: (value: number) => number
): PitchEntry[] => values.map((value) => ({ system, value, module: moduleOf(value), weight }));

const byDiametral = (value: number) => 25.4 / value;
const byCircular = (value: number) => (value * 25.4) / Math.PI;

/** Sixteenths of an inch from 1/4 to 4; old cast gears have the whole eighths far more often. */
const SIXTEENTHS = Array.from({ length: 61 }, (_, i) => (i + 4) / 16);
const isEighth = (inches: number) => Number.isInteger(inches * 8);

const PITCHES: Record<Candidate['system'], PitchEntry[]> = {
	diametral: [
		...pitches('diametral', COARSE_PITCHES, 1, byDiametral),
		...pitches('diametral', FINE_PITCHES, 0.3, byDiametral),
		...pitches('diametral', STOCK_CUTTER_PITCHES, 0.35, byDiametral)
	],
	module: [
		...pitches('module', MODULES_SERIES_I, 1, (value) => value),
		...pitches('module', MODULES_SERIES_II, 0.2, (value) => value),
		...pitches('module', MODULES_BELOW_1, 0.2, (value) => value)
	],
	circular: [
		...pitches('circular', SIXTEENTHS.filter(isEighth), 1, byCircular),
		...pitches(
			'circular',
			SIXTEENTHS.filter((value) => !isEighth(value)),
			0.1,
			byCircular
		)
	]
};

/** Share of each system by the origin of the machine. */
const SYSTEMS: Record<NonNullable<IdentifyInput['prior']>, Record<Candidate['system'], number>> = {
	inch: { diametral: 0.84, module: 0.08, circular: 0.08 },
	metric: { diametral: 0.07, module: 0.91, circular: 0.02 },
	either: { diametral: 0.46, module: 0.48, circular: 0.06 }
};

/** Pressure angle and form by system, in shares. 14.5 degrees is the older inch standard, 20 the present one. */
const SHAPES: Record<Candidate['system'], [angle: number, form: Candidate['form'], share: number][]> = {
	diametral: [
		[20, 'full-depth', 0.5],
		[14.5, 'full-depth', 0.37],
		[20, 'stub', 0.07],
		[25, 'full-depth', 0.03],
		[22.5, 'full-depth', 0.015],
		[17.5, 'full-depth', 0.01],
		[15, 'full-depth', 0.005]
	],
	module: [
		[20, 'full-depth', 0.9],
		[15, 'full-depth', 0.02],
		[20, 'stub', 0.03],
		[25, 'full-depth', 0.015],
		[22.5, 'full-depth', 0.01],
		[17.5, 'full-depth', 0.01],
		[14.5, 'full-depth', 0.015]
	],
	circular: [
		[14.5, 'full-depth', 0.62],
		[15, 'full-depth', 0.06],
		[20, 'full-depth', 0.24],
		[20, 'stub', 0.05],
		[22.5, 'full-depth', 0.01],
		[17.5, 'full-depth', 0.01],
		[25, 'full-depth', 0.01]
	]
};

/** Every gear of the set with its prior for a machine of this origin. */
export function kindsFor(origin: NonNullable<IdentifyInput['prior']>): readonly Kind[] {
	return (kept[origin] ??= kinds(SYSTEMS[origin]));
}

const kept: Partial<Record<NonNullable<IdentifyInput['prior']>, Kind[]>> = {};

function kinds(shares: Record<Candidate['system'], number>): Kind[] {
	return Object.values(PITCHES).flatMap((entries) => {
		const all = entries.reduce((sum, { weight }) => sum + weight, 0);
		return entries.flatMap(({ system, value, module, weight }) =>
			SHAPES[system].map(([pressureAngle, form, share]) => ({
				system,
				value,
				module,
				pressureAngle,
				form,
				logPrior: Math.log((shares[system] * weight * share) / all)
			}))
		);
	});
}
