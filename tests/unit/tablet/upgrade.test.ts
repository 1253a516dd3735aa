/** What an old tablet still holds must outlive every later version: upgrades only add. */
import { forceCloseDatabase } from 'fake-indexeddb';
import { unwrap } from 'idb';
import { describe, expect, it, vi } from 'vitest';
import { keepCheck } from '../../../src/lib/tablet/store/keep';
import { listRecords } from '../../../src/lib/tablet/store/outbox';
import { UPGRADES, type CogmarkDb } from '../../../src/lib/tablet/store/schema';
import { checkOf, draftOf, member } from '../../sync/samples';
import { freshName, tab } from './database';

const NOW = new Date('2026-03-02T09:00:00Z');

function schemaOf(db: CogmarkDb) {
	const names = Array.from(db.objectStoreNames).sort();
	const tx = db.transaction(names);
	return Object.fromEntries(
		names.map((name) => {
			const store = tx.objectStore(name);
			const indexes = Array.from(store.indexNames as Iterable<never>).map((index) => {
				const { name: called, keyPath, unique } = store.index(index);
				return `${called as string}: ${JSON.stringify(keyPath)}${unique ? ' unique' : ''}`;
			});
			return [name, { key: store.keyPath, auto: store.autoIncrement, indexes }];
		})
	);
}

/** As released. An entry here may gain a store or an index by a new version, and lose nothing. */
const RELEASED = {
	counters: { key: ['plantId', 'tabletId', 'authorId'], auto: false, indexes: [] },
	drafts: { key: 'id', auto: false, indexes: ['byAuthor: ["plantId","authorId"]'] },
	mirror: {
		key: ['plantId', 'entity', 'id'],
		auto: false,
		indexes: ['byParent: ["plantId","entity","parentId"]']
	},
	outbox: {
		key: 'order',
		auto: true,
		indexes: ['byDue: ["plantId","due"]', 'byId: ["plantId","id"] unique', 'byState: ["plantId","state"]']
	},
	person: { key: null, auto: false, indexes: [] },
	pulls: { key: 'plantId', auto: false, indexes: [] },
	records: { key: ['plantId', 'id'], auto: false, indexes: [] },
	settings: { key: null, auto: false, indexes: [] }
};

describe('the database of the tablet', () => {
	it('has the stores and indexes that were released', async () => {
		const db = await tab(freshName()).db();
		expect(db.version).toBe(1);
		expect(schemaOf(db)).toEqual(RELEASED);
	});

	it.each(UPGRADES.map((_, i) => i + 1))(
		'keeps the outbox of version %i through every later one',
		async (version) => {
			const name = freshName();
			const old = tab(name, version);
			const who = member();
			const record = await keepCheck(old, checkOf(draftOf(who)), NOW);
			await old.close();
			const now = tab(name);
			expect((await now.db()).version).toBe(UPGRADES.length);
			expect((await listRecords(now, who.plantId)).map((kept) => kept.record)).toEqual([record]);
		}
	);

	it('makes way for a newer version in another tab and says so', async () => {
		const name = freshName();
		const told: string[] = [];
		const old = tab(name, UPGRADES.length, (trouble) => told.push(trouble));
		await old.db();
		const newer = tab(name, UPGRADES.length + 1);
		expect((await newer.db()).version).toBe(UPGRADES.length + 1);
		expect(told).toEqual(['outdated']);
		await expect(old.db()).rejects.toThrow();
		expect(told).toEqual(['outdated', 'outdated']);
	});

	it('opens again after the browser closed it', async () => {
		const name = freshName();
		const told: string[] = [];
		const store = tab(name, undefined, (trouble) => told.push(trouble));
		const who = member();
		const record = await keepCheck(store, checkOf(draftOf(who)), NOW);
		// What a browser does when it takes the store away: the connection is closed and told so.
		forceCloseDatabase(unwrap(await store.db()) as never);
		await vi.waitFor(() => expect(told).toEqual(['terminated']));
		expect((await listRecords(store, who.plantId)).map((kept) => kept.record)).toEqual([record]);
	});
});
