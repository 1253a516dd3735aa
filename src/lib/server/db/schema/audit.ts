/** Who did what and when: numbered per plant, each entry hashed over the one before. Append-only. */
import { foreignKey, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { memberships } from './people';
import { count, moment } from './plants';

export const audit = pgTable(
	'audit',
	{
		plantId: uuid().notNull(),
		number: count().notNull(),
		at: moment().notNull(),
		actorId: uuid().notNull(),
		/** A verb of the trade: material-added, material-revised, tablet-first-heard. */
		action: text().notNull(),
		entity: text().notNull(),
		entityId: uuid().notNull(),
		detail: jsonb().$type<Record<string, unknown>>().notNull(),
		previousHash: text().notNull(),
		hash: text().notNull()
	},
	(t) => [
		primaryKey({ name: 'audit_pk', columns: [t.plantId, t.number] }),
		foreignKey({
			name: 'audit_actor_fk',
			columns: [t.plantId, t.actorId],
			foreignColumns: [memberships.plantId, memberships.userId]
		})
	]
);
