/** The supervisor's list decides on the tablet: a material that loses its permission is refused after the next pull. */
import { expect, lookAt, readyTablet, signIn, test } from './fixtures';
import { doCheck } from './steps';

test('a withdrawn material gives "not permitted" on the tablet after the next pull, and old records keep theirs', async ({
	page,
	browser,
	server,
	sql
}) => {
	await lookAt(sql, 'Kettle Hollow Lime Works');
	await readyTablet(page, 'metricMillwright');

	const office = await browser.newContext({
		viewport: { width: 1440, height: 900 },
		hasTouch: true,
		baseURL: server.origin
	});
	const supervisor = await office.newPage();
	await signIn(supervisor, 'metricSupervisor');
	await supervisor.goto('/materials');
	await supervisor.getByRole('link', { name: /1045/ }).first().click();
	await supervisor.waitForURL('**/materials/*');
	const materialId = supervisor.url().split('/').at(-1)!;
	const before =
		await sql`select revision from material_revisions where material_id = ${materialId} order by revision`;

	// Without a source nothing is taken, and nothing typed is lost.
	await supervisor.locator('input[name=source]').fill('');
	await supervisor.locator('input[name=basis]').fill('half of the tensile strength');
	await supervisor.locator('form:has(input[name=source]) button[type=submit]').click();
	await expect(supervisor.getByText(/fuente|Source/i).first()).toBeVisible();
	await expect(supervisor.locator('input[name=basis]')).toHaveValue('half of the tensile strength');
	expect(await sql`select 1 from material_revisions where material_id = ${materialId}`).toHaveLength(
		before.length
	);

	await supervisor.locator('input[name=source]').fill('plant test report 12');
	await supervisor.locator('select[name=permitted]').selectOption('no');
	await supervisor.locator('form:has(input[name=source]) button[type=submit]').click();
	await expect
		.poll(
			async () =>
				(await sql`select revision from material_revisions where material_id = ${materialId}`).length
		)
		.toBe(before.length + 1);

	// The tablet hears of it by its own pull, also in the middle of a check.
	await page.goto('/tablet');
	await page
		.getByRole('listitem')
		.filter({ hasText: /[A-Z]+-\d+/ })
		.first()
		.getByRole('link')
		.tap();
	await page.getByRole('button', { name: 'Start a check' }).first().tap();
	await doCheck(page, {
		teeth: '24',
		outsideDiameter: '104',
		faceWidth: '40',
		gear: /^Module 4, 20°, full depth/,
		power: '5.5',
		speed: '300',
		service: /1\.25/,
		finish: 'cut or milled',
		material: /1045/
	});
	await expect(page.getByRole('heading', { level: 1, name: 'Material not permitted here' })).toBeVisible();
	await page.getByRole('button', { name: 'Keep this check' }).tap();
	await expect(page.getByRole('heading', { name: /Received by the plant/ })).toBeVisible();
	const id = /check\/([0-9a-f-]{36})/.exec(page.url())![1]!;
	const [row] = await sql`select agrees, server_outcome->>'verdict' as verdict from checks where id = ${id}`;
	expect(row).toEqual({ agrees: true, verdict: 'not-permitted' });

	// What was recorded with the earlier revision stays as it was.
	await supervisor.goto(`/checks/${id}`);
	await expect(supervisor.locator('.panel')).toBeVisible();
	await office.close();
});
