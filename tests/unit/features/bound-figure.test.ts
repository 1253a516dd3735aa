/** A bound in few digits never promises more than what was worked out. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { boundFigure } from '$lib/features/verdict/bound-figure';

describe('a bound in few digits', () => {
	it('is cut where it is the most, and raised where it is the least', () => {
		expect(boundFigure(1.2296, 3, 'at-most')).toBe(1.22);
		expect(boundFigure(1.2212, 3, 'at-least')).toBe(1.23);
		expect(boundFigure(577.31, 4, 'at-least')).toBe(577.4);
		expect(boundFigure(12_345, 3, 'at-most')).toBe(12_300);
		expect(boundFigure(0.012345, 3, 'at-least')).toBe(0.0124);
	});

	it('leaves a round figure as it is, whatever arithmetic did to its last place', () => {
		expect(boundFigure(1.5, 3, 'at-least')).toBe(1.5);
		expect(boundFigure(1.5 * (1 + 4e-16), 3, 'at-least')).toBe(1.5);
		expect(boundFigure(1.5 * (1 - 4e-16), 3, 'at-most')).toBe(1.5);
		expect(boundFigure(0, 3, 'at-most')).toBe(0);
	});

	it('stays on its side, and within one step of the last digit', () => {
		const values = fc.double({ min: 1e-4, max: 1e6, noNaN: true });
		fc.assert(
			fc.property(values, fc.constantFrom(3, 4), (value, digits) => {
				const step = 10 ** (Math.floor(Math.log10(value)) - digits + 1);
				const most = boundFigure(value, digits, 'at-most');
				const least = boundFigure(value, digits, 'at-least');
				expect(most).toBeLessThanOrEqual(value * (1 + 1e-9));
				expect(least).toBeGreaterThanOrEqual(value * (1 - 1e-9));
				expect(value - most).toBeLessThan(step * (1 + 1e-9));
				expect(least - value).toBeLessThan(step * (1 + 1e-9));
			}),
			{ numRuns: 1000 }
		);
	});
});
