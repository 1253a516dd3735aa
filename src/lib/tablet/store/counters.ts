/** The numbers drawn on this tablet: gapless per plant, tablet and author, so that a missing record is seen. */
import type { Store } from './open';
import type { Counter } from './schema';

export async function highestDrawn(
	store: Store,
	key: Pick<Counter, 'plantId' | 'tabletId' | 'authorId'>
): Promise<number> {
	const db = await store.db();
	return (await db.get('counters', [key.plantId, key.tabletId, key.authorId]))?.highest ?? 0;
}

/** Every author's highest number for a plant, as each push tells it. */
export async function drawnAt(
	store: Store,
	plantId: string,
	tabletId: string
): Promise<{ authorId: string; highest: number }[]> {
	const db = await store.db();
	const counters = await db.getAll(
		'counters',
		IDBKeyRange.bound([plantId, tabletId], [plantId, tabletId, []])
	);
	return counters.map(({ authorId, highest }) => ({ authorId, highest }));
}
