/**
 * What sending and pulling need from outside: the store through a small port, and the network, clock, timer,
 * chance and lock as plain functions. Nothing in this folder reaches for any of them by itself, so that a
 * simulation can be all of them.
 */
import type { PullResponse, QuarantineCode } from '$lib/records/protocol';

/** A record that must be pushed. */
export interface DueRecord {
	id: string;
	hash: string;
	/** Of its JSON, UTF-8. */
	bytes: number;
	record: unknown;
}

export type Settlement =
	| { kind: 'received'; id: string; hash: string; seq: number; receivedAt: string }
	| { kind: 'quarantined'; id: string; hash: string; code: QuarantineCode; text: string }
	/** The record stays waiting, and a person must look. */
	| { kind: 'trouble'; id: string; hash: string; code: 'too-large' | 'receipt-differs'; text: string };

export interface Asked {
	personId: string;
	plantId: string;
	cursor: string | null;
}

/** `overtaken`: another person or tab came in between, nothing is written. `restart`: ask from the start. */
export type Applied =
	{ kind: 'applied'; switched: boolean; resend: boolean } | { kind: 'overtaken' } | { kind: 'restart' };

export interface OutboxCounts {
	due: number;
	waiting: number;
	oldestSince: string | null;
	attention: number;
	elsewhere: number;
}

export interface Contact {
	at: string;
	clockOffsetMs: number;
}

export interface SyncPort {
	person(): Promise<{ personId: string; plantId: string } | null>;
	tabletId(): Promise<string>;
	drawn(plantId: string): Promise<{ authorId: string; highest: number }[]>;
	/** The oldest due records within both limits, at least one if there is any that is not skipped. */
	due(
		plantId: string,
		limits: { records: number; bytes: number },
		skip: ReadonlySet<string>
	): Promise<DueRecord[]>;
	/** Ignores a settlement whose hash is not the record's. */
	settle(plantId: string, settlements: Settlement[]): Promise<void>;
	counts(plantId: string | null): Promise<OutboxCounts>;
	cursor(plantId: string): Promise<string | null>;
	/** Rows, cursor, person and marks for sending again in one transaction. */
	applyPage(page: PullResponse, asked: Asked, now: Date): Promise<Applied>;
	/** Removes what the plant has had for long enough, by its own clock. */
	purgeSent(plantId: string, serverTime: string): Promise<number>;
	lastContact(): Promise<Contact | null>;
	rememberContact(contact: Contact): Promise<void>;
}

export interface Clock {
	/** Wall clock of the tablet, ms since 1970: for showing and for the offset only. */
	now(): number;
	/** Never goes back, ms since any start: for everything that waits. */
	monotonic(): number;
}

export interface Timer {
	set(afterMs: number, run: () => void): unknown;
	clear(handle: unknown): void;
}

export type Fetch = (
	path: string,
	init: { method: 'GET' | 'POST'; body?: string; signal: AbortSignal }
) => Promise<Response>;

/**
 * Runs the work when no other tab of this tablet sends; answers false at once when one does. It saves requests
 * and nothing depends on it. The signal ends the work when it has held the lock for too long.
 */
export type SenderLock = (limitMs: number, work: (signal: AbortSignal) => Promise<void>) => Promise<boolean>;

/** What changed in the store, for the screens of this and other tabs. */
export type SyncNews = 'records' | 'mirror' | 'person';

export interface SyncDeps {
	port: SyncPort;
	fetch: Fetch;
	clock: Clock;
	timer: Timer;
	/** 0 ≤ x < 1 */
	random: () => number;
	lock: SenderLock;
	tell: (news: SyncNews) => void;
}
