/** Every reason code, working name and source that the core holds has words in both languages. */
import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { reasonWords } from '$lib/features/verdict/reason-words';
import { decidingLine, sourceWords, workingRows } from '$lib/features/verdict/working-words';
import { evaluate } from '$lib/gear/evaluate';
import type { EvaluateInput } from '$lib/gear/contract';
import { SOURCES } from '$lib/gear/sources';
import { isMessage, translator } from '$lib/i18n/catalogue';
import type { Words } from '$lib/i18n/context.svelte';

// Only what the words' helpers use: the class itself holds runes and needs a component.
const words = (language: 'en' | 'es') => ({ language, t: translator(language) }) as Words;
const [english, spanish] = [words('en'), words('es')];

const core = readdirSync('src/lib/gear', { recursive: true, encoding: 'utf8' })
	.filter((file) => file.endsWith('.ts'))
	.map((file) => readFileSync(`src/lib/gear/${file}`, 'utf8'))
	.join('\n');

const found = (pattern: RegExp) => [
	...new Set([...core.matchAll(pattern)].map((match) => match.slice(1).find(Boolean) ?? ''))
];

const iron = {
	name: 'Iron, class 30',
	metallic: true,
	allowableBending: { value: 8500, unit: 'psi' as const },
	brinell: 200,
	modulus: { value: 15e3, unit: 'ksi' as const }
};

const gearOf = (): EvaluateInput['gear'] => ({
	kind: 'spur',
	teeth: 18,
	pitch: { system: 'diametral', value: 4 },
	pressureAngle: 14.5,
	form: 'full-depth',
	faceWidth: { value: 2.5, unit: 'in' },
	finish: 'cut',
	material: { ...iron, permitted: true }
});

const input = (change: Partial<EvaluateInput['gear']> = {}): EvaluateInput => ({
	gear: { ...gearOf(), ...change },
	mate: {
		kind: 'spur',
		teeth: 54,
		form: 'full-depth',
		faceWidth: { value: 2, unit: 'in' },
		centreDistance: { value: 9.01, unit: 'in' },
		material: { ...iron, permitted: true }
	},
	original: { ...gearOf(), finish: 'hobbed' },
	drive: {
		load: { power: { value: 10, unit: 'hp' } },
		speed: { value: 220, unit: 'rpm' },
		serviceFactor: 1.25,
		bending: 'reversing'
	},
	rules: { bendingMargin: 1.5 }
});

describe('words for the core', () => {
	// The one code that is an error of the input, not a reason of an outcome.
	const codes = found(/(?:code|short|low|enough): '([a-z-]+)'/g).filter((code) => code !== 'invalid-input');
	const names = found(/(?:name: |(?:read|step|margin)\('\w+', )(?:'([^']+)'|"([^"]+)")/g);

	it('finds the codes and names it is meant to check', () => {
		expect(codes.length).toBeGreaterThan(40);
		expect(names.length).toBeGreaterThan(45);
	});

	it.each(codes)('reason %s', (code) => {
		expect(isMessage(`reason.${code}`)).toBe(true);
	});

	it.each(names)('working line %s', (name) => {
		expect(isMessage(`working.${name}`)).toBe(true);
	});

	it.each(Object.values(SOURCES))('source %s keeps its titles in Spanish', (source) => {
		const told = sourceWords(source, spanish);
		expect(told).not.toMatch(/from memory|definition|mechanics|rule of the plant|as given/);
		expect(sourceWords(source, english)).toBe(source);
	});

	it.each([
		['cut', true],
		['cast', true],
		['hobbed', true],
		['ground', true],
		['hobbed', false]
	] as const)('the whole working of %s teeth, metallic %s', (finish, metallic) => {
		const { gear } = input();
		const outcome = evaluate(input({ finish, material: { ...gear.material, metallic } }));
		expect(outcome.working.length).toBeGreaterThan(35);
		for (const line of outcome.working) {
			expect(isMessage(`working.${line.name}`), line.name).toBe(true);
		}
	});
});

describe('a reason in words', () => {
	it('cuts margins, never rounds them up', () => {
		const values = { margin: 1.499, low: 1.2, needed: 1.5 };
		const reason = { code: 'bending-margin-short', text: 'unused', values };
		expect(reasonWords(reason, english)).toContain('1.49, the plant needs 1.50');
		expect(reasonWords(reason, spanish)).toContain('1.49 y la planta requiere 1.50');
	});

	it('says a velocity in both units and the law in words', () => {
		const reason = {
			code: 'speed-beyond-law',
			text: 'unused',
			values: { velocity: 12, end: 10.16, law: 'cut-600' }
		};
		expect(reasonWords(reason, english)).toContain('12.00 m/s (2,362 ft/min)');
		expect(reasonWords(reason, spanish)).toContain('dientes cortados comerciales');
	});

	it('says what is missing in the language of the page', () => {
		const reason = { code: 'missing', text: 'unused', values: { field: 'faceWidth' } };
		expect(reasonWords(reason, spanish)).toContain('ancho de cara');
	});

	it('falls back to the sentence of the core for a code of a later version', () => {
		expect(reasonWords({ code: 'of-a-later-core', text: 'As the core says it.' }, spanish)).toBe(
			'As the core says it.'
		);
	});
});

describe('working rows', () => {
	it('stands a figure of SI beside its inch unit', () => {
		const rows = workingRows(evaluate(input()).working, english);
		const diameter = rows.find((row) => row.symbol === 'd');
		expect(diameter).toMatchObject({ value: '114.3', unit: 'mm', inch: '4.5 in' });
		expect(rows.find((row) => row.symbol === 'M')).toMatchObject({ unit: '', inch: '' });
	});

	it("says of the mate's lines whose they are, in both languages", () => {
		const { working } = evaluate(input());
		const at = working.findIndex(({ symbol, of }) => symbol === 'M' && of === 'mate');
		expect(workingRows(working, english)[at]?.name).toBe('mate: margin in bending');
		expect(workingRows(working, spanish)[at]?.name).toMatch(/^conjugado: margen/);
	});

	it('marks one margin: that of the answer that decides', () => {
		const { working } = evaluate(input());
		const marked = (limitedBy: Parameters<typeof decidingLine>[1]) =>
			working[decidingLine(working, limitedBy)];
		expect(marked('gear-bending')).toMatchObject({ symbol: 'M' });
		expect(marked('gear-bending')?.of).toBeUndefined();
		expect(marked('mate-bending')).toMatchObject({ symbol: 'M', of: 'mate' });
		const wear = working.filter(({ symbol }) => symbol === 'Mc' || symbol === 'Mw');
		expect(wear).toHaveLength(2);
		expect(marked('wear')?.value).toBe(Math.min(...wear.map(({ value }) => value)));
		// A core before 1.0.0 did not say.
		expect(marked(undefined)).toBe(marked('gear-bending'));
		expect(decidingLine([], 'wear')).toBe(-1);
	});
});
