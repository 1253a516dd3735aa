/**
 * Wear of a pair: figures worked out by hand, where there is no figure and why, the same from either side, and at the
 * ends of what the schema lets through.
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { GearKind, Material, ToothedPart } from '$lib/gear/contract';
import { memberOf, type Member } from '$lib/gear/member';
import { SOURCES } from '$lib/gear/sources';
import { wearOf, type WearAnswer, type WearQuestion } from '$lib/gear/wear';
import { unrecorded, Working } from '$lib/gear/working';
import { within } from './check-arbitrary';

const steel = (brinell: number, change: Partial<Material> = {}): Material => ({
	name: `steel of ${brinell}`,
	metallic: true,
	allowableBending: { value: 200, unit: 'MPa' },
	brinell,
	modulus: { value: 207, unit: 'GPa' },
	poisson: 0.3,
	permitted: true,
	...change
});

const part = (of: Partial<ToothedPart>): Member =>
	memberOf({
		kind: 'spur',
		pitch: { system: 'module', value: 4 },
		pressureAngle: 20,
		form: 'full-depth',
		...of
	});
const withTeeth = (teeth: number, kind: GearKind = 'spur') => part({ kind, teeth });
const RACK = part({ kind: 'rack' });

interface Pair extends WearQuestion {
	mateMaterial: Material;
}

const PAIR: Pair = {
	gear: withTeeth(24),
	mate: withTeeth(60),
	faceWidth: 40,
	gearMaterial: steel(300),
	mateMaterial: steel(250),
	dynamicForce: 1000
};
const wear = (change: Partial<WearQuestion> = {}) => wearOf({ ...PAIR, ...change }, unrecorded);
const swapped = (pair: Pair): Pair => ({
	...pair,
	gear: pair.mate,
	mate: pair.gear,
	gearMaterial: pair.mateMaterial,
	mateMaterial: pair.gearMaterial
});

const NO_ANSWER: WearAnswer = { strength: null, figures: null, refusal: null };

describe('worked out by hand: 24 teeth, module 4, 40 mm, 300 on 250 HB, 207 GPa, 1,000 N', () => {
	// Recomputed apart from the core: 2.76 x 275 - 70 = 689 MPa; K = 1.120525 MPa; Cp = 190.250 √MPa.
	const helical = (teeth: number) => part({ kind: 'helical', teeth, helixAngle: 20, plane: 'normal' });
	test.each<[string, Partial<WearQuestion>, { stress: number; hertz: number; buckingham: number }]>([
		['60 teeth', {}, { stress: 286.59539, hertz: 5779.6302, buckingham: 6146.8827 }],
		[
			'in an internal gear of 60',
			{ mate: withTeeth(60, 'internal') },
			{ stress: 187.62072, hertz: 13485.804, buckingham: 14342.727 }
		],
		['on a rack', { mate: RACK }, { stress: 242.21731, hertz: 8091.4823, buckingham: 8605.6358 }],
		[
			'60 teeth, 20 degrees of helix',
			{ gear: helical(24), mate: helical(60) },
			{ stress: 261.06456, hertz: 6965.3445, buckingham: 7407.9404 }
		]
	])('%s', (_what, change, { stress, hertz, buckingham }) => {
		const { figures, strength, refusal } = wear(change);
		expect(refusal).toBeNull();
		expect(figures?.allowableContact).toBeCloseTo(689, 9);
		expect(figures?.contactStress).toBeCloseTo(stress, 4);
		expect(figures?.contactMargin).toBeCloseTo(hertz / 1000, 5);
		expect(figures?.wearLoad).toBeCloseTo(buckingham, 2);
		expect(figures?.wearLoadMargin).toBeCloseTo(buckingham / 1000, 5);
		expect(strength).toBeCloseTo(hertz, 2);
	});

	test('on cast iron of 200 HB, 105 GPa and 0.21, the moduli of both count, and Hertz stays below Buckingham', () => {
		const iron = steel(200, { modulus: { value: 105, unit: 'GPa' }, poisson: 0.21 });
		const { figures, strength } = wear({ mateMaterial: iron });
		expect(figures?.allowableContact).toBeCloseTo(620, 9);
		expect(figures?.contactStress).toBeCloseTo(231.28833, 4);
		expect(figures?.wearLoad).toBeCloseTo(7394.9486, 3);
		expect(strength).toBeCloseTo(7185.8134, 3);
	});

	test('the margin by stress is that of the load: (allowable / stress)²', () => {
		const { figures } = wear({ dynamicForce: 2345 });
		const of = (value: number | undefined) => value ?? NaN;
		expect(figures?.contactMargin).toBeCloseTo(
			(of(figures?.allowableContact) / of(figures?.contactStress)) ** 2,
			12
		);
	});

	test('what the flanks bear is the lower of both, whichever that is', () => {
		const limp = { poisson: 0.5 };
		const hertz = wear({ gearMaterial: steel(300, limp), mateMaterial: steel(250, limp) });
		expect(hertz.strength).toBeCloseTo((hertz.figures?.contactMargin ?? NaN) * 1000, 6);
		// At a pressure angle of 5 degrees cos α hardly counts, so ν = 0 puts Hertz above.
		const [gear, mate] = [24, 60].map((teeth) => part({ teeth, pressureAngle: 5 })) as [Member, Member];
		const stiff = { poisson: 0 };
		const buckingham = wear({ gear, mate, gearMaterial: steel(300, stiff), mateMaterial: steel(250, stiff) });
		expect(buckingham.figures?.contactMargin).toBeGreaterThan(buckingham.figures?.wearLoadMargin ?? NaN);
		expect(buckingham.strength).toBe(buckingham.figures?.wearLoad);
	});

	test('a load that is not known leaves what the flanks bear', () => {
		expect(wear({ dynamicForce: null })).toEqual({ ...NO_ANSWER, strength: wear().strength });
	});
});

describe('no figure and no refusal where', () => {
	test('the mate has no material', () => {
		expect(wear({ mateMaterial: undefined })).toEqual(NO_ANSWER);
	});

	test('the mate has no hardness, however hard the gear is', () => {
		const mateMaterial = steel(250, { brinell: undefined });
		expect(wear({ gearMaterial: steel(600), mateMaterial })).toEqual(NO_ANSWER);
	});

	test.each<[string, Partial<Pair>]>([
		['the gear has no hardness', { gearMaterial: steel(300, { brinell: undefined }) }],
		['the mate has no hardness', { mateMaterial: steel(250, { brinell: undefined }) }],
		['the gear has no modulus', { gearMaterial: steel(300, { modulus: undefined }) }],
		['the mate has no modulus', { mateMaterial: steel(250, { modulus: undefined }) }],
		['the mate has no teeth', { mate: part({}) }],
		['the gear has no teeth', { gear: part({}) }],
		['a gear without teeth runs on a rack', { gear: part({}), mate: RACK }],
		['an internal gear has fewer teeth than its pinion', { mate: withTeeth(20, 'internal') }],
		['an internal gear has as many teeth as its pinion', { mate: withTeeth(24, 'internal') }],
		[
			'an internal gear with fewer teeth is asked about',
			{ gear: withTeeth(20, 'internal'), mate: withTeeth(60) }
		],
		['both are internal', { gear: withTeeth(24, 'internal'), mate: withTeeth(60, 'internal') }],
		['an internal gear runs on a rack', { gear: withTeeth(24, 'internal'), mate: RACK }],
		['both are racks', { gear: RACK, mate: RACK }]
	])('%s', (_what, change) => {
		expect(wear(change)).toEqual(NO_ANSWER);
		expect(wearOf(swapped({ ...PAIR, ...change }), unrecorded)).toEqual(NO_ANSWER);
	});
});

describe('the range of the published strength', () => {
	test.each([
		[150, 150],
		[100, 200],
		[400, 400],
		[200, 600]
	])('%d on %d HB lies within it', (own, mates) => {
		expect(wear({ gearMaterial: steel(own), mateMaterial: steel(mates) }).strength).toBeGreaterThan(0);
	});

	test.each([
		[150, 149, 149.5],
		[400, 400.5, 400.25],
		[1, 1, 1],
		[1000, 1000, 1000]
	])('%d on %d HB lies outside: refused, with the mean that does', (own, mates, mean) => {
		const answer = wear({ gearMaterial: steel(own), mateMaterial: steel(mates) });
		expect(answer).toMatchObject({ strength: null, figures: null });
		expect(answer.refusal).toMatchObject({
			code: 'wear-out-of-range',
			values: { brinell: mean, from: 150, to: 400 }
		});
		// A mean just outside is never told as the end of the range itself.
		expect(answer.refusal?.text).not.toMatch(/it is (150|400)\. /);
	});

	test('a mean outside is refused before a modulus is asked for', () => {
		const soft = { modulus: undefined };
		const answer = wear({ gearMaterial: steel(120, soft), mateMaterial: steel(120, soft) });
		expect(answer.refusal?.code).toBe('wear-out-of-range');
	});

	test.each<[string, Partial<WearQuestion>]>([
		['the gear', { gearMaterial: steel(300, { metallic: false }) }],
		['the mate', { mateMaterial: steel(250, { metallic: false }) }],
		[
			'the mate, of which no more is known,',
			{ mateMaterial: steel(250, { metallic: false, brinell: undefined, modulus: undefined }) }
		],
		[
			'the gear, whose mate is of no known material,',
			{ gearMaterial: steel(300, { metallic: false, brinell: undefined }), mateMaterial: undefined }
		]
	])('it is for metal on metal: %s is not', (_which, change) => {
		const answer = wear(change);
		expect(answer).toMatchObject({ strength: null, figures: null });
		expect(answer.refusal?.code).toBe('wear-not-for-plastics');
	});
});

describe('the working', () => {
	const workingOf = (change: Partial<WearQuestion> = {}) => {
		const working = new Working();
		wearOf({ ...PAIR, ...change }, working);
		return working.lines;
	};

	test('states the moduli of both with K', () => {
		const iron = steel(200, { modulus: { value: 105, unit: 'GPa' } });
		const line = workingOf({ mateMaterial: iron }).find(({ symbol }) => symbol === 'K');
		expect(line?.numbers).toContain('1 / 207000 + 1 / 105000');
		expect(line?.source).toBe(SOURCES.buckingham);
	});

	test('each margin divides the force of its own method by the load', () => {
		const lines = workingOf({ dynamicForce: 1500 });
		const of = (symbol: string) => lines.find((line) => line.symbol === symbol);
		for (const [margin, force] of [
			['Mc', 'Wh'],
			['Mw', 'Fw']
		] as const) {
			expect(of(margin)?.expression).toBe(`${force} / W`);
			expect(of(margin)?.value).toBeCloseTo((of(force)?.value ?? NaN) / 1500, 12);
		}
		expect(of('Mc')?.numbers).not.toBe(of('Mw')?.numbers);
	});

	test.each<[string, Partial<WearQuestion>, (undefined | 'mate')[]]>([
		['neither', {}, []],
		['the gear', { gearMaterial: steel(300, { poisson: undefined }) }, [undefined]],
		['the mate', { mateMaterial: steel(250, { poisson: undefined }) }, ['mate']]
	])("says where 0.3 was taken for Poisson's ratio: %s", (_which, change, of) => {
		const taken = workingOf(change).filter(({ symbol }) => symbol === 'ν');
		expect(taken.map((line) => line.of)).toEqual(of);
		for (const line of taken) expect(line).toMatchObject({ value: 0.3, source: 'common practice' });
		expect(wear(change)).toEqual(wear());
	});

	test("Poisson's ratio of 0 is one that is given", () => {
		const flat = { gearMaterial: steel(300, { poisson: 0 }) };
		expect(workingOf(flat).some(({ symbol }) => symbol === 'ν')).toBe(false);
		expect(wear(flat).strength).toBeGreaterThan(wear().strength ?? NaN);
	});

	test('a refusal leaves no line behind', () => {
		expect(workingOf({ mateMaterial: steel(900) })).toEqual([]);
	});
});

const material = (brinell: fc.Arbitrary<number>) =>
	fc
		.record({ brinell, gigapascals: within(0.001, 2000), poisson: within(0, 0.5) })
		.map(({ brinell, gigapascals, poisson }) =>
			steel(brinell, { modulus: { value: gigapascals, unit: 'GPa' }, poisson })
		);

/** Everything that the schema lets through of a pair, fitting or not. */
const member = fc
	.record({
		kind: fc.constantFrom<GearKind>('spur', 'helical', 'internal', 'rack'),
		teeth: fc.integer({ min: 1, max: 5000 }),
		module: within(0.05, 250),
		pressureAngle: within(5, 45),
		helixAngle: within(0, 60)
	})
	.map(({ kind, teeth, module, helixAngle, ...rest }) =>
		part({
			...rest,
			kind,
			teeth: kind === 'rack' ? undefined : teeth,
			helixAngle: kind === 'spur' ? 0 : helixAngle,
			pitch: { system: 'module', value: module }
		})
	);
