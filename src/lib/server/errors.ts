/**
 * What the server refuses, as coded unions. The words here are the plain English of the API; people read the
 * words of the catalogue, chosen by code. A refusal names no row of another plant: what is not ours is not there.
 */
import type { WholeError } from '$lib/records/protocol';

export interface Issue {
	path: string;
	message: string;
}

export type RefusalCode = WholeError['error']['code'];
export type Refusal =
	{ code: 'invalid-input'; issues: Issue[] } | { code: Exclude<RefusalCode, 'invalid-input'> };

/** Thrown inside a command, so that its transaction rolls back; answered at the edge of the server. */
export class Refused extends Error {
	override name = 'Refused';
	constructor(readonly refusal: Refusal) {
		super(refusal.code);
	}
}

export const REFUSAL_STATUS: Record<RefusalCode, number> = {
	'invalid-input': 422,
	'signed-out': 401,
	'not-allowed': 403,
	'tablet-blocked': 403,
	'not-found': 404,
	'too-large': 413,
	'update-needed': 426,
	busy: 503,
	failed: 500
};

export const REFUSAL_TEXT: Record<RefusalCode, string> = {
	'invalid-input': 'Something in this request cannot be used. See the fields named.',
	'signed-out': 'Sign in first.',
	'not-allowed':
		'Your role at this plant does not allow this, or the request did not come from a page of this application (header x-cogmark: 1).',
	'tablet-blocked': 'This tablet is blocked. Hand it to a supervisor.',
	'not-found': 'There is nothing here by this name.',
	'too-large': 'This is too much at once. Send less.',
	'update-needed': 'This tablet needs an update before it can send.',
	busy: 'The plant cannot be reached just now. Try again shortly.',
	failed: 'This went wrong on the server. Nothing you sent was lost; try again.'
};
