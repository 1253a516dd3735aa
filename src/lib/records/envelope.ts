/**
 * The envelope of a record: made on the tablet, immutable, hashed. Key `(plantId, id)`; `tabletSeq` is gapless
 * per tablet and author; `hash` is SHA-256 over the canonical JSON of everything else.
 */
import { z } from 'zod';
import { canonicalJson, sha256 } from './canonical';
import { checkBody } from './check';
import { uuid } from './ids';
import { strictFields } from './plain-words';

export const SCHEMA_VERSION = 1;
const digest = z.string().regex(/^[0-9a-f]{64}$/, 'A hash is 64 lower-case hexadecimal digits.');

export const envelope = strictFields('A record', {
	schemaVersion: z.literal(
		SCHEMA_VERSION,
		'This version of the record is not known here: update the tablet.'
	),
	kind: z.literal('check'),
	id: uuid,
	plantId: uuid,
	authorId: uuid,
	tabletId: uuid,
	tabletSeq: z.number().int().positive(),
	/** ISO 8601 by the tablet's clock. */
	performedAt: z.iso.datetime(),
	/** Server's clock minus tablet's clock when last heard, in ms; null before the first contact. */
	clockOffsetMs: z.number().int().nullable(),
	/** The record that this one corrects; the original stays as it is. */
	amends: uuid.nullable(),
	/** SHA-256 of each photo as kept. */
	photos: z.array(digest).max(0, 'Photos are not sent by this version.'),
	body: checkBody,
	hash: digest
});
export type Envelope = z.infer<typeof envelope>;
export type Unhashed = Omit<Envelope, 'hash'>;

/** Hash of an envelope: everything but the hash itself. Keys that a later version adds are hashed too. */
export async function envelopeHash(record: Record<string, unknown>): Promise<string> {
	const { hash: _hash, ...rest } = record;
	return sha256(canonicalJson(rest));
}
