/** What the browser tests share: the server, the demo's people, and signing in. */
import { test as base, expect, type Page } from '@playwright/test';
import postgres from 'postgres';
import { Server } from './server';

export { expect };

/** Accounts of the demo seed (src/lib/server/demo): e-mail and invented password. */
export const PEOPLE = {
	millwright: ['millwright@ashgrove.example', 'paper-tag-brass-eyelet'],
	planner: ['planner@ashgrove.example', 'index-card-long-drawer'],
	supervisor: ['supervisor@ashgrove.example', 'ink-stamp-green-enamel'],
	metricMillwright: ['millwright@kettlehollow.example', 'kiln-brick-steel-rule'],
	metricSupervisor: ['supervisor@kettlehollow.example', 'lime-burner-third-shift']
} as const;

interface Worker {
	server: Server;
	/** The owner's connection, to look at rows as they are, one plant at a time: see `lookAt`. */
	sql: postgres.Sql;
}

export const test = base.extend<object, Worker>({
	server: [
		// eslint-disable-next-line no-empty-pattern -- Playwright reads the names of the first argument
		async ({}, use) => {
			const server = await Server.create();
			await server.start();
			await use(server);
			await server.stop();
		},
		{ scope: 'worker' }
	],
	sql: [
		// eslint-disable-next-line no-empty-pattern -- as above
		async ({}, use) => {
			const sql = postgres(process.env.E2E_DATABASE_OWNER_URL ?? '', { max: 1 });
			await use(sql);
			await sql.end();
		},
		{ scope: 'worker' }
	],
	baseURL: async ({ server }, use) => use(server.origin)
});

/** The owner too sees no plant's rows before naming the plant. */
export async function lookAt(sql: postgres.Sql, plant: string): Promise<void> {
	const [row] = await sql`select id from plants where name = ${plant}`;
	await sql`select set_config('app.plant', ${row!.id}, false)`;
}

export async function signIn(page: Page, who: keyof typeof PEOPLE, next = ''): Promise<void> {
	await page.goto(`/sign-in${next ? `?next=${next}` : ''}`);
	const [email, password] = PEOPLE[who];
	await page.locator('input[name=email]').fill(email);
	await page.locator('input[name=password]').fill(password);
	await page.locator('form:has(input[name=password]) button[type=submit]').tap();
	await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
}

/** A tablet that can go offline: signed in, rows pulled, the worker in charge of the page. */
export async function readyTablet(page: Page, who: keyof typeof PEOPLE): Promise<void> {
	await signIn(page, who, '/tablet');
	await page.waitForURL('**/tablet');
	await expect(
		page
			.getByRole('listitem')
			.filter({ hasText: /[A-Z]+-\d+/ })
			.first()
	).toBeVisible();
	await page.evaluate(() => navigator.serviceWorker.ready);
	await expect(page.getByText(/Last heard from the plant/)).toBeVisible();
	// The first page was loaded before the worker took over.
	await page.reload();
	await page.waitForFunction(() => navigator.serviceWorker.controller !== null);
}

/** Types on the own keypad, by touch. */
export async function tapKeys(page: Page, text: string): Promise<void> {
	const keys = text.match(/\/\d+| |./g) ?? [];
	for (const key of keys) {
		await page
			.locator('.pad')
			.getByRole('button', { name: key === ' ' ? /^(and|y)/ : key, exact: true })
			.tap();
	}
}
