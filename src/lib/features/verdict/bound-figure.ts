/**
 * A bound in few digits that still holds: what may be at most is cut, what must be at least is raised, so that
 * somebody who keeps to the figure on the screen gets what the sentence beside it promises.
 */

export type Bound = 'at-most' | 'at-least';

/** A figure that is round already is not pushed on by what arithmetic does in the tenth place. */
const ROUNDING = 1e-9;

/** @param digits significant ones */
export function boundFigure(value: number, digits: number, bound: Bound): number {
	if (!(value > 0 && Number.isFinite(value))) return value;
	const decimals = digits - 1 - Math.floor(Math.log10(value));
	const scaled = value * 10 ** decimals;
	const whole = bound === 'at-most' ? Math.floor(scaled + ROUNDING) : Math.ceil(scaled - ROUNDING);
	return whole / 10 ** decimals;
}
