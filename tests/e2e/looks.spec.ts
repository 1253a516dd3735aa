/** Every screen of this version under axe, in both orientations, themes and languages; pictures for looking at. */
import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { expect, lookAt, readyTablet, signIn, test } from './fixtures';
import { doCheck } from './steps';

async function isClean(page: Page): Promise<void> {
	const { violations } = await new AxeBuilder({ page })
		.withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'])
		.analyze();
	const found = violations.map(
		({ id, impact, nodes }) => `${impact} ${id}: ${nodes.map(({ target }) => target.join(' ')).join(', ')}`
	);
	expect.soft(found, page.url()).toEqual([]);
}

/** Nothing may be cut off sideways. */
async function fitsAcross(page: Page): Promise<void> {
	const wide = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth);
	expect
		.soft(wide, `${page.url()} at ${page.viewportSize()?.width} is ${wide} px too wide`)
		.toBeLessThanOrEqual(0);
}

const SHAPES = [
	['landscape', 1280, 800],
	['portrait', 800, 1280],
	['small', 1024, 768],
	['phone', 390, 844]
] as const;

async function everyWay(page: Page, name: string): Promise<void> {
	for (const theme of ['day', 'night'] as const) {
		await page.evaluate((to) => {
			if (to === 'night') document.documentElement.dataset.theme = 'night';
			else delete document.documentElement.dataset.theme;
		}, theme);
		// What fits by day fits by night: the colours are looked at in the size that tablets have.
		for (const [shape, width, height] of theme === 'day' ? SHAPES : SHAPES.slice(0, 1)) {
			await page.setViewportSize({ width, height });
			await fitsAcross(page);
			await page.screenshot({ path: `test-results/looks/${name}-${theme}-${shape}.png`, fullPage: true });
		}
		await page.setViewportSize({ width: 1280, height: 800 });
		await isClean(page);
	}
	await page.evaluate(() => delete document.documentElement.dataset.theme);
}

test('door and offline page', async ({ page }) => {
	await page.goto('/sign-in');
	await everyWay(page, 'sign-in');
	await page.goto('/offline');
	await everyWay(page, 'offline');
});

test('the tablet, every step', async ({ page }) => {
	test.setTimeout(300_000);
	await readyTablet(page, 'millwright');
	await everyWay(page, 'tablet-machines');
	await page.getByRole('link', { name: /A-204/ }).tap();
	await page.getByRole('button', { name: 'Start a check' }).first().waitFor();
	await everyWay(page, 'tablet-machine');
	await page.getByRole('button', { name: 'Start a check' }).first().tap();
	await page.waitForURL('**/before');
	await everyWay(page, 'tablet-before');
	const base = page.url().replace('/before', '');
	await doCheck(page, {
		teeth: '18',
		outsideDiameter: '4 63/64',
		faceWidth: '2 1/2',
		gear: /^DP 4, 14\.5°, full depth/,
		power: '10',
		speed: '220',
		service: /1\.25/,
		finish: 'cut or milled',
		material: /class 30/
	});
	await expect(page.getByRole('heading', { level: 1, name: 'Will not carry the load' })).toBeVisible();
	for (const step of [
		'machine',
		'look',
		'measure?reading=teeth',
		'measure?reading=outsideDiameter',
		'measure?reading=span-3',
		'measure?reading=wholeDepth',
		'which-gear',
		'which-gear?reading=by-hand',
		'drive?reading=load',
		'drive?reading=speed',
		'drive?reading=service',
		'spare',
		'result',
		'keep'
	]) {
		await page.goto(`${base}/${step}`);
		await page.locator('main h1, main .panel').first().waitFor();
		await everyWay(page, `tablet-${step.replace(/\W+/g, '-')}`);
	}
	await page.goto(`${base}/result`);
	await page.getByRole('button', { name: /Working/ }).tap();
	await everyWay(page, 'tablet-working');
	await page.getByRole('button', { name: 'Español' }).tap();
	await expect(page.getByRole('heading', { level: 1, name: 'No soporta la carga' })).toBeVisible();
	await everyWay(page, 'tablet-result-es');
	await page.getByRole('button', { name: 'English' }).tap();
	await page.goto('/tablet/kept');
	await everyWay(page, 'tablet-kept');
});

test('the office, every page', async ({ page, sql }) => {
	test.setTimeout(300_000);
	await page.setViewportSize({ width: 1440, height: 900 });
	await lookAt(sql, 'Ashgrove Board Mill');
	await signIn(page, 'supervisor');
	const [check] = await sql`
		select id from checks where server_outcome->>'verdict' = 'will-not-carry' order by seq desc limit 1`;
	const [machine] = await sql`select id from machines where tag = 'A-117'`;
	const [material] = await sql`select id from materials limit 1`;
	for (const [name, path] of [
		['machines', '/machines'],
		['machines-none', '/machines?find=nothing-like-this'],
		['machine', `/machines/${machine!.id}`],
		['checks', '/checks'],
		['check', `/checks/${check!.id}`],
		['materials', '/materials'],
		['rules', '/rules'],
		['material', `/materials/${material!.id}`],
		['missing', '/machines/01900000-0000-7000-8000-000000000000']
	] as const) {
		await page.goto(path);
		await everyWay(page, `office-${name}`);
		await page.setViewportSize({ width: 1440, height: 900 });
		await page.screenshot({ path: `test-results/looks/office-${name}-1440.png` });
	}
});
