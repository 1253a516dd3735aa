import { describe, expect, it } from 'vitest';
import { oddCountShortfall, outsideDiameterFromTips } from '$lib/gear/measure/outside-diameter';

/** Independent of the formula: the farthest tip from tip 0 among N tips on a circle. */
function tipToTip(outsideDiameter: number, teeth: number): number {
	const radius = outsideDiameter / 2;
	return Math.max(
		...Array.from({ length: teeth }, (_, tip) => {
			const angle = (2 * Math.PI * tip) / teeth;
			return Math.hypot(radius * (1 - Math.cos(angle)), radius * Math.sin(angle));
		})
	);
}

describe('outside diameter over two tips', () => {
	it.each([8, 9, 13, 24, 25, 61, 120, 121])('%i teeth: undoes what the chord takes away', (teeth) => {
		expect(outsideDiameterFromTips(tipToTip(137.16, teeth), teeth)).toBeCloseTo(137.16, 9);
	});

	it('25 teeth of DP 5 read 0.011 in low (27 / 5 in by the handbook relation, Mott 4th ed. p. 319)', () => {
		expect(oddCountShortfall(tipToTip((27 / 5) * 25.4, 25), 25) / 25.4).toBeCloseTo(0.011, 3);
	});

	it('an even count reads true', () => {
		expect(oddCountShortfall(100, 24)).toBe(0);
	});
});
