/**
 * Random checks that fill what the schema lets through: every field of gear, mate, original, drive and rules, in every
 * unit, from end to end of its range. Half of them lie in its middle, where teeth mesh and answers come to figures.
 */
import fc from 'fast-check';
import type {
	EvaluateInput,
	Gear,
	GearKind,
	Load,
	Mate,
	Pitch,
	Quantity,
	ToothForm
} from '$lib/gear/contract';
import {
	FORCE_UNITS,
	fromSI,
	LENGTH_UNITS,
	POWER_UNITS,
	STRESS_UNITS,
	TORQUE_UNITS,
	VELOCITY_UNITS,
	type Unit
} from '$lib/gear/quantity';
import { MOST_UNCERTAIN } from '$lib/gear/uncertainty';
import { within } from './check-arbitrary';

const KINDS = ['spur', 'helical', 'internal', 'rack'] as const satisfies readonly GearKind[];
const finish = fc.constantFrom('cast', 'cut', 'hobbed', 'ground');

/** There in one of so many. */
const oneIn = <T>(many: number, of: fc.Arbitrary<T>): fc.Arbitrary<T | undefined> =>
	fc.oneof({ weight: many - 1, arbitrary: fc.constant(undefined) }, { weight: 1, arbitrary: of });

/** Sizes of every order alike; ends included but for what a conversion of units rounds. */
const ofAnyOrder = (from: number, to: number) =>
	within(Math.log(from), Math.log(to)).map((log) =>
		Math.min(to * (1 - 1e-12), Math.max(from * (1 + 1e-12), Math.exp(log)))
	);

const size = <U extends Unit>(from: number, to: number, units: readonly U[]): fc.Arbitrary<Quantity<U>> =>
	fc.tuple(ofAnyOrder(from, to), fc.constantFrom(...units)).map(([si, unit]) => ({
		value: fromSI(si, unit),
		unit
	}));

const length = (from: number, to: number) => size(from, to, LENGTH_UNITS);

/** Ends of the ranges of one half: of the whole schema, or of what a shop sees. */
interface Ranges {
	teeth: [number, number];
	/** mm. */
	module: [number, number];
	angle: fc.Arbitrary<number>;
	form: fc.Arbitrary<ToothForm>;
	shift: [number, number];
	helix: [number, number];
	/** mm, of tip wear and face. */
	wear: [number, number];
	face: [number, number];
	/** MPa. */
	allowable: [number, number];
	modulus: [number, number];
	brinell: [number, number];
	velocity: [number, number];
	rpm: [number, number];
	/** W, N·m and N. */
	load: [number, number];
	/** Of the fields that must agree for two to mesh, one in so many is stated on its own. */
	strangers: number;
}

const WHOLE: Ranges = {
	teeth: [1, 5000],
	module: [0.05, 250],
	angle: within(5, 45),
	form: fc.oneof(
		fc.constantFrom<ToothForm>('full-depth', 'stub'),
		fc.record({ addendum: within(0.1, 2), dedendum: within(0.1, 2.5), tipRadius: within(0, 1) })
	),
	shift: [-2, 2],
	helix: [0, 60],
	wear: [0.1, 20_000],
	face: [0.1, 20_000],
	allowable: [0.01, 10_000],
	modulus: [1, 2_000_000],
	brinell: [1, 1000],
	velocity: [1e-6, 500],
	rpm: [0.001, 200_000],
	load: [0.001, 1e9],
	strangers: 2
};

const MIDDLE: Ranges = {
	teeth: [6, 150],
	module: [1, 12],
	angle: fc.constantFrom(14.5, 20, 20, 25),
	form: fc.oneof(
		{ weight: 3, arbitrary: fc.constantFrom<ToothForm>('full-depth', 'stub') },
		{
			weight: 1,
			arbitrary: fc.record({
				addendum: within(0.7, 1.2),
				dedendum: within(0.9, 1.4),
				tipRadius: within(0, 0.35)
			})
		}
	),
	shift: [-0.3, 0.5],
	helix: [0, 35],
	wear: [0.1, 2],
	face: [5, 200],
	allowable: [10, 600],
	modulus: [1000, 210_000],
	brinell: [120, 450],
	velocity: [0.01, 30],
	rpm: [0.1, 3000],
	load: [10, 100_000],
	strangers: 10
};

