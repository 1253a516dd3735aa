/** What SvelteKit's events carry in this application; hooks.server.ts fills it. */
import type { Membership, Person } from '$lib/server/auth/session';

declare global {
	namespace App {
		interface Error {
			message: string;
			/** A refusal's code, where there is one. */
			code?: string;
			/** Under which the failure stands in the server's log. */
			id?: string;
		}
		interface Locals {
			language: 'en' | 'es';
			session: { id: string; expiresAt: Date } | null;
			person: Person | null;
			/** The plant in which the person works now, and their role there. */
			member: Membership | null;
			memberships: Membership[];
			/** The database could not be asked who this is: neither signed in nor signed out. */
			outage: boolean;
		}
	}
}

export {};
