/** Where the margin rule ends and where its bar lies. The rule always shows the stop and, if it can, the pointer. */

/** The last whole unit on the rule: at least 3, at most 6, one beyond the stop. */
export function ruleEnd(middle: number | null, stop: number): number {
	return Math.min(6, Math.max(3, Math.ceil(stop + 0.5), Math.ceil(middle ?? 0)));
}

/** The bar from low end to middle, kept on the rule; null without a middle value. */
export function barOnRule(middle: number | null, low: number | null, end: number) {
	if (middle === null) return null;
	return { from: Math.min(low ?? middle, end), to: Math.min(middle, end) };
}
