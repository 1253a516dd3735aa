// What a bench tells: a median with its quartiles, beside the limit that the project set itself.

/**
 * @typedef {object} Figure
 * @property {number[]} samples
 * @property {string} unit
 * @property {number} limit goal of the project: the value should not be above it
 * @property {string} of what is measured
 */

/** @typedef {{ value: number, low: number, high: number, unit: string, limit: number, of: string }} Told */

/**
 * @param {Figure} figure
 * @returns {Told} the median, between its quartiles
 */
export function told({ samples, unit, limit, of }) {
	const sorted = [...samples].sort((a, b) => a - b);
	/** @param {number} share */
	const at = (share) => rounded(sorted[Math.round(share * (sorted.length - 1))] ?? NaN);
	return { value: at(0.5), low: at(0.25), high: at(0.75), unit, limit, of };
}

/** @param {number} value three digits are more than a noisy machine gives */
function rounded(value) {
	return Number(value.toPrecision(3));
}

/** @param {Record<string, Told>} figures */
export function table(figures) {
	const rows = Object.entries(figures).map(([name, { value, low, high, unit, limit, of }]) => [
		name,
		`${value} ${unit}`,
		`${low} … ${high}`,
		`${limit} ${unit}`,
		value <= limit ? 'within' : 'ABOVE',
		of
	]);
	const all = [['name', 'median', 'quartiles', 'limit', '', 'of'], ...rows];
	const widths = all[0]?.map((_, column) => Math.max(...all.map((row) => row[column]?.length ?? 0))) ?? [];
	return all
		.map((row) =>
			row
				.map((cell, column) => cell.padEnd(widths[column] ?? 0))
				.join('  ')
				.trimEnd()
		)
		.join('\n');
}
