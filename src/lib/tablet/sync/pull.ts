/** Pulling: page after page until the server has no more, each written with its cursor in one transaction. */
import { pullResponse } from '$lib/records/protocol';
import { ask, type Refusal } from './ask';
import type { Contact, SyncDeps } from './port';

export type Pulled =
	| {
			kind: 'pulled';
			plantId: string;
			/** Server's time of the last page. */
			serverTime: string;
			/** A page rebuilt the mirror: what the server still holds is not known yet. */
			rebuilt: boolean;
	  }
	| { kind: 'refused'; refusal: Refusal }
	/** Nobody works here any more, the run was stopped, or others keep coming in between. */
	| { kind: 'stopped' };

/** Pages that may be overtaken by another tab or person before this run leaves the field to them. */
const OVERTAKEN_MOST = 3;

/** @param heard called for each answer of the plant */
export async function pull(
	deps: SyncDeps,
	until: AbortSignal,
	heard: (contact: Contact) => Promise<void>
): Promise<Pulled> {
	let rebuilt = false;
	let inVain = 0;
	while (!until.aborted && inVain < OVERTAKEN_MOST) {
		const person = await deps.port.person();
		if (!person) return { kind: 'stopped' };
		const cursor = await deps.port.cursor(person.plantId);
		const path = cursor === null ? '/api/v1/pull' : `/api/v1/pull?cursor=${encodeURIComponent(cursor)}`;
		const answer = await ask(deps, { method: 'GET', path }, pullResponse, until);
		if (answer.kind !== 'ok') return { kind: 'refused', refusal: answer };
		await heard(answer.contact);
		const page = answer.value;
		// A server that has more but does not move on would be asked for ever.
		if (page.more && page.cursor === cursor) {
			return { kind: 'refused', refusal: { kind: 'failed', status: 200, retryAfterMs: null } };
		}
		const { personId, plantId } = person;
		const applied = await deps.port.applyPage(
			page,
			{ personId, plantId, cursor },
			new Date(deps.clock.now())
		);
		if (applied.kind !== 'applied') {
			inVain++;
			continue;
		}
		inVain = 0;
		rebuilt ||= page.reset !== null || applied.resend;
		if (applied.switched) deps.tell('person');
		if (applied.resend) deps.tell('records');
		if (page.reset !== null || page.changes.length > 0) deps.tell('mirror');
		if (!page.more) return { kind: 'pulled', plantId: page.plant.id, serverTime: page.serverTime, rebuilt };
	}
	return { kind: 'stopped' };
}
