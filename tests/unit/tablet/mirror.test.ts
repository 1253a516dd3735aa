/** A page is here with its cursor or not at all, and rebuilding the mirror never touches what is unsent. */
import { beforeEach, describe, expect, it } from 'vitest';
import { newId } from '../../../src/lib/records/ids';
import type { PullResponse } from '../../../src/lib/records/protocol';
import { keepCheck } from '../../../src/lib/tablet/store/keep';
import * as mirror from '../../../src/lib/tablet/store/mirror';
import type { Store } from '../../../src/lib/tablet/store/open';
import { countOutbox, listRecords, settle } from '../../../src/lib/tablet/store/outbox';
import { readPerson, setPerson, signOut } from '../../../src/lib/tablet/store/person';
import { checkOf, draftOf, localPerson, machineChange, member, type Member } from '../../sync/samples';
import { freshName, tab } from './database';

const NOW = new Date('2026-03-02T09:00:00Z');
let store: Store;
let who: Member;

beforeEach(async () => {
	store = tab(freshName());
	who = member();
	await setPerson(store, localPerson(who));
});

function page(over: Partial<PullResponse> = {}, of = who): PullResponse {
	return {
		reset: null,
		plant: { id: of.plantId, name: of.plantName },
		person: { id: of.personId, name: of.name, role: 'millwright' },
		changes: [],
		cursor: 'c1',
		more: false,
		serverTime: '2026-03-02T09:00:01.000Z',
		...over
	};
}
const asked = (cursor: string | null = null, of = who) => ({
	personId: of.personId,
	plantId: of.plantId,
	cursor
});
const apply = (over: Partial<PullResponse>, cursor: string | null = null) =>
	mirror.applyPage(store, page(over), asked(cursor), NOW);
const tags = async (of = who) => (await mirror.machines(store, of.plantId)).map(({ tag }) => tag);

/** One record that the plant has, one that it refused, one that waits. */
async function outboxOfThree() {
	const [sent, refused, waiting] = [
		await keepCheck(store, checkOf(draftOf(who)), NOW),
		await keepCheck(store, checkOf(draftOf(who)), NOW),
		await keepCheck(store, checkOf(draftOf(who)), NOW)
	];
	await settle(store, who.plantId, [
		{ kind: 'received', id: sent.id, hash: sent.hash, seq: 7, receivedAt: '2026-03-02T09:00:00Z' },
		{ kind: 'quarantined', id: refused.id, hash: refused.hash, code: 'unknown-position', text: 'no' }
	]);
	return { sent, refused, waiting };
}
const states = async () =>
	(await listRecords(store, who.plantId)).map(({ status }) => status.state).reverse();

describe('a page', () => {
	it('brings rows in the order in which people read them, and its cursor', async () => {
		const id = newId();
		await apply({
			reset: 'start',
			more: true,
			changes: [machineChange(1, 'PM-10', id), machineChange(2, 'PM-9'), machineChange(3, 'PM-2')]
		});
		expect(await tags()).toEqual(['PM-2', 'PM-9', 'PM-10']);
		expect(await mirror.pullPosition(store, who.plantId)).toMatchObject({ cursor: 'c1', complete: false });
		await apply({ cursor: 'c2', changes: [{ entity: 'machine', id, seq: 9, row: null }] }, 'c1');
		expect(await tags()).toEqual(['PM-2', 'PM-9']);
		expect(await mirror.pullPosition(store, who.plantId)).toMatchObject({ cursor: 'c2', complete: true });
		expect(await mirror.machine(store, who.plantId, id)).toBeNull();
	});

	it('finds positions by their machine and checks by their position', async () => {
		const [machineId, positionId] = [newId(), newId()];
		const position = { machineId, mateTeeth: null, gear: null, drive: null };
		const check = {
			positionId,
			performedAt: '2030-01-01T00:00:00Z',
			authorName: 'Tester',
			verdict: 'carries' as const,
			bendingMargin: 2,
			bendingMarginLow: 1.8
		};
		const [other, first, second] = [newId(), newId(), newId()];
		await apply({
			reset: 'start',
			changes: [
				{ entity: 'position', id: other, seq: 1, row: { ...position, id: other, name: 'B', ordinal: 2 } },
				{
					entity: 'position',
					id: positionId,
					seq: 2,
					row: { ...position, id: positionId, name: 'A', ordinal: 1 }
				},
				{
					entity: 'check',
					id: first,
					seq: 3,
					row: { ...check, id: first, receivedAt: '2026-01-02T00:00:00Z' }
				},
				{
					entity: 'check',
					id: second,
					seq: 4,
					row: { ...check, id: second, receivedAt: '2026-01-03T00:00:00Z' }
				}
			]
		});
		expect((await mirror.positions(store, who.plantId, machineId)).map(({ name }) => name)).toEqual([
			'A',
			'B'
		]);
		expect(await mirror.positions(store, who.plantId, newId())).toEqual([]);
		expect((await mirror.checksAt(store, who.plantId, positionId)).map(({ id }) => id)).toEqual([
			second,
			first
		]);
	});

	it('leaves nothing behind when one of its rows cannot be written', async () => {
		await apply({ reset: 'start', changes: [machineChange(1, 'OLD')] });
		const bad = machineChange(3, 'BAD');
		// Structured cloning refuses a function, as a full disk would refuse the row.
		(bad.row as { area: unknown }).area = () => 'no';
		await expect(
			apply({ reset: 'epoch', cursor: 'c2', changes: [machineChange(2, 'NEW'), bad] }, 'c1')
		).rejects.toThrow();
		expect(await tags()).toEqual(['OLD']);
		expect(await mirror.pullPosition(store, who.plantId)).toMatchObject({ cursor: 'c1' });
	});

	it('is not written when another tab was faster, or somebody else works here, or nobody', async () => {
		await apply({ reset: 'start', changes: [machineChange(1, 'A')] });
		const late = { cursor: 'c9', changes: [machineChange(2, 'LATE')] };
		expect(await apply(late, null)).toEqual({ kind: 'overtaken' });
		await setPerson(store, localPerson({ ...who, personId: newId() }));
		expect(await apply(late, 'c1')).toEqual({ kind: 'overtaken' });
		await signOut(store);
		expect(await apply(late, null)).toEqual({ kind: 'overtaken' });
		expect(await tags()).toEqual([]);
	});
});

