/**
 * What a tablet pulls: the plant's changes after its cursor, in commit order, only the latest of each row, each
 * with the row as it is at this one moment. No page repeats or skips, whatever is written in between.
 */
import { and, asc, eq, gt, gte, sql } from 'drizzle-orm';
import { PULL_PAGE, type PullResponse } from '$lib/records/protocol';
import { readCursor, signCursor, type Cursor } from '../../cursor';
import { Refused } from '../../errors';
import { readPlant, type Scope, type Tx } from '../client';
import { checks } from '../schema/checks';
import { memberships, users } from '../schema/people';
import { changes, installation, plantCounters, plants } from '../schema/plants';
import { mirrorRows, type LoggedChange } from './mirror-rows';

/** Older checks stay in the office; a tablet carries half a year. */
const RECENT_DAYS = 180;

export interface PullOptions {
	/** As sent; null at the start. */
	cursor: string | null;
	secret: string;
	now?: Date;
	pageSize?: number;
}

export function pullPage(
	scope: Scope,
	{ cursor: sent, secret, now = new Date(), pageSize = PULL_PAGE }: PullOptions
): Promise<PullResponse> {
	return readPlant(scope, async (tx) => {
		const here = await whereWeAre(tx, scope);
		const held = sent === null ? null : readCursor(sent, secret);
		const reset = sent === null ? 'start' : resetOf(held, here.now);
		const after = reset === null && held ? held.seq : 0;

		const since = new Date(now.getTime() - RECENT_DAYS * 24 * 60 * 60 * 1000);
		const latest = await latestChanges(tx, scope.plantId, { after, since, limit: pageSize + 1 });
		const page = latest.slice(0, pageSize);
		const more = latest.length > pageSize;
		// Without more to come the mirror is complete up to the head, even where the last numbers are not for it.
		const seq = more ? (page.at(-1)?.seq ?? after) : here.now.seq;
		return {
			reset,
			plant: here.plant,
			person: here.person,
			changes: await mirrorRows(tx, scope.plantId, page),
			cursor: signCursor({ ...here.now, seq }, secret),
			more,
			serverTime: now.toISOString()
		};
	});
}

async function whereWeAre(tx: Tx, scope: Scope) {
	const [row] = await tx
		.select({
			epoch: installation.epoch,
			plant: { id: plants.id, name: plants.name },
			person: { id: users.id, name: users.name, role: memberships.role },
			scopeVersion: memberships.scopeVersion,
			head: plantCounters.head
		})
		.from(memberships)
		.innerJoin(users, eq(users.id, memberships.userId))
		.innerJoin(plants, eq(plants.id, memberships.plantId))
		.innerJoin(plantCounters, eq(plantCounters.plantId, memberships.plantId))
		.innerJoin(installation, sql`true`)
		.where(
			and(
				eq(memberships.plantId, scope.plantId),
				eq(memberships.userId, scope.personId),
				sql`${memberships.disabledAt} is null`
			)
		);
	// The right was lost between the session's reading and now.
	if (!row) throw new Refused({ code: 'not-allowed' });
	const { epoch, plant, person, scopeVersion, head } = row;
	return { plant, person, now: { epoch, plant: plant.id, scopeVersion, seq: head } };
}

function resetOf(held: Cursor | null, now: Cursor): 'cursor' | 'epoch' | 'scope' | null {
	if (!held) return 'cursor';
	if (held.epoch !== now.epoch) return 'epoch';
	if (held.plant !== now.plant || held.scopeVersion !== now.scopeVersion) return 'scope';
	return held.seq > now.seq ? 'cursor' : null;
}

function latestChanges(
	tx: Tx,
	plantId: string,
	{ after, since, limit }: { after: number; since: Date; limit: number }
): Promise<LoggedChange[]> {
	const recent = tx
		.select({ one: sql`1` })
		.from(checks)
		.where(
			and(eq(checks.plantId, changes.plantId), eq(checks.id, changes.entityId), gte(checks.receivedAt, since))
		);
	return tx
		.select({
			seq: changes.seq,
			entity: changes.entity,
			entityId: changes.entityId,
			tombstone: changes.tombstone
		})
		.from(changes)
		.where(
			and(
				eq(changes.plantId, plantId),
				gt(changes.seq, after),
				sql`not exists (select from changes later where later.plant_id = ${changes.plantId}
					and later.entity = ${changes.entity} and later.entity_id = ${changes.entityId}
					and later.seq > ${changes.seq})`,
				sql`(${changes.entity} <> 'check' or exists (${recent}))`
			)
		)
		.orderBy(asc(changes.seq))
		.limit(limit);
}
