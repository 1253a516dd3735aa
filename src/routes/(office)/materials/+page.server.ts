/** The plant's list of materials as it stands. */
import { requireMember } from '$lib/server/auth/guard';
import { listMaterials } from '$lib/server/db/queries/materials';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async (event) => {
	const scope = requireMember(event, 'planner', 'supervisor');
	return { materials: await listMaterials(scope), today: new Date().toISOString().slice(0, 10) };
};
