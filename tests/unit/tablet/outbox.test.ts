/** Which records go next, what a receipt may change, and when a copy may go. */
import { beforeEach, describe, expect, it } from 'vitest';
import { keepCheck } from '../../../src/lib/tablet/store/keep';
import type { Store } from '../../../src/lib/tablet/store/open';
import {
	countOutbox,
	dueRecords,
	listRecords,
	purgeSent,
	readRecord,
	sendAgain,
	SENT_KEPT_MS,
	settle,
	type Settlement
} from '../../../src/lib/tablet/store/outbox';
import { inTransaction } from '../../../src/lib/tablet/store/transaction';
import type { Envelope } from '../../../src/lib/records/envelope';
import { checkOf, draftOf, member, type Member } from '../../sync/samples';
import { freshName, tab } from './database';

const RECEIVED = '2026-03-02T09:00:00.000Z';
let store: Store;
let who: Member;
beforeEach(() => {
	store = tab(freshName());
	who = member();
});

/** The tablet's clock runs backwards here: nothing may depend on it. */
async function keep(count: number): Promise<Envelope[]> {
	const kept: Envelope[] = [];
	for (let i = 0; i < count; i++) {
		kept.push(await keepCheck(store, checkOf(draftOf(who)), new Date(Date.UTC(2026, 2, 30 - i))));
	}
	return kept;
}
const ids = (records: { id: string }[]) => records.map(({ id }) => id);
const due = (limits: { records: number; bytes: number }, skip: string[] = []) =>
	dueRecords(store, who.plantId, limits, new Set(skip));
const received = ({ id, hash }: Envelope): Settlement => ({
	kind: 'received',
	id,
	hash,
	seq: 1,
	receivedAt: RECEIVED
});

describe('due records', () => {
	it('come in the order of keeping, within both limits, without the skipped ones', async () => {
		const kept = await keep(5);
		expect(ids(await due({ records: 3, bytes: 1e9 }))).toEqual(ids(kept.slice(0, 3)));
		const size = (await due({ records: 1, bytes: 1e9 }))[0]!.bytes;
		expect(size).toBe(new TextEncoder().encode(JSON.stringify(kept[0])).length);
		expect(await due({ records: 50, bytes: size * 2 + 10 })).toHaveLength(2);
		expect(ids(await due({ records: 2, bytes: 1e9 }, [kept[0]!.id, kept[2]!.id]))).toEqual([
			kept[1]!.id,
			kept[3]!.id
		]);
	});

	it('hold at least one, so that a record of any size is offered', async () => {
		await keep(2);
		expect(await due({ records: 50, bytes: 10 })).toHaveLength(1);
	});

	it('are those of one plant', async () => {
		await keep(1);
		expect(await dueRecords(store, member().plantId, { records: 50, bytes: 1e9 }, new Set())).toEqual([]);
	});
});

describe('a settlement', () => {
	it('with another hash changes nothing', async () => {
		const [record] = await keep(1);
		await settle(store, who.plantId, [{ ...received(record!), hash: 'f'.repeat(64) }]);
		expect((await readRecord(store, who.plantId, record!.id))?.status).toEqual({ state: 'waiting' });
		await settle(store, who.plantId, [received(record!)]);
		expect((await readRecord(store, who.plantId, record!.id))?.status).toEqual({
			state: 'received',
			at: RECEIVED
		});
	});

	it('of a refused record names the reason; a later receipt takes it away', async () => {
		const [record] = await keep(1);
		const { id, hash } = record!;
		await settle(store, who.plantId, [{ kind: 'quarantined', id, hash, code: 'bad-content', text: 'why' }]);
		expect(await countOutbox(store, who.plantId)).toMatchObject({ due: 0, waiting: 0, attention: 1 });
		expect((await readRecord(store, who.plantId, id))?.status).toEqual({
			state: 'attention',
			code: 'bad-content',
			text: 'why'
		});
		await settle(store, who.plantId, [received(record!)]);
		expect(await countOutbox(store, who.plantId)).toMatchObject({ due: 0, waiting: 0, attention: 0 });
	});

	it('that only finds trouble leaves the record waiting and due', async () => {
		const [record] = await keep(1);
		const { id, hash } = record!;
		await settle(store, who.plantId, [{ kind: 'trouble', id, hash, code: 'too-large', text: 'why' }]);
		expect(await countOutbox(store, who.plantId)).toMatchObject({ due: 1, waiting: 1, attention: 1 });
	});
});

describe('copies of what was received', () => {
	const after = (ms: number) => new Date(Date.parse(RECEIVED) + SENT_KEPT_MS + ms).toISOString();

	it('go 14 days later by the clock of the plant, and nothing else goes', async () => {
		const [sent, refused, waiting] = await keep(3);
		await settle(store, who.plantId, [
			received(sent!),
			{ kind: 'quarantined', id: refused!.id, hash: refused!.hash, code: 'bad-content', text: 'why' }
		]);
		expect(await purgeSent(store, who.plantId, after(0))).toBe(0);
		expect(await purgeSent(store, who.plantId, after(1))).toBe(1);
		expect(ids((await listRecords(store, who.plantId)).map(({ record }) => record)).sort()).toEqual(
			[refused!.id, waiting!.id].sort()
		);
	});

	it('stay while they are to be pushed once more', async () => {
		const [sent] = await keep(1);
		await settle(store, who.plantId, [received(sent!)]);
		await inTransaction(store, ['outbox'], (tx) => sendAgain(tx.objectStore('outbox'), who.plantId, false));
		expect(await purgeSent(store, who.plantId, after(1))).toBe(0);
	});
});
