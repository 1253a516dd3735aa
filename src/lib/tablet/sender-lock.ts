/**
 * One tab sends at a time, by a Web Lock. It saves requests and nothing else: without the lock, or with two
 * holders, every record still arrives once. A holder that hangs longer than the limit loses it.
 */
import type { SenderLock } from './sync/port';

const NAME = 'cogmark-sender';

/** @param locks undefined where the browser has none @param monotonic ms that never go back */
export function senderLock(locks: LockManager | undefined, monotonic: () => number): SenderLock {
	let takenSince: number | null = null;
	return async (limitMs, work) => {
		const limit = AbortSignal.timeout(limitMs);
		if (!locks) {
			await work(limit);
			return true;
		}
		const hangs = takenSince !== null && monotonic() - takenSince > limitMs;
		const mine = await locks.request(NAME, hangs ? { steal: true } : { ifAvailable: true }, async (lock) => {
			if (!lock) return false;
			takenSince = null;
			await work(limit);
			return true;
		});
		if (!mine) takenSince ??= monotonic();
		return mine;
	};
}
