/** A tablet sends what it kept (records/protocol.ts). Every record has its own answer. */
import { PUSH_MAX_BYTES, PUSH_MAX_RECORDS, pushRequest } from '$lib/records/protocol';
import { invalidInput } from '$lib/records/invalid-input';
import { api, readJson } from '$lib/server/api';
import { memberScope } from '$lib/server/auth/guard';
import { storeRecords } from '$lib/server/commands/records';
import { Refused } from '$lib/server/errors';

export const POST = api(async ({ locals, request }) => {
	const scope = memberScope(locals);
	const body = await readJson(request, PUSH_MAX_BYTES);
	if (recordsIn(body) > PUSH_MAX_RECORDS) throw new Refused({ code: 'too-large' });
	const parsed = pushRequest.safeParse(body, { reportInput: true });
	if (!parsed.success) throw new Refused(invalidInput(parsed.error.issues, body).error);
	return storeRecords(scope, parsed.data);
});

/** Too many is no mistake of the content: the tablet halves the batch and sends again. */
function recordsIn(body: unknown): number {
	const records = (body as { records?: unknown } | null)?.records;
	return Array.isArray(records) ? records.length : 0;
}
