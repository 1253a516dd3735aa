/**
 * The working is arithmetic that anyone can repeat: every line's numbers, taken as they stand, give its value, and its
 * symbols are those of earlier lines.
 */
import { describe, expect, test } from 'vitest';
import type { EvaluateInput, Load, Mate, WorkingLine } from '$lib/gear/contract';
import { evaluate } from '$lib/gear/evaluate';
import { spurCheck, type TextbookCheck } from '../../reference/spur-check';

const loads: Load[] = [
	{ power: { value: 5, unit: 'hp' } },
	{ torque: { value: 300, unit: 'lbf*in' } },
	{ tangentialForce: { value: 150, unit: 'lbf' } }
];

const steel = {
	name: 'steel of the mate',
	metallic: true,
	allowableBending: { value: 20, unit: 'ksi' as const },
	brinell: 210,
	modulus: { value: 30e3, unit: 'ksi' as const }
};

/** A mate of which all is known: bending, wear and mesh are in the working. */
const knownMate: Mate = {
	kind: 'spur',
	teeth: 77,
	form: 'full-depth',
	faceWidth: { value: 20, unit: 'mm' },
	centreDistance: { value: 253.8, unit: 'mm' },
	toothThickness: { value: 6.2, unit: 'mm' },
	material: { ...steel, poisson: 0.29, permitted: true }
};

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
				gear: { ...input.gear, material: { ...input.gear.material, ...steel, name: 'steel', metallic } },
				original: input.gear,
				drive: { ...input.drive, bending: 'reversing' },
				mate: knownMate
			};
		})
	)
);

/** A helical pair, stated in either plane: virtual teeth, both modules, overlap. */
const helical = (['normal', 'transverse'] as const).map((plane): EvaluateInput => {
	const [input] = checks as [EvaluateInput];
	const part = { kind: 'helical' as const, plane, helixAngle: 17 };
	return {
		...input,
		gear: { ...input.gear, ...part, profileShift: 0.2 },
		mate: { ...knownMate, ...part, centreDistance: undefined, profileShift: -0.1 },
		rules: { formFactor: 'lower-of-both' }
	};
});

/** The numbers of a line as the arithmetic they are. */
function worth(numbers: string): number {
	const script = numbers
		.replaceAll('π', 'Math.PI')
		.replaceAll('√', 'Math.sqrt')
		.replaceAll('·', '*')
		.replaceAll('²', '**2')
		.replaceAll('³', '**3')
		.replaceAll('^', '**')
		.replaceAll('∞', 'Infinity')
		.replace(/\barccos\(/g, '(180 / Math.PI) * Math.acos(')
		.replace(/\bcos\(([^()]+)\)/g, 'Math.cos(($1) * Math.PI / 180)')
		.replace(/\bsin\(([^()]+)\)/g, 'Math.sin(($1) * Math.PI / 180)')
		.replace(/\b(min|max)\(/g, 'Math.$1(');
	return new Function(`return ${script};`)() as number;
}

const isArithmetic = ({ expression }: WorkingLine) =>
	expression !== 'as given' && !expression.startsWith('table') && !expression.startsWith('from the');

describe.each([...checks, ...helical])(
	'$drive.load $gear.finish, metallic $gear.material.metallic',
	(input) => {
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
			expect(lines.length).toBeGreaterThan(25);
			for (const { numbers, value } of lines) {
				// Six digits are shown of every term; a difference has the error of its first.
				const size = /^[\d.]+ - /.test(numbers) ? parseFloat(numbers) : Math.max(Math.abs(value), 0.01);
				expect(Math.abs(worth(numbers) - value), numbers).toBeLessThanOrEqual(2e-5 * size);
			}
		});

		test('each line names its unit and its source', () => {
			for (const line of working) {
				expect(line.source).not.toBe('');
				expect(line.unit).not.toBe('');
			}
		});
	}
);

test('between table entries the working shows the interpolation, up to the rack', () => {
	const lineFor = (teeth: number) =>
		evaluate(spurCheck({ teeth, pitch: { system: 'module', value: 4 } })).working.find(
			({ symbol }) => symbol === 'Yh'
		);
	expect(lineFor(48)?.numbers).toBe('0.399 + (0.408 - 0.399) · (1 / 45 - 1 / 48) / (1 / 45 - 1 / 50)');
	expect(lineFor(400)?.numbers).toBe('0.471 + (0.484 - 0.471) · (1 / 300 - 1 / 400) / (1 / 300 - 1 / ∞)');
	expect(worth(lineFor(400)?.numbers ?? '')).toBeCloseTo(lineFor(400)?.value ?? NaN, 9);
	expect(lineFor(24)).toMatchObject({ expression: 'table at N', numbers: 'table at 24', value: 0.337 });
});
