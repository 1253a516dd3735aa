/** Checks of an older core: answered again from what was stored, shown beside what they said, and never changed. */
import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { and, eq } from 'drizzle-orm';
import { describe, expect, test } from 'vitest';
import type { Outcome, Verdict } from '$lib/gear/contract';
import { CORE_VERSION } from '$lib/gear/version';
import type { Envelope } from '$lib/records/envelope';
import { reviseMaterial } from '$lib/server/commands/materials';
import { storeRecords } from '$lib/server/commands/records';
import { asOwner } from '$lib/server/db/client';
import { recomputedCheck, recomputedChecks } from '$lib/server/db/queries/recompute';
import { checks } from '$lib/server/db/schema/checks';
import { testDatabases } from './fixtures/database';
import { makePlant, testMaterial, type TestPlant } from './fixtures/plant';
import { makeRecord, makeTablet, pushOf } from './fixtures/record';

const { web, owner } = testDatabases();

/** Stores checks, then makes the rows look as if an older core had computed them. */
async function keptByOlderCore(
	plant: TestPlant,
	verdict: Verdict,
	count = 1,
	bendingMargin?: number
): Promise<Envelope[]> {
	const tablet = makeTablet();
	const records: Envelope[] = [];
	for (let n = 0; n < count; n++) records.push(await makeRecord(plant, tablet));
	await storeRecords(plant.scope.millwright, pushOf(tablet, records));
	for (const record of records) {
		const { limits: _limits, limitedBy: _limitedBy, ...older } = record.body.outcome;
		const margin = bendingMargin ?? older.bendingMargin;
		const serverOutcome = { ...older, core: '0.0.9', verdict, bendingMargin: margin } as Outcome;
		await asOwner(owner, plant.id, (tx) =>
			tx
				.update(checks)
				.set({ serverCore: '0.0.9', serverOutcome, verdict })
				.where(and(eq(checks.plantId, plant.id), eq(checks.id, record.id)))
		);
	}
	return records;
}

const rowsOf = (plant: TestPlant) =>
	asOwner(owner, plant.id, (tx) => tx.select().from(checks).where(eq(checks.plantId, plant.id)));

test('a check of this core needs none', async () => {
	const plant = await makePlant(web, owner);
	const tablet = makeTablet();
	const record = await makeRecord(plant, tablet);
	await storeRecords(plant.scope.millwright, pushOf(tablet, [record]));
	expect(await recomputedCheck(plant.scope.planner, record.id)).toBeNull();
	expect(await recomputedChecks(plant.scope.planner, 0)).toEqual({ checks: [], next: null });
});

test('an older one is answered from its own material and rules, and nothing is written', async () => {
	const plant = await makePlant(web, owner);
	const [record] = await keptByOlderCore(plant, 'carries');
	if (!record) throw new Error('a record was needed');
	// A later revision of the material is not what the check was made with.
	const weaker = testMaterial('weaker', { allowableBending: { value: 10, unit: 'psi' } });
	await reviseMaterial(plant.scope.supervisor, {
		id: plant.materialId,
		expectedRevision: 1,
		statement: weaker
	});
	const before = await rowsOf(plant);
	const found = await recomputedCheck(plant.scope.planner, record.id);
	expect(found?.was).toMatchObject({ core: '0.0.9', verdict: 'carries' });
	expect(found?.now.core).toBe(CORE_VERSION);
	expect(found?.now.bendingMargin).toBe(record.body.outcome.bendingMargin);
	expect(found?.now.limits).toEqual(record.body.outcome.limits);
	expect(found?.changed).toBe(record.body.outcome.verdict !== 'carries');
	expect(await rowsOf(plant)).toEqual(before);
});

test('another verdict than then is told, page by page over more than one page', async () => {
	const plant = await makePlant(web, owner);
	const records = await keptByOlderCore(plant, 'not-permitted', 3);
	const first = await recomputedChecks(plant.scope.planner, 0);
	expect(first.checks.map(({ id, changed }) => [id, changed])).toEqual(records.map(({ id }) => [id, true]));
	const rest = await recomputedChecks(plant.scope.planner, first.checks[0]?.seq ?? NaN);
	expect(rest.checks.map(({ id }) => id)).toEqual(records.slice(1).map(({ id }) => id));
});

