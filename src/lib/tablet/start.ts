/**
 * The one place where the tablet's store and its sending meet the browser. Called once a page load by the
 * tablet's layout; screens use what it returns and nothing else of this folder but types.
 */
import type { Envelope } from '$lib/records/envelope';
import type { CheckRow, MachineRow, MaterialRow, PositionRow, RulesRow } from '$lib/records/mirror';
import { newsBoard, type News } from './news';
import { senderLock } from './sender-lock';
import * as drafts from './store/drafts';
import { keepCheck, type CheckToKeep } from './store/keep';
import * as mirror from './store/mirror';
import { DATABASE, openStore, type StoreTrouble } from './store/open';
import { listRecords, readRecord, type KeptRecord } from './store/outbox';
import { readPerson, setPerson, signOut } from './store/person';
import type { Draft, LocalPerson } from './store/schema';
import { syncPort } from './store/sync-port';
import { tabletId } from './store/tablet-id';
import { createSync, type Sync } from './sync/engine';
import type { Fetch } from './sync/port';
import { storageState, type StorageState } from './sync/status';
import { whoAmI, type WhoAmI } from './who-am-i';

export type { News } from './news';
export { KeepFailure, type CheckToKeep } from './store/keep';
export type { KeptRecord, RecordStatus } from './store/outbox';
export type { Draft, LocalPerson } from './store/schema';
export type { Sync } from './sync/engine';
export type { SyncStatus } from './sync/status';
export type { WhoAmI } from './who-am-i';

/** `unavailable`: the browser gives no store at all; told by whoever called, when the start is refused. */
export type Trouble = StoreTrouble | 'unavailable';

export interface StorageStatus {
	state: StorageState;
	persisted: boolean;
	/** Bytes; null where the browser does not tell. */
	usage: number | null;
	quota: number | null;
}

export interface Tablet {
	/** UUIDv7 of this device. */
	id: string;
	/** Whether the browser promised not to evict the store. */
	persisted: boolean;
	storage(): Promise<StorageStatus>;
	person(): Promise<LocalPerson | null>;
	/** On this tablet only: the mirror goes, drafts and records stay. The server's session is ended elsewhere. */
	signOut(): Promise<void>;
	/** Asks the server, and lets whoever is signed in there work here. */
	whoAmI(): Promise<WhoAmI>;
	drafts: {
		start(start: drafts.DraftStart): Promise<Draft>;
		/** To be called at every keystroke. */
		save(draft: Draft): Promise<'saved' | 'already-kept'>;
		get(id: string): Promise<Draft | undefined>;
		list(plantId: string, authorId: string): Promise<Draft[]>;
		discard(id: string): Promise<void>;
	};
	mirror: {
		machines(plantId: string): Promise<MachineRow[]>;
		machine(plantId: string, id: string): Promise<MachineRow | null>;
		positions(plantId: string, machineId?: string): Promise<PositionRow[]>;
		position(plantId: string, id: string): Promise<PositionRow | null>;
		materials(plantId: string): Promise<MaterialRow[]>;
		material(plantId: string, id: string): Promise<MaterialRow | null>;
		rules(plantId: string): Promise<RulesRow | null>;
		checksAt(plantId: string, positionId: string): Promise<CheckRow[]>;
		/** null: never pulled since the sign-in. */
		state(plantId: string): Promise<{ complete: boolean; pulledAt: string } | null>;
	};
	/** @returns when the check is on the disk @throws KeepFailure, with the draft untouched */
	keep(check: CheckToKeep): Promise<Envelope>;
	records: {
		list(plantId: string, authorId?: string): Promise<KeptRecord[]>;
		get(plantId: string, id: string): Promise<KeptRecord | undefined>;
	};
	sync: Sync;
	/** What changed in the store, by this tab or another. @returns the end of it */
	subscribe(listener: (about: News) => void): () => void;
	stop(): Promise<void>;
}

