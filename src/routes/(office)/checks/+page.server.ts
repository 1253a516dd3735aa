/** Checks by arrival, cut into pages by key: what arrives in the meantime moves nothing of the page being read. */
import { VERDICTS } from '$lib/gear/contract';
import { requireMember } from '$lib/server/auth/guard';
import { listChecks } from '$lib/server/db/queries/checks';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async (event) => {
	const scope = requireMember(event, 'planner', 'supervisor');
	const params = event.url.searchParams;
	const verdict = VERDICTS.find((known) => known === params.get('verdict')) ?? null;
	const before = params.get('before');
	return { verdict, before, ...(await listChecks(scope, { cursor: before, verdict })) };
};
