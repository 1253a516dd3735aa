/**
 * The strip on paper: one printable page, made on this device with no network. Outlines and check line are 1:1 when
 * the print is made at actual size, and the page tells how to see whether it was.
 */
import type { PDFFont, PDFPage } from '@cantoo/pdf-lib';
import type { Reason } from '$lib/gear/contract';
import { stripDrawing, type StripDrawing, type StripGear } from './strip-gear';

export type Paper = 'A4' | 'Letter';

/** All that is written on the page, in the language of whoever prints it. */
export interface PdfWords {
	title: string;
	date: string;
	aid: string;
	printing: string;
	check: string;
	caution: string;
	caption(drawing: StripDrawing): string;
	refused(reason: Reason): string;
	/** Of gears that the page has no room for. */
	leftOut(gears: number): string;
}

/** mm. */
const PAPERS: Record<Paper, { width: number; height: number }> = {
	A4: { width: 210, height: 297 },
	Letter: { width: 215.9, height: 279.4 }
};
const MARGIN = 12;
const CHECK_LENGTH = 100;
const POINTS_PER_MM = 72 / 25.4;
/** Line height by type size. */
const LEADING = 1.25;
/** mm between gears, and of the line that says what was left out: kept free until the end. */
const GAP = 5;
const LEFT_OUT = 8;

type Library = typeof import('@cantoo/pdf-lib');

interface Sheet {
	library: Library;
	page: PDFPage;
	width: number;
	height: number;
	plain: PDFFont;
	bold: PDFFont;
	/** How far down the page is written, mm. */
	down: number;
}

/** The page as a file. Never throws for a gear: one that cannot be drawn stands there with its reason. */
export async function stripPdf(
	gears: readonly StripGear[],
	words: PdfWords,
	paper: Paper,
	madeAt: Date
): Promise<Uint8Array> {
	const library = await import('@cantoo/pdf-lib');
	const { PDFDocument, PrintScaling, StandardFonts } = library;
	const document = await PDFDocument.create();
	document.setTitle(words.title);
	document.setCreationDate(madeAt);
	document.setModificationDate(madeAt);
	// Asks the print dialog for actual size; one that does not listen is found out by the check line.
	document.catalog.getOrCreateViewerPreferences().setPrintScaling(PrintScaling.None);
	const { width, height } = PAPERS[paper];
	const sheet: Sheet = {
		library,
		page: document.addPage([width * POINTS_PER_MM, height * POINTS_PER_MM]),
		width,
		height,
		plain: await document.embedFont(StandardFonts.Helvetica),
		bold: await document.embedFont(StandardFonts.HelveticaBold),
		down: MARGIN
	};

	const foot = paragraph(sheet, words.caution, { size: 9 });
	const bottom = height - MARGIN - foot.height;
	write(sheet, foot, bottom);

	next(sheet, words.title, { size: 20, bold: true });
	next(sheet, words.date, { size: 10 });
	next(sheet, words.aid, { size: 12, bold: true });
	next(sheet, words.printing, { size: 10 });
	checkLine(sheet, words.check);

	let leftOut = 0;
	for (const gear of gears) {
		if (!drawGear(sheet, gear, words, bottom - LEFT_OUT)) leftOut += 1;
	}
	if (leftOut > 0) next(sheet, words.leftOut(leftOut), { size: 10, bold: true });
	return document.save();
}

/** False where the gear has no room above `bottom`: nothing is drawn then. */
function drawGear(sheet: Sheet, gear: StripGear, words: PdfWords, bottom: number): boolean {
	const drawing = stripDrawing(gear, sheet.width - 2 * MARGIN);
	const refused = 'code' in drawing;
	const label = paragraph(sheet, gear.label, { size: 12, bold: true });
	const said = refused ? words.refused(drawing) : words.caption(drawing);
	const caption = paragraph(sheet, said, { size: 10 });
	const needed = GAP + label.height + caption.height + (refused ? 0 : 2 + drawing.height);
	if (sheet.down + needed > bottom) return false;
	write(sheet, label, sheet.down + GAP);
	write(sheet, caption, sheet.down + GAP + label.height);
	sheet.down += needed;
	if (!refused) outline(sheet, drawing, sheet.down - drawing.height);
	return true;
}

interface Style {
	/** Points. */
	size: number;
	bold?: boolean;
}

interface Paragraph extends Style {
	lines: string[];
	/** mm. */
	height: number;
}

function paragraph({ library, width, plain, bold }: Sheet, text: string, style: Style): Paragraph {
	const font = style.bold ? bold : plain;
	const most = (width - 2 * MARGIN) * POINTS_PER_MM;
	const lines = library.breakTextIntoLines(printable(text, font), [' '], most, (part) =>
		font.widthOfTextAtSize(part, style.size)
	);
	return { ...style, lines, height: (lines.length * style.size * LEADING) / POINTS_PER_MM };
}

function write({ page, height, ...fonts }: Sheet, { lines, size, bold }: Paragraph, down: number): void {
	lines.forEach((line, i) =>
		page.drawText(line, {
			x: MARGIN * POINTS_PER_MM,
			y: (height - down) * POINTS_PER_MM - size - i * size * LEADING,
			size,
			font: bold ? fonts.bold : fonts.plain
		})
	);
}

function next(sheet: Sheet, text: string, style: Style): void {
	const written = paragraph(sheet, text, style);
	write(sheet, written, sheet.down);
	sheet.down += written.height + 1;
}

/** The standard fonts of a PDF know Western letters only; what they do not know must not stop the page. */
function printable(text: string, font: PDFFont): string {
	const known = new Set(font.getCharacterSet());
	return [...text.replaceAll('\u2212', '-')]
		.map((letter) => (known.has(letter.codePointAt(0) ?? 0) ? letter : '?'))
		.join('');
}

/** 100 mm with a stroke at each 10 mm, the longer ones at its ends. */
function checkLine(sheet: Sheet, words: string): void {
	const { page, height } = sheet;
	const at = sheet.down + 8;
	const point = (x: number, down: number) => ({
		x: (MARGIN + x) * POINTS_PER_MM,
		y: (height - down) * POINTS_PER_MM
	});
	for (let x = 0; x <= CHECK_LENGTH; x += 10) {
		const tick = x % CHECK_LENGTH === 0 ? 5 : 2.5;
		page.drawLine({ start: point(x, at - tick), end: point(x, at), thickness: 0.5 });
	}
	page.drawLine({ start: point(0, at), end: point(CHECK_LENGTH, at), thickness: 0.5 });
	sheet.down = at + 1.5;
	next(sheet, words, { size: 10, bold: true });
}

/** In the middle of the page; a gear that is wider than the paper is cut at its margins and stays 1:1. */
function outline({ library, page, width, height }: Sheet, drawing: StripDrawing, down: number): void {
	const { clip, endPath, popGraphicsState, pushGraphicsState, rectangle, rgb } = library;
	const inner = (width - 2 * MARGIN) * POINTS_PER_MM;
	page.pushOperators(
		pushGraphicsState(),
		rectangle(MARGIN * POINTS_PER_MM, 0, inner, height * POINTS_PER_MM),
		clip(),
		endPath()
	);
	page.drawSvgPath(drawing.path, {
		x: ((width - drawing.width) / 2) * POINTS_PER_MM,
		y: (height - down) * POINTS_PER_MM,
		scale: POINTS_PER_MM,
		color: rgb(0.88, 0.89, 0.88),
		borderColor: rgb(0, 0, 0),
		borderWidth: 0.15
	});
	page.pushOperators(popGraphicsState());
}
