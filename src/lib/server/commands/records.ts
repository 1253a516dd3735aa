/**
 * Receiving records from a tablet. Promises: what is answered `stored` or `duplicate` is a committed row with
 * that hash; what is refused is kept whole in quarantine; a record that is refused delays no other; a record of
 * another plant leaves no trace here; and the server's outcome comes from its own core, materials and rules.
 */
import type { Outcome } from '$lib/gear/contract';
import { answerCheck } from '$lib/records/answer-check';
import { sha256 } from '$lib/records/canonical';
import type { Envelope } from '$lib/records/envelope';
import { newId } from '$lib/records/ids';
import type { PushAnswer, PushRequest, PushResponse, QuarantineCode } from '$lib/records/protocol';
import { allow } from '../auth/permission';
import { recordChange } from '../db/change-log';
import { inPlant, type Scope, type Tx } from '../db/client';
import { databaseFault, databaseUnreachable } from '../db/postgres-error';
import { checks, quarantine } from '../db/schema/checks';
import { Refused } from '../errors';
import { logFailure } from '../log';
import { outcomesAgree } from './agreement';
import { contextOf, keptRows, placeRecord, type Kept } from './record-context';
import { readRecord, type Intake, type Unstorable } from './record-intake';
import { hearTablet, noteDrawn } from './tablet-contact';

/** A record that cannot be taken now is offered again after this time. */
const RETRY_MS = 60_000;

type Sound = Extract<Intake, { kind: 'sound' }>;
type Prepared =
	| { kind: 'elsewhere'; id: string | null }
	| Unstorable
	| { kind: 'duplicate'; sentId: string; kept: Kept }
	| { kind: 'new'; intake: Sound; outcome: Outcome };
/** A failure on our side: the record stays on the tablet. */
type Failed = { kind: 'failed'; id: string | null };

interface Sender {
	scope: Scope;
	tabletId: string;
	receivedAt: Date;
}

export async function storeRecords(
	scope: Scope,
	request: PushRequest,
	receivedAt = new Date()
): Promise<PushResponse> {
	allow(scope);
	const tabletId = request.tabletId.toLowerCase();
	const sender: Sender = { scope, tabletId, receivedAt };
	const at = { plantId: scope.plantId, tabletId };
	const intakes: Intake[] = [];
	for (const sent of request.records) intakes.push(await readRecord(sent, at));

	const answers = await inPlant(scope, async (tx) => {
		const maySend = await hearTablet(tx, scope, tabletId, receivedAt);
		await noteDrawn(tx, scope, { tabletId, drawn: request.drawn });
		if (!maySend) return null;
		const prepared = await prepare(tx, scope.plantId, intakes);
		// Everything is read and computed: from here on the plant's counter may be held.
		const settled: PushAnswer[] = [];
		for (const [index, item] of prepared.entries()) settled.push(await settle(tx, sender, item, index));
		return settled;
	});
	// After the commit, so that the contact itself is noted.
	if (!answers) throw new Refused({ code: 'tablet-blocked' });
	return { answers, serverTime: new Date().toISOString() };
}

async function prepare(tx: Tx, plantId: string, intakes: Intake[]): Promise<(Prepared | Failed)[]> {
	const sound = intakes.filter((intake) => intake.kind === 'sound');
	const context = await contextOf(
		tx,
		plantId,
		sound.map((intake) => intake.record)
	);
	return intakes.map((intake) => {
		if (intake.kind !== 'sound') return intake;
		const { record, sentId } = intake;
		const kept = context.kept.get(record.id.toLowerCase());
		if (kept) return kept.hash === record.hash ? { kind: 'duplicate', sentId, kept } : idTaken(intake);
		const place = placeRecord(record, context);
		if (!place.ok) return unstorable(intake, place.code, place.text);
		try {
			const { answers } = record.body;
			const outcome = answerCheck(answers, place.plantSide, record.performedAt);
			return { kind: 'new', intake, outcome };
		} catch (failure) {
			logFailure('check computed again', failure);
			return { kind: 'failed', id: sentId };
		}
	});
}

async function settle(tx: Tx, sender: Sender, item: Prepared | Failed, index: number): Promise<PushAnswer> {
	try {
		switch (item.kind) {
			case 'duplicate':
				return receipt('duplicate', item.sentId, item.kept);
			case 'new':
				return await storeNew(tx, sender, item, index);
			case 'unstorable':
				return await keepAside(tx, sender, item, index);
			case 'elsewhere':
			case 'failed':
				return { status: 'retry', id: item.id, index, afterMs: RETRY_MS };
		}
	} catch (failure) {
		if (databaseUnreachable(failure)) throw failure;
		logFailure('record stored', failure);
		const id = item.kind === 'new' ? item.intake.sentId : item.kind === 'duplicate' ? item.sentId : item.id;
		return { status: 'retry', id, index, afterMs: RETRY_MS };
	}
}

