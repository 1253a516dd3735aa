/**
 * What may be asked of the core: bad input is named field by field with the remedy, and nothing that was misspelt is
 * silently left out. The schema's type is the core's own.
 */
import { describe, expect, expectTypeOf, test } from 'vitest';
import type { z } from 'zod';
import type { EvaluateInput } from '$lib/gear/contract';
import { evaluateInput, parseEvaluate } from '$lib/records/evaluate';

const MATERIAL = {
	name: 'steel',
	metallic: true,
	allowableBending: { value: 138, unit: 'MPa' },
	brinell: 200,
	modulus: { value: 207, unit: 'GPa' },
	poisson: 0.3,
	permitted: true
};

const GEAR = {
	kind: 'spur',
	teeth: 24,
	pitch: { system: 'diametral', value: 6 },
	plane: 'transverse',
	pressureAngle: 20,
	form: 'full-depth',
	profileShift: 0,
	helixAngle: 0,
	faceWidth: { value: 1.5, unit: 'in' },
	finish: 'cut',
	material: MATERIAL
};

const CHECK = {
	gear: GEAR,
	mate: { kind: 'spur', teeth: 60, centreDistance: { value: 7, unit: 'in' } },
	original: GEAR,
	drive: {
		load: { power: { value: 5, unit: 'hp' } },
		speed: { value: 1150, unit: 'rpm' },
		serviceFactor: 1.25,
		bending: 'one-way'
	},
	rules: {
		formFactor: 'handbook',
		cutLaw: 1200,
		bendingMargin: 1,
		wearMargin: 1,
		reversingFactor: 0.7,
		speedLimit: { cast: null, cut: { value: 10, unit: 'm/s' }, hobbed: null, ground: null }
	},
	permittedMaterials: [MATERIAL],
	uncertainty: { faceWidth: 0.01, load: 0.1, speed: 0.01 }
};

const RACK_CHECK = {
	gear: { ...GEAR, kind: 'rack', teeth: undefined },
	drive: {
		load: { tangentialForce: { value: 2, unit: 'kN' } },
		velocity: { value: 0.2, unit: 'm/s' },
		serviceFactor: 1
	}
};

/** The whole check with one field set, or taken away by `undefined`. */
function changed(path: string, value: unknown, from: unknown = CHECK): unknown {
	const [key = '', ...rest] = path.split('.');
	const copy: Record<string, unknown> = { ...(from as Record<string, unknown>) };
	if (rest.length > 0) copy[key] = changed(rest.join('.'), value, copy[key]);
	else if (value === undefined) delete copy[key];
	else copy[key] = value;
	return copy;
}

function issuesOf(input: unknown): { path: string; message: string }[] {
	const parsed = parseEvaluate(input);
	return parsed.ok ? [] : parsed.error.error.issues;
}

test('the type of the schema is the type of the core', () => {
	expectTypeOf<z.infer<typeof evaluateInput>>().toExtend<EvaluateInput>();
	expectTypeOf<EvaluateInput>().toExtend<z.infer<typeof evaluateInput>>();
});

describe('is accepted', () => {
	test('the whole of the contract', () => {
		expect(parseEvaluate(CHECK)).toEqual({ ok: true, input: CHECK });
	});

	test.each([
		['only what is needed', { gear: CHECK.gear, drive: CHECK.drive }],
		['an unknown load', changed('drive.load', 'unknown')],
		['a torque', changed('drive.load', { torque: { value: 60, unit: 'lbf*ft' } })],
		['a tangential force', changed('drive.load', { tangentialForce: { value: 1, unit: 'kN' } })],
		['a module', changed('gear.pitch', { system: 'module', value: 4 })],
		['a circular pitch', changed('gear.pitch', { system: 'circular', value: 1.25, unit: 'in' })],
		['a form by its rack', changed('gear.form', { addendum: 1, dedendum: 1.25, tipRadius: 0.3 })],
		['no speed, which the verdict then asks for', changed('drive.speed', undefined)],
		['a rack without teeth, with its velocity', RACK_CHECK],
		['some rules only', changed('rules', { cutLaw: 600 })],
		['a speed limit for one finish', changed('rules.speedLimit', { cut: { value: 2000, unit: 'ft/min' } })]
	])('%s', (_what, input) => {
		expect(issuesOf(input)).toEqual([]);
	});

	test('speed limits that are not given are the method’s own', () => {
		const parsed = parseEvaluate(changed('rules.speedLimit', {}));
		if (!parsed.ok) throw new Error('refused');
		expect(parsed.input.rules?.speedLimit).toEqual({ cast: null, cut: null, hobbed: null, ground: null });
	});
});

