/** Push: stored once whatever is sent how often, refused without delaying others, numbered without gaps. */
import { and, asc, eq } from 'drizzle-orm';
import { describe, expect, test } from 'vitest';
import type { Envelope } from '$lib/records/envelope';
import { canonicalJson } from '$lib/records/canonical';
import { newId } from '$lib/records/ids';
import { pushResponse, type PushAnswer } from '$lib/records/protocol';
import { firstBrokenAudit } from '$lib/server/audit';
import { storeRecords } from '$lib/server/commands/records';
import { asOwner, inPlant } from '$lib/server/db/client';
import { checks, quarantine } from '$lib/server/db/schema/checks';
import { memberships } from '$lib/server/db/schema/people';
import { changes, plantCounters } from '$lib/server/db/schema/plants';
import { tabletAuthors, tablets } from '$lib/server/db/schema/tablets';
import { Refused } from '$lib/server/errors';
import { testDatabases } from './fixtures/database';
import { makePlant, testMaterial, type TestPlant } from './fixtures/plant';
import { makeRecord, makeTablet, pushOf, sealed, statuses } from './fixtures/record';

const { web, owner } = testDatabases();

const keptChecks = (plant: TestPlant) =>
	inPlant(plant.scope.planner, (tx) => tx.select().from(checks).orderBy(asc(checks.seq)));
const asideOf = (plant: TestPlant) => inPlant(plant.scope.planner, (tx) => tx.select().from(quarantine));

/** Invariant: the plant's numbers are 1..head, and every check stands under one of them. */
async function expectGapless(plant: TestPlant): Promise<void> {
	const { log, head } = await inPlant(plant.scope.planner, async (tx) => ({
		log: await tx.select().from(changes).orderBy(asc(changes.seq)),
		head: (await tx.select().from(plantCounters))[0]?.head
	}));
	expect(log.map((change) => change.seq)).toEqual(log.map((_, index) => index + 1));
	expect(head).toBe(log.length);
	for (const check of await keptChecks(plant)) {
		expect(log[check.seq - 1]).toMatchObject({ entity: 'check', entityId: check.id });
	}
}

describe('storing', () => {
	test('a record is stored with its bytes, both outcomes and a receipt', async () => {
		const plant = await makePlant(web, owner);
		const tablet = makeTablet();
		const record = await makeRecord(plant, tablet);
		const response = await storeRecords(plant.scope.millwright, pushOf(tablet, [record]));
		expect(pushResponse.parse(response)).toEqual(response);
		const [answer] = response.answers;
		const [row] = await keptChecks(plant);
		expect(answer).toEqual({
			status: 'stored',
			id: record.id,
			hash: record.hash,
			seq: row?.seq,
			receivedAt: row?.receivedAt.toISOString()
		});
		expect(row).toMatchObject({
			envelope: canonicalJson(record),
			hash: record.hash,
			authorId: plant.people.millwright.id,
			sentBy: plant.people.millwright.id,
			tabletSeq: 1,
			agrees: true,
			verdict: 'carries',
			serverCore: record.body.outcome.core
		});
		expect(row?.serverOutcome).toEqual(record.body.outcome);
		expect(row?.body).toEqual(record.body);
		await expectGapless(plant);
	});

	test('the author is who made it, whoever sends it', async () => {
		const plant = await makePlant(web, owner);
		const tablet = makeTablet();
		const record = await makeRecord(plant, tablet);
		await storeRecords(plant.scope.planner, pushOf(tablet, [record]));
		expect(await keptChecks(plant)).toMatchObject([
			{ authorId: plant.people.millwright.id, sentBy: plant.people.planner.id }
		]);
	});

	test('the server answers from its own material and says when the tablet came to something else', async () => {
		const plant = await makePlant(web, owner);
		const tablet = makeTablet();
		const flattering = testMaterial('Iron', { allowableBending: { value: 85_000, unit: 'psi' } });
		const weak = { power: { typed: '20', value: 20, unit: 'hp', source: 'keypad' } } as const;
		const record = await makeRecord(plant, tablet, { material: flattering, answers: weak });
		expect(record.body.outcome.verdict).toBe('carries');
		await storeRecords(plant.scope.millwright, pushOf(tablet, [record]));
		const [row] = await keptChecks(plant);
		expect(row?.agrees).toBe(false);
		expect(row?.verdict).toBe('will-not-carry');
		expect(row?.tabletOutcome.verdict).toBe('carries');
		const factor = row!.tabletOutcome.bendingMargin! / row!.serverOutcome.bendingMargin!;
		expect(factor).toBeCloseTo(10, 6);
	});

	test('a material that is not permitted is said so', async () => {
		const plant = await makePlant(web, owner);
		const tablet = makeTablet();
		const record = await makeRecord(plant, tablet, {
			answers: { materialId: plant.refusedMaterialId },
			material: testMaterial(`Nylon ${plant.canary}`, { metallic: false, permitted: false })
		});
		await storeRecords(plant.scope.millwright, pushOf(tablet, [record]));
		expect(await keptChecks(plant)).toMatchObject([{ verdict: 'not-permitted', agrees: true }]);
	});

	test('a correction stands beside what it corrects', async () => {
		const plant = await makePlant(web, owner);
		const tablet = makeTablet();
		const first = await makeRecord(plant, tablet);
		const second = await makeRecord(plant, tablet, { envelope: { amends: first.id } });
		const lost = await makeRecord(plant, tablet, { envelope: { amends: newId() } });
		const { answers } = await storeRecords(plant.scope.millwright, pushOf(tablet, [first, second, lost]));
		expect(statuses(answers)).toEqual(['stored', 'stored', 'bad-content']);
		expect((await keptChecks(plant)).map((row) => row.amends)).toEqual([null, first.id]);
	});
});

