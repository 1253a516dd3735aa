/**
 * What the plant knows, as this tablet last pulled it. Rows, cursor, the person they were sent to and the
 * marks for sending again are written in one transaction: after a crash either all of a page is here or none.
 */
import type {
	CheckRow,
	Entity,
	MachineRow,
	MaterialRow,
	MirrorChange,
	PositionRow,
	RulesRow
} from '$lib/records/mirror';
import type { PullResponse } from '$lib/records/protocol';
import type { Store } from './open';
import { sendAgain } from './outbox';
import type { LocalPerson, MirrorEntry, PullPosition } from './schema';
import { inTransaction } from './transaction';

/** What was true when the page was asked for. */
export interface Asked {
	personId: string;
	plantId: string;
	cursor: string | null;
}

export type Applied =
	| { kind: 'applied'; switched: boolean; resend: boolean }
	/** Someone else signed in or out, or another tab wrote a page, since it was asked for: nothing is written. */
	| { kind: 'overtaken' }
	/** The page goes on from a place that this tablet does not have: ask again from the start. */
	| { kind: 'restart' };

function parentOf(change: MirrorChange): string {
	if (change.entity === 'position' && change.row) return change.row.machineId;
	if (change.entity === 'check' && change.row) return change.row.positionId;
	return '';
}

/**
 * Writes one page. A reset clears the mirror first and never the outbox. Unless only the scope changed, a
 * rebuild also means that this tablet cannot know whether the server still has what it received: those records
 * are pushed again. After a restore (`epoch`) they are shown as waiting until there is a new receipt.
 */
export function applyPage(store: Store, page: PullResponse, asked: Asked, now: Date): Promise<Applied> {
	return inTransaction(store, ['person', 'mirror', 'pulls', 'outbox'], async (tx): Promise<Applied> => {
		const [people, mirror, pulls] = [
			tx.objectStore('person'),
			tx.objectStore('mirror'),
			tx.objectStore('pulls')
		];
		const here = await people.get('now');
		const cursor = (await pulls.get(asked.plantId))?.cursor ?? null;
		if (here?.personId !== asked.personId || here.plantId !== asked.plantId || cursor !== asked.cursor) {
			return { kind: 'overtaken' };
		}
		const plantId = page.plant.id;
		const otherPlant = plantId !== here.plantId;
		const switched = otherPlant || page.person.id !== here.personId;
		await people.put(personOf(page, switched ? now.toISOString() : here.since), 'now');
		if (page.reset !== null || otherPlant) {
			await mirror.clear();
			await pulls.clear();
		}
		if (otherPlant && page.reset === null) return { kind: 'restart' };

		const resend = (page.reset !== null && page.reset !== 'scope') || otherPlant;
		if (resend) await sendAgain(tx.objectStore('outbox'), plantId, page.reset === 'epoch');
		for (const change of page.changes) {
			const { entity, id, seq, row } = change;
			if (row === null) await mirror.delete([plantId, entity, id]);
			else await mirror.put({ plantId, entity, id, parentId: parentOf(change), seq, row });
		}
		await pulls.put({ plantId, cursor: page.cursor, complete: !page.more, pulledAt: page.serverTime });
		return { kind: 'applied', switched, resend };
	});
}

function personOf({ person, plant }: PullResponse, since: string): LocalPerson {
	const { id: personId, name, role } = person;
	return { personId, name, role, plantId: plant.id, plantName: plant.name, since };
}

export async function pullPosition(store: Store, plantId: string): Promise<PullPosition | null> {
	const db = await store.db();
	return (await db.get('pulls', plantId)) ?? null;
}

/** Everything under a key that begins with these parts: an array sorts after every string. */
function under(...parts: [string, string] | [string, string, string]): IDBKeyRange {
	return parts.length === 3 ? IDBKeyRange.only(parts) : IDBKeyRange.bound(parts, [...parts, []]);
}

async function all<R>(store: Store, plantId: string, entity: Entity): Promise<R[]> {
	const db = await store.db();
	return rowsOf<R>(await db.getAll('mirror', under(plantId, entity)));
}

async function children<R>(store: Store, plantId: string, entity: Entity, parentId: string): Promise<R[]> {
	const db = await store.db();
	return rowsOf<R>(await db.getAllFromIndex('mirror', 'byParent', under(plantId, entity, parentId)));
}

async function one<R>(store: Store, plantId: string, entity: Entity, id: string): Promise<R | null> {
	const db = await store.db();
	const entry = await db.get('mirror', [plantId, entity, id]);
	return entry ? (entry.row as R) : null;
}

const rowsOf = <R>(entries: MirrorEntry[]): R[] => entries.map((entry) => entry.row as R);
const byText = (a: string, b: string) => a.localeCompare(b, 'en', { numeric: true });

export const machine = (store: Store, plantId: string, id: string) =>
	one<MachineRow>(store, plantId, 'machine', id);
export const position = (store: Store, plantId: string, id: string) =>
	one<PositionRow>(store, plantId, 'position', id);
export const material = (store: Store, plantId: string, id: string) =>
	one<MaterialRow>(store, plantId, 'material', id);

/** By tag. */
export async function machines(store: Store, plantId: string): Promise<MachineRow[]> {
	return (await all<MachineRow>(store, plantId, 'machine')).sort((a, b) => byText(a.tag, b.tag));
}

/** In the order of the machine, of one machine or of all. */
export async function positions(store: Store, plantId: string, machineId?: string): Promise<PositionRow[]> {
	const rows = machineId
		? await children<PositionRow>(store, plantId, 'position', machineId)
		: await all<PositionRow>(store, plantId, 'position');
	return rows.sort((a, b) => a.ordinal - b.ordinal || byText(a.name, b.name));
}

/** By name; what is no longer permitted is here too, so that an old choice can be named. */
export async function materials(store: Store, plantId: string): Promise<MaterialRow[]> {
	return (await all<MaterialRow>(store, plantId, 'material')).sort((a, b) => byText(a.name, b.name));
}

/** The rules in force: the highest revision. */
export async function rules(store: Store, plantId: string): Promise<RulesRow | null> {
	const rows = await all<RulesRow>(store, plantId, 'rules');
	return rows.sort((a, b) => b.revision - a.revision)[0] ?? null;
}

/** Past checks at a position, the last received first: the server's clock orders them. */
export async function checksAt(store: Store, plantId: string, positionId: string): Promise<CheckRow[]> {
	const rows = await children<CheckRow>(store, plantId, 'check', positionId);
	return rows.sort((a, b) => Date.parse(b.receivedAt) - Date.parse(a.receivedAt));
}
