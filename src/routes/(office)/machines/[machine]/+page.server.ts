/** One machine: its gear positions, each with what is on record, its drive and its checks. */
import { error } from '@sveltejs/kit';
import { requireMember } from '$lib/server/auth/guard';
import { machinePage } from '$lib/server/db/queries/machines';
import { listMaterials } from '$lib/server/db/queries/materials';
import { REFUSAL_TEXT } from '$lib/server/errors';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async (event) => {
	const scope = requireMember(event, 'planner', 'supervisor');
	const [found, materials] = await Promise.all([
		machinePage(scope, event.params.machine),
		listMaterials(scope)
	]);
	if (!found) error(404, { message: REFUSAL_TEXT['not-found'], code: 'not-found' });
	return {
		...found,
		/** The names of the plant's materials, for gears on record. */
		materialNames: Object.fromEntries(materials.map(({ id, statement }) => [id, statement.name]))
	};
};
