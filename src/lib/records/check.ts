/**
 * The body of a check. `answers` are what the person gave; the question to the core is assembled from them
 * with the plant's own material and rules (assemble.ts), on the tablet and again on the server, so that the
 * server trusts no figure of the tablet.
 */
import { z } from 'zod';
import { uuid } from './ids';
import { pitch } from './mirror';
import { outcome } from './outcome';
import { strictFields } from './plain-words';
import { answeredIn } from './reading';

/** What the person answered so far. A draft is this with gaps; a kept check is this as it stood. */
export const checkAnswers = strictFields('The answers', {
	/** Number of the site's isolation permit, as free text. */
	permit: z.string().max(80),
	/** When the cautions were shown and put behind: ISO 8601, tablet's clock. */
	cautionsSeenAt: z.iso.datetime().nullable(),
	note: z.string().max(2000),
	teeth: answeredIn(
		['teeth'],
		z.number('Count the teeth: a whole number.').int('Teeth are counted: a whole number.').min(1).max(2000)
	),
	outsideDiameter: answeredIn(['in', 'mm']),
	faceWidth: answeredIn(['in', 'mm']),
	pitch: pitch.nullable(),
	pressureAngle: z.union([z.literal(14.5), z.literal(20)]).nullable(),
	form: z.enum(['full-depth', 'stub']).nullable(),
	loadKind: z.enum(['power', 'torque', 'unknown']).nullable(),
	loadBasis: z.enum(['nameplate', 'measured', 'process']).nullable(),
	power: answeredIn(['hp', 'kW', 'W']),
	torque: answeredIn(['lbf*ft', 'lbf*in', 'N*m']),
	speed: answeredIn(['rpm']),
	duty: z.enum(['uniform', 'light-shock', 'medium-shock', 'heavy-shock']).nullable(),
	serviceFactor: answeredIn(['x']),
	reversing: z.boolean(),
	finish: z.enum(['cast', 'cut', 'hobbed', 'ground']).nullable(),
	materialId: uuid.nullable()
});
export type CheckAnswers = z.infer<typeof checkAnswers>;

export const checkBody = strictFields('A check', {
	machineId: uuid,
	positionId: uuid,
	answers: checkAnswers,
	/** The revision of the material on the tablet when it was kept; null where none was chosen. */
	materialRevision: z.number().int().positive().nullable(),
	rulesRevision: z.number().int().positive(),
	outcome
});
export type CheckBody = z.infer<typeof checkBody>;

export const noAnswers: CheckAnswers = {
	permit: '',
	cautionsSeenAt: null,
	note: '',
	teeth: null,
	outsideDiameter: null,
	faceWidth: null,
	pitch: null,
	pressureAngle: null,
	form: null,
	loadKind: null,
	loadBasis: null,
	power: null,
	torque: null,
	speed: null,
	duty: null,
	serviceFactor: null,
	reversing: false,
	finish: null,
	materialId: null
};
