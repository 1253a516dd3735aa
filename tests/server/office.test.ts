/** What the office reads: positions by the decision they need, one check whole, tablets and what they owe. */
import { expect, test } from 'vitest';
import type { Envelope } from '$lib/records/envelope';
import { newId } from '$lib/records/ids';
import { reviseMaterial } from '$lib/server/commands/materials';
import { storeRecords } from '$lib/server/commands/records';
import { checkPage, listChecks } from '$lib/server/db/queries/checks';
import { listMachines, machinePage } from '$lib/server/db/queries/machines';
import { tabletsLedger } from '$lib/server/db/queries/tablets';
import { testDatabases } from './fixtures/database';
import { makePlant, testMaterial, type TestPlant } from './fixtures/plant';
import { makeRecord, makeTablet, pushOf, type RecordChange, type Tablet } from './fixtures/record';

const { web, owner } = testDatabases();

const hp = (value: number) => ({
	power: { typed: String(value), value, unit: 'hp', source: 'keypad' } as const
});

async function keep(
	plant: TestPlant,
	tablet: Tablet,
	change: RecordChange = {},
	at?: Date
): Promise<Envelope> {
	const record = await makeRecord(plant, tablet, change);
	const { answers } = await storeRecords(plant.scope.millwright, pushOf(tablet, [record]), at);
	if (answers[0]?.status !== 'stored') throw new Error(JSON.stringify(answers[0]));
	return record;
}

test('machines stand by the decision they need, each with its latest check', async () => {
	const plant = await makePlant(web, owner);
	const tablet = makeTablet();
	await keep(plant, tablet, { position: 0 });
	const failing = await keep(plant, tablet, { position: 0, answers: hp(20) });
	await keep(plant, tablet, { position: 2, answers: hp(20) });
	const fine = await keep(plant, tablet, { position: 2 });
	const { positions, counts } = await listMachines(plant.scope.planner);
	expect(positions.map((p) => [p.position.id, p.standing, p.check?.id ?? null])).toEqual([
		[plant.positionIds[0], 'will-not-carry', failing.id],
		[plant.positionIds[1], 'no-check', null],
		[plant.positionIds[2], 'carries', fine.id]
	]);
	expect(counts).toEqual({
		all: 3,
		carries: 1,
		close: 0,
		'will-not-carry': 1,
		'not-permitted': 0,
		'cannot-say': 0,
		'no-check': 1
	});
	const [first] = positions;
	expect(first?.machine).toMatchObject({ tag: 'T-1', area: 'Hall' });
	expect(first?.check).toMatchObject({
		margin: failing.body.outcome.bendingMargin,
		marginLow: failing.body.outcome.bendingMarginLow,
		marginNeeded: 1.5,
		reason: failing.body.outcome.reasons[0],
		agrees: true,
		authorName: plant.people.millwright.name,
		tabletName: 'Tablet 1',
		corrected: false,
		gear: {
			teeth: 24,
			pitch: { system: 'diametral', value: 6 },
			pressureAngle: 20,
			form: 'full-depth',
			finish: 'cut',
			materialName: `Iron ${plant.canary}`
		}
	});
});

test('of equal need the oldest stands first', async () => {
	const plant = await makePlant(web, owner);
	const tablet = makeTablet();
	const at = (day: number) => new Date(Date.UTC(2026, 0, day));
	await keep(plant, tablet, { position: 2, answers: hp(20) }, at(3));
	await keep(plant, tablet, { position: 0, answers: hp(20) }, at(2));
	await keep(plant, tablet, { position: 1, answers: hp(20) }, at(1));
	const { positions } = await listMachines(plant.scope.planner);
	expect(positions.map((p) => p.position.id)).toEqual(
		[1, 0, 2].map((position) => plant.positionIds[position])
	);
});

test("a machine's page holds its positions in order with their history, and no other machine's", async () => {
	const plant = await makePlant(web, owner);
	const tablet = makeTablet();
	const first = await keep(plant, tablet, { position: 1 });
	const second = await keep(plant, tablet, { position: 1, envelope: { amends: first.id } });
	await keep(plant, tablet, { position: 2 });
	const page = await machinePage(plant.scope.millwright, plant.machineIds[0]!);
	expect(page?.machine).toMatchObject({ id: plant.machineIds[0], tag: 'T-1', origin: 'inch' });
	expect(page?.positions.map((p) => [p.position.id, p.history.map((check) => check.id)])).toEqual([
		[plant.positionIds[0], []],
		[plant.positionIds[1], [second.id, first.id]]
	]);
	expect(page?.positions[1]?.history.map((check) => check.corrected)).toEqual([false, true]);
});

