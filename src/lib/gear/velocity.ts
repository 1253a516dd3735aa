/**
 * Pitch-line velocity, and what it does to the stress: Barth's velocity factor by finish. The laws are exact in
 * ft/min, so the velocity is converted once and the constants stay as published.
 */
import type { CutLaw, Finish, Rules } from './contract';
import { fromSI, toSI } from './quantity';
import { SOURCES } from './sources';
import { unrecorded, type Recorder } from './working';

/** Which law a factor comes from. `cut` is (1200 + V) / 1200; `cut-600` is the older reading of "cut". */
export type VelocityLaw = 'cast' | 'cut' | 'cut-600' | 'hobbed' | 'ground' | 'non-metallic';

interface Law {
	/** Kv >= 1, which multiplies the stress; V in ft/min. */
	expression: string;
	factor: (V: number) => number;
	/** V/Kv · dKv/dV: the part of a relative error in V that reaches Kv. */
	shareExpression: string;
	share: (V: number) => number;
	/** Usual end of range in ft/min. */
	end: number;
	/** The furthest that any text goes, where that is further. */
	furthest?: number;
	source: string;
}

const linear = (constant: number, end: number, source: string): Law => ({
	expression: `(${constant} + Vf) / ${constant}`,
	factor: (V) => (constant + V) / constant,
	shareExpression: `Vf / (${constant} + Vf)`,
	share: (V) => V / (constant + V),
	end,
	source
});

/**
 * Ends of range. Cast: 1,000 ft/min, 2,000 in older texts, which a plant that follows them states as its speed limit.
 * Cut: 2,000 ft/min by the 600 law, 4,000 ft/min by the 1200 law (Faires; Doughtie & Vallance, from memory).
 * Hobbed: 4,000 ft/min. Ground: 10,000 ft/min (where the dynamic-factor charts end, from memory). Non-metallic: a pinion
 * of it on metal is held to 1,500 to 3,000 ft/min in the texts (from memory). An end there must be, because at an absurd
 * speed a given power needs hardly any force and every gear would seem to carry it.
 */
const LAWS: Record<VelocityLaw, Law> = {
	cast: { ...linear(600, 1000, SOURCES.velocityFactor), furthest: 2000 },
	cut: linear(1200, 4000, SOURCES.velocityFactor),
	'cut-600': linear(600, 2000, SOURCES.commercialCut),
	hobbed: {
		expression: '(50 + √(Vf)) / 50',
		factor: (V) => (50 + Math.sqrt(V)) / 50,
		shareExpression: '√(Vf) / (2 · (50 + √(Vf)))',
		share: (V) => Math.sqrt(V) / (2 * (50 + Math.sqrt(V))),
		end: 4000,
		source: SOURCES.velocityFactor
	},
	ground: {
		expression: '√((78 + √(Vf)) / 78)',
		factor: (V) => Math.sqrt((78 + Math.sqrt(V)) / 78),
		shareExpression: '√(Vf) / (4 · (78 + √(Vf)))',
		share: (V) => Math.sqrt(V) / (4 * (78 + Math.sqrt(V))),
		end: 10000,
		source: SOURCES.velocityFactor
	},
	'non-metallic': {
		expression: '1 / (150 / (200 + Vf) + 0.25)',
		factor: (V) => 1 / (150 / (200 + V) + 0.25),
		shareExpression: 'Vf · 150 / (200 + Vf)² / (150 / (200 + Vf) + 0.25)',
		share: (V) => (V * 150) / (200 + V) ** 2 / (150 / (200 + V) + 0.25),
		end: 3000,
		source: SOURCES.nonMetallic
	}
};

/**
 * Pitch-line velocity V in m/s from the pitch diameter d in mm and the speed n in rpm. V = π d n / 60,000.
 * Source: mechanics; Wentzell, Machine Design, Ex. 12.2, p. 256 (2.5 in at 1,725 rpm: 1,129.01 ft/min).
 * @example pitchLineVelocity(63.5, 1725) // 5.735370
 */
