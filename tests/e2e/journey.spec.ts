/** The whole way, in small: a measured gear on a tablet without a server, to the planner's page. */
import { expect, lookAt, readyTablet, signIn, tapKeys, test } from './fixtures';
import { doCheck, takeReading } from './steps';

test.afterEach(async ({ server }) => {
	// A test that stopped the server leaves it running for the next, whatever became of it.
	await server.stop();
	await server.start();
});

test('a check is done with the server stopped, survives a killed page, and reaches the planner once', async ({
	page,
	context,
	browser,
	server,
	sql
}) => {
	await lookAt(sql, 'Ashgrove Board Mill');
	await readyTablet(page, 'millwright');
	await page.getByRole('link', { name: /A-117/ }).tap();
	await page.waitForURL('**/tablet/machine/*');
	const machineUrl = page.url();

	await server.stop();
	await expect(fetch(server.origin)).rejects.toThrow();

	// A deep link, loaded afresh.
	await page.goto('about:blank');
	await page.goto(machineUrl);
	await page
		.getByRole('listitem')
		.filter({ hasText: 'Stage 2 pinion' })
		.getByRole('button', { name: 'Start a check' })
		.tap();
	await doCheck(page, {
		teeth: '25',
		outsideDiameter: '5.389',
		faceWidth: '2 1/2',
		gear: /^DP 5, 20°, full depth/,
		power: '7.5',
		speed: '180',
		service: /1\.25/,
		finish: 'cut or milled',
		material: /Steel 1045/
	});

	await expect(page.getByRole('heading', { level: 1, name: /load|Close/ })).toBeVisible();
	await expect(page.getByText(/A screening of tooth strength/)).toBeVisible();
	const margin = await page.locator('.panel dd').first().innerText();
	const checkUrl = page.url().replace('/result', '/keep');
	const id = /check\/([0-9a-f-]{36})/.exec(checkUrl)![1]!;
	await page.getByRole('button', { name: 'Keep this check' }).tap();
	await expect(page.getByRole('heading', { name: 'Kept on this tablet. Waiting to send' })).toBeVisible();

	// The page dies without a word; a new one, still without a server, finds the record.
	const session = await context.newCDPSession(page);
	await Promise.race([session.send('Page.crash').catch(() => null), page.waitForEvent('crash')]);
	const again = await context.newPage();
	await again.goto(`${server.origin}/tablet/kept`);
	await expect(again.getByRole('listitem').getByText('Kept on this tablet. Waiting to send')).toHaveCount(1);
	await expect(again.getByRole('main').getByText('Waiting to send (1)')).toBeVisible();

	await server.start();
	await again.getByRole('button', { name: 'Send now' }).tap();
	await expect(again.getByRole('listitem').getByText(/Received by the plant \d\d:\d\d/)).toBeVisible();
	await expect(again.getByRole('main').getByText('Nothing waits to be sent')).toBeVisible();

	const rows =
		await sql`select id, agrees, envelope, server_outcome, tablet_outcome from checks where id = ${id}`;
	expect(rows).toHaveLength(1);
	expect(rows[0]!.agrees).toBe(true);
	expect(rows[0]!.server_outcome).toEqual(rows[0]!.tablet_outcome);

	// The same record once more, as a tablet would that never got the answer.
	const record = JSON.parse(rows[0]!.envelope as string);
	const answer = await again.evaluate(async (sent) => {
		const response = await fetch('/api/v1/push', {
			method: 'POST',
			headers: { 'content-type': 'application/json', 'x-cogmark': '1' },
			body: JSON.stringify({ tabletId: sent.tabletId, drawn: [], records: [sent] })
		});
		return response.json();
	}, record);
	expect(answer.answers).toMatchObject([{ status: 'duplicate', id, hash: record.hash }]);
	expect(await sql`select 1 from checks where id = ${id}`).toHaveLength(1);

	const office = await browser.newContext({
		viewport: { width: 1440, height: 900 },
		hasTouch: true,
		baseURL: server.origin
	});
	const planner = await office.newPage();
	await signIn(planner, 'planner');
	await planner.goto('/machines?find=A-117');
	const row = planner.getByRole('row').filter({ hasText: 'Stage 2 pinion' });
	await expect(row).toHaveCount(1);
	await expect(row).toContainText(margin);
	await planner.goto(`/checks/${id}`);
	await expect(planner.getByText('Tablet and server agree')).toBeVisible();
	await expect(planner.getByText('2 1/2').first()).toBeVisible();
	await expect(planner.getByText('5.389').first()).toBeVisible();
	await expect(planner.locator('.panel dd').first()).toHaveText(margin);
	await office.close();
});

