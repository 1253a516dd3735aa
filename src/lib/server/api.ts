/**
 * The edge of the API: one wrapper that turns what a handler returns or refuses into JSON, and the reading of
 * bodies within a size. Promise: an answer never carries a stack, a query or a text of the database.
 */
import { json, type RequestEvent } from '@sveltejs/kit';
import { databaseUnreachable } from './db/postgres-error';
import { REFUSAL_STATUS, REFUSAL_TEXT, Refused, type Refusal } from './errors';
import { logFailure } from './log';

type Handler = (event: RequestEvent) => Promise<Response>;

/** @param work returns the body of a 200 answer, or a whole answer */
export function api(work: (event: RequestEvent) => Promise<object>): Handler {
	return async (event) => {
		try {
			if (event.request.method !== 'GET') requireOwnPage(event.request);
			const answer = await work(event);
			return answer instanceof Response ? answer : json(answer);
		} catch (failure) {
			if (failure instanceof Refused) return refusalResponse(failure.refusal);
			if (databaseUnreachable(failure)) return refusalResponse({ code: 'busy' });
			logFailure(`${event.request.method} ${event.route.id}`, failure);
			return refusalResponse({ code: 'failed' });
		}
	};
}

export function refusalResponse(refusal: Refusal): Response {
	const { code } = refusal;
	const status = REFUSAL_STATUS[code];
	const issues = code === 'invalid-input' ? refusal.issues : undefined;
	return json(
		{ error: { code, text: REFUSAL_TEXT[code], issues } },
		{ status, headers: status === 503 ? { 'retry-after': '5' } : {} }
	);
}

/**
 * A page of another site can send a form or a plain text with our cookie, but neither this header nor JSON
 * without asking first, and nobody here answers that question with yes.
 */
function requireOwnPage(request: Request): void {
	const origin = request.headers.get('origin');
	const host = request.headers.get('host') ?? new URL(request.url).host;
	const sameOrigin = origin === null || (URL.canParse(origin) && new URL(origin).host === host);
	if (!sameOrigin || request.headers.get('x-cogmark') !== '1') throw new Refused({ code: 'not-allowed' });
}

/** The JSON body of a request, read no further than `maxBytes`. */
export async function readJson(request: Request, maxBytes: number): Promise<unknown> {
	const type = request.headers.get('content-type') ?? '';
	if (!/^application\/json\s*(;|$)/i.test(type)) {
		throw invalid('content-type', 'Send JSON: content-type application/json.');
	}
	if (Number(request.headers.get('content-length')) > maxBytes) throw new Refused({ code: 'too-large' });
	const bytes = await readBytes(request, maxBytes);
	try {
		return JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(bytes));
	} catch {
		throw invalid('', 'This is not JSON in UTF-8. Nothing was kept; send it again.');
	}
}

async function readBytes(request: Request, maxBytes: number): Promise<Uint8Array> {
	const parts: Uint8Array[] = [];
	let size = 0;
	const reader = request.body?.getReader();
	for (let part = await reader?.read(); part?.value; part = await reader?.read()) {
		size += part.value.length;
		if (size > maxBytes) {
			await reader?.cancel();
			throw new Refused({ code: 'too-large' });
		}
		parts.push(part.value);
	}
	return Buffer.concat(parts);
}

function invalid(path: string, message: string): Refused {
	return new Refused({ code: 'invalid-input', issues: [{ path, message }] });
}
