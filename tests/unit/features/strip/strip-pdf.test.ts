/** The printed page, read back: one sheet of the right size, a line of 100 mm on it, the teeth at 1:1. */
import { decodePDFRawStream, PDFDocument, PDFRawStream } from '@cantoo/pdf-lib';
import { describe, expect, test } from 'vitest';
import { stripDrawing, type StripDrawing, type StripGear } from '$lib/features/strip/strip-gear';
import { stripPdf, type Paper } from '$lib/features/strip/strip-pdf';
import { pdfWords } from '$lib/features/strip/strip-words';
import { translator } from '$lib/i18n/catalogue';
import type { Words } from '$lib/i18n/context.svelte';
import type { Language } from '$lib/i18n/language';

const MADE = new Date('2026-03-04T12:00:00Z');
const GEAR: StripGear = {
	label: 'Module 5, 20°, full depth',
	teeth: 25,
	module: 5,
	pressureAngle: 20,
	form: 'full-depth',
	profileShift: 0
};

async function printed(gears: StripGear[], paper: Paper = 'A4', language: Language = 'en') {
	const words = { t: translator(language), language } as Words;
	const document = await PDFDocument.load(await stripPdf(gears, pdfWords(words, MADE), paper, MADE));
	const page = document.getPage(0);
	const streams = page.node.normalizedEntries().Contents?.asArray() ?? [];
	const content = streams
		.map((entry) => document.context.lookup(entry))
		.filter((stream): stream is PDFRawStream => stream instanceof PDFRawStream)
		.map((stream) => new TextDecoder('latin1').decode(decodePDFRawStream(stream).decode()))
		.join('\n');
	// The standard fonts' text is written as hexadecimal WinAnsi codes, which are Latin-1 for what is used here.
	const text = [...content.matchAll(/<([0-9A-Fa-f]+)>\s*Tj/g)]
		.map(([, hex]) => Buffer.from(hex!, 'hex').toString('latin1'))
		.join(' ')
		.replace(/\s+/g, ' ');
	return { document, page, content, text };
}

type Pair = [number, number];

/** Ends of every straight line that is a path of its own. */
function lines(content: string): [from: Pair, to: Pair][] {
	const number = '(-?[\\d.]+)';
	const pattern = new RegExp(`${number} ${number} m\\s+${number} ${number} l\\s+S`, 'g');
	return [...content.matchAll(pattern)].map(([, ...ends]) => {
		const [x1, y1, x2, y2] = ends.map(Number) as [number, number, number, number];
		return [
			[x1, y1],
			[x2, y2]
		];
	});
}

describe.each<[Paper, Pair]>([
	// 210 x 297 mm (ISO 216) and 8.5 x 11 in, at 72 points an inch.
	['A4', [595.276, 841.89]],
	['Letter', [612, 792]]
])('on %s', (paper, [width, height]) => {
	test('is one page of that size, with a line of 100 mm', async () => {
		const { document, page, content } = await printed([GEAR], paper);
		expect(document.getPageCount()).toBe(1);
		expect(page.getWidth()).toBeCloseTo(width, 2);
		expect(page.getHeight()).toBeCloseTo(height, 2);
		const level = lines(content).filter(([[, y1], [, y2]]) => y1 === y2);
		// 100 / 25.4 x 72.
		expect(level).toHaveLength(1);
		const [[from], [to]] = level[0]!;
		expect(to - from).toBeCloseTo(283.46, 2);
	});

	test('says what it is for and how it is printed', async () => {
		const { document, text } = await printed([GEAR], paper);
		expect(text).toContain('Comparison aid only.');
		expect(text).toContain('must measure 100 mm');
		expect(text).toContain('100 % or "actual size"');
		expect(text).toContain('isolation procedure');
		expect(text).toContain('no permission to run');
		expect(text).toContain('Mar 4, 2026');
		expect(text).toContain('Module 5, 20°, full depth');
		expect(document.catalog.getViewerPreferences()?.getPrintScaling()).toBe('None');
	});
});

test('holds the outline at 1:1: points an inch times its millimetres', async () => {
	const { content } = await printed([GEAR]);
	const drawing = stripDrawing(GEAR, 210 - 24) as StripDrawing;
	const scales = [...content.matchAll(/(-?[\d.]+) 0 0 (-?[\d.]+) 0 0 cm/g)].map(([, a, d]) => [
		Number(a),
		Number(d)
	]);
	expect(scales).toContainEqual([expect.closeTo(72 / 25.4, 9), expect.closeTo(-72 / 25.4, 9)]);
	const [, firstPair] = /M (\S+ \S+) L/.exec(drawing.path)!;
	const [x, y] = firstPair!.split(' ').map(Number);
	expect(content).toContain(`${x} ${y} m`);
	expect(content.match(/ l\n/g)!.length).toBeGreaterThan(drawing.path.split('L').length - 2);
});

test('speaks Spanish, and a letter that the font lacks does not stop it', async () => {
	const { text } = await printed([{ ...GEAR, label: 'Módulo 5 ⚙ corregido −0.20' }], 'A4', 'es');
	expect(text).toContain('Solo ayuda para comparar.');
	expect(text).toContain('Módulo 5 ? corregido -0.20');
});

test('a gear that cannot be drawn stands there with its reason, beside one that can', async () => {
	const { text, content } = await printed([{ ...GEAR, label: 'Six teeth', teeth: 6 }, GEAR]);
	expect(text).toContain('Six teeth');
	expect(text).toContain('Teeth are drawn from 8 upwards, this gear has 6.');
	expect(content).toMatch(/ cm[^]* l\n/);
});

test('is still one page when there are more gears than room, and says how many it left out', async () => {
	const { document, text } = await printed([10, 11, 12, 14, 16].map((module) => ({ ...GEAR, module })));
	expect(document.getPageCount()).toBe(1);
	expect(text).toMatch(/[2-4] more gears have no room on this page/);
});
