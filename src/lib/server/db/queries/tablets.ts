/**
 * The tablets of a plant: when each was last heard, what it still holds, and which of its records never came.
 * A record that the plant refused has arrived: it stands under attention, not under missing.
 */
import { asc, eq, sql } from 'drizzle-orm';
import { readPlant, type Scope, type Tx } from '../client';
import { quarantine } from '../schema/checks';
import { users } from '../schema/people';
import { tablets } from '../schema/tablets';

export interface TabletLedgerRow {
	id: string;
	number: number;
	name: string;
	lastHeardAt: Date;
	/** Name of the person who was signed in then. */
	lastHeardFrom: string;
	blockedAt: Date | null;
	/** Drawn on the tablet above the highest number that arrived. */
	waiting: number;
	/** Gaps below it: numbers that were drawn and never came, per author. */
	missing: { authorName: string; from: number; to: number }[];
	/** Records of this tablet in quarantine. */
	attention: number;
}

export function tabletsLedger(scope: Scope): Promise<TabletLedgerRow[]> {
	return readPlant(scope, async (tx) => {
		const rows = await tx
			.select({
				id: tablets.id,
				number: tablets.number,
				name: tablets.name,
				lastHeardAt: tablets.lastHeardAt,
				lastHeardFrom: users.name,
				blockedAt: tablets.blockedAt,
				attention: sql<number>`(select count(*) from ${quarantine}
					where ${quarantine.plantId} = ${tablets.plantId} and ${quarantine.tabletId} = ${tablets.id})::int`
			})
			.from(tablets)
			.innerJoin(users, eq(users.id, tablets.lastHeardFrom))
			.where(eq(tablets.plantId, scope.plantId))
			.orderBy(asc(tablets.number));
		const waiting = await waitingOf(tx, scope.plantId);
		const gaps = await gapsOf(tx, scope.plantId);
		return rows.map((row) => ({
			...row,
			waiting: waiting.get(row.id) ?? 0,
			missing: gaps
				.filter((gap) => gap.tabletId === row.id)
				.map(({ authorName, from, to }) => ({ authorName, from, to }))
		}));
	});
}

/**
 * Numbers that arrived, by whatever way; distinct, since a number can be both stored and refused. What was
 * refused may carry any number: it counts only when the tablet says that it drew it.
 */
const arrived = (plantId: string) => sql`
	select tablet_id, author_id, tablet_seq from checks where plant_id = ${plantId}
	union
	select refused.tablet_id, refused.author_id, refused.tablet_seq
	from quarantine refused
	join tablet_authors drawn using (plant_id, tablet_id, author_id)
	where plant_id = ${plantId} and refused.tablet_seq <= drawn.highest_drawn`;

async function waitingOf(tx: Tx, plantId: string): Promise<Map<string, number>> {
	const rows = await tx.execute<{ tablet_id: string; waiting: number }>(sql`
		with arrived as (${arrived(plantId)}),
		highest as (select tablet_id, author_id, max(tablet_seq) as seq from arrived group by 1, 2)
		select drawn.tablet_id,
			sum(greatest(drawn.highest_drawn - coalesce(highest.seq, 0), 0))::float8 as waiting
		from tablet_authors drawn
		left join highest using (tablet_id, author_id)
		where drawn.plant_id = ${plantId}
		group by 1`);
	return new Map(rows.map((row) => [row.tablet_id, row.waiting]));
}

async function gapsOf(tx: Tx, plantId: string) {
	return tx.execute<{ tabletId: string; authorName: string; from: number; to: number }>(sql`
		with arrived as (${arrived(plantId)}),
		steps as (
			select tablet_id, author_id, tablet_seq,
				lag(tablet_seq, 1, 0::bigint) over (partition by tablet_id, author_id order by tablet_seq) as before
			from arrived
		)
		select steps.tablet_id as "tabletId", users.name as "authorName",
			(steps.before + 1)::float8 as "from", (steps.tablet_seq - 1)::float8 as "to"
		from steps
		join memberships member on member.plant_id = ${plantId} and member.user_id = steps.author_id
		join users on users.id = member.user_id
		where steps.tablet_seq > steps.before + 1
		order by 2, 3`);
}
