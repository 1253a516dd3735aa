/** The session's cookie: unreadable for scripts, not sent along by other sites, over HTTPS only where there is HTTPS. */
import type { Cookies } from '@sveltejs/kit';
import { overHttps } from '../environment';

const NAME = 'cogmark_session';
const common = () => ({ path: '/', httpOnly: true, sameSite: 'lax', secure: overHttps() }) as const;

export function sessionCookie(cookies: Cookies): string | undefined {
	return cookies.get(NAME);
}

export function setSessionCookie(cookies: Cookies, session: { id: string; expiresAt: Date }): void {
	cookies.set(NAME, session.id, { ...common(), expires: session.expiresAt });
}

export function clearSessionCookie(cookies: Cookies): void {
	cookies.delete(NAME, common());
}
