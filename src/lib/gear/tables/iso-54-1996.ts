/**
 * Standard modules in mm. Source: ISO 54:1996, series I and II (values from memory); 6.5 is to be avoided where
 * possible, but it is found.
 */
// prettier-ignore
export const MODULES_SERIES_I: readonly number[] = [
	1, 1.25, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10, 12, 16, 20, 25, 32, 40, 50
];

// prettier-ignore
export const MODULES_SERIES_II: readonly number[] = [
	1.125, 1.375, 1.75, 2.25, 2.75, 3.5, 4.5, 5.5, 6.5, 7, 9, 11, 14, 18, 22, 28, 36, 45
];

/** Fine modules below 1 mm. Source: DIN 780 (from memory). */
// prettier-ignore
export const MODULES_BELOW_1: readonly number[] = [
	0.2, 0.25, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9
];
