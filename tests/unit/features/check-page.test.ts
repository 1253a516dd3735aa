/** What a check's page says of its answers, and of a tablet and a server that do not agree. */
import { describe, expect, it } from 'vitest';
import { driveRows, readingRows } from '$lib/features/check-page/answer-rows';
import { agreementNote, differences } from '$lib/features/check-page/differences';
import type { Outcome } from '$lib/gear/contract';
import { cannotSay } from '$lib/gear/verdict';
import { translator } from '$lib/i18n/catalogue';
import type { Words } from '$lib/i18n/context.svelte';
import { noAnswers, type CheckAnswers } from '$lib/records/check';

const words = (language: 'en' | 'es') => ({ language, t: translator(language) }) as Words;
const english = words('en');

const answers: CheckAnswers = {
	...noAnswers,
	teeth: { typed: '18', value: 18, unit: 'teeth', source: 'keypad' },
	outsideDiameter: { typed: '4 63/64', value: 4 + 63 / 64, unit: 'in', source: 'typed' },
	faceWidth: { cannotMeasure: true },
	pitch: { system: 'diametral', value: 4 },
	pressureAngle: 14.5,
	loadKind: 'power',
	loadBasis: 'nameplate',
	power: { typed: '10', value: 10, unit: 'hp', source: 'keypad' },
	duty: 'light-shock',
	serviceFactor: { typed: '1.25', value: 1.25, unit: 'x', source: 'rule' }
};
const row = (rows: { label: string }[], label: string) => rows.find((r) => r.label === label);

describe('readings as typed', () => {
	const rows = readingRows(answers, english);

	it('keeps a fraction as it was typed, with the other unit beside it', () => {
		expect(row(rows, 'Outside diameter')).toMatchObject({
			typed: '4 63/64 in',
			other: '126.6 mm',
			source: 'keyboard or calliper'
		});
	});

	it('adds no second unit to a text that carries its own', () => {
		const faceWidth = { typed: '63.5 mm', value: 63.5, unit: 'mm', source: 'typed' } as const;
		expect(row(readingRows({ ...answers, faceWidth }, english), 'Face width')).toMatchObject({
			typed: '63.5 mm'
		});
	});

	it('says what could not be measured and what was not given', () => {
		expect(row(rows, 'Face width')).toMatchObject({ typed: 'cannot measure', given: false });
		expect(row(rows, 'Tooth form')).toMatchObject({ typed: 'not given', given: false });
	});

	it('shows the load that counts, with its basis', () => {
		const drive = driveRows(answers, english, { name: 'Iron, class 30', stress: '8,500 psi' });
		expect(row(drive, 'Power')).toMatchObject({ typed: '10 hp', other: '7.457 kW', source: 'nameplate' });
		expect(row(drive, 'Torque')).toBeUndefined();
		expect(row(drive, 'Service factor')).toMatchObject({ other: 'light shock', source: 'plant rule' });
		expect(row(drive, 'Material of the spare')).toMatchObject({
			typed: 'Iron, class 30',
			other: '8,500 psi'
		});
	});

	it('says that a load is not known, and that none was chosen', () => {
		expect(row(driveRows({ ...answers, loadKind: 'unknown' }, english, null), 'Load')).toMatchObject({
			typed: 'not known',
			given: true
		});
		expect(row(driveRows({ ...answers, loadKind: null }, english, null), 'Load')).toMatchObject({
			given: false
		});
	});
});

describe('tablet and server', () => {
	const outcome = (change: Partial<Outcome>): Outcome => ({
		...cannotSay([]),
		verdict: 'carries',
		bendingMargin: 1.8019,
		bendingMarginLow: 1.57,
		...change
	});
	const server = outcome({});

	it('agree with both figures, cut and not rounded', () => {
		const { core } = server;
		expect(differences(server, server, english)).toEqual([]);
		expect(agreementNote(server, server, english).rest).toBe(`1.801 and 1.801, core ${core} on both`);
	});

	it('agree by the margin that the verdict shows, where wear decides', () => {
		const wear = { answer: 'wear', margin: 1.3119, marginLow: 1.1, needed: 1.2 } as const;
		const worn = outcome({ limits: [wear], limitedBy: 'wear' });
		expect(agreementNote(worn, worn, english).rest).toMatch(/^1\.311 and 1\.311, /);
	});

	it('forgive what arithmetic does in the tenth place', () => {
		expect(differences(outcome({ bendingMargin: 1.8019 * (1 + 1e-12) }), server, english)).toEqual([]);
	});

	it('show both figures where they differ', () => {
		expect(differences(outcome({ verdict: 'close', bendingMargin: 1.5 }), server, english)).toEqual([
			{ name: 'verdict', tablet: 'Close: needs review', server: 'Carries the load' },
			{ name: 'margin in bending', tablet: '1.5', server: '1.8019' }
		]);
	});

	it('show a figure that only one of them has', () => {
		expect(differences(outcome({ velocityFactor: null }), outcome({ velocityFactor: 1.2 }), english)).toEqual(
			[{ name: 'velocity factor', tablet: 'none', server: '1.2' }]
		);
	});

	it('name their cores when those are not the same', () => {
		const older = outcome({ core: '0.0.9' });
		expect(agreementNote(older, server, english).rest).toBe(`core 0.0.9 and core ${server.core}`);
		expect(differences(older, server, words('es')).map(({ name }) => name)).toEqual(['versión del núcleo']);
	});
});
