// identify.ms: the answer to the readings of a usual visit, in milliseconds. The limit is that of the tablet: 100 ms at
// six times slower.
import { bundledCore, perCall } from './core.mjs';

/** @returns {Promise<Record<string, import('../figure.mjs').Figure>>} */
export async function identifyFigures({ quick = false } = {}) {
	const { identify, usualReadings } = await bundledCore();
	const { samples } = perCall(quick ? 60 : 300, 4, () => identify(usualReadings));
	return {
		'identify.ms': {
			samples: samples.map((microseconds) => microseconds / 1000),
			unit: 'ms',
			limit: 16,
			of: 'which gear it is, from teeth, outside diameter, whole depth and two spans'
		}
	};
}
