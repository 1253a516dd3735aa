/** The name of this device in the protocol: a UUIDv7 made once, with the database, and kept with it. */
import { newId } from '$lib/records/ids';
import type { Store } from './open';
import { inTransaction } from './transaction';

export async function tabletId(store: Store): Promise<string> {
	const db = await store.db();
	const known = await db.get('settings', 'tabletId');
	return typeof known === 'string' ? known : makeOnce(store, newId());
}

/** Two tabs that start together agree on the one that came first. */
function makeOnce(store: Store, fresh: string): Promise<string> {
	return inTransaction(
		store,
		['settings'],
		async (tx) => {
			const settings = tx.objectStore('settings');
			const known = await settings.get('tabletId');
			if (typeof known === 'string') return known;
			await settings.put(fresh, 'tabletId');
			return fresh;
		},
		'strict'
	);
}
