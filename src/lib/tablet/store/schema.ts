/**
 * The tablet's database: what each store holds, and the steps that made it. A tablet may come back after a
 * year with an old version and a full outbox, so a released step is never edited and a step can only add:
 * it is handed nothing with which it could delete.
 */
import type { DBSchema, IDBPDatabase, IDBPTransaction, IndexNames, StoreNames } from 'idb';
import type { CheckAnswers } from '$lib/records/check';
import type { Envelope } from '$lib/records/envelope';
import type { Entity, MirrorChange } from '$lib/records/mirror';
import type { QuarantineCode, Role } from '$lib/records/protocol';
import type { Take } from '$lib/records/reading';

/** Who works here now. It outlives the server's session: the right to record offline is another thing. */
export interface LocalPerson {
	personId: string;
	name: string;
	role: Role;
	plantId: string;
	plantName: string;
	/** ISO 8601, tablet's clock. */
	since: string;
}

/** What stands in the number field and is no answer yet. */
export interface Entry {
	/** Which reading: a span carries its teeth in the name. */
	field: string;
	text: string;
	unit: string;
	source: Take['source'];
	/** The same reading once more, beside the one that is kept. */
	again: boolean;
}

/** A check that is not kept yet, with the text of the field that is being typed. */
export interface Draft {
	/** The record that is made of it takes this id, so that keeping twice keeps once. */
	id: string;
	plantId: string;
	authorId: string;
	machineId: string;
	positionId: string;
	answers: CheckAnswers;
	entry: Entry | null;
	step: string;
	startedAt: string;
	updatedAt: string;
}

/** One row of the mirror. `parentId` is the machine of a position or the position of a check, else ''. */
export interface MirrorEntry {
	plantId: string;
	entity: Entity;
	id: string;
	parentId: string;
	seq: number;
	row: NonNullable<MirrorChange['row']>;
}

export interface PullPosition {
	plantId: string;
	cursor: string;
	/** False while more pages are to come after a rebuild. */
	complete: boolean;
	/** Server's time of the last page. */
	pulledAt: string;
}

export interface Counter {
	plantId: string;
	tabletId: string;
	authorId: string;
	highest: number;
}

/** Why a record needs a person: the server's reason, or one that the tablet found itself. */
export type TroubleCode = QuarantineCode | 'too-large' | 'receipt-differs';
export interface Trouble {
	code: TroubleCode;
	text: string;
}

/** Where a kept record is on its way. The record itself stands in `records` and is never written again. */
export interface OutboxEntry {
	/** Place in the order of keeping on this tablet; set by the database, no clock in it. */
	order?: number;
	plantId: string;
	id: string;
	authorId: string;
	hash: string;
	/** UTF-8 bytes of the record as sent. */
	bytes: number;
	/** ISO 8601, tablet's clock: when it was called kept. */
	keptAt: string;
	state: 'waiting' | 'sent' | 'quarantined';
	/** 1 while it must be pushed. A sent record is pushed again when the server may have lost it. */
	due: 0 | 1;
	/** The server's number and server's time, from a receipt with the same id and hash. */
	receipt: { seq: number; receivedAt: string } | null;
	trouble: Trouble | null;
}

export interface CogmarkSchema extends DBSchema {
	settings: { key: string; value: unknown };
	person: { key: string; value: LocalPerson };
	drafts: { key: string; value: Draft; indexes: { byAuthor: [string, string] } };
	records: { key: [string, string]; value: Envelope };
	outbox: {
		key: number;
		value: OutboxEntry;
		indexes: { byId: [string, string]; byDue: [string, number]; byState: [string, string] };
	};
	counters: { key: [string, string, string]; value: Counter };
	mirror: {
		key: [string, string, string];
		value: MirrorEntry;
		indexes: { byParent: [string, string, string] };
	};
	pulls: { key: string; value: PullPosition };
}

export type CogmarkDb = IDBPDatabase<CogmarkSchema>;
type Stores = StoreNames<CogmarkSchema>;
type Upgrading = IDBPTransaction<CogmarkSchema, Stores[], 'versionchange'>;

/** All that an upgrade can do. */
export interface Adder {
	store(name: Stores, options?: IDBObjectStoreParameters): void;
	index<S extends Stores>(
		store: S,
		name: IndexNames<CogmarkSchema, S>,
		path: string | string[],
		unique?: boolean
	): void;
}

/** Step n leads from version n to n + 1. */
export const UPGRADES: readonly ((add: Adder) => void)[] = [
	(add) => {
		add.store('settings');
		add.store('person');
		add.store('drafts', { keyPath: 'id' });
		add.index('drafts', 'byAuthor', ['plantId', 'authorId']);
		add.store('records', { keyPath: ['plantId', 'id'] });
		add.store('outbox', { keyPath: 'order', autoIncrement: true });
		add.index('outbox', 'byId', ['plantId', 'id'], true);
		add.index('outbox', 'byDue', ['plantId', 'due']);
		add.index('outbox', 'byState', ['plantId', 'state']);
		add.store('counters', { keyPath: ['plantId', 'tabletId', 'authorId'] });
		add.store('mirror', { keyPath: ['plantId', 'entity', 'id'] });
		add.index('mirror', 'byParent', ['plantId', 'entity', 'parentId']);
		add.store('pulls', { keyPath: 'plantId' });
	}
];

export function adderFor(db: CogmarkDb, tx: Upgrading): Adder {
	return {
		store: (name, options) => void db.createObjectStore(name, options),
		index: (store, name, path, unique = false) =>
			void tx.objectStore(store).createIndex(name, path, { unique })
	};
}
