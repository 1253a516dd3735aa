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
import { answeredIn, cannotMeasure, orNone, readingIn } from './reading';

const LENGTH = ['in', 'mm'] as const;
const count = z
	.number('Count the teeth: a whole number.')
	.int('Teeth are counted: a whole number.')
	.min(1)
	.max(5000);

/** What the person answered so far. A draft is this with gaps; a kept check is this as it stood. */
export const checkAnswers = strictFields('The answers', {
	/** Number of the site's isolation permit, as free text. */
	permit: z.string().max(80),
	/** When the cautions were shown and put behind: ISO 8601, tablet's clock. */
	cautionsSeenAt: z.iso.datetime().nullable(),
	note: z.string().max(2000),
	/** Where the machine's gears are likely to come from: a prior of identification. */
	origin: z.enum(['inch', 'metric', 'either']),
	teeth: answeredIn(['teeth'], count),
	/** The teeth once more, without a look at the first count. */
	secondCount: answeredIn(['teeth'], count),
	outsideDiameter: answeredIn(LENGTH),
	outsideDiameterTaken: z.enum(['over-tips', 'tip-to-gap', 'pi-tape']),
	tipWorn: z.boolean(),
	flanksWorn: z.boolean(),
	faceWidth: answeredIn(LENGTH),
	/** Over how many teeth each was taken, and what it read. */
	spans: z
		.array(
			z.strictObject({
				teeth: z.number().int('A span is taken over a whole number of teeth.').min(2).max(500),
				reading: z.union([readingIn(LENGTH), cannotMeasure])
			})
		)
		.max(6, 'At most six spans can be kept.'),
	wholeDepth: answeredIn(LENGTH),
	rootDiameter: answeredIn(LENGTH),
	chordalThickness: answeredIn(LENGTH),
	overPins: answeredIn(LENGTH),
	pinDiameter: answeredIn(LENGTH),
	centreDistance: answeredIn(LENGTH),
	mateTeeth: answeredIn(['teeth'], count),
	circularPitch: answeredIn(LENGTH),
	helixAngle: answeredIn(['deg'], orNone),
	/** Several gears fit and are left open: the weakest of those that survive the readings decides. */
	severalGears: z.boolean(),
	/** The gear that was chosen, by hand or from the candidates. */
	pitch: pitch.nullable(),
	pressureAngle: z.literal([14.5, 15, 17.5, 20, 22.5, 25]).nullable(),
	form: z.enum(['full-depth', 'stub']).nullable(),
	/** In modules, of the chosen candidate; 0 by hand. */
	profileShift: z.number().min(-1).max(2),
	/** Of the chosen candidate, where the readings say that the count was off; null takes the count. */
	gearTeeth: count.nullable(),
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
	origin: 'either',
	teeth: null,
	secondCount: null,
	outsideDiameter: null,
	outsideDiameterTaken: 'over-tips',
	tipWorn: false,
	flanksWorn: false,
	faceWidth: null,
	spans: [],
	wholeDepth: null,
	rootDiameter: null,
	chordalThickness: null,
	overPins: null,
	pinDiameter: null,
	centreDistance: null,
	mateTeeth: null,
	circularPitch: null,
	helixAngle: null,
	severalGears: false,
	pitch: null,
	pressureAngle: null,
	form: null,
	profileShift: 0,
	gearTeeth: null,
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
