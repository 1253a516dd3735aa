/** The mirror follows the plant, and a restore of the plant brings back what was sent since. */
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { machines, pullPosition } from '../../src/lib/tablet/store/mirror';
import { SENT_KEPT_MS } from '../../src/lib/tablet/store/outbox';
import { readPerson, setPerson, signOut } from '../../src/lib/tablet/store/person';
import { newId } from '../../src/lib/records/ids';
import { device, type Device } from './device';
import { localPerson, machineChange, member } from './samples';

let d: Device;
beforeEach(async () => {
	d = await device();
});
afterEach(() => d.end());

const add = (tag: string, id?: string) => d.plant.changes.push(machineChange(d.plant.nextSeq(), tag, id));
const tags = async (plantId = d.who.plantId) => (await machines(d.store, plantId)).map(({ tag }) => tag);
const pulls = () => d.plant.seen.filter(({ method }) => method === 'GET');

describe('a pull', () => {
	it('goes on until the plant has no more, then from its cursor', async () => {
		for (const tag of ['A', 'B', 'C', 'D', 'E']) add(tag);
		await d.start();
		expect(pulls()).toHaveLength(3);
		expect(await tags()).toEqual(['A', 'B', 'C', 'D', 'E']);
		add('F');
		await d.nudge('button');
		expect(pulls()).toHaveLength(4);
		expect(await tags()).toEqual(['A', 'B', 'C', 'D', 'E', 'F']);
		expect(d.news).toContain('mirror');
	});

	it('that breaks off goes on where it was', async () => {
		for (const tag of ['A', 'B', 'C', 'D', 'E']) add(tag);
		d.plant.faults = [null, 'no-connection'];
		await d.start();
		expect(await tags()).toEqual(['A', 'B']);
		expect(await pullPosition(d.store, d.who.plantId)).toMatchObject({ complete: false });
		await d.time.advance(60_000);
		expect(await tags()).toEqual(['A', 'B', 'C', 'D', 'E']);
		expect(pulls().filter(({ path }) => !path.includes('cursor'))).toHaveLength(1);
	});

	it('whose page cannot be written is asked for again: no row is skipped', async () => {
		let failing = true;
		const other = await device({
			wrap: (port) => ({
				...port,
				applyPage: async (...given) => {
					if (failing) throw new DOMException('full', 'QuotaExceededError');
					return port.applyPage(...given);
				}
			})
		});
		other.plant.changes.push(machineChange(other.plant.nextSeq(), 'A'));
		await other.start();
		failing = false;
		await other.time.advance(60_000);
		expect((await machines(other.store, other.who.plantId)).map(({ tag }) => tag)).toEqual(['A']);
		await other.end();
	});

	it('takes rows away by tombstones', async () => {
		const id = newId();
		add('A', id);
		add('B');
		await d.start();
		d.plant.changes.push({ entity: 'machine', id, seq: d.plant.nextSeq(), row: null });
		await d.nudge('button');
		expect(await tags()).toEqual(['B']);
	});

	it('does nothing for nobody: after a sign-out nobody is signed in again by a session that lives on', async () => {
		await d.start();
		await signOut(d.store);
		const asked = d.plant.seen.length;
		await d.nudge('button');
		expect(d.plant.seen).toHaveLength(asked);
		expect(d.sync.status().sending).toEqual({ state: 'signed-out', count: 0 });
		expect(await readPerson(d.store)).toBeNull();
	});

	it('that is under way when the person signs out writes nothing', async () => {
		add('A');
		d.plant.onRequest = () => signOut(d.store);
		await d.start();
		expect(await readPerson(d.store)).toBeNull();
		expect(await tags()).toEqual([]);
	});
});

