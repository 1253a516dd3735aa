/** Machines by tag and their gear positions, with what is known of the gear, its mate and its drive. */
import { sql } from 'drizzle-orm';
import {
	check,
	foreignKey,
	integer,
	jsonb,
	pgTable,
	primaryKey,
	text,
	unique,
	uuid
} from 'drizzle-orm/pg-core';
import type { KnownDrive, KnownGear } from '$lib/records/mirror';
import { plants } from './plants';

export const machines = pgTable(
	'machines',
	{
		plantId: uuid()
			.notNull()
			.references(() => plants.id),
		id: uuid().notNull(),
		tag: text().notNull(),
		name: text().notNull(),
		area: text().notNull(),
		origin: text().$type<'inch' | 'metric'>().notNull()
	},
	(t) => [
		primaryKey({ name: 'machines_pk', columns: [t.plantId, t.id] }),
		unique('machines_tag').on(t.plantId, t.tag),
		check('machines_origin', sql`${t.origin} in ('inch', 'metric')`)
	]
);

export const gearPositions = pgTable(
	'gear_positions',
	{
		plantId: uuid().notNull(),
		id: uuid().notNull(),
		machineId: uuid().notNull(),
		name: text().notNull(),
		ordinal: integer().notNull(),
		mateTeeth: integer(),
		gear: jsonb().$type<KnownGear>(),
		drive: jsonb().$type<KnownDrive>()
	},
	(t) => [
		primaryKey({ name: 'gear_positions_pk', columns: [t.plantId, t.id] }),
		// What a check refers to: a position together with the machine it belongs to.
		unique('gear_positions_of_machine').on(t.plantId, t.machineId, t.id),
		unique('gear_positions_ordinal').on(t.plantId, t.machineId, t.ordinal),
		foreignKey({
			name: 'gear_positions_machine_fk',
			columns: [t.plantId, t.machineId],
			foreignColumns: [machines.plantId, machines.id]
		})
	]
);
