/**
 * Checks that are being made. Every keystroke is put here, so that a killed tab loses nothing; a draft goes
 * only when its record is kept, in the same transaction, or when its author discards it.
 */
import { noAnswers, type CheckAnswers } from '$lib/records/check';
import { newId } from '$lib/records/ids';
import type { Store } from './open';
import type { Draft } from './schema';
import { inTransaction } from './transaction';

export type DraftStart = Pick<Draft, 'plantId' | 'authorId' | 'machineId' | 'positionId' | 'step'> & {
	/** What is known before anything is answered. */
	answers?: Partial<CheckAnswers>;
};

export async function startDraft(store: Store, start: DraftStart, now: Date): Promise<Draft> {
	const at = now.toISOString();
	const draft: Draft = {
		...start,
		id: newId(now.getTime()),
		answers: { ...structuredClone(noAnswers), ...start.answers },
		entry: null,
		startedAt: at,
		updatedAt: at
	};
	await saveDraft(store, draft, now);
	return draft;
}

/**
 * Puts a draft as it stands. Answers `already-kept` and writes nothing when its record is kept: a late
 * keystroke must not bring a draft back beside the record that was made of it.
 */
export async function saveDraft(store: Store, draft: Draft, now: Date): Promise<'saved' | 'already-kept'> {
	// Through JSON, because a screen's reactive state cannot be cloned into the database.
	const plain = JSON.parse(JSON.stringify({ ...draft, updatedAt: now.toISOString() })) as Draft;
	return inTransaction(store, ['drafts', 'records'], async (tx) => {
		if (await tx.objectStore('records').getKey([plain.plantId, plain.id])) return 'already-kept';
		await tx.objectStore('drafts').put(plain);
		return 'saved';
	});
}

export async function readDraft(store: Store, id: string): Promise<Draft | undefined> {
	const db = await store.db();
	return db.get('drafts', id);
}

/** One author's drafts at one plant, the last touched first. */
export async function listDrafts(store: Store, plantId: string, authorId: string): Promise<Draft[]> {
	const db = await store.db();
	const drafts = await db.getAllFromIndex('drafts', 'byAuthor', [plantId, authorId]);
	return drafts.sort((a, b) => (a.updatedAt < b.updatedAt ? 1 : a.updatedAt > b.updatedAt ? -1 : 0));
}

export async function discardDraft(store: Store, id: string): Promise<void> {
	const db = await store.db();
	await db.delete('drafts', id);
}
