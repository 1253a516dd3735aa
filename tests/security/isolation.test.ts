/**
 * Isolation in the database itself, asked as the application's role in plain SQL: every table, every verb, from
 * either plant. A table that this test does not know fails it.
 */
import { sql, type SQL } from 'drizzle-orm';
import { beforeAll, describe, expect, test } from 'vitest';
import { asOwner, connect, inPlant, type Database, type Tx } from '$lib/server/db/client';
import { databaseFault } from '$lib/server/db/postgres-error';
import { testDatabases } from '../server/fixtures/database';
import { makePlant, type TestPlant } from '../server/fixtures/plant';
import { fillPlant } from '../server/fixtures/record';

const { web, owner } = testDatabases();

/** Which columns of each table the application may change; everything else it may at most add to. */
const PLANT_TABLES: Record<string, { insert: boolean; update: string[] }> = {
	plants: { insert: false, update: [] },
	plant_counters: { insert: false, update: ['head', 'audit_head', 'tablet_head'] },
	memberships: { insert: false, update: [] },
	tablets: { insert: true, update: ['name', 'last_heard_at', 'last_heard_from', 'blocked_at'] },
	tablet_authors: { insert: true, update: ['highest_drawn'] },
	machines: { insert: false, update: [] },
	gear_positions: { insert: false, update: [] },
	materials: { insert: true, update: [] },
	material_revisions: { insert: true, update: [] },
	plant_rules: { insert: true, update: [] },
	checks: { insert: true, update: [] },
	quarantine: { insert: true, update: [] },
	changes: { insert: true, update: [] },
	audit: { insert: true, update: [] }
};
/** These belong to no plant. */
const COMMON_TABLES = ['users', 'sessions', 'installation'];
const DENIED = '42501';
const UNIQUE = '23505';

let here: TestPlant;
let there: TestPlant;

beforeAll(async () => {
	here = await makePlant(web, owner);
	there = await makePlant(web, owner);
	await fillPlant(here);
	await fillPlant(there);
});

const keyOf = (table: string) => sql.identifier(table === 'plants' ? 'id' : 'plant_id');

/** SQLSTATE of a statement in a plant, or how many rows it touched. */
async function tried(plant: TestPlant | null, statement: SQL, database: Database = web) {
	const run = async (tx: Tx) => {
		const rows = await tx.execute(statement);
		return rows.count ?? rows.length;
	};
	try {
		if (!plant) return await database.db.transaction((tx) => run(tx as Tx));
		return await inPlant({ database, plantId: plant.id }, run);
	} catch (failure) {
		const fault = databaseFault(failure);
		if (!fault) throw failure;
		return fault.state;
	}
}

test('every table is known to this test', async () => {
	const rows = await owner.db.execute<{ name: string }>(
		sql`select table_name as name from information_schema.tables where table_schema = 'public'`
	);
	expect(rows.map((row) => row.name).sort()).toEqual([...Object.keys(PLANT_TABLES), ...COMMON_TABLES].sort());
});

test("the application's role owns nothing and may not step around the rules", async () => {
	const [role] = await web.db.execute(sql`
		select r.rolsuper, r.rolbypassrls, r.rolcreaterole, r.rolcreatedb,
			(select count(*)::int from pg_class c where pg_has_role(current_user, c.relowner, 'usage')
				and c.relnamespace = 'public'::regnamespace) as owned,
			has_schema_privilege('public', 'create') as may_create
		from pg_roles r where r.rolname = current_user`);
	expect(role).toMatchObject({
		rolsuper: false,
		rolbypassrls: false,
		rolcreaterole: false,
		rolcreatedb: false,
		owned: 0,
		may_create: false
	});
	// Rules of a view are those of its owner unless it says otherwise.
	const views = await owner.db.execute(sql`
		select relname from pg_class where relkind in ('v', 'm') and relnamespace = 'public'::regnamespace
			and not coalesce('security_invoker=true' = any(reloptions), false)`);
	expect(views).toHaveLength(0);
});

