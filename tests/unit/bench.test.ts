/** The bench's own arithmetic and words: what it is asked, the median with its quartiles, the table. */
import { expect, test } from 'vitest';
import { table, told } from '../bench/figure.mjs';
import { mayMeasure, readOptions } from '../bench/options.mjs';

test('options in any order; what is not understood is refused', () => {
	expect(readOptions([])).toEqual({ only: '', quick: false });
	expect(readOptions(['--quick', '--only', 'identify.ms'])).toEqual({ only: 'identify.ms', quick: true });
	expect(readOptions(['--only', 'evaluate', '--quick'])).toEqual({ only: 'evaluate', quick: true });
	for (const args of [['--only'], ['--only', '--quick'], ['--quik'], ['evaluate']]) {
		expect(readOptions(args)).toBeNull();
	}
});

test('a bench is run for a beginning of its names, and for no other', () => {
	for (const only of ['', 'eval', 'evaluate', 'evaluate.', 'evaluate.geometry.us']) {
		expect(mayMeasure('evaluate', only)).toBe(true);
	}
	for (const only of ['identify', 'evaluatex', 'xevaluate', 'evaluate-']) {
		expect(mayMeasure('evaluate', only)).toBe(false);
	}
});

test('the median lies between its quartiles, whatever order the samples came in', () => {
	const figure = { unit: 'µs', limit: 30, of: 'one call' };
	expect(told({ ...figure, samples: [50, 10, 40, 20, 30] })).toEqual({
		...figure,
		value: 30,
		low: 20,
		high: 40
	});
	expect(told({ ...figure, samples: [12.3456] })).toMatchObject({ value: 12.3, low: 12.3, high: 12.3 });
});

test('the table says which median is above its limit; one at the limit is within', () => {
	const at = (value: number) => ({ value, low: 1, high: 99, unit: 'µs', limit: 30, of: 'one call' });
	const [head, ...rows] = table({ 'a.us': at(30), 'b.longer.us': at(30.1) }).split('\n');
	expect(head).toMatch(/^name +median +quartiles +limit +of$/);
	expect(rows[0]).toMatch(/^a\.us +30 µs +1 … 99 +30 µs +within +one call$/);
	expect(rows[1]).toMatch(/^b\.longer\.us +30\.1 µs +1 … 99 +30 µs +ABOVE +one call$/);
});
