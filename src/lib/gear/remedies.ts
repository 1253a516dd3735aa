/**
 * What would make it carry: one change at a time, solved by the laws and then answered by the same figures that the
 * verdict comes from. All answers of a pair bear one dynamic load Kv Ko Wt, so what scales it scales every margin.
 */
import type { EvaluateInput, Finish, Gear, Quantity, Remedy, Verdict } from './contract';
import { decidingOf, figuresOf, type FiguresAnswer } from './figures';
import { toSI } from './quantity';
import { firstToEnd } from './pair-law';
import { uncertaintyOf } from './rules';
import { speedThatCarries } from './speed-remedy';
import { isPower } from './uncertainty';
import { meets } from './verdict';
import { unrecorded } from './working';

const FINISHES: readonly Finish[] = ['cast', 'cut', 'hobbed', 'ground'];

/** Enough to choose from; a list of everything is no advice. */
const MOST_MATERIALS = 10;

/** Widest face in modules: five times the circular pitch, beyond which teeth do not bear evenly. Common practice. */
const WIDEST_FACE = 16;

/** What the deciding answer has of what it needs, at the middle and at the bad end, and this gear's own margin. */
interface Standing {
	ratio: number;
	lowRatio: number;
	badEnd: number;
	bendingMargin: number;
	bendingMarginLow: number;
}

interface Short {
	input: EvaluateInput;
	answer: FiguresAnswer;
	now: Standing;
	/** The middle meets the plant's margin, only the bad end does not. */
	onlyLow: boolean;
}

/** In the order power, speed, face width, finish, material; empty where it carries or nothing can be said. */
export function remediesFor(input: EvaluateInput, answer: FiguresAnswer, verdict: Verdict): Remedy[] {
	if (verdict === 'carries' || verdict === 'cannot-say') return [];
	const now = standingOf(answer);
	if (!now) return [];
	const short = { input, answer, now, onlyLow: meets(now.ratio, 1) };
	if (verdict === 'not-permitted') return materials(short);
	// A rule of the plant, not the load, sent it to review: no change of this kind helps.
	if (meets(now.lowRatio, 1)) return [];
	return [...power(short), ...speed(short), ...faceWidth(short), ...finishes(short), ...materials(short)];
}

function standingOf({ figures, refusals, uncertainty }: FiguresAnswer): Standing | null {
	const deciding = decidingOf(figures.limits);
	const { bendingMargin, bendingMarginLow } = figures;
	if (refusals.length > 0 || !deciding || !uncertainty || bendingMargin === null || bendingMarginLow === null)
		return null;
	const ratio = deciding.margin / deciding.needed;
	if (!(ratio > 0 && Number.isFinite(ratio))) return null;
	const lowRatio = deciding.marginLow / deciding.needed;
	return { ratio, lowRatio, badEnd: uncertainty.badEnd, bendingMargin, bendingMarginLow };
}

function standingWith(input: EvaluateInput): Standing | null {
	return standingOf(figuresOf(input, unrecorded));
}

function power({ input, answer, now, onlyLow }: Short): Remedy[] {
	const { tangentialForce: force, pitchLineVelocity: velocity } = answer.figures;
	if (force === null || velocity === null) return [];
	const middle = force * velocity * now.ratio;
	const at = (watts: number) => ({ value: watts / 1000, unit: 'kW' as const });
	const change = (watts: number) => withDrive(input, { load: { power: at(watts) } });
	// Stated as a power, the load's share of a speed error differs from that of a torque.
	const stated = standingWith(change(middle));
	if (!stated) return [];
	return solved('power', at, change, {
		value: onlyLow ? middle * stated.badEnd : middle,
		carriesAt: middle * stated.badEnd
	});
}