test('a check is read whole: as typed, both outcomes, the revisions it was made with', async () => {
	const plant = await makePlant(web, owner);
	const tablet = makeTablet();
	const record = await keep(plant, tablet, { envelope: { clockOffsetMs: -4000 } });
	const later = await keep(plant, tablet, { envelope: { amends: record.id } });
	const now = testMaterial('Renamed');
	await reviseMaterial(plant.scope.supervisor, { id: plant.materialId, expectedRevision: 1, statement: now });
	const page = await checkPage(plant.scope.planner, record.id);
	expect(page).toMatchObject({
		id: record.id,
		hash: record.hash,
		clockOffsetMs: -4000,
		author: { id: plant.people.millwright.id, name: plant.people.millwright.name },
		tablet: { id: tablet.id, number: 1, name: 'Tablet 1' },
		tabletSeq: 1,
		machine: { tag: 'T-1' },
		position: { id: plant.positionIds[0], mateTeeth: 60 },
		answers: record.body.answers,
		tabletOutcome: record.body.outcome,
		serverOutcome: record.body.outcome,
		agrees: true,
		material: {
			id: plant.materialId,
			used: { revision: 1, statement: testMaterial(`Iron ${plant.canary}`) },
			current: { revision: 2, statement: now }
		},
		rules: { used: { revision: 1, rules: plant.rules }, currentRevision: 1 },
		amends: null,
		amendedBy: [later.id]
	});
	expect(page?.performedAt.toISOString()).toBe(record.performedAt);
});

test('the list of checks goes on where it stopped, whatever arrives', async () => {
	const plant = await makePlant(web, owner);
	const tablet = makeTablet();
	const kept: string[] = [];
	for (let n = 0; n < 60; n++) kept.unshift((await keep(plant, tablet, { answers: hp(n < 3 ? 20 : 2) })).id);
	const first = await listChecks(plant.scope.planner);
	await keep(plant, tablet);
	const second = await listChecks(plant.scope.planner, { cursor: first.next });
	expect([...first.checks, ...second.checks].map((check) => check.id)).toEqual(kept);
	expect(second.next).toBeNull();
	const failing = await listChecks(plant.scope.planner, { verdict: 'will-not-carry' });
	expect(failing.checks.map((check) => check.id)).toEqual(kept.slice(-3));
	expect((await listChecks(plant.scope.planner, { cursor: 'nonsense' })).checks).toHaveLength(50);
});

test('another plant has none of these pages', async () => {
	const plant = await makePlant(web, owner);
	const other = await makePlant(web, owner);
	const record = await keep(other, makeTablet());
	const { supervisor } = plant.scope;
	for (const id of [record.id, newId(), 'nonsense']) expect(await checkPage(supervisor, id)).toBeNull();
	for (const id of [other.machineIds[0]!, newId(), '']) expect(await machinePage(supervisor, id)).toBeNull();
	expect((await listChecks(supervisor)).checks).toEqual([]);
	expect(await tabletsLedger(supervisor)).toEqual([]);
	const { positions } = await listMachines(supervisor);
	expect(positions.map((p) => p.position.id)).not.toContain(other.positionIds[0]);
});

test('the ledger tells what waits, what never came and what was refused', async () => {
	const plant = await makePlant(web, owner);
	const { millwright, planner } = plant.people;
	const tablet = makeTablet();
	const at = new Date('2026-03-01T12:00:00Z');
	await keep(plant, tablet, {}, at);
	// 2 and 3 are drawn and never come; 4 comes; 5 comes and is refused; 6 and 7 still wait.
	await makeRecord(plant, tablet);
	await makeRecord(plant, tablet);
	const fourth = await makeRecord(plant, tablet);
	const fifth = await makeRecord(plant, tablet, { envelope: { id: fourth.id } });
	await makeRecord(plant, tablet);
	await makeRecord(plant, tablet);
	const planners = await makeRecord(plant, tablet, { authorId: planner.id });
	await makeRecord(plant, tablet, { authorId: planner.id });
	await storeRecords(plant.scope.planner, pushOf(tablet, [fourth, fifth, planners]), at);
	const silent = makeTablet();
	await storeRecords(plant.scope.millwright, pushOf(silent, []), at);
	expect(await tabletsLedger(plant.scope.supervisor)).toEqual([
		{
			id: tablet.id,
			number: 1,
			name: 'Tablet 1',
			lastHeardAt: at,
			lastHeardFrom: planner.name,
			blockedAt: null,
			waiting: 2 + 1,
			missing: [{ authorName: millwright.name, from: 2, to: 3 }],
			attention: 1
		},
		{
			id: silent.id,
			number: 2,
			name: 'Tablet 2',
			lastHeardAt: at,
			lastHeardFrom: millwright.name,
			blockedAt: null,
			waiting: 0,
			missing: [],
			attention: 0
		}
	]);
});

test('a refused record with a made-up number makes no gap', async () => {
	const plant = await makePlant(web, owner);
	const tablet = makeTablet();
	const record = await keep(plant, tablet);
	const madeUp = { ...record, tabletSeq: 4_000_000_000 };
	await storeRecords(plant.scope.millwright, pushOf(tablet, [madeUp]));
	expect(await tabletsLedger(plant.scope.planner)).toMatchObject([{ missing: [], waiting: 0, attention: 1 }]);
});
