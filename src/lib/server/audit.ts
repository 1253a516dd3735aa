/**
 * The audit trail: numbered per plant, every entry's hash covers the one before, so that a row that was
 * changed, removed or slipped in shows. Entries are written in the transaction of what they tell.
 */
import { and, asc, eq, sql } from 'drizzle-orm';
import { canonicalJson, sha256 } from '$lib/records/canonical';
import type { Scope, Tx } from './db/client';
import { readPlant } from './db/client';
import { audit } from './db/schema/audit';
import { plantCounters } from './db/schema/plants';

export interface AuditEntry {
	action: string;
	entity: string;
	entityId: string;
	detail: Record<string, unknown>;
}

const BEFORE_THE_FIRST = '0'.repeat(64);

export async function recordAudit(
	tx: Tx,
	scope: Pick<Scope, 'plantId' | 'personId'>,
	entry: AuditEntry,
	at: Date
): Promise<void> {
	const { plantId, personId: actorId } = scope;
	const [drawn] = await tx
		.update(plantCounters)
		.set({ auditHead: sql`${plantCounters.auditHead} + 1` })
		.where(eq(plantCounters.plantId, plantId))
		.returning({ number: plantCounters.auditHead });
	if (!drawn) throw new Error('This plant has no counter.');
	const [before] = await tx
		.select({ hash: audit.hash })
		.from(audit)
		.where(and(eq(audit.plantId, plantId), eq(audit.number, drawn.number - 1)));
	const row = {
		plantId,
		number: drawn.number,
		at,
		actorId,
		...entry,
		previousHash: before?.hash ?? BEFORE_THE_FIRST
	};
	await tx.insert(audit).values({ ...row, hash: await auditHash(row) });
}

/** Number of the first entry that does not follow from the one before; null when the whole trail holds. */
export async function firstBrokenAudit(scope: Pick<Scope, 'database' | 'plantId'>): Promise<number | null> {
	const { rows, head } = await readPlant(scope, async (tx) => ({
		rows: await tx.select().from(audit).where(eq(audit.plantId, scope.plantId)).orderBy(asc(audit.number)),
		head: (
			await tx
				.select({ head: plantCounters.auditHead })
				.from(plantCounters)
				.where(eq(plantCounters.plantId, scope.plantId))
		)[0]?.head
	}));
	let previousHash = BEFORE_THE_FIRST;
	for (const [index, row] of rows.entries()) {
		const sound =
			row.number === index + 1 && row.previousHash === previousHash && row.hash === (await auditHash(row));
		if (!sound) return index + 1;
		previousHash = row.hash;
	}
	// Entries cut off at the end leave a sound chain, but the counter remembers how many there were.
	return rows.length === head ? null : rows.length + 1;
}

function auditHash(row: Omit<typeof audit.$inferSelect, 'hash'>): Promise<string> {
	const { plantId, number, at, actorId, action, entity, entityId, detail, previousHash } = row;
	return sha256(
		canonicalJson({
			plantId,
			number,
			at: at.toISOString(),
			actorId,
			action,
			entity,
			entityId,
			detail,
			previousHash
		})
	);
}
