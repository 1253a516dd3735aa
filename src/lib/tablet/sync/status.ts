/**
 * What the tablet says about keeping and sending, as codes and numbers; the words for people stand in the
 * message catalogue. Pure: the same facts give the same status.
 */
import type { Contact, OutboxCounts } from './port';

/** Beyond this the times of records are marked. */
export const CLOCK_TOLERANCE_MS = 5 * 60_000;

/** Why nothing is sent until a person does something. */
export type Halt =
	{ kind: 'signed-out' } | { kind: 'blocked'; code: 'tablet-blocked' | 'not-allowed' } | { kind: 'update' };

export interface SyncFacts {
	counts: OutboxCounts;
	/** The record on its way and how many go in this run; null while nothing is sent. */
	sending: { at: number; of: number } | null;
	halt: Halt | null;
	contact: Contact | null;
	/** Whether the last attempt was answered; null before the first. */
	reachable: boolean | null;
}

export type SendingState =
	| { state: 'nothing-waits' }
	| { state: 'waiting'; count: number; oldestSince: string | null }
	| { state: 'sending'; at: number; of: number }
	| { state: 'signed-out'; count: number }
	| { state: 'blocked'; count: number; code: 'tablet-blocked' | 'not-allowed' }
	| { state: 'update'; count: number };

export type ClockState = { state: 'unknown' } | { state: 'right' | 'off'; offsetMs: number };

export interface SyncStatus {
	sending: SendingState;
	/** Records that need a person's attention. */
	attention: number;
	/** Records that wait for a sign-in at another plant. */
	elsewhere: number;
	/** When the plant was last heard, by its own clock (ISO 8601). */
	contactAt: string | null;
	reachable: boolean | null;
	clock: ClockState;
}

export const NO_COUNTS: OutboxCounts = { due: 0, waiting: 0, oldestSince: null, attention: 0, elsewhere: 0 };

export function syncStatus(facts: SyncFacts): SyncStatus {
	const { counts, contact, reachable } = facts;
	return {
		sending: sendingState(facts),
		attention: counts.attention,
		elsewhere: counts.elsewhere,
		contactAt: contact?.at ?? null,
		reachable,
		clock: clockState(contact)
	};
}

function sendingState({ counts, sending, halt }: SyncFacts): SendingState {
	const count = counts.waiting;
	if (halt?.kind === 'blocked') return { state: 'blocked', count, code: halt.code };
	if (halt) return { state: halt.kind, count };
	if (sending) return { state: 'sending', ...sending };
	if (count === 0) return { state: 'nothing-waits' };
	return { state: 'waiting', count, oldestSince: counts.oldestSince };
}

function clockState(contact: Contact | null): ClockState {
	if (!contact) return { state: 'unknown' };
	const offsetMs = contact.clockOffsetMs;
	return { state: Math.abs(offsetMs) > CLOCK_TOLERANCE_MS ? 'off' : 'right', offsetMs };
}

export type StorageState = 'protected' | 'unprotected' | 'nearly-full';

/** Less than this share or this many bytes left is nearly full: some hundred records fit in it. */
const LEFT_SHARE = 0.05;
const LEFT_BYTES = 20 * 1024 * 1024;

/** @param usage bytes used, @param quota bytes allowed; null where the browser does not tell */
export function storageState(persisted: boolean, usage: number | null, quota: number | null): StorageState {
	if (usage !== null && quota !== null) {
		const left = quota - usage;
		if (left < LEFT_BYTES || left < quota * LEFT_SHARE) return 'nearly-full';
	}
	return persisted ? 'protected' : 'unprotected';
}
