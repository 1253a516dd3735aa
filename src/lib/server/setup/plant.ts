/**
 * Sets up a plant with its people and rules, and its machines, over the owner's connection: the application's
 * own role may not make any of these yet. Everything that tablets mirror goes through the log.
 */
import type { MachineRow, PositionRow } from '$lib/records/mirror';
import type { PlantRules } from '$lib/records/plant-rules';
import type { Role } from '$lib/records/protocol';
import { recordChange } from '../db/change-log';
import { asOwner, type Database } from '../db/client';
import { gearPositions, machines } from '../db/schema/machines';
import { plantRules } from '../db/schema/materials';
import { memberships, users } from '../db/schema/people';
import { plantCounters, plants } from '../db/schema/plants';

export interface PersonSetup {
	id: string;
	email: string;
	name: string;
	locale: 'en' | 'es';
	passwordHash: string;
	role: Role;
}

export interface PlantSetup {
	id: string;
	name: string;
	/** Shown at the foot of office pages. */
	note: string | null;
	/** The first supervisor states the rules. A person whose id is known already only gets the membership. */
	people: PersonSetup[];
	rules: PlantRules;
}

export function setUpPlant(owner: Database, setup: PlantSetup, at: Date): Promise<void> {
	const { id: plantId, name, note, people, rules } = setup;
	const supervisor = people.find((person) => person.role === 'supervisor');
	if (!supervisor) throw new Error('A plant needs a supervisor, who states its rules.');
	return asOwner(owner, plantId, async (tx) => {
		await tx.insert(plants).values({ id: plantId, name, note, createdAt: at });
		await tx.insert(plantCounters).values({ plantId });
		for (const { role, ...person } of people) {
			const row = { ...person, email: person.email.toLowerCase(), createdAt: at };
			await tx.insert(users).values(row).onConflictDoNothing({ target: users.id });
			await tx.insert(memberships).values({ plantId, userId: person.id, role });
		}
		const createdBy = supervisor.id;
		await tx.insert(plantRules).values({ plantId, revision: 1, rules, createdBy, createdAt: at });
		await recordChange(tx, plantId, 'rules', plantId);
	});
}

/** Adds machines and their gear positions to a plant that is set up. */
export function addMachines(
	owner: Database,
	plantId: string,
	{ machines: added, positions }: { machines: MachineRow[]; positions: PositionRow[] }
): Promise<void> {
	return asOwner(owner, plantId, async (tx) => {
		for (const machine of added) {
			await tx.insert(machines).values({ plantId, ...machine });
			await recordChange(tx, plantId, 'machine', machine.id);
		}
		for (const position of positions) {
			await tx.insert(gearPositions).values({ plantId, ...position });
			await recordChange(tx, plantId, 'position', position.id);
		}
	});
}