const question = (brinell: fc.Arbitrary<number>): fc.Arbitrary<Pair> =>
	fc.record({
		gear: member,
		mate: member,
		faceWidth: within(0.1, 20_000),
		gearMaterial: material(brinell),
		mateMaterial: material(brinell),
		dynamicForce: within(1e-7, 1e12)
	});

describe('for every pair', () => {
	const RUNS = { numRuns: 2000 };

	test('figures are positive numbers, or there are none', () => {
		fc.assert(
			fc.property(question(within(1, 1000)), (asked) => {
				const { strength, figures, refusal } = wearOf(asked, new Working());
				expect(figures === null).toBe(strength === null);
				if (refusal) expect(figures).toBeNull();
				for (const figure of Object.values(figures ?? {})) {
					expect(figure > 0 && Number.isFinite(figure), `${figure}`).toBe(true);
				}
			}),
			RUNS
		);
	});

	test('the answer is the same from either side, fitting or not', () => {
		fc.assert(
			fc.property(question(within(150, 400)), (asked) => {
				const [one, other] = [wearOf(asked, unrecorded), wearOf(swapped(asked), unrecorded)];
				expect(one.figures === null).toBe(other.figures === null);
				for (const [name, value] of Object.entries(one.figures ?? {})) {
					const from = other.figures?.[name as keyof typeof other.figures] ?? NaN;
					expect(Math.abs(value / from - 1), name).toBeLessThan(1e-12);
				}
			}),
			RUNS
		);
	});

	test('most that fit have figures, so that the above says something', () => {
		const sample = fc.sample(question(within(150, 400)), { numRuns: 300, seed: 11 });
		expect(sample.filter((asked) => wearOf(asked, unrecorded).figures).length).toBeGreaterThan(150);
	});
});

describe('two that agree in base pitch alone', () => {
	// 4 cos 20 = m cos 14.5 degrees: the same rack of contact by another name.
	const cosine = (degrees: number) => Math.cos((degrees * Math.PI) / 180);
	const pitch = { system: 'module' as const, value: (4 * cosine(20)) / cosine(14.5) };
	const other = (teeth: number) => part({ teeth, pitch, pressureAngle: 14.5 });

	test('roll on circles in the ratio of their teeth, by the angle of the pinion', () => {
		expect(wear({ mate: other(60) })).toEqual(wear());
		expect(wear({ gear: withTeeth(60), mate: other(24) }).strength).not.toBeCloseTo(
			wear().strength ?? NaN,
			0
		);
	});

	test('an internal gear of one tooth more is never flatter than flat', () => {
		const short = part({ kind: 'internal', teeth: 1001, pitch: { system: 'module', value: 3.992 } });
		const { figures } = wear({ gear: withTeeth(1000), mate: short });
		expect(figures?.contactStress).toBeGreaterThan(0);
		expect(figures).toEqual(wear({ gear: withTeeth(1000), mate: withTeeth(1001, 'internal') }).figures);
	});
});
