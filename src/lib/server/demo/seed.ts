/**
 * Fills an empty database with the demonstration, whole or not at all: it is one transaction. Run over the
 * owner's connection by the start command, with no part of SvelteKit loaded.
 */
import { sql } from 'drizzle-orm';
import { newId } from '$lib/records/ids';
import { hashPassword } from '../auth/password';
import { connect, type Database } from '../db/client';
import { installation, plants } from '../db/schema/plants';
import type { PersonSetup } from '../setup/plant';
import { ASHGROVE } from './ashgrove';
import { KETTLE_HOLLOW } from './kettle-hollow';
import { makeDemoPlant } from './plant';

export interface DemoSignIn {
	email: string;
	password: string;
	role: string;
	plant: string;
}

const DEMO_PLANTS = [ASHGROVE, KETTLE_HOLLOW];
/** Any number, but always the same: of two starts at once only one seeds. */
const SEED_LOCK = 4281;

/** @returns the sign-ins of the demonstration; none when the database holds something else */
export async function seedDemo(ownerUrl: string, now = new Date()): Promise<DemoSignIn[]> {
	const owner = connect(ownerUrl, { connections: 1 });
	try {
		return await owner.db.transaction(async (tx) => {
			await tx.execute(sql`select pg_advisory_xact_lock(${SEED_LOCK})`);
			const [anyPlant] = await tx.select({ id: plants.id }).from(plants).limit(1);
			if (anyPlant) {
				const [here] = await tx.select({ demo: installation.demo }).from(installation);
				return here?.demo ? demoSignIns() : [];
			}
			await tx.update(installation).set({ demo: true });
			return fillWithDemo(tx, now);
		});
	} finally {
		await owner.close();
	}
}

/** @param db a transaction over the owner's connection */
export async function fillWithDemo(db: Database['db'], now: Date): Promise<DemoSignIn[]> {
	const people = await demoPeople();
	const database = { db, close: () => Promise.resolve() };
	for (const plant of DEMO_PLANTS) await makeDemoPlant(database, plant, people, now);
	return demoSignIns();
}

async function demoPeople(): Promise<Map<string, Omit<PersonSetup, 'role'>>> {
	const people = new Map<string, Omit<PersonSetup, 'role'>>();
	for (const { person } of DEMO_PLANTS.flatMap((plant) => plant.people)) {
		if (people.has(person.email)) continue;
		const { password, ...rest } = person;
		people.set(person.email, { ...rest, id: newId(), passwordHash: await hashPassword(password) });
	}
	return people;
}

function demoSignIns(): DemoSignIn[] {
	return DEMO_PLANTS.flatMap((plant) =>
		plant.people.map(({ person, role }) => ({
			email: person.email,
			password: person.password,
			role,
			plant: plant.name
		}))
	);
}
