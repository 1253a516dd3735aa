/**
 * A tablet says something: it is known from its first contact on, noted as heard, and refused when blocked.
 * The highest numbers it has drawn are kept at every contact, so that a record that never comes is missed.
 */
import { and, eq, inArray, sql } from 'drizzle-orm';
import type { PushRequest } from '$lib/records/protocol';
import { recordAudit } from '../audit';
import type { Scope, Tx } from '../db/client';
import { memberships } from '../db/schema/people';
import { plantCounters } from '../db/schema/plants';
import { tabletAuthors, tablets } from '../db/schema/tablets';

/** @returns whether the tablet may send; a blocked one is noted as heard all the same */
export async function hearTablet(tx: Tx, scope: Scope, tabletId: string, at: Date): Promise<boolean> {
	const heard = await noteHeard(tx, scope, tabletId, at);
	if (heard !== 'unknown') return heard === 'known';
	const [counter] = await tx
		.update(plantCounters)
		.set({ tabletHead: sql`${plantCounters.tabletHead} + 1` })
		.where(eq(plantCounters.plantId, scope.plantId))
		.returning({ number: plantCounters.tabletHead });
	if (!counter) throw new Error('This plant has no counter.');
	const name = `Tablet ${counter.number}`;
	const [added] = await tx
		.insert(tablets)
		.values({
			plantId: scope.plantId,
			id: tabletId,
			number: counter.number,
			name,
			firstHeardAt: at,
			lastHeardAt: at,
			lastHeardFrom: scope.personId
		})
		.onConflictDoNothing()
		.returning({ id: tablets.id });
	if (!added) {
		// Two first contacts at once: the other one came first, and its number stands.
		await tx
			.update(plantCounters)
			.set({ tabletHead: sql`${plantCounters.tabletHead} - 1` })
			.where(eq(plantCounters.plantId, scope.plantId));
		return true;
	}
	const detail = { name };
	await recordAudit(
		tx,
		scope,
		{ action: 'tablet-first-heard', entity: 'tablet', entityId: tabletId, detail },
		at
	);
	return true;
}

async function noteHeard(
	tx: Tx,
	scope: Scope,
	tabletId: string,
	at: Date
): Promise<'known' | 'blocked' | 'unknown'> {
	const here = and(eq(tablets.plantId, scope.plantId), eq(tablets.id, tabletId));
	const [row] = await tx
		.update(tablets)
		.set({
			lastHeardAt: sql`greatest(${tablets.lastHeardAt}, ${at.toISOString()}::timestamptz)`,
			lastHeardFrom: scope.personId
		})
		.where(here)
		.returning({ blockedAt: tablets.blockedAt });
	if (!row) return 'unknown';
	return row.blockedAt ? 'blocked' : 'known';
}

export async function noteDrawn(
	tx: Tx,
	scope: Scope,
	{ tabletId, drawn }: Pick<PushRequest, 'tabletId' | 'drawn'>
): Promise<void> {
	if (!drawn.length) return;
	const highest = new Map<string, number>();
	for (const { authorId, highest: number } of drawn) {
		const id = authorId.toLowerCase();
		highest.set(id, Math.max(number, highest.get(id) ?? 0));
	}
	// Only of people who have or had a right here; anyone else's number is none of this plant's business.
	const people = await tx
		.select({ id: memberships.userId })
		.from(memberships)
		.where(and(eq(memberships.plantId, scope.plantId), inArray(memberships.userId, [...highest.keys()])))
		// Always in the same order, so that two senders never wait for each other crosswise.
		.orderBy(memberships.userId);
	if (!people.length) return;
	await tx
		.insert(tabletAuthors)
		.values(
			people.map(({ id }) => ({
				plantId: scope.plantId,
				tabletId,
				authorId: id,
				highestDrawn: highest.get(id) ?? 0
			}))
		)
		.onConflictDoUpdate({
			target: [tabletAuthors.plantId, tabletAuthors.tabletId, tabletAuthors.authorId],
			set: { highestDrawn: sql`greatest(${tabletAuthors.highestDrawn}, excluded.highest_drawn)` }
		});
}
