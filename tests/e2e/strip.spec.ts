/** Teeth at true scale: matched to a card, measured in pixels, refused when the screen is another, printed offline. */
import { readFileSync } from 'node:fs';
import AxeBuilder from '@axe-core/playwright';
import { PDFDocument } from '@cantoo/pdf-lib';
import type { Page } from '@playwright/test';
import { expect, readyTablet, test } from './fixtures';

const GEARS = [
	'5.08,25,20,full-depth,0,DP 5, 20°, full depth',
	'5.08,25,14.5,full-depth,0,DP 5, 14.5°, full depth',
	'5,25,20,full-depth,0.21,Module 5, 20°, full depth, shifted +0.21'
];
const BACK = '/tablet/check/01900000-0000-7000-8000-000000000000/which-gear';
const address = (gears: string[]) =>
	`/tablet/strip?${new URLSearchParams([...gears.map((gear) => ['gear', gear]), ['back', BACK]])}`;

const heading = (page: Page, name: string) => page.getByRole('heading', { level: 1, name });
const teeth = (page: Page) => page.getByRole('img', { name: /teeth of .* at true scale/ });

/** From 96 pixels an inch up to six a millimetre. */
async function matchToSix(page: Page): Promise<void> {
	await expect(heading(page, 'Match the screen to a card')).toBeVisible();
	for (let i = 0; i < 23; i++) await page.getByRole('button', { name: 'much larger' }).tap();
	await expect(page.getByText('6.00 pixels per mm')).toBeVisible();
	await page.getByRole('button', { name: 'larger', exact: true }).tap();
	await expect(page.getByText('6.01 pixels per mm')).toBeVisible();
	await page.getByRole('button', { name: 'smaller', exact: true }).tap();
	const card = await page.locator('rect.card').evaluate((rect: SVGRectElement) => {
		const { a } = rect.getScreenCTM()!;
		return [rect.width.baseVal.value * a, rect.height.baseVal.value * a];
	});
	expect(card[0]).toBeCloseTo(85.6 * 6, 1);
	expect(card[1]).toBeCloseTo(53.98 * 6, 1);
	await page.getByRole('button', { name: 'It matches' }).tap();
	await expect(heading(page, 'Teeth at true scale')).toBeVisible();
}

test.afterEach(async ({ server }) => {
	await server.stop();
	await server.start();
});

test('matched to six pixels a millimetre, 50 mm are 300 pixels and the teeth are as large as the gear', async ({
	page
}) => {
	await page.goto(address(GEARS));
	await matchToSix(page);
	await expect(page.getByText('Comparison aid only.')).toBeInViewport();

	const check = page.getByRole('img', { name: 'Check line of 50 mm' });
	expect((await check.boundingBox())!.width).toBeCloseTo(300, 1);
	const line = await check.locator('.check-line').evaluate((one: SVGLineElement) => {
		return one.getTotalLength() * one.getScreenCTM()!.a;
	});
	expect(Math.abs(line - 300)).toBeLessThan(0.5);

	await expect(teeth(page)).toHaveCount(3);
	// Outside diameter of DP 5 with 25 teeth: 27 / 5 in. First tip to last of five teeth: a chord over four pitches.
	const tipRadius = (27 / 5 / 2) * 25.4 * 6;
	const chord = 2 * tipRadius * Math.sin((4 * Math.PI) / 25);
	const drawn = await teeth(page)
		.first()
		.locator('.flanks')
		.evaluate((path: SVGPathElement, radius) => {
			const matrix = path.getScreenCTM()!;
			const pairs = path.getAttribute('d')!.match(/[\d.]+ [\d.]+/g)!;
			const all = pairs.map((pair) => {
				const [x, y] = pair.split(' ').map(Number) as [number, number];
				return new DOMPoint(x, y).matrixTransform(matrix);
			});
			const top = all.reduce((high, one) => (one.y < high.y ? one : high));
			const centre = { x: top.x, y: top.y + radius };
			const atTip = all.filter(
				({ x, y }) => Math.abs(Math.hypot(x - centre.x, y - centre.y) - radius) < 0.02
			);
			const turns = atTip.map(({ x, y }) => Math.atan2(x - centre.x, centre.y - y)).sort((a, b) => a - b);
			// A tip's points lie close together; between two tips there is a gap.
			const tips = turns.reduce<number[][]>((found, turn) => {
				const last = found.at(-1);
				if (last && turn - last.at(-1)! < 0.05) last.push(turn);
				else found.push([turn]);
				return found;
			}, []);
			const middle = (tip: number[]) => (tip[0]! + tip.at(-1)!) / 2;
			const [first, last] = [middle(tips[0]!), middle(tips.at(-1)!)];
			return { tips: tips.length, chord: radius * (Math.sin(last) - Math.sin(first)), scale: matrix.a };
		}, tipRadius);
	expect(drawn.scale).toBeCloseTo(6, 4);
	expect(drawn.tips).toBe(5);
	expect(Math.abs(drawn.chord - chord)).toBeLessThan(0.5);
	// The figure that the core gives for it stands beside it.
	await expect(page.getByText(`First tip to last: ${(chord / 6).toFixed(2)} mm`).first()).toBeVisible();
	const measured = await teeth(page)
		.first()
		.locator('.over-tips')
		.evaluate((one: SVGLineElement) => one.getTotalLength() * one.getScreenCTM()!.a);
	expect(Math.abs(measured - chord)).toBeLessThan(0.5);

	await expect(page.getByRole('link', { name: 'Back to the gears' })).toHaveAttribute('href', BACK);
});

