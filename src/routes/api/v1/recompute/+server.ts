/**
 * What the core that runs now makes of a plant's checks that an older one computed, page by page: for planner and
 * supervisor, to see what an update changes. Nothing is stored.
 */
import { api } from '$lib/server/api';
import { memberScope } from '$lib/server/auth/guard';
import { allow } from '$lib/server/auth/permission';
import { recomputedChecks } from '$lib/server/db/queries/recompute';

export const GET = api(async ({ locals, url }) => {
	const scope = memberScope(locals);
	allow(scope, 'planner', 'supervisor');
	const after = url.searchParams.get('after') ?? '';
	return recomputedChecks(scope, /^\d{1,15}$/.test(after) ? Number(after) : 0);
});
