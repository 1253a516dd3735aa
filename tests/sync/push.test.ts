/** Sending against a plant that goes wrong: nothing is lost, nothing is doubled, nothing delays another. */
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { PUSH_MAX_BYTES, PUSH_MAX_RECORDS } from '../../src/lib/records/protocol';
import { listRecords } from '../../src/lib/tablet/store/outbox';
import { setPerson } from '../../src/lib/tablet/store/person';
import { device, type Device } from './device';
import { cannotSayOutcome, localPerson, member } from './samples';

const MINUTE = 60_000;
let d: Device;
beforeEach(async () => {
	d = await device();
});
afterEach(() => d.end());

const sending = () => d.sync.status().sending;
const held = async () => (await listRecords(d.store, d.who.plantId)).length;

describe('a push', () => {
	it('sends the oldest first and takes the receipts', async () => {
		const kept = await d.keep(3);
		await d.start();
		expect(d.plant.recordsSent()).toEqual(kept);
		for (const record of kept) expect(await d.statusOf(record)).toBe('received');
		expect(sending()).toEqual({ state: 'nothing-waits' });
	});

	it('pings with an empty list and the numbers drawn when nothing waits', async () => {
		await d.keep(2);
		await d.start();
		const pushes = d.plant.pushes().length;
		await d.nudge('button');
		const [ping, ...more] = d.plant.pushes().slice(pushes);
		expect(more).toEqual([]);
		expect(ping?.push).toMatchObject({ records: [], drawn: [{ authorId: d.who.personId, highest: 2 }] });
	});

	it('holds at most 50 records and 256 KB', async () => {
		const text = 'x'.repeat(1900);
		const reasons = Array.from({ length: 10 }, () => ({ code: 'long', text }));
		await d.keep(30, { outcome: { ...cannotSayOutcome, reasons } });
		await d.keep(60);
		await d.start();
		const filled = d.plant.pushes().filter(({ push }) => push!.records.length > 0);
		for (const { bytes, push } of filled) {
			expect(bytes).toBeLessThanOrEqual(PUSH_MAX_BYTES);
			expect(push!.records.length).toBeLessThanOrEqual(PUSH_MAX_RECORDS);
		}
		expect(filled.length).toBeLessThanOrEqual(5);
		expect(d.plant.stored.size).toBe(90);
	});

	it('counts up while it sends', async () => {
		await d.keep(120);
		const said: unknown[] = [];
		d.sync.subscribe(({ sending }) => sending.state === 'sending' && said.push([sending.at, sending.of]));
		await d.start();
		expect([...new Set(said.map((x) => JSON.stringify(x)))]).toEqual(['[1,120]', '[51,120]', '[101,120]']);
	});

	it('sends only what belongs to the plant of the session', async () => {
		const [elsewhere] = await d.keep(1);
		const there = member();
		await setPerson(d.store, localPerson(there));
		d.plant.session = there;
		await d.start();
		expect(d.plant.recordsSent()).toEqual([]);
		expect(await d.statusOf(elsewhere!)).toBe('waiting');
		expect(d.sync.status()).toMatchObject({ elsewhere: 1, sending: { state: 'nothing-waits' } });
	});

	it('goes to the plant that the session turned out to be of', async () => {
		const [here] = await d.keep(1);
		const there = member();
		d.plant.session = there;
		await d.start();
		expect(d.plant.recordsSent()).toEqual([]);
		expect(await d.statusOf(here!)).toBe('waiting');
		expect(d.news).toContain('person');
	});
});

describe('a lost answer', () => {
	it('leaves the record waiting; the second push is answered with the first receipt', async () => {
		const [record] = await d.keep(1);
		d.plant.faults = [null, 'lost'];
		await d.start();
		expect(d.plant.stored.size).toBe(1);
		expect(await d.statusOf(record!)).toBe('waiting');
		await d.time.advance(MINUTE);
		expect(await d.statusOf(record!)).toBe('received');
		expect(d.plant.stored.size).toBe(1);
		expect(d.plant.recordsSent()).toEqual([record, record]);
	});
});

