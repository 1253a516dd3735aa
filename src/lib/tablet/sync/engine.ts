/**
 * When the tablet talks to the plant: on start, on becoming visible, on `online`, after keeping, every 30 s
 * while something waits, and by the button. One run at a time, one tab at a time; failures wait longer and
 * longer, and however long an outage lasts the number of requests an hour is bounded.
 */
import { PUSH_MAX_RECORDS } from '$lib/records/protocol';
import type { Refusal } from './ask';
import { BASE_MS } from './backoff';
import { cycle, type Outcome } from './cycle';
import { holding } from './held';
import { createPace, type Trigger } from './pace';
import type { Contact, SyncDeps } from './port';
import type { PushMemory } from './push';
import { NO_COUNTS, syncStatus, type SyncFacts, type SyncStatus } from './status';

export type Nudge = Exclude<Trigger, 'start' | 'tick'>;

export interface Sync {
	start(): void;
	/** Ends the run that is on its way; resolves when it writes no more. */
	stop(): Promise<void>;
	nudge(why: Nudge): void;
	/** Counts again without sending: something else changed the store. */
	refresh(): Promise<void>;
	status(): SyncStatus;
	/** The listener is called at once and after each change. @returns the end of it */
	subscribe(listener: (status: SyncStatus) => void): () => void;
	/** Resolves when no run is on its way. */
	idle(): Promise<void>;
}

export const EVERY_MS = 30_000;
/** A tab may send for so long before another may take over. */
export const LOCK_LIMIT_MS = 2 * 60_000;

export function createSync(deps: SyncDeps): Sync {
	const { port, clock, timer } = deps;
	const memory: PushMemory = { batch: PUSH_MAX_RECORDS, held: holding(() => clock.monotonic()) };
	const pace = createPace(() => clock.monotonic(), deps.random);
	const facts: SyncFacts = { counts: NO_COUNTS, sending: null, halt: null, contact: null, reachable: null };
	const listeners = new Set<(status: SyncStatus) => void>();
	let started = false;
	let end = new AbortController();
	let running: Promise<void> | null = null;
	/** Something was asked for during a run: look again after it. */
	let again: Trigger | null = null;
	let planned: unknown = null;
	let counting = 0;

	function publish(change: Partial<SyncFacts>) {
		Object.assign(facts, change);
		const status = syncStatus(facts);
		for (const listener of listeners) listener(status);
	}

	async function refresh() {
		const mine = ++counting;
		const person = await port.person();
		const counts = await port.counts(person?.plantId ?? null);
		const contact = await port.lastContact();
		// A newer counting is on its way or done: this one is out of date.
		if (mine === counting) publish({ counts, contact });
	}

	function plan(afterMs: number | null) {
		if (planned !== null) timer.clear(planned);
		planned = null;
		if (afterMs === null || !started) return;
		planned = timer.set(afterMs, () => {
			planned = null;
			trigger('tick');
		});
	}

	function trigger(why: Trigger) {
		if (!started) return;
		if (why === 'button' || why === 'online') memory.held.clear();
		if (running) {
			if (why === 'kept' || why === 'button' || why === 'signed-in') again = why;
			return;
		}
		// Until a person does something about it, only what may have changed it is a reason to ask again.
		const halted = facts.halt !== null && (why === 'kept' || why === 'tick');
		const wait = halted ? null : pace.waitFor(why);
		if (wait !== 0) {
			plan(wait);
			refresh().catch(() => undefined);
			return;
		}
		plan(null);
		pace.began();
		running = run().finally(() => {
			running = null;
			const next = again;
			again = null;
			if (next) trigger(next);
		});
	}

	async function run() {
		let outcome: Outcome | null = null;
		const over = new AbortController();
		const heard = async (contact: Contact) => {
			await port.rememberContact(contact);
			facts.reachable = true;
			await refresh();
		};
		const sending = (at: number, of: number) => publish({ sending: { at, of } });
		try {
			await refresh();
			await deps.lock(LOCK_LIMIT_MS, async (limit) => {
				const until = AbortSignal.any([limit, end.signal, over.signal]);
				outcome = await cycle(deps, memory, until, { heard, sending });
			});
		} catch {
			// The store failed or the lock was taken away: nothing is lost, everything is tried again.
			outcome = { kind: 'stopped' };
		} finally {
			// A run whose lock was taken away must not go on beside the next one.
			over.abort();
		}
		publish({ sending: null });
		if (!started) return;
		const wait = conclude(outcome);
		await refresh().catch(() => undefined);
		if (facts.halt) return;
		const due = facts.counts.due > 0;
		plan(wait ?? (due ? Math.min(EVERY_MS, Math.max(BASE_MS, memory.held.nextFree() ?? EVERY_MS)) : null));
	}

	/** @param outcome null when another tab sends @returns ms to wait after a failure, else null */
	function conclude(outcome: Outcome | null): number | null {
		if (outcome === null) return null;
		if (outcome.kind === 'stopped') return pace.failed(null);
		if (outcome.kind === 'refused') return refused(outcome.refusal);
		pace.succeeded();
		facts.halt = outcome.kind === 'nobody' ? { kind: 'signed-out' } : null;
		return null;
	}

	function refused(refusal: Refusal): number | null {
		switch (refusal.kind) {
			case 'signed-out':
			case 'blocked':
			case 'update':
				facts.halt = refusal;
				facts.reachable = true;
				pace.succeeded();
				return null;
			case 'busy':
				facts.reachable = true;
				return pace.failed(refusal.retryAfterMs);
			case 'failed':
				facts.reachable = false;
				return pace.failed(refusal.retryAfterMs);
			case 'unreachable':
			case 'too-large':
				facts.reachable = refusal.kind === 'too-large';
				return pace.failed(null);
		}
	}

	return {
		start() {
			if (started) return;
			started = true;
			end = new AbortController();
			trigger('start');
		},
		async stop() {
			started = false;
			plan(null);
			end.abort();
			await running;
		},
		nudge: trigger,
		refresh,
		status: () => syncStatus(facts),
		subscribe(listener) {
			listeners.add(listener);
			listener(syncStatus(facts));
			return () => void listeners.delete(listener);
		},
		async idle() {
			while (running) await running;
		}
	};
}
