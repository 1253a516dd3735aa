/** Time that passes only when a test says so: the tablet's wall clock, its monotonic clock and its timers. */
import type { Clock, Timer } from '../../src/lib/tablet/sync/port';

export class VirtualTime {
	/** True time, by which the plant goes. */
	now = Date.UTC(2026, 2, 2, 9, 0, 0);
	/** How far the tablet's wall clock is ahead. */
	tabletAheadMs = 0;
	#timers = new Map<number, { at: number; run: () => void }>();
	#next = 1;
	/** Waited for after each timer, so that what it started is over. */
	settle: () => Promise<void> = async () => undefined;

	readonly clock: Clock = { now: () => this.now + this.tabletAheadMs, monotonic: () => this.now };
	readonly timer: Timer = {
		set: (afterMs, run) => {
			const handle = this.#next++;
			this.#timers.set(handle, { at: this.now + afterMs, run });
			return handle;
		},
		clear: (handle) => void this.#timers.delete(handle as number)
	};

	waiting = () => this.#timers.size;

	/** Lets time pass without letting any timer run: for the duration of a request. */
	pass(ms: number): void {
		this.now += ms;
	}

	/** Runs the one timer that is due first. */
	fireNext(): void {
		const next = [...this.#timers].sort(([, a], [, b]) => a.at - b.at)[0];
		if (!next) throw new Error('no timer is set');
		this.#timers.delete(next[0]);
		this.now = Math.max(this.now, next[1].at);
		next[1].run();
	}

	async advance(ms: number): Promise<void> {
		const end = this.now + ms;
		await this.settle();
		for (;;) {
			const next = [...this.#timers].filter(([, { at }]) => at <= end).sort(([, a], [, b]) => a.at - b.at)[0];
			if (!next) break;
			this.fireNext();
			await this.settle();
		}
		this.now = end;
	}
}
