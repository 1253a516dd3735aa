/** Signing in: fields `email`, `password` and `next` (a path of this application to go on to). */
import { fail, redirect } from '@sveltejs/kit';
import { sessionCookie, setSessionCookie } from '$lib/server/auth/cookie';
import { homeOf, localPath } from '$lib/server/auth/guard';
import { signIn, signOut } from '$lib/server/auth/session';
import { databaseUnreachable } from '$lib/server/db/postgres-error';
import { database } from '$lib/server/environment';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = ({ locals, url }) => {
	const next = localPath(url.searchParams.get('next'));
	if (locals.member) redirect(303, next ?? homeOf(locals.member.role));
	return { next };
};

export const actions: Actions = {
	default: async ({ request, cookies }) => {
		const form = await request.formData();
		const email = textOf(form, 'email');
		const next = localPath(form.get('next'));
		const refused = (status: number, code: 'incomplete' | 'wrong' | 'no-plant' | 'busy') =>
			fail(status, { code, email, next });

		const password = textOf(form, 'password');
		if (!email.trim() || !password) return refused(400, 'incomplete');
		let answer;
		try {
			answer = await signIn(database(), email, password);
			const before = sessionCookie(cookies);
			if (answer.ok && before) await signOut(database(), before);
		} catch (failure) {
			if (databaseUnreachable(failure)) return refused(503, 'busy');
			throw failure;
		}
		if (!answer.ok) return refused(400, answer.code);
		setSessionCookie(cookies, answer.session);
		redirect(303, next ?? homeOf(answer.member.role));
	}
};

function textOf(form: FormData, name: string): string {
	const value = form.get(name);
	return typeof value === 'string' ? value : '';
}