test('another resolution or two fingers, and no teeth are drawn until the screen is matched again', async ({
	page
}) => {
	await page.goto(address(GEARS));
	await matchToSix(page);
	const session = await page.context().newCDPSession(page);
	const screen = { width: 1280, height: 800, screenWidth: 1280, screenHeight: 800, mobile: false };

	await session.send('Emulation.setDeviceMetricsOverride', { ...screen, deviceScaleFactor: 1.5 });
	await expect(page.getByRole('alert')).toContainText('Zoom or resolution differ');
	await expect(teeth(page)).toHaveCount(0);
	await expect(page.getByText('Comparison aid only.')).toBeInViewport();
	await page.reload();
	await expect(page.getByRole('alert')).toContainText('Zoom or resolution differ');

	await session.send('Emulation.setDeviceMetricsOverride', { ...screen, deviceScaleFactor: 1 });
	await expect(teeth(page)).toHaveCount(3);

	await session.send('Emulation.setPageScaleFactor', { pageScaleFactor: 2 });
	await expect(page.getByRole('alert')).toContainText('enlarged by two fingers');
	await expect(page.getByRole('button', { name: 'It matches' })).toBeDisabled();
	await session.send('Emulation.setPageScaleFactor', { pageScaleFactor: 1 });
	await expect(teeth(page)).toHaveCount(3);

	await session.send('Emulation.setDeviceMetricsOverride', {
		...screen,
		screenWidth: 1920,
		screenHeight: 1080,
		deviceScaleFactor: 1
	});
	await page.reload();
	await expect(page.getByRole('alert')).toContainText('another screen');
	await expect(teeth(page)).toHaveCount(0);
	await page.getByRole('button', { name: 'It matches' }).tap();
	await expect(teeth(page)).toHaveCount(3);
});

test('a page to print is made with the server stopped', async ({ page, server }) => {
	await readyTablet(page, 'millwright');
	await server.stop();
	await page.goto(address(GEARS));
	await page.getByRole('radio', { name: 'A4' }).tap();
	await page.getByRole('button', { name: 'Make the page' }).tap();
	const started = page.waitForEvent('download');
	await page.getByRole('link', { name: 'Download it' }).tap();
	const download = await started;
	expect(download.suggestedFilename()).toBe('teeth-at-true-scale-A4.pdf');
	await download.saveAs('test-results/looks/tablet-strip-A4.pdf');
	const document = await PDFDocument.load(readFileSync('test-results/looks/tablet-strip-A4.pdf'));
	expect(document.getPageCount()).toBe(1);
	expect(document.getPage(0).getWidth()).toBeCloseTo(595.28, 1);
	// Another paper is another page.
	await page.getByRole('radio', { name: 'Letter' }).tap();
	await expect(page.getByRole('button', { name: 'Make the page' })).toBeVisible();
});