describe('is refused, with the field and the remedy', () => {
	test.each([
		['drive.speed', { ...RACK_CHECK, drive: { ...RACK_CHECK.drive, speed: { value: 10, unit: 'rpm' } } }],
		['original.kind', { ...RACK_CHECK, original: GEAR }],
		['drive.velocity', changed('drive.velocity', { value: 1, unit: 'm/s' })],
		['mate.worn', changed('mate.worn', 'a little')],
		['gear.tipWear.value', changed('gear.tipWear', { value: -1, unit: 'mm' })],
		['gear.toothThickness.unit', changed('gear.toothThickness', { value: 1, unit: 'rpm' })]
	])('%s', (path, input) => {
		const issues = issuesOf(input);
		expect(issues.map((issue) => issue.path)).toContain(path);
		for (const { message } of issues) expect(message).toMatch(/\b(must|leave|check)\b/);
	});

	const lengths = 'Face width must be between 0.1 mm and 20 m.';
	test.each([
		['gear.teeth', 24.5, 'Teeth must be a whole number of at least 1.'],
		['gear.teeth', 0, 'Teeth must be a whole number of at least 1.'],
		['gear.teeth', -24, 'Teeth must be a whole number of at least 1.'],
		['gear.teeth', NaN, 'Teeth must be a whole number of at least 1.'],
		['gear.teeth', '24', 'Teeth must be a whole number of at least 1.'],
		['gear.teeth', null, 'Teeth must be a whole number of at least 1.'],
		['gear.teeth', 1e308, 'Teeth must be at most 5000.'],
		['gear.teeth', undefined, 'Teeth is missing: it must be a whole number of at least 1.'],
		['gear.faceWidth.value', 0, lengths],
		['gear.faceWidth.value', -1.5, lengths],
		['gear.faceWidth.value', 1e308, lengths],
		['gear.faceWidth.value', 5e-324, lengths],
		['gear.faceWidth.value', Infinity, 'Face width must be a number between 0.1 mm and 20 m.'],
		['gear.faceWidth.value', NaN, 'Face width must be a number between 0.1 mm and 20 m.'],
		['gear.faceWidth.unit', 'inch', 'Unit of face width must be one of mm, cm, m, in, ft.'],
		['gear.faceWidth', 1.5, 'Face width must be an object with value, unit.'],
		['gear.faceWidth', undefined, 'Face width is missing: it must be an object with value, unit.'],
		['gear.pitch.value', 0, 'Diametral pitch must be a number between 0.1 and 500.'],
		[
			'gear.pitch.system',
			'metric',
			'Pitch must be an object whose system is diametral, module or circular, with its value.'
		],
		['gear.pressureAngle', 0, 'Pressure angle (degrees) must be a number between 5 and 45.'],
		['gear.kind', 'bevel', 'Kind of gear must be one of spur, helical, internal, rack.'],
		['gear.finish', 'Cut', 'Finish must be one of cast, cut, hobbed, ground.'],
		[
			'gear.form',
			'deep',
			'Tooth form must be full-depth, stub, or an object with addendum, dedendum and tipRadius.'
		],
		[
			'gear.form',
			{ addendum: 1 },
			'Tooth form must be full-depth, stub, or an object with addendum, dedendum and tipRadius.'
		],
		['gear.helixAngle', 15, 'A spur gear has no helix angle: set it to 0, or choose helical as the kind.'],
		[
			'gear.material.allowableBending.value',
			-138,
			'Allowable bending stress must be between 0.01 MPa and 10 GPa.'
		],
		['gear.material.permitted', 'yes', 'Permitted must be true or false.'],
		['gear.material.name', '', 'Name of the material must not be empty.'],
		['mate.teeth', 0, 'Teeth must be a whole number of at least 1.'],
		[
			'drive.load',
			undefined,
			'Load is missing: it must be exactly one of power, torque or tangentialForce, each with value and unit, or the word unknown.'
		],
		[
			'drive.load',
			'some',
			'Load must be exactly one of power, torque or tangentialForce, each with value and unit, or the word unknown.'
		],
		[
			'drive.load',
			{},
			'Load must be exactly one of power, torque or tangentialForce, each with value and unit, or the word unknown.'
		],
		['drive.load.power', 5, 'Power must be an object with value, unit.'],
		['drive.load.power.value', -5, 'Power must be between 0.001 W and 1,000,000 kW.'],
		['drive.load.power.unit', 'PS', 'Unit of power must be one of W, kW, hp.'],
		['drive.speed.value', 0, 'Speed must be between 0.001 rpm and 200,000 rpm.'],
		['drive.speed.unit', 'Hz', 'Unit of speed must be one of rpm.'],
		['drive.serviceFactor', 0, 'Service factor must be a number between 0.1 and 10.'],
		[
			'drive.velocity',
			{ value: 5, unit: 'm/s' },
			'Velocity is for a rack: leave it out and give the speed of this gear in rpm.'
		],
		['rules.cutLaw', 900, 'Law for cut teeth must be one of 600, 1200.'],
		['rules.bendingMargin', 0, 'Needed margin in bending must be a number between 0.1 and 100.'],
		['uncertainty.load', 10, 'Uncertainty of the load (a fraction) must be a number between 0 and 0.5.'],
		['permittedMaterials', {}, 'Permitted materials must be a list of materials.'],
		['mate', null, /^Mate must be an object with kind, teeth/],
		['gear', undefined, /^Gear is missing: it must be an object with kind, teeth/],
		['drive', [], /^Drive must be an object with load, speed/]
	] as const)('%s: %j', (path, value, message) => {
		const issues = issuesOf(changed(path, value));
		expect(issues).toHaveLength(1);
		expect(issues[0]?.path).toBe(path);
		if (typeof message === 'string') expect(issues[0]?.message).toBe(message);
		else expect(issues[0]?.message).toMatch(message);
	});

	test.each([
		'gear.teethCount',
		'gear.faceWidth.units',
		'drive.servicefactor',
		'rules.cutlaw',
		'Gear',
		'gear.material.E'
	])('a field that is not known: %s', (path) => {
		const issues = issuesOf(changed(path, 1));
		expect(issues).toHaveLength(1);
		expect(issues[0]?.path).toBe(path);
		expect(issues[0]?.message).toMatch(
			/^This field is not known here\. .+ has: .+\. Correct its name or leave it out\.$/
		);
	});

	test('two loads at once', () => {
		const load = { power: { value: 5, unit: 'hp' }, torque: { value: 5, unit: 'N*m' } };
		expect(issuesOf(changed('drive.load', load))[0]).toMatchObject({
			path: 'drive.load',
			message: expect.stringContaining('exactly one of') as string
		});
	});

	test('a field of a form given by its rack', () => {
		const form = { addendum: 1, dedendum: -1.25, tipRadius: 0.3 };
		expect(issuesOf(changed('gear.form', form))).toEqual([
			{ path: 'gear.form.dedendum', message: 'Dedendum (in modules) must be a number between 0.1 and 2.5.' }
		]);
	});

	test('a material in a list is named by its place', () => {
		const list = [MATERIAL, { ...MATERIAL, poisson: 3 }];
		expect(issuesOf(changed('permittedMaterials', list))[0]?.path).toBe('permittedMaterials.1.poisson');
	});

	test.each([[null], [5], ['text'], [[]], [undefined]])('something that is no check at all: %j', (input) => {
		expect(issuesOf(input)).toEqual([
			{ path: '', message: expect.stringMatching(/^Check .*an object with gear/) as string }
		]);
	});

	test('everything at once, each field by its name', () => {
		const input = { gear: { ...GEAR, teeth: 0, finish: 'x' }, drive: { ...CHECK.drive, serviceFactor: -1 } };
		expect(issuesOf(input).map(({ path }) => path)).toEqual([
			'gear.teeth',
			'gear.finish',
			'drive.serviceFactor'
		]);
	});
});
