/**
 * A plant in memory that answers push and pull by the rules of the protocol, and goes wrong on demand: the
 * next requests can be refused, their answers lost, or the whole plant be put back to an older state.
 */
import { envelope, envelopeHash, type Envelope } from '../../src/lib/records/envelope';
import type { MirrorChange } from '../../src/lib/records/mirror';
import {
	PUSH_MAX_BYTES,
	pushRequest,
	type PullResponse,
	type PushAnswer,
	type PushRequest
} from '../../src/lib/records/protocol';
import type { Fetch } from '../../src/lib/tablet/sync/port';
import type { Member } from './samples';

export type Kept = { record: Envelope; seq: number; receivedAt: string };

/** What goes wrong with one request. `lost`: the plant does its work and the answer never arrives. */
export type Fault = 'no-connection' | 'lost' | { status: number; body?: unknown; retryAfter?: string };

export interface Seen {
	method: 'GET' | 'POST';
	path: string;
	at: number;
	push: PushRequest | null;
	bytes: number;
	status: number | null;
	signal: AbortSignal;
}

type Judge = (record: Envelope, index: number) => PushAnswer | null;

export class Plant {
	stored = new Map<string, Kept>();
	quarantine: unknown[] = [];
	changes: MirrorChange[] = [];
	epoch = 1;
	scopeVersion = 1;
	/** Whose session it is; null when signed out. */
	session: Member | null;
	seen: Seen[] = [];
	/** Taken by the next requests in turn, then `always`. */
	faults: (Fault | null)[] = [];
	always: Fault | null = null;
	/** Answers of its own for single records, before the usual judgement. */
	judge: Judge = () => null;
	/** Called with each request before it is answered. */
	onRequest: (seen: Seen) => void | Promise<void> = () => undefined;
	pageSize = 2;
	#seq = 0;
	readonly #now: () => number;

	constructor(session: Member, now: () => number) {
		this.session = session;
		this.#now = now;
	}

	nextSeq = () => ++this.#seq;
	pushes = () => this.seen.filter(({ push }) => push !== null);
	recordsSent = () => this.pushes().flatMap(({ push }) => (push?.records ?? []) as Envelope[]);

	backup() {
		const [stored, changes] = [new Map(this.stored), [...this.changes]];
		return () => {
			this.stored = stored;
			this.changes = changes;
			this.epoch++;
		};
	}

	readonly fetch: Fetch = async (path, { method, body = '', signal }) => {
		signal.throwIfAborted();
		const push = method === 'POST' ? pushRequest.parse(JSON.parse(body)) : null;
		const seen: Seen = {
			method,
			path,
			at: this.#now(),
			push,
			bytes: Buffer.byteLength(body),
			status: null,
			signal
		};
		this.seen.push(seen);
		await this.onRequest(seen);
		const fault = this.faults.length > 0 ? this.faults.shift()! : this.always;
		if (fault === 'no-connection') throw new TypeError('no connection');
		if (fault !== null && fault !== 'lost')
			return this.#answer(seen, fault.status, fault.body, fault.retryAfter);
		const response = await this.#serve(seen, path);
		if (fault === 'lost') throw new TypeError('the answer was lost');
		return response;
	};

	async #serve(seen: Seen, path: string): Promise<Response> {
		if (!this.session) return this.#answer(seen, 401, { error: { code: 'signed-out', text: 'sign in' } });
		if (!seen.push)
			return this.#answer(seen, 200, this.#page(this.session, new URL(path, 'http://plant').searchParams));
		if (seen.bytes > PUSH_MAX_BYTES) return this.#answer(seen, 413);
		const answers: PushAnswer[] = [];
		for (const [index, sent] of seen.push.records.entries()) answers.push(await this.#take(sent, index));
		return this.#answer(seen, 200, { answers, serverTime: this.#time() });
	}

	async #take(sent: unknown, index: number): Promise<PushAnswer> {
		const parsed = envelope.safeParse(sent);
		const id = (sent as { id?: string }).id ?? null;
		if (!parsed.success || (await envelopeHash(sent as Record<string, unknown>)) !== parsed.data.hash) {
			this.quarantine.push(sent);
			return { status: 'quarantined', id, index, code: 'bad-content', text: 'not a record' };
		}
		const record = parsed.data;
		if (record.plantId !== this.session?.plantId) return { status: 'retry', id, index, afterMs: 60_000 };
		const own = this.judge(record, index);
		if (own) {
			if (own.status === 'quarantined') this.quarantine.push(record);
			return own;
		}
		const before = this.stored.get(record.id);
		if (before) {
			const { seq, receivedAt } = before;
			return { status: 'duplicate', id: record.id, hash: before.record.hash, seq, receivedAt };
		}
		const kept = { record, seq: this.nextSeq(), receivedAt: this.#time() };
		this.stored.set(record.id, kept);
		return { status: 'stored', id: record.id, hash: record.hash, seq: kept.seq, receivedAt: kept.receivedAt };
	}

	#page(session: Member, query: URLSearchParams): PullResponse {
		const sent = query.get('cursor');
		const held =
			sent === null
				? null
				: (JSON.parse(sent) as { epoch: number; plant: string; scope: number; seq: number });
		let reset: PullResponse['reset'] = null;
		if (!held) reset = 'start';
		else if (held.epoch !== this.epoch) reset = 'epoch';
		else if (held.plant !== session.plantId || held.scope !== this.scopeVersion) reset = 'scope';
		const after = reset === null ? held!.seq : 0;
		const rest = this.changes.filter(({ seq }) => seq > after).sort((a, b) => a.seq - b.seq);
		const changes = rest.slice(0, this.pageSize);
		const seq = changes.at(-1)?.seq ?? after;
		return {
			reset,
			plant: { id: session.plantId, name: session.plantName },
			person: { id: session.personId, name: session.name, role: 'millwright' },
			changes,
			cursor: JSON.stringify({ epoch: this.epoch, plant: session.plantId, scope: this.scopeVersion, seq }),
			more: rest.length > changes.length,
			serverTime: this.#time()
		};
	}

	#time = () => new Date(this.#now()).toISOString();

	#answer(seen: Seen, status: number, body: unknown = {}, retryAfter?: string): Response {
		seen.status = status;
		const text = typeof body === 'string' ? body : JSON.stringify(body);
		return new Response(text, { status, headers: retryAfter ? { 'retry-after': retryAfter } : {} });
	}
}
