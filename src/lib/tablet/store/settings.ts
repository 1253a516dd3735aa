/** What a person sets on this tablet. It belongs to the device, not to the person or the plant. */
import type { Store } from './open';
import { inTransaction } from './transaction';

export interface Settings {
	language: 'en' | 'es';
	theme: 'day' | 'night';
}

const DEFAULTS: Settings = { language: 'en', theme: 'day' };

export async function readSettings(store: Store): Promise<Settings> {
	const db = await store.db();
	return { ...DEFAULTS, ...((await db.get('settings', 'settings')) as Partial<Settings> | undefined) };
}

export function changeSettings(store: Store, change: Partial<Settings>): Promise<Settings> {
	return inTransaction(store, ['settings'], async (tx) => {
		const settings = tx.objectStore('settings');
		const before = (await settings.get('settings')) as Partial<Settings> | undefined;
		const after = { ...DEFAULTS, ...before, ...change };
		await settings.put(after, 'settings');
		return after;
	});
}
