/**
 * Identity of records: UUID version 7 (RFC 9562, section 5.7), made where the record is made.
 * The time in it is for the reader's eye only: no order in this application depends on a tablet's clock.
 */
import { z } from 'zod';

export const uuid = z.uuid('This must be an identifier (UUID). Take it from the list; do not type it.');

/** A new UUIDv7 for a moment in milliseconds since 1970. */
export function newId(now: number = Date.now()): string {
	const bytes = crypto.getRandomValues(new Uint8Array(16));
	const time = BigInt(Math.max(0, Math.floor(now)));
	for (let i = 0; i < 6; i++) bytes[i] = Number((time >> BigInt(8 * (5 - i))) & 0xffn);
	bytes[6] = (bytes[6]! & 0x0f) | 0x70;
	bytes[8] = (bytes[8]! & 0x3f) | 0x80;
	const hex = Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('');
	return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-${hex.slice(12, 16)}-${hex.slice(16, 20)}-${hex.slice(20)}`;
}