describe('the same record again', () => {
	test('twice in a row, twice in one push, and by another person: stored once', async () => {
		const plant = await makePlant(web, owner);
		const tablet = makeTablet();
		const record = await makeRecord(plant, tablet);
		const once = await storeRecords(plant.scope.millwright, pushOf(tablet, [record, record]));
		const again = await storeRecords(plant.scope.planner, pushOf(tablet, [record]));
		expect(statuses(once.answers)).toEqual(['stored', 'duplicate']);
		expect(statuses(again.answers)).toEqual(['duplicate']);
		const receipts = [...once.answers, ...again.answers].map(({ status: _status, ...receipt }) => receipt);
		expect(receipts).toEqual([receipts[0], receipts[0], receipts[0]]);
		expect(await keptChecks(plant)).toHaveLength(1);
		await expectGapless(plant);
	});

	test('at the same moment over many connections: stored once, one receipt', async () => {
		const plant = await makePlant(web, owner);
		const tablet = makeTablet();
		const records: Envelope[] = [];
		for (let n = 0; n < 10; n++) records.push(await makeRecord(plant, tablet));
		const pushes = await Promise.all(
			Array.from({ length: 8 }, (_, n) => {
				// Each sender in another order, so that they meet in the middle.
				const turned = [...records.slice(n), ...records.slice(0, n)];
				return storeRecords(plant.scope.millwright, pushOf(tablet, turned));
			})
		);
		const answers = pushes.flatMap((push) => push.answers);
		expect(answers.filter((answer) => answer.status === 'stored')).toHaveLength(10);
		expect(answers.filter((answer) => answer.status === 'duplicate')).toHaveLength(70);
		const seqs = new Map<string | null, Set<number>>();
		for (const answer of answers as Extract<PushAnswer, { seq: number }>[]) {
			seqs.set(answer.id, (seqs.get(answer.id) ?? new Set()).add(answer.seq));
		}
		expect([...seqs.values()].every((numbers) => numbers.size === 1)).toBe(true);
		expect(await keptChecks(plant)).toHaveLength(10);
		await expectGapless(plant);
		expect(await inPlant(plant.scope.planner, (tx) => tx.select().from(tablets))).toHaveLength(1);
	});

	test('still a duplicate after its author lost the right', async () => {
		const plant = await makePlant(web, owner);
		const tablet = makeTablet();
		const record = await makeRecord(plant, tablet);
		await storeRecords(plant.scope.millwright, pushOf(tablet, [record]));
		await disable(plant);
		const next = await makeRecord(plant, tablet);
		const { answers } = await storeRecords(plant.scope.planner, pushOf(tablet, [record, next]));
		expect(statuses(answers)).toEqual(['duplicate', 'author-not-here']);
	});
});

