/** One check with everything its verdict came from. */
import { error } from '@sveltejs/kit';
import { requireMember } from '$lib/server/auth/guard';
import { checkPage } from '$lib/server/db/queries/checks';
import { recomputedCheck } from '$lib/server/db/queries/recompute';
import { REFUSAL_TEXT } from '$lib/server/errors';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async (event) => {
	const scope = requireMember(event, 'planner', 'supervisor');
	const check = await checkPage(scope, event.params.check);
	if (!check) error(404, { message: REFUSAL_TEXT['not-found'], code: 'not-found' });
	return { check, recomputed: await recomputedCheck(scope, check.id) };
};
