/** A small generator with a seed, so that the demonstration is the same everywhere. Not for secrets. */

/** @returns numbers from 0 to below 1; a 32-bit linear congruential step with its high bits mixed down */
export function seededRandom(seed: number): () => number {
	let state = seed >>> 0;
	return () => {
		state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
		const mixed = Math.imul(state ^ (state >>> 15), 2246822519) >>> 0;
		return ((mixed ^ (mixed >>> 13)) >>> 0) / 2 ** 32;
	};
}
