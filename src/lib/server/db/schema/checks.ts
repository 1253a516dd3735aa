/**
 * Checks as they arrived, and what was refused. Both are append-only: the application's role has no grant to
 * change or remove a row. `envelope` is the canonical JSON whose hash the tablet holds.
 */
import {
	bigint,
	boolean,
	foreignKey,
	index,
	integer,
	jsonb,
	pgTable,
	primaryKey,
	text,
	unique,
	uuid
} from 'drizzle-orm/pg-core';
import type { Outcome, Verdict } from '$lib/gear/contract';
import type { CheckBody } from '$lib/records/check';
import type { QuarantineCode } from '$lib/records/protocol';
import { gearPositions } from './machines';
import { materialRevisions, plantRules } from './materials';
import { memberships } from './people';
import { changes, count, moment } from './plants';
import { tablets } from './tablets';

export const checks = pgTable(
	'checks',
	{
		plantId: uuid().notNull(),
		id: uuid().notNull(),
		seq: count().notNull(),
		hash: text().notNull(),
		envelope: text().notNull(),
		authorId: uuid().notNull(),
		tabletId: uuid().notNull(),
		tabletSeq: count().notNull(),
		performedAt: moment().notNull(),
		clockOffsetMs: bigint({ mode: 'number' }),
		receivedAt: moment().notNull(),
		sentBy: uuid().notNull(),
		machineId: uuid().notNull(),
		positionId: uuid().notNull(),
		materialId: uuid(),
		materialRevision: integer(),
		rulesRevision: integer().notNull(),
		amends: uuid(),
		body: jsonb().$type<CheckBody>().notNull(),
		tabletOutcome: jsonb().$type<Outcome>().notNull(),
		serverOutcome: jsonb().$type<Outcome>().notNull(),
		tabletCore: text().notNull(),
		serverCore: text().notNull(),
		/** Whether tablet and server came to the same verdict and figures. */
		agrees: boolean().notNull(),
		/** The server's verdict: the one that the office ranks and counts by. */
		verdict: text().$type<Verdict>().notNull()
	},
	(t) => [
		primaryKey({ name: 'checks_pk', columns: [t.plantId, t.id] }),
		unique('checks_number').on(t.plantId, t.tabletId, t.authorId, t.tabletSeq),
		unique('checks_seq').on(t.plantId, t.seq),
		index('checks_position_idx').on(t.plantId, t.positionId, t.seq),
		index('checks_verdict_idx').on(t.plantId, t.verdict, t.seq),
		foreignKey({
			name: 'checks_change_fk',
			columns: [t.plantId, t.seq],
			foreignColumns: [changes.plantId, changes.seq]
		}),
		foreignKey({
			name: 'checks_author_fk',
			columns: [t.plantId, t.authorId],
			foreignColumns: [memberships.plantId, memberships.userId]
		}),
		foreignKey({
			name: 'checks_sent_by_fk',
			columns: [t.plantId, t.sentBy],
			foreignColumns: [memberships.plantId, memberships.userId]
		}),
		foreignKey({
			name: 'checks_tablet_fk',
			columns: [t.plantId, t.tabletId],
			foreignColumns: [tablets.plantId, tablets.id]
		}),
		foreignKey({
			name: 'checks_position_fk',
			columns: [t.plantId, t.machineId, t.positionId],
			foreignColumns: [gearPositions.plantId, gearPositions.machineId, gearPositions.id]
		}),
		foreignKey({
			name: 'checks_material_fk',
			columns: [t.plantId, t.materialId, t.materialRevision],
			foreignColumns: [materialRevisions.plantId, materialRevisions.materialId, materialRevisions.revision]
		}),
		foreignKey({
			name: 'checks_rules_fk',
			columns: [t.plantId, t.rulesRevision],
			foreignColumns: [plantRules.plantId, plantRules.revision]
		}),
		foreignKey({
			name: 'checks_amends_fk',
			columns: [t.plantId, t.amends],
			foreignColumns: [t.plantId, t.id]
		})
	]
);

export const quarantine = pgTable(
	'quarantine',
	{
		plantId: uuid().notNull(),
		id: uuid().notNull(),
		/** What was sent, whole, for the supervisor. */
		bytes: text().notNull(),
		bytesHash: text().notNull(),
		code: text().$type<QuarantineCode>().notNull(),
		text: text().notNull(),
		tabletId: uuid().notNull(),
		/** As far as they could be read: so that a refused record does not count as missing. */
		authorId: uuid(),
		tabletSeq: count(),
		sentBy: uuid().notNull(),
		receivedAt: moment().notNull()
	},
	(t) => [
		primaryKey({ name: 'quarantine_pk', columns: [t.plantId, t.id] }),
		// The same bytes refused again for the same reason are kept once, however often a tablet tries.
		unique('quarantine_once').on(t.plantId, t.bytesHash, t.code),
		foreignKey({
			name: 'quarantine_tablet_fk',
			columns: [t.plantId, t.tabletId],
			foreignColumns: [tablets.plantId, tablets.id]
		}),
		foreignKey({
			name: 'quarantine_sent_by_fk',
			columns: [t.plantId, t.sentBy],
			foreignColumns: [memberships.plantId, memberships.userId]
		})
	]
);
