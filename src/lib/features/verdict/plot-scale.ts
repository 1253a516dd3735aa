/** Ends and ticks of a plot's axes. */

/** The next round figure at or above a value: 1, 1.5, 2, 2.5, 3, 4, 5, 6, 8 times a power of ten. */
export function niceEnd(value: number): number {
	const scale = 10 ** Math.floor(Math.log10(value));
	const step = [1, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10].find(
		(candidate) => candidate * scale >= value * (1 - 1e-9)
	);
	return (step ?? 10) * scale;
}

/** Four or five round figures from zero to the end, the end included where it falls on one. */
export function ticks(end: number): number[] {
	const rough = end / 4;
	const scale = 10 ** Math.floor(Math.log10(rough));
	const step =
		([1, 2, 2.5, 5, 10].find((candidate) => candidate * scale >= rough * (1 - 1e-9)) ?? 10) * scale;
	return Array.from({ length: Math.floor(end / step + 1e-9) + 1 }, (_, i) => i * step);
}
