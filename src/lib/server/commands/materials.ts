/**
 * The supervisor's hand on the list of materials. Every change is a new revision, logged for the tablets and
 * in the audit trail; a revision that someone else made in the meantime is never written over.
 */
import { and, desc, eq } from 'drizzle-orm';
import { newId } from '$lib/records/ids';
import { invalidInput } from '$lib/records/invalid-input';
import { materialStatement, type MaterialStatement } from '$lib/records/material';
import { recordAudit } from '../audit';
import { allow } from '../auth/permission';
import { recordChange } from '../db/change-log';
import { inPlant, type Scope, type Tx } from '../db/client';
import { isId } from '../db/queries/identifier';
import { materialRevisions, materials } from '../db/schema/materials';
import { plantCounters } from '../db/schema/plants';
import type { Issue } from '../errors';

export type MaterialAnswer =
	| { ok: true; id: string; revision: number }
	| { ok: false; code: 'invalid-input'; issues: Issue[] }
	/** Someone else made `revision` since the form was opened. */
	| { ok: false; code: 'stale'; revision: number }
	| { ok: false; code: 'not-found' };

export async function addMaterial(
	scope: Scope,
	statement: unknown,
	at = new Date()
): Promise<MaterialAnswer> {
	allow(scope, 'supervisor');
	const read = readStatement(statement);
	if (!read.ok) return read;
	const id = newId(at.getTime());
	await inPlant(scope, async (tx) => {
		await tx.insert(materials).values({ plantId: scope.plantId, id });
		await addRevision(tx, scope, { id, revision: 1, statement: read.statement, at });
	});
	return { ok: true, id, revision: 1 };
}

export async function reviseMaterial(
	scope: Scope,
	change: { id: string; expectedRevision: number; statement: unknown },
	at = new Date()
): Promise<MaterialAnswer> {
	allow(scope, 'supervisor');
	const { id, expectedRevision, statement } = change;
	if (!isId(id)) return { ok: false, code: 'not-found' };
	const read = readStatement(statement);
	if (!read.ok) return read;
	return inPlant(scope, async (tx): Promise<MaterialAnswer> => {
		// Whoever revises next waits here and then sees this revision.
		await tx
			.select({ head: plantCounters.head })
			.from(plantCounters)
			.where(eq(plantCounters.plantId, scope.plantId))
			.for('update');
		const [latest] = await tx
			.select({ revision: materialRevisions.revision })
			.from(materialRevisions)
			.where(and(eq(materialRevisions.plantId, scope.plantId), eq(materialRevisions.materialId, id)))
			.orderBy(desc(materialRevisions.revision))
			.limit(1);
		if (!latest) return { ok: false, code: 'not-found' };
		if (latest.revision !== expectedRevision) {
			return { ok: false, code: 'stale', revision: latest.revision };
		}
		const revision = latest.revision + 1;
		await addRevision(tx, scope, { id, revision, statement: read.statement, at });
		return { ok: true, id, revision };
	});
}

async function addRevision(
	tx: Tx,
	scope: Scope,
	made: { id: string; revision: number; statement: MaterialStatement; at: Date }
): Promise<void> {
	const { id, revision, statement, at } = made;
	await tx.insert(materialRevisions).values({
		plantId: scope.plantId,
		materialId: id,
		revision,
		statement,
		createdBy: scope.personId,
		createdAt: at
	});
	await recordChange(tx, scope.plantId, 'material', id);
	await recordAudit(
		tx,
		scope,
		{
			action: revision === 1 ? 'material-added' : 'material-revised',
			entity: 'material',
			entityId: id,
			detail: { revision, statement }
		},
		at
	);
}

type ReadStatement =
	{ ok: true; statement: MaterialStatement } | Extract<MaterialAnswer, { code: 'invalid-input' }>;

function readStatement(statement: unknown): ReadStatement {
	const parsed = materialStatement.safeParse(statement);
	if (!parsed.success) {
		return {
			ok: false,
			code: 'invalid-input',
			issues: invalidInput(parsed.error.issues, statement).error.issues
		};
	}
	const unkeepable = Object.entries(parsed.data).filter(([, value]) => !isKeepable(value));
	if (unkeepable.length === 0) return { ok: true, statement: parsed.data };
	const message = 'This holds a character that cannot be kept: type it again.';
	return { ok: false, code: 'invalid-input', issues: unkeepable.map(([path]) => ({ path, message })) };
}

/** PostgreSQL keeps every text in JSON but those with a zero character or half a surrogate pair. */
function isKeepable(value: unknown): boolean {
	return typeof value !== 'string' || !/\0|\p{Surrogate}/u.test(value);
}
