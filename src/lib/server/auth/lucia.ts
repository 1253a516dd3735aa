/**
 * The session library, and all of it that this application sees. lucia is no longer developed: nothing outside
 * this folder may know it, so that it can be replaced here.
 */
import { DrizzlePostgreSQLAdapter } from '@lucia-auth/adapter-drizzle';
import { Lucia, TimeSpan } from 'lucia';
import type { Database } from '../db/client';
import { sessions, users } from '../db/schema/people';

declare module 'lucia' {
	interface Register {
		Lucia: ReturnType<typeof build>;
		UserId: string;
		DatabaseSessionAttributes: { plantId: string | null };
		DatabaseUserAttributes: { email: string; name: string; locale: 'en' | 'es' };
	}
}

function build({ db }: Database) {
	return new Lucia(new DrizzlePostgreSQLAdapter(db, sessions, users), {
		// A tablet is away from the plant's network for days; every use within the month renews it.
		sessionExpiresIn: new TimeSpan(30, 'd'),
		getSessionAttributes: ({ plantId }) => ({ plantId }),
		// Named one by one: the adapter reads the whole row, password hash included.
		getUserAttributes: ({ email, name, locale }) => ({ email, name, locale })
	});
}

const built = new WeakMap<Database, ReturnType<typeof build>>();

export function lucia(database: Database): ReturnType<typeof build> {
	const known = built.get(database) ?? build(database);
	built.set(database, known);
	return known;
}
