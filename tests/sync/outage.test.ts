/** Triggers, waiting and two tabs: how often the tablet asks, and that it always gets there in the end. */
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { listRecords } from '../../src/lib/tablet/store/outbox';
import type { SenderLock } from '../../src/lib/tablet/sync/port';
import { device, noLock, type Device } from './device';

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;
let d: Device;
beforeEach(async () => {
	d = await device();
});
afterEach(() => d.end());

/** The most requests that fall into any one hour. */
function busiestHour(of: Device): number {
	const times = of.plant.seen.map(({ at }) => at);
	return Math.max(0, ...times.map((from) => times.filter((at) => at >= from && at < from + HOUR).length));
}

describe('three days without a network', () => {
	it('cost few requests in any hour, lose nothing, and end when it is back', async () => {
		await d.keep(20);
		d.plant.always = 'no-connection';
		await d.start();
		await d.time.advance(72 * HOUR);
		// Half of 5 min on average: 24 an hour; the first hour begins with the short waits.
		expect(busiestHour(d)).toBeLessThan(50);
		expect(d.plant.seen.length).toBeLessThan(72 * 35);
		expect(d.sync.status().sending).toMatchObject({ state: 'waiting', count: 20 });
		d.plant.always = null;
		await d.time.advance(10 * MINUTE);
		expect(d.plant.stored.size).toBe(20);
		expect(d.sync.status().sending).toEqual({ state: 'nothing-waits' });
	});

	it('with a server that fails all the time cost few requests as well', async () => {
		await d.keep(20);
		d.plant.always = { status: 500 };
		await d.start();
		await d.time.advance(72 * HOUR);
		expect(busiestHour(d)).toBeLessThan(100);
		d.plant.always = null;
		await d.time.advance(10 * MINUTE);
		expect(d.plant.stored.size).toBe(20);
	});

	it('with a network that comes and goes every second ask no more than every 10 s', async () => {
		await d.keep(1);
		d.plant.always = 'no-connection';
		await d.start();
		for (let i = 0; i < 600; i++) {
			await d.nudge(i % 2 ? 'online' : 'visible');
			await d.time.advance(1000);
		}
		expect(d.plant.seen.length).toBeLessThanOrEqual(65);
	});

	it('end at once when the network comes back', async () => {
		await d.keep(3);
		d.plant.always = 'no-connection';
		await d.start();
		await d.time.advance(12 * HOUR);
		d.plant.always = null;
		await d.nudge('online');
		await d.time.advance(11_000);
		expect(d.plant.stored.size).toBe(3);
	});
});

describe('triggers', () => {
	it('nothing is asked while nothing waits and nothing failed', async () => {
		await d.start();
		const asked = d.plant.seen.length;
		await d.time.advance(24 * HOUR);
		expect(d.plant.seen).toHaveLength(asked);
		expect(d.time.waiting()).toBe(0);
	});

	it('keeping sends at once', async () => {
		await d.start();
		await d.keep(1);
		await d.nudge('kept');
		expect(d.plant.stored.size).toBe(1);
	});

	it('what is kept while a run is on its way goes with it or right after it', async () => {
		await d.keep(1);
		d.plant.onRequest = async ({ push }) => {
			if (!push || d.plant.pushes().length > 1) return;
			await d.keep(1);
			d.sync.nudge('kept');
		};
		await d.start();
		await d.sync.idle();
		expect(d.plant.stored.size).toBe(2);
	});

	it('every 30 s while something waits', async () => {
		await d.keep(1);
		d.plant.judge = ({ id }, index) => ({ status: 'retry', id, index, afterMs: 30_000 });
		await d.start();
		const asked = d.plant.recordsSent().length;
		await d.time.advance(5 * MINUTE + 1000);
		expect(d.plant.recordsSent().length - asked).toBe(10);
	});

	it('stopping ends everything', async () => {
		await d.keep(1);
		d.plant.always = 'no-connection';
		await d.start();
		await d.sync.stop();
		const asked = d.plant.seen.length;
		await d.time.advance(HOUR);
		await d.nudge('button');
		expect(d.plant.seen).toHaveLength(asked);
		d.plant.always = null;
		d.sync.start();
		await d.sync.idle();
		expect(d.plant.stored.size).toBe(1);
	});

	it('a request that hangs is given up and sent again', async () => {
		const [record] = await d.keep(1);
		let hung = false;
		d.plant.onRequest = ({ signal }) => {
			if (hung) return;
			hung = true;
			return new Promise((_, reject) =>
				signal.addEventListener('abort', () => reject(signal.reason as Error))
			);
		};
		d.sync.start();
		while (!hung) await new Promise((resolve) => setTimeout(resolve, 1));
		// The only timer is the limit of the request.
		d.time.fireNext();
		await d.sync.idle();
		expect(await d.statusOf(record!)).toBe('waiting');
		await d.time.advance(MINUTE);
		expect(await d.statusOf(record!)).toBe('received');
	});
});

describe('two tabs', () => {
	/** A lock as browsers have it, shared by the tabs of one tablet. */
	function sharedLock(): SenderLock {
		let taken = false;
		return async (limit, work) => {
			if (taken) return false;
			taken = true;
			try {
				return await noLock(limit, work);
			} finally {
				taken = false;
			}
		};
	}

	async function twoTabs(lock: SenderLock) {
		const one = await device({ lock });
		const name = (await one.store.db()).name;
		const two = await device({ lock, of: { name, who: one.who, time: one.time, plant: one.plant } });
		return { one, two };
	}

	it('with the lock send each record once', async () => {
		const { one, two } = await twoTabs(sharedLock());
		await one.keep(5);
		await two.keep(5);
		await Promise.all([one.start(), two.start()]);
		expect(one.plant.recordsSent()).toHaveLength(10);
		expect(one.plant.stored.size).toBe(10);
		await Promise.all([one.end(), two.end()]);
	});

	it('without any lock still store each record once, under one sequence of numbers', async () => {
		const { one, two } = await twoTabs(noLock);
		await Promise.all([one.keep(6), two.keep(6)]);
		await Promise.all([one.start(), two.start()]);
		const numbers = [...one.plant.stored.values()].map(({ record }) => record.tabletSeq);
		expect(numbers.sort((a, b) => a - b)).toEqual(Array.from({ length: 12 }, (_, i) => i + 1));
		for (const { status } of await listRecords(one.store, one.who.plantId))
			expect(status.state).toBe('received');
		await Promise.all([one.end(), two.end()]);
	});

	it('take over when the other one goes away', async () => {
		let taken = true;
		const tab = await device({ lock: async (limit, work) => (taken ? false : noLock(limit, work)) });
		await tab.keep(1);
		await tab.start();
		expect(tab.plant.seen).toEqual([]);
		taken = false;
		await tab.time.advance(31_000);
		expect(tab.plant.stored.size).toBe(1);
		await tab.end();
	});
});