describe('single answers', () => {
	it('a receipt with another hash is not taken and asks for attention; the right one is', async () => {
		const [wrong, right] = await d.keep(2);
		d.plant.judge = ({ id }) =>
			id === wrong!.id
				? { status: 'stored', id, hash: 'a'.repeat(64), seq: 1, receivedAt: '2026-03-02T09:00:00Z' }
				: null;
		await d.start();
		expect(await d.statusOf(wrong!)).toBe('attention');
		expect(await d.statusOf(right!)).toBe('received');
		expect(sending()).toMatchObject({ state: 'waiting', count: 1 });
		d.plant.judge = () => null;
		await d.time.advance(6 * MINUTE);
		expect(await d.statusOf(wrong!)).toBe('received');
		expect(d.sync.status().attention).toBe(0);
	});

	it('a receipt for a record that was not sent changes nothing', async () => {
		const [first, second] = await d.keep(2);
		const { hash, id } = second!;
		d.plant.judge = (record) =>
			record.id === first!.id
				? { status: 'stored', id, hash, seq: 5, receivedAt: '2026-03-02T09:00:00Z' }
				: null;
		await d.start();
		expect(await d.statusOf(first!)).toBe('waiting');
	});

	it('a record that is refused delays no other and stays on the tablet', async () => {
		const kept = await d.keep(5);
		d.plant.judge = ({ id }, index) =>
			id === kept[2]!.id ? { status: 'quarantined', id, index, code: 'unknown-position', text: 'why' } : null;
		await d.start();
		expect(await Promise.all(kept.map(d.statusOf))).toEqual([
			'received',
			'received',
			'attention',
			'received',
			'received'
		]);
		expect(d.sync.status()).toMatchObject({ attention: 1, sending: { state: 'nothing-waits' } });
		const before = d.plant.recordsSent().length;
		await d.time.advance(60 * MINUTE);
		expect(d.plant.recordsSent()).toHaveLength(before);
		expect(await held()).toBe(5);
	});

	it('a refusal that names no id is matched by its place', async () => {
		const kept = await d.keep(2);
		d.plant.judge = (record, index) =>
			record.id === kept[1]!.id
				? { status: 'quarantined', id: null, index, code: 'bad-content', text: 'why' }
				: null;
		await d.start();
		expect(await d.statusOf(kept[0]!)).toBe('received');
		expect(await d.statusOf(kept[1]!)).toBe('attention');
	});

	it('a record that is to be offered later waits its time, and the others go', async () => {
		const [later, now] = await d.keep(2);
		let asked = 0;
		d.plant.judge = ({ id }, index) =>
			id === later!.id && ++asked === 1 ? { status: 'retry', id, index, afterMs: 45_000 } : null;
		await d.start();
		expect(await d.statusOf(now!)).toBe('received');
		await d.time.advance(29_000);
		expect(asked).toBe(1);
		await d.time.advance(MINUTE);
		expect(await d.statusOf(later!)).toBe('received');
	});

	it('a record that was left out of the answers is sent again, not in a loop', async () => {
		const [record] = await d.keep(1);
		d.plant.faults = [null, { status: 200, body: { answers: [], serverTime: '2026-03-02T09:00:00Z' } }];
		await d.start();
		expect(d.plant.recordsSent()).toHaveLength(1);
		await d.time.advance(10 * MINUTE);
		expect(await d.statusOf(record!)).toBe('received');
	});
});

