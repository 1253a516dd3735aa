/** Whether probabilities mean what they say: what was claimed against what was true, over many answers. */
import type { Candidate, IdentifyAnswer } from '$lib/gear/identify/contract';
import type { SyntheticGear } from './synthetic-gears';

export function isRight(gear: SyntheticGear, candidate: Candidate | undefined): boolean {
	return (
		candidate !== undefined &&
		Math.abs(candidate.module / gear.module - 1) < 1e-4 &&
		candidate.pressureAngle === gear.angle &&
		candidate.form === gear.form
	);
}

export class Calibration {
	readonly #bins = Array.from({ length: 10 }, () => ({ told: 0, claimed: 0, right: 0 }));
	readonly #high = { told: 0, claimed: 0, right: 0 };
	answers = 0;
	right = 0;
	surviving = 0;

	add(gear: SyntheticGear, { candidates }: IdentifyAnswer): void {
		this.answers++;
		if (isRight(gear, candidates[0])) this.right++;
		if (candidates.some((one) => one.probability > 0.01 && isRight(gear, one))) this.surviving++;
		for (const candidate of candidates) {
			const { probability } = candidate;
			const truth = isRight(gear, candidate) ? 1 : 0;
			const bins = [this.#bins[Math.min(9, Math.floor(probability * 10))]];
			if (probability >= 0.9) bins.push(this.#high);
			for (const bin of bins) {
				if (!bin) continue;
				bin.told++;
				bin.claimed += probability;
				bin.right += truth;
			}
		}
	}

	/** Expected calibration error: how far claims and truth lie apart, over all that was told. */
	get error(): number {
		const told = this.#bins.reduce((sum, bin) => sum + bin.told, 0);
		return this.#bins.reduce((sum, { claimed, right }) => sum + Math.abs(claimed - right), 0) / told;
	}

	/** Of those told at 0.9 or more: the rate that was claimed and the rate that was true. */
	get high(): { told: number; claimed: number; right: number } {
		const { told, claimed, right } = this.#high;
		return { told, claimed: claimed / told, right: right / told };
	}

	rate(count: number): number {
		return count / this.answers;
	}
}
