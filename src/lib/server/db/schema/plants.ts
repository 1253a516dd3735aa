/**
 * Plants and what orders their data: the counter that every write draws from and the log of changes that
 * tablets pull. Promise: `seq` of a plant is 1..head without gaps, in commit order.
 */
import { sql } from 'drizzle-orm';
import {
	bigint,
	boolean,
	check,
	index,
	pgTable,
	primaryKey,
	smallint,
	text,
	timestamp,
	uuid
} from 'drizzle-orm/pg-core';
import type { Entity } from '$lib/records/mirror';

/** Moments are kept to the millisecond, so that what is hashed in JavaScript reads back the same. */
export const moment = () => timestamp({ withTimezone: true, precision: 3 });
export const count = () => bigint({ mode: 'number' });

export const plants = pgTable('plants', {
	id: uuid().primaryKey(),
	name: text().notNull().unique(),
	/** Shown at the foot of office pages, such as "Figures are invented demo data." */
	note: text(),
	createdAt: moment().notNull().defaultNow()
});

/** One row a plant. Whoever updates it holds the plant's order until the transaction ends. */
export const plantCounters = pgTable('plant_counters', {
	plantId: uuid()
		.primaryKey()
		.references(() => plants.id),
	head: count().notNull().default(0),
	auditHead: count().notNull().default(0),
	tabletHead: count().notNull().default(0)
});

export const changes = pgTable(
	'changes',
	{
		plantId: uuid()
			.notNull()
			.references(() => plants.id),
		seq: count().notNull(),
		entity: text().$type<Entity>().notNull(),
		entityId: uuid().notNull(),
		tombstone: boolean().notNull().default(false)
	},
	(t) => [
		primaryKey({ name: 'changes_pk', columns: [t.plantId, t.seq] }),
		// Pull asks whether a later change of the same row exists.
		index('changes_entity_idx').on(t.plantId, t.entity, t.entityId, t.seq)
	]
);

/** A single row. A restored backup gets a new epoch, so that every mirror notices. */
export const installation = pgTable(
	'installation',
	{
		id: smallint().primaryKey().default(1),
		epoch: uuid().notNull().defaultRandom(),
		/** True when the demo was seeded here: only then are its sign-ins printed. */
		demo: boolean().notNull().default(false)
	},
	(t) => [check('installation_single', sql`${t.id} = 1`)]
);
