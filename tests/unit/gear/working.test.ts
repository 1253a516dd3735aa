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

/** Undercut on both sides, an internal mate, a rack: each has lines of its own. */
const others = (
	[
		{ teeth: 14, pressureAngle: 14.5, mate: { kind: 'spur', teeth: 30, profileShift: 0.1 } },
		{ teeth: 14, pressureAngle: 20, mate: { kind: 'internal', teeth: 60, profileShift: 0.2 } },
		{ teeth: 14, pressureAngle: 14.5, profileShift: 0.1, mate: { kind: 'rack' } }
	] as const
).map(({ mate, ...gear }): EvaluateInput => {
	const [input] = checks as [EvaluateInput];
	const thin = { toothThickness: { value: 6, unit: 'mm' as const } };
	const thickness = mate.kind === 'rack' ? {} : thin;
	const { centreDistance: _, toothThickness: __, teeth: ___, ...known } = knownMate;
	return {
		...input,
		gear: { ...input.gear, ...gear, ...thickness },
		mate: { ...known, ...mate },
		original: undefined
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
		.replace(/\barctan\(/g, '(180 / Math.PI) * Math.atan(')
		.replace(/\btan\(([^()]+)\)/g, 'Math.tan(($1) * Math.PI / 180)')
		.replace(/\bcos\(([^()]+)\)/g, 'Math.cos(($1) * Math.PI / 180)')
		.replace(/\bsin\(([^()]+)\)/g, 'Math.sin(($1) * Math.PI / 180)')
		.replace(/\b(min|max)\(/g, 'Math.$1(');
	return new Function(`return ${script};`)() as number;
}

/** Six digits are shown of every term; a difference has the error of its terms. */
function sizeOf(numbers: string, value: number): number {
	const [, first] = /^\(?([\d.]+) - /.exec(numbers) ?? [];
	if (first) return Number(first);
	const [, minuend = '1', subtrahend = '0'] = /max\(0, ([\d.]+) - ([\d.]+)\) ·/.exec(numbers) ?? [];
	const lost = Number(minuend) / Math.max(Number(minuend) - Number(subtrahend), 1e-9);
	return Math.max(Math.abs(value) * lost, 0.01);
}

const isArithmetic = ({ expression }: WorkingLine) =>
	expression !== 'as given' && !expression.startsWith('table') && !expression.startsWith('from the');

describe.each([...checks, ...helical, ...others])(
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
				expect(Math.abs(worth(numbers) - value), numbers).toBeLessThanOrEqual(2e-5 * sizeOf(numbers, value));
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

describe('no figure appears from nowhere', () => {
	/** Readings and tables, and the names that all lines of one kind share. */
	const GIVEN =
		/^(m|m1|m2|mn|N|N1|N2|x|x1|x2|ha|hf|ρ|w|d|d1|d2|α|α1|α2|αn|αn1|αn2|αt|β|βb|r1|C|sn|φ|uF|uL|un|z|π|ν1|ν2|E1|E2|F|HB1|HB2)$/;
	const symbols = (expression: string) =>
		[...expression.matchAll(/\p{L}[\p{L}\p{Nd}]*/gu)].map(([symbol]) => symbol);
	const FUNCTION = /^(cos|sin|tan|arccos|arctan|min|max)$/;

	test.each([
		['measured pair', checks[0]],
		['helical pair', helical[0]],
		['undercut pair', others[0]],
		['internal pair', others[1]],
		['rack', others[2]]
	])('%s: path of contact, flanks and backlash', (_name, input) => {
		const { working } = evaluate(input as EvaluateInput);
		const told = new Set(working.map(({ symbol }) => symbol));
		const traced = working.filter(({ symbol }) =>
			/^(Z|Ze|Zb|Zu|Z1|Z2|A|h|e|mp|mu|pb|cr|jt|jn|pw|s1|s2|rw1|rw2|invw|ke|Kf)$/.test(symbol)
		);
		expect(traced.length).toBeGreaterThan(8);
		for (const { expression } of traced) {
			for (const symbol of symbols(expression)) {
				if (FUNCTION.test(symbol) || GIVEN.test(symbol) || expression.startsWith('from')) continue;
				expect(told, `${symbol} of ${expression}`).toContain(symbol);
			}
		}
	});

	test('a helical pair tells its transverse angle, a pair of shifts the angle and distance that they make', () => {
		const told = evaluate(helical[0] as EvaluateInput).working.map(({ symbol }) => symbol);
		for (const symbol of ['αt', 'inv1', 'inv2', 'invw', 'αw', 'C', 'r1', 'r2', 'rf'])
			expect(told).toContain(symbol);
	});
});

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
