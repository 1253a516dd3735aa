/**
 * Diametral pitches in teeth per inch (all values from memory). Coarse: ANSI B6.1-1968; fine: ANSI/AGMA 1003, both
 * as in Shigley, Mechanical Engineering Design, Table 13-2. The third list holds the other pitches for which
 * cutters were stocked, from Machinery's Handbook: old machines have them.
 */
export const COARSE_PITCHES: readonly number[] = [2, 2.25, 2.5, 3, 4, 6, 8, 10, 12, 16];

export const FINE_PITCHES: readonly number[] = [20, 24, 32, 40, 48, 64, 80, 96, 120, 150, 200];

// prettier-ignore
export const STOCK_CUTTER_PITCHES: readonly number[] = [
	0.5, 0.75, 1, 1.25, 1.5, 1.75, 2.75, 3.5, 5, 7, 9, 11, 14, 18, 22, 26, 28, 30, 36
];
