// evaluate.*: one check worked out by the calculation core, with its working and its words, in microseconds.
import { bundledCore, perCall } from './core.mjs';

/** @typedef {import('../figure.mjs').Figure} Figure */

/** @returns {Promise<Record<string, Figure>>} */
export async function evaluateFigures({ quick = false } = {}) {
	const { evaluate, spurCheck, geometryCheck } = await bundledCore();
	const batches = quick ? 60 : 300;
	/** No two calls of one run get the same shift, so no tooth is remembered. */
	let next = 0;
	return {
		'evaluate.handbook.us': {
			...perCall(batches, 100, () => evaluate(spurCheck)),
			limit: 30,
			of: 'one check by the handbook table'
		},
		'evaluate.geometry.us': {
			...perCall(batches, 20, () => evaluate(geometryCheck(1e-6 * ++next))),
			limit: 300,
			of: 'one check by the geometry of a tooth that was not met before'
		},
		'evaluate.geometry.cached.us': {
			...perCall(batches, 100, () => evaluate(geometryCheck(0.25))),
			limit: 60,
			of: 'one check by geometry, the tooth met before'
		}
	};
}
