/** Remedies and limits as people read them, in both languages and the plant's units. */
import { describe, expect, it } from 'vitest';
import { decidingMargin, limitRows } from '$lib/features/verdict/limit-rows';
import { remedyLines } from '$lib/features/verdict/remedy-words';
import { otherReasons, verdictSentence } from '$lib/features/verdict/reason-words';
import type { EvaluateInput, Outcome } from '$lib/gear/contract';
import { evaluate } from '$lib/gear/evaluate';
import { translator } from '$lib/i18n/catalogue';
import type { Words } from '$lib/i18n/context.svelte';

const words = (language: 'en' | 'es') => ({ language, t: translator(language) }) as Words;
const [english, spanish] = [words('en'), words('es')];

const weak = (
	change: Partial<EvaluateInput['drive']> = {},
	rules: EvaluateInput['rules'] = {}
): EvaluateInput => ({
	gear: {
		kind: 'spur',
		teeth: 24,
		pitch: { system: 'module', value: 4 },
		pressureAngle: 20,
		form: 'full-depth',
		faceWidth: { value: 30, unit: 'mm' },
		finish: 'cut',
		material: {
			name: 'Iron 20',
			metallic: true,
			allowableBending: { value: 55, unit: 'MPa' },
			permitted: true
		}
	},
	drive: {
		load: { power: { value: 1.6, unit: 'kW' } },
		speed: { value: 300, unit: 'rpm' },
		serviceFactor: 1.25,
		...change
	},
	rules: { bendingMargin: 1.5, ...rules },
	permittedMaterials: [
		{ name: 'Steel 40', metallic: true, allowableBending: { value: 170, unit: 'MPa' }, permitted: true }
	]
});

const withFace = (faceWidth: EvaluateInput['gear']['faceWidth']): EvaluateInput => ({
	...weak(),
	gear: { ...weak().gear, faceWidth }
});

const leads = (outcome: Outcome, metric: boolean, of = english) =>
	remedyLines(outcome, metric, of).map(({ lead }) => lead);

describe('remedies', () => {
	const outcome = evaluate(weak());

	it('are a sentence each: power in both units, a faster speed for a power, a wider face, a material', () => {
		expect(outcome.verdict).toBe('will-not-carry');
		const told = leads(outcome, true);
		expect(told[0]).toMatch(/^It would pass at [\d.]+ kW \([\d.]+ hp\) or less\.$/);
		expect(told.join(' ')).toMatch(/at [\d.]+ rpm or more, with the same power/);
		expect(told.join(' ')).toMatch(/a face of [\d.]+ mm or more/);
		expect(told.at(-1)).toBe('It would pass in Steel 40.');
	});

	it('are in inches and horsepower on an inch machine', () => {
		const told = leads(outcome, false);
		expect(told[0]).toMatch(/^It would pass at [\d.]+ hp \([\d.]+ kW\) or less\.$/);
		expect(told.join(' ')).toMatch(/a face of [\d.]+ in or more/);
	});

	it('say where review begins, or the margins where it carries throughout', () => {
		const lines = remedyLines(outcome, true, english);
		expect(lines[0]?.rest).toMatch(/^Between that and [\d.]+ kW .* it needs review\.$/);
		expect(lines.at(-1)?.rest).toMatch(/^Margin in bending \d\.\d\d, low end \d\.\d\d\.$/);
		expect(lines[0]?.kind).toBe('Change: needs review');
	});

	it.each([
		['kW', /at ([\d.]+) kW/, (value: number) => weak({ load: { power: { value, unit: 'kW' } } })],
		['hp', /\(([\d.]+) hp\)/, (value: number) => weak({ load: { power: { value, unit: 'hp' } } })],
		['rpm', /at ([\d.]+) rpm/, (value: number) => weak({ speed: { value, unit: 'rpm' } })],
		['mm', /face of ([\d.]+) mm/, (value: number) => withFace({ value, unit: 'mm' })]
	] as const)('carries in truth at the %s on the screen, when it is typed in', (_unit, pattern, apply) => {
		const lead = leads(outcome, true).find((told) => pattern.test(told)) ?? '';
		expect(evaluate(apply(Number(pattern.exec(lead)?.[1]))).verdict).toBe('carries');
	});

	it('needs review, and does not fall short, at the figure where review begins', () => {
		const rest = remedyLines(outcome, true, english)[0]?.rest ?? '';
		const value = Number(/and ([\d.]+) kW/.exec(rest)?.[1]);
		expect(evaluate(weak({ load: { power: { value, unit: 'kW' } } })).verdict).toBe('close');
	});

	it('are told of two materials of one name, each with its margins', () => {
		const permittedMaterials = [170, 240].map((value) => ({
			name: 'Steel 40',
			metallic: true,
			allowableBending: { value, unit: 'MPa' as const },
			permitted: true
		}));
		const lines = remedyLines(evaluate({ ...weak(), permittedMaterials }), true, english);
		const steels = lines.filter(({ lead }) => lead === 'It would pass in Steel 40.');
		expect(steels).toHaveLength(2);
		expect(steels[0]?.rest).not.toBe(steels[1]?.rest);
	});

	it('turn a torque down, not up', () => {
		const permitted = outcome.permittedTorque ?? NaN;
		const hard = evaluate(weak({ load: { torque: { value: permitted * 1.03, unit: 'N*m' } } }));
		expect(leads(hard, true).join(' ')).toMatch(/rpm or less, with the same torque/);
	});

	it('are told in Spanish', () => {
		expect(leads(outcome, true, spanish)[0]).toMatch(/^Pasaría con .* o menos\.$/);
	});

	it('of an outcome of an older core there are none', () => {
		const { remedies: _remedies, ...older } = outcome;
		expect(remedyLines(older as Outcome, true, english)).toEqual([]);
	});
});

describe('limits', () => {
	it('stand with the deciding one first', () => {
		const limit = { margin: 1, marginLow: 0.9, needed: 1 };
		const outcome = {
			...evaluate(weak()),
			limits: [
				{ answer: 'gear-bending', ...limit },
				{ answer: 'wear', ...limit }
			],
			limitedBy: 'wear'
		} as Outcome;
		expect(limitRows(outcome, 1.5).map(({ answer }) => answer)).toEqual(['wear', 'gear-bending']);
		expect(verdictSentence({ ...outcome, verdict: 'will-not-carry' }, english)).toBe(
			'Wear of the pair decides.'
		);
		expect(verdictSentence({ ...outcome, verdict: 'will-not-carry' }, spanish)).toBe(
			'Decide el desgaste del par.'
		);
		expect(decidingMargin(outcome)).toBe(1);
	});

	it('of an older core are its bending with what the plant needed', () => {
		const { limits: _limits, ...older } = evaluate(weak());
		expect(limitRows(older as Outcome, 1.5)).toEqual([
			{
				answer: 'gear-bending',
				margin: older.bendingMargin,
				marginLow: older.bendingMarginLow,
				needed: 1.5
			}
		]);
	});
});

describe('a verdict of close', () => {
	it('says why a rule sends it to review, and keeps the margin for the panel', () => {
		const light = weak({ load: { power: { value: 0.2, unit: 'kW' } } });
		const helical = { ...light, gear: { ...light.gear, kind: 'helical' as const, helixAngle: 15 } };
		const outcome = evaluate(helical);
		expect(outcome.verdict).toBe('close');
		expect(verdictSentence(outcome, english)).toContain('helical gear');
		expect(otherReasons(outcome).some(({ code }) => code.includes('margin'))).toBe(false);
	});
});
