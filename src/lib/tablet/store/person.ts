/**
 * Who works here now. Set after a sign-in, switched when the server says that the session is another's, kept
 * when the session expires. Signing out clears the person and the mirror, never a draft or a record.
 */
import type { Store } from './open';
import type { LocalPerson } from './schema';
import { inTransaction } from './transaction';

const NOW = 'now';

export async function readPerson(store: Store): Promise<LocalPerson | null> {
	const db = await store.db();
	return (await db.get('person', NOW)) ?? null;
}

/** The mirror of any other plant goes: a tablet shows one plant at a time. */
export function setPerson(store: Store, person: LocalPerson): Promise<void> {
	return inTransaction(store, ['person', 'mirror', 'pulls'], async (tx) => {
		const before = await tx.objectStore('person').get(NOW);
		const same = before?.personId === person.personId && before.plantId === person.plantId;
		await tx.objectStore('person').put({ ...person, since: same ? before.since : person.since }, NOW);
		if (before?.plantId === person.plantId) return;
		await tx.objectStore('mirror').clear();
		await tx.objectStore('pulls').clear();
	});
}

export function signOut(store: Store): Promise<void> {
	return inTransaction(
		store,
		['person', 'mirror', 'pulls'],
		async (tx) => {
			await tx.objectStore('person').clear();
			await tx.objectStore('mirror').clear();
			await tx.objectStore('pulls').clear();
		},
		'strict'
	);
}
