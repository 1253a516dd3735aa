/** Candidates in plain words, in both languages: names, misfits with their likely cause, what the next reading tells. */
import { describe, expect, it } from 'vitest';
import {
	candidateName,
	misfitWords,
	nextName,
	otherNames,
	percent,
	shortName,
	tellsWords
} from '$lib/features/identify/candidate-words';
import { differences, expectedMarks } from '$lib/features/identify/expected-marks';
import type { Candidate, IdentifyInput, Misfit, NextReading } from '$lib/gear/identify/contract';
import { identify } from '$lib/gear/identify/identify';
import { translator } from '$lib/i18n/catalogue';
import type { Words } from '$lib/i18n/context.svelte';

const words = (language: 'en' | 'es') => ({ language, t: translator(language) }) as Words;
const [english, spanish] = [words('en'), words('es')];

const candidate = (change: Partial<Candidate> = {}): Candidate => ({
	system: 'diametral',
	value: 5,
	module: 5.08,
	diametralPitch: 5,
	pressureAngle: 20,
	form: 'full-depth',
	profileShift: 0,
	tipLoss: 0,
	thicknessLoss: 0,
	teeth: 25,
	probability: 0.58,
	misfits: [],
	...change
});

const misfit = (change: Partial<Misfit> = {}): Misfit => ({
	reading: 'outsideDiameter',
	residual: 0,
	offNominal: 0,
	unit: 'mm',
	sigmas: 0,
	flagged: false,
	...change
});

describe('a gear', () => {
	it('has a name, and its pitch two others', () => {
		expect(candidateName(candidate(), english)).toBe('DP 5, 20°, full depth');
		expect(candidateName(candidate({ profileShift: 0.214 }), english)).toBe(
			'DP 5, 20°, full depth, shifted +0.21'
		);
		expect(candidateName(candidate({ profileShift: -0.1 }), spanish)).toMatch(
			/^DP 5, 20°, .*corregido −0\.10$/
		);
		expect(otherNames(candidate(), 25, english)).toBe('module 5.08 · circular pitch 0.628 in');
		const metric = candidate({ system: 'module', value: 5, module: 5, diametralPitch: 5.08 });
		expect(candidateName(metric, english)).toBe('Module 5, 20°, full depth');
		expect(otherNames(metric, 25, english)).toBe('DP 5.08 · circular pitch 15.71 mm');
		const old = candidate({ system: 'circular', value: 0.625, module: 5.0532, diametralPitch: 5.0265 });
		expect(candidateName(old, english)).toBe('Circular pitch 0.625 in, 20°, full depth');
		expect(shortName({ ...old, form: 'stub' }, english)).toBe('CP 0.625, 20° stub');
	});

	it('of another count than was counted says so', () => {
		expect(otherNames(candidate({ teeth: 24 }), 25, english)).toContain('24 teeth, counted 25');
	});

	it('is never told as certain, nor a possible one as impossible', () => {
		expect([0.99999, 0.995, 0.584, 0.0101, 0.0099].map(percent)).toEqual(['99', '99', '58', '1', '<1']);
	});
});

describe('a misfit', () => {
	it('says what it may be', () => {
		const worn = candidate({ tipLoss: 0.46 });
		expect(misfitWords(misfit({ offNominal: -0.92 }), worn, 'mm', english)).toBe(
			'Outside diameter: reads 0.92 mm low: worn tip?'
		);
		const thin = candidate({ thicknessLoss: 0.5 });
		const span = misfit({ reading: 'spans', teeth: 4, offNominal: -0.47 });
		expect(misfitWords(span, thin, 'in', english)).toBe(
			'Span over 4 teeth: reads 0.019 in low: worn flanks?'
		);
		const shifted = candidate({ profileShift: 0.21 });
		expect(misfitWords(misfit({ offNominal: 2.1 }), shifted, 'mm', english)).toBe(
			'Outside diameter: fits only with the shift'
		);
		expect(misfitWords(misfit({ offNominal: 0.1 }), candidate(), 'mm', english)).toBe(
			'Outside diameter: fits'
		);
	});

	it('that nothing explains is told by its size, and asked to be looked at where it is gross', () => {
		const off = misfit({ residual: 0.3, sigmas: 2.4 });
		expect(misfitWords(off, candidate(), 'mm', english)).toBe('Outside diameter: reads 0.30 mm high');
		expect(misfitWords({ ...off, sigmas: 9, flagged: true }, candidate(), 'mm', english)).toBe(
			'Outside diameter: reads 0.30 mm high, look again'
		);
	});
});

describe('the next reading', () => {
	const readings: IdentifyInput = {
		teeth: 25,
		prior: 'inch',
		outsideDiameter: { value: 5.389, unit: 'in', uncertainty: 0.001 }
	};
	const answer = identify(readings);
	const next = answer.nextReading as NextReading;

	it('is named with what it tells apart', () => {
		expect(nextName(next, english)).toBe('Span over 3, then 4 teeth');
		expect(tellsWords(next, answer, english)).toBe('Next best reading: tells 20° from 14.5°');
		expect(nextName({ ...next, thenSpanTeeth: undefined }, english)).toBe('Span over 3 teeth');
		expect(nextName({ what: 'wholeDepth', why: '', expected: [] }, spanish)).toBe('Altura del diente');
	});

	it('of two spans shows their difference: the base pitch of each gear', () => {
		const marks = expectedMarks(differences(next.expected, answer.candidates), 'in', 388);
		expect(marks).toHaveLength(3);
		for (const { candidate: place, value } of marks) {
			const gear = answer.candidates[place]!;
			expect(value).toBeCloseTo(
				(Math.PI * gear.module * Math.cos((gear.pressureAngle * Math.PI) / 180)) / 25.4,
				9
			);
		}
	});

	it('has labels that neither cover each other nor leave the rule', () => {
		for (const values of [[1, 1, 1], [1, 1.001, 9], [1, 8.999, 9], [1, 5, 9], [3]]) {
			const expected = values.map((value, i) => ({ candidate: i, value, unit: 'mm' as const }));
			const marks = expectedMarks(expected, 'mm', 388);
			expect(marks.map(({ value }) => value)).toEqual(values);
			marks.forEach(({ label }, i) => {
				expect(label).toBeGreaterThanOrEqual(64 - 1e-9);
				expect(label).toBeLessThanOrEqual(388 - 64 + 1e-9);
				if (i > 0) expect(label - marks[i - 1]!.label).toBeGreaterThanOrEqual(128 - 1e-9);
			});
		}
	});
});