test('a draft comes back after a killed page with every keystroke', async ({ page, context, server }) => {
	await readyTablet(page, 'millwright');
	await page.getByRole('link', { name: /A-204/ }).tap();
	await page.getByRole('button', { name: 'Start a check' }).first().tap();
	await page.getByLabel(/isolation permit/).fill('LOTO 4711');
	await page.getByRole('link', { name: 'Next: Look' }).tap();
	await page.getByRole('link', { name: 'Next: Measure' }).tap();
	await tapKeys(page, '18');
	await page.getByRole('button', { name: 'Keep this reading' }).tap();
	await tapKeys(page, '4 63');
	await server.stop();
	const session = await context.newCDPSession(page);
	await Promise.race([session.send('Page.crash').catch(() => null), page.waitForEvent('crash')]);

	const again = await context.newPage();
	await again.goto(`${server.origin}/tablet`);
	await again
		.getByRole('link', { name: /A-204.*at Measure/ })
		.first()
		.tap();
	await expect(again.getByRole('heading', { name: 'Outside diameter' })).toBeVisible();
	await expect(again.locator('.box input')).toHaveValue('4 63');
	await again.getByRole('link', { name: 'Before' }).tap();
	await expect(again.getByLabel(/isolation permit/)).toHaveValue('LOTO 4711');
});

test('every step can be visited in any order, and a check with gaps is kept as "cannot say yet"', async ({
	page
}) => {
	await readyTablet(page, 'millwright');
	await page.getByRole('link', { name: /A-131/ }).tap();
	await page.getByRole('button', { name: 'Start a check' }).first().tap();
	await page.getByRole('link', { name: 'Drive', exact: true }).tap();
	await page.getByRole('radio', { name: 'not known' }).tap();
	await page.getByRole('link', { name: 'Measure', exact: true }).tap();
	await page.getByRole('button', { name: 'Cannot measure this' }).tap();
	await page.getByRole('link', { name: 'Result', exact: true }).tap();
	await expect(page.getByRole('heading', { level: 1, name: 'Cannot say yet' })).toBeVisible();
	await expect(page.getByRole('link', { name: 'number of teeth' })).toBeVisible();
	await page.getByRole('button', { name: 'Keep this check' }).tap();
	await expect(page.getByRole('heading', { name: /Received by the plant|Waiting to send/ })).toBeVisible();
});

test('bad input on the keypad names field and remedy and keeps what was typed', async ({ page }) => {
	await readyTablet(page, 'millwright');
	await page.getByRole('link', { name: /A-117/ }).tap();
	await page.getByRole('button', { name: 'Start a check' }).first().tap();
	await page.getByRole('link', { name: 'Measure', exact: true }).tap();
	const keep = page.getByRole('button', { name: 'Keep this reading' });
	await keep.tap();
	await expect(page.getByText('Teeth: type it first.')).toBeVisible();
	await tapKeys(page, '2');
	await keep.tap();
	await expect(page.getByText(/Teeth: at least 4/)).toBeVisible();
	await expect(page.locator('.box input')).toHaveValue('2');
	await tapKeys(page, '5');
	await keep.tap();
	// The record of this position has another count: it is taken once more.
	await takeReading(page, 'Teeth, counted again', '25');

	// A calliper types into the field wherever the focus is, and Enter keeps the reading.
	await expect(page.getByRole('heading', { name: 'Outside diameter' })).toBeVisible();
	await page.keyboard.type('1,250');
	await expect(page.getByText(/A comma can mean two things/)).toBeVisible();
	await page.locator('.box input').fill('5.38.9');
	await page.keyboard.press('Enter');
	await expect(page.getByText(/two points/)).toBeVisible();
	await page.locator('.box input').fill('136.9 mm');
	await page.keyboard.press('Enter');
	// Its unit counts: 136.9 mm are kept as typed, not as inches.
	await expect(page.getByRole('heading', { name: 'Face width' })).toBeVisible();
	await page.goto(page.url().replace(/\?.*/, '?reading=outsideDiameter'));
	await expect(page.locator('.box input')).toHaveValue('136.9 mm');
	await expect(page.getByText('5.3898 in')).toBeVisible();
});

