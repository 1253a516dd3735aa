/**
 * People, their role at each plant, and their sessions. A person is not data of a plant, so `users` and
 * `sessions` carry no plant key; everything that a plant shows of a person goes through a membership.
 */
import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import type { Role } from '$lib/records/protocol';
import { moment, plants } from './plants';

export const users = pgTable('users', {
	id: uuid().primaryKey(),
	/** Lower case, as compared at sign-in. */
	email: text().notNull().unique(),
	name: text().notNull(),
	locale: text().$type<'en' | 'es'>().notNull().default('en'),
	/** argon2id in PHC form. */
	passwordHash: text().notNull(),
	createdAt: moment().notNull().defaultNow()
});

export const memberships = pgTable(
	'memberships',
	{
		plantId: uuid()
			.notNull()
			.references(() => plants.id),
		userId: uuid()
			.notNull()
			.references(() => users.id),
		role: text().$type<Role>().notNull(),
		/** Raised whenever role or reach changes: a tablet then rebuilds its mirror, never its outbox. */
		scopeVersion: integer().notNull().default(1),
		disabledAt: moment()
	},
	(t) => [
		primaryKey({ name: 'memberships_pk', columns: [t.plantId, t.userId] }),
		index('memberships_user_idx').on(t.userId),
		check('memberships_role', sql`${t.role} in ('millwright', 'planner', 'supervisor')`)
	]
);

export const sessions = pgTable(
	'sessions',
	{
		id: text().primaryKey(),
		userId: uuid()
			.notNull()
			.references(() => users.id),
		expiresAt: moment().notNull(),
		/** The plant in which the person works now. */
		plantId: uuid()
	},
	(t) => [
		index('sessions_user_idx').on(t.userId),
		foreignKey({
			name: 'sessions_membership_fk',
			columns: [t.plantId, t.userId],
			foreignColumns: [memberships.plantId, memberships.userId]
		})
	]
);
