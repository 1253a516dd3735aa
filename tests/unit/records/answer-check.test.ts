/** The outcome of a check whose gear is chosen, left open, or fits nothing: the weakest decides, a doubt is told. */
import { describe, expect, it } from 'vitest';
import type { IdentifyReading } from '$lib/gear/identify/contract';
import { evaluate } from '$lib/gear/evaluate';
import { answerCheck, answerWithQuestion } from '$lib/records/answer-check';
import { assemble, type PlantSide } from '$lib/records/assemble';
import { noAnswers, type CheckAnswers } from '$lib/records/check';
import { outcome as outcomeSchema } from '$lib/records/outcome';
import type { MaterialStatement } from '$lib/records/material';
import { cycloidalReadings } from '../../identify/cycloidal-gears';
import { randomOf } from '../../identify/synthetic-gears';

const NOW = '2026-06-01T10:00:00.000Z';
const material: MaterialStatement = {
	name: 'Invented steel',
	condition: 'as rolled',
	metallic: true,
	allowableBending: { value: 100, unit: 'MPa' },
	basis: 'invented for the test',
	brinellLow: 180,
	brinellHigh: 200,
	modulus: { value: 207, unit: 'GPa' },
	poisson: 0.3,
	permitted: true,
	source: 'invented',
	edition: '1',
	validFrom: '2020-01-01'
};

const plantSide: PlantSide = {
	material,
	offered: [],
	rules: {
		bendingMargin: 1.2,
		wearMargin: 1,
		reversingFactor: 0.7,
		cutLaw: 1200,
		formFactor: 'handbook',
		speedLimit: { cast: null, cut: null, hobbed: null, ground: null },
		uncertainty: { faceWidth: 0.01, load: 0.05, speed: 0.01 },
		serviceFactors: [{ duty: 'uniform', factor: 1, source: 'invented' }]
	}
};

const reading = <U extends string>(value: number, unit: U) => ({
	typed: String(value),
	value,
	unit,
	source: 'keypad' as const
});

/** 25 teeth of DP 5, pressure angle not told by the outside diameter alone. */
const open: CheckAnswers = {
	...noAnswers,
	origin: 'inch',
	teeth: reading(25, 'teeth'),
	outsideDiameter: reading(5.389, 'in'),
	faceWidth: reading(2, 'in'),
	severalGears: true,
	loadKind: 'power',
	power: reading(9, 'hp'),
	speed: reading(180, 'rpm'),
	serviceFactor: reading(1, 'x'),
	finish: 'cut',
	materialId: '01900000-0000-7000-8000-000000000001'
};

