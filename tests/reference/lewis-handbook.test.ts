/**
 * The Lewis form factor against the handbook's table, entry by entry and between entries.
 * Values: Faires, Design of Machine Elements, form-factor table; same numbers in Machinery's Handbook. Entries are
 * from memory except those that worked examples confirm (named below).
 */
import { describe, expect, test } from 'vitest';
import { handbookHolds, lewisFormFactor } from '$lib/gear/form-factor';

interface Column {
	angle: number;
	form: 'full-depth' | 'stub';
	rack: number;
	Y: [teeth: number, Y: number][];
}

// prettier-ignore
const COLUMNS: Column[] = [
	{ angle: 14.5, form: 'full-depth', rack: 0.39, Y: [
		[10, 0.176], [11, 0.192], [12, 0.21], [13, 0.223], [14, 0.236], [15, 0.245], [16, 0.255],
		[17, 0.264], [18, 0.27], [19, 0.277], [20, 0.283], [21, 0.289], [22, 0.292], [23, 0.296],
		[24, 0.302], [25, 0.305], [26, 0.308], [27, 0.311], [28, 0.314], [29, 0.316], [30, 0.318],
		[32, 0.322], [33, 0.324], [35, 0.327], [37, 0.33], [39, 0.335], [40, 0.336], [45, 0.34],
		[50, 0.346], [55, 0.352], [60, 0.355], [65, 0.358], [70, 0.36], [75, 0.361], [80, 0.363],
		[90, 0.366], [100, 0.368], [150, 0.375], [200, 0.378], [300, 0.382]
	] },
	{ angle: 20, form: 'full-depth', rack: 0.484, Y: [
		[10, 0.201], [11, 0.226], [12, 0.245], [13, 0.264], [14, 0.276], [15, 0.289], [16, 0.295],
		[17, 0.302], [18, 0.308], [19, 0.314], [20, 0.32], [21, 0.326], [22, 0.33], [23, 0.333],
		[24, 0.337], [25, 0.34], [26, 0.344], [27, 0.348], [28, 0.352], [29, 0.355], [30, 0.358],
		[32, 0.364], [33, 0.367], [35, 0.373], [37, 0.38], [39, 0.386], [40, 0.389], [45, 0.399],
		[50, 0.408], [55, 0.415], [60, 0.421], [65, 0.425], [70, 0.429], [75, 0.433], [80, 0.436],
		[90, 0.442], [100, 0.446], [150, 0.458], [200, 0.463], [300, 0.471]
	] },
	{ angle: 20, form: 'stub', rack: 0.55, Y: [
		[10, 0.261], [11, 0.289], [12, 0.311], [13, 0.324], [14, 0.339], [15, 0.348], [16, 0.361],
		[17, 0.367], [18, 0.377], [19, 0.386], [20, 0.393], [21, 0.399], [22, 0.405], [23, 0.408],
		[24, 0.411], [25, 0.416], [26, 0.421], [27, 0.426], [28, 0.43], [29, 0.434], [30, 0.437],
		[32, 0.443], [33, 0.445], [35, 0.449], [37, 0.454], [39, 0.457], [40, 0.459], [45, 0.468],
		[50, 0.474], [55, 0.48], [60, 0.484], [65, 0.488], [70, 0.493], [75, 0.496], [80, 0.499],
		[90, 0.503], [100, 0.506], [150, 0.518], [200, 0.524], [300, 0.534]
	] }
];

const Y = (teeth: number, pressureAngle: number, form: 'full-depth' | 'stub') =>
	lewisFormFactor({ teeth, pressureAngle, form });

describe.each(COLUMNS)('$angle degrees $form', ({ angle, form, rack, Y: entries }) => {
	test.each(entries)('%i teeth', (teeth, published) => {
		expect(Y(teeth, angle, form)).toBe(published);
	});

	test(`rack: ${rack}`, () => {
		expect(Y(Infinity, angle, form)).toBe(rack);
	});

	test('many teeth come to the rack', () => {
		expect(Y(1e9, angle, form)).toBeCloseTo(rack, 6);
	});

	test('halfway from 300 teeth to the rack in 1/N lies 600 teeth', () => {
		const last = entries[entries.length - 1]?.[1] ?? NaN;
		expect(Y(600, angle, form)).toBeCloseTo((last + rack) / 2, 12);
	});

	test('between two entries it lies between their values, and rises with the teeth', () => {
		const all = Array.from({ length: 391 }, (_, i) => Y(10 + i, angle, form));
		all.slice(1).forEach((value, i) => expect(value).toBeGreaterThanOrEqual(all[i] ?? NaN));
	});
});

