/**
 * Random checks for property tests: `realistic` ones mostly have a margin, `allowed` ones fill the whole space that
 * the schema lets through.
 */
import fc from 'fast-check';
import type { EvaluateInput, Load, Pitch } from '$lib/gear/contract';

const within = (min: number, max: number) => fc.double({ min, max, noNaN: true });

const finish = fc.constantFrom('cast', 'cut', 'hobbed', 'ground');
const maybe = <T>(of: fc.Arbitrary<T>) => fc.option(of, { nil: undefined });

function check(parts: {
	teeth: fc.Arbitrary<number>;
	pitch: fc.Arbitrary<Pitch>;
	form: fc.Arbitrary<Pick<EvaluateInput['gear'], 'form' | 'pressureAngle' | 'profileShift'>>;
	faceWidth: fc.Arbitrary<EvaluateInput['gear']['faceWidth']>;
	allowable: fc.Arbitrary<EvaluateInput['gear']['material']['allowableBending']>;
	load: fc.Arbitrary<Load>;
	rpm: fc.Arbitrary<number>;
}): fc.Arbitrary<EvaluateInput> {
	return fc.record({
		gear: fc
			.record({
				teeth: parts.teeth,
				pitch: parts.pitch,
				form: parts.form,
				faceWidth: parts.faceWidth,
				finish,
				allowableBending: parts.allowable,
				metallic: fc.boolean(),
				permitted: fc.boolean()
			})
			.map(({ form, allowableBending, metallic, permitted, ...gear }) => ({
				kind: 'spur' as const,
				...gear,
				...form,
				material: { name: 'any', metallic, permitted, allowableBending }
			})),
		mate: maybe(fc.record({ kind: fc.constant('spur' as const), faceWidth: maybe(parts.faceWidth) })),
		drive: fc.record({
			load: parts.load,
			speed: fc.record({ value: parts.rpm, unit: fc.constant('rpm' as const) }),
			serviceFactor: within(0.1, 10),
			bending: fc.constantFrom('one-way', 'reversing')
		}),
		rules: maybe(
			fc.record({
				formFactor: fc.constantFrom('handbook', 'handbook', 'handbook', 'geometry', 'lower-of-both'),
				cutLaw: fc.constantFrom(600, 1200),
				bendingMargin: within(0.1, 100),
				reversingFactor: within(0.1, 1)
			})
		),
		uncertainty: maybe(fc.record({ faceWidth: within(0, 0.5), load: within(0, 0.5), speed: within(0, 0.5) }))
	}) as fc.Arbitrary<EvaluateInput>;
}

const handbookForm = fc.constantFrom(
	{ form: 'full-depth' as const, pressureAngle: 14.5 },
	{ form: 'full-depth' as const, pressureAngle: 20 },
	{ form: 'stub' as const, pressureAngle: 20 }
);

const size = <U extends string>(min: number, max: number, unit: U) =>
	within(min, max).map((value) => ({ value, unit }));

export const realistic = check({
	teeth: fc.integer({ min: 10, max: 400 }),
	pitch: fc.oneof(
		within(1, 20).map((value) => ({ system: 'diametral' as const, value })),
		within(1, 25).map((value) => ({ system: 'module' as const, value }))
	),
	form: handbookForm,
	faceWidth: size(5, 300, 'mm'),
	allowable: size(10, 600, 'MPa'),
	load: fc.oneof(
		size(0.1, 500, 'kW').map((power) => ({ power })),
		size(1, 5000, 'N*m').map((torque) => ({ torque })),
		size(10, 50000, 'N').map((tangentialForce) => ({ tangentialForce }))
	),
	rpm: within(0.1, 200)
});

export const allowed = check({
	teeth: fc.integer({ min: 1, max: 5000 }),
	pitch: fc.oneof(
		within(0.1, 500).map((value) => ({ system: 'diametral' as const, value })),
		within(0.05, 250).map((value) => ({ system: 'module' as const, value })),
		within(0.001, 800).map((value) => ({ system: 'circular' as const, value, unit: 'ft' as const }))
	),
	form: fc.oneof(
		handbookForm,
		fc.record({
			form: fc.constant('full-depth' as const),
			pressureAngle: within(5, 45),
			profileShift: within(-2, 2)
		}),
		within(0.1, 2).map((addendum) => ({
			form: { addendum, dedendum: 1.25, tipRadius: 0 },
			pressureAngle: 20
		}))
	),
	faceWidth: size(0.1, 20_000, 'mm'),
	allowable: size(0.01, 10_000, 'MPa'),
	load: fc.oneof(
		fc.constant('unknown' as const),
		size(0.001, 1e9, 'W').map((power) => ({ power })),
		size(1e-6, 1e9, 'N*m').map((torque) => ({ torque })),
		size(1e-6, 1e9, 'N').map((tangentialForce) => ({ tangentialForce }))
	),
	rpm: within(0.001, 200_000)
});