describe('a rebuild', () => {
	it('after a change of scope clears the mirror and leaves the outbox as it is', async () => {
		await outboxOfThree();
		await apply({ reset: 'start', changes: [machineChange(1, 'GONE')] });
		await settleAll();
		const before = await (await store.db()).getAll('outbox');
		expect(
			await apply({ reset: 'scope', cursor: 'c2', changes: [machineChange(2, 'HERE')] }, 'c1')
		).toMatchObject({
			resend: false
		});
		expect(await tags()).toEqual(['HERE']);
		expect(await (await store.db()).getAll('outbox')).toEqual(before);
	});

	it('after a restore shows what was received as waiting and pushes all of it again', async () => {
		await outboxOfThree();
		expect(await states()).toEqual(['received', 'attention', 'waiting']);
		expect(await apply({ reset: 'epoch' })).toMatchObject({ resend: true });
		expect(await states()).toEqual(['waiting', 'attention', 'waiting']);
		expect(await countOutbox(store, who.plantId)).toMatchObject({ due: 3, waiting: 2, attention: 1 });
	});

	it('from the start, when no cursor could tell of a restore, asks again without calling it unsent', async () => {
		await outboxOfThree();
		await apply({ reset: 'start' });
		expect(await states()).toEqual(['received', 'attention', 'waiting']);
		expect(await countOutbox(store, who.plantId)).toMatchObject({ due: 3, waiting: 1 });
	});

	async function settleAll() {
		const db = await store.db();
		for (const entry of await db.getAll('outbox')) await db.put('outbox', { ...entry, due: 0 });
	}
});

describe('another person or plant', () => {
	it('of the session works here from then on', async () => {
		await apply({ reset: 'start', changes: [machineChange(1, 'A')] });
		const other = { ...who, personId: newId(), name: 'Other' };
		await mirror.applyPage(store, page({ cursor: 'c2' }, other), asked('c1'), NOW);
		expect(await readPerson(store)).toMatchObject({
			personId: other.personId,
			name: 'Other',
			since: NOW.toISOString()
		});
		expect(await tags()).toEqual(['A']);
	});

	it('at another plant sees only that plant, and the outbox stays', async () => {
		await outboxOfThree();
		await apply({ reset: 'start', changes: [machineChange(1, 'A')] });
		const other = member();
		const there = page({ reset: 'scope', cursor: 'c2', changes: [machineChange(5, 'B')] }, other);
		expect(await mirror.applyPage(store, there, asked('c1'), NOW)).toMatchObject({ switched: true });
		expect(await tags()).toEqual([]);
		expect(await tags(other)).toEqual(['B']);
		expect(await listRecords(store, who.plantId)).toHaveLength(3);
		expect(await countOutbox(store, other.plantId)).toMatchObject({ due: 0, waiting: 0, elsewhere: 1 });
	});

	it('whose page does not begin at the start is not mixed in', async () => {
		await apply({ reset: 'start', changes: [machineChange(1, 'A')] });
		const other = member();
		const applied = await mirror.applyPage(
			store,
			page({ cursor: 'c2', changes: [machineChange(5, 'B')] }, other),
			asked('c1'),
			NOW
		);
		expect(applied).toEqual({ kind: 'restart' });
		expect([await tags(), await tags(other)]).toEqual([[], []]);
		expect(await mirror.pullPosition(store, other.plantId)).toBeNull();
	});

	it('signing out clears person and mirror and keeps every record', async () => {
		await outboxOfThree();
		await apply({ reset: 'start', changes: [machineChange(1, 'A')] });
		await signOut(store);
		expect(await readPerson(store)).toBeNull();
		expect(await tags()).toEqual([]);
		expect(await mirror.pullPosition(store, who.plantId)).toBeNull();
		expect(await listRecords(store, who.plantId)).toHaveLength(3);
		expect(await countOutbox(store, null)).toMatchObject({ waiting: 1 });
	});
});
