/**
 * Keeping a check: its number, the record, its place in the outbox and the end of its draft are one strict
 * transaction, and it is called kept only after that. Whatever fails, the draft is still there.
 */
import type { Outcome } from '$lib/gear/contract';
import { canonicalJson } from '$lib/records/canonical';
import { envelope, envelopeHash, SCHEMA_VERSION, type Envelope, type Unhashed } from '$lib/records/envelope';
import { lastContact } from './contact';
import { highestDrawn } from './counters';
import type { Store } from './open';
import type { Draft, OutboxEntry } from './schema';
import { tabletId } from './tablet-id';
import { inTransaction } from './transaction';

export interface CheckToKeep {
	/** The record takes its id, so that a double tap keeps one record. */
	draft: Draft;
	/** ISO 8601, tablet's clock: the moment for which the outcome was worked out. */
	performedAt: string;
	materialRevision: number | null;
	rulesRevision: number;
	outcome: Outcome;
	amends?: string | null;
}

export type KeepFailureCode = 'bad-content' | 'already-kept' | 'storage-full' | 'store-failed';

/** Why a check could not be kept. `issues` name the fields of bad content; the words for people stand elsewhere. */
export class KeepFailure extends Error {
	constructor(
		readonly code: KeepFailureCode,
		message: string,
		readonly issues: { path: string; message: string }[] = [],
		options?: ErrorOptions
	) {
		super(message, options);
		this.name = 'KeepFailure';
	}
}

/** More than the tabs of one tablet can have in flight at once; each round one of them gets its number. */
const ROUNDS = 100;

/**
 * @param now when it is called kept, by the tablet's clock
 * @returns the record as it stands on the disk
 * @throws KeepFailure
 */
export async function keepCheck(store: Store, check: CheckToKeep, now: Date): Promise<Envelope> {
	const tablet = await tabletId(store);
	const contact = await lastContact(store);
	const { draft } = check;
	const key = { plantId: draft.plantId, tabletId: tablet, authorId: draft.authorId };
	for (let round = 0; round < ROUNDS; round++) {
		// The hash covers the number, and hashing cannot wait inside a transaction: take the next number, hash,
		// and write only when it is still the next.
		const tabletSeq = (await highestDrawn(store, key)) + 1;
		const record = await seal({
			schemaVersion: SCHEMA_VERSION,
			kind: 'check',
			id: draft.id,
			...key,
			tabletSeq,
			performedAt: check.performedAt,
			clockOffsetMs: contact?.clockOffsetMs ?? null,
			amends: check.amends ?? null,
			photos: [],
			body: {
				machineId: draft.machineId,
				positionId: draft.positionId,
				answers: draft.answers,
				materialRevision: check.materialRevision,
				rulesRevision: check.rulesRevision,
				outcome: check.outcome
			}
		});
		const kept = await write(store, record, now).catch((error: unknown) => {
			throw failureOf(error);
		});
		if (kept) return sameCheck(kept, record);
	}
	throw new KeepFailure('store-failed', 'No free number was found for this record: try again.');
}

/** As plain data, checked by the schema of the wire: a record that the plant would refuse is told here. */
async function seal(unhashed: Unhashed): Promise<Envelope> {
	const plain = JSON.parse(canonicalJson(unhashed)) as Unhashed;
	const record: Envelope = { ...plain, hash: await envelopeHash(plain) };
	const checked = envelope.safeParse(record);
	if (checked.success) return record;
	const issues = checked.error.issues.map(({ path, message }) => ({ path: path.join('.'), message }));
	throw new KeepFailure(
		'bad-content',
		issues.map(({ path, message }) => `${path}: ${message}`).join(' '),
		issues
	);
}

/** @returns the record of this id that is on the disk, or null when the number was taken meanwhile */
function write(store: Store, record: Envelope, now: Date): Promise<Envelope | null> {
	const { plantId, id, authorId, tabletId, tabletSeq, hash } = record;
	const entry: OutboxEntry = {
		plantId,
		id,
		authorId,
		hash,
		bytes: new TextEncoder().encode(JSON.stringify(record)).length,
		keptAt: now.toISOString(),
		state: 'waiting',
		due: 1,
		receipt: null,
		trouble: null
	};
	return inTransaction(
		store,
		['records', 'outbox', 'counters', 'drafts'],
		async (tx) => {
			const kept = await tx.objectStore('records').get([plantId, id]);
			if (kept) return kept;
			const counter = await tx.objectStore('counters').get([plantId, tabletId, authorId]);
			if ((counter?.highest ?? 0) !== tabletSeq - 1) return null;
			await tx.objectStore('records').add(record);
			await tx.objectStore('outbox').add(entry);
			await tx.objectStore('counters').put({ plantId, tabletId, authorId, highest: tabletSeq });
			await tx.objectStore('drafts').delete(id);
			return record;
		},
		'strict'
	);
}

/** A second keeping of one draft is the first one, as long as it says the same. */
function sameCheck(kept: Envelope, asked: Envelope): Envelope {
	const said = ({ authorId, amends, body }: Envelope) =>
		canonicalJson({
			authorId,
			amends,
			machineId: body.machineId,
			positionId: body.positionId,
			answers: body.answers
		});
	if (said(kept) === said(asked)) return kept;
	throw new KeepFailure(
		'already-kept',
		'This check is kept already, with other content. Start a new check to correct it.'
	);
}

function failureOf(error: unknown): KeepFailure {
	const full = error instanceof DOMException && error.name === 'QuotaExceededError';
	return full
		? new KeepFailure(
				'storage-full',
				'The storage of this tablet is full: the check stays as a draft. Send what waits, then keep it again.',
				[],
				{ cause: error }
			)
		: new KeepFailure(
				'store-failed',
				'The tablet could not write the check: it stays as a draft. Try again.',
				[],
				{
					cause: error
				}
			);
}
