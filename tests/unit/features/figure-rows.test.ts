/** Mesh, flanks and form factors as a check's page tells them, in both languages and the units of the plant. */
import { describe, expect, it } from 'vitest';
import { figureRows } from '$lib/features/check-page/figure-rows';
import type { EvaluateInput } from '$lib/gear/contract';
import { evaluate } from '$lib/gear/evaluate';
import { translator } from '$lib/i18n/catalogue';
import type { Words } from '$lib/i18n/context.svelte';

const words = (language: 'en' | 'es') => ({ language, t: translator(language) }) as Words;
const [english, spanish] = [words('en'), words('es')];

const iron = {
	name: 'Iron 20',
	metallic: true,
	allowableBending: { value: 55, unit: 'MPa' as const },
	brinell: 200,
	modulus: { value: 100, unit: 'GPa' as const },
	permitted: true
};

const pair: EvaluateInput = {
	gear: {
		kind: 'spur',
		teeth: 24,
		pitch: { system: 'module', value: 4 },
		pressureAngle: 20,
		form: 'full-depth',
		faceWidth: { value: 30, unit: 'mm' },
		finish: 'cut',
		material: iron
	},
	mate: {
		kind: 'spur',
		teeth: 60,
		form: 'full-depth',
		centreDistance: { value: 168.5, unit: 'mm' },
		faceWidth: { value: 30, unit: 'mm' },
		material: iron
	},
	drive: {
		load: { power: { value: 1, unit: 'kW' } },
		speed: { value: 300, unit: 'rpm' },
		serviceFactor: 1.25
	}
};

const told = (input: EvaluateInput, metric = true, of = english) =>
	Object.fromEntries(figureRows(evaluate(input), metric, of).map(({ label, value }) => [label, value]));

describe('figures of a pair', () => {
	it('are ratio, distances, angle, contact ratio, backlash and how the teeth meet', () => {
		expect(told(pair)).toMatchObject({
			Ratio: '2.5',
			// 4 mm x (24 + 60) / 2
			'Standard centre distance': '168.00 mm',
			// acos(168 cos 20 / 168.5)
			'Operating pressure angle': '20.46°',
			'Every tooth meets every other': 'no',
			Undercut: 'no',
			'Tip interference': 'no'
		});
		expect(Number(told(pair)['Contact ratio'])).toBeGreaterThan(1.4);
		expect(told(pair)['Backlash across the flanks']).toMatch(/^0\.\d\d mm$/);
	});

	it('say that every tooth meets every other where the counts share no divisor', () => {
		const hunting = {
			...pair,
			mate: { ...pair.mate, kind: 'spur' as const, teeth: 61, centreDistance: undefined }
		};
		expect(told(hunting)['Every tooth meets every other']).toBe('yes');
	});

	it('are in inches, psi and pounds on an inch machine', () => {
		const inch = told(pair, false);
		expect(inch['Standard centre distance']).toBe('6.614 in');
		expect(inch['Contact stress']).toMatch(/^[\d,]+ psi$/);
		expect(inch['Limit load for wear']).toMatch(/^[\d,]+ lbf$/);
	});

	it('mark the form factor that counts, and the stress concentration as information', () => {
		const rows = told({ ...pair, rules: { formFactor: 'handbook' } });
		expect(rows['Form factor by the handbook']).toMatch(/^0\.\d{3}, counts$/);
		expect(rows['Form factor by geometry']).toMatch(/^0\.\d{3}$/);
		expect(rows['Stress concentration at the fillet, for information']).toMatch(/^\d\.\d\d$/);
	});

	it('are told in Spanish, row for row', () => {
		const rows = told(pair, true, spanish);
		expect(rows['Relación']).toBe('2.5');
		expect(rows['Socavado']).toBe('no');
		expect(Object.keys(rows)).toHaveLength(Object.keys(told(pair)).length);
	});
});

describe('figures of one gear', () => {
	it('are those of its tooth only: nothing is said of flanks and mesh that were not worked out', () => {
		const { mate: _mate, ...alone } = pair;
		expect(Object.keys(told(alone))).toEqual([
			'Form factor by the handbook',
			'Form factor by geometry',
			'Stress concentration at the fillet, for information'
		]);
	});
});