describe('a reset', () => {
	it('of scope rebuilds the mirror and pushes nothing again', async () => {
		add('A');
		const [record] = await d.keep(1);
		await d.start();
		const pushed = d.plant.recordsSent().length;
		d.plant.scopeVersion++;
		d.plant.changes = [];
		add('B');
		await d.nudge('button');
		expect(await tags()).toEqual(['B']);
		expect(d.plant.recordsSent()).toHaveLength(pushed);
		expect(await d.statusOf(record!)).toBe('received');
	});

	it('of scope leaves what waits in the outbox', async () => {
		await d.start();
		d.plant.scopeVersion++;
		const kept = await d.keep(3);
		d.plant.onRequest = ({ method }) => {
			d.plant.always = method === 'POST' ? 'no-connection' : null;
		};
		await d.nudge('kept');
		expect(await Promise.all(kept.map(d.statusOf))).toEqual(['waiting', 'waiting', 'waiting']);
	});

	it('by a restore pushes again what the plant no longer has, in the same run', async () => {
		add('A');
		const first = await d.keep(2);
		await d.start();
		const restore = d.plant.backup();
		const second = await d.keep(3);
		await d.nudge('kept');
		expect(d.plant.stored.size).toBe(5);
		restore();
		expect(d.plant.stored.size).toBe(2);
		await d.nudge('button');
		expect(d.plant.stored.size).toBe(5);
		for (const record of [...first, ...second]) expect(await d.statusOf(record)).toBe('received');
		expect(await tags()).toEqual(['A']);
	});

	it('by a restore that happened while nobody was signed in is repaired too', async () => {
		await d.start();
		const restore = d.plant.backup();
		const [record] = await d.keep(1);
		await d.nudge('kept');
		await signOut(d.store);
		restore();
		expect(d.plant.stored.size).toBe(0);
		await setPerson(d.store, localPerson(d.who));
		await d.nudge('signed-in');
		expect(d.plant.stored.has(record!.id)).toBe(true);
	});
});

describe('copies of what was sent', () => {
	it('go after 14 days by the clock of the plant, whatever the clock of the tablet says', async () => {
		const [record] = await d.keep(1);
		await d.start();
		d.time.tabletAheadMs = 10 * 365 * 24 * 3_600_000;
		await d.nudge('button');
		expect(await d.statusOf(record!)).toBe('received');
		d.time.tabletAheadMs = -d.time.tabletAheadMs;
		d.time.pass(SENT_KEPT_MS + 1000);
		await d.nudge('button');
		expect(await d.statusOf(record!)).toBe('gone');
	});

	it('stay when a restore is noticed in that very run', async () => {
		const restore = d.plant.backup();
		const [record] = await d.keep(1);
		await d.start();
		d.time.pass(SENT_KEPT_MS + 1000);
		restore();
		await d.nudge('button');
		expect(d.plant.stored.has(record!.id)).toBe(true);
		expect(await d.statusOf(record!)).toBe('received');
	});

	it('are not even looked at in a run that rebuilt the mirror', async () => {
		let looked = 0;
		const other = await device({
			wrap: (port) => ({
				...port,
				purgeSent: (...given) => {
					looked++;
					return port.purgeSent(...given);
				}
			})
		});
		await other.start();
		expect(looked).toBe(0);
		await other.nudge('button');
		expect(looked).toBe(1);
		other.plant.epoch++;
		await other.nudge('button');
		expect(looked).toBe(1);
		await other.end();
	});
});

describe('the clock', () => {
	it('of the tablet is compared with the middle of the round trip', async () => {
		d.time.tabletAheadMs = 3 * 3_600_000;
		d.plant.onRequest = () => d.time.pass(400);
		await d.start();
		// The plant reads its clock at the end of the 400 ms that the request took: 200 ms after the middle.
		expect(d.sync.status().clock).toEqual({ state: 'off', offsetMs: -3 * 3_600_000 + 200 });
	});

	it('is remembered, with the time of the contact, over a restart', async () => {
		await d.start();
		const at = d.sync.status().contactAt;
		expect(at).toBe(new Date(d.time.now).toISOString());
		d.plant.always = 'no-connection';
		d.time.pass(3_600_000);
		await d.nudge('button');
		expect(d.sync.status()).toMatchObject({ contactAt: at, reachable: false });
	});
});

describe('another person', () => {
	it('of the session works here after the pull', async () => {
		await d.start();
		const other = { ...d.who, personId: newId(), name: 'Other' };
		d.plant.session = other;
		await d.nudge('button');
		expect(await readPerson(d.store)).toMatchObject({ personId: other.personId, name: 'Other' });
	});

	it('at another plant gets the mirror of that plant only', async () => {
		add('A');
		await d.start();
		const there = member();
		d.plant.session = there;
		d.plant.changes = [];
		add('B');
		await d.nudge('button');
		expect([await tags(), await tags(there.plantId)]).toEqual([[], ['B']]);
	});
});
