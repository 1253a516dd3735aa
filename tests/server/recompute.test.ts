/** Checks of an older core: answered again from what was stored, shown beside what they said, and never changed. */
import { and, eq } from 'drizzle-orm';
import { expect, test } from 'vitest';
import type { Verdict } from '$lib/gear/contract';
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
async function keptByOlderCore(plant: TestPlant, verdict: Verdict, count = 1): Promise<Envelope[]> {
	const tablet = makeTablet();
	const records: Envelope[] = [];
	for (let n = 0; n < count; n++) records.push(await makeRecord(plant, tablet));
	await storeRecords(plant.scope.millwright, pushOf(tablet, records));
	for (const record of records) {
		const { limits: _limits, limitedBy: _limitedBy, ...older } = record.body.outcome;
		const serverOutcome = { ...older, core: '0.0.9', verdict } as typeof record.body.outcome;
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
