/**
 * The cursor of a pull: signed, so that a tablet can hand it back but not make one. It says up to which number
 * of which plant the mirror is complete, in which epoch of the database and with which reach.
 */
import { createHmac, timingSafeEqual } from 'node:crypto';
import { z } from 'zod';
import { uuid } from '$lib/records/ids';

const cursor = z.strictObject({
	epoch: uuid,
	plant: uuid,
	scopeVersion: z.number().int(),
	seq: z.number().int().nonnegative()
});
export type Cursor = z.infer<typeof cursor>;

export function signCursor(value: Cursor, secret: string): string {
	const text = Buffer.from(JSON.stringify(value)).toString('base64url');
	return `${text}.${signature(text, secret)}`;
}

/** Null for a cursor that was not signed with this secret, or not by this server at all. */
export function readCursor(sent: string, secret: string): Cursor | null {
	const [text = '', given = '', ...more] = sent.split('.');
	const right = Buffer.from(signature(text, secret));
	const held = Buffer.from(given);
	if (more.length || held.length !== right.length || !timingSafeEqual(held, right)) return null;
	// Signed, therefore ours; an older version of this server may still have meant something else.
	const parsed = cursor.safeParse(JSON.parse(Buffer.from(text, 'base64url').toString('utf8')));
	return parsed.success ? parsed.data : null;
}

function signature(text: string, secret: string): string {
	return createHmac('sha256', secret).update(`pull-cursor:${text}`).digest('base64url');
}
