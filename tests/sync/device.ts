/** A tablet: the real store on an IndexedDB in memory and the real sending code, in virtual time. */
import 'fake-indexeddb/auto';
import { openStore, type Store } from '../../src/lib/tablet/store/open';
import { keepCheck } from '../../src/lib/tablet/store/keep';
import { readRecord } from '../../src/lib/tablet/store/outbox';
import { setPerson } from '../../src/lib/tablet/store/person';
import { syncPort } from '../../src/lib/tablet/store/sync-port';
import { createSync, type Sync } from '../../src/lib/tablet/sync/engine';
import type { SenderLock, SyncNews, SyncPort } from '../../src/lib/tablet/sync/port';
import type { Envelope } from '../../src/lib/records/envelope';
import type { CheckToKeep } from '../../src/lib/tablet/store/keep';
import { Plant } from './plant';
import { checkOf, draftOf, localPerson, member, type Member } from './samples';
import { VirtualTime } from './virtual-time';

let count = 0;

export interface Device {
	who: Member;
	time: VirtualTime;
	plant: Plant;
	store: Store;
	sync: Sync;
	news: SyncNews[];
	keep(n?: number, over?: Partial<CheckToKeep>): Promise<Envelope[]>;
	/** A trigger and what it leads to. */
	nudge(why: Parameters<Sync['nudge']>[0]): Promise<void>;
	start(): Promise<void>;
	statusOf(record: Envelope): Promise<string>;
	end(): Promise<void>;
}

export const noLock: SenderLock = async (_limit, work) => {
	await work(new AbortController().signal);
	return true;
};

/** Always the same draws, spread over 0 to 1. */
export function draws(seed = 1): () => number {
	let state = seed;
	return () => (state = (state * 16807) % 2147483647) / 2147483647;
}

export async function device(
	over: {
		lock?: SenderLock;
		wrap?: (port: SyncPort) => SyncPort;
		of?: { name: string; who: Member; time: VirtualTime; plant: Plant };
	} = {}
): Promise<Device> {
	const who = over.of?.who ?? member();
	const time = over.of?.time ?? new VirtualTime();
	const plant = over.of?.plant ?? new Plant(who, () => time.now);
	const store = openStore(undefined, over.of?.name ?? `cogmark-sync-${process.pid}-${++count}`);
	await setPerson(store, localPerson(who));
	const news: SyncNews[] = [];
	const port: SyncPort = syncPort(store);
	const sync = createSync({
		port: over.wrap?.(port) ?? port,
		fetch: plant.fetch,
		clock: time.clock,
		timer: time.timer,
		random: draws(),
		lock: over.lock ?? noLock,
		tell: (about) => news.push(about)
	});
	const before = time.settle;
	time.settle = async () => {
		await before();
		await sync.idle();
	};
	return {
		who,
		time,
		plant,
		store,
		sync,
		news,
		async keep(n = 1, checkOver = {}) {
			const kept: Envelope[] = [];
			for (let i = 0; i < n; i++) {
				kept.push(await keepCheck(store, checkOf(draftOf(who), checkOver), new Date(time.clock.now())));
			}
			return kept;
		},
		async nudge(why) {
			sync.nudge(why);
			await sync.idle();
		},
		async start() {
			sync.start();
			await sync.idle();
		},
		async statusOf({ plantId, id }) {
			return (await readRecord(store, plantId, id))?.status.state ?? 'gone';
		},
		async end() {
			await sync.stop();
			await store.close();
		}
	};
}
