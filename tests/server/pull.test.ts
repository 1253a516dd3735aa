/** Pull: a mirror built page by page is the plant's rows, whatever is written meanwhile, and starts anew when it must. */
import { asc, eq } from 'drizzle-orm';
import { expect, test } from 'vitest';
import { newId } from '$lib/records/ids';
import type { MirrorChange } from '$lib/records/mirror';
import { pullResponse, type PullResponse } from '$lib/records/protocol';
import { reviseMaterial } from '$lib/server/commands/materials';
import { storeRecords } from '$lib/server/commands/records';
import { signCursor } from '$lib/server/cursor';
import { recordChange } from '$lib/server/db/change-log';
import { asOwner, inPlant, type Scope } from '$lib/server/db/client';
import { pullPage } from '$lib/server/db/queries/pull';
import { machines } from '$lib/server/db/schema/machines';
import { memberships } from '$lib/server/db/schema/people';
import { changes } from '$lib/server/db/schema/plants';
import { testDatabases } from './fixtures/database';
import { makePlant, testMaterial, type TestPlant } from './fixtures/plant';
import { makeRecord, makeTablet, pushOf } from './fixtures/record';

const { web, owner } = testDatabases();
const secret = 'a secret of thirty-two characters';
const START = null;

async function page(scope: Scope, cursor: string | null, pageSize = 500): Promise<PullResponse> {
	const response = await pullPage(scope, { cursor, secret, pageSize });
	// What leaves the server is what the tablet's schema takes in, to the last field.
	expect(pullResponse.parse(response)).toEqual(response);
	return response;
}

/** The tablet's side in the smallest: rows by entity and id, built anew on a reset. */
function mirror() {
	const rows = new Map<string, MirrorChange>();
	return {
		rows,
		apply(response: PullResponse) {
			if (response.reset) rows.clear();
			for (const change of response.changes) {
				const key = `${change.entity}/${change.id}`;
				if (change.row) rows.set(key, change);
				else rows.delete(key);
			}
		}
	};
}

async function pullAll(scope: Scope, from: string | null, size: number, between?: () => Promise<unknown>) {
	const built = mirror();
	const pages: PullResponse[] = [];
	let cursor = from;
	do {
		const response = await page(scope, cursor, size);
		pages.push(response);
		built.apply(response);
		cursor = response.cursor;
		if (response.more) await between?.();
	} while (pages.at(-1)?.more);
	return { pages, rows: built.rows, cursor };
}

async function pushOne(plant: TestPlant, at?: Date): Promise<string> {
	const tablet = makeTablet();
	const record = await makeRecord(plant, tablet);
	await storeRecords(plant.scope.millwright, pushOf(tablet, [record]), at);
	return record.id;
}

test('the first pull brings everything of the plant and nothing of another', async () => {
	const plant = await makePlant(web, owner);
	const other = await makePlant(web, owner);
	await pushOne(other);
	const checkId = await pushOne(plant);
	const { pages, rows } = await pullAll(plant.scope.millwright, START, 3);
	expect(pages[0]).toMatchObject({
		reset: 'start',
		plant: { id: plant.id, name: plant.name },
		person: { id: plant.people.millwright.id, role: 'millwright' }
	});
	expect(pages.slice(1).every((p) => p.reset === null)).toBe(true);
	expect([...rows.keys()].sort()).toEqual(
		[
			`rules/${plant.id}`,
			...plant.machineIds.map((id) => `machine/${id}`),
			...plant.positionIds.map((id) => `position/${id}`),
			`material/${plant.materialId}`,
			`material/${plant.refusedMaterialId}`,
			`check/${checkId}`
		].sort()
	);
	expect(rows.get(`material/${plant.materialId}`)?.row).toEqual({
		...testMaterial(`Iron ${plant.canary}`),
		id: plant.materialId,
		revision: 1
	});
	expect(rows.get(`check/${checkId}`)?.row).toMatchObject({
		verdict: 'carries',
		authorName: plant.people.millwright.name,
		positionId: plant.positionIds[0]
	});
	expect(JSON.stringify(pages)).not.toContain(other.canary);
});

test('a later pull brings what changed, only once and only in its last state', async () => {
	const plant = await makePlant(web, owner);
	const { cursor } = await pullAll(plant.scope.millwright, START, 500);
	expect(await page(plant.scope.millwright, cursor)).toMatchObject({ reset: null, changes: [], more: false });

	const statement = testMaterial('Renamed', { permitted: false });
	for (const expectedRevision of [1, 2, 3]) {
		await reviseMaterial(plant.scope.supervisor, { id: plant.materialId, expectedRevision, statement });
	}
	const later = await page(plant.scope.millwright, cursor);
	expect(later.changes).toMatchObject([
		{ entity: 'material', id: plant.materialId, row: { name: 'Renamed', permitted: false, revision: 4 } }
	]);
	expect((await page(plant.scope.millwright, later.cursor)).changes).toEqual([]);
});

