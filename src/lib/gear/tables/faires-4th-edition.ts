/**
 * Lewis form factor Y at the tip of the tooth, for diametral pitch or module, by number of teeth.
 * Source: Faires, Design of Machine Elements, 4th ed., form-factor table; the same numbers stand in Machinery's
 * Handbook. The edition and the entries are from memory, save those that worked examples confirm: 14.5 degrees
 * N = 24; 20 degrees N = 18, 20, 24, 30, 32, 60 (Wentzell, Machine Design; Jindal, Machine Design).
 */

/** One form's column. `Y[i]` belongs to `LEWIS_TEETH[i]`; `rack` is the limit of many teeth. */
export interface LewisColumn {
	readonly Y: readonly number[];
	readonly rack: number;
}

// prettier-ignore
export const LEWIS_TEETH: readonly number[] = [
	10, 11, 12, 13, 14, 15, 16, 17, 18, 19, 20, 21, 22, 23, 24, 25, 26, 27, 28, 29, 30, 32, 33,
	35, 37, 39, 40, 45, 50, 55, 60, 65, 70, 75, 80, 90, 100, 150, 200, 300
];

/** 14.5 degree full depth. */
export const FULL_DEPTH_14_5: LewisColumn = {
	// prettier-ignore
	Y: [
		0.176, 0.192, 0.21, 0.223, 0.236, 0.245, 0.255, 0.264, 0.27, 0.277, 0.283, 0.289, 0.292,
		0.296, 0.302, 0.305, 0.308, 0.311, 0.314, 0.316, 0.318, 0.322, 0.324, 0.327, 0.33, 0.335,
		0.336, 0.34, 0.346, 0.352, 0.355, 0.358, 0.36, 0.361, 0.363, 0.366, 0.368, 0.375, 0.378,
		0.382
	],
	rack: 0.39
};

/** 20 degree full depth. */
export const FULL_DEPTH_20: LewisColumn = {
	// prettier-ignore
	Y: [
		0.201, 0.226, 0.245, 0.264, 0.276, 0.289, 0.295, 0.302, 0.308, 0.314, 0.32, 0.326, 0.33,
		0.333, 0.337, 0.34, 0.344, 0.348, 0.352, 0.355, 0.358, 0.364, 0.367, 0.373, 0.38, 0.386,
		0.389, 0.399, 0.408, 0.415, 0.421, 0.425, 0.429, 0.433, 0.436, 0.442, 0.446, 0.458, 0.463,
		0.471
	],
	rack: 0.484
};

/** 20 degree stub (addendum 0.8, dedendum 1.0). */
export const STUB_20: LewisColumn = {
	// prettier-ignore
	Y: [
		0.261, 0.289, 0.311, 0.324, 0.339, 0.348, 0.361, 0.367, 0.377, 0.386, 0.393, 0.399, 0.405,
		0.408, 0.411, 0.416, 0.421, 0.426, 0.43, 0.434, 0.437, 0.443, 0.445, 0.449, 0.454, 0.457,
		0.459, 0.468, 0.474, 0.48, 0.484, 0.488, 0.493, 0.496, 0.499, 0.503, 0.506, 0.518, 0.524,
		0.534
	],
	rack: 0.55
};
