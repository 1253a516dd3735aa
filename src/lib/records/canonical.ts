/**
 * The bytes that are hashed: JSON with object keys sorted by UTF-16 code unit, no white space, and numbers as
 * ECMAScript prints them (RFC 8785, JSON Canonicalization Scheme). The same value gives the same bytes on the
 * tablet and on the server, whatever order its keys were written in.
 */

export function canonicalJson(value: unknown): string {
	if (value === null || typeof value === 'boolean' || typeof value === 'string') return JSON.stringify(value);
	if (typeof value === 'number') {
		if (!Number.isFinite(value)) throw new RangeError('A record holds finite numbers only.');
		return JSON.stringify(value);
	}
	if (Array.isArray(value)) return `[${value.map((item) => canonicalJson(item)).join(',')}]`;
	if (typeof value === 'object') {
		const entries = Object.entries(value as Record<string, unknown>)
			// JSON has no `undefined`: a key without a value is the same as no key.
			.filter(([, item]) => item !== undefined)
			.sort(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0))
			.map(([key, item]) => `${JSON.stringify(key)}:${canonicalJson(item)}`);
		return `{${entries.join(',')}}`;
	}
	throw new TypeError(`A record cannot hold a ${typeof value}.`);
}

/** SHA-256 as 64 lower-case hexadecimal digits, of the UTF-8 bytes of a text. */
export async function sha256(text: string): Promise<string> {
	const digest = await crypto.subtle.digest('SHA-256', new TextEncoder().encode(text));
	return Array.from(new Uint8Array(digest), (byte) => byte.toString(16).padStart(2, '0')).join('');
}