describe('values that published examples used', () => {
	test.each([
		// Wentzell, Machine Design: Ex. 12.5 p. 263, Ex. 12.6 p. 266 (between 45 and 50), Ex. 12.3 p. 258.
		{ teeth: 24, angle: 14.5, published: 0.302 },
		{ teeth: 48, angle: 14.5, published: 0.344 },
		{ teeth: 20, angle: 20, published: 0.32 },
		{ teeth: 60, angle: 20, published: 0.421 },
		{ teeth: 24, angle: 20, published: 0.337 },
		// Jindal, Machine Design: Ex. 25-3 p. 670, 26-3 p. 699, 25-4 p. 672.
		{ teeth: 30, angle: 20, published: 0.358 },
		{ teeth: 32, angle: 20, published: 0.364 },
		{ teeth: 18, angle: 20, published: 0.308 },
		// Jindal Ex. 26-3 p. 699 interpolates at 31.48 virtual teeth, linear in N: 0.36244; in 1/N it is 0.0001 more.
		{ teeth: 31.48, angle: 20, published: 0.3624 }
	])('$teeth teeth at $angle degrees, full depth: $published', ({ teeth, angle, published }) => {
		expect(Math.abs(Y(teeth, angle, 'full-depth') - published)).toBeLessThanOrEqual(0.0005);
	});
});

describe('what the table does not hold', () => {
	test.each([
		{ teeth: 9, pressureAngle: 20, form: 'full-depth' },
		{ teeth: NaN, pressureAngle: 20, form: 'full-depth' },
		{ teeth: 24, pressureAngle: 25, form: 'full-depth' },
		{ teeth: 24, pressureAngle: 14.5, form: 'stub' },
		{ teeth: 24, pressureAngle: 20, form: { addendum: 1, dedendum: 1.25, tipRadius: 0.3 } },
		{ teeth: 24, pressureAngle: 20, form: 'full-depth', profileShift: 0.2 }
	] as const)('$teeth teeth at $pressureAngle degrees, $form', (tooth) => {
		expect(handbookHolds(tooth)).toBe(false);
		expect(() => lewisFormFactor(tooth)).toThrow(RangeError);
	});
});

describe('the table beside others of its kind', () => {
	// Shigley, Mechanical Engineering Design, Table 14-2 (from memory): π times the three-digit Lewis y, so it differs
	// from the handbook's rounding by up to 0.003 and never more.
	// prettier-ignore
	test.each([
		[12, 0.245], [13, 0.261], [14, 0.277], [15, 0.29], [16, 0.296], [17, 0.303], [18, 0.309], [19, 0.314],
		[20, 0.322], [21, 0.328], [22, 0.331], [24, 0.337], [26, 0.346], [28, 0.353], [30, 0.359], [34, 0.371],
		[38, 0.384], [43, 0.397], [50, 0.409], [60, 0.422], [75, 0.435], [100, 0.447], [150, 0.46], [300, 0.472],
		[400, 0.48], [Infinity, 0.485]
	])('Shigley, 20 degrees, %d teeth: %d', (teeth, published) => {
		expect(Math.abs(Y(teeth, 20, 'full-depth') - published)).toBeLessThanOrEqual(teeth === 400 ? 0.006 : 0.0031);
	});

	// Lewis (1892) as reprinted in Marks and Kent (from memory): y for circular pitch, to three digits; Y = π y. Columns:
	// 14.5 degrees, 20 degrees full depth, 20 degrees stub.
	// prettier-ignore
	test.each([
		[12, 0.067, 0.078, 0.099], [13, 0.071, 0.083, 0.103], [14, 0.075, 0.088, 0.108],
		[15, 0.078, 0.092, 0.111], [16, 0.081, 0.094, 0.115], [17, 0.084, 0.096, 0.117],
		[18, 0.086, 0.098, 0.12], [19, 0.088, 0.1, 0.123], [20, 0.09, 0.102, 0.125],
		[21, 0.092, 0.104, 0.127], [22, 0.093, 0.105, 0.129], [23, 0.094, 0.106, 0.13],
		[24, 0.095, 0.107, 0.132], [26, 0.098, 0.11, 0.135], [28, 0.1, 0.112, 0.137],
		[30, 0.101, 0.114, 0.139], [34, 0.104, 0.118, 0.142], [38, 0.106, 0.122, 0.145],
		[43, 0.108, 0.126, 0.147], [50, 0.11, 0.13, 0.151], [60, 0.113, 0.134, 0.154],
		[75, 0.115, 0.138, 0.158], [100, 0.117, 0.142, 0.161], [150, 0.119, 0.146, 0.165],
		[300, 0.122, 0.15, 0.17], [Infinity, 0.124, 0.154, 0.175]
	])('Lewis, %d teeth: y %d at 14.5 degrees, %d at 20 degrees, %d stub', (teeth, at14, at20, stub) => {
		// Half a digit of y, and the handbook's own smoothing of it.
		const rounding = 0.0005 * Math.PI + 0.002;
		expect(Math.abs(Y(teeth, 14.5, 'full-depth') - Math.PI * at14)).toBeLessThanOrEqual(rounding);
		expect(Math.abs(Y(teeth, 20, 'full-depth') - Math.PI * at20)).toBeLessThanOrEqual(rounding);
		// Stub teeth of 24 are the farthest apart of all: 0.0037.
		expect(Math.abs(Y(teeth, 20, 'stub') - Math.PI * stub)).toBeLessThanOrEqual(teeth === 24 ? 0.0038 : rounding);
	});
});