function pitchOf([from, to]: [number, number]): fc.Arbitrary<Pitch> {
	const module = ofAnyOrder(from, to);
	return fc.oneof(
		module.map((value) => ({ system: 'module' as const, value })),
		module.map((value) => ({
			system: 'diametral' as const,
			value: Math.min(500, Math.max(0.1, 25.4 / value))
		})),
		fc.tuple(module, fc.constantFrom(...LENGTH_UNITS)).map(([value, unit]) => ({
			system: 'circular' as const,
			value: Math.min(800, Math.max(0.001, fromSI(Math.PI * value, unit))),
			unit
		}))
	);
}

const mostlyTrue = fc.oneof(
	{ weight: 3, arbitrary: fc.constant(true) },
	{ weight: 1, arbitrary: fc.constant(false) }
);

const materialOf = (ranges: Ranges) =>
	fc.record({
		name: fc.constantFrom('one', 'two', 'three'),
		metallic: mostlyTrue,
		allowableBending: size(...ranges.allowable, STRESS_UNITS),
		brinell: fc.option(within(...ranges.brinell), { nil: undefined, freq: 4 }),
		modulus: fc.option(size(...ranges.modulus, STRESS_UNITS), { nil: undefined, freq: 4 }),
		poisson: fc.option(within(0, 0.5), { nil: undefined }),
		permitted: mostlyTrue
	});

/** A rack has no teeth and a spur gear no helix: the schema says so. */
function asKind<T extends { kind: GearKind; teeth?: number | undefined; helixAngle?: number | undefined }>(
	part: T
): T {
	if (part.kind === 'rack') return { ...part, teeth: undefined };
	return part.kind === 'spur' ? { ...part, helixAngle: undefined } : part;
}

function gearOf(ranges: Ranges): fc.Arbitrary<Gear> {
	return fc
		.record({
			kind: fc.constantFrom<GearKind>('spur', ...KINDS),
			teeth: fc.integer({ min: ranges.teeth[0], max: ranges.teeth[1] }),
			pitch: pitchOf(ranges.module),
			plane: fc.constantFrom('normal', 'transverse', undefined),
			pressureAngle: ranges.angle,
			form: ranges.form,
			profileShift: oneIn(2, within(...ranges.shift)),
			helixAngle: fc.option(within(...ranges.helix), { nil: undefined, freq: 5 }),
			finish,
			tipWear: oneIn(4, length(...ranges.wear)),
			toothThickness: oneIn(4, length(0.1, 30)),
			faceWidth: length(...ranges.face),
			material: materialOf(ranges)
		})
		.map(asKind) as fc.Arbitrary<Gear>;
}

/** Stated as a stranger's in parts, or left to be as the gear is; its centre distance is near the standard or anywhere. */
function mateOf(ranges: Ranges): fc.Arbitrary<Mate> {
	const { strangers } = ranges;
	return fc
		.record({
			kind: fc.constantFrom<GearKind>('spur', ...KINDS),
			teeth: fc.option(fc.integer({ min: ranges.teeth[0], max: ranges.teeth[1] }), {
				nil: undefined,
				freq: 8
			}),
			pitch: oneIn(strangers, pitchOf(ranges.module)),
			plane: oneIn(strangers, fc.constantFrom('normal', 'transverse')),
			pressureAngle: oneIn(strangers, ranges.angle),
			form: fc.option(ranges.form, { nil: undefined }),
			profileShift: oneIn(2, within(...ranges.shift)),
			helixAngle: oneIn(strangers, within(...ranges.helix)),
			finish: fc.option(finish, { nil: undefined }),
			tipWear: oneIn(4, length(...ranges.wear)),
			toothThickness: oneIn(4, length(0.1, 30)),
			worn: oneIn(2, fc.boolean()),
			faceWidth: fc.option(length(...ranges.face), { nil: undefined }),
			material: fc.option(materialOf(ranges), { nil: undefined }),
			centreDistance: oneIn(4, length(0.1, 20_000))
		})
		.map(asKind) as fc.Arbitrary<Mate>;
}