function speed({ input, answer, now, onlyLow }: Short): Remedy[] {
	const { pitchLineVelocity: velocity, pitchDiameter } = answer.figures;
	if (velocity === null || !(velocity > 0)) return [];
	const question = {
		laws: answer.laws,
		velocity,
		end: firstToEnd(answer.laws).end,
		byPower: isPower(input.drive.load),
		ratio: now.ratio
	};
	const carriesAt = speedThatCarries({ ...question, badEndOf: uncertaintyOf(input.uncertainty) });
	const value = onlyLow ? carriesAt : speedThatCarries({ ...question, badEndOf: null });
	if (value === null) return [];
	if (pitchDiameter === null) {
		const at = (metres: number) => ({ value: metres, unit: 'm/s' as const });
		return solved('speed', at, (metres) => withDrive(input, { velocity: at(metres) }), { value, carriesAt });
	}
	const at = (metres: number) => ({
		value: (metres * 60000) / (Math.PI * pitchDiameter),
		unit: 'rpm' as const
	});
	return solved('speed', at, (metres) => withDrive(input, { speed: at(metres) }), { value, carriesAt });
}

function faceWidth({ input, answer, now, onlyLow }: Short): Remedy[] {
	const own = toSI(input.gear.faceWidth);
	const mates = input.mate?.faceWidth ? toSI(input.mate.faceWidth) : Infinity;
	const widest = Math.min(mates, WIDEST_FACE * (answer.figures.normalModule ?? 0));
	const within = (width: number) => (width <= widest && own <= mates ? width : null);
	const carriesAt = within(own / now.lowRatio);
	const value = onlyLow ? carriesAt : within(own / now.ratio);
	if (value === null) return [];
	const at = (width: number) => ({ value: width, unit: 'mm' as const });
	const original = input.original && toSI(input.original.faceWidth);
	return solved(
		'faceWidth',
		at,
		(width) => withGear(input, { faceWidth: at(width) }),
		{ value, carriesAt },
		original !== undefined && original >= Math.max(value, carriesAt ?? 0)
	);
}

/** Smoother teeth help as far as the mate's own do not set the load: one that adds nothing to a plainer is left out. */
function finishes({ input, onlyLow }: Short): Remedy[] {
	const better = FINISHES.slice(FINISHES.indexOf(input.gear.finish) + 1);
	const offered = better.flatMap((finish) =>
		chosen('finish', finish, withGear(input, { finish }), onlyLow, input.original?.finish === finish)
	);
	return offered.filter(
		({ bendingMargin }, place) => place === 0 || bendingMargin > (offered[place - 1]?.bendingMargin ?? 0)
	);
}

function materials({ input, onlyLow }: Short): Remedy[] {
	const permitted = (input.permittedMaterials ?? []).filter((material) => material.permitted);
	return permitted
		.flatMap((material) =>
			chosen(
				'material',
				material.name,
				withGear(input, { material }),
				onlyLow,
				input.original?.material.name === material.name
			)
		)
		.sort((a, b) => a.bendingMargin - b.bendingMargin)
		.slice(0, MOST_MATERIALS);
}

/** A solved change, answered again by the figures of a check: what is told is what that check would say. */
function solved<U extends string>(
	change: Remedy['change'],
	at: (si: number) => Quantity<U>,
	apply: (si: number) => EvaluateInput,
	{ value, carriesAt }: { value: number; carriesAt: number | null },
	likeForLike = false
): Remedy[] {
	const then = standingWith(apply(value));
	if (!then || !Number.isFinite(at(value).value)) return [];
	return [
		{
			change,
			value: at(value),
			likeForLike,
			bendingMargin: then.bendingMargin,
			bendingMarginLow: then.bendingMarginLow,
			carriesAt: carriesAt === null ? null : at(carriesAt)
		}
	];
}

function chosen(
	change: Remedy['change'],
	value: string,
	changed: EvaluateInput,
	onlyLow: boolean,
	likeForLike: boolean
): Remedy[] {
	const then = standingWith(changed);
	if (!then || !meets(onlyLow ? then.lowRatio : then.ratio, 1)) return [];
	const { bendingMargin, bendingMarginLow } = then;
	const carriesAt = meets(then.lowRatio, 1) ? value : null;
	return [{ change, value, likeForLike, bendingMargin, bendingMarginLow, carriesAt }];
}

function withDrive(input: EvaluateInput, change: Partial<EvaluateInput['drive']>): EvaluateInput {
	return { ...input, drive: { ...input.drive, ...change } };
}

function withGear(input: EvaluateInput, change: Partial<Gear>): EvaluateInput {
	return { ...input, gear: { ...input.gear, ...change } };
}
