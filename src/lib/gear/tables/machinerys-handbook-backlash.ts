/**
 * Recommended backlash of coarse-pitch gears in inches, by diametral pitch and centre distance in inches.
 * Source: Machinery's Handbook, AGMA recommended backlash range (from memory).
 */

interface Row {
	/** Centre distance, inches: above `from`, up to `to`. */
	from: number;
	to: number;
	/** Least and most by column of diametral pitch; null where the table has no entry. */
	ranges: readonly (readonly [number, number] | null)[];
}

/** Columns by diametral pitch: from the first to below the second. */
const PITCHES: readonly (readonly [number, number])[] = [
	[0.5, 2],
	[2, 3.5],
	[3.5, 6],
	[6, 10],
	[10, 20]
];

// prettier-ignore
const ROWS: readonly Row[] = [
	{ from: 0, to: 5, ranges: [null, null, null, null, [0.005, 0.015]] },
	{ from: 5, to: 10, ranges: [null, null, null, [0.01, 0.02], [0.01, 0.02]] },
	{ from: 10, to: 20, ranges: [null, null, [0.02, 0.03], [0.015, 0.025], [0.01, 0.02]] },
	{ from: 20, to: 30, ranges: [null, [0.03, 0.04], [0.025, 0.03], [0.02, 0.03], null] },
	{ from: 30, to: 40, ranges: [[0.04, 0.06], [0.035, 0.045], [0.03, 0.04], [0.025, 0.035], null] },
	{ from: 40, to: 50, ranges: [[0.05, 0.07], [0.04, 0.055], [0.035, 0.05], [0.03, 0.04], null] },
	{ from: 50, to: 80, ranges: [[0.06, 0.08], [0.045, 0.065], [0.04, 0.06], null, null] },
	{ from: 80, to: 100, ranges: [[0.07, 0.095], [0.05, 0.08], null, null, null] }
];

/** Least and most backlash in inches; null where the table has no entry. */
export function machinerysHandbookRange(
	diametralPitch: number,
	centreInches: number
): { least: number; most: number } | null {
	const column = PITCHES.findIndex(([from, to]) => diametralPitch >= from && diametralPitch < to);
	const row = ROWS.find(({ from, to }) => centreInches > from && centreInches <= to);
	const range = row?.ranges[column];
	return range ? { least: range[0], most: range[1] } : null;
}
