/** When the plant was last heard, by its own clock, and how far this tablet's clock was from it then. */
import type { Store } from './open';

export interface Contact {
	/** Server's time, ISO 8601. */
	at: string;
	/** Server's clock minus tablet's clock, ms. */
	clockOffsetMs: number;
}

export async function lastContact(store: Store): Promise<Contact | null> {
	const db = await store.db();
	return ((await db.get('settings', 'contact')) as Contact | undefined) ?? null;
}

export async function rememberContact(store: Store, contact: Contact): Promise<void> {
	const db = await store.db();
	await db.put('settings', contact, 'contact');
}
