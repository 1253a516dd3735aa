/**
 * What travels between tablet and server, pinned. Tablets in the field hold records of every released version
 * for weeks: a change of this hash is a change of the wire. While nothing is released the hash may be replaced;
 * after a release the change needs a new line here with a new version, and the old version stays accepted.
 */
import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { canonicalJson } from '../../src/lib/records/canonical';
import { envelope, SCHEMA_VERSION } from '../../src/lib/records/envelope';
import { pullResponse, pushRequest, pushResponse, wholeError } from '../../src/lib/records/protocol';

/** Path version and schemaVersion of the envelope, with the SHA-256 of the JSON Schemas of all messages. */
const RELEASED: Record<string, string> = {
	'api/v1, schema 1': 'fe4b17225511cb749995a739238db40439dba42c918e99e01b212dbe39028bfa'
};

describe('the wire', () => {
	it('is what was pinned for this version', () => {
		const messages = { envelope, pushRequest, pushResponse, pullResponse, wholeError };
		const schemas = Object.fromEntries(
			Object.entries(messages).map(([name, schema]) => [name, z.toJSONSchema(schema, { io: 'input' })])
		);
		const hash = createHash('sha256').update(canonicalJson(schemas)).digest('hex');
		expect(hash).toBe(RELEASED[`api/v1, schema ${SCHEMA_VERSION}`]);
	});
});
