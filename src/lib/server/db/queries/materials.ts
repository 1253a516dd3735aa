/** The plant's materials for the office: the list as it stands, and one material with all its revisions. */
import { and, desc, eq } from 'drizzle-orm';
import type { MaterialStatement } from '$lib/records/material';
import { readPlant, type Scope } from '../client';
import { materialRevisions } from '../schema/materials';
import { users } from '../schema/people';
import { isId } from './identifier';

export interface MaterialRevision {
	revision: number;
	statement: MaterialStatement;
	createdAt: Date;
	createdByName: string;
}

export type MaterialListRow = MaterialRevision & { id: string };

const columns = {
	revision: materialRevisions.revision,
	statement: materialRevisions.statement,
	createdAt: materialRevisions.createdAt,
	createdByName: users.name
};

export async function listMaterials(scope: Scope): Promise<MaterialListRow[]> {
	const rows = await readPlant(scope, (tx) =>
		tx
			.selectDistinctOn([materialRevisions.materialId], { id: materialRevisions.materialId, ...columns })
			.from(materialRevisions)
			.innerJoin(users, eq(users.id, materialRevisions.createdBy))
			.where(eq(materialRevisions.plantId, scope.plantId))
			.orderBy(materialRevisions.materialId, desc(materialRevisions.revision))
	);
	return rows.sort((a, b) => a.statement.name.localeCompare(b.statement.name));
}

export async function materialPage(
	scope: Scope,
	id: string
): Promise<{ id: string; revisions: MaterialRevision[] } | null> {
	if (!isId(id)) return null;
	const revisions = await readPlant(scope, (tx) =>
		tx
			.select(columns)
			.from(materialRevisions)
			.innerJoin(users, eq(users.id, materialRevisions.createdBy))
			.where(and(eq(materialRevisions.plantId, scope.plantId), eq(materialRevisions.materialId, id)))
			.orderBy(desc(materialRevisions.revision))
	);
	return revisions.length ? { id, revisions } : null;
}