describe('a check that is left open between several gears', () => {
	const { outcome, question } = answerWithQuestion(open, plantSide, NOW);

	it('has the figures of the weakest, and every gear beside it', () => {
		const assembled = assemble(open, plantSide, NOW);
		if (!assembled.ok) throw new Error('nothing is missing');
		const each = assembled.questions.map(({ input }) => evaluate(input));
		expect(each.length).toBeGreaterThan(2);
		const weakest = Math.min(...each.map(({ bendingMarginLow }) => bendingMarginLow ?? Infinity));
		expect(outcome.bendingMarginLow).toBe(weakest);
		expect(outcome.gears).toHaveLength(each.length);
		expect(outcome.gears?.filter(({ decides }) => decides)).toMatchObject([{ marginLow: weakest }]);
		expect(question && evaluate(question).bendingMarginLow).toBe(weakest);
		expect(outcome.reasons.map(({ code }) => code)).toContain('weakest-of-several');
		// The 14.5 degree gear is the weaker of the two leading ones.
		const margin = (angle: number) =>
			outcome.gears?.find((gear) => gear.pressureAngle === angle && gear.form === 'full-depth')?.margin ?? 0;
		expect(margin(14.5)).toBeLessThan(margin(20));
		expect(outcomeSchema.safeParse(outcome).success).toBe(true);
	});

	it('carries only if every one of them does', () => {
		const at = (hp: number) =>
			answerCheck({ ...open, power: reading(hp, 'hp') as CheckAnswers['power'] }, plantSide, NOW);
		const seen = new Set<string>();
		for (let hp = 2; hp < 60; hp *= 1.03) {
			const { verdict, gears = [] } = at(hp);
			seen.add(verdict);
			if (verdict === 'carries') expect(gears.every((gear) => gear.verdict === 'carries')).toBe(true);
			if (verdict === 'will-not-carry') {
				expect(gears.some((gear) => gear.verdict === 'will-not-carry')).toBe(true);
			}
		}
		expect([...seen].sort()).toEqual(['carries', 'close', 'will-not-carry']);
	});

	it('cannot be answered where no involute gear fits', () => {
		// A cast wheel with cycloidal teeth, as it was read.
		const wheel = cycloidalReadings(randomOf(3));
		const inches = (read: IdentifyReading | undefined) => reading(read?.value ?? 0, 'in' as const);
		const answers: CheckAnswers = {
			...open,
			teeth: reading(wheel.teeth, 'teeth'),
			outsideDiameter: inches(wheel.outsideDiameter),
			outsideDiameterTaken: 'pi-tape',
			wholeDepth: inches(wheel.wholeDepth),
			spans: (wheel.spans ?? []).map((span) => ({ teeth: span.teeth, reading: inches(span) }))
		};
		const none = answerCheck(answers, plantSide, NOW);
		expect(none).toMatchObject({ verdict: 'cannot-say', reasons: [{ code: 'no-gear-fits' }] });
	});

	it('says what is missing before anything is measured', () => {
		const { reasons } = answerCheck({ ...noAnswers, severalGears: true }, plantSide, NOW);
		expect(reasons.map(({ values }) => values?.['field'])).toEqual([
			'teeth',
			'faceWidth',
			'pitch',
			'load',
			'speed',
			'serviceFactor',
			'finish'
		]);
	});
});

describe('a gear that was chosen', () => {
	const chosen = {
		...open,
		severalGears: false,
		pitch: { system: 'diametral', value: 5 },
		form: 'full-depth'
	} as const;
	const spans: CheckAnswers['spans'] = [
		{ teeth: 3, reading: reading(1.546, 'in') },
		{ teeth: 4, reading: reading(2.136, 'in') }
	];
	const weak = { power: reading(2, 'hp') as CheckAnswers['power'] };

	it('is answered alone while the readings allow it', () => {
		const outcome = answerCheck({ ...chosen, ...weak, pressureAngle: 20, spans }, plantSide, NOW);
		expect(outcome.verdict).toBe('carries');
		expect(outcome.gears).toBeUndefined();
	});

	it('goes to review where the readings speak against it', () => {
		const outcome = answerCheck({ ...chosen, ...weak, pressureAngle: 14.5, spans }, plantSide, NOW);
		expect(outcome.verdict).toBe('close');
		expect(outcome.reasons[0]?.code).toBe('choice-against-readings');
	});

	it('never gets better by a doubt', () => {
		const heavy = { power: reading(60, 'hp') as CheckAnswers['power'] };
		const outcome = answerCheck({ ...chosen, ...heavy, pressureAngle: 14.5, spans }, plantSide, NOW);
		expect(outcome.verdict).toBe('will-not-carry');
		expect(outcome.reasons[1]?.code).toBe('choice-against-readings');
	});

	it('is asked about as a helical gear where a helix was read', () => {
		const answers: CheckAnswers = { ...chosen, pressureAngle: 20, helixAngle: reading(15, 'deg') };
		expect(answerWithQuestion(answers, plantSide, NOW).question?.gear).toMatchObject({
			kind: 'helical',
			plane: 'normal',
			helixAngle: 15
		});
	});

	it('takes the mean of repeated face widths', () => {
		const earlier = [{ ...reading(52.8, 'mm') }];
		const answers: CheckAnswers = {
			...chosen,
			pressureAngle: 20,
			faceWidth: { ...reading(2, 'in'), earlier }
		};
		const face = answerWithQuestion(answers, plantSide, NOW).question?.gear.faceWidth;
		expect(face?.unit).toBe('in');
		expect(face?.value).toBeCloseTo((2 + 52.8 / 25.4) / 2, 12);
	});
});
