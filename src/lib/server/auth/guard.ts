/**
 * Who may come in. Every load, action and API route starts here; commands check the role again. Not signed in
 * leads to the sign-in page (or 401), the wrong role is 403, and what is not of the session's plant is 404.
 */
import { error, redirect } from '@sveltejs/kit';
import type { Role } from '$lib/records/protocol';
import type { Scope } from '../db/client';
import { database } from '../environment';
import { REFUSAL_TEXT, Refused } from '../errors';
import { allow } from './permission';

type Guarded = { locals: App.Locals; url: URL };

/** For API routes and commands: refuses by throwing `Refused`. No roles named: any role of the plant. */
export function memberScope(locals: App.Locals, ...roles: Role[]): Scope {
	const { person, member, outage } = locals;
	if (outage) throw new Refused({ code: 'busy' });
	if (!person) throw new Refused({ code: 'signed-out' });
	if (!member) throw new Refused({ code: 'not-allowed' });
	const scope = { database: database(), plantId: member.plantId, personId: person.id, role: member.role };
	allow(scope, ...roles);
	return scope;
}

/** For pages: the same, answered as a redirect to sign-in or as an error page. */
export function requireMember({ locals, url }: Guarded, ...roles: Role[]): Scope {
	try {
		return memberScope(locals, ...roles);
	} catch (refused) {
		if (!(refused instanceof Refused)) throw refused;
		const { code } = refused.refusal;
		if (code === 'signed-out') redirect(303, signInPath(url));
		error(code === 'busy' ? 503 : 403, { message: REFUSAL_TEXT[code], code });
	}
}

export function signInPath(url: URL): string {
	return `/sign-in?next=${encodeURIComponent(url.pathname + url.search)}`;
}

/** Where to go after signing in: a path of this application, never another site's address. */
export function localPath(value: unknown): string | null {
	if (typeof value !== 'string' || !value.startsWith('/') || value.length > 500) return null;
	const here = 'http://here.invalid';
	const url = URL.canParse(value, here) ? new URL(value, here) : null;
	// Browsers read `//x` and `/\x` as another host; parsing says so as they would.
	if (!url || url.origin !== here || url.pathname.startsWith('//')) return null;
	return url.pathname + url.search;
}

/** Where each role's work starts. */
export function homeOf(role: Role): string {
	return role === 'millwright' ? '/tablet' : '/machines';
}
