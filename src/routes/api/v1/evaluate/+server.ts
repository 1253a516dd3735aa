/** The calculation contract over HTTP: one question or a list of them, as at the shell. */
import { json } from '@sveltejs/kit';
import { evaluate } from '$lib/gear/evaluate';
import { parseEvaluate } from '$lib/records/evaluate';
import { api, readJson } from '$lib/server/api';
import { memberScope } from '$lib/server/auth/guard';

const MAX_BYTES = 256 * 1024;

export const POST = api(async ({ locals, request }) => {
	memberScope(locals);
	const body = await readJson(request, MAX_BYTES);
	if (Array.isArray(body)) return body.map((item) => answer(item).body);
	const { status, body: answered } = answer(body);
	return status === 200 ? answered : json(answered, { status });
});

function answer(question: unknown) {
	const parsed = parseEvaluate(question);
	return parsed.ok ? { status: 200, body: evaluate(parsed.input) } : { status: 422, body: parsed.error };
}
