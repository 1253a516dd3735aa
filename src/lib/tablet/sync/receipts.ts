/**
 * From the server's answers to what becomes of each record. A receipt counts only for a record of this very
 * request with the same id and the same hash; whatever is not understood leaves its record waiting.
 */
import type { PushAnswer } from '$lib/records/protocol';
import type { DueRecord, Settlement } from './port';

export interface Judged {
	settlements: Settlement[];
	/** Records to be left alone for a while, by the server's wish or because its answer is no receipt. */
	hold: { id: string; forMs: number }[];
	/** How many of the batch were answered in a way that moves them. */
	settled: number;
	stored: number;
}

/** A record whose receipt does not fit, or that was not answered, is tried again after this time. */
export const UNSETTLED_HOLD_MS = 5 * 60_000;

export function judge(batch: DueRecord[], answers: PushAnswer[]): Judged {
	const judged: Judged = { settlements: [], hold: [], settled: 0, stored: 0 };
	const open = new Map(batch.map((record) => [record.id, record]));
	for (const answer of answers) {
		const record = answer.id === null || 'index' in answer ? at(batch, answer) : open.get(answer.id);
		if (!record || !open.has(record.id)) continue;
		open.delete(record.id);
		const { id, hash } = record;
		if (answer.status === 'retry') {
			judged.hold.push({ id, forMs: Math.min(answer.afterMs, UNSETTLED_HOLD_MS) });
		} else if (answer.status === 'quarantined') {
			judged.settlements.push({ kind: 'quarantined', id, hash, code: answer.code, text: answer.text });
			judged.settled++;
		} else if (answer.hash === hash) {
			const { seq, receivedAt } = answer;
			judged.settlements.push({ kind: 'received', id, hash, seq, receivedAt });
			judged.settled++;
			if (answer.status === 'stored') judged.stored++;
		} else {
			const text = `The plant holds other content under the number of this record (${answer.hash}).`;
			judged.settlements.push({ kind: 'trouble', id, hash, code: 'receipt-differs', text });
			judged.hold.push({ id, forMs: UNSETTLED_HOLD_MS });
		}
	}
	for (const id of open.keys()) judged.hold.push({ id, forMs: UNSETTLED_HOLD_MS });
	return judged;
}

/** The record at the place that the answer names; none when it names another record as well. */
function at(batch: DueRecord[], answer: PushAnswer): DueRecord | undefined {
	const record = 'index' in answer ? batch[answer.index] : undefined;
	return answer.id === null || answer.id === record?.id ? record : undefined;
}
