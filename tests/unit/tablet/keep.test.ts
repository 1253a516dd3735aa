/** The promise of keeping: all of it or nothing, numbers without gaps, one record of one draft. */
import { afterEach, describe, expect, it, vi } from 'vitest';
import { envelope, envelopeHash } from '../../../src/lib/records/envelope';
import { highestDrawn } from '../../../src/lib/tablet/store/counters';
import { readDraft, saveDraft } from '../../../src/lib/tablet/store/drafts';
import { KeepFailure, keepCheck } from '../../../src/lib/tablet/store/keep';
import { rememberContact } from '../../../src/lib/tablet/store/contact';
import type { Store } from '../../../src/lib/tablet/store/open';
import { listRecords } from '../../../src/lib/tablet/store/outbox';
import { tabletId } from '../../../src/lib/tablet/store/tablet-id';
import { checkOf, draftOf, member } from '../../sync/samples';
import { freshName, tab } from './database';

const NOW = new Date('2026-03-02T09:00:00Z');
afterEach(() => vi.restoreAllMocks());

async function failureOf(keeping: Promise<unknown>): Promise<KeepFailure> {
	const failure = await keeping.then(
		() => null,
		(error: unknown) => error
	);
	expect(failure).toBeInstanceOf(KeepFailure);
	return failure as KeepFailure;
}

async function untouched(store: Store, draftId: string, of: { plantId: string; personId: string }) {
	const db = await store.db();
	expect(await readDraft(store, draftId)).toBeDefined();
	expect(await db.count('records')).toBe(0);
	const key = { plantId: of.plantId, tabletId: await tabletId(store), authorId: of.personId };
	expect(await highestDrawn(store, key)).toBe(0);
}

describe('keeping a check', () => {
	it('writes record, outbox entry and number and ends the draft', async () => {
		const store = tab(freshName());
		const who = member();
		const draft = draftOf(who);
		await saveDraft(store, draft, NOW);
		await rememberContact(store, { at: '2026-03-01T00:00:00Z', clockOffsetMs: -1234 });
		const record = await keepCheck(store, checkOf(draft), NOW);

		expect(envelope.parse(record)).toMatchObject({
			id: draft.id,
			plantId: who.plantId,
			authorId: who.personId,
			tabletId: await tabletId(store),
			tabletSeq: 1,
			clockOffsetMs: -1234
		});
		expect(record.hash).toBe(await envelopeHash(record));
		const [kept, ...more] = await listRecords(store, who.plantId);
		expect(more).toEqual([]);
		expect(kept).toEqual({ record, keptAt: NOW.toISOString(), status: { state: 'waiting' } });
		expect(await readDraft(store, draft.id)).toBeUndefined();
	});

	it('is on the disk when it is called kept: another tab reads it at once', async () => {
		const name = freshName();
		const [one, two] = [tab(name), tab(name)];
		const who = member();
		const record = await keepCheck(one, checkOf(draftOf(who)), NOW);
		expect((await listRecords(two, who.plantId))[0]?.record).toEqual(record);
	});

	it('asks the browser to flush before it calls a check kept', async () => {
		const store = tab(freshName());
		await tabletId(store);
		const began = vi.spyOn(IDBDatabase.prototype, 'transaction');
		await keepCheck(store, checkOf(draftOf(member())), NOW);
		const keeping = began.mock.calls.find(([stores]) => Array.isArray(stores) && stores.includes('records'));
		expect(keeping?.[2]).toEqual({ durability: 'strict' });
	});

	it('undoes everything when one write fails', async () => {
		const store = tab(freshName());
		const who = member();
		const draft = draftOf(who);
		await saveDraft(store, draft, NOW);
		// An entry of the same id is in the way of the second write of the transaction.
		const db = await store.db();
		await db.add('outbox', {
			plantId: who.plantId,
			id: draft.id,
			authorId: who.personId,
			hash: '',
			bytes: 1,
			keptAt: '',
			state: 'sent',
			due: 0,
			receipt: null,
			trouble: null
		});
		const failure = await failureOf(keepCheck(store, checkOf(draft), NOW));
		expect(failure.code).toBe('store-failed');
		await untouched(store, draft.id, who);
	});

	it('says that the storage is full and leaves the draft', async () => {
		const store = tab(freshName());
		const who = member();
		const draft = draftOf(who);
		await saveDraft(store, draft, NOW);
		await tabletId(store);
		vi.spyOn(IDBObjectStore.prototype, 'add').mockImplementation(() => {
			throw new DOMException('full', 'QuotaExceededError');
		});
		expect((await failureOf(keepCheck(store, checkOf(draft), NOW))).code).toBe('storage-full');
		vi.restoreAllMocks();
		await untouched(store, draft.id, who);
		expect((await keepCheck(store, checkOf(draft), NOW)).tabletSeq).toBe(1);
	});

	it('refuses what the plant would refuse, names the field and leaves the draft', async () => {
		const store = tab(freshName());
		const who = member();
		const draft = draftOf(who);
		draft.answers.teeth = { typed: '0', value: 0, unit: 'teeth', source: 'keypad' };
		await saveDraft(store, draft, NOW);
		const failure = await failureOf(keepCheck(store, checkOf(draft), NOW));
		expect(failure.code).toBe('bad-content');
		expect(failure.issues[0]?.path).toMatch(/^body\.answers\.teeth/);
		await untouched(store, draft.id, who);
	});
});

