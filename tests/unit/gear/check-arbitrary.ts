/** Random checks for property tests that mostly have a margin. All that the schema lets through: schema-arbitrary.ts. */
import fc from 'fast-check';
import type { EvaluateInput, Gear, GearKind, Load, Material, Mate, Pitch } from '$lib/gear/contract';

export const within = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const maybe = <T>(of: fc.Arbitrary<T>) => fc.option(of, { nil: undefined });
const finish = fc.constantFrom('cast', 'cut', 'hobbed', 'ground');

const size = <U extends string>(min: number, max: number, unit: U) =>
	within(min, max).map((value) => ({ value, unit }));

interface Parts {
	kinds: GearKind[];
	teeth: fc.Arbitrary<number>;
	pitch: fc.Arbitrary<Pitch>;
	form: fc.Arbitrary<Pick<Gear, 'form' | 'pressureAngle' | 'profileShift'>>;
	faceWidth: fc.Arbitrary<Gear['faceWidth']>;
	material: fc.Arbitrary<Material>;
	load: fc.Arbitrary<Load>;
	rpm: fc.Arbitrary<number>;
	centreDistance: fc.Arbitrary<NonNullable<Mate['centreDistance']>>;
	uncertainty: [number, number];
}

function gearOf(parts: Parts, kinds: GearKind[]): fc.Arbitrary<Gear> {
	return fc
		.record({
			kind: fc.constantFrom(...kinds),
			teeth: parts.teeth,
			pitch: parts.pitch,
			plane: maybe(fc.constantFrom('normal', 'transverse')),
			helix: within(0, 45),
			form: parts.form,
			faceWidth: parts.faceWidth,
			finish,
			material: parts.material
		})
		.map(({ kind, teeth, helix, form, ...gear }) => ({
			...gear,
			...form,
			kind,
			...(kind === 'rack' ? {} : { teeth }),
			...(kind === 'helical' ? { helixAngle: helix } : {})
		})) as fc.Arbitrary<Gear>;
}

function mateOf(parts: Parts): fc.Arbitrary<Mate> {
	return fc.record(
		{
			kind: fc.constant('spur' as const),
			teeth: parts.teeth,
			form: fc.constantFrom('full-depth', 'stub'),
			faceWidth: parts.faceWidth,
			material: parts.material,
			finish,
			worn: fc.boolean(),
			centreDistance: parts.centreDistance
		},
		{ requiredKeys: ['kind'] }
	) as fc.Arbitrary<Mate>;
}

/** A gear with its mate that fits it (same pitch, angle and helix), its original and its drive. */
function check(parts: Parts): fc.Arbitrary<EvaluateInput> {
	const [least, most] = parts.uncertainty;
	return fc
		.record({
			gear: gearOf(parts, parts.kinds),
			mate: maybe(mateOf(parts)),
			original: maybe(gearOf(parts, ['spur'])),
			load: parts.load,
			rpm: parts.rpm,
			serviceFactor: within(0.1, 10),
			bending: fc.constantFrom('one-way', 'reversing'),
			rules: maybe(
				fc.record({
					formFactor: fc.constantFrom('handbook', 'geometry', 'lower-of-both'),
					cutLaw: fc.constantFrom(600, 1200),
					bendingMargin: within(0.1, 100),
					wearMargin: within(0.1, 100),
					reversingFactor: within(0.1, 1)
				})
			),
			permittedMaterials: maybe(fc.array(parts.material, { maxLength: 6 })),
			uncertainty: maybe(
				fc.record({
					faceWidth: within(least, most),
					load: within(least, most),
					speed: within(least, most)
				})
			)
		})
		.map(({ load, rpm, serviceFactor, bending, mate, original, ...rest }) => {
			const { kind, helixAngle } = rest.gear;
			const rack = kind === 'rack';
			return {
				...rest,
				mate: mate && (kind === 'helical' ? { ...mate, kind, helixAngle } : mate),
				original: rack ? undefined : original,
				drive: {
					load,
					...(rack
						? { velocity: { value: Math.min(rpm, 90_000), unit: 'ft/min' as const } }
						: { speed: { value: rpm, unit: 'rpm' as const } }),
					serviceFactor,
					bending
				}
			};
		}) as fc.Arbitrary<EvaluateInput>;
}

const handbookForm = fc.constantFrom(
	{ form: 'full-depth' as const, pressureAngle: 14.5 },
	{ form: 'full-depth' as const, pressureAngle: 20 },
	{ form: 'stub' as const, pressureAngle: 20 }
);

const material = (
	allowable: [number, number],
	modulus: [number, number],
	brinell: [number, number]
): fc.Arbitrary<Material> =>
	fc.record(
		{
			name: fc.constantFrom('one', 'two', 'three'),
			metallic: fc.boolean(),
			allowableBending: size(...allowable, 'MPa' as const),
			brinell: within(...brinell),
			modulus: size(...modulus, 'GPa' as const),
			poisson: within(0, 0.5),
			permitted: fc.boolean()
		},
		{ requiredKeys: ['name', 'metallic', 'allowableBending', 'permitted'] }
	);

const realisticParts: Parts = {
	kinds: ['spur'],
	teeth: fc.integer({ min: 10, max: 400 }),
	pitch: fc.oneof(
		within(1, 20).map((value) => ({ system: 'diametral' as const, value })),
		within(1, 25).map((value) => ({ system: 'module' as const, value }))
	),
	form: handbookForm,
	faceWidth: size(5, 300, 'mm'),
	material: material([10, 600], [80, 210], [150, 400]),
	load: fc.oneof(
		size(0.1, 500, 'kW').map((power) => ({ power })),
		size(1, 5000, 'N*m').map((torque) => ({ torque })),
		size(10, 50000, 'N').map((tangentialForce) => ({ tangentialForce }))
	),
	rpm: within(0.1, 200),
	centreDistance: size(20, 5000, 'mm'),
	uncertainty: [0, 0.3]
};

/** Spur gears whose drive, mate and materials a plant could have. */
export const realistic = check({ ...realisticParts });

/** The same with helical and internal gears and racks, shifted teeth and odd angles. */
export const realisticOfAllKinds = check({
	...realisticParts,
	kinds: ['spur', 'helical', 'internal', 'rack'],
	form: fc.oneof(
		handbookForm,
		fc.record({
			form: fc.constant('full-depth' as const),
			pressureAngle: within(14.5, 25),
			profileShift: within(0, 0.4)
		})
	)
});
