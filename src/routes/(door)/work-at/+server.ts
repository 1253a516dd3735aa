/** Changes the plant in which a person with several works now. Form fields: `plant` and, if wanted, `next`. */
import { error, redirect } from '@sveltejs/kit';
import { homeOf, localPath, signInPath } from '$lib/server/auth/guard';
import { workAt } from '$lib/server/auth/session';
import { database } from '$lib/server/environment';
import { REFUSAL_TEXT } from '$lib/server/errors';
import type { RequestHandler } from './$types';

export const POST: RequestHandler = async ({ locals, request, url }) => {
	const { session, person, outage } = locals;
	if (outage) error(503, { message: REFUSAL_TEXT.busy, code: 'busy' });
	if (!session || !person) redirect(303, signInPath(new URL('/', url)));
	const form = await request.formData();
	const plantId = String(form.get('plant'));
	const member = await workAt(database(), { sessionId: session.id, personId: person.id, plantId });
	if (!member) error(404, { message: REFUSAL_TEXT['not-found'], code: 'not-found' });
	redirect(303, localPath(form.get('next')) ?? homeOf(member.role));
};
