/**
 * Draws the plant's next number and logs what changed under it. The counter's row stays locked until the
 * transaction ends, so numbers appear in commit order; a rolled back savepoint gives its number back. Draw as
 * late as possible: everyone else who writes in the plant waits from here on.
 */
import { eq, sql } from 'drizzle-orm';
import type { Entity } from '$lib/records/mirror';
import type { Tx } from './client';
import { changes, plantCounters } from './schema/plants';

export async function recordChange(
	tx: Tx,
	plantId: string,
	entity: Entity,
	entityId: string,
	tombstone = false
): Promise<number> {
	const [row] = await tx
		.update(plantCounters)
		.set({ head: sql`${plantCounters.head} + 1` })
		.where(eq(plantCounters.plantId, plantId))
		.returning({ seq: plantCounters.head });
	if (!row) throw new Error('This plant has no counter.');
	await tx.insert(changes).values({ plantId, seq: row.seq, entity, entityId, tombstone });
	return row.seq;
}