async function disable(plant: TestPlant): Promise<void> {
	await asOwner(owner, plant.id, (tx) =>
		tx
			.update(memberships)
			.set({ disabledAt: new Date() })
			.where(and(eq(memberships.plantId, plant.id), eq(memberships.userId, plant.people.millwright.id)))
	);
}

describe('refusing', () => {
	test('what is bad is kept aside whole and delays no other', async () => {
		const plant = await makePlant(web, owner);
		const other = await makePlant(web, owner);
		const tablet = makeTablet();
		const good = await makeRecord(plant, tablet);
		const body = { ...good.body };
		const make = (change: object) => sealed({ ...good, id: newId(), ...change });
		const withBody = (change: object) => make({ tabletSeq: 90, body: { ...body, ...change } });
		const sent: [string, unknown][] = [
			['bad-content', 'no record at all'],
			['bad-content', null],
			['bad-content', { ...good, id: 'not an id' }],
			['bad-content', { ...good, schemaVersion: 2 }],
			['bad-content', { ...good, body: { ...body, answers: { ...body.answers, teeth: -3 } } }],
			['bad-content', await make({ tabletId: newId() })],
			['bad-content', await make({ tabletSeq: 91, performedAt: '0000-01-01T00:00:00Z' })],
			['bad-content', await withBody({ answers: { ...body.answers, note: 'a zero \u0000 in it' } })],
			['hash-mismatch', { ...good, tabletSeq: 7 }],
			['stored', good],
			['id-taken', await sealed({ ...good, tabletSeq: 50 })],
			['number-taken', await make({})],
			['author-not-here', await make({ authorId: other.people.millwright.id })],
			['author-not-here', await make({ authorId: newId() })],
			['unknown-position', await withBody({ positionId: other.positionIds[0] })],
			['unknown-position', await withBody({ machineId: plant.machineIds[1] })],
			['unknown-material', await withBody({ materialRevision: 2 })],
			['unknown-material', await withBody({ materialRevision: null })],
			['unknown-material', await withBody({ answers: { ...body.answers, materialId: other.materialId } })],
			['unknown-rules', await withBody({ rulesRevision: 9 })],
			['stored', await makeRecord(plant, tablet)]
		];
		const records = sent.map(([, record]) => record);
		const { answers } = await storeRecords(plant.scope.millwright, pushOf(tablet, records));
		expect(statuses(answers)).toEqual(sent.map(([status]) => status));
		for (const [index, answer] of answers.entries()) {
			if (answer.status !== 'quarantined') continue;
			expect(answer.index).toBe(index);
			expect(answer.text).toMatch(/\w{3}.*[.:]/);
		}
		const aside = await asideOf(plant);
		const refused = records.filter((_, index) => answers[index]?.status === 'quarantined');
		expect(new Set(aside.map((row) => row.bytes))).toEqual(new Set(refused.map((r) => canonicalJson(r))));
		expect(await keptChecks(plant)).toHaveLength(2);
		await expectGapless(plant);

		// Sent again, each is answered as before: only what was stored is now a duplicate.
		const again = await storeRecords(plant.scope.millwright, pushOf(tablet, records));
		expect(statuses(again.answers)).toEqual(
			sent.map(([status]) => (status === 'stored' ? 'duplicate' : status))
		);
		expect(await asideOf(plant)).toHaveLength(aside.length);
		expect(await firstBrokenAudit(plant.scope.supervisor)).toBeNull();
	});

	test('a number that JSON cannot hold is refused, not lost', async () => {
		const plant = await makePlant(web, owner);
		const tablet = makeTablet();
		const record: unknown = JSON.parse('{"id":"x","value":1e999}');
		const { answers } = await storeRecords(plant.scope.millwright, pushOf(tablet, [record]));
		expect(statuses(answers)).toEqual(['bad-content']);
		expect((await asideOf(plant))[0]?.bytes).toContain('Infinity');
	});

	test('a record of another plant is put off and leaves nothing here', async () => {
		const plant = await makePlant(web, owner);
		const other = await makePlant(web, owner);
		const tablet = makeTablet();
		const foreign = await makeRecord(other, tablet);
		const spoiled = { ...foreign, hash: 'spoiled' };
		const { answers } = await storeRecords(plant.scope.millwright, pushOf(tablet, [foreign, spoiled]));
		expect(answers).toMatchObject([
			{ status: 'retry', index: 0, id: foreign.id },
			{ status: 'retry', index: 1, id: foreign.id }
		]);
		expect(await keptChecks(plant)).toEqual([]);
		expect(await asideOf(plant)).toEqual([]);
	});
});

