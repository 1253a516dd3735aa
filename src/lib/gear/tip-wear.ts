/**
 * What worn tips do to an answer. The load on a shorter tooth bends it less, but no gear is stronger for being worn: its
 * teeth are taken as unworn, the answer goes to review, and the method ends where nothing stands above the pitch circle.
 */
import type { EvaluateInput, Reason } from './contract';
import type { Member } from './member';
import { toSI } from './quantity';

/** Height in mm of the tips, wear off, above the pitch circle or a rack's pitch line; an internal gear's point inwards. */
export function tipHeight({ kind, normalModule, rack, profileShift, tipWear }: Member): number {
	const shift = kind === 'rack' ? 0 : kind === 'internal' ? -profileShift : profileShift;
	return (rack.addendum + shift) * normalModule - tipWear;
}

/** The Lewis method knows a tooth as a beam that stands above the pitch circle, not a stub below it. */
export function stubRefusal(member: Member): Reason | null {
	if (isWornAway(member)) return TIP_WORN_AWAY;
	return tipHeight(member) > 0 ? null : TIP_BELOW_PITCH_CIRCLE;
}

/** Worn further than the teeth are deep: nothing is left to mesh with. */
function isWornAway({ rack, normalModule, tipWear }: Member): boolean {
	return tipWear >= (rack.addendum + rack.dedendum) * normalModule;
}

/** Whichever of the two is worn down to its pitch circle, there is no mesh to work out. */
export function tipsOfPairRefusal(...pair: [Member, Member]): Reason | null {
	const ended = (member: Member) => isWornAway(member) || (member.tipWear > 0 && !(tipHeight(member) > 0));
	return pair.some(ended) ? TIPS_OF_PAIR_WORN_AWAY : null;
}

/** What worn tips mean for strength and flanks the method does not know: review, whatever the margin. */
export function tipWearReviews({ gear, mate }: EvaluateInput): Reason[] {
	const [own, mates] = [gear.tipWear, mate?.tipWear].map((wear) => (wear ? toSI(wear) : 0)) as [
		number,
		number
	];
	const reviews: Reason[] = [];
	if (own > 0) {
		reviews.push({
			code: 'tips-worn',
			text: `The tips of this gear are worn by ${own.toFixed(2)} mm. It is given the strength of unworn teeth, never more; what has worn the tips may have worn the flanks too. An engineer should review it.`,
			values: { wear: own }
		});
	}
	if (mates > 0) {
		reviews.push({
			code: 'mate-tips-worn',
			text: `The tips of the mate are worn by ${mates.toFixed(2)} mm. It is given the strength of unworn teeth, never more; what has worn the tips may have worn the flanks too. An engineer should review it.`,
			values: { wear: mates }
		});
	}
	return reviews;
}

const TIP_WORN_AWAY: Reason = {
	code: 'tip-worn-away',
	text: 'The tips are worn below the beginning of the flank: no tooth is left to work out. Check the wear of the tips.'
};

const TIP_BELOW_PITCH_CIRCLE: Reason = {
	code: 'tip-below-pitch-circle',
	text: 'The tips of these teeth do not stand above the pitch circle: the Lewis method does not hold for such stubs. Check the wear of the tips, the addendum and the profile shift.'
};

const TIPS_OF_PAIR_WORN_AWAY: Reason = {
	code: 'tips-of-pair-worn-away',
	text: 'The tips of the gear or of its mate are worn down to the pitch circle or below: no mesh is left to work out. Check the wear of the tips of both.'
};
