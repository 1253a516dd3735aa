/**
 * One transaction, all or nothing: it resolves when everything is on the disk (`strict`: flushed), and an
 * error anywhere in the work undoes all of it. The work may await IndexedDB only, or the browser commits early.
 */
import type { IDBPTransaction, StoreNames } from 'idb';
import type { Store } from './open';
import type { CogmarkDb, CogmarkSchema } from './schema';

type Names = StoreNames<CogmarkSchema>[];

export async function inTransaction<const N extends Names, T>(
	store: Store,
	names: N,
	work: (tx: IDBPTransaction<CogmarkSchema, N, 'readwrite'>) => Promise<T>,
	durability: IDBTransactionDurability = 'default'
): Promise<T> {
	const tx = await begin(store, (db) => db.transaction(names, 'readwrite', { durability }));
	// Awaited below; this only keeps a failure from being reported a second time as unhandled.
	tx.done.catch(() => undefined);
	let result: T;
	try {
		result = await work(tx);
	} catch (error) {
		try {
			tx.abort();
		} catch {
			// It is aborted already: that is why the work failed.
		}
		throw tx.error ?? error;
	}
	await tx.done;
	return result;
}

/** A connection that was closed under us is opened again, once. */
async function begin<T>(store: Store, start: (db: CogmarkDb) => T): Promise<T> {
	try {
		return start(await store.db());
	} catch (error) {
		if (!(error instanceof DOMException && error.name === 'InvalidStateError')) throw error;
		return start(await store.db());
	}
}
