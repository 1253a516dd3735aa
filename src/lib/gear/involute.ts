/** The involute function and its inverse; angles in radians. */

/**
 * inv α = tan α - α. Source: definition.
 * @example involute(Math.PI / 9) // 0.0149044
 */
export function involute(angle: number): number {
	return Math.tan(angle) - angle;
}

/**
 * The angle in radians whose involute is given; 0 for an involute of 0 or less. Range: below 1.2 rad (69 degrees).
 * Newton's method on tan α - α, which converges from above for a convex function.
 * @example inverseInvolute(0.014904383867) // 0.349065850
 */
export function inverseInvolute(value: number): number {
	if (!(value > 0)) return 0;
	// The first term of the series, cube root of 3 inv, lies above the root for small angles.
	let angle = Math.min(Math.cbrt(3 * value), 1.45);
	for (let step = 0; step < 30; step++) {
		const tangent = Math.tan(angle);
		const change = (tangent - angle - value) / (tangent * tangent);
		angle -= change;
		if (Math.abs(change) < 1e-15 * angle) break;
	}
	return angle;
}
