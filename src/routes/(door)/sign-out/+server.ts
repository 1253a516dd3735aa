/** Ends the session. A form posted from any page; what a tablet has not sent yet stays on the tablet. */
import { redirect } from '@sveltejs/kit';
import { clearSessionCookie, sessionCookie } from '$lib/server/auth/cookie';
import { signOut } from '$lib/server/auth/session';
import { databaseUnreachable } from '$lib/server/db/postgres-error';
import { database } from '$lib/server/environment';
import type { RequestHandler } from './$types';

export const POST: RequestHandler = async ({ locals, cookies }) => {
	const id = locals.session?.id ?? sessionCookie(cookies);
	clearSessionCookie(cookies);
	try {
		if (id) await signOut(database(), id);
	} catch (failure) {
		// The person leaves this device all the same; without its cookie the session is of no use here.
		if (!databaseUnreachable(failure)) throw failure;
	}
	redirect(303, '/sign-in');
};