async function storeNew(
	tx: Tx,
	sender: Sender,
	{ intake, outcome }: Extract<Prepared, { kind: 'new' }>,
	index: number
): Promise<PushAnswer> {
	const { record, sentId } = intake;
	try {
		// A savepoint: when the insert fails, the number drawn for it goes back to the counter.
		const kept = await tx.transaction((savepoint) => insertCheck(savepoint, sender, intake, outcome));
		return receipt('stored', sentId, kept);
	} catch (failure) {
		const fault = databaseFault(failure);
		if (fault?.state === UNIQUE_VIOLATION) {
			// Someone was faster. Only the row itself tells whether it is the same record.
			const id = record.id.toLowerCase();
			const kept = (await keptRows(tx, sender.scope.plantId, [id])).get(id);
			if (kept?.hash === record.hash) return receipt('duplicate', sentId, kept);
			const taken = kept
				? idTaken(intake)
				: unstorable(intake, 'number-taken', 'Another record of this tablet and author has this number.');
			return keepAside(tx, sender, taken, index);
		}
		if (fault?.constraint === 'checks_amends_fk') {
			const text = 'amends: The record that this one corrects is not here.';
			return keepAside(tx, sender, unstorable(intake, 'bad-content', text), index);
		}
		if (fault?.state.startsWith(DATA_EXCEPTION)) {
			const text = 'record: It holds a character or a moment that cannot be stored.';
			return keepAside(tx, sender, unstorable(intake, 'bad-content', text), index);
		}
		throw failure;
	}
}

const UNIQUE_VIOLATION = '23505';
const DATA_EXCEPTION = '22';

async function insertCheck(
	tx: Tx,
	{ scope, tabletId, receivedAt }: Sender,
	{ record, bytes }: Sound,
	outcome: Outcome
): Promise<Kept> {
	const { plantId, personId } = scope;
	const { body, hash } = record;
	const seq = await recordChange(tx, plantId, 'check', record.id);
	await tx.insert(checks).values({
		plantId,
		id: record.id,
		seq,
		hash,
		envelope: bytes,
		authorId: record.authorId,
		tabletId,
		tabletSeq: record.tabletSeq,
		performedAt: new Date(record.performedAt),
		clockOffsetMs: record.clockOffsetMs,
		receivedAt,
		sentBy: personId,
		machineId: body.machineId,
		positionId: body.positionId,
		materialId: body.answers.materialId,
		materialRevision: body.materialRevision,
		rulesRevision: body.rulesRevision,
		amends: record.amends,
		body,
		tabletOutcome: body.outcome,
		serverOutcome: outcome,
		tabletCore: body.outcome.core,
		serverCore: outcome.core,
		agrees: outcomesAgree(body.outcome, outcome),
		verdict: outcome.verdict
	});
	return { hash, seq, receivedAt };
}

async function keepAside(
	tx: Tx,
	{ scope, tabletId, receivedAt }: Sender,
	{ id, bytes, code, text, authorId, tabletSeq }: Unstorable,
	index: number
): Promise<PushAnswer> {
	const row = {
		plantId: scope.plantId,
		id: newId(receivedAt.getTime()),
		bytes,
		bytesHash: await sha256(bytes),
		code,
		text,
		tabletId,
		authorId,
		tabletSeq,
		sentBy: scope.personId,
		receivedAt
	};
	await tx.transaction((savepoint) => savepoint.insert(quarantine).values(row).onConflictDoNothing());
	return { status: 'quarantined', id, index, code, text };
}

function receipt(status: 'stored' | 'duplicate', id: string, { hash, seq, receivedAt }: Kept): PushAnswer {
	return { status, id, hash, seq, receivedAt: receivedAt.toISOString() };
}

function unstorable(
	{ sentId, bytes, record }: { sentId: string; bytes: string; record: Envelope },
	code: QuarantineCode,
	text: string
): Unstorable {
	const { authorId, tabletSeq } = record;
	return { kind: 'unstorable', id: sentId, bytes, code, text, authorId, tabletSeq };
}

function idTaken(intake: Sound): Unstorable {
	return unstorable(intake, 'id-taken', 'Another record is kept here under this identifier.');
}
