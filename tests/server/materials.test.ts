/** The list of permitted materials: only a supervisor changes it, by revisions that nobody overwrites. */
import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';
import { newId } from '$lib/records/ids';
import { firstBrokenAudit } from '$lib/server/audit';
import { addMaterial, reviseMaterial } from '$lib/server/commands/materials';
import { asOwner, inPlant } from '$lib/server/db/client';
import { listMaterials, materialPage } from '$lib/server/db/queries/materials';
import { audit } from '$lib/server/db/schema/audit';
import { testDatabases } from './fixtures/database';
import { makePlant, testMaterial } from './fixtures/plant';

const { web, owner } = testDatabases();

test('each change is a new revision, and every one stays readable', async () => {
	const plant = await makePlant(web, owner);
	const { supervisor } = plant.scope;
	const statement = testMaterial('Steel', { allowableBending: { value: 20_000, unit: 'psi' } });
	const added = await addMaterial(supervisor, statement);
	if (!added.ok) throw new Error(added.code);
	const { id } = added;
	const lowered = { ...statement, allowableBending: { value: 18_000, unit: 'psi' } as const };
	const revised = await reviseMaterial(supervisor, { id, expectedRevision: 1, statement: lowered });
	expect(revised).toEqual({ ok: true, id, revision: 2 });
	const page = await materialPage(plant.scope.planner, id);
	expect(page?.revisions.map((r) => [r.revision, r.statement, r.createdByName])).toEqual([
		[2, lowered, plant.people.supervisor.name],
		[1, statement, plant.people.supervisor.name]
	]);
	const list = await listMaterials(plant.scope.planner);
	expect(list.map((row) => [row.statement.name, row.revision])).toEqual([
		[`Iron ${plant.canary}`, 1],
		[`Nylon ${plant.canary}`, 1],
		['Steel', 2]
	]);
});

test('a value without a source, or out of range, is refused by name and nothing is kept', async () => {
	const plant = await makePlant(web, owner);
	const { supervisor } = plant.scope;
	const { source: _source, ...unsourced } = testMaterial('Steel');
	const bad = { ...testMaterial('Steel'), source: '  ', brinellLow: 300, brinellHigh: 200 };
	const first = await addMaterial(supervisor, unsourced);
	const second = await reviseMaterial(supervisor, {
		id: plant.materialId,
		expectedRevision: 1,
		statement: { ...bad, source: 'known' }
	});
	const third = await addMaterial(supervisor, bad);
	const fourth = await addMaterial(supervisor, testMaterial('Steel', { basis: 'a zero \u0000' }));
	const fifth = await addMaterial(supervisor, testMaterial('Half \ud83d'));
	for (const [answer, path] of [
		[first, 'source'],
		[second, 'brinellHigh'],
		[third, 'source'],
		[fourth, 'basis'],
		[fifth, 'name']
	] as const) {
		if (answer.ok || answer.code !== 'invalid-input') throw new Error('It was taken.');
		expect(answer.issues.map((issue) => issue.path)).toContain(path);
	}
	const list = await listMaterials(supervisor);
	expect(list.map((row) => row.revision)).toEqual([1, 1]);
});

test('a revision made in the meantime is not written over', async () => {
	const plant = await makePlant(web, owner);
	const revise = (name: string) =>
		reviseMaterial(plant.scope.supervisor, {
			id: plant.materialId,
			expectedRevision: 1,
			statement: testMaterial(name)
		});
	const answers = await Promise.all(['one', 'two', 'three', 'four'].map(revise));
	expect(answers.filter((answer) => answer.ok)).toHaveLength(1);
	expect(answers.filter((answer) => !answer.ok)).toEqual(
		Array.from({ length: 3 }, () => ({ ok: false, code: 'stale', revision: 2 }))
	);
});

test('nobody but a supervisor of this plant may', async () => {
	const plant = await makePlant(web, owner);
	const other = await makePlant(web, owner);
	const statement = testMaterial('Sneaked in');
	const denied = { refusal: { code: 'not-allowed' } };
	for (const role of ['millwright', 'planner'] as const) {
		const change = { id: plant.materialId, expectedRevision: 1, statement };
		await expect(addMaterial(plant.scope[role], statement)).rejects.toMatchObject(denied);
		await expect(reviseMaterial(plant.scope[role], change)).rejects.toMatchObject(denied);
	}
	for (const id of [other.materialId, newId(), 'nonsense']) {
		const change = { id, expectedRevision: 1, statement };
		const answer = await reviseMaterial(plant.scope.supervisor, change);
		expect(answer).toEqual({ ok: false, code: 'not-found' });
		expect(await materialPage(plant.scope.supervisor, id)).toBeNull();
	}
	expect((await listMaterials(other.scope.planner)).map((row) => row.revision)).toEqual([1, 1]);
});

test('the audit trail tells each change, and shows when it was tampered with', async () => {
	const plant = await makePlant(web, owner);
	await reviseMaterial(plant.scope.supervisor, {
		id: plant.materialId,
		expectedRevision: 1,
		statement: testMaterial('Renamed')
	});
	const trail = await inPlant(plant.scope.supervisor, (tx) => tx.select().from(audit).orderBy(audit.number));
	expect(trail.map((entry) => entry.action)).toEqual([
		'material-added',
		'material-added',
		'material-revised'
	]);
	expect(trail[2]).toMatchObject({
		actorId: plant.people.supervisor.id,
		entityId: plant.materialId,
		detail: { revision: 2, statement: { name: 'Renamed' } }
	});
	const broken = () => firstBrokenAudit(plant.scope.supervisor);
	expect(await broken()).toBeNull();

	// The application has no right to do this; an owner of the database could.
	const tamper = (number: number, change: Partial<typeof audit.$inferInsert>) =>
		asOwner(owner, plant.id, (tx) => tx.update(audit).set(change).where(eq(audit.number, number)));
	await tamper(2, { action: 'material-removed' });
	expect(await broken()).toBe(2);
	await tamper(2, { action: 'material-added' });
	expect(await broken()).toBeNull();
	await asOwner(owner, plant.id, (tx) => tx.delete(audit).where(eq(audit.number, 3)));
	expect(await broken()).toBe(3);
});
