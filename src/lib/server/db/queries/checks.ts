/** Checks for the office: the list by arrival, and one check with everything that its verdict came from. */
import { and, desc, eq, lt } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Outcome, Verdict } from '$lib/gear/contract';
import type { CheckAnswers } from '$lib/records/check';
import type { MaterialStatement } from '$lib/records/material';
import type { MachineRow } from '$lib/records/mirror';
import type { PlantRules } from '$lib/records/plant-rules';
import { readPlant, type Scope, type Tx } from '../client';
import { checks } from '../schema/checks';
import { gearPositions, machines } from '../schema/machines';
import { materialRevisions, plantRules } from '../schema/materials';
import { users } from '../schema/people';
import { tablets } from '../schema/tablets';
import { selectCheckLines, summaryOf, type CheckSummary } from './check-summary';
import { isId } from './identifier';

export type CheckListRow = CheckSummary & {
	machine: { id: string; tag: string; name: string; area: string };
	position: { id: string; name: string };
};

export interface CheckPage {
	id: string;
	seq: number;
	hash: string;
	/** By the tablet's clock. */
	performedAt: Date;
	clockOffsetMs: number | null;
	receivedAt: Date;
	author: { id: string; name: string };
	sentBy: { id: string; name: string };
	tablet: { id: string; number: number; name: string };
	tabletSeq: number;
	machine: MachineRow;
	position: { id: string; name: string; ordinal: number; mateTeeth: number | null };
	answers: CheckAnswers;
	tabletOutcome: Outcome;
	serverOutcome: Outcome;
	agrees: boolean;
	/** As used, and as it stands now. */
	material: { id: string; used: MaterialInRevision; current: MaterialInRevision } | null;
	rules: { used: { revision: number; rules: PlantRules }; currentRevision: number };
	amends: string | null;
	amendedBy: string[];
}

interface MaterialInRevision {
	revision: number;
	statement: MaterialStatement;
}

const PAGE = 50;

/** @param cursor `next` of the page before; the list goes on below it, whatever has arrived since */
export function listChecks(
	scope: Scope,
	{ cursor = null, verdict = null }: { cursor?: string | null; verdict?: Verdict | null } = {}
): Promise<{ checks: CheckListRow[]; next: string | null }> {
	const below = cursor !== null && /^\d{1,15}$/.test(cursor) ? Number(cursor) : null;
	return readPlant(scope, async (tx) => {
		const lines = await selectCheckLines(tx)
			.where(
				and(
					eq(checks.plantId, scope.plantId),
					below === null ? undefined : lt(checks.seq, below),
					verdict === null ? undefined : eq(checks.verdict, verdict)
				)
			)
			.orderBy(desc(checks.seq))
			.limit(PAGE + 1);
		const shown = lines.slice(0, PAGE);
		return {
			checks: shown.map((line) => ({
				...summaryOf(line),
				machine: line.machine,
				position: { id: line.position.id, name: line.position.name }
			})),
			next: lines.length > PAGE ? String(shown.at(-1)?.seq) : null
		};
	});
}

export async function checkPage(scope: Scope, id: string): Promise<CheckPage | null> {
	if (!isId(id)) return null;
	return readPlant(scope, async (tx) => {
		const row = await wholeCheck(tx, scope.plantId, id);
		if (!row) return null;
		const { check, machine, position, tablet, author, sentBy, rules, materialUsed } = row;
		const { plantId: _plantId, ...machineRow } = machine;
		const amending = await tx
			.select({ id: checks.id })
			.from(checks)
			.where(and(eq(checks.plantId, scope.plantId), eq(checks.amends, check.id)))
			.orderBy(checks.seq);
		return {
			id: check.id,
			seq: check.seq,
			hash: check.hash,
			performedAt: check.performedAt,
			clockOffsetMs: check.clockOffsetMs,
			receivedAt: check.receivedAt,
			author,
			sentBy,
			tablet,
			tabletSeq: check.tabletSeq,
			machine: machineRow,
			position,
			answers: check.body.answers,
			tabletOutcome: check.tabletOutcome,
			serverOutcome: check.serverOutcome,
			agrees: check.agrees,
			material:
				check.materialId && materialUsed
					? {
							id: check.materialId,
							used: materialUsed,
							current: (await currentMaterial(tx, scope.plantId, check.materialId)) ?? materialUsed
						}
					: null,
			rules: { used: rules, currentRevision: (await currentRules(tx, scope.plantId)) ?? rules.revision },
			amends: check.amends,
			amendedBy: amending.map((later) => later.id)
		};
	});
}

async function wholeCheck(tx: Tx, plantId: string, id: string) {
	const sender = alias(users, 'sender');
	const [row] = await tx
		.select({
			check: checks,
			machine: machines,
			position: {
				id: gearPositions.id,
				name: gearPositions.name,
				ordinal: gearPositions.ordinal,
				mateTeeth: gearPositions.mateTeeth
			},
			tablet: { id: tablets.id, number: tablets.number, name: tablets.name },
			author: { id: users.id, name: users.name },
			sentBy: { id: sender.id, name: sender.name },
			rules: { revision: plantRules.revision, rules: plantRules.rules },
			materialUsed: { revision: materialRevisions.revision, statement: materialRevisions.statement }
		})
		.from(checks)
		.innerJoin(machines, and(eq(machines.plantId, checks.plantId), eq(machines.id, checks.machineId)))
		.innerJoin(
			gearPositions,
			and(eq(gearPositions.plantId, checks.plantId), eq(gearPositions.id, checks.positionId))
		)
		.innerJoin(tablets, and(eq(tablets.plantId, checks.plantId), eq(tablets.id, checks.tabletId)))
		.innerJoin(users, eq(users.id, checks.authorId))
		.innerJoin(sender, eq(sender.id, checks.sentBy))
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
		.where(and(eq(checks.plantId, plantId), eq(checks.id, id)));
	return row;
}

async function currentMaterial(tx: Tx, plantId: string, id: string): Promise<MaterialInRevision | undefined> {
	const [row] = await tx
		.select({ revision: materialRevisions.revision, statement: materialRevisions.statement })
		.from(materialRevisions)
		.where(and(eq(materialRevisions.plantId, plantId), eq(materialRevisions.materialId, id)))
		.orderBy(desc(materialRevisions.revision))
		.limit(1);
	return row;
}

async function currentRules(tx: Tx, plantId: string): Promise<number | undefined> {
	const [row] = await tx
		.select({ revision: plantRules.revision })
		.from(plantRules)
		.where(eq(plantRules.plantId, plantId))
		.orderBy(desc(plantRules.revision))
		.limit(1);
	return row?.revision;
}
