/**
 * The way of kept records to the plant. An entry changes its state only by a receipt whose id and hash match;
 * no answer deletes one. What the plant has is held for 14 more days, counted by the plant's clock.
 */
import type { IDBPObjectStore, StoreNames } from 'idb';
import type { Envelope } from '$lib/records/envelope';
import type { Store } from './open';
import type { CogmarkSchema, OutboxEntry, Trouble, TroubleCode } from './schema';
import { inTransaction } from './transaction';

export const SENT_KEPT_MS = 14 * 24 * 3600 * 1000;

type OutboxStore = IDBPObjectStore<CogmarkSchema, StoreNames<CogmarkSchema>[], 'outbox', 'readwrite'>;

export interface DueRecord {
	id: string;
	hash: string;
	bytes: number;
	record: Envelope;
}

export interface Limits {
	records: number;
	bytes: number;
}

/** The oldest records that must be pushed, within both limits but at least one; `skip` holds ids. */
export async function dueRecords(
	store: Store,
	plantId: string,
	limits: Limits,
	skip: ReadonlySet<string>
): Promise<DueRecord[]> {
	const db = await store.db();
	const tx = db.transaction(['outbox', 'records']);
	const due = await tx
		.objectStore('outbox')
		.index('byDue')
		.getAll([plantId, 1], limits.records + skip.size);
	const batch: DueRecord[] = [];
	let bytes = 0;
	for (const { id, hash, bytes: size } of due) {
		if (skip.has(id)) continue;
		if (batch.length > 0 && (batch.length === limits.records || bytes + size > limits.bytes)) break;
		const record = await tx.objectStore('records').get([plantId, id]);
		// Both were written in one transaction; should the browser have lost one, the others still go.
		if (!record) continue;
		batch.push({ id, hash, bytes: size, record });
		bytes += size;
	}
	await tx.done;
	return batch;
}

/** What became of a record that was pushed. */
export type Settlement =
	| { kind: 'received'; id: string; hash: string; seq: number; receivedAt: string }
	| { kind: 'quarantined'; id: string; hash: string; code: TroubleCode; text: string }
	/** It stays waiting, and a person must look. */
	| { kind: 'trouble'; id: string; hash: string; code: TroubleCode; text: string };

export function settle(store: Store, plantId: string, settlements: Settlement[]): Promise<void> {
	return inTransaction(store, ['outbox'], async (tx) => {
		const outbox = tx.objectStore('outbox');
		for (const settlement of settlements) {
			const entry = await outbox.index('byId').get([plantId, settlement.id]);
			if (!entry || entry.hash !== settlement.hash) continue;
			await outbox.put({ ...entry, ...changeBy(settlement, entry) });
		}
	});
}

function changeBy(settlement: Settlement, entry: OutboxEntry): Partial<OutboxEntry> {
	if (settlement.kind === 'received') {
		const { seq, receivedAt } = settlement;
		return { state: 'sent', due: 0, receipt: { seq, receivedAt }, trouble: null };
	}
	const trouble: Trouble = { code: settlement.code, text: settlement.text };
	if (settlement.kind === 'trouble') return { trouble };
	// A record with a receipt stays received: a later refusal of the same bytes is the server's own matter.
	if (entry.state === 'sent') return { due: 0 };
	return { state: 'quarantined', due: 0, trouble };
}

/**
 * Marks everything that the server answered before to be pushed again, inside the transaction in which the
 * reason is noticed. @param lost after a restore: what was received is shown as waiting until a new receipt
 */
export async function sendAgain(outbox: OutboxStore, plantId: string, lost: boolean): Promise<void> {
	for (const entry of await outbox.index('byDue').getAll([plantId, 0])) {
		await outbox.put({ ...entry, due: 1, state: lost && entry.state === 'sent' ? 'waiting' : entry.state });
	}
}

