/** What about the two members' materials and finish a millwright should be told; none of it changes a verdict. */
import type { Finish, Gear, Mate, Reason } from './contract';

export function pairingWarnings(gear: Gear, mate: Mate): Reason[] {
	return [reversedHardness(gear, mate), wornMate(mate), rougherMate(gear, mate)].filter(
		(reason) => reason !== null
	);
}

/** The pinion's teeth meet more often, so a hard pinion on a soft wheel is usual. Source: common practice. */
function reversedHardness(gear: Gear, mate: Mate): Reason | null {
	const [own, mates] = [gear.material.brinell, mate.material?.brinell];
	if (own === undefined || mates === undefined || gear.teeth === undefined || mate.teeth === undefined)
		return null;
	if (gear.teeth === mate.teeth) return null;
	const [pinion, wheel] = gear.teeth < mate.teeth ? [own, mates] : [mates, own];
	if (wheel <= pinion) return null;
	return {
		code: 'hardness-reversed',
		text: `The wheel is harder (${Math.round(wheel)} HB) than the pinion (${Math.round(pinion)} HB). Usual is a hard pinion on a softer wheel: check which is which.`,
		values: { pinion: Math.round(pinion), wheel: Math.round(wheel) }
	};
}

function wornMate({ worn }: Mate): Reason | null {
	if (!worn) return null;
	return {
		code: 'mate-worn',
		text: 'The mate is worn: a new gear on worn flanks wears fast and runs rough. Consider renewing both.'
	};
}

const ROUGHEST_FIRST: readonly Finish[] = ['cast', 'cut', 'hobbed', 'ground'];

/** The velocity law is that of the gear's own finish; a rougher mate adds to the dynamic load. */
function rougherMate(gear: Gear, mate: Mate): Reason | null {
	if (!mate.finish || ROUGHEST_FIRST.indexOf(mate.finish) >= ROUGHEST_FIRST.indexOf(gear.finish)) return null;
	return {
		code: 'mate-finish-rougher',
		text: "The mate's teeth are rougher than this gear's: the dynamic load is then nearer to that of the mate's finish. Answer the check with the mate's finish as well."
	};
}
