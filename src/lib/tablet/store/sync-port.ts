/** The store as sending and pulling see it: the shape that tablet/sync asks for, and nothing more. */
import type { PullResponse } from '$lib/records/protocol';
import { lastContact, rememberContact, type Contact } from './contact';
import { drawnAt } from './counters';
import { applyPage, pullPosition, type Asked } from './mirror';
import type { Store } from './open';
import { countOutbox, dueRecords, purgeSent, settle, type Limits, type Settlement } from './outbox';
import { readPerson } from './person';
import { tabletId } from './tablet-id';

export function syncPort(store: Store) {
	return {
		person: () => readPerson(store),
		tabletId: () => tabletId(store),
		drawn: async (plantId: string) => drawnAt(store, plantId, await tabletId(store)),
		due: (plantId: string, limits: Limits, skip: ReadonlySet<string>) =>
			dueRecords(store, plantId, limits, skip),
		settle: (plantId: string, settlements: Settlement[]) => settle(store, plantId, settlements),
		counts: (plantId: string | null) => countOutbox(store, plantId),
		cursor: async (plantId: string) => (await pullPosition(store, plantId))?.cursor ?? null,
		applyPage: (page: PullResponse, asked: Asked, now: Date) => applyPage(store, page, asked, now),
		purgeSent: (plantId: string, serverTime: string) => purgeSent(store, plantId, serverTime),
		lastContact: () => lastContact(store),
		rememberContact: (contact: Contact) => rememberContact(store, contact)
	};
}
