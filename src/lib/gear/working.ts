/**
 * The working of a check, line by line. A step computes its figure and writes its line in one call, so the line
 * shows the very numbers that were used. `unrecorded` computes without writing, for curves and hints.
 */
import type { Quantity, WorkingLine } from './contract';
import { toSI, type Unit } from './quantity';
import { SOURCES } from './sources';

/** What a line says about a figure. `expression` holds the names of the terms as symbols. */
export type LineHead = Omit<WorkingLine, 'numbers' | 'value' | 'of'>;

export interface Recorder {
	/** Computes a figure from its terms; the terms replace their symbols in the line's numbers. */
	step<Terms extends Record<string, number>>(
		head: LineHead,
		terms: Terms,
		compute: (terms: Terms) => number
	): number;
	/** A reading or a value of the plant, converted to the core's unit. */
	given(head: Omit<LineHead, 'expression' | 'source'>, quantity: Quantity<Unit>): number;
	/** The same working, for figures of the mate. */
	mate(): Recorder;
}

export const unrecorded: Recorder = {
	step: (_head, terms, compute) => compute(terms),
	given: (_head, quantity) => toSI(quantity),
	mate: () => unrecorded
};

/** A recorder that keeps its lines. */
export class Working implements Recorder {
	constructor(
		readonly lines: WorkingLine[] = [],
		private readonly of?: WorkingLine['of']
	) {}

	mate(): Recorder {
		return new Working(this.lines, 'mate');
	}

	step<Terms extends Record<string, number>>(
		head: LineHead,
		terms: Terms,
		compute: (terms: Terms) => number
	): number {
		const value = compute(terms);
		this.write(head, head.expression, withNumbers(head.expression, terms), value, head.source);
		return value;
	}

	given(head: Omit<LineHead, 'expression' | 'source'>, quantity: Quantity<Unit>): number {
		const value = toSI(quantity);
		this.write(head, 'as given', `${quantity.value} ${quantity.unit}`, value, SOURCES.reading);
		return value;
	}

	private write(
		{ symbol, name, unit }: Pick<LineHead, 'symbol' | 'name' | 'unit'>,
		expression: string,
		numbers: string,
		value: number,
		source: string
	): void {
		// A line without a figure would show nothing; the outcome itself says why there is none.
		if (!Number.isFinite(value)) return;
		const line = { symbol, name, expression, numbers, value, unit, source };
		this.lines.push(this.of ? { ...line, of: this.of } : line);
	}
}

const SYMBOL = /(\p{L}[\p{L}\p{Nd}]*)/u;

/** Expressions are few and fixed, so each is taken apart once; symbols stand at the odd places. */
const partsOf = new Map<string, readonly string[]>();

function withNumbers(expression: string, terms: Record<string, number>): string {
	const parts = partsOf.get(expression) ?? expression.split(SYMBOL);
	partsOf.set(expression, parts);
	let numbers = '';
	parts.forEach((part, place) => {
		const value = place % 2 === 1 ? terms[part] : undefined;
		numbers += value === undefined ? part : figure(value);
	});
	return numbers;
}

/** Six significant digits: more than any reading has, few enough to check by hand. */
function figure(value: number): string {
	if (value === Infinity) return '∞';
	const digits = `${sixDigits(value)}`;
	return value < 0 ? `(${digits})` : digits;
}

/** What toPrecision(6) would say. That is the costly part of a working, and most figures are of ordinary size. */
function sixDigits(value: number): number {
	const size = Math.abs(value);
	if (Number.isInteger(value) && size < 1e6) return value;
	if (size >= 1e-3 && size < 1e6) {
		const scale = SCALES[5 - Math.floor(Math.log10(size))] ?? 1;
		return Math.round(value * scale) / scale;
	}
	return Number(value.toPrecision(6));
}

/** Powers of ten by the digits that six significant ones leave behind the point. */
const SCALES: readonly number[] = [1, 10, 100, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8];
