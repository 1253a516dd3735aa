/**
 * How long to wait after a failure: full jitter (a time chosen evenly between nothing and a ceiling that
 * doubles), so that tablets which lost the server together do not come back together.
 */
export const BASE_MS = 2_000;
export const CAP_MS = 5 * 60_000;
/** Without it a run of small draws would be a burst of requests. */
const FLOOR_MS = 500;
/** A server that names a time is believed, but not for ever. */
const RETRY_AFTER_MOST_MS = 60 * 60_000;

/** @param failures in a row, 1 after the first; @param retryAfterMs what the server asked for, or null */
export function backoffMs(failures: number, retryAfterMs: number | null, random: () => number): number {
	const ceiling = Math.min(CAP_MS, BASE_MS * 2 ** Math.min(failures - 1, 30));
	const jittered = Math.max(FLOOR_MS, random() * ceiling);
	return Math.max(jittered, Math.min(retryAfterMs ?? 0, RETRY_AFTER_MOST_MS));
}

/**
 * `Retry-After` (RFC 9110, section 10.2.3) in ms: a number of seconds or an HTTP date.
 * @param serverNow ms since 1970 by the server's clock as well as it is known; null when unreadable
 */
export function retryAfterMs(header: string | null, serverNow: number): number | null {
	if (header === null) return null;
	if (/^\s*\d+\s*$/.test(header)) return Number(header) * 1000;
	const at = Date.parse(header);
	return Number.isNaN(at) ? null : Math.max(0, at - serverNow);
}
