/** The rows that logged changes stand for, as a tablet holds them (records/mirror.ts). */
import { and, desc, eq, inArray } from 'drizzle-orm';
import type { Entity, MirrorChange } from '$lib/records/mirror';
import type { Tx } from '../client';
import { checks } from '../schema/checks';
import { gearPositions, machines } from '../schema/machines';
import { materialRevisions, plantRules } from '../schema/materials';
import { users } from '../schema/people';

export interface LoggedChange {
	seq: number;
	entity: Entity;
	entityId: string;
	tombstone: boolean;
}

type Row = NonNullable<MirrorChange['row']>;
type Reader = (tx: Tx, plantId: string, ids: string[]) => Promise<Map<string, Row>>;

/** In the order of the log. A row that is gone, or was logged as gone, is null. */
export async function mirrorRows(tx: Tx, plantId: string, page: LoggedChange[]): Promise<MirrorChange[]> {
	const rows = new Map<Entity, Map<string, Row>>();
	for (const entity of new Set(page.map((change) => change.entity))) {
		const ids = page.filter((change) => change.entity === entity).map((change) => change.entityId);
		rows.set(entity, await READERS[entity](tx, plantId, ids));
	}
	return page.map(({ entity, entityId: id, seq, tombstone }) => {
		const row = tombstone ? null : (rows.get(entity)?.get(id) ?? null);
		return { entity, id, seq, row } as MirrorChange;
	});
}

const READERS: Record<Entity, Reader> = {
	machine: async (tx, plantId, ids) =>
		byId(
			await tx
				.select({
					id: machines.id,
					tag: machines.tag,
					name: machines.name,
					area: machines.area,
					origin: machines.origin
				})
				.from(machines)
				.where(and(eq(machines.plantId, plantId), inArray(machines.id, ids)))
		),
	position: async (tx, plantId, ids) =>
		byId(
			await tx
				.select({
					id: gearPositions.id,
					machineId: gearPositions.machineId,
					name: gearPositions.name,
					ordinal: gearPositions.ordinal,
					mateTeeth: gearPositions.mateTeeth,
					gear: gearPositions.gear,
					drive: gearPositions.drive
				})
				.from(gearPositions)
				.where(and(eq(gearPositions.plantId, plantId), inArray(gearPositions.id, ids)))
		),
	material: async (tx, plantId, ids) => {
		const rows = await tx
			.selectDistinctOn([materialRevisions.materialId])
			.from(materialRevisions)
			.where(and(eq(materialRevisions.plantId, plantId), inArray(materialRevisions.materialId, ids)))
			.orderBy(materialRevisions.materialId, desc(materialRevisions.revision));
		return byId(rows.map(({ materialId: id, revision, statement }) => ({ ...statement, id, revision })));
	},
	// The rules are one row of the mirror; they go by the plant's own id.
	rules: async (tx, plantId) => {
		const [row] = await tx
			.select({ revision: plantRules.revision, rules: plantRules.rules })
			.from(plantRules)
			.where(eq(plantRules.plantId, plantId))
			.orderBy(desc(plantRules.revision))
			.limit(1);
		return new Map(row ? [[plantId, row]] : []);
	},
	check: async (tx, plantId, ids) => {
		const rows = await tx
			.select({
				id: checks.id,
				positionId: checks.positionId,
				performedAt: checks.performedAt,
				receivedAt: checks.receivedAt,
				authorName: users.name,
				verdict: checks.verdict,
				outcome: checks.serverOutcome
			})
			.from(checks)
			.innerJoin(users, eq(users.id, checks.authorId))
			.where(and(eq(checks.plantId, plantId), inArray(checks.id, ids)));
		return byId(
			rows.map(({ outcome, performedAt, receivedAt, ...row }) => ({
				...row,
				performedAt: performedAt.toISOString(),
				receivedAt: receivedAt.toISOString(),
				bendingMargin: outcome.bendingMargin,
				bendingMarginLow: outcome.bendingMarginLow
			}))
		);
	}
};

function byId<T extends Row & { id: string }>(rows: T[]): Map<string, Row> {
	return new Map(rows.map((row) => [row.id, row]));
}
