/** The plant's tools: what the supervisor states is what the millwright sees and what the candidates are weighed by. */
import { expect, readyTablet, signIn, test } from './fixtures';
import { measure } from './steps';

test('a coarser calliper reaches the tablet, and leaves more gears standing', async ({
	page,
	browser,
	server
}) => {
	await readyTablet(page, 'metricMillwright');
	await page
		.getByRole('listitem')
		.filter({ hasText: /[A-Z]+-\d+/ })
		.first()
		.getByRole('link')
		.tap();
	await page.getByRole('button', { name: 'Start a check' }).first().tap();
	await page.getByRole('link', { name: 'Measure', exact: true }).tap();
	await page.waitForURL('**/measure');
	const base = page.url().replace(/\/measure.*/, '');
	await measure(page, { teeth: '20', outsideDiameter: '110', faceWidth: '40' });
	const count = () =>
		page.getByRole('list', { name: 'Gears that fit the readings' }).getByRole('button').count();
	const before = await count();

	const office = await browser.newContext({
		viewport: { width: 1440, height: 900 },
		hasTouch: true,
		baseURL: server.origin
	});
	const supervisor = await office.newPage();
	await signIn(supervisor, 'metricSupervisor');
	await supervisor.goto('/rules');
	const calliper = supervisor.locator('input[name=calliper]');
	await calliper.fill('0,5');
	await supervisor.locator('form:has(input[name=calliper]) button[type=submit]').click();
	await expect(supervisor.getByRole('alert')).toBeVisible();
	await expect(calliper).toHaveValue('0,5');
	await calliper.fill('3');
	await supervisor.locator('form:has(input[name=calliper]) button[type=submit]').click();
	await supervisor.waitForURL('**/rules?kept=*');
	await expect(supervisor.getByRole('status')).toBeVisible();

	await page.goto(`${base}/measure?reading=outsideDiameter`);
	await expect(page.locator('summary').filter({ hasText: 'good to 3 mm' })).toBeVisible({ timeout: 40_000 });
	await page.goto(`${base}/which-gear`);
	await page.getByRole('button', { name: /more, \d+ % together/ }).tap();
	expect(await count()).toBeGreaterThan(before);

	// As it was, for the tests that follow.
	await supervisor.goto('/rules');
	await calliper.fill('');
	await supervisor.locator('form:has(input[name=calliper]) button[type=submit]').click();
	await supervisor.waitForURL('**/rules?kept=*');
	await office.close();
});
