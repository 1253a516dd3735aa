/** The parts that meet the browser: whose session it is, the lock between tabs, news between tabs. */
import { describe, expect, it } from 'vitest';
import { newsBoard } from '../../../src/lib/tablet/news';
import { senderLock } from '../../../src/lib/tablet/sender-lock';
import { whoAmI } from '../../../src/lib/tablet/who-am-i';
import { newId } from '../../../src/lib/records/ids';

const NOW = new Date('2026-03-02T09:00:00Z');

describe('who is signed in', () => {
	const answering = (status: number, body: unknown) =>
		whoAmI(async () => new Response(JSON.stringify(body), { status }), NOW);
	const [id, plantId] = [newId(), newId()];
	const person = { id, name: 'Tester' };

	it('is read from the plant', async () => {
		const plant = { id: plantId, name: 'Test Mill', role: 'planner' };
		expect(await answering(200, { person, plant })).toEqual({
			kind: 'signed-in',
			person: {
				personId: id,
				name: 'Tester',
				role: 'planner',
				plantId,
				plantName: 'Test Mill',
				since: NOW.toISOString()
			}
		});
		expect(await answering(200, { person, plant: null })).toEqual({ kind: 'no-plant', name: 'Tester' });
		expect(await answering(401, {})).toEqual({ kind: 'signed-out' });
	});

	it('stays open when no answer of the plant comes', async () => {
		expect(await answering(503, {})).toEqual({ kind: 'unreachable' });
		expect(await answering(200, { hello: 'guest network' })).toEqual({ kind: 'unreachable' });
		expect(await whoAmI(() => Promise.reject(new TypeError('no connection')), NOW)).toEqual({
			kind: 'unreachable'
		});
	});
});

describe('the lock between tabs', () => {
	/** Web Locks as far as they are used: one holder a name, `ifAvailable` and `steal`. */
	function locks() {
		let holder: ((reason: unknown) => void) | null = null;
		const request = async (
			_name: string,
			options: LockOptions,
			work: (lock: Lock | null) => Promise<unknown>
		) => {
			if (holder && !options.steal) return work(null);
			holder?.(new DOMException('stolen', 'AbortError'));
			const lost = new Promise((_, reject) => (holder = reject));
			try {
				return await Promise.race([work({ name: 'n', mode: 'exclusive' }), lost]);
			} finally {
				holder = null;
			}
		};
		return { request } as unknown as LockManager;
	}
	const idle = async () => undefined;

	it('lets one tab work and tells the other at once', async () => {
		const shared = locks();
		const [one, two] = [senderLock(shared, () => 0), senderLock(shared, () => 0)];
		let finish = () => {};
		const working = one(1000, () => new Promise<void>((resolve) => (finish = resolve)));
		expect(await two(1000, idle)).toBe(false);
		finish();
		expect(await working).toBe(true);
		expect(await two(1000, idle)).toBe(true);
	});

	it('is taken from a tab that hangs for longer than the limit', async () => {
		let now = 0;
		const shared = locks();
		const [one, two] = [senderLock(shared, () => now), senderLock(shared, () => now)];
		const hanging = one(1000, () => new Promise(() => undefined));
		expect(await two(1000, idle)).toBe(false);
		now = 900;
		expect(await two(1000, idle)).toBe(false);
		now = 1001;
		expect(await two(1000, idle)).toBe(true);
		await expect(hanging).rejects.toThrow('stolen');
	});

	it('is not needed', async () => {
		let worked = false;
		expect(await senderLock(undefined, () => 0)(1000, async () => void (worked = true))).toBe(true);
		expect(worked).toBe(true);
	});
});

describe('news', () => {
	it('reach this tab and every other one, and no tab after it closed', async () => {
		const [one, two] = [newsBoard('cogmark-news-test'), newsBoard('cogmark-news-test')];
		const heard: unknown[] = [];
		one.subscribe((about, elsewhere) => heard.push(['one', about, elsewhere]));
		const other = new Promise<void>((resolve) =>
			two.subscribe((about, elsewhere) => {
				heard.push(['two', about, elsewhere]);
				resolve();
			})
		);
		one.tell('records');
		await other;
		expect(heard).toEqual([
			['one', 'records', false],
			['two', 'records', true]
		]);
		one.close();
		two.close();
	});
});
