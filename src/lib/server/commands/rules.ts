/**
 * The supervisor's hand on the plant's rules: a new revision, logged for the tablets and in the audit trail. Records
 * keep the revision they were made with; a revision that someone else made in the meantime is never written over.
 */
import { desc, eq } from 'drizzle-orm';
import { instrumentRules } from '$lib/records/instruments';
import { invalidInput } from '$lib/records/invalid-input';
import { recordAudit } from '../audit';
import { allow } from '../auth/permission';
import { recordChange } from '../db/change-log';
import { inPlant, type Scope } from '../db/client';
import { plantRules } from '../db/schema/materials';
import { plantCounters } from '../db/schema/plants';
import type { Issue } from '../errors';

export type RulesAnswer =
	| { ok: true; revision: number }
	| { ok: false; code: 'invalid-input'; issues: Issue[] }
	/** Someone else made `revision` since the form was opened. */
	| { ok: false; code: 'stale'; revision: number };

/** States how far the plant trusts its tools; every other rule stays as it is. */
export async function reviseTools(
	scope: Scope,
	change: { expectedRevision: number; instruments: unknown },
	at = new Date()
): Promise<RulesAnswer> {
	allow(scope, 'supervisor');
	const parsed = instrumentRules.safeParse(change.instruments);
	if (!parsed.success) {
		const { issues } = invalidInput(parsed.error.issues, change.instruments).error;
		return { ok: false, code: 'invalid-input', issues };
	}
	const { plantId, personId } = scope;
	return inPlant(scope, async (tx): Promise<RulesAnswer> => {
		// Whoever revises next waits here and then sees this revision.
		await tx
			.select({ head: plantCounters.head })
			.from(plantCounters)
			.where(eq(plantCounters.plantId, plantId))
			.for('update');
		const [latest] = await tx
			.select({ revision: plantRules.revision, rules: plantRules.rules })
			.from(plantRules)
			.where(eq(plantRules.plantId, plantId))
			.orderBy(desc(plantRules.revision))
			.limit(1);
		if (!latest) throw new Error('This plant has no rules.');
		if (latest.revision !== change.expectedRevision) {
			return { ok: false, code: 'stale', revision: latest.revision };
		}
		const revision = latest.revision + 1;
		const rules = { ...latest.rules, instruments: parsed.data };
		await tx.insert(plantRules).values({ plantId, revision, rules, createdBy: personId, createdAt: at });
		await recordChange(tx, plantId, 'rules', plantId);
		const detail = { revision, instruments: parsed.data };
		await recordAudit(tx, scope, { action: 'rules-revised', entity: 'rules', entityId: plantId, detail }, at);
		return { ok: true, revision };
	});
}