test('a gear that cannot be read is named, one that cannot be drawn has its reason', async ({ page }) => {
	await page.goto(
		address(['5,many,20,full-depth,0,Typed wrong', '5,6,20,full-depth,0,Six teeth', GEARS[0]!])
	);
	await expect(page.getByRole('alert')).toContainText('Typed wrong (number of teeth)');
	await page.getByRole('button', { name: 'It matches' }).tap();
	await expect(page.getByText('Teeth are drawn from 8 upwards, this gear has 6. Count again.')).toBeVisible();
	await expect(teeth(page)).toHaveCount(1);

	await page.goto('/tablet/strip?back=https://elsewhere.example/tablet/');
	await expect(page.getByText('There is no gear to draw.')).toBeVisible();
	await expect(page.getByRole('link', { name: 'All machines' })).toHaveAttribute('href', '/tablet');
});

test('a gear wider than the screen keeps its size and is scrolled', async ({ page }) => {
	await page.goto(address(['25.4,30,20,full-depth,0,DP 1, 20°, full depth']));
	await matchToSix(page);
	const view = page.getByRole('region', { name: 'Gears at true scale' });
	expect((await teeth(page).boundingBox())!.width).toBeGreaterThan((await view.boundingBox())!.width);
	const from = await view.evaluate((one) => one.scrollLeft);
	expect(from).toBeGreaterThan(0);
	await page.getByRole('button', { name: 'To the left' }).tap();
	await expect.poll(() => view.evaluate((one) => one.scrollLeft)).toBeLessThan(from);
});

test('how it looks, and axe', async ({ page }) => {
	test.setTimeout(180_000);
	await page.goto(address(GEARS));
	const looks = async (name: string, ready: () => Promise<void>) => {
		for (const theme of ['day', 'night'] as const) {
			for (const [shape, width, height] of [
				['landscape', 1280, 800],
				['portrait', 800, 1280],
				['small', 1024, 768],
				['phone', 390, 844]
			] as const) {
				await page.setViewportSize({ width, height });
				await ready();
				await page.evaluate((to) => {
					if (to === 'night') document.documentElement.dataset.theme = 'night';
					else delete document.documentElement.dataset.theme;
				}, theme);
				const wide = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth);
				expect.soft(wide, `${name} at ${width} is ${wide} px too wide`).toBeLessThanOrEqual(0);
				const path = `test-results/looks/${name}-${theme}-${shape}.png`;
				await page.screenshot({ path, fullPage: true });
				if (shape !== 'landscape') continue;
				const { violations } = await new AxeBuilder({ page })
					.withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'])
					.analyze();
				expect.soft(violations.map(({ id, nodes }) => `${id} ${nodes.map((node) => node.html)}`)).toEqual([]);
			}
		}
	};
	/** As a tablet of 5.6 px/mm would have kept it, for whatever screen the picture is taken on. */
	const matched = (title: string) => async () => {
		await page.evaluate(() => {
			const kept = {
				pxPerMm: 5.6,
				devicePixelRatio,
				screenWidth: screen.width,
				screenHeight: screen.height,
				date: '2026-03-04T12:00:00.000Z'
			};
			localStorage.setItem('cogmark-strip', JSON.stringify(kept));
		});
		await page.reload();
		await expect(heading(page, title)).toBeVisible();
	};
	await looks('tablet-strip-match', async () => {
		await expect(heading(page, 'Match the screen to a card')).toBeVisible();
	});
	await looks('tablet-strip', matched('Teeth at true scale'));
	await page.getByRole('button', { name: 'Español' }).tap();
	await looks('tablet-strip-es', matched('Dientes a tamaño real'));
	await page.getByRole('button', { name: 'Ajustar otra vez' }).tap();
	await looks('tablet-strip-match-es', async () => {
		await expect(heading(page, 'Ajuste la pantalla a una tarjeta')).toBeVisible();
	});
});
