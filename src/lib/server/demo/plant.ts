/**
 * One plant of the demonstration, made in the order in which it would have happened: people and rules, then
 * materials and machines, then revisions and checks by date.
 */
import { newId } from '$lib/records/ids';
import type { MaterialStatement } from '$lib/records/material';
import type { MachineRow, PositionRow } from '$lib/records/mirror';
import { addMaterial, reviseMaterial } from '../commands/materials';
import type { Database, Scope } from '../db/client';
import { addMachines, setUpPlant, type PersonSetup } from '../setup/plant';
import { DAY, known, pushes, shiftHour, type Material, type Planned } from './history';
import { seededRandom } from './random';
import { DEMO_NOTE, type DemoPlant, type DemoPosition } from './scenario';

const OPENED_DAYS_AGO = 400;

export async function makeDemoPlant(
	database: Database,
	plant: DemoPlant,
	people: Map<string, Omit<PersonSetup, 'role'>>,
	now: Date
): Promise<void> {
	const random = seededRandom(plant.name.length * 7919);
	const ago = (days: number) => new Date(now.getTime() - days * DAY);
	const plantId = newId(ago(OPENED_DAYS_AGO).getTime());
	const members = plant.people.map(({ person, role }) => ({ ...known(people, person.email), role }));
	const scopeOf = (email: string): Scope => {
		const member = members.find((one) => one.email === email);
		if (!member) throw new Error(`${email} does not work at ${plant.name}.`);
		return { database, plantId, personId: member.id, role: member.role };
	};
	const supervisor = plant.people.find(({ role }) => role === 'supervisor')?.person.email ?? '';

	const { name, rules } = plant;
	await setUpPlant(
		database,
		{ id: plantId, name, note: DEMO_NOTE, people: members, rules },
		ago(OPENED_DAYS_AGO)
	);
	const materials = new Map<string, Material>();
	const dated: { at: Date; happen: () => Promise<void> }[] = [];
	for (const material of plant.materials) {
		const at = ago(OPENED_DAYS_AGO - 1);
		const statement = stated(material.statement, at);
		const added = await addMaterial(scopeOf(supervisor), statement, at);
		if (!added.ok) throw new Error(`${material.key} is no material statement.`);
		const revisions = [{ at, statement }];
		materials.set(material.key, { id: added.id, revisions });
		for (const [daysAgo, change] of material.revisions ?? []) {
			const revised = { ...revisions.at(-1)!.statement, ...change, validFrom: day(ago(daysAgo)) };
			const expectedRevision = revisions.length;
			revisions.push({ at: ago(daysAgo), statement: revised });
			dated.push({
				at: ago(daysAgo),
				happen: async () => {
					const revision = { id: added.id, expectedRevision, statement: revised };
					const answer = await reviseMaterial(scopeOf(supervisor), revision, ago(daysAgo));
					if (!answer.ok) throw new Error(`${material.key} could not be revised: ${answer.code}.`);
				}
			});
		}
	}

	const { rows, planned } = machinesOf(plant, materials, { ago, now, random });
	await addMachines(database, plantId, rows);
	dated.push(...pushes(plant, { plantId, planned, materials, scopeOf, random }));
	dated.sort((a, b) => a.at.getTime() - b.at.getTime());
	for (const { happen } of dated) await happen();
}

function machinesOf(
	plant: DemoPlant,
	materials: Map<string, Material>,
	{ ago, now, random }: { ago: (days: number) => Date; now: Date; random: () => number }
) {
	const rows: { machines: MachineRow[]; positions: PositionRow[] } = { machines: [], positions: [] };
	const planned: Planned[] = [];
	for (const { tag, name, area, positions } of plant.machines) {
		const machineId = newId(ago(OPENED_DAYS_AGO).getTime());
		rows.machines.push({ id: machineId, tag, name, area, origin: plant.origin });
		for (const [index, position] of positions.entries()) {
			const positionId = newId(ago(OPENED_DAYS_AGO).getTime());
			rows.positions.push(positionRow(plant, position, { machineId, positionId, index, materials, ago }));
			for (const check of position.checks) {
				const performedAt = shiftHour(ago(check.daysAgo), check.daysAgo, random);
				const delay = Math.min(random() ** 4 * 2 * DAY, (now.getTime() - performedAt.getTime()) / 2);
				const receivedAt = new Date(performedAt.getTime() + 60_000 + delay);
				planned.push({ position, machineId, positionId, check, performedAt, receivedAt });
			}
		}
	}
	planned.sort((a, b) => a.performedAt.getTime() - b.performedAt.getTime());
	return { rows, planned };
}

function positionRow(
	plant: DemoPlant,
	{ name, mateTeeth, gear, drive, checks }: DemoPosition,
	at: {
		machineId: string;
		positionId: string;
		index: number;
		materials: Map<string, Material>;
		ago: (days: number) => Date;
	}
): PositionRow {
	const inch = plant.origin === 'inch';
	return {
		id: at.positionId,
		machineId: at.machineId,
		name,
		ordinal: at.index + 1,
		mateTeeth,
		gear: gear && {
			teeth: gear.teeth,
			pitch: gear.pitch,
			pressureAngle: gear.angle,
			form: gear.form,
			faceWidth: { value: gear.face, unit: inch ? 'in' : 'mm' },
			finish: gear.finish,
			materialId: known(at.materials, gear.material).id,
			asOf: day(at.ago(checks.at(-1)?.daysAgo ?? OPENED_DAYS_AGO))
		},
		drive: drive && {
			power: drive.power === null ? null : { value: drive.power, unit: inch ? 'hp' : 'kW' },
			speedRpm: drive.rpm,
			duty: drive.duty,
			reversing: drive.reversing ?? false
		}
	};
}

function stated(statement: DemoPlant['materials'][number]['statement'], at: Date): MaterialStatement {
	return { ...statement, source: 'invented for the demo', edition: 'demo', validFrom: day(at) };
}

function day(moment: Date): string {
	return moment.toISOString().slice(0, 10);
}
