/** Who is signed in, where they work now and where else they may. */
import { api } from '$lib/server/api';
import { Refused } from '$lib/server/errors';

export const GET = api(async ({ locals }) => {
	const { person, member, memberships, outage } = locals;
	if (outage) throw new Refused({ code: 'busy' });
	if (!person) throw new Refused({ code: 'signed-out' });
	return {
		person,
		plant: member && {
			id: member.plantId,
			name: member.plantName,
			note: member.plantNote,
			role: member.role,
			scopeVersion: member.scopeVersion
		},
		memberships: memberships.map(({ plantId, plantName, role }) => ({ plantId, plantName, role }))
	};
});