describe('tablets', () => {
	test('each has a number from its first contact, and what it drew is kept', async () => {
		const plant = await makePlant(web, owner);
		const [one, two] = [makeTablet(), makeTablet()];
		await Promise.all([one, two, one, two].map((t) => storeRecords(plant.scope.millwright, pushOf(t, []))));
		await makeRecord(plant, one);
		await makeRecord(plant, one);
		const drawn = [
			...pushOf(one, []).drawn,
			{ authorId: plant.people.planner.id, highest: 0 },
			{ authorId: newId(), highest: 99 }
		];
		await storeRecords(plant.scope.planner, { ...pushOf(one, []), drawn });
		const known = await inPlant(plant.scope.planner, (tx) =>
			tx.select().from(tablets).orderBy(asc(tablets.number))
		);
		expect(known.map((t) => t.name)).toEqual(['Tablet 1', 'Tablet 2']);
		expect(known.find((t) => t.id === one.id)?.lastHeardFrom).toBe(plant.people.planner.id);
		const authors = await inPlant(plant.scope.planner, (tx) => tx.select().from(tabletAuthors));
		expect(authors.map((a) => [a.authorId, a.highestDrawn]).sort()).toEqual(
			[
				[plant.people.millwright.id, 2],
				[plant.people.planner.id, 0]
			].sort()
		);
		// An older ping that arrives late takes nothing back.
		await storeRecords(plant.scope.planner, { ...pushOf(one, []), drawn: [{ ...drawn[0]!, highest: 1 }] });
		const after = await inPlant(plant.scope.planner, (tx) => tx.select().from(tabletAuthors));
		expect(after.find((a) => a.authorId === plant.people.millwright.id)?.highestDrawn).toBe(2);
	});

	test('a blocked one is refused, stores nothing, and is noted as heard', async () => {
		const plant = await makePlant(web, owner);
		const tablet = makeTablet();
		await storeRecords(plant.scope.millwright, pushOf(tablet, []), new Date('2026-01-01T00:00:00Z'));
		await inPlant(plant.scope.supervisor, (tx) =>
			tx.update(tablets).set({ blockedAt: new Date() }).where(eq(tablets.id, tablet.id))
		);
		const record = await makeRecord(plant, tablet);
		const push = storeRecords(plant.scope.millwright, pushOf(tablet, [record]));
		await expect(push).rejects.toThrow(new Refused({ code: 'tablet-blocked' }));
		expect(await keptChecks(plant)).toEqual([]);
		const [row] = await inPlant(plant.scope.planner, (tx) => tx.select().from(tablets));
		expect(row?.lastHeardAt.getTime()).toBeGreaterThan(Date.parse('2026-01-01T00:00:00Z'));
	});
});

test('numbers have no gap after rollbacks and many writers at once', async () => {
	const plant = await makePlant(web, owner);
	const writers = Array.from({ length: 6 }, async () => {
		const tablet = makeTablet();
		for (let n = 0; n < 5; n++) {
			const good = await makeRecord(plant, tablet);
			const clash = await sealed({ ...good, id: newId() });
			await storeRecords(plant.scope.millwright, pushOf(tablet, [good, clash]));
		}
	});
	const failing = Array.from({ length: 10 }, () =>
		inPlant(plant.scope.planner, async (tx) => {
			await tx.update(plantCounters).set({ head: 999 }).where(eq(plantCounters.plantId, plant.id));
			throw new Error('planned');
		}).catch(() => null)
	);
	await Promise.all([...writers, ...failing]);
	expect(await keptChecks(plant)).toHaveLength(30);
	await expectGapless(plant);
});
