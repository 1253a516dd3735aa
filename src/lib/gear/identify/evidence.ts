/**
 * How well a hypothesis explains the readings, with shift, tip loss, thickness loss and the helix's doubt integrated out
 * and at most one reading taken as a gross error. Everything is normal and linear, so each part of the mixture is one small solve.
 */
import type { Nuisances, Part } from './nuisances';
import type { Observation } from './observations';
import type { Prediction } from './hypothesis';

/** How often a reading is grossly wrong: a digit swapped, another unit, another place. From memory of shop practice. */
const LOG_GROSS = Math.log(0.01);

export interface Evidence {
	/** Natural logarithm of the density of the readings, mm⁻ⁿ. */
	log: number;
	/** The likeliest explanation: shift, tip loss, thickness loss in modules, and the reading it takes as wrong. */
	shift: number;
	tip: number;
	thickness: number;
	/** By how much the helix stands off from what was read, radians. */
	helix: number;
	gross: number | null;
}

/** Nothing is seen of it. */
const UNSEEN: readonly Part[] = [{ weight: 1, mean: 0, spread: 1e-4 }];

export function evidenceOf(
	observations: readonly Observation[],
	predictions: readonly Prediction[],
	{ shift, tip, thickness, helix }: Nuisances
): Evidence {
	const system = new System(observations, predictions, helix);
	const best: Evidence = { log: -Infinity, shift: 0, tip: 0, thickness: 0, helix: 0, gross: null };
	let highest = -Infinity;
	let total = 0;
	for (const x of system.seesShift ? shift : UNSEEN) {
		for (const w of system.seesTip ? tip : UNSEEN) {
			for (const d of system.seesThickness ? thickness : UNSEEN) {
				system.suppose(x, w, d);
				for (let gross = -1; gross < observations.length; gross++) {
					const log = system.solve(gross);
					if (log > highest) {
						total = total * Math.exp(highest - log) + 1;
						highest = log;
						best.shift = x.mean + system.x;
						best.tip = w.mean + system.w;
						best.thickness = d.mean + system.d;
						best.helix = system.z;
						best.gross = gross < 0 ? null : gross;
					} else total += Math.exp(log - highest);
				}
			}
		}
	}
	best.log = highest + Math.log(total);
	return best;
}

const HALF_LOG_TWO_PI = Math.log(2 * Math.PI) / 2;

/**
 * The readings of one hypothesis as a linear system in the four unseen. `suppose` takes a part of each mixture as
 * prior, `solve` leaves one reading out (or none, -1) and gives the log density; x, w, d and z are then the middles of
 * what the readings leave, from the prior's. The helix z is one normal distribution, so it is eliminated first (Schur
 * complement) and three are left to solve for; on a spur gear nothing depends on it.
 * Source: Gaussian conditioning (matrix inversion lemma); Bishop, Pattern Recognition and Machine Learning, ch. 2
 * (from memory).
 */
class System {
	readonly seesShift: boolean;
	readonly seesTip: boolean;
	readonly seesThickness: boolean;
	x = 0;
	w = 0;
	d = 0;
	z = 0;
	/** Of each reading: precision, log of its width (over how often it is taken so), log density if it is grossly wrong, residual. */
	readonly #precision: Float64Array;
	readonly #logWidth: Float64Array;
	readonly #logWrong: Float64Array;
	readonly #residual: Float64Array;
	#prior: [Part, Part, Part] = [UNSEEN[0] as Part, UNSEEN[0] as Part, UNSEEN[0] as Part];
	#logPrior = 0;

	constructor(
		private readonly observations: readonly Observation[],
		private readonly predictions: readonly Prediction[],
		private readonly helixSpread: number
	) {
		const count = observations.length;
		this.#precision = new Float64Array(count);
		this.#logWidth = new Float64Array(count);
		this.#logWrong = new Float64Array(count);
		this.#residual = new Float64Array(count);
		let [seesShift, seesTip, seesThickness] = [false, false, false];
		observations.forEach(({ value, sigma }, i) => {
			const { own, shift, tip, thickness, logChance } = predictions[i] as Prediction;
			const width2 = sigma * sigma + own * own;
			this.#precision[i] = 1 / width2;
			this.#logWidth[i] = Math.log(width2) / 2 + HALF_LOG_TWO_PI - logChance;
			this.#logWrong[i] = LOG_GROSS - Math.log(Math.abs(value));
			seesShift ||= shift !== 0;
			seesTip ||= tip !== 0;
			seesThickness ||= thickness !== 0;
		});
		this.seesShift = seesShift;
		this.seesTip = seesTip;
		this.seesThickness = seesThickness;
	}

	suppose(x: Part, w: Part, d: Part): void {
		this.#prior = [x, w, d];
		this.#logPrior = Math.log((x.weight * w.weight * d.weight) / (x.spread * w.spread * d.spread));
		for (let i = 0; i < this.observations.length; i++) {
			const of = this.predictions[i] as Prediction;
			const { value } = this.observations[i] as Observation;
			this.#residual[i] = value - of.nominal - of.shift * x.mean - of.tip * w.mean - of.thickness * d.mean;
		}
	}

	solve(leftOut: number): number {
		const [px, pw, pd] = this.#prior;
		let a = 1 / (px.spread * px.spread);
		let e = 1 / (pw.spread * pw.spread);
		let i = 1 / (pd.spread * pd.spread);
		let [b, c, f, bx, bw, bd, misfit] = [0, 0, 0, 0, 0, 0, 0];
		let [q, zx, zw, zd, bz] = [0, 0, 0, 0, 0];
		let log = this.#logPrior;
		for (let n = 0; n < this.predictions.length; n++) {
			if (n === leftOut) {
				log += this.#logWrong[n] as number;
				continue;
			}
			const { shift, tip, thickness, helix } = this.predictions[n] as Prediction;
			const p = this.#precision[n] as number;
			const r = this.#residual[n] as number;
			a += shift * shift * p;
			b += shift * tip * p;
			c += shift * thickness * p;
			e += tip * tip * p;
			f += tip * thickness * p;
			i += thickness * thickness * p;
			bx += shift * r * p;
			bw += tip * r * p;
			bd += thickness * r * p;
			q += helix * helix * p;
			zx += helix * shift * p;
			zw += helix * tip * p;
			zd += helix * thickness * p;
			bz += helix * r * p;
			misfit += r * r * p;
			log -= this.#logWidth[n] as number;
		}
		const variance = this.helixSpread * this.helixSpread;
		const seen = q * variance + 1;
		const share = variance / seen;
		if (share > 0) {
			a -= zx * zx * share;
			b -= zx * zw * share;
			c -= zx * zd * share;
			e -= zw * zw * share;
			f -= zw * zd * share;
			i -= zd * zd * share;
			bx -= zx * bz * share;
			bw -= zw * bz * share;
			bd -= zd * bz * share;
			misfit -= bz * bz * share;
			log -= Math.log(seen) / 2;
		}
		const A = e * i - f * f;
		const B = c * f - b * i;
		const C = b * f - c * e;
		const determinant = a * A + b * B + c * C;
		this.x = (A * bx + B * bw + C * bd) / determinant;
		this.w = (B * bx + (a * i - c * c) * bw + (b * c - a * f) * bd) / determinant;
		this.d = (C * bx + (b * c - a * f) * bw + (a * e - b * b) * bd) / determinant;
		this.z = (bz - zx * this.x - zw * this.w - zd * this.d) * share;
		const pull = bx * this.x + bw * this.w + bd * this.d;
		return log - (misfit - pull) / 2 - Math.log(determinant) / 2;
	}
}
