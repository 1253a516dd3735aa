/** The planner's first page: positions by the decision they need, tablets with unsent records, last arrivals. */
import { gearInShort } from '$lib/features/machines/gear-in-short';
import { positionsPage, readPositionsQuery } from '$lib/features/machines/positions-view';
import { translator } from '$lib/i18n/catalogue';
import { requireMember } from '$lib/server/auth/guard';
import { listChecks } from '$lib/server/db/queries/checks';
import { listMachines, type PositionStanding } from '$lib/server/db/queries/machines';
import { tabletsLedger } from '$lib/server/db/queries/tablets';
import type { PageServerLoad } from './$types';

const ARRIVALS = 5;

export const load: PageServerLoad = async (event) => {
	const scope = requireMember(event, 'planner', 'supervisor');
	const { language } = event.locals;
	const words = { language, t: translator(language) };
	const query = readPositionsQuery(event.url.searchParams);
	const [{ positions, counts }, { checks }, tablets] = await Promise.all([
		listMachines(scope),
		listChecks(scope),
		tabletsLedger(scope)
	]);
	const textOf = ({ machine, position, check }: PositionStanding) => {
		const { what, made } = check ? gearInShort(check.gear, words) : { what: '', made: '' };
		return [machine.tag, machine.name, machine.area, position.name, what, made].join(' ');
	};
	return {
		query,
		page: positionsPage(positions, query, textOf),
		counts,
		tablets,
		arrivals: checks.slice(0, ARRIVALS),
		now: new Date()
	};
};
