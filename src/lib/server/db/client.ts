/**
 * The connection, and the only ways to plant data. Promise: a query inside `inPlant` runs as the
 * application's role with the plant set for this transaction only, so it sees that plant and no other even
 * where a `where` was forgotten.
 */
import { sql, type ExtractTablesWithRelations } from 'drizzle-orm';
import type { PgDatabase } from 'drizzle-orm/pg-core';
import { drizzle, type PostgresJsQueryResultHKT, type PostgresJsTransaction } from 'drizzle-orm/postgres-js';
import postgres from 'postgres';
import type { Role } from '$lib/records/protocol';

type NoRelations = Record<string, never>;
export type Tx = PostgresJsTransaction<NoRelations, ExtractTablesWithRelations<NoRelations>>;

export interface Database {
	/** For what belongs to no plant: users, sessions, installation. May itself be a transaction, as in the seed. */
	db: PgDatabase<PostgresJsQueryResultHKT, NoRelations>;
	close(): Promise<void>;
}

/** Who works where: made by the guard from a session, by the seed and the tests by hand. */
export interface Scope {
	database: Database;
	plantId: string;
	personId: string;
	role: Role;
}

/** Opens nothing yet: postgres.js connects with the first query. */
export function connect(url: string, options: { connections?: number } = {}): Database {
	const client = postgres(url, {
		max: options.connections ?? 10,
		// A database that does not answer is said so soon; pages that need none must not wait for it.
		connect_timeout: 5,
		onnotice: () => {},
		connection: {
			application_name: 'cogmark',
			statement_timeout: 15_000,
			idle_in_transaction_session_timeout: 30_000
		}
	});
	return {
		db: drizzle(client, { casing: 'snake_case' }),
		close: () => client.end({ timeout: 5 })
	};
}

/** One transaction in one plant, for commands. */
export function inPlant<T>(
	scope: Pick<Scope, 'database' | 'plantId'>,
	work: (tx: Tx) => Promise<T>
): Promise<T> {
	return scope.database.db.transaction(async (tx) => {
		await enter(tx, 'app.plant', scope.plantId);
		return work(tx);
	});
}

/** One moment of one plant, for queries: every statement inside sees the same rows, and none can write. */
export function readPlant<T>(
	scope: Pick<Scope, 'database' | 'plantId'>,
	work: (tx: Tx) => Promise<T>
): Promise<T> {
	return scope.database.db.transaction(
		async (tx) => {
			await enter(tx, 'app.plant', scope.plantId);
			return work(tx);
		},
		{ isolationLevel: 'repeatable read', accessMode: 'read only' }
	);
}

/** What a person may see before a plant is chosen: their own memberships and the plants of those. */
export function asPerson<T>(database: Database, personId: string, work: (tx: Tx) => Promise<T>): Promise<T> {
	return database.db.transaction(
		async (tx) => {
			await enter(tx, 'app.user', personId);
			return work(tx);
		},
		{ accessMode: 'read only' }
	);
}

/**
 * For setting a plant up over the owner's connection. Row level security is forced on the owner too, so this
 * names a plant like everyone else; only the application's missing grants do not bind it.
 */
export function asOwner<T>(owner: Database, plantId: string, work: (tx: Tx) => Promise<T>): Promise<T> {
	return owner.db.transaction(async (tx) => {
		// Within a larger transaction an earlier step may have stepped down to the application's role.
		await tx.execute(sql`select set_config('role', 'none', true), set_config('app.plant', ${plantId}, true)`);
		return work(tx);
	});
}

/** Both settings end with the transaction: a pooled connection carries none into the next one. */
async function enter(tx: Tx, setting: 'app.plant' | 'app.user', id: string): Promise<void> {
	await tx.execute(
		sql`select set_config(${setting}, ${id}, true),
			case when pg_has_role('cogmark_app', 'member') then set_config('role', 'cogmark_app', true) end`
	);
}
