/** What limits a check, row by row, the answer that decides first; and the margin that it decides by. */
import type { Limit, Outcome } from '$lib/gear/contract';

/**
 * The limits of an outcome with the deciding one first. An outcome of a core before 1.0.0 names none; it knew bending
 * of this gear only.
 */
export function limitRows(
	{ limits = [], limitedBy, bendingMargin: margin, bendingMarginLow: marginLow }: Outcome,
	needed: number
): Limit[] {
	if (limits.length > 0) {
		return [...limits].sort((a, b) => Number(b.answer === limitedBy) - Number(a.answer === limitedBy));
	}
	return margin === null || marginLow === null ? [] : [{ answer: 'gear-bending', margin, marginLow, needed }];
}

/** Margin of the answer that decides; null where no answer was computed. */
export function decidingMargin(outcome: Outcome): number | null {
	// What the plant needs does not enter the margin.
	return limitRows(outcome, NaN)[0]?.margin ?? null;
}
