/**
 * Tablets of a plant and, per author, the highest record number each has drawn: from this and the checks that
 * arrived the office tells what still waits and what never came.
 */
import { foreignKey, integer, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core';
import { memberships } from './people';
import { count, moment, plants } from './plants';

export const tablets = pgTable(
	'tablets',
	{
		plantId: uuid()
			.notNull()
			.references(() => plants.id),
		id: uuid().notNull(),
		number: integer().notNull(),
		name: text().notNull(),
		firstHeardAt: moment().notNull(),
		lastHeardAt: moment().notNull(),
		lastHeardFrom: uuid().notNull(),
		blockedAt: moment()
	},
	(t) => [
		primaryKey({ name: 'tablets_pk', columns: [t.plantId, t.id] }),
		unique('tablets_number').on(t.plantId, t.number),
		foreignKey({
			name: 'tablets_last_heard_from_fk',
			columns: [t.plantId, t.lastHeardFrom],
			foreignColumns: [memberships.plantId, memberships.userId]
		})
	]
);

export const tabletAuthors = pgTable(
	'tablet_authors',
	{
		plantId: uuid().notNull(),
		tabletId: uuid().notNull(),
		authorId: uuid().notNull(),
		highestDrawn: count().notNull()
	},
	(t) => [
		primaryKey({ name: 'tablet_authors_pk', columns: [t.plantId, t.tabletId, t.authorId] }),
		foreignKey({
			name: 'tablet_authors_tablet_fk',
			columns: [t.plantId, t.tabletId],
			foreignColumns: [tablets.plantId, tablets.id]
		}),
		foreignKey({
			name: 'tablet_authors_author_fk',
			columns: [t.plantId, t.authorId],
			foreignColumns: [memberships.plantId, memberships.userId]
		})
	]
);