const loadOf = ([from, to]: [number, number]): fc.Arbitrary<Load> =>
	fc.oneof(
		{ weight: 1, arbitrary: fc.constant('unknown' as const) },
		{ weight: 3, arbitrary: size(from, to, POWER_UNITS).map((power) => ({ power })) },
		{ weight: 3, arbitrary: size(from, to, TORQUE_UNITS).map((torque) => ({ torque })) },
		{ weight: 3, arbitrary: size(from, to, FORCE_UNITS).map((tangentialForce) => ({ tangentialForce })) }
	);

const limit = fc.option(size(1e-6, 500, VELOCITY_UNITS), { nil: null, freq: 1 });

const rules = fc.record(
	{
		formFactor: fc.constantFrom('handbook', 'geometry', 'lower-of-both'),
		cutLaw: fc.constantFrom(600, 1200),
		bendingMargin: within(0.1, 100),
		wearMargin: within(0.1, 100),
		reversingFactor: within(0.1, 1),
		speedLimit: fc.record({ cast: limit, cut: limit, hobbed: limit, ground: limit })
	},
	{ requiredKeys: [] }
);

const uncertainty = fc.record(
	{
		faceWidth: within(0, MOST_UNCERTAIN.faceWidth),
		load: within(0, MOST_UNCERTAIN.load),
		speed: within(0, MOST_UNCERTAIN.speed)
	},
	{ requiredKeys: [] }
);

function checkOf(ranges: Ranges): fc.Arbitrary<EvaluateInput> {
	return fc
		.record({
			gear: gearOf(ranges),
			mate: fc.option(mateOf(ranges), { nil: undefined, freq: 4 }),
			original: oneIn(3, gearOf(ranges)),
			load: loadOf(ranges.load),
			rpm: mostly(size(...ranges.rpm, ['rpm'])),
			velocity: mostly(size(...ranges.velocity, VELOCITY_UNITS)),
			serviceFactor: within(0.1, 10),
			bending: fc.constantFrom('one-way', 'reversing', undefined),
			rules: oneIn(2, rules),
			permittedMaterials: oneIn(2, fc.array(materialOf(ranges), { maxLength: 4 })),
			uncertainty: oneIn(2, uncertainty)
		})
		.map(({ load, rpm, velocity, serviceFactor, bending, gear, mate, original, ...rest }) => {
			const rack = gear.kind === 'rack';
			return {
				...rest,
				gear,
				mate: mate && nearTo(gear, mate),
				// A rack can only stand in for a rack.
				original: original && (original.kind === 'rack') === rack ? original : undefined,
				drive: { load, ...(rack ? { velocity } : { speed: rpm }), serviceFactor, bending }
			};
		}) as fc.Arbitrary<EvaluateInput>;
}

/** Now and then a drive without its speed, which the core has to ask for. */
function mostly<T>(of: fc.Arbitrary<T>): fc.Arbitrary<T | undefined> {
	return fc.option(of, { nil: undefined, freq: 15 });
}

/** On a gear with a helix, a mate with teeth on a cylinder mostly is helical too; else it is spur, as the gear is. */
function nearTo({ helixAngle = 0 }: Gear, mate: Mate): Mate {
	const slanted = helixAngle > 0;
	if (slanted && mate.kind === 'spur' && (mate.teeth ?? 0) % 3 > 0) return { ...mate, kind: 'helical' };
	if (!slanted && mate.kind === 'helical' && (mate.teeth ?? 0) % 3 > 0)
		return asKind({ ...mate, kind: 'spur' });
	return mate;
}

/** Every check here is one that the schema lets through (a test parses them). */
export const allowed: fc.Arbitrary<EvaluateInput> = fc.oneof(checkOf(WHOLE), checkOf(MIDDLE));
