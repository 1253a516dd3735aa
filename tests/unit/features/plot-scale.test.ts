import { describe, expect, it } from 'vitest';
import { niceEnd, ticks } from '$lib/features/verdict/plot-scale';

describe('axes of the capacity plot', () => {
	it.each([
		[0.34, 0.4],
		[1, 1],
		[1.2, 1.5],
		[7.1, 8],
		[434, 500],
		[980, 1000]
	])('end at a round figure at or above %d', (value, end) => {
		expect(niceEnd(value)).toBeCloseTo(end, 9);
	});

	it.each([0.4, 1, 1.5, 8, 40, 500, 1000])(
		'have three to seven ticks from zero that never pass %d',
		(end) => {
			const all = ticks(end);
			expect(all[0]).toBe(0);
			expect(all.length).toBeGreaterThanOrEqual(3);
			expect(all.length).toBeLessThanOrEqual(7);
			expect(all.at(-1)).toBeLessThanOrEqual(end * (1 + 1e-9));
		}
	);
});
