/**
 * One request and what its answer means. Only a 200 whose body has the shape of the protocol is an answer of
 * the plant; a sign-in page of the site's network, half an answer or an error page is a failure like any other.
 */
import type { z } from 'zod';
import { wholeError } from '$lib/records/protocol';
import { retryAfterMs } from './backoff';
import type { Contact, SyncDeps } from './port';

/** A request that hangs for longer is given up; the record stays and is sent again. */
export const REQUEST_LIMIT_MS = 30_000;

export type Answer<T> =
	| { kind: 'ok'; value: T; contact: Contact }
	/** No answer came. */
	| { kind: 'unreachable' }
	| { kind: 'signed-out' }
	| { kind: 'blocked'; code: 'tablet-blocked' | 'not-allowed' }
	| { kind: 'too-large' }
	| { kind: 'update' }
	/** The server is there and says later: 429 and 503. */
	| { kind: 'busy'; retryAfterMs: number | null }
	/** Any other answer: nothing is concluded from it but to try again later. */
	| { kind: 'failed'; status: number; retryAfterMs: number | null };

export type Refusal = Exclude<Answer<never>, { kind: 'ok' }>;

type Asking = Pick<SyncDeps, 'fetch' | 'clock' | 'timer'>;

export async function ask<T extends { serverTime: string }>(
	deps: Asking,
	request: { method: 'GET' | 'POST'; path: string; body?: string },
	schema: z.ZodType<T>,
	until: AbortSignal
): Promise<Answer<T>> {
	const { clock, timer } = deps;
	const giveUp = new AbortController();
	const limit = timer.set(REQUEST_LIMIT_MS, () => giveUp.abort());
	const stop = () => giveUp.abort();
	until.addEventListener('abort', stop);
	if (until.aborted) stop();
	const askedAt = clock.monotonic();
	try {
		const { path, ...init } = request;
		const response = await deps.fetch(path, { ...init, signal: giveUp.signal });
		const roundTrip = clock.monotonic() - askedAt;
		if (response.status !== 200) return await refusalOf(response, clock.now());
		const parsed = schema.safeParse(await readJson(response));
		const serverTime = parsed.success ? Date.parse(parsed.data.serverTime) : NaN;
		if (!parsed.success || Number.isNaN(serverTime)) {
			return { kind: 'failed', status: 200, retryAfterMs: null };
		}
		// The server read its clock somewhere between question and answer: in the middle, as far as is known.
		const clockOffsetMs = Math.round(serverTime - (clock.now() - roundTrip / 2));
		return { kind: 'ok', value: parsed.data, contact: { at: parsed.data.serverTime, clockOffsetMs } };
	} catch {
		return { kind: 'unreachable' };
	} finally {
		timer.clear(limit);
		until.removeEventListener('abort', stop);
	}
}

async function refusalOf(response: Response, now: number): Promise<Refusal> {
	const { status } = response;
	const after = retryAfterMs(response.headers.get('retry-after'), now);
	if (status === 401) return { kind: 'signed-out' };
	if (status === 403) {
		const body = wholeError.safeParse(await readJson(response).catch(() => null));
		const notAllowed = body.success && body.data.error.code === 'not-allowed';
		return { kind: 'blocked', code: notAllowed ? 'not-allowed' : 'tablet-blocked' };
	}
	if (status === 413) return { kind: 'too-large' };
	if (status === 426) return { kind: 'update' };
	if (status === 429 || status === 503) return { kind: 'busy', retryAfterMs: after };
	return { kind: 'failed', status, retryAfterMs: after };
}

/** What is not JSON is no answer of the plant; a body that breaks off is no answer at all and throws. */
async function readJson(response: Response): Promise<unknown> {
	const text = await response.text();
	try {
		return JSON.parse(text) as unknown;
	} catch {
		return undefined;
	}
}