describe('whole answers', () => {
	it('401 pauses and asks for sign-in; everything waits and goes after it', async () => {
		await d.keep(12);
		d.plant.session = null;
		await d.start();
		expect(sending()).toEqual({ state: 'signed-out', count: 12 });
		const asked = d.plant.seen.length;
		await d.time.advance(60 * MINUTE);
		expect(d.plant.seen).toHaveLength(asked);
		await d.keep(1);
		await d.nudge('kept');
		await d.sync.refresh();
		expect(d.plant.seen).toHaveLength(asked);
		expect(sending()).toEqual({ state: 'signed-out', count: 13 });
		d.plant.session = d.who;
		await d.nudge('signed-in');
		expect(d.plant.stored.size).toBe(13);
		expect(sending()).toEqual({ state: 'nothing-waits' });
	});

	it.each([
		['tablet-blocked', 'tablet-blocked'],
		['not-allowed', 'not-allowed'],
		['something-new', 'tablet-blocked']
	])('403 %s seals the outbox', async (code, said) => {
		await d.keep(2);
		d.plant.faults = [null, { status: 403, body: { error: { code, text: 'no' } } }];
		await d.start();
		expect(sending()).toEqual({ state: 'blocked', count: 2, code: said });
		const asked = d.plant.seen.length;
		await d.time.advance(60 * MINUTE);
		expect(d.plant.seen).toHaveLength(asked);
		expect(await held()).toBe(2);
		await d.nudge('button');
		expect(d.plant.stored.size).toBe(2);
	});

	it('426 asks for the update and keeps everything', async () => {
		await d.keep(2);
		d.plant.always = { status: 426 };
		await d.start();
		expect(sending()).toEqual({ state: 'update', count: 2 });
		expect(await held()).toBe(2);
	});

	it('413 halves the batch until it goes', async () => {
		const kept = await d.keep(20);
		d.plant.onRequest = ({ push }) => {
			d.plant.always = push && push.records.length > 6 ? { status: 413 } : null;
		};
		await d.start();
		const sizes = d.plant.pushes().map(({ push }) => push!.records.length);
		expect(sizes.slice(0, 3)).toEqual([20, 10, 5]);
		expect(d.plant.stored.size).toBe(kept.length);
	});

	it('413 for one record alone asks for attention and delays no other', async () => {
		const kept = await d.keep(4);
		d.plant.onRequest = ({ push }) => {
			const tooLarge = (push?.records as { id: string }[] | undefined)?.some(({ id }) => id === kept[1]!.id);
			d.plant.always = tooLarge ? { status: 413 } : null;
		};
		await d.start();
		expect(await Promise.all(kept.map(d.statusOf))).toEqual([
			'received',
			'attention',
			'received',
			'received'
		]);
		expect(sending()).toMatchObject({ state: 'waiting', count: 1 });
	});

	it('429 and 503 wait as long as the server asks, for the button too', async () => {
		await d.keep(1);
		d.plant.faults = [null, { status: 429, retryAfter: '90' }];
		await d.start();
		const asked = d.plant.seen.length;
		await d.nudge('button');
		await d.time.advance(89_000);
		expect(d.plant.seen).toHaveLength(asked);
		await d.time.advance(2_000);
		expect(d.plant.stored.size).toBe(1);
	});

	it.each([500, 502, 400, 404, 409, 422])('%i is tried again and drops nothing', async (status) => {
		const [record] = await d.keep(1);
		d.plant.always = { status, body: 'not json' };
		await d.start();
		await d.time.advance(30 * MINUTE);
		expect(await d.statusOf(record!)).toBe('waiting');
		d.plant.always = null;
		await d.time.advance(10 * MINUTE);
		expect(await d.statusOf(record!)).toBe('received');
	});

	it('a page of the network that is between answers in vain', async () => {
		const [record] = await d.keep(1);
		d.plant.always = { status: 200, body: '<html>sign in to the guest network</html>' };
		await d.start();
		expect(await d.statusOf(record!)).toBe('waiting');
		expect(d.sync.status()).toMatchObject({ contactAt: null, reachable: false });
	});

	it('one record on which the plant fails does not keep the others', async () => {
		const kept = await d.keep(8);
		d.plant.onRequest = ({ push }) => {
			const poison = (push?.records as { id: string }[] | undefined)?.some(({ id }) => id === kept[0]!.id);
			d.plant.always = poison ? { status: 500 } : null;
		};
		await d.start();
		await d.time.advance(10 * MINUTE);
		expect(d.plant.stored.size).toBe(7);
		expect(await d.statusOf(kept[0]!)).toBe('waiting');
	});

	it('a pull that fails does not keep records from being pushed', async () => {
		const [record] = await d.keep(1);
		d.plant.onRequest = ({ method }) => {
			d.plant.always = method === 'GET' ? { status: 500 } : null;
		};
		await d.start();
		expect(await d.statusOf(record!)).toBe('received');
	});
});
