/**
 * Push and pull, version 1: what a tablet and the server say to each other. No answer of the server ever
 * deletes a record on a tablet; only a receipt with matching id and hash moves it from outbox to sent.
 */
import { z } from 'zod';
import { uuid } from './ids';
import { mirrorChange } from './mirror';
import { strictFields } from './plain-words';

export const PUSH_MAX_RECORDS = 50;
export const PUSH_MAX_BYTES = 256 * 1024;
export const PULL_PAGE = 500;

export const pushRequest = strictFields('The request', {
	tabletId: uuid,
	/** The highest number drawn per author on this tablet for this plant; sent with every ping. */
	drawn: z
		.array(
			z.strictObject({
				authorId: uuid,
				highest: z.number('The highest number drawn: a whole number from 0.').int().nonnegative()
			}),
			'drawn: send a list of {authorId, highest}; an empty list where none was drawn.'
		)
		.max(200, 'drawn: at most 200 authors.'),
	/** Checked one by one, so that a bad record delays no other. An empty list is a ping. */
	records: z
		.array(z.unknown(), 'records: send a list; an empty one is a ping.')
		.max(PUSH_MAX_RECORDS, `At most ${PUSH_MAX_RECORDS} records at once.`)
});
export type PushRequest = z.infer<typeof pushRequest>;

export const QUARANTINE_CODES = [
	'bad-content',
	'hash-mismatch',
	'id-taken',
	'number-taken',
	'author-not-here',
	'unknown-position',
	'unknown-material',
	'unknown-rules'
] as const;
export type QuarantineCode = (typeof QUARANTINE_CODES)[number];

const receipt = {
	id: uuid,
	hash: z.string(),
	seq: z.number().int().positive(),
	receivedAt: z.string()
};

export const pushAnswer = z.discriminatedUnion('status', [
	z.object({ status: z.literal('stored'), ...receipt }),
	z.object({ status: z.literal('duplicate'), ...receipt }),
	z.object({
		status: z.literal('quarantined'),
		/** As sent; null when the record named none that could be read. */
		id: z.string().nullable(),
		/** Place in the request, so that a record without a readable id is found again. */
		index: z.number().int().nonnegative(),
		code: z.enum(QUARANTINE_CODES),
		text: z.string()
	}),
	z.object({
		status: z.literal('retry'),
		id: z.string().nullable(),
		index: z.number().int().nonnegative(),
		afterMs: z.number().int().nonnegative()
	})
]);
export type PushAnswer = z.infer<typeof pushAnswer>;

export const pushResponse = z.object({ answers: z.array(pushAnswer), serverTime: z.string() });
export type PushResponse = z.infer<typeof pushResponse>;

export const ROLES = ['millwright', 'planner', 'supervisor'] as const;
export type Role = (typeof ROLES)[number];

export const pullResponse = z.object({
	/** Why the mirror must be rebuilt before these changes are written; null when it goes on. */
	reset: z.enum(['start', 'scope', 'epoch', 'cursor']).nullable(),
	plant: z.object({ id: uuid, name: z.string() }),
	person: z.object({ id: uuid, name: z.string(), role: z.enum(ROLES) }),
	changes: z.array(mirrorChange),
	/** Opaque and signed: {epoch, plant, scopeVersion, seq}. */
	cursor: z.string(),
	more: z.boolean(),
	serverTime: z.string()
});
export type PullResponse = z.infer<typeof pullResponse>;

/** Whole answers other than 200. The words for people stand in the message catalogue. */
export const wholeError = z.object({
	error: z.object({
		code: z.enum([
			'invalid-input',
			'signed-out',
			'not-allowed',
			'tablet-blocked',
			'too-large',
			'update-needed',
			'busy',
			'not-found',
			'failed'
		]),
		text: z.string(),
		issues: z.array(z.object({ path: z.string(), message: z.string() })).optional()
	})
});
export type WholeError = z.infer<typeof wholeError>;
