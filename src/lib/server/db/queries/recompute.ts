/**
 * Old checks, answered again by the core that runs now: from the answers, the material's revision and the rules'
 * revision that each was made with. Nothing is written; a stored check keeps the outcome that it arrived with.
 */
import { and, asc, eq, gt, ne, type SQL } from 'drizzle-orm';
import type { Outcome, Verdict } from '$lib/gear/contract';
import { CORE_VERSION } from '$lib/gear/version';
import { answerCheck } from '$lib/records/answer-check';
import type { MaterialStatement } from '$lib/records/material';
import { readPlant, type Scope, type Tx } from '../client';
import { checks } from '../schema/checks';
import { materialRevisions, plantRules } from '../schema/materials';
import { isId } from './identifier';
import { offeredMaterials } from './offered-materials';

export interface RecomputedCheck {
	id: string;
	seq: number;
	was: { core: string; verdict: Verdict; bendingMargin: number | null };
	now: Outcome;
	/** Another verdict than then. */
	changed: boolean;
}

/** One check that another core computed; null where it is this core's own, or not there. */
export function recomputedCheck(scope: Scope, id: string): Promise<RecomputedCheck | null> {
	if (!isId(id)) return Promise.resolve(null);
	return readPlant(scope, async (tx) => (await recomputed(tx, scope, eq(checks.id, id), 1))[0] ?? null);
}

const BATCH = 200;

/** A plant's checks that another core computed, by arrival. @param after the `next` of the page before, or 0 */
export function recomputedChecks(
	scope: Pick<Scope, 'database' | 'plantId'>,
	after: number
): Promise<{ checks: RecomputedCheck[]; next: number | null }> {
	return readPlant(scope, async (tx) => {
		const found = await recomputed(tx, scope, gt(checks.seq, after), BATCH);
		return { checks: found, next: found.length === BATCH ? (found.at(-1)?.seq ?? null) : null };
	});
}

async function recomputed(
	tx: Tx,
	{ plantId }: Pick<Scope, 'plantId'>,
	which: SQL,
	limit: number
): Promise<RecomputedCheck[]> {
	const rows = await tx
		.select({
			id: checks.id,
			seq: checks.seq,
			body: checks.body,
			performedAt: checks.performedAt,
			serverCore: checks.serverCore,
			outcome: checks.serverOutcome,
			rules: plantRules.rules,
			material: materialRevisions.statement
		})
		.from(checks)
		.innerJoin(
			plantRules,
			and(eq(plantRules.plantId, checks.plantId), eq(plantRules.revision, checks.rulesRevision))
		)
		.leftJoin(
			materialRevisions,
			and(
				eq(materialRevisions.plantId, checks.plantId),
				eq(materialRevisions.materialId, checks.materialId),
				eq(materialRevisions.revision, checks.materialRevision)
			)
		)
		.where(and(eq(checks.plantId, plantId), ne(checks.serverCore, CORE_VERSION), which))
		.orderBy(asc(checks.seq))
		.limit(limit);
	const offered: MaterialStatement[] = rows.length > 0 ? await offeredMaterials(tx, plantId) : [];
	return rows.map(({ id, seq, body, performedAt, serverCore, outcome, rules, material }) => {
		const now = answerCheck(body.answers, { material, rules, offered }, performedAt.toISOString());
		const { verdict, bendingMargin } = outcome;
		const was = { core: serverCore, verdict, bendingMargin };
		return { id, seq, was, now, changed: now.verdict !== verdict };
	});
}
