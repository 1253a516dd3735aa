/**
 * Remedies: each one, applied to the check and answered again, does what it says. Random checks that fall short, and
 * a few by name.
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { EvaluateInput, Finish, Outcome, Quantity, Remedy } from '$lib/gear/contract';
import { evaluate } from '$lib/gear/evaluate';
import { spurCheck } from '../../reference/spur-check';
import { realistic, realisticOfAllKinds } from './check-arbitrary';

const RUNS = { numRuns: 1000 };

/** The check with a remedy's value applied. */
function applied(input: EvaluateInput, { change }: Remedy, value: Remedy['value']): EvaluateInput {
	const { gear, drive } = input;
	const quantity = value as Quantity<never>;
	switch (change) {
		case 'power':
			return { ...input, drive: { ...drive, load: { power: quantity } } };
		case 'speed':
			return gear.kind === 'rack'
				? { ...input, drive: { ...drive, velocity: quantity } }
				: { ...input, drive: { ...drive, speed: quantity } };
		case 'faceWidth':
			return { ...input, gear: { ...gear, faceWidth: quantity } };
		case 'finish':
			return { ...input, gear: { ...gear, finish: value as Finish } };
		case 'material': {
			const material = input.permittedMaterials?.find(({ name, permitted }) => permitted && name === value);
			if (!material) throw new Error('a remedy named a material that is not permitted');
			return { ...input, gear: { ...gear, material } };
		}
	}
}

/** Names are unique here, as on a plant's list. */
const named = (arbitrary: fc.Arbitrary<EvaluateInput>) =>
	arbitrary.map((input) => ({
		...input,
		permittedMaterials: input.permittedMaterials?.map((material, n) => ({ ...material, name: `no. ${n}` }))
	}));

const share = ({ limits }: Outcome, end: 'margin' | 'marginLow') =>
	Math.min(...limits.map((limit) => limit[end] / limit.needed));

const solved = ({ change }: Remedy) => ['power', 'speed', 'faceWidth'].includes(change);

describe.each([
	['spur gears', named(realistic)],
	['gears of all kinds', named(realisticOfAllKinds)]
])('%s', (_name, checks) => {
	const short = checks.filter((input) => evaluate(input).remedies.length > 0);

	test('a solved remedy gives what the plant needs within 0.1 %, a chosen one at least that', () => {
		fc.assert(
			fc.property(short, (input) => {
				const now = evaluate(input);
				for (const remedy of now.remedies) {
					const then = evaluate(applied(input, remedy, remedy.value));
					const end = now.verdict === 'close' ? 'marginLow' : 'margin';
					if (solved(remedy)) expect(Math.abs(share(then, end) - 1)).toBeLessThan(0.001);
					else if (now.verdict !== 'not-permitted') expect(share(then, end)).toBeGreaterThan(1 - 1e-9);
					expect(then.bendingMargin).toBeCloseTo(remedy.bendingMargin, 9);
					expect(then.bendingMarginLow).toBeCloseTo(remedy.bendingMarginLow, 9);
					expect(then.verdict).not.toBe('will-not-carry');
				}
			}),
			RUNS
		);
	});

	test('where it is said to carry, it carries at the bad end too', () => {
		fc.assert(
			fc.property(short, (input) => {
				for (const remedy of evaluate(input).remedies) {
					if (remedy.carriesAt === null) continue;
					const then = evaluate(applied(input, remedy, remedy.carriesAt));
					if (solved(remedy)) expect(Math.abs(share(then, 'marginLow') - 1)).toBeLessThan(0.001);
					else expect(share(then, 'marginLow')).toBeGreaterThan(1 - 1e-9);
				}
			}),
			RUNS
		);
	});
});

