/**
 * What the plant knows of the things that sent records name: authors, positions, and the very revisions of
 * material and rules. Read at once for a whole batch, before the plant's counter is taken.
 */
import { and, eq, inArray, isNull } from 'drizzle-orm';
import type { PlantSide } from '$lib/records/assemble';
import type { Envelope } from '$lib/records/envelope';
import type { MaterialStatement } from '$lib/records/material';
import type { PlantRules } from '$lib/records/plant-rules';
import type { QuarantineCode } from '$lib/records/protocol';
import type { Tx } from '../db/client';
import { offeredMaterials } from '../db/queries/offered-materials';
import { checks } from '../db/schema/checks';
import { gearPositions } from '../db/schema/machines';
import { materialRevisions, plantRules } from '../db/schema/materials';
import { memberships } from '../db/schema/people';

export interface Kept {
	hash: string;
	seq: number;
	receivedAt: Date;
}

export interface RecordContext {
	kept: Map<string, Kept>;
	authors: Set<string>;
	machineOfPosition: Map<string, string>;
	materials: Map<string, MaterialStatement>;
	rules: Map<number, PlantRules>;
	/** The list as it stands: each material in its last revision. */
	offered: MaterialStatement[];
}

export async function contextOf(tx: Tx, plantId: string, records: Envelope[]): Promise<RecordContext> {
	const ids = <T>(of: (record: Envelope) => T | null) =>
		[...new Set(records.map(of))].filter((id): id is T => id !== null);
	const empty: RecordContext = {
		kept: new Map(),
		authors: new Set(),
		machineOfPosition: new Map(),
		materials: new Map(),
		rules: new Map(),
		offered: []
	};
	if (!records.length) return empty;

	const authors = await tx
		.select({ id: memberships.userId })
		.from(memberships)
		.where(
			and(
				eq(memberships.plantId, plantId),
				isNull(memberships.disabledAt),
				inArray(
					memberships.userId,
					ids((r) => r.authorId)
				)
			)
		);
	const positions = await tx
		.select({ id: gearPositions.id, machineId: gearPositions.machineId })
		.from(gearPositions)
		.where(
			and(
				eq(gearPositions.plantId, plantId),
				inArray(
					gearPositions.id,
					ids((r) => r.body.positionId)
				)
			)
		);
	const materialIds = ids((r) => r.body.answers.materialId);
	const materials = materialIds.length
		? await tx
				.select()
				.from(materialRevisions)
				.where(
					and(eq(materialRevisions.plantId, plantId), inArray(materialRevisions.materialId, materialIds))
				)
		: [];
	const rules = await tx.select().from(plantRules).where(eq(plantRules.plantId, plantId));
	return {
		kept: await keptRows(
			tx,
			plantId,
			ids((r) => r.id)
		),
		authors: new Set(authors.map((row) => row.id)),
		machineOfPosition: new Map(positions.map((row) => [row.id, row.machineId])),
		materials: new Map(materials.map((row) => [revisionKey(row.materialId, row.revision), row.statement])),
		rules: new Map(rules.map((row) => [row.revision, row.rules])),
		offered: await offeredMaterials(tx, plantId)
	};
}

export async function keptRows(tx: Tx, plantId: string, ids: string[]): Promise<Map<string, Kept>> {
	const rows = await tx
		.select({ id: checks.id, hash: checks.hash, seq: checks.seq, receivedAt: checks.receivedAt })
		.from(checks)
		.where(and(eq(checks.plantId, plantId), inArray(checks.id, ids)));
	return new Map(rows.map(({ id, ...kept }) => [id, kept]));
}

/** The material and the rules that a record was made with, or why it cannot be placed in this plant. */
export function placeRecord(
	{ authorId, body }: Envelope,
	context: RecordContext
): { ok: true; plantSide: PlantSide } | { ok: false; code: QuarantineCode; text: string } {
	const refuse = (code: QuarantineCode, text: string) => ({ ok: false, code, text }) as const;
	if (!context.authors.has(authorId.toLowerCase())) {
		return refuse('author-not-here', 'Its author does not work at this plant, or no longer does.');
	}
	if (context.machineOfPosition.get(body.positionId.toLowerCase()) !== body.machineId.toLowerCase()) {
		return refuse('unknown-position', 'This plant has no such gear position on such a machine.');
	}
	const { materialRevision, answers } = body;
	if ((answers.materialId === null) !== (materialRevision === null)) {
		return refuse('unknown-material', 'A material and its revision go together.');
	}
	const material =
		answers.materialId === null || materialRevision === null
			? null
			: context.materials.get(revisionKey(answers.materialId, materialRevision));
	if (material === undefined) {
		return refuse('unknown-material', 'This plant has no such material in that revision.');
	}
	const rules = context.rules.get(body.rulesRevision);
	if (!rules) return refuse('unknown-rules', 'This plant has no such revision of its rules.');
	return { ok: true, plantSide: { material, rules, offered: context.offered } };
}

function revisionKey(id: string, revision: number): string {
	return `${id.toLowerCase()}/${revision}`;
}
