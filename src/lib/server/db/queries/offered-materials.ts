/** Each material of the plant in its last revision: what remedies are offered from. */
import { desc, eq } from 'drizzle-orm';
import type { MaterialStatement } from '$lib/records/material';
import type { Tx } from '../client';
import { materialRevisions } from '../schema/materials';

export async function offeredMaterials(tx: Tx, plantId: string): Promise<MaterialStatement[]> {
	const rows = await tx
		.selectDistinctOn([materialRevisions.materialId], { statement: materialRevisions.statement })
		.from(materialRevisions)
		.where(eq(materialRevisions.plantId, plantId))
		.orderBy(materialRevisions.materialId, desc(materialRevisions.revision));
	return rows.map(({ statement }) => statement);
}
