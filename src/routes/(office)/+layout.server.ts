/** Who may come into the office, and what its head shows. Every page below asks the guard again for itself. */
import { requireMember } from '$lib/server/auth/guard';
import type { LayoutServerLoad } from './$types';

export const load: LayoutServerLoad = (event) => {
	const scope = requireMember(event, 'planner', 'supervisor');
	const { language, person, member, memberships } = event.locals;
	return {
		language,
		plant: { id: scope.plantId, name: member?.plantName ?? '', note: member?.plantNote ?? null },
		role: scope.role,
		personName: person?.name ?? '',
		otherPlants: memberships
			.filter(({ plantId }) => plantId !== scope.plantId)
			.map(({ plantId, plantName, role }) => ({ plantId, plantName, role }))
	};
};
