/**
 * Machines for the office: each gear position with its latest check, the ones that need a decision first.
 * Latest means last received: a tablet's clock decides no order.
 */
import { and, asc, desc, eq, inArray } from 'drizzle-orm';
import type { Verdict } from '$lib/gear/contract';
import type { KnownDrive, KnownGear, MachineRow } from '$lib/records/mirror';
import { readPlant, type Scope, type Tx } from '../client';
import { checks } from '../schema/checks';
import { gearPositions, machines } from '../schema/machines';
import { selectCheckLines, summaryOf, type CheckSummary } from './check-summary';
import { isId } from './identifier';

export type Standing = Verdict | 'no-check';

export interface PositionStanding {
	position: { id: string; name: string; ordinal: number; mateTeeth: number | null };
	machine: Omit<MachineRow, 'origin'>;
	standing: Standing;
	/** The latest one. */
	check: CheckSummary | null;
	/** The gear last known here, from the plant's own list. */
	known: KnownGear | null;
}

export interface MachinesList {
	positions: PositionStanding[];
	counts: Record<Standing | 'all', number>;
}

export interface MachinePage {
	machine: MachineRow;
	/** In the order of the machine; `history` newest first, the latest check included. */
	positions: (PositionStanding & { drive: KnownDrive | null; history: CheckSummary[] })[];
}

/** What stops a machine stands before what is in doubt, and that before what is unknown. */
const DECISION_NEEDED: readonly Standing[] = [
	'will-not-carry',
	'not-permitted',
	'close',
	'cannot-say',
	'no-check',
	'carries'
];
const HISTORY_LENGTH = 50;

export function listMachines(scope: Scope): Promise<MachinesList> {
	return readPlant(scope, async (tx) => {
		const rows = await positionsOf(tx, scope);
		const latest = await latestChecks(tx, scope);
		const positions = rows.map((row) => standingOf(row, latest.get(row.position.id) ?? null));
		positions.sort(byDecisionNeeded);
		const counts = { all: positions.length } as MachinesList['counts'];
		for (const standing of DECISION_NEEDED) {
			counts[standing] = positions.filter((p) => p.standing === standing).length;
		}
		return { positions, counts };
	});
}

export async function machinePage(scope: Scope, id: string): Promise<MachinePage | null> {
	if (!isId(id)) return null;
	return readPlant(scope, async (tx) => {
		const [machine] = await tx
			.select({
				id: machines.id,
				tag: machines.tag,
				name: machines.name,
				area: machines.area,
				origin: machines.origin
			})
			.from(machines)
			.where(and(eq(machines.plantId, scope.plantId), eq(machines.id, id)));
		if (!machine) return null;
		const rows = await positionsOf(tx, scope, id);
		const positions: MachinePage['positions'] = [];
		for (const row of rows) {
			const lines = await selectCheckLines(tx)
				.where(and(eq(checks.plantId, scope.plantId), eq(checks.positionId, row.position.id)))
				.orderBy(desc(checks.seq))
				.limit(HISTORY_LENGTH);
			const history = lines.map(summaryOf);
			positions.push({ ...standingOf(row, history[0] ?? null), drive: row.drive, history });
		}
		return { machine, positions };
	});
}

async function positionsOf(tx: Tx, { plantId }: Scope, machineId?: string) {
	return tx
		.select({
			position: {
				id: gearPositions.id,
				name: gearPositions.name,
				ordinal: gearPositions.ordinal,
				mateTeeth: gearPositions.mateTeeth
			},
			machine: { id: machines.id, tag: machines.tag, name: machines.name, area: machines.area },
			known: gearPositions.gear,
			drive: gearPositions.drive
		})
		.from(gearPositions)
		.innerJoin(
			machines,
			and(eq(machines.plantId, gearPositions.plantId), eq(machines.id, gearPositions.machineId))
		)
		.where(
			and(
				eq(gearPositions.plantId, plantId),
				machineId === undefined ? undefined : eq(gearPositions.machineId, machineId)
			)
		)
		.orderBy(asc(machines.tag), asc(gearPositions.ordinal));
}

async function latestChecks(tx: Tx, { plantId }: Scope): Promise<Map<string, CheckSummary>> {
	const latest = tx
		.selectDistinctOn([checks.positionId], { id: checks.id })
		.from(checks)
		.where(eq(checks.plantId, plantId))
		.orderBy(checks.positionId, desc(checks.seq));
	const lines = await selectCheckLines(tx).where(
		and(eq(checks.plantId, plantId), inArray(checks.id, latest))
	);
	return new Map(lines.map((line) => [line.position.id, summaryOf(line)]));
}

function standingOf(
	row: Awaited<ReturnType<typeof positionsOf>>[number],
	check: CheckSummary | null
): PositionStanding {
	const { position, machine, known } = row;
	return { position, machine, known, check, standing: check?.verdict ?? 'no-check' };
}

function byDecisionNeeded(a: PositionStanding, b: PositionStanding): number {
	return (
		DECISION_NEEDED.indexOf(a.standing) - DECISION_NEEDED.indexOf(b.standing) ||
		(a.check?.receivedAt.getTime() ?? 0) - (b.check?.receivedAt.getTime() ?? 0) ||
		a.machine.tag.localeCompare(b.machine.tag) ||
		a.position.ordinal - b.position.ordinal
	);
}
