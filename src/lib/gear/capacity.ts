/**
 * What a gear carries at another speed, for the plot of power over speed. It comes from the same figures as the
 * verdict: a drive below `low` carries, one between `low` and `middle` is close, one above will not carry.
 */
import type { EvaluateInput } from './contract';
import { figuresOf } from './figures';
import { lowEnd } from './uncertainty';
import { unrecorded } from './working';

/** Powers in W at the plant's margin: at the middle of the uncertainty and at its bad end. */
export interface PermittedPower {
	middle: number;
	low: number;
}

/** Power that the gear of this check carries at a speed in rpm; null where the method does not reach, or on a rack. */
export function permittedPowerAt(input: EvaluateInput, rpm: number): PermittedPower | null {
	if (!(rpm > 0 && Number.isFinite(rpm)) || input.gear.kind === 'rack') return null;
	const drive = { ...input.drive, speed: { value: rpm, unit: 'rpm' as const } };
	const { figures, uncertainty, refusals } = figuresOf({ ...input, drive }, unrecorded);
	const middle = figures.permittedPower;
	// The curve needs no load: it is what a check with an unknown load still can show.
	if (refusals.some(({ code }) => code !== 'load-unknown') || middle === null || uncertainty === null) {
		return null;
	}
	return Number.isFinite(middle) ? { middle, low: lowEnd(middle, uncertainty.badEnd) } : null;
}
