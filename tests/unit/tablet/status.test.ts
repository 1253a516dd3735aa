/** What the tablet says, and how long it waits: pure functions. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { BASE_MS, backoffMs, CAP_MS, retryAfterMs } from '../../../src/lib/tablet/sync/backoff';
import { createPace } from '../../../src/lib/tablet/sync/pace';
import { NO_COUNTS, storageState, syncStatus, type SyncFacts } from '../../../src/lib/tablet/sync/status';

const quiet: SyncFacts = { counts: NO_COUNTS, sending: null, halt: null, contact: null, reachable: null };
const twelve = { ...NO_COUNTS, due: 12, waiting: 12, oldestSince: '2026-03-01T00:00:00Z' };
const sendingOf = (facts: Partial<SyncFacts>) => syncStatus({ ...quiet, ...facts }).sending;

describe('the status', () => {
	it.each([
		[{}, { state: 'nothing-waits' }],
		[{ counts: twelve }, { state: 'waiting', count: 12, oldestSince: '2026-03-01T00:00:00Z' }],
		[
			{ counts: twelve, sending: { at: 3, of: 12 } },
			{ state: 'sending', at: 3, of: 12 }
		],
		[
			{ counts: twelve, halt: { kind: 'signed-out' } },
			{ state: 'signed-out', count: 12 }
		],
		[
			{ counts: twelve, halt: { kind: 'blocked', code: 'tablet-blocked' } },
			{ state: 'blocked', count: 12, code: 'tablet-blocked' }
		],
		[
			{ counts: twelve, halt: { kind: 'update' } },
			{ state: 'update', count: 12 }
		]
	] as [Partial<SyncFacts>, unknown][])('of %j is %j', (facts, expected) => {
		expect(sendingOf(facts)).toEqual(expected);
	});

	it('says what needs attention, where records wait and when the plant was heard', () => {
		const contact = { at: '2026-03-02T09:14:00Z', clockOffsetMs: -3 * 3_600_000 };
		const counts = { ...NO_COUNTS, attention: 2, elsewhere: 3 };
		expect(syncStatus({ ...quiet, counts, contact })).toMatchObject({
			attention: 2,
			elsewhere: 3,
			contactAt: contact.at,
			clock: { state: 'off', offsetMs: contact.clockOffsetMs }
		});
		expect(syncStatus(quiet)).toMatchObject({ contactAt: null, clock: { state: 'unknown' } });
		expect(syncStatus({ ...quiet, contact: { ...contact, clockOffsetMs: 60_000 } }).clock.state).toBe(
			'right'
		);
	});

	it('says whether the storage is protected or nearly full', () => {
		expect(storageState(true, 1e6, 1e9)).toBe('protected');
		expect(storageState(false, 1e6, 1e9)).toBe('unprotected');
		expect(storageState(true, 0.97e9, 1e9)).toBe('nearly-full');
		expect(storageState(true, null, null)).toBe('protected');
	});
});

describe('backoff', () => {
	it('is drawn evenly below a ceiling that doubles from 2 s to 5 min', () => {
		const draws = (failures: number, x: number) => backoffMs(failures, null, () => x);
		expect([1, 2, 3, 4].map((n) => draws(n, 0.5))).toEqual([1, 2, 4, 8].map((n) => (n * BASE_MS) / 2));
		expect(draws(1000, 0.5)).toBe(CAP_MS / 2);
		fc.assert(
			fc.property(fc.nat(5000), fc.double({ min: 0, max: 0.999, noNaN: true }), (failures, x) => {
				const wait = draws(failures + 1, x);
				expect(wait).toBeGreaterThan(0);
				expect(wait).toBeLessThanOrEqual(CAP_MS);
			})
		);
	});

	it('never goes below what the server asked for', () => {
		expect(backoffMs(1, 90_000, () => 0)).toBe(90_000);
		expect(backoffMs(20, 1_000, () => 0.9)).toBeGreaterThan(1_000);
	});

	it('reads Retry-After as seconds or as a date (RFC 9110, section 10.2.3)', () => {
		expect(retryAfterMs('120', 0)).toBe(120_000);
		expect(retryAfterMs('Fri, 31 Dec 1999 23:59:59 GMT', Date.UTC(1999, 11, 31, 23, 58, 59))).toBe(60_000);
		expect(retryAfterMs('Fri, 31 Dec 1999 23:59:59 GMT', Date.UTC(2026, 0, 1))).toBe(0);
		expect(retryAfterMs('soon', 0)).toBeNull();
		expect(retryAfterMs(null, 0)).toBeNull();
	});
});

describe('the pace', () => {
	it('lets triggers come before the backoff but never in a burst, and a person at once', () => {
		let now = 0;
		const pace = createPace(
			() => now,
			() => 0.99
		);
		for (let i = 0; i < 12; i++) pace.failed(null);
		pace.began();
		expect(pace.waitFor('tick')).toBeGreaterThan(200_000);
		expect(pace.waitFor('online')).toBe(10_000);
		expect(pace.waitFor('button')).toBe(0);
		now = 10_000;
		expect(pace.waitFor('online')).toBe(0);
		pace.succeeded();
		expect(pace.waitFor('kept')).toBe(0);
	});

	it('makes everyone wait for as long as the server asked', () => {
		const pace = createPace(
			() => 0,
			() => 0
		);
		pace.failed(60_000);
		for (const why of ['tick', 'online', 'visible', 'button', 'kept'] as const) {
			expect(pace.waitFor(why)).toBe(60_000);
		}
	});
});
