/**
 * The working is arithmetic that anyone can repeat: every line's numbers, taken as they stand, give its value, and its
 * symbols are those of earlier lines.
 */
import { describe, expect, test } from 'vitest';
import type { EvaluateInput, Load, WorkingLine } from '$lib/gear/contract';
import { evaluate } from '$lib/gear/evaluate';
import { spurCheck, type TextbookCheck } from '../../reference/spur-check';

const loads: Load[] = [
	{ power: { value: 5, unit: 'hp' } },
	{ torque: { value: 300, unit: 'lbf*in' } },
	{ tangentialForce: { value: 150, unit: 'lbf' } }
];

const checks: EvaluateInput[] = loads.flatMap((load) =>
	(['cast', 'cut', 'hobbed', 'ground'] as const).flatMap((finish) =>
		[true, false].map((metallic): EvaluateInput => {
			const check: TextbookCheck = {
				teeth: 48,
				pitch: { system: 'circular', value: 0.5, unit: 'in' },
				rpm: 400,
				load,
				finish,
				metallic
			};
			const input = spurCheck(check);
			return {
				...input,
				drive: { ...input.drive, bending: 'reversing' },
				mate: { kind: 'spur', faceWidth: { value: 20, unit: 'mm' } }
			};
		})
	)
);

/** The numbers of a line as the arithmetic they are. */
function worth(numbers: string): number {
	const script = numbers
		.replaceAll('π', 'Math.PI')
		.replaceAll('√', 'Math.sqrt')
		.replaceAll('·', '*')
		.replaceAll('²', '**2')
		.replaceAll('∞', 'Infinity')
		.replace(/\b(min|max)\(/g, 'Math.$1(');
	return new Function(`return ${script};`)() as number;
}

const isArithmetic = ({ expression }: WorkingLine) =>
	expression !== 'as given' && !expression.startsWith('table');

describe.each(checks)('$drive.load $gear.finish, metallic $gear.material.metallic', (input) => {
	const { working, ...outcome } = evaluate(input);

	test('reaches the outcome: margin, low end, permitted power and torque', () => {
		const value = (symbol: string) => working.find((line) => line.symbol === symbol)?.value;
		expect(value('d')).toBe(outcome.pitchDiameter);
		expect(value('Wd')).toBe(outcome.designForce);
		expect(value('S')).toBe(outcome.bendingStress);
		expect(value('M')).toBe(outcome.bendingMargin);
		expect(value('Ml')).toBe(outcome.bendingMarginLow);
		expect(value('Pp')).toBe(outcome.permittedPower);
		expect(value('Tp')).toBe(outcome.permittedTorque);
	});

	test('each line can be worked by hand from its numbers', () => {
		const lines = working.filter(isArithmetic);
		expect(lines.length).toBeGreaterThan(12);
		for (const { numbers, value } of lines) {
			// Six digits are shown of every term.
			expect(Math.abs(worth(numbers) - value), numbers).toBeLessThanOrEqual(
				2e-5 * Math.max(Math.abs(value), 0.01)
			);
		}
	});

	test('each line names its unit and its source', () => {
		for (const line of working) {
			expect(line.source).not.toBe('');
			expect(line.unit).not.toBe('');
		}
	});
});

test('between table entries the working shows the interpolation, up to the rack', () => {
	const lineFor = (teeth: number) =>
		evaluate(spurCheck({ teeth, pitch: { system: 'module', value: 4 } })).working.find(
			({ symbol }) => symbol === 'Y'
		);
	expect(lineFor(48)?.numbers).toBe('0.399 + (0.408 - 0.399) · (1 / 45 - 1 / 48) / (1 / 45 - 1 / 50)');
	expect(lineFor(400)?.numbers).toBe('0.471 + (0.484 - 0.471) · (1 / 300 - 1 / 400) / (1 / 300 - 1 / ∞)');
	expect(worth(lineFor(400)?.numbers ?? '')).toBeCloseTo(lineFor(400)?.value ?? NaN, 9);
	expect(lineFor(24)).toMatchObject({ expression: 'table at N', numbers: 'table at 24', value: 0.337 });
});
