/** How a check reads in one line of a list: the columns, the joins they need and the line made of them. */
import { and, eq, sql } from 'drizzle-orm';
import type { Finish, Outcome, Reason, Verdict } from '$lib/gear/contract';
import type { CheckAnswers } from '$lib/records/check';
import type { ChosenPitch } from '$lib/records/mirror';
import { isReading } from '$lib/records/reading';
import type { Tx } from '../client';
import { checks } from '../schema/checks';
import { gearPositions, machines } from '../schema/machines';
import { materialRevisions, plantRules } from '../schema/materials';
import { users } from '../schema/people';
import { tablets } from '../schema/tablets';

export interface GearSummary {
	teeth: number | null;
	pitch: ChosenPitch | null;
	pressureAngle: number | null;
	form: 'full-depth' | 'stub' | null;
	finish: Finish | null;
	materialName: string | null;
}

export interface CheckSummary {
	id: string;
	seq: number;
	/** The server's own. */
	verdict: Verdict;
	margin: number | null;
	marginLow: number | null;
	/** By the rules with which the check was made. */
	marginNeeded: number;
	reason: Reason | null;
	/** Whether tablet and server came to the same. */
	agrees: boolean;
	performedAt: Date;
	receivedAt: Date;
	authorName: string;
	tabletName: string;
	gear: GearSummary;
	/** A later record amends this one. */
	corrected: boolean;
}

const columns = {
	id: checks.id,
	seq: checks.seq,
	verdict: checks.verdict,
	outcome: checks.serverOutcome,
	answers: sql<CheckAnswers>`${checks.body} -> 'answers'`,
	marginNeeded: sql<number>`(${plantRules.rules} ->> 'bendingMargin')::float8`,
	materialName: sql<string | null>`${materialRevisions.statement} ->> 'name'`,
	agrees: checks.agrees,
	performedAt: checks.performedAt,
	receivedAt: checks.receivedAt,
	authorName: users.name,
	tabletName: tablets.name,
	corrected: sql<boolean>`exists (select from checks later
		where later.plant_id = ${checks.plantId} and later.amends = ${checks.id})`,
	position: {
		id: gearPositions.id,
		name: gearPositions.name,
		ordinal: gearPositions.ordinal,
		mateTeeth: gearPositions.mateTeeth
	},
	machine: { id: machines.id, tag: machines.tag, name: machines.name, area: machines.area }
};

/** Every check with what its line needs; the caller adds which ones and in what order. */
export function selectCheckLines(tx: Tx) {
	return tx
		.select(columns)
		.from(checks)
		.innerJoin(
			gearPositions,
			and(eq(gearPositions.plantId, checks.plantId), eq(gearPositions.id, checks.positionId))
		)
		.innerJoin(machines, and(eq(machines.plantId, checks.plantId), eq(machines.id, checks.machineId)))
		.innerJoin(tablets, and(eq(tablets.plantId, checks.plantId), eq(tablets.id, checks.tabletId)))
		.innerJoin(users, eq(users.id, checks.authorId))
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
		.$dynamic();
}

export type CheckLine = Awaited<ReturnType<typeof selectCheckLines>>[number];

export function summaryOf(line: CheckLine): CheckSummary {
	const { outcome, answers, materialName, position: _position, machine: _machine, ...rest } = line;
	return {
		...rest,
		margin: outcome.bendingMargin,
		marginLow: outcome.bendingMarginLow,
		reason: firstReason(outcome),
		gear: {
			teeth: isReading(answers.teeth) ? answers.teeth.value : null,
			pitch: answers.pitch,
			pressureAngle: answers.pressureAngle,
			form: answers.form,
			finish: answers.finish,
			materialName
		}
	};
}

function firstReason(outcome: Outcome): Reason | null {
	return outcome.reasons[0] ?? null;
}