test("another plant's checks are not there", async () => {
	const [plant, other] = [await makePlant(web, owner), await makePlant(web, owner)];
	const [record] = await keptByOlderCore(plant, 'carries');
	expect(await recomputedCheck(other.scope.supervisor, record?.id ?? '')).toBeNull();
	expect((await recomputedChecks(other.scope.supervisor, 0)).checks).toEqual([]);
});

describe('the command for the operator', () => {
	const root = fileURLToPath(new URL('../..', import.meta.url));

	/** A real process on the tests' database, as `npm run -s recompute` starts it. */
	function recompute(...args: string[]) {
		const { status, stdout, stderr } = spawnSync(process.execPath, ['scripts/recompute.mjs', ...args], {
			cwd: root,
			encoding: 'utf8',
			maxBuffer: 2 ** 26,
			env: {
				...process.env,
				DATABASE_URL: process.env['TEST_DATABASE_URL'],
				DATABASE_OWNER_URL: process.env['TEST_DATABASE_OWNER_URL']
			}
		});
		return { status, stderr, lines: stdout.trimEnd().split('\n') };
	}

	interface Line {
		plant?: { id: string; name: string };
		check?: string;
		summary?: Record<string, unknown>;
	}
	/** Other test files fill the same database: only the lines of one's own plants tell anything. */
	const linesOf = (plant: TestPlant, lines: string[]) =>
		lines.map((line) => JSON.parse(line) as Line).filter((line) => line.plant?.id === plant.id);

	test('prints what changed in each plant, leaves out what did not, and writes nothing', async () => {
		const [plant, other] = [await makePlant(web, owner), await makePlant(web, owner)];
		const [verdict] = await keptByOlderCore(plant, 'not-permitted');
		if (!verdict) throw new Error('a record was needed');
		const { verdict: now, bendingMargin } = verdict.body.outcome;
		const [margin] = await keptByOlderCore(other, now, 1, 0.25);
		const [same] = await keptByOlderCore(other, now);
		const before = [await rowsOf(plant), await rowsOf(other)];

		const json = recompute('--json');
		expect(json).toMatchObject({ status: 0, stderr: '' });
		expect(linesOf(plant, json.lines)).toEqual([
			{
				plant: { id: plant.id, name: plant.name },
				check: verdict.id,
				was: { core: '0.0.9', verdict: 'not-permitted', bendingMargin },
				now: { core: CORE_VERSION, verdict: now, bendingMargin },
				verdictChanged: true,
				marginChanged: false
			}
		]);
		expect(linesOf(other, json.lines)).toMatchObject([
			{
				check: margin?.id,
				was: { bendingMargin: 0.25 },
				now: { bendingMargin },
				verdictChanged: false,
				marginChanged: true
			}
		]);
		const { summary } = JSON.parse(json.lines.at(-1) ?? '') as Line;
		expect(summary).toMatchObject({ core: CORE_VERSION });

		const text = recompute();
		expect(text).toMatchObject({ status: 0, stderr: '' });
		const line = (id: string | undefined) => text.lines.find((printed) => printed.includes(String(id)));
		expect(line(verdict.id)).toContain(
			`${plant.name}  ${verdict.id}  core 0.0.9 -> ${CORE_VERSION}  VERDICT not-permitted -> ${now}`
		);
		expect(line(margin?.id)).toMatch(`verdict ${now}, the same  bending margin 0.25 -> `);
		expect(line(same?.id)).toBeUndefined();
		expect(text.lines.at(-1)).toMatch(/^Plants: \d+\. Checks of another core than /);
		expect([await rowsOf(plant), await rowsOf(other)]).toEqual(before);
	});

	test('goes on after the first batch', async () => {
		const plant = await makePlant(web, owner);
		const records = await keptByOlderCore(plant, 'not-permitted', 201);
		const found = linesOf(plant, recompute('--json').lines).map(({ check }) => check);
		expect(found).toEqual(records.map(({ id }) => id));
	});
});
