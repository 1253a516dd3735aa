/**
 * Before and after every request: language, who asks, headers. Promise: a database that is down takes away no
 * page that needs none, because the tablet's shell must still load.
 */
import { building } from '$app/environment';
import type { Handle, HandleServerError, RequestEvent } from '@sveltejs/kit';
import { isLanguage, languageFromHeader, type Language } from '$lib/i18n/language';
import { clearSessionCookie, sessionCookie, setSessionCookie } from '$lib/server/auth/cookie';
import { readSession } from '$lib/server/auth/session';
import { databaseUnreachable } from '$lib/server/db/postgres-error';
import { database } from '$lib/server/environment';
import { logFailure } from '$lib/server/log';

export const handle: Handle = async ({ event, resolve }) => {
	event.locals = {
		language: languageOf(event),
		session: null,
		person: null,
		member: null,
		memberships: [],
		outage: false
	};
	// The tablet's pages are the same for everyone and must not wait for the database.
	if (!building && !event.route.id?.startsWith('/(tablet)')) await identify(event);

	const response = await resolve(event, {
		transformPageChunk: ({ html }) => html.replace('<html lang="en"', `<html lang="${event.locals.language}"`)
	});
	protect(response);
	return response;
};

async function identify(event: RequestEvent): Promise<void> {
	const id = sessionCookie(event.cookies);
	if (!id) return;
	try {
		const signedIn = await readSession(database(), id);
		if (!signedIn) return clearSessionCookie(event.cookies);
		const { session, person, member, memberships } = signedIn;
		if (session.renewed) setSessionCookie(event.cookies, session);
		Object.assign(event.locals, { session, person, member, memberships });
	} catch (failure) {
		event.locals.outage = true;
		if (!databaseUnreachable(failure)) logFailure('session', failure);
	}
}

function languageOf(event: RequestEvent): Language {
	const chosen = event.cookies.get('language');
	return isLanguage(chosen) ? chosen : languageFromHeader(event.request.headers.get('accept-language'));
}

/** The content policy itself comes from svelte.config.js; what a meta tag cannot say stands here. */
function protect(response: Response): void {
	const { headers } = response;
	if (!headers.has('content-security-policy')) {
		headers.set('content-security-policy', "frame-ancestors 'none'");
	}
	headers.set('x-content-type-options', 'nosniff');
	headers.set('x-frame-options', 'DENY');
	headers.set('referrer-policy', 'same-origin');
	headers.set('permissions-policy', 'camera=(self), microphone=(), geolocation=(), payment=(), usb=()');
	// Built assets are served before this hook; whatever comes through it may be a plant's data.
	headers.set('cache-control', 'no-store');
}

export const handleError: HandleServerError = ({ error, event, status, message }) => {
	if (status < 500) return { message };
	if (databaseUnreachable(error)) {
		return { message: 'The database cannot be reached just now. Try again shortly.', code: 'busy' };
	}
	const id = logFailure(`${event.request.method} ${event.route.id}`, error);
	return { message: 'This went wrong on the server.', code: 'failed', id };
};
