/** The demonstration: made whole through the application's own ways, of all verdicts, and never over other data. */
import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { VERDICTS } from '$lib/gear/contract';
import { firstBrokenAudit } from '$lib/server/audit';
import { readSession, signIn } from '$lib/server/auth/session';
import type { Database, Scope } from '$lib/server/db/client';
import { checkPage, listChecks } from '$lib/server/db/queries/checks';
import { listMachines } from '$lib/server/db/queries/machines';
import { listMaterials } from '$lib/server/db/queries/materials';
import { tabletsLedger } from '$lib/server/db/queries/tablets';
import { fillWithDemo, seedDemo, type DemoSignIn } from '$lib/server/demo/seed';
import { testDatabases } from './fixtures/database';
import { makePlant } from './fixtures/plant';

const { web, owner } = testDatabases();
const NOW = new Date('2026-06-15T08:00:00Z');

/** The demonstration is made in a transaction that is taken back in the end: other tests never see it. */
let demo: Database;
let signIns: DemoSignIn[];
let takeBack = () => {};
let takenBack: Promise<unknown> = Promise.resolve();

beforeAll(async () => {
	await new Promise<void>((ready, failed) => {
		takenBack = owner.db
			.transaction(async (tx) => {
				demo = { db: tx, close: () => Promise.resolve() };
				signIns = await fillWithDemo(tx, NOW);
				const end = new Promise<void>((resolve) => (takeBack = resolve));
				ready();
				await end;
				tx.rollback();
			})
			.catch(failed);
	});
});
afterAll(async () => {
	takeBack();
	await takenBack;
});

async function scopeOf(email: string): Promise<Scope> {
	const entry = signIns.find((one) => one.email === email);
	const answer = await signIn(demo, email, entry?.password ?? '');
	if (!answer.ok) throw new Error(answer.code);
	const session = await readSession(demo, answer.session.id);
	const { plantId, role } = answer.member;
	return { database: demo, plantId, role, personId: session?.person.id ?? '' };
}

test('every sign-in that is printed opens its plant in its role', async () => {
	expect(signIns.length).toBe(8);
	for (const { email, password, role, plant } of signIns) {
		expect(email).toMatch(/^[a-z]+@[a-z]+\.example$/);
		expect(password.length).toBeGreaterThanOrEqual(12);
		const answer = await signIn(demo, email, password);
		if (!answer.ok) throw new Error(`${email}: ${answer.code}`);
		const session = await readSession(demo, answer.session.id);
		expect(session?.memberships.map((m) => [m.plantName, m.role])).toContainEqual([plant, role]);
		expect(session?.memberships.every((m) => m.plantNote === 'Figures are invented demo data.')).toBe(true);
	}
});

test('two plants of about thirty positions and eighty checks show every verdict', async () => {
	const standings = new Set<string>();
	let positions = 0;
	let checks = 0;
	for (const email of ['planner@ashgrove.example', 'planner@kettlehollow.example']) {
		const scope = await scopeOf(email);
		const machines = await listMachines(scope);
		positions += machines.counts.all;
		for (const { standing } of machines.positions) standings.add(standing);
		let cursor: string | null = null;
		do {
			const page: Awaited<ReturnType<typeof listChecks>> = await listChecks(scope, { cursor });
			checks += page.checks.length;
			expect(page.checks.every((check) => check.agrees && check.receivedAt <= NOW)).toBe(true);
			expect(page.checks.every((check) => check.receivedAt >= check.performedAt)).toBe(true);
			cursor = page.next;
		} while (cursor);
		const tablets = await tabletsLedger(scope);
		expect(tablets.map((tablet) => tablet.number)).toEqual([1, 2]);
		expect(tablets.some((tablet) => tablet.waiting > 0 && tablet.missing.length > 0)).toBe(true);
		expect(await firstBrokenAudit(scope)).toBeNull();
	}
	expect(standings).toEqual(new Set([...VERDICTS, 'no-check']));
	expect(positions).toBe(30);
	expect(checks).toBe(80);
});

test('materials name their source, and one that was withdrawn is told by the check that used it', async () => {
	const scope = await scopeOf('supervisor@ashgrove.example');
	const materials = await listMaterials(scope);
	expect(materials.every(({ statement }) => statement.source === 'invented for the demo')).toBe(true);
	expect(materials.filter(({ statement }) => !statement.permitted).map((m) => m.statement.name)).toEqual([
		'Iron, class 20',
		'Moulded nylon'
	]);
	const { checks } = await listChecks(scope, { verdict: 'not-permitted' });
	const page = await checkPage(scope, checks[0]?.id ?? '');
	expect(page?.material?.used).toMatchObject({ revision: 2, statement: { permitted: false } });
});

test('a database that holds something else is left alone', async () => {
	await makePlant(web, owner);
	expect(await seedDemo(process.env['TEST_DATABASE_OWNER_URL'] ?? '')).toEqual([]);
	const demoPlants = await owner.db.execute(sql`select 1 from plants where note like '%demo%'`);
	expect(demoPlants).toHaveLength(0);
	const [here] = await owner.db.execute(sql`select demo from installation`);
	expect(here).toEqual({ demo: false });
});