describe.each(Object.entries(PLANT_TABLES))('%s', (table, rights) => {
	const name = sql.identifier(table);
	const key = keyOf(table);

	test('has its rules enabled and forced, and a key that starts with the plant', async () => {
		const [row] = await owner.db.execute<{ enabled: boolean; forced: boolean; first: string }>(sql`
			select c.relrowsecurity as enabled, c.relforcerowsecurity as forced, a.attname as first
			from pg_class c join pg_index i on i.indrelid = c.oid and i.indisprimary
			join pg_attribute a on a.attrelid = c.oid and a.attnum = i.indkey[0]
			where c.oid = ${table}::regclass`);
		expect(row).toEqual({
			enabled: true,
			forced: true,
			first: table === 'plants' ? 'id' : 'plant_id'
		});
	});

	test('shows a plant its own rows and none of another, and none without a plant', async () => {
		for (const [from, to] of [
			[here, there],
			[there, here]
		] as const) {
			const own = await tried(from, sql`select 1 from ${name} where ${key} = ${from.id}`);
			expect(own).toBeGreaterThan(0);
			expect(await tried(from, sql`select 1 from ${name} where ${key} = ${to.id}`)).toBe(0);
			expect(await tried(from, sql`select 1 from ${name} where ${key} <> ${from.id}`)).toBe(0);
		}
		expect(await tried(null, sql`select 1 from ${name}`)).toBe(0);
	});

	test('takes no row for another plant', async () => {
		for (const [from, to] of [
			[here, there],
			[there, here]
		] as const) {
			const rowOf = (plant: TestPlant) =>
				asOwner(owner, plant.id, async (tx) => {
					const rows = await tx.execute<{ row: unknown }>(
						sql`select to_jsonb(t) as row from ${name} t where ${key} = ${plant.id} limit 1`
					);
					return JSON.stringify(rows[0]?.row);
				});
			const insert = (row: string) =>
				sql`insert into ${name} select * from jsonb_populate_record(null::${name}, ${row}::jsonb)`;
			expect(await tried(from, insert(await rowOf(to)))).toBe(DENIED);
			expect(await tried(null, insert(await rowOf(to)))).toBe(DENIED);
			// Its own row is there already: where adding is allowed, only the key refuses it.
			expect(await tried(from, insert(await rowOf(from)))).toBe(rights.insert ? UNIQUE : DENIED);
		}
	});

	test('lets nobody change what is not theirs, nor what is a record', async () => {
		const columns = await owner.db.execute<{ column: string }>(sql`
			select column_name as column from information_schema.columns
			where table_schema = 'public' and table_name = ${table}`);
		for (const { column } of columns) {
			const set = sql`update ${name} set ${sql.identifier(column)} = ${sql.identifier(column)}`;
			const may = rights.update.includes(column);
			for (const [from, to] of [
				[here, there],
				[there, here]
			] as const) {
				expect(await tried(from, sql`${set} where ${key} = ${to.id}`)).toBe(may ? 0 : DENIED);
				const own = await tried(from, sql`${set} where ${key} = ${from.id}`);
				if (may) expect(own).toBeGreaterThan(0);
				else expect(own).toBe(DENIED);
			}
		}
	});

	test('lets nobody remove anything', async () => {
		expect(await tried(here, sql`delete from ${name} where ${key} = ${here.id}`)).toBe(DENIED);
		expect(await tried(here, sql`delete from ${name} where ${key} = ${there.id}`)).toBe(DENIED);
		expect(await tried(here, sql`truncate ${name} cascade`)).toBe(DENIED);
	});

	test('refers to other rows of a plant together with the plant', async () => {
		const keys = await owner.db.execute<{ name: string; first: string }>(sql`
			select f.conname as name, a.attname as first
			from pg_constraint f
			join pg_attribute a on a.attrelid = f.conrelid and a.attnum = f.conkey[1]
			where f.contype = 'f' and f.conrelid = ${table}::regclass and f.confrelid <> 'users'::regclass`);
		for (const foreign of keys) expect(foreign).toMatchObject({ first: 'plant_id' });
	});
});

test('the owner, too, sees one plant at a time', async () => {
	const rows = await asOwner(owner, here.id, (tx) =>
		tx.execute(sql`select 1 from checks where plant_id = ${there.id}`)
	);
	expect(rows).toHaveLength(0);
});

test('a check cannot name a position of another plant, whoever asks', async () => {
	const insert = asOwner(owner, here.id, (tx) =>
		tx.execute(sql`
			insert into gear_positions (plant_id, id, machine_id, name, ordinal)
			values (${here.id}, ${here.id}, ${there.machineIds[0]}, 'borrowed', 9)`)
	);
	await expect(insert.catch((failure) => databaseFault(failure))).resolves.toMatchObject({
		state: '23503',
		constraint: 'gear_positions_machine_fk'
	});
});

test('a connection carries no plant, person or role into its next use', async () => {
	const single = connect(process.env['TEST_DATABASE_URL'] ?? '', { connections: 1 });
	try {
		const before = await single.db.execute(sql`select current_user, pg_backend_pid() as pid`);
		await inPlant({ database: single, plantId: here.id }, (tx) => tx.execute(sql`select 1 from checks`));
		await inPlant({ database: single, plantId: here.id }, async () => {
			throw new Error('planned');
		}).catch(() => null);
		const after = await single.db.execute(sql`select current_user, pg_backend_pid() as pid`);
		expect(after[0]).toEqual(before[0]);
		expect(await single.db.execute(sql`select 1 from checks`)).toHaveLength(0);
		expect(await single.db.execute(sql`select 1 from memberships`)).toHaveLength(0);
	} finally {
		await single.close();
	}
});

test('the common tables give the application no more than it needs', async () => {
	for (const statement of [
		sql`update users set password_hash = 'x'`,
		sql`insert into users (id, email, name, password_hash) values (gen_random_uuid(), 'x', 'x', 'x')`,
		sql`delete from users`,
		sql`truncate users cascade`,
		sql`update installation set demo = true`,
		sql`delete from installation`,
		sql`update sessions set user_id = user_id`,
		sql`truncate sessions`
	]) {
		expect(await tried(here, statement)).toBe(DENIED);
	}
});
