/**
 * Outline of a gear for pictures that show how to take a reading. A sketch with straight flanks, drawn with the
 * tooth count that was given: it is no geometry and nothing is computed from it.
 */

export interface Sketch {
	cx: number;
	cy: number;
	tip: number;
	root: number;
	teeth: number;
}

export function gearOutline({ cx, cy, tip, root, teeth }: Sketch): string {
	const points: string[] = [];
	const corner = (radius: number, tooth: number) => {
		// A tooth stands at twelve o'clock.
		const angle = ((tooth - 0.5) / teeth) * 2 * Math.PI - Math.PI / 2;
		return `${(cx + radius * Math.cos(angle)).toFixed(1)} ${(cy + radius * Math.sin(angle)).toFixed(1)}`;
	};
	for (let tooth = 0; tooth < teeth; tooth++) {
		points.push(
			corner(root, tooth + 0.2),
			corner((root + tip) / 2, tooth + 0.27),
			corner(tip, tooth + 0.37),
			corner(tip, tooth + 0.63),
			corner((root + tip) / 2, tooth + 0.73),
			corner(root, tooth + 0.8)
		);
	}
	return `M ${points.join(' L ')} Z`;
}
