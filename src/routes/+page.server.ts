/** The address without a path: each role's own start, or the door. */
import { error, redirect } from '@sveltejs/kit';
import { homeOf } from '$lib/server/auth/guard';
import { REFUSAL_TEXT } from '$lib/server/errors';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = ({ locals }) => {
	if (locals.outage) error(503, { message: REFUSAL_TEXT.busy, code: 'busy' });
	redirect(303, locals.member ? homeOf(locals.member.role) : '/sign-in');
};
