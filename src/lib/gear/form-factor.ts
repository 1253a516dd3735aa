/**
 * The Lewis form factor Y by the handbook table: how much of the load's force a tooth's shape turns into stress at its
 * root, load at the tip. Full depth at 14.5 and 20 degrees, stub at 20 degrees, no shift; every other tooth goes by
 * its geometry (form-factor-geometry.ts).
 */
import type { Reason, ToothForm } from './contract';
import { SOURCES } from './sources';
import {
	FULL_DEPTH_14_5,
	FULL_DEPTH_20,
	LEWIS_TEETH,
	STUB_20,
	type LewisColumn
} from './tables/faires-4th-edition';
import { unrecorded, type Recorder } from './working';

/** Fewest teeth in the table; below, the fillet is undercut and the method ends. */
export const FEWEST_TEETH = 10;

/**
 * What the table is asked for: teeth (virtual ones of a helical gear, Infinity for a rack), normal pressure angle in
 * degrees, shift in modules.
 */
export interface TableTooth {
	teeth: number;
	pressureAngle: number;
	form: ToothForm;
	profileShift?: number | undefined;
}

const line = {
	symbol: 'Yh',
	name: 'Lewis form factor by the handbook, load at the tip',
	unit: '1',
	source: SOURCES.lewisTable
};
const ENTRY = { ...line, expression: 'table at N' };
const RACK = { ...line, expression: 'table, rack' };
const BETWEEN = { ...line, expression: 'Ya + (Yb - Ya) · (1 / Na - 1 / N) / (1 / Na - 1 / Nb)' };

/** The Lewis method ends below ten teeth, by table and by geometry alike. */
export function fewTeethRefusal(teeth: number): Reason | null {
	if (teeth >= FEWEST_TEETH) return null;
	return {
		code: 'too-few-teeth',
		text: `The Lewis method starts at ${FEWEST_TEETH} teeth, this gear has ${teeth}. Count again, or have the gear rated by an engineer.`,
		values: { teeth, fewest: FEWEST_TEETH }
	};
}

/** Whether the table holds this tooth: one of its three forms, whole, not shifted, of ten teeth or more. */
export function handbookHolds(tooth: TableTooth): boolean {
	const { teeth, pressureAngle, form, profileShift = 0 } = tooth;
	return profileShift === 0 && teeth >= FEWEST_TEETH && columnOf(pressureAngle, form) !== null;
}

/**
 * Lewis form factor Y (for diametral pitch or module), load at the tip, from the handbook table; between two
 * entries linear in 1/N, the rack at 1/N = 0. Throws a RangeError for a tooth that the table does not hold
 * (`handbookHolds` tells).
 * Source: Faires, Design of Machine Elements, 4th ed., form-factor table (edition from memory).
 * @example lewisFormFactor({ teeth: 24, pressureAngle: 14.5, form: 'full-depth' }) // 0.302
 * @example lewisFormFactor({ teeth: 48, pressureAngle: 14.5, form: 'full-depth' }) // 0.34375
 */
export function lewisFormFactor(tooth: TableTooth, recorder: Recorder = unrecorded): number {
	const column = columnOf(tooth.pressureAngle, tooth.form);
	if (!column || !handbookHolds(tooth)) {
		throw new RangeError('The handbook table does not hold this tooth: see handbookHolds.');
	}
	if (tooth.teeth === Infinity) return recorder.step(RACK, {}, () => column.rack);

	const { below, above } = neighbours(column, tooth.teeth);
	if (below.N === tooth.teeth) {
		return recorder.step(ENTRY, { N: below.N }, () => below.Y);
	}
	return recorder.step(
		BETWEEN,
		{ Ya: below.Y, Yb: above.Y, Na: below.N, Nb: above.N, N: tooth.teeth },
		({ Ya, Yb, Na, Nb, N }) => Ya + ((Yb - Ya) * (1 / Na - 1 / N)) / (1 / Na - 1 / Nb)
	);
}

/** Nobody reads an angle off a gear to a thousandth of a degree: this only forgives the arithmetic of a form. */
const SAME_ANGLE = 1e-6;

function columnOf(pressureAngle: number, form: ToothForm): LewisColumn | null {
	const is = (angle: number) => Math.abs(pressureAngle - angle) < SAME_ANGLE;
	if (form === 'full-depth') return is(20) ? FULL_DEPTH_20 : is(14.5) ? FULL_DEPTH_14_5 : null;
	return form === 'stub' && is(20) ? STUB_20 : null;
}

interface Entry {
	N: number;
	Y: number;
}

/** The entries on either side of a tooth count; the last one's upper neighbour is the rack, at N = Infinity. */
function neighbours({ Y, rack }: LewisColumn, teeth: number): { below: Entry; above: Entry } {
	const next = LEWIS_TEETH.findIndex((N) => N > teeth);
	const last = next === -1 ? LEWIS_TEETH.length - 1 : next - 1;
	const entry = (i: number): Entry => ({ N: LEWIS_TEETH[i] ?? Infinity, Y: Y[i] ?? rack });
	return { below: entry(last), above: entry(last + 1) };
}
