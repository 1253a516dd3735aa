/**
 * How soon the next run may begin. By the monotonic clock only. Triggers shorten a wait, the server's own wish
 * (`Retry-After`) stands above all of them, and nothing but a person's touch starts two runs within 10 s.
 */
import { backoffMs } from './backoff';

export type Trigger = 'start' | 'visible' | 'online' | 'signed-in' | 'kept' | 'button' | 'tick';

/** A network that comes and goes, or a tab that is looked at again and again, asks no more often than this. */
export const SOONEST_MS = 10_000;

export interface Pace {
	/** ms to wait before a run for this reason; 0 is now. */
	waitFor(why: Trigger): number;
	began(): void;
	succeeded(): void;
	/** @returns ms until the next run may begin */
	failed(retryAfterMs: number | null): number;
	/** Whether the last run failed. */
	failing(): boolean;
}

export function createPace(monotonic: () => number, random: () => number): Pace {
	let failures = 0;
	let began = -Infinity;
	let notBefore = -Infinity;
	let byServer = -Infinity;

	function earliest(why: Trigger): number {
		switch (why) {
			case 'button':
			case 'signed-in':
				return byServer;
			case 'visible':
			case 'online':
				return Math.max(byServer, began + SOONEST_MS);
			default:
				return notBefore;
		}
	}

	return {
		waitFor: (why) => Math.max(0, earliest(why) - monotonic()),
		began: () => void (began = monotonic()),
		succeeded() {
			failures = 0;
			notBefore = byServer = -Infinity;
		},
		failed(retryAfterMs) {
			failures++;
			const wait = backoffMs(failures, retryAfterMs, random);
			notBefore = monotonic() + wait;
			byServer = retryAfterMs === null ? -Infinity : notBefore;
			return wait;
		},
		failing: () => failures > 0
	};
}
