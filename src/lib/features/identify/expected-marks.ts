/** Where the expected values of the leading gears stand on a rule, and their labels so that none covers another. */
import type { Candidate, NextReading } from '$lib/gear/identify/contract';
import { basePitch } from '$lib/gear/measure/span';
import { fromSI, toSI } from '$lib/gear/quantity';
import type { LengthUnit } from './candidate-words';

export interface ExpectedMark {
	/** Place in the list of candidates. */
	candidate: number;
	/** In the unit of the rule. */
	value: number;
	/** Of the mark and of the middle of its label, in pixels from the left. */
	at: number;
	label: number;
}

/** More labels than this have no room beside each other. */
const SHOWN = 3;
const LABEL = 128;

/** What the longer of two spans reads more than the shorter: the base pitch of each gear. */
export function differences(
	expected: NextReading['expected'],
	candidates: readonly Candidate[]
): NextReading['expected'] {
	return expected.flatMap(({ candidate }) => {
		const gear = candidates[candidate];
		if (!gear) return [];
		const value = basePitch(gear.module, (gear.pressureAngle * Math.PI) / 180);
		return [{ candidate, value, unit: 'mm' as const }];
	});
}

/** Of the likeliest gears, in the order of their values. */
export function expectedMarks(
	expected: NextReading['expected'],
	unit: LengthUnit,
	width: number
): ExpectedMark[] {
	const values = expected
		.toSorted((a, b) => a.candidate - b.candidate)
		.slice(0, SHOWN)
		.map(({ candidate, value, unit: its }) => ({
			candidate,
			value: fromSI(toSI({ value, unit: its }), unit)
		}))
		.sort((a, b) => a.value - b.value);
	const [least, most] = [values[0]?.value ?? 0, values.at(-1)?.value ?? 0];
	const margin = LABEL / 2;
	const place = (value: number) =>
		most > least ? margin + ((value - least) / (most - least)) * (width - 2 * margin) : width / 2;
	const labels = apart(
		values.map(({ value }) => place(value)),
		width
	);
	return values.map((one, i) => ({ ...one, at: place(one.value), label: labels[i] ?? 0 }));
}

/** The places moved as little as keeps a label's width between them and all inside. */
function apart(places: number[], width: number): number[] {
	const moved = [...places];
	for (let i = 1; i < moved.length; i++) moved[i] = Math.max(moved[i]!, moved[i - 1]! + LABEL);
	const over = Math.max(0, (moved.at(-1) ?? 0) - (width - LABEL / 2));
	for (let i = moved.length - 1; i >= 0; i--) {
		const most = i === moved.length - 1 ? width - LABEL / 2 : moved[i + 1]! - LABEL;
		moved[i] = Math.min(moved[i]!, over > 0 ? most : moved[i]!);
	}
	return moved;
}
