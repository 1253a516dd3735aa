/**
 * The velocity laws of a gear and its mate. Their teeth bear one dynamic load, so the harsher law counts for both, as
 * far as the laws of both reach: a pair gets the same factor whichever of its gears is asked about.
 */
import type { Finish, Gear, Mate, Rules, Uncertainty } from './contract';
import { toSI } from './quantity';
import { SOURCES } from './sources';
import { marginUncertainty, type MarginUncertainty } from './uncertainty';
import {
	barthVelocityFactor,
	velocityEnd,
	velocityFactorShare,
	velocityLawOf,
	type VelocityLaw
} from './velocity';
import { unrecorded, type Recorder } from './working';

/** The law of one member, with the end of its range. */
export interface MemberLaw {
	law: VelocityLaw;
	/** Undefined on a non-metallic mate whose finish is not known. */
	finish: Finish | undefined;
	/** m/s. */
	end: number;
	/** The end is the plant's own limit: one beyond the law's furthest end is not. */
	byPlant: boolean;
	of?: 'mate' | undefined;
}

/** The gear's own, then the mate's where finish or material tell it: of an unknown finish nothing is assumed. */
export type PairLaws = readonly [MemberLaw, MemberLaw?];

export function lawsOf(gear: Gear, mate: Mate | undefined, rules: Rules): PairLaws {
	const own = memberLaw(gear.finish, gear.material.metallic, rules);
	const metallic = mate?.material?.metallic ?? true;
	if (!mate || (mate.finish === undefined && metallic)) return [own];
	return [own, { ...memberLaw(mate.finish, metallic, rules), of: 'mate' }];
}

function memberLaw(finish: Finish | undefined, metallic: boolean, { cutLaw, speedLimit }: Rules): MemberLaw {
	if (finish === undefined) {
		const none = { cast: null, cut: null, hobbed: null, ground: null };
		return { law: 'non-metallic', finish, end: velocityEnd('non-metallic', 'cut', none), byPlant: false };
	}
	const law = velocityLawOf(finish, metallic, cutLaw);
	const end = velocityEnd(law, finish, speedLimit);
	const limit = speedLimit[finish];
	return { law, finish, end, byPlant: limit !== null && toSI(limit) <= end };
}

/** The member whose law ends first: beyond it nobody knows which of the two is the harsher. */
export function firstToEnd([own, mates]: PairLaws): MemberLaw {
	return mates && mates.end < own.end ? mates : own;
}

/** The one law of a pair whose members have the same; null where the velocity decides which counts. */
export function onlyLaw([own, mates]: PairLaws): VelocityLaw | null {
	return mates && mates.law !== own.law ? null : own.law;
}

/** The law that counts at a velocity in m/s; of two with one factor that which ends first, else by name: whoever has it. */
export function harsherLaw(velocity: number, [own, mates]: PairLaws): MemberLaw {
	if (!mates || mates.law === own.law) return own;
	const difference = barthVelocityFactor(velocity, mates.law) - barthVelocityFactor(velocity, own.law);
	if (difference !== 0) return difference > 0 ? mates : own;
	const first = mates.end === own.end ? mates.law < own.law : mates.end < own.end;
	return first ? mates : own;
}

/**
 * Velocity factor Kv of the pair at a velocity in m/s, from 0 to the end of both laws: the higher of both.
 * Source: common practice; the laws as in `barthVelocityFactor`.
 */
export function pairVelocityFactor(
	velocity: number,
	[own, mates]: PairLaws,
	recorder: Recorder = unrecorded
): number {
	if (!mates || mates.law === own.law) return barthVelocityFactor(velocity, own.law, recorder);
	// The velocity in ft/min is the pair's and stands there once.
	const Kv1 = barthVelocityFactor(velocity, own.law, factorAs('Kv1', recorder, recorder));
	const Kv2 = barthVelocityFactor(velocity, mates.law, factorAs('Kv2', recorder.mate(), unrecorded));
	return recorder.step(
		{
			symbol: 'Kv',
			name: 'velocity factor of the pair, the higher of both',
			expression: 'max(Kv1, Kv2)',
			unit: '1',
			source: SOURCES.commonPractice
		},
		{ Kv1, Kv2 },
		({ Kv1, Kv2 }) => Math.max(Kv1, Kv2)
	);
}

/** Two factors side by side need a symbol each; the other lines of a factor go where they are sent. */
function factorAs(symbol: string, recorder: Recorder, others: Recorder): Recorder {
	return {
		step: (head, terms, compute) =>
			head.symbol === 'Kv'
				? recorder.step({ ...head, symbol }, terms, compute)
				: others.step(head, terms, compute),
		given: (head, quantity) => others.given(head, quantity),
		mate: () => factorAs(symbol, recorder.mate(), others.mate())
	};
}

/**
 * Uncertainty of a pair's margin at a velocity in m/s. The margin is the lower of those by either law, and so is its
 * low end: where the laws cross, the one that does not count yet can be the worse at the bad end.
 * Source: as of `marginUncertainty`.
 */
export function pairUncertainty(
	velocity: number,
	laws: PairLaws,
	{ uncertainty, byPower }: { uncertainty: Uncertainty; byPower: boolean },
	recorder: Recorder = unrecorded
): MarginUncertainty {
	const by = ({ law }: MemberLaw, lines: Recorder) =>
		marginUncertainty(uncertainty, byPower, velocityFactorShare(velocity, law, lines), lines);
	const counts = harsherLaw(velocity, laws);
	const [own, mates] = laws;
	if (!mates || mates.law === own.law) return by(own, recorder);

	const other = counts === own ? mates : own;
	const factor = (member: MemberLaw) => barthVelocityFactor(velocity, member.law);
	const linesOf = (member: MemberLaw) => (member.of ? recorder.mate() : recorder);
	const lighter = factor(counts) / factor(other);
	if (by(other, unrecorded).badEnd * lighter >= by(counts, unrecorded).badEnd) {
		return by(counts, linesOf(counts));
	}
	const { relative, badEnd: ke } = by(other, linesOf(other));
	const badEnd = recorder.step(
		{
			symbol: 'ke',
			name: 'what the bad end leaves of the margin, by the law that falls faster here',
			expression: other.of ? 'ke · Kv1 / Kv2' : 'ke · Kv2 / Kv1',
			unit: '1',
			source: SOURCES.propagation
		},
		{ ke, Kv1: factor(own), Kv2: factor(mates) },
		({ ke, Kv1, Kv2 }) => (ke * (other.of ? Kv1 : Kv2)) / (other.of ? Kv2 : Kv1)
	);
	return { relative, badEnd };
}
