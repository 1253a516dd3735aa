/**
 * The speed at which a gear that falls short would carry. A torque or force is carried better at a lower speed, since
 * the velocity factor falls; a power better at a higher one, since its force falls faster than the factor rises.
 */
import type { Uncertainty } from './contract';
import { pairUncertainty, pairVelocityFactor, type PairLaws } from './pair-law';

export interface SpeedQuestion {
	laws: PairLaws;
	/** Present pitch-line velocity and the end of the range of these laws, m/s. */
	velocity: number;
	end: number;
	byPower: boolean;
	/** What the deciding answer has of what it needs, at the present velocity. */
	ratio: number;
	/** Whether the bad end of this uncertainty must reach it, or the middle. */
	badEndOf: Uncertainty | null;
}

/** Below this share of the present speed it is another machine. Common practice. */
const SLOWEST = 0.01;

/** Velocity in m/s at which the answer has just what it needs; null where the range of the laws does not reach it. */
export function speedThatCarries(question: SpeedQuestion): number | null {
	const { velocity, end, byPower } = question;
	const has = (at: number) => ratioAt(question, at);
	// The ratio is monotonic in the velocity (tests): short at one end of the bracket, enough at the other.
	let short = velocity;
	let enough = byPower ? end : velocity * SLOWEST;
	if (!(has(enough) >= 1)) return null;
	for (let halving = 0; halving < 60; halving++) {
		const middle = (short + enough) / 2;
		if (has(middle) >= 1) enough = middle;
		else short = middle;
	}
	return enough;
}

function ratioAt({ laws, velocity, byPower, ratio, badEndOf }: SpeedQuestion, at: number): number {
	const factor = pairVelocityFactor(velocity, laws) / pairVelocityFactor(at, laws);
	const middle = ratio * factor * (byPower ? at / velocity : 1);
	return badEndOf ? middle * pairUncertainty(at, laws, { uncertainty: badEndOf, byPower }).badEnd : middle;
}
