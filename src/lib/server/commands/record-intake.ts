/**
 * Reads one sent record before anything is asked of the database: whose plant it is, whether it is a record at
 * all, whether it is the one that the tablet hashed. Never throws: what cannot be read is refused with a reason.
 */
import { canonicalJson } from '$lib/records/canonical';
import { envelope, envelopeHash, type Envelope } from '$lib/records/envelope';
import { uuid } from '$lib/records/ids';
import { invalidInput } from '$lib/records/invalid-input';
import type { QuarantineCode } from '$lib/records/protocol';

/** What is known of a record that cannot be stored, as far as it could be read. */
export interface Unstorable {
	kind: 'unstorable';
	/** As sent. */
	id: string | null;
	bytes: string;
	code: QuarantineCode;
	text: string;
	authorId: string | null;
	tabletSeq: number | null;
}

export type Intake =
	/** Made at another plant: nothing of it may be kept, logged or answered here. */
	| { kind: 'elsewhere'; id: string | null }
	| Unstorable
	/** `bytes` is the canonical JSON that the hash was taken over, together with the hash. */
	| { kind: 'sound'; record: Envelope; sentId: string; bytes: string };

export async function readRecord(sent: unknown, at: { plantId: string; tabletId: string }): Promise<Intake> {
	const fields = isObject(sent) ? sent : {};
	const id = typeof fields['id'] === 'string' ? fields['id'].slice(0, 100) : null;
	const plant = uuid.safeParse(fields['plantId']);
	if (plant.success && !sameId(plant.data, at.plantId)) return { kind: 'elsewhere', id };

	const bytes = bytesOf(sent);
	const author = uuid.safeParse(fields['authorId']);
	const number = fields['tabletSeq'];
	const refuse = (code: QuarantineCode, text: string): Unstorable => ({
		kind: 'unstorable',
		id,
		bytes,
		code,
		text,
		authorId: author.success ? author.data : null,
		tabletSeq: typeof number === 'number' && Number.isSafeInteger(number) && number > 0 ? number : null
	});

	const parsed = envelope.safeParse(sent, { reportInput: true });
	if (!parsed.success) {
		const [first] = invalidInput(parsed.error.issues, sent).error.issues;
		return refuse(
			'bad-content',
			`${first?.path || 'record'}: ${first?.message ?? 'cannot be read.'}`.slice(0, 500)
		);
	}
	const record = parsed.data;
	if (!sameId(record.tabletId, at.tabletId)) {
		return refuse('bad-content', 'tabletId: This record was made on another tablet. Send it from there.');
	}
	// Over the record as sent, since the schema leaves out what it does not know.
	if ((await envelopeHash(fields)) !== record.hash) {
		return refuse('hash-mismatch', 'The content is not what the tablet kept: its hash differs.');
	}
	return { kind: 'sound', record, sentId: record.id, bytes };
}

export function sameId(a: string, b: string): boolean {
	return a.toLowerCase() === b.toLowerCase();
}

function isObject(value: unknown): value is Record<string, unknown> {
	return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function bytesOf(sent: unknown): string {
	try {
		return canonicalJson(sent);
	} catch {
		// A number such as 1e999 reads as infinite, which JSON cannot hold: it is kept as a word.
		return JSON.stringify(sent, (_key, value: unknown) =>
			typeof value === 'number' && !Number.isFinite(value) ? String(value) : value
		);
	}
}
