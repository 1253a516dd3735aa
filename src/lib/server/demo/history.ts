/**
 * The year of checks of one plant: when each was made and arrived, and how it takes the way of every check,
 * sealed as on a tablet and received through `storeRecords`.
 */
import { answerCheck } from '$lib/records/answer-check';
import { envelopeHash, type Unhashed } from '$lib/records/envelope';
import { newId } from '$lib/records/ids';
import type { MaterialStatement } from '$lib/records/material';
import { storeRecords } from '../commands/records';
import type { Scope } from '../db/client';
import { answersOf } from './answers';
import type { DemoCheck, DemoPlant, DemoPosition } from './scenario';

export const DAY = 24 * 60 * 60 * 1000;

export interface Material {
	id: string;
	/** Each revision with when it was made, oldest first. */
	revisions: { at: Date; statement: MaterialStatement }[];
}

export interface Planned {
	position: DemoPosition;
	machineId: string;
	positionId: string;
	check: DemoCheck;
	performedAt: Date;
	receivedAt: Date;
}

export function pushes(
	plant: DemoPlant,
	made: {
		plantId: string;
		planned: Planned[];
		materials: Map<string, Material>;
		scopeOf: (email: string) => Scope;
		random: () => number;
	}
): { at: Date; happen: () => Promise<void> }[] {
	const { plantId, planned, materials, scopeOf, random } = made;
	const tablets = [0, 1].map(() => ({ id: newId(), drawn: 0, sent: new Date(0) }));
	const last = planned.findLast(({ check }) => check.tablet === 1);
	return planned.map((plan) => {
		const { check, performedAt } = plan;
		const tablet = tablets[check.tablet]!;
		const scope = scopeOf(plant.authors[check.tablet]);
		if (check.tablet === 1 && tablet.drawn === plant.lost.after) tablet.drawn += plant.lost.count;
		const tabletSeq = ++tablet.drawn;
		// A tablet sends its oldest first, so none of its records arrives before an earlier one.
		const at = new Date(Math.max(plan.receivedAt.getTime(), tablet.sent.getTime() + 1000));
		tablet.sent = at;
		const highest = tabletSeq + (plan === last ? plant.waiting : 0);
		const material = known(materials, check.material);
		const revisions = material.revisions.filter((revision) => revision.at <= performedAt);
		const answers = answersOf(plant, plan.position, check, { materialId: material.id, performedAt, random });
		const offered = [...materials.values()].flatMap(
			(one) => one.revisions.findLast((revision) => revision.at <= performedAt)?.statement ?? []
		);
		const plantSide = { material: revisions.at(-1)!.statement, rules: plant.rules, offered };
		const moment = performedAt.toISOString();
		const happen = async () => {
			const unhashed: Unhashed = {
				schemaVersion: 1,
				kind: 'check',
				id: newId(performedAt.getTime()),
				plantId,
				authorId: scope.personId,
				tabletId: tablet.id,
				tabletSeq,
				performedAt: moment,
				clockOffsetMs: 0,
				amends: null,
				photos: [],
				body: {
					machineId: plan.machineId,
					positionId: plan.positionId,
					answers,
					materialRevision: revisions.length,
					rulesRevision: 1,
					outcome: answerCheck(answers, plantSide, moment)
				}
			};
			const record = { ...unhashed, hash: await envelopeHash({ ...unhashed }) };
			const drawn = [{ authorId: scope.personId, highest }];
			const push = { tabletId: tablet.id, drawn, records: [record] };
			const { answers: answered } = await storeRecords(scope, push, at);
			if (answered[0]?.status !== 'stored') {
				throw new Error(`A check of the demonstration was not stored: ${JSON.stringify(answered[0])}`);
			}
		};
		return { at, happen };
	});
}

/** Some hour of that day's shift; for what is less than a day old, the hour itself. */
export function shiftHour(moment: Date, daysAgo: number, random: () => number): Date {
	const hour = 6 + random() * 9;
	if (daysAgo < 1) return moment;
	return new Date(Math.floor(moment.getTime() / DAY) * DAY + hour * 60 * 60 * 1000);
}

export function known<T>(map: Map<string, T>, key: string): T {
	const value = map.get(key);
	if (value === undefined) throw new Error(`The demonstration names ${key}, which it does not have.`);
	return value;
}