const fetchFromPlant: Fetch = (path, init) =>
	fetch(path, {
		...init,
		headers: {
			// A page of another origin cannot send this header without asking first.
			'x-cogmark': '1',
			accept: 'application/json',
			...(init.body === undefined ? {} : { 'content-type': 'application/json' })
		},
		credentials: 'same-origin',
		// A sign-in page that answers in the plant's place is no answer.
		redirect: 'error',
		cache: 'no-store'
	});

/** @param options.onTrouble the store is held or closed by something else: see StoreTrouble */
export async function startTablet(
	options: { onTrouble?: (trouble: StoreTrouble) => void } = {}
): Promise<Tablet> {
	const store = openStore(options.onTrouble);
	const id = await tabletId(store);
	const persisted = (await navigator.storage?.persist?.().catch(() => false)) ?? false;
	const news = newsBoard(DATABASE);
	const now = () => new Date();

	const sync = createSync({
		port: syncPort(store),
		fetch: fetchFromPlant,
		clock: { now: () => Date.now(), monotonic: () => performance.now() },
		timer: {
			set: (afterMs, run) => window.setTimeout(run, afterMs),
			clear: (handle) => window.clearTimeout(handle as number)
		},
		random: Math.random,
		lock: senderLock(navigator.locks, () => performance.now()),
		tell: news.tell
	});

	const onVisible = () => {
		if (document.visibilityState === 'visible') sync.nudge('visible');
	};
	const onOnline = () => sync.nudge('online');
	document.addEventListener('visibilitychange', onVisible);
	window.addEventListener('online', onOnline);
	news.subscribe((about, elsewhere) => {
		if (about !== 'records' && about !== 'person') return;
		if (about === 'person' && elsewhere && sync.status().sending.state === 'signed-out') {
			sync.nudge('signed-in');
		} else {
			sync.refresh().catch(() => undefined);
		}
	});
	sync.start();

	async function told<T>(about: News, work: Promise<T>): Promise<T> {
		const result = await work;
		news.tell(about);
		return result;
	}

	return {
		id,
		persisted,
		async storage() {
			const { usage = null, quota = null } = (await navigator.storage?.estimate?.()) ?? {};
			return { state: storageState(persisted, usage, quota), persisted, usage, quota };
		},
		person: () => readPerson(store),
		signOut: () => told('person', signOut(store)),
		async whoAmI() {
			const answer = await whoAmI(fetchFromPlant, now());
			if (answer.kind === 'signed-in') {
				await told('person', setPerson(store, answer.person));
				sync.nudge('signed-in');
			}
			return answer;
		},
		drafts: {
			start: (start) => told('drafts', drafts.startDraft(store, start, now())),
			save: (draft) => drafts.saveDraft(store, draft, now()),
			get: (draftId) => drafts.readDraft(store, draftId),
			list: (plantId, authorId) => drafts.listDrafts(store, plantId, authorId),
			discard: (draftId) => told('drafts', drafts.discardDraft(store, draftId))
		},
		mirror: {
			machines: (plantId) => mirror.machines(store, plantId),
			machine: (plantId, rowId) => mirror.machine(store, plantId, rowId),
			positions: (plantId, machineId) => mirror.positions(store, plantId, machineId),
			position: (plantId, rowId) => mirror.position(store, plantId, rowId),
			materials: (plantId) => mirror.materials(store, plantId),
			material: (plantId, rowId) => mirror.material(store, plantId, rowId),
			rules: (plantId) => mirror.rules(store, plantId),
			checksAt: (plantId, positionId) => mirror.checksAt(store, plantId, positionId),
			state: (plantId) => mirror.pullPosition(store, plantId)
		},
		async keep(check) {
			const record = await told('records', keepCheck(store, check, now()));
			news.tell('drafts');
			sync.nudge('kept');
			return record;
		},
		records: {
			list: (plantId, authorId) => listRecords(store, plantId, authorId),
			get: (plantId, recordId) => readRecord(store, plantId, recordId)
		},
		sync,
		subscribe: (listener) => news.subscribe((about) => listener(about)),
		async stop() {
			document.removeEventListener('visibilitychange', onVisible);
			window.removeEventListener('online', onOnline);
			await sync.stop();
			news.close();
			await store.close();
		}
	};
}