describe('by name', () => {
	const weak = (change: Partial<EvaluateInput> = {}): EvaluateInput => ({
		...spurCheck({
			teeth: 24,
			pitch: { system: 'module', value: 4 },
			rpm: 300,
			load: { power: { value: 60, unit: 'kW' } }
		}),
		...change
	});
	const find = (outcome: Outcome, change: Remedy['change']) =>
		outcome.remedies.find((remedy) => remedy.change === change);

	test('a check that carries has none', () => {
		const light = weak();
		const load = { power: { value: 0.1, unit: 'kW' as const } };
		const outcome = evaluate({ ...light, drive: { ...light.drive, load } });
		expect(outcome.verdict).toBe('carries');
		expect(outcome.remedies).toEqual([]);
	});

	test('the power that carries is that of the permitted power', () => {
		const outcome = evaluate(weak());
		expect(outcome.verdict).toBe('will-not-carry');
		const power = find(outcome, 'power')?.value as Quantity<'kW'>;
		expect(power.value * 1000).toBeCloseTo(outcome.permittedPower ?? NaN, 6);
	});

	test('a power is carried at a higher speed, a torque at a lower one', () => {
		const at = (load: EvaluateInput['drive']['load']) => {
			const input = weak();
			return { ...input, drive: { ...input.drive, load } };
		};
		const { permittedPower, permittedTorque } = evaluate(weak());
		const more = { power: { value: (permittedPower ?? NaN) * 1.3, unit: 'W' as const } };
		const faster = find(evaluate(at(more)), 'speed')?.value as Quantity<'rpm'>;
		expect(faster.value).toBeGreaterThan(300);
		const harder = { torque: { value: (permittedTorque ?? NaN) * 1.1, unit: 'N*m' as const } };
		const slower = find(evaluate(at(harder)), 'speed')?.value as Quantity<'rpm'>;
		expect(slower.value).toBeLessThan(300);
	});

	test('a face wider than the mate, or than five circular pitches, is not offered', () => {
		const barely = weak();
		const load = { power: { value: 1, unit: 'kW' as const } };
		const margin = evaluate({ ...barely, drive: { ...barely.drive, load } }).bendingMargin ?? NaN;
		const just = { power: { value: margin * 1.1, unit: 'kW' as const } };
		const input = { ...barely, drive: { ...barely.drive, load: just } };
		expect(find(evaluate(input), 'faceWidth')).toBeDefined();
		const mate = { kind: 'spur' as const, faceWidth: input.gear.faceWidth };
		expect(find(evaluate({ ...input, mate }), 'faceWidth')).toBeUndefined();
		expect(find(evaluate(weak()), 'faceWidth')).toBeUndefined();
	});

	test('a wider face is like for like only where the original was as wide as what carries at the bad end', () => {
		const input = weak();
		const at = (watts: number): EvaluateInput => ({
			...input,
			drive: { ...input.drive, load: { power: { value: watts, unit: 'W' } } }
		});
		// 10 % short: a tenth more carries at the middle, about a third more at the bad end.
		const short = at((evaluate(input).permittedPower ?? NaN) * 1.1);
		const face = find(evaluate(short), 'faceWidth');
		const value = (face?.value as Quantity<'mm'>).value;
		const carriesAt = (face?.carriesAt as Quantity<'mm'>).value;
		expect(carriesAt).toBeGreaterThan(value * 1.1);
		const was = (width: number) =>
			find(
				evaluate({ ...short, original: { ...input.gear, faceWidth: { value: width, unit: 'mm' } } }),
				'faceWidth'
			)?.likeForLike;
		expect(was(value * 1.01)).toBe(false);
		expect(was(carriesAt * 0.999)).toBe(false);
		expect(was(carriesAt * 1.001)).toBe(true);
	});

	test('only permitted materials are offered, and like for like is what the original was', () => {
		const input = weak();
		const strong = (name: string, permitted: boolean) => ({
			...input.gear.material,
			name,
			permitted,
			allowableBending: { value: 2000, unit: 'MPa' as const }
		});
		const outcome = evaluate({
			...input,
			original: { ...input.gear, material: strong('as before', true) },
			permittedMaterials: [strong('other', true), strong('as before', true), strong('barred', false)]
		});
		const offered = outcome.remedies.filter(({ change }) => change === 'material');
		expect(offered.map(({ value }) => value).sort()).toEqual(['as before', 'other']);
		expect(offered.find(({ value }) => value === 'as before')?.likeForLike).toBe(true);
		expect(offered.find(({ value }) => value === 'other')?.likeForLike).toBe(false);
	});

	test('a material that is not permitted gets permitted ones offered, and nothing else', () => {
		const input = weak();
		const load = { power: { value: 0.1, unit: 'kW' as const } };
		const outcome = evaluate({
			...input,
			drive: { ...input.drive, load },
			gear: { ...input.gear, material: { ...input.gear.material, permitted: false } },
			permittedMaterials: [{ ...input.gear.material, name: 'listed', permitted: true }]
		});
		expect(outcome.verdict).toBe('not-permitted');
		expect(outcome.remedies.map(({ change, value }) => [change, value])).toEqual([['material', 'listed']]);
	});
});