test('pages neither repeat nor skip while others write', async () => {
	const plant = await makePlant(web, owner);
	for (let n = 0; n < 5; n++) await pushOne(plant);
	let revision = 1;
	const { pages, rows } = await pullAll(plant.scope.millwright, START, 2, async () => {
		if (revision > 6) return;
		const statement = testMaterial(`Revision ${revision + 1}`);
		const change = { id: plant.materialId, expectedRevision: revision++, statement };
		await Promise.all([reviseMaterial(plant.scope.supervisor, change), pushOne(plant), pushOne(plant)]);
	});
	const seqs = pages.flatMap((p) => p.changes.map((change) => change.seq));
	expect(seqs).toEqual([...new Set(seqs)].sort((a, b) => a - b));
	const whole = await pullAll(plant.scope.planner, START, 500);
	expect(rows).toEqual(whole.rows);
	expect(rows.size).toBe(8 + 17);
	expect(rows.get(`material/${plant.materialId}`)?.row).toMatchObject({ revision: 7 });
});

test('a reader between two writers never passes over the slower one', async () => {
	const plant = await makePlant(web, owner);
	const { cursor } = await pullAll(plant.scope.millwright, START, 500);
	let release = () => {};
	const gate = new Promise<void>((resolve) => (release = resolve));
	let drawn = () => {};
	const hasDrawn = new Promise<void>((resolve) => (drawn = resolve));
	const slow = inPlant(plant.scope.planner, async (tx) => {
		await recordChange(tx, plant.id, 'machine', plant.machineIds[0]!);
		drawn();
		await gate;
	});
	await hasDrawn;
	const fast = pushOne(plant);
	const between = await page(plant.scope.millwright, cursor);
	expect(between.changes).toEqual([]);
	release();
	await Promise.all([slow, fast]);
	const after = await page(plant.scope.millwright, between.cursor);
	expect(after.changes.map((change) => change.entity)).toEqual(['machine', 'check']);
});

test('a row that is gone is told as gone', async () => {
	const plant = await makePlant(web, owner);
	const { cursor } = await pullAll(plant.scope.millwright, START, 500);
	const gone = newId();
	await asOwner(owner, plant.id, async (tx) => {
		await tx
			.insert(machines)
			.values({ plantId: plant.id, id: gone, tag: 'T-9', name: 'Gone', area: '', origin: 'inch' });
		await recordChange(tx, plant.id, 'machine', gone);
		await tx.delete(machines).where(eq(machines.id, gone));
		await recordChange(tx, plant.id, 'machine', gone, true);
	});
	expect((await page(plant.scope.millwright, cursor)).changes).toMatchObject([
		{ entity: 'machine', id: gone, row: null }
	]);
});

test('checks older than half a year stay in the office, and the cursor passes them', async () => {
	const plant = await makePlant(web, owner);
	const { cursor } = await pullAll(plant.scope.millwright, START, 500);
	const day = 24 * 60 * 60 * 1000;
	await pushOne(plant, new Date(Date.now() - 181 * day));
	const passed = await page(plant.scope.millwright, cursor);
	expect(passed).toMatchObject({ changes: [], more: false });
	expect(passed.cursor).not.toBe(cursor);
	const recent = await pushOne(plant, new Date(Date.now() - 179 * day));
	expect((await page(plant.scope.millwright, passed.cursor)).changes).toMatchObject([{ id: recent }]);
});

test('the mirror is built anew when reach, plant, epoch or cursor no longer fit', async () => {
	const plant = await makePlant(web, owner);
	const other = await makePlant(web, owner);
	const { millwright } = plant.scope;
	const first = await page(millwright, START);
	const resetFor = async (cursor: string) => (await page(millwright, cursor)).reset;
	const text = JSON.parse(Buffer.from(first.cursor.split('.')[0]!, 'base64url').toString('utf8'));

	expect(await resetFor(first.cursor)).toBeNull();
	expect(await resetFor('')).toBe('cursor');
	expect(await resetFor('made.up')).toBe('cursor');
	expect(await resetFor(`${first.cursor}x`)).toBe('cursor');
	expect(await resetFor(signCursor(text, 'another secret of thirty-two ch.'))).toBe('cursor');
	expect(await resetFor(signCursor({ ...text, seq: text.seq + 1 }, secret))).toBe('cursor');
	expect(await resetFor(signCursor({ ...text, epoch: newId() }, secret))).toBe('epoch');
	expect(await resetFor((await page(other.scope.millwright, START)).cursor)).toBe('scope');

	await asOwner(owner, plant.id, (tx) =>
		tx.update(memberships).set({ scopeVersion: 2 }).where(eq(memberships.userId, millwright.personId))
	);
	const anew = await page(millwright, first.cursor);
	expect(anew.reset).toBe('scope');
	expect(anew.changes).toHaveLength(first.changes.length);
	expect((await page(millwright, anew.cursor)).reset).toBeNull();
});

test('who lost the right is served no row', async () => {
	const plant = await makePlant(web, owner);
	await asOwner(owner, plant.id, (tx) =>
		tx
			.update(memberships)
			.set({ disabledAt: new Date() })
			.where(eq(memberships.userId, plant.people.millwright.id))
	);
	await expect(page(plant.scope.millwright, START)).rejects.toMatchObject({
		refusal: { code: 'not-allowed' }
	});
});

test('every logged change is of a row that the log names once per number', async () => {
	const plant = await makePlant(web, owner);
	await pushOne(plant);
	const log = await inPlant(plant.scope.planner, (tx) => tx.select().from(changes).orderBy(asc(changes.seq)));
	expect(log.map((c) => c.entity)).toEqual([
		'rules',
		'machine',
		'machine',
		'position',
		'position',
		'position',
		'material',
		'material',
		'check'
	]);
});
