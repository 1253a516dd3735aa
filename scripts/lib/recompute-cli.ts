/**
 * What `npm run -s recompute` prints: of all plants, each check that another core computed and that the core of today
 * answers otherwise, and a summary. Reads each plant inside its own row level security, and writes nothing.
 */
import { asc } from 'drizzle-orm';
import type { Verdict } from '$lib/gear/contract';
import { CORE_VERSION } from '$lib/gear/version';
import { connect, type Database } from '$lib/server/db/client';
import { databaseFault, databaseUnreachable } from '$lib/server/db/postgres-error';
import { recomputedChecks, type RecomputedCheck } from '$lib/server/db/queries/recompute';
import { plants } from '$lib/server/db/schema/plants';

interface Said {
	core: string;
	verdict: Verdict;
	bendingMargin: number | null;
}

/** A check that is answered otherwise than it was. */
interface Change {
	plant: { id: string; name: string };
	check: string;
	was: Said;
	now: Said;
	verdictChanged: boolean;
	marginChanged: boolean;
}

interface Summary {
	core: string;
	plants: number;
	/** That another core computed, changed or not. */
	checks: number;
	verdictsChanged: number;
	marginsChanged: number;
}

interface Options {
	/** JSON lines instead of lines to read. */
	json: boolean;
	print: (line: string) => Promise<void>;
}

/** @param addresses only the owner may list all plants; their rows are read as the application reads them */
export async function recompute(
	addresses: { owner: string; web: string },
	{ json, print }: Options
): Promise<Summary> {
	const owner = connect(addresses.owner, { connections: 1 });
	const web = connect(addresses.web, { connections: 1 });
	try {
		const all = await owner.db
			.select({ id: plants.id, name: plants.name })
			.from(plants)
			.orderBy(asc(plants.name));
		const summary = {
			core: CORE_VERSION,
			plants: all.length,
			checks: 0,
			verdictsChanged: 0,
			marginsChanged: 0
		};
		for (const plant of all) {
			for await (const check of checksOfOtherCores(web, plant.id)) {
				const change = changeOf(plant, check);
				summary.checks++;
				if (change.verdictChanged) summary.verdictsChanged++;
				if (change.marginChanged) summary.marginsChanged++;
				if (!change.verdictChanged && !change.marginChanged) continue;
				await print(json ? JSON.stringify(change) : changeLine(change));
			}
		}
		await print(json ? JSON.stringify({ summary }) : summaryLine(summary));
		return summary;
	} finally {
		await Promise.all([owner.close(), web.close()]);
	}
}

async function* checksOfOtherCores(database: Database, plantId: string): AsyncGenerator<RecomputedCheck> {
	for (let after: number | null = 0; after !== null;) {
		const page: Awaited<ReturnType<typeof recomputedChecks>> = await recomputedChecks(
			{ database, plantId },
			after
		);
		yield* page.checks;
		after = page.next;
	}
}

function changeOf(plant: Change['plant'], { id, was, now, changed }: RecomputedCheck): Change {
	const { core, verdict, bendingMargin } = now;
	return {
		plant,
		check: id,
		was,
		now: { core, verdict, bendingMargin },
		verdictChanged: changed,
		marginChanged: !sameMargin(was.bendingMargin, bendingMargin)
	};
}

/** To one part in 10^9, as tablet and server are compared: less is the rounding of another machine. */
function sameMargin(a: number | null, b: number | null): boolean {
	if (a === null || b === null) return a === b;
	return Math.abs(a - b) <= 1e-9 * Math.max(Math.abs(a), Math.abs(b));
}

function changeLine({ plant, check, was, now, verdictChanged, marginChanged }: Change): string {
	const margin = ({ bendingMargin }: Said) =>
		bendingMargin === null ? 'none' : String(Number(bendingMargin.toPrecision(10)));
	return [
		plant.name,
		check,
		`core ${was.core} -> ${now.core}`,
		verdictChanged ? `VERDICT ${was.verdict} -> ${now.verdict}` : `verdict ${now.verdict}, the same`,
		marginChanged
			? `bending margin ${margin(was)} -> ${margin(now)}`
			: `bending margin ${margin(now)}, the same`
	].join('  ');
}

function summaryLine({ core, plants, checks, verdictsChanged, marginsChanged }: Summary): string {
	return (
		`Plants: ${plants}. Checks of another core than ${core}: ${checks}. ` +
		`Verdicts changed: ${verdictsChanged}. Margins changed: ${marginsChanged}. Nothing was written.`
	);
}

const NOT_LET_IN = ['28P01', '28000', '3D000', '42501'];
const UNKNOWN_TABLE_OR_COLUMN = ['42P01', '42703'];

/** Why the database could not be read, where a person can mend it; the command knows the words for each. */
export function whyUnread(error: unknown): 'no-answer' | 'not-let-in' | 'not-set-up' | null {
	const state = databaseFault(error)?.state ?? '';
	if (NOT_LET_IN.includes(state)) return 'not-let-in';
	if (UNKNOWN_TABLE_OR_COLUMN.includes(state)) return 'not-set-up';
	return databaseUnreachable(error) ? 'no-answer' : null;
}
