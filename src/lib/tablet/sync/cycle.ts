/**
 * One run of keeping in step: pull, so that the session's plant is known before anything is sent; push; pull
 * again when something was stored, so that the tablet sees its own checks as the plant has them; then drop
 * what the plant has had for long, but never in a run that rebuilt the mirror.
 */
import type { Refusal } from './ask';
import type { SyncDeps } from './port';
import { pull } from './pull';
import { push, type PushMemory, type PushWatch } from './push';

export type Outcome =
	| { kind: 'done' }
	| { kind: 'refused'; refusal: Refusal }
	/** Others came in between or the time was up: to be taken up again soon. */
	| { kind: 'stopped' }
	/** Nobody works here. */
	| { kind: 'nobody' };

const ROUNDS = 3;

export async function cycle(
	deps: SyncDeps,
	memory: PushMemory,
	until: AbortSignal,
	watch: PushWatch
): Promise<Outcome> {
	let rebuilt = false;
	for (let round = 0; round < ROUNDS; round++) {
		const pulled = await pull(deps, until, watch.heard);
		// A pull that the server fails at must not keep records here: pushing them is tried all the same.
		if (pulled.kind === 'refused' && pulled.refusal.kind !== 'failed') return pulled;
		const person = await deps.port.person();
		if (!person) return { kind: 'nobody' };
		if (pulled.kind === 'stopped') return pulled;

		const pushed = await push(deps, memory, person.plantId, until, watch);
		if (pushed.kind !== 'pushed') return pushed;
		if (pulled.kind === 'refused') return pulled;

		rebuilt ||= pulled.rebuilt;
		if (pushed.stored > 0) continue;
		if (!rebuilt && (await deps.port.purgeSent(pulled.plantId, pulled.serverTime)) > 0) deps.tell('records');
		return { kind: 'done' };
	}
	return { kind: 'done' };
}
