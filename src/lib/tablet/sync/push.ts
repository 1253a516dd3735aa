/**
 * Pushing: the due records of the session's plant, oldest first, in batches that the protocol allows; with
 * nothing to push, one ping that tells the highest numbers drawn. No answer removes a record: a receipt moves
 * it, everything else leaves it where it is.
 */
import { PUSH_MAX_BYTES, PUSH_MAX_RECORDS, pushResponse, type PushRequest } from '$lib/records/protocol';
import { ask, type Refusal } from './ask';
import type { Held } from './held';
import type { Contact, DueRecord, SyncDeps } from './port';
import { judge, UNSETTLED_HOLD_MS } from './receipts';

const DRAWN_MOST = 200;

/** What lasts from one run to the next. */
export interface PushMemory {
	/** How many records the next batch may hold: less after failures, so that no record drags the others down. */
	batch: number;
	held: Held;
}

export type Pushed =
	{ kind: 'pushed'; stored: number } | { kind: 'refused'; refusal: Refusal } | { kind: 'stopped' };

export interface PushWatch {
	heard: (contact: Contact) => Promise<void>;
	/** The record that is on its way, counted from 1, and how many go in this run. */
	sending: (at: number, of: number) => void;
}

export async function push(
	deps: SyncDeps,
	memory: PushMemory,
	plantId: string,
	until: AbortSignal,
	watch: PushWatch
): Promise<Pushed> {
	const { port } = deps;
	const tabletId = await port.tabletId();
	const held = memory.held.ids();
	const of = Math.max(0, (await port.counts(plantId)).due - held.size);
	// A run tries each record once: an answer that settles nothing must not be asked for again and again.
	const tried = new Set<string>();
	let told = false;
	let narrowed = false;
	let stored = 0;

	while (!until.aborted) {
		// In turn, should there ever be more authors on a tablet than one push may tell.
		const everyone = await port.drawn(plantId);
		const first = everyone.length > DRAWN_MOST ? Math.floor(deps.random() * everyone.length) : 0;
		const drawn = [...everyone.slice(first), ...everyone.slice(0, first)].slice(0, DRAWN_MOST);
		const batch = await port.due(
			plantId,
			{ records: memory.batch, bytes: roomFor(tabletId, drawn) },
			new Set([...memory.held.ids(), ...tried])
		);
		if (batch.length === 0 && told) return { kind: 'pushed', stored };
		if (batch.length > 0)
			watch.sending(Math.min(tried.size + 1, Math.max(of, 1)), Math.max(of, batch.length));

		const body = JSON.stringify(requestOf(tabletId, drawn, batch));
		const answer = await ask(deps, { method: 'POST', path: '/api/v1/push', body }, pushResponse, until);

		if (answer.kind === 'ok') {
			told = true;
			const judged = judge(batch, answer.value.answers);
			await port.settle(plantId, judged.settlements);
			for (const { id, forMs } of judged.hold) memory.held.hold(id, forMs);
			for (const { id } of batch) tried.add(id);
			stored += judged.stored;
			await watch.heard(answer.contact);
			if (batch.length > 0) deps.tell('records');
			if (!narrowed) memory.batch = Math.min(PUSH_MAX_RECORDS, memory.batch * 2);
			continue;
		}
		if (answer.kind === 'too-large' && batch.length > 1) {
			memory.batch = half(batch.length);
			narrowed = true;
			continue;
		}
		if (answer.kind === 'too-large' && batch[0]) {
			const { id, hash } = batch[0];
			const text = 'The plant takes no record of this size. It stays on this tablet.';
			await port.settle(plantId, [{ kind: 'trouble', id, hash, code: 'too-large', text }]);
			memory.held.hold(id, UNSETTLED_HOLD_MS);
			tried.add(id);
			deps.tell('records');
			continue;
		}
		if (answer.kind === 'failed' || answer.kind === 'unreachable') memory.batch = half(batch.length);
		// The server failed on this record alone: the others go first next time.
		if (answer.kind === 'failed' && batch.length === 1) memory.held.hold(batch[0]!.id, UNSETTLED_HOLD_MS);
		return { kind: 'refused', refusal: answer };
	}
	return { kind: 'stopped' };
}

const half = (records: number) => Math.max(1, Math.floor(records / 2));

function requestOf(tabletId: string, drawn: PushRequest['drawn'], batch: DueRecord[]): PushRequest {
	return { tabletId, drawn, records: batch.map(({ record }) => record) };
}

/** Bytes that are left for records and the commas between them. Everything else in a request is ASCII. */
function roomFor(tabletId: string, drawn: PushRequest['drawn']): number {
	return PUSH_MAX_BYTES - PUSH_MAX_RECORDS - JSON.stringify(requestOf(tabletId, drawn, [])).length;
}