export interface OutboxCounts {
	/** To be pushed at this plant, those that are sent once more included. */
	due: number;
	waiting: number;
	oldestSince: string | null;
	attention: number;
	/** Waiting for another plant's sign-in. */
	elsewhere: number;
}

/** @param plantId where the person works; null counts everything as waiting, whichever plant it is for */
export async function countOutbox(store: Store, plantId: string | null): Promise<OutboxCounts> {
	const db = await store.db();
	const open = (await db.getAll('outbox')).filter((entry) => entry.state !== 'sent' || entry.due === 1);
	const here = plantId === null ? open : open.filter((entry) => entry.plantId === plantId);
	const waiting = here.filter((entry) => entry.state === 'waiting');
	return {
		due: here.filter((entry) => entry.due === 1).length,
		waiting: waiting.length,
		oldestSince: waiting[0]?.keptAt ?? null,
		attention: here.filter((entry) => entry.state !== 'sent' && entry.trouble !== null).length,
		elsewhere: open.filter((entry) => !here.includes(entry) && entry.state === 'waiting').length
	};
}

/** A record as a screen lists it; the words stand in the message catalogue. */
export type RecordStatus =
	| { state: 'waiting' }
	| { state: 'received'; at: string }
	| { state: 'attention'; code: TroubleCode; text: string };

export interface KeptRecord {
	record: Envelope;
	keptAt: string;
	status: RecordStatus;
}

export function recordStatus(entry: Pick<OutboxEntry, 'state' | 'receipt' | 'trouble'>): RecordStatus {
	if (entry.state === 'sent' && entry.receipt) return { state: 'received', at: entry.receipt.receivedAt };
	if (entry.trouble) return { state: 'attention', ...entry.trouble };
	return { state: 'waiting' };
}

/** What this tablet kept for a plant, the last kept first; of one author or of all. */
export async function listRecords(store: Store, plantId: string, authorId?: string): Promise<KeptRecord[]> {
	const db = await store.db();
	const tx = db.transaction(['outbox', 'records']);
	const entries = await tx
		.objectStore('outbox')
		.index('byId')
		.getAll(IDBKeyRange.bound([plantId], [plantId, []]));
	const listed: KeptRecord[] = [];
	for (const entry of entries.sort((a, b) => (b.order ?? 0) - (a.order ?? 0))) {
		if (authorId !== undefined && entry.authorId !== authorId) continue;
		const record = await tx.objectStore('records').get([plantId, entry.id]);
		if (record) listed.push({ record, keptAt: entry.keptAt, status: recordStatus(entry) });
	}
	await tx.done;
	return listed;
}

export async function readRecord(store: Store, plantId: string, id: string): Promise<KeptRecord | undefined> {
	const db = await store.db();
	const tx = db.transaction(['outbox', 'records']);
	const entry = await tx.objectStore('outbox').index('byId').get([plantId, id]);
	const record = await tx.objectStore('records').get([plantId, id]);
	await tx.done;
	return entry && record ? { record, keptAt: entry.keptAt, status: recordStatus(entry) } : undefined;
}

/**
 * Removes what the plant received more than 14 days before a moment of its own clock. To be called only after
 * a pull that went on from its cursor: a restore that is not noticed yet would make these the last copies.
 */
export function purgeSent(store: Store, plantId: string, serverTime: string): Promise<number> {
	const limit = Date.parse(serverTime) - SENT_KEPT_MS;
	return inTransaction(store, ['outbox', 'records'], async (tx) => {
		const sent = await tx.objectStore('outbox').index('byState').getAll([plantId, 'sent']);
		let purged = 0;
		for (const { order, id, due, receipt } of sent) {
			if (order === undefined || due === 1 || !receipt || Date.parse(receipt.receivedAt) >= limit) continue;
			await tx.objectStore('outbox').delete(order);
			await tx.objectStore('records').delete([plantId, id]);
			purged++;
		}
		return purged;
	});
}