test('signing out keeps what is unsent, and is refused without the server', async ({ page, server }) => {
	await readyTablet(page, 'millwright');
	await page.goto('/tablet/kept');
	await server.stop();
	await page.getByRole('button', { name: /Sign out/ }).tap();
	await expect(page.getByText(/Signing out needs a connection/)).toBeVisible();
	await page.goto('/tablet');
	await expect(page.getByRole('link', { name: /A-117/ })).toBeVisible();
	await page.getByRole('link', { name: /A-150/ }).tap();
	await page.getByRole('button', { name: 'Start a check' }).first().tap();
	await page.getByRole('link', { name: 'Result', exact: true }).tap();
	await page.getByRole('button', { name: 'Keep this check' }).tap();
	await expect(page.getByRole('heading', { name: /Waiting to send/ })).toBeVisible();

	await server.start();
	await page.context().clearCookies();
	await page.goto('/tablet/kept');
	await expect(page.getByRole('main').getByText(/Sign in to send/)).toBeVisible();
	await page.getByRole('button', { name: /Sign out/ }).tap();
	await page.waitForURL('**/sign-in**');

	// Another person signs in; the record goes out under the name of who made it.
	await signIn(page, 'planner', '/tablet/kept');
	await expect(page.getByRole('listitem').getByText(/Received by the plant/)).toBeVisible();
	await page.goto('/checks');
	await expect(page.getByRole('row').filter({ hasText: 'A-150' }).first()).toContainText('Bexley');
});

test('the steps work by keyboard alone', async ({ page }) => {
	await readyTablet(page, 'millwright');
	await page.getByRole('searchbox').focus();
	await page.keyboard.type('a142');
	await page.keyboard.press('Tab');
	await page.keyboard.press('Enter');
	await page.getByRole('button', { name: 'Start a check' }).first().focus();
	await page.keyboard.press('Enter');
	await page.getByLabel(/isolation permit/).waitFor();
	await page.getByRole('link', { name: 'Measure', exact: true }).focus();
	await page.keyboard.press('Enter');
	for (const [title, text] of [
		['Teeth', '56'],
		['Outside diameter', '9.66'],
		['Face width', '2']
	] as const) {
		await page.getByRole('heading', { level: 1, name: title }).waitFor();
		await page.keyboard.type(text);
		await page.keyboard.press('Enter');
	}
	await page.getByRole('button', { name: /^DP 6, 20°/ }).focus();
	await page.keyboard.press('Enter');
	await expect(page.getByRole('button', { name: /^DP 6, 20°/ })).toHaveAttribute('aria-pressed', 'true');
	await page.getByRole('link', { name: 'Choose by hand' }).focus();
	await page.keyboard.press('Enter');
	const form = page.getByRole('radiogroup', { name: 'Pressure angle and form' });
	await form.getByRole('radio').first().focus();
	await page.keyboard.press('ArrowDown');
	await expect(form.getByRole('radio', { name: /14\.5° full depth/ })).toBeFocused();
	await expect(form.getByRole('radio', { name: /14\.5° full depth/ })).toBeChecked();
	await page.keyboard.press('Tab');
	await page.keyboard.press('Tab');
	await expect(page.getByRole('link', { name: 'Next: Drive' })).toBeFocused();
});