export function pitchLineVelocity(diameter: number, speed: number, recorder: Recorder = unrecorded): number {
	return recorder.step(
		{
			symbol: 'V',
			name: 'pitch-line velocity',
			expression: 'π · d · n / 60000',
			unit: 'm/s',
			source: SOURCES.mechanics
		},
		{ d: diameter, n: speed },
		({ d, n }) => (Math.PI * d * n) / 60000
	);
}

/**
 * The law for a gear. A non-metallic gear has its own, however its teeth were made. What "cut" means is the
 * plant's decision: the two readings differ by up to half the load.
 * @example velocityLawOf('cut', true, 600) // cut-600
 */
export function velocityLawOf(finish: Finish, metallic: boolean, cutLaw: CutLaw): VelocityLaw {
	if (!metallic) return 'non-metallic';
	return finish === 'cut' && cutLaw === 600 ? 'cut-600' : finish;
}

/**
 * Highest velocity in m/s at which the law is used: the plant's limit for the finish, but never beyond the furthest that a
 * published text takes the law; without a limit of the plant the law's own end. A plant may know its gears better than
 * a book, yet the law's figures beyond its end are nobody's: they are not given, rather than given with a remark.
 * @example velocityEnd('cast', 'cast', { cast: { value: 500, unit: 'm/s' }, cut: null, hobbed: null, ground: null }) // 10.16
 */
export function velocityEnd(law: VelocityLaw, finish: Finish, speedLimit: Rules['speedLimit']): number {
	const { end, furthest = end } = LAWS[law];
	const feet = (value: number) => toSI({ value, unit: 'ft/min' });
	const limit = speedLimit[finish];
	return limit ? Math.min(toSI(limit), feet(furthest)) : feet(end);
}

/**
 * Barth's velocity factor Kv >= 1, which multiplies the stress. Velocity in m/s, from 0; the end of a law's range
 * is `velocityEnd`. Throws a RangeError for a negative velocity or none at all.
 * Source: Shigley, Mechanical Engineering Design, 8th ed., ch. 14 (edition from memory); for `cut-600` Wentzell,
 * Machine Design, Ex. 12.4, p. 262; for `non-metallic` Machinery's Handbook (from memory).
 * @example barthVelocityFactor(5.08, 'cut') // 1.833333
 * @example barthVelocityFactor(5.08, 'hobbed') // 1.632456
 */
export function barthVelocityFactor(
	velocity: number,
	law: VelocityLaw,
	recorder: Recorder = unrecorded
): number {
	if (!(velocity >= 0))
		throw new RangeError('The velocity factor needs a pitch-line velocity of 0 m/s or more.');
	const Vf = feetPerMinute(velocity, recorder);
	const { expression, factor, source } = LAWS[law];
	return recorder.step(
		{ symbol: 'Kv', name: `velocity factor, ${law} law`, expression, unit: '1', source },
		{ Vf },
		({ Vf }) => factor(Vf)
	);
}

/**
 * The part of a relative error in the velocity (m/s) that reaches the velocity factor: V/Kv · dKv/dV.
 * Source: derivative of the law.
 * @example velocityFactorShare(6.096, 'cut') // 0.5
 */
export function velocityFactorShare(
	velocity: number,
	law: VelocityLaw,
	recorder: Recorder = unrecorded
): number {
	const { shareExpression, share } = LAWS[law];
	return recorder.step(
		{
			symbol: 'sk',
			name: 'share of a speed error that reaches the velocity factor',
			expression: shareExpression,
			unit: '1',
			source: SOURCES.propagation
		},
		{ Vf: fromSI(velocity, 'ft/min') },
		({ Vf }) => share(Vf)
	);
}

function feetPerMinute(velocity: number, recorder: Recorder): number {
	return recorder.step(
		{
			symbol: 'Vf',
			name: 'pitch-line velocity in ft/min, for the law',
			expression: 'V / 0.00508',
			unit: 'ft/min',
			source: SOURCES.units
		},
		{ V: velocity },
		({ V }) => fromSI(V, 'ft/min')
	);
}
