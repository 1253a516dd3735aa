/**
 * A question of the calculation contract over HTTP: signed in, one question or a list, bad input as 422 with the error
 * object, in a list as that element's answer.
 */
import { json, type RequestEvent } from '@sveltejs/kit';
import type { InvalidInput } from '$lib/gear/contract';
import { readJson } from './api';
import { memberScope } from './auth/guard';

const MAX_BYTES = 256 * 1024;

export async function answerContract(
	{ locals, request }: RequestEvent,
	answer: (question: unknown) => object | InvalidInput
): Promise<object> {
	memberScope(locals);
	const body = await readJson(request, MAX_BYTES);
	if (Array.isArray(body)) return body.map(answer);
	const answered = answer(body);
	return 'error' in answered ? json(answered, { status: 422 }) : answered;
}
