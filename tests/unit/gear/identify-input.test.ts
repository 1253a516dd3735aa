/** What may be asked of identification: bad readings are named with the remedy, and what is let through is answered. */
import fc from 'fast-check';
import { describe, expect, expectTypeOf, test } from 'vitest';
import type { z } from 'zod';
import type { IdentifyInput } from '$lib/gear/identify/contract';
import { identify } from '$lib/gear/identify/identify';
import { identifyInput, parseIdentify } from '$lib/records/identify';

/** The whole of the contract. */
const READINGS = {
	teeth: 25,
	teethCertain: true,
	outsideDiameter: { value: 5.39, unit: 'in', uncertainty: 0.004, taken: 'over-tips', tipWorn: false },
	rootDiameter: { value: 4.49, unit: 'in', uncertainty: 0.002 },
	wholeDepth: { value: 0.45, unit: 'in', uncertainty: 0.002 },
	spans: [
		{ teeth: 3, value: 1.547, unit: 'in', uncertainty: 0.001 },
		{ teeth: 4, value: 2.137, unit: 'in', uncertainty: 0.001 }
	],
	overPins: { pinDiameter: { value: 0.3456, unit: 'in' }, value: 5.44, unit: 'in', uncertainty: 0.001 },
	chordalThickness: { value: 0.31, unit: 'in' },
	centreDistance: { value: 8.5, unit: 'in', uncertainty: 0.02 },
	mateTeeth: 60,
	circularPitch: { values: [0.62, 0.64, 0.63], unit: 'in' },
	helixAngle: { value: 0, uncertainty: 0.5 },
	flanksWorn: false,
	prior: 'inch',
	cannotMeasure: ['spans']
};

const issues = (input: unknown) => {
	const parsed = parseIdentify(input);
	return parsed.ok ? [] : parsed.error.error.issues;
};

test('the type of the schema is the type of the core', () => {
	expectTypeOf<z.infer<typeof identifyInput>>().toExtend<IdentifyInput>();
});

test('the whole of the contract is accepted, and so is a count alone', () => {
	expect(parseIdentify(READINGS)).toEqual({ ok: true, input: READINGS });
	expect(issues({ teeth: 25 })).toEqual([]);
});

describe('is refused, with the field and the remedy', () => {
	test.each<[string, unknown]>([
		['teeth', { ...READINGS, teeth: 24.5 }],
		['teeth', { ...READINGS, teeth: undefined }],
		['teeth', { ...READINGS, teeth: 3 }],
		['outsideDiameter.value', { ...READINGS, outsideDiameter: { value: -5, unit: 'in' } }],
		['outsideDiameter.value', { ...READINGS, outsideDiameter: { value: 1e308, unit: 'in' } }],
		['outsideDiameter.value', { ...READINGS, outsideDiameter: { unit: 'in' } }],
		['outsideDiameter.value', { ...READINGS, outsideDiameter: { value: 5, values: [5], unit: 'in' } }],
		['outsideDiameter.taken', { ...READINGS, outsideDiameter: { value: 5, unit: 'in', taken: 'by eye' } }],
		['outsideDiameter.unit', { ...READINGS, outsideDiameter: { value: 5, unit: 'inch' } }],
		['wholeDepth.uncertainty', { ...READINGS, wholeDepth: { value: 0.4, unit: 'in', uncertainty: 0 } }],
		['rootDiameter.values', { ...READINGS, rootDiameter: { values: [4, 0], unit: 'in' } }],
		['spans.0.teeth', { ...READINGS, spans: [{ teeth: 1, value: 1.5, unit: 'in' }] }],
		['overPins.pinDiameter', { ...READINGS, overPins: { value: 5, unit: 'in' } }],
		['mateTeeth', { ...READINGS, mateTeeth: undefined }],
		['helixAngle.value', { ...READINGS, helixAngle: { value: 90 } }],
		['prior', { ...READINGS, prior: 'old' }],
		['cannotMeasure.0', { ...READINGS, cannotMeasure: ['colour'] }],
		['spanns', { ...READINGS, spanns: [] }]
	])('%s', (path, input) => {
		const found = issues(input);
		expect(found.map((issue) => issue.path)).toContain(path);
		for (const { message } of found) expect(message).toMatch(/\b(must|known|leave)\b/);
	});

	test.each([null, 5, 'x', [], undefined])('%j as a whole', (input) => {
		expect(issues(input)).toHaveLength(1);
	});
});

test('whatever is let through is answered with finite numbers that add up to one', () => {
	const length = fc.record({
		value: fc.double({ min: 0.1, max: 20_000, noNaN: true }),
		unit: fc.constant('mm' as const),
		uncertainty: fc.double({ min: 1e-4, max: 100, noNaN: true })
	});
	const input = fc.record(
		{
			teeth: fc.integer({ min: 4, max: 2000 }),
			teethCertain: fc.boolean(),
			outsideDiameter: length,
			rootDiameter: length,
			wholeDepth: length,
			spans: fc.array(
				fc
					.record({ reading: length, teeth: fc.integer({ min: 2, max: 500 }) })
					.map(({ reading, teeth }) => ({ ...reading, teeth })),
				{ maxLength: 4 }
			),
			overPins: fc
				.record({ reading: length, pinDiameter: fc.double({ min: 0.1, max: 20_000, noNaN: true }) })
				.map(({ reading, pinDiameter }) => ({
					...reading,
					pinDiameter: { value: pinDiameter, unit: 'mm' as const }
				})),
			chordalThickness: length,
			circularPitch: length,
			helixAngle: fc.record({ value: fc.double({ min: -60, max: 60, noNaN: true }) }),
			flanksWorn: fc.boolean(),
			prior: fc.constantFrom('inch', 'metric', 'either')
		},
		{ requiredKeys: ['teeth'] }
	);
	fc.assert(
		fc.property(input, (readings) => {
			const parsed = parseIdentify(readings);
			if (!parsed.ok) throw new Error(JSON.stringify(parsed.error));
			const answer = identify(parsed.input);
			expectFinite(answer);
			const told = answer.candidates.reduce((sum, { probability }) => sum + probability, 0);
			expect(told + answer.noneFits).toBeLessThanOrEqual(1 + 1e-9);
			expect(['clear', 'several', 'none-fits']).toContain(answer.state);
			for (const { candidate } of answer.nextReading?.expected ?? []) {
				expect(answer.candidates[candidate]).toBeDefined();
			}
		}),
		{ numRuns: 1000 }
	);
}, 60_000);

function expectFinite(value: unknown): void {
	if (typeof value === 'number') return expect(Number.isFinite(value)).toBe(true);
	if (typeof value === 'object' && value !== null) Object.values(value).forEach(expectFinite);
}
