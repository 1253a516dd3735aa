/**
 * Signing in and out, and who a session's cookie stands for. Promise: an unknown account, a wrong password and
 * an account without a plant are told apart by nobody who lacks the right password, by words or by work done.
 */
import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Role } from '$lib/records/protocol';
import { asPerson, type Database } from '../db/client';
import { memberships, sessions, users } from '../db/schema/people';
import { plants } from '../db/schema/plants';
import { lucia } from './lucia';
import { passwordMatches } from './password';

export interface Person {
	id: string;
	name: string;
	email: string;
	locale: 'en' | 'es';
}

export interface Membership {
	plantId: string;
	plantName: string;
	/** Such as "Figures are invented demo data."; shown at the foot of office pages. */
	plantNote: string | null;
	role: Role;
	scopeVersion: number;
}

export interface SignedIn {
	session: { id: string; expiresAt: Date; renewed: boolean };
	person: Person;
	/** The plant in which the person works now; null when the right to it was lost. */
	member: Membership | null;
	/** All plants in which the person may work. */
	memberships: Membership[];
}

export type SignInAnswer =
	| { ok: true; session: { id: string; expiresAt: Date }; member: Membership }
	| { ok: false; code: 'wrong' | 'no-plant' };

const LONGEST_PASSWORD = 128;

export async function signIn(database: Database, email: string, password: string): Promise<SignInAnswer> {
	const address = email.trim().toLowerCase();
	const [user] = await database.db
		.select({ id: users.id, passwordHash: users.passwordHash })
		.from(users)
		.where(eq(users.email, address));
	const typed = password.slice(0, LONGEST_PASSWORD + 1);
	const matches = await passwordMatches(user?.passwordHash ?? null, typed);
	if (!user || !matches || typed.length > LONGEST_PASSWORD) return { ok: false, code: 'wrong' };
	const [member] = await membershipsOf(database, user.id);
	if (!member) return { ok: false, code: 'no-plant' };
	const session = await lucia(database).createSession(user.id, { plantId: member.plantId });
	return { ok: true, session: { id: session.id, expiresAt: session.expiresAt }, member };
}

export function signOut(database: Database, sessionId: string): Promise<void> {
	return lucia(database).invalidateSession(sessionId);
}

/** Null for a session that is unknown or at its end. */
export async function readSession(database: Database, sessionId: string): Promise<SignedIn | null> {
	const { session, user } = await lucia(database).validateSession(sessionId);
	if (!session) return null;
	const mine = await membershipsOf(database, user.id);
	return {
		session: { id: session.id, expiresAt: session.expiresAt, renewed: session.fresh },
		person: { id: user.id, name: user.name, email: user.email, locale: user.locale },
		member: mine.find((m) => m.plantId === session.plantId) ?? null,
		memberships: mine
	};
}

/** Sets the plant in which a session works; the new membership, or null where the person has none there. */
export async function workAt(
	database: Database,
	{ sessionId, personId, plantId }: { sessionId: string; personId: string; plantId: string }
): Promise<Membership | null> {
	const member = (await membershipsOf(database, personId)).find((m) => m.plantId === plantId);
	if (!member) return null;
	await database.db
		.update(sessions)
		.set({ plantId })
		.where(and(eq(sessions.id, sessionId), eq(sessions.userId, personId)));
	return member;
}

function membershipsOf(database: Database, personId: string): Promise<Membership[]> {
	return asPerson(database, personId, (tx) =>
		tx
			.select({
				plantId: memberships.plantId,
				plantName: plants.name,
				plantNote: plants.note,
				role: memberships.role,
				scopeVersion: memberships.scopeVersion
			})
			.from(memberships)
			.innerJoin(plants, eq(plants.id, memberships.plantId))
			.where(and(eq(memberships.userId, personId), isNull(memberships.disabledAt)))
			.orderBy(asc(plants.name))
	);
}
