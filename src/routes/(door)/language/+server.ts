/** Remembers the language for pages of the server, for browsers without scripts. Form fields: `language`, `next`. */
import { error, redirect } from '@sveltejs/kit';
import { isLanguage } from '$lib/i18n/language';
import { localPath } from '$lib/server/auth/guard';
import { overHttps } from '$lib/server/environment';
import type { RequestHandler } from './$types';

const ONE_YEAR = 365 * 24 * 60 * 60;

export const POST: RequestHandler = async ({ request, cookies }) => {
	const form = await request.formData();
	const language = form.get('language');
	if (!isLanguage(language)) {
		error(400, { message: 'The language must be en or es.', code: 'invalid-input' });
	}
	// Not a secret, and the switch with scripts writes the same cookie.
	cookies.set('language', language, {
		path: '/',
		maxAge: ONE_YEAR,
		sameSite: 'lax',
		httpOnly: false,
		secure: overHttps()
	});
	redirect(303, localPath(form.get('next')) ?? '/');
};
