/** Whose session the server sees. Asked after a sign-in, to set who works on this tablet. */
import { z } from 'zod';
import { uuid } from '$lib/records/ids';
import { ROLES } from '$lib/records/protocol';
import type { LocalPerson } from './store/schema';
import type { Fetch } from './sync/port';

const me = z.object({
	person: z.object({ id: uuid, name: z.string() }),
	/** Where the session works now; null for a member of no plant. */
	plant: z.object({ id: uuid, name: z.string(), role: z.enum(ROLES) }).nullable()
});

export type WhoAmI =
	| { kind: 'signed-in'; person: LocalPerson }
	/** Signed in, but a member of no plant. */
	| { kind: 'no-plant'; name: string }
	| { kind: 'signed-out' }
	/** No answer of the plant: whoever works here goes on working here. */
	| { kind: 'unreachable' };

const LIMIT_MS = 10_000;

export async function whoAmI(fetch: Fetch, now: Date): Promise<WhoAmI> {
	try {
		const response = await fetch('/api/v1/me', { method: 'GET', signal: AbortSignal.timeout(LIMIT_MS) });
		if (response.status === 401) return { kind: 'signed-out' };
		if (response.status !== 200) return { kind: 'unreachable' };
		const { person, plant } = me.parse(await response.json());
		if (!plant) return { kind: 'no-plant', name: person.name };
		return {
			kind: 'signed-in',
			person: {
				personId: person.id,
				name: person.name,
				role: plant.role,
				plantId: plant.id,
				plantName: plant.name,
				since: now.toISOString()
			}
		};
	} catch {
		return { kind: 'unreachable' };
	}
}
