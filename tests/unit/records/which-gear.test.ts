/** From answers as typed to the question of identification, and to the gears that a check is answered for. */
import { describe, expect, it } from 'vitest';
import { parseIdentify } from '$lib/records/identify';
import { checkAnswers, noAnswers, type CheckAnswers } from '$lib/records/check';
import { USUAL_UNCERTAINTY } from '$lib/records/instruments';
import type { Reading } from '$lib/records/reading';
import { readingsOf, whichGears } from '$lib/records/which-gear';

const CANNOT = { cannotMeasure: true } as const;

function read<U extends 'in' | 'mm' | 'teeth' | 'deg'>(
	value: number,
	unit: U,
	more: object = {}
): Reading<U> {
	return { typed: String(value), value, unit, source: 'keypad', ...more };
}

/** DP 5, 20 degrees, 25 teeth, full depth: over two tips an odd count reads m (N + 2) cos(90° / N), near enough. */
const measured: CheckAnswers = {
	...noAnswers,
	origin: 'inch',
	teeth: read(25, 'teeth'),
	outsideDiameter: read(5.389, 'in', { instrument: 'calliper' })
};
const spans: CheckAnswers['spans'] = [
	{ teeth: 3, reading: read(1.546, 'in', { instrument: 'calliper' }) },
	{ teeth: 4, reading: read(2.136, 'in', { instrument: 'calliper' }) }
];

describe('readings as identification takes them', () => {
	it('asks nothing before teeth and one size are read', () => {
		expect(readingsOf(noAnswers, undefined)).toBeNull();
		expect(readingsOf({ ...noAnswers, teeth: read(25, 'teeth') }, undefined)).toBeNull();
		expect(readingsOf({ ...measured, teeth: CANNOT }, undefined)).toBeNull();
		expect(readingsOf({ ...measured, outsideDiameter: CANNOT }, undefined)).toBeNull();
	});

	it('hands on every reading in its own unit, with its repeats and its tool', () => {
		const earlier = [
			{ typed: '5.391', value: 5.391, unit: 'in', source: 'typed' },
			{ typed: '136.9', value: 136.9, unit: 'mm', source: 'keypad' }
		];
		const answers: CheckAnswers = {
			...measured,
			outsideDiameter: read(5.389, 'in', { instrument: 'calliper', earlier }),
			outsideDiameterTaken: 'tip-to-gap',
			tipWorn: true,
			flanksWorn: true,
			secondCount: read(26, 'teeth'),
			spans,
			wholeDepth: read(11.4, 'mm', { instrument: 'calliper-tips' }),
			overPins: read(5.5, 'in'),
			pinDiameter: read(0.35, 'in'),
			centreDistance: read(10, 'in'),
			mateTeeth: read(75, 'teeth'),
			helixAngle: read(12, 'deg', { instrument: 'protractor' }),
			rootDiameter: CANNOT
		};
		// As a record would hold them.
		expect(checkAnswers.safeParse(answers).success).toBe(true);
		const asked = readingsOf(answers, { calliper: 0.05 });
		expect(asked).toMatchObject({
			teeth: 25,
			teethCertain: false,
			prior: 'inch',
			flanksWorn: true,
			outsideDiameter: { unit: 'in', taken: 'tip-to-gap', tipWorn: true },
			wholeDepth: { values: [11.4], unit: 'mm', uncertainty: USUAL_UNCERTAINTY['calliper-tips'] },
			spans: [
				{ teeth: 3, values: [1.546], unit: 'in' },
				{ teeth: 4, values: [2.136], unit: 'in' }
			],
			overPins: { values: [5.5], pinDiameter: { value: 0.35, unit: 'in' } },
			centreDistance: { values: [10] },
			mateTeeth: 75,
			helixAngle: { value: 12, uncertainty: USUAL_UNCERTAINTY.protractor },
			cannotMeasure: ['rootDiameter']
		});
		const { outsideDiameter } = asked!;
		expect(outsideDiameter?.values?.[0]).toBe(5.391);
		expect(outsideDiameter?.values?.[1]).toBeCloseTo(136.9 / 25.4, 12);
		expect(outsideDiameter?.values?.[2]).toBe(5.389);
		// The plant's own figure for its callipers, not the usual one.
		expect(outsideDiameter?.uncertainty).toBeCloseTo(0.05 / 25.4, 12);
		expect(parseIdentify(asked).ok).toBe(true);
	});

	it('leaves out what lacks its other half, and the helix of straight teeth', () => {
		const halves: CheckAnswers = {
			...measured,
			overPins: read(5.5, 'in'),
			mateTeeth: CANNOT,
			centreDistance: read(10, 'in'),
			helixAngle: read(0, 'deg'),
			secondCount: read(25, 'teeth')
		};
		const asked = readingsOf(halves, undefined);
		expect(Object.keys(asked ?? {}).sort()).toEqual(
			['cannotMeasure', 'flanksWorn', 'outsideDiameter', 'prior', 'teeth'].sort()
		);
		expect(asked?.cannotMeasure).toEqual(['centreDistance']);
	});
});

describe('the gears that a check is answered for', () => {
	it('is the chosen one, with what the readings say for it', () => {
		const chosen = {
			pitch: { system: 'diametral', value: 5 },
			pressureAngle: 20,
			form: 'full-depth'
		} as const;
		const which = whichGears({ ...measured, spans, ...chosen }, undefined);
		expect(which).toMatchObject({ ok: true, gears: [{ teeth: 25, pressureAngle: 20, profileShift: 0 }] });
		if (!which.ok) return;
		expect(which.gears[0]?.probability).toBeGreaterThan(0.95);
		// The spans speak for 20 degrees, so 14.5 chosen by hand is told as next to impossible.
		const other = whichGears({ ...measured, spans, ...chosen, pressureAngle: 14.5 }, undefined);
		expect(other.ok && other.gears[0]?.probability).toBeLessThan(0.01);
	});

	it('without a reading of the size, of a choice nothing can be told', () => {
		const answers: CheckAnswers = {
			...noAnswers,
			teeth: read(25, 'teeth'),
			pitch: { system: 'module', value: 5 },
			pressureAngle: 20,
			form: 'stub',
			gearTeeth: 24
		};
		expect(whichGears(answers, undefined)).toMatchObject({
			ok: true,
			identified: null,
			gears: [{ teeth: 24, probability: null }]
		});
	});

	it('are all that survive where they are left open, by the same name as they were told', () => {
		const which = whichGears({ ...measured, severalGears: true }, undefined);
		expect(which.ok).toBe(true);
		if (!which.ok) return;
		const pitches = which.gears.map(
			({ pitch, pressureAngle }) => `${pitch.system} ${pitch.value} ${pressureAngle}`
		);
		expect(pitches).toContain('diametral 5 20');
		expect(pitches).toContain('diametral 5 14.5');
		expect(which.gears.every(({ probability }) => (probability ?? 0) > 0.01)).toBe(true);
		expect(whichGears({ ...measured, severalGears: true, outsideDiameter: null }, undefined)).toMatchObject({
			ok: false,
			missing: ['pitch']
		});
	});

	it('names every gap of a choice', () => {
		expect(whichGears(noAnswers, undefined)).toMatchObject({
			ok: false,
			missing: ['teeth', 'pitch', 'pressureAngle', 'form']
		});
	});
});
