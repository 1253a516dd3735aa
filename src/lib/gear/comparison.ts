/**
 * How much of what the original gear carried the spare carries, at the same drive and with the same mate: the answer
 * that remains when nobody knows the load. Ratios of power, which at one speed are ratios of torque too.
 */
import type { EvaluateInput, LimitName, Outcome, Reason } from './contract';
import { figuresOf, type FiguresAnswer } from './figures';
import type { PairLaws } from './pair-law';
import { SOURCES } from './sources';
import { unrecorded, type Recorder } from './working';

export interface Comparison {
	original: Outcome['original'];
	reasons: Reason[];
}

/** Spare over original in bending and in wear; null without an original, or where the two cannot be compared. */
export function compareWithOriginal(
	input: EvaluateInput,
	spare: FiguresAnswer,
	recorder: Recorder
): Comparison {
	if (!input.original) return { original: null, reasons: [] };
	const { original: gear, ...rest } = input;
	const original = figuresOf({ ...rest, gear }, unrecorded);
	const bending = ratio('gear-bending', spare, original);
	if (bending === null) return { original: null, reasons: [NOT_COMPARABLE] };

	const wear = ratio('wear', spare, original);
	const step = (symbol: string, name: string, { spares, originals }: Ratio) =>
		recorder.step(
			{ symbol, name, expression: 'Cs / Co', unit: '1', source: SOURCES.mechanics },
			{ Cs: spares, Co: originals },
			({ Cs, Co }) => Cs / Co
		);
	const bendingCapacityRatio = step('Rb', 'capacity in bending, spare over original', bending);
	const wearCapacityRatio = wear && step('Rw', 'capacity in wear, spare over original', wear);
	const text =
		`The spare carries ${percent(bendingCapacityRatio)} % of what the original gear carried in bending` +
		(wearCapacityRatio === null ? '.' : ` and ${percent(wearCapacityRatio)} % in wear.`);
	const told: Reason =
		wearCapacityRatio === null
			? { code: 'compared-bending', text, values: { bending: percent(bendingCapacityRatio) } }
			: {
					code: 'compared',
					text,
					values: { bending: percent(bendingCapacityRatio), wear: percent(wearCapacityRatio) }
				};
	return { original: { bendingCapacityRatio, wearCapacityRatio }, reasons: [told] };
}

const NOT_COMPARABLE: Reason = {
	code: 'original-not-comparable',
	text: 'The original gear cannot be compared: one of the two is outside the method, or the speed is missing and their finish or size differs. Check what is given of the original.'
};

interface Ratio {
	spares: number;
	originals: number;
}

/** Capacities of both on one scale: W at this speed, or N·mm of dynamic load where the speed is not known. */
function ratio(answer: LimitName, spare: FiguresAnswer, original: FiguresAnswer): Ratio | null {
	const force = (of: FiguresAnswer) => of.strengths.find((strength) => strength.answer === answer)?.force;
	const spareForce = force(spare);
	const originalForce = force(original);
	if (spareForce === undefined || originalForce === undefined) return null;

	const spares = powerOf(spareForce, spare);
	const originals = powerOf(originalForce, original);
	if (spares !== null && originals !== null) return finite({ spares, originals });
	// Without a speed: the same laws on the same pitch circle have the same factor, whatever the speed.
	const same =
		haveSameLaws(spare.laws, original.laws) && spare.figures.pitchDiameter === original.figures.pitchDiameter;
	const known = spare.figures.pitchLineVelocity !== null;
	return same && !known ? finite({ spares: spareForce, originals: originalForce }) : null;
}

function haveSameLaws(one: PairLaws, other: PairLaws): boolean {
	const names = (laws: PairLaws) => [...new Set(laws.map((member) => member?.law))].sort().join();
	return names(one) === names(other);
}

function powerOf(force: number, { figures }: FiguresAnswer): number | null {
	const { velocityFactor, pitchLineVelocity } = figures;
	return velocityFactor === null || pitchLineVelocity === null
		? null
		: (force / velocityFactor) * pitchLineVelocity;
}

function finite(ratio: Ratio): Ratio | null {
	return Number.isFinite(ratio.spares / ratio.originals) ? ratio : null;
}

/** Cut, not rounded: 99.6 % is not all of it. */
function percent(ratio: number): number {
	return Math.floor(ratio * 100 + 1e-9);
}