describe('numbers', () => {
	it('have no gap and no double when two tabs keep at once, for each author', async () => {
		const name = freshName();
		const tabs = [tab(name), tab(name)];
		const first = member();
		const people = [first, member({ plantId: first.plantId })];
		const kept = await Promise.all(
			Array.from({ length: 24 }, (_, i) =>
				keepCheck(tabs[i % 2]!, checkOf(draftOf(people[i % 3 ? 0 : 1]!)), NOW)
			)
		);
		for (const { personId } of people) {
			const numbers = kept.filter((r) => r.authorId === personId).map((r) => r.tabletSeq);
			expect(numbers.sort((a, b) => a - b)).toEqual(numbers.map((_, i) => i + 1));
			expect(numbers.length).toBeGreaterThan(0);
		}
		expect(new Set(kept.map((r) => r.tabletId)).size).toBe(1);
		expect(await listRecords(tabs[0]!, first.plantId)).toHaveLength(24);
	});

	it('start again at another plant', async () => {
		const store = tab(freshName());
		const [here, there] = [member(), member()];
		await keepCheck(store, checkOf(draftOf(here)), NOW);
		expect(
			(await keepCheck(store, checkOf(draftOf({ ...here, plantId: there.plantId })), NOW)).tabletSeq
		).toBe(1);
		expect((await keepCheck(store, checkOf(draftOf(here)), NOW)).tabletSeq).toBe(2);
	});
});

describe('a second keeping of one draft', () => {
	it('by a double tap is the first record', async () => {
		const name = freshName();
		const [one, two] = [tab(name), tab(name)];
		const draft = draftOf(member());
		const [a, b] = await Promise.all([
			keepCheck(one, checkOf(draft), NOW),
			keepCheck(two, checkOf(draft, { performedAt: '2026-03-02T08:00:01.000Z' }), NOW)
		]);
		expect(a).toEqual(b);
		expect(await listRecords(one, draft.plantId)).toHaveLength(1);
		expect(
			(await keepCheck(one, checkOf(draftOf({ plantId: draft.plantId, personId: draft.authorId })), NOW))
				.tabletSeq
		).toBe(2);
	});

	it('with other content is refused and changes nothing', async () => {
		const store = tab(freshName());
		const draft = draftOf(member());
		const record = await keepCheck(store, checkOf(draft), NOW);
		const other = { ...draft, answers: { ...draft.answers, note: 'other' } };
		expect((await failureOf(keepCheck(store, checkOf(other), NOW))).code).toBe('already-kept');
		expect((await listRecords(store, draft.plantId)).map((kept) => kept.record)).toEqual([record]);
	});
});
