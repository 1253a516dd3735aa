/** What about the two members' materials and wear a millwright should be told; none of it changes a verdict. */
import type { Gear, Mate, Material, Reason } from './contract';

export function pairingWarnings(gear: Gear, mate: Mate): Reason[] {
	return [reversedHardness(gear, mate), wornMate(mate)].filter((reason) => reason !== null);
}

/** The pinion's teeth meet more often, so a hard pinion on a soft wheel is usual. Source: common practice. */
function reversedHardness(gear: Gear, mate: Mate): Reason | null {
	const [own, mates] = [toldBrinell(gear.material), toldBrinell(mate.material)];
	if (own === null || mates === null || gear.teeth === undefined || mate.teeth === undefined) return null;
	if (gear.teeth === mate.teeth) return null;
	const [pinion, wheel] = gear.teeth < mate.teeth ? [own, mates] : [mates, own];
	if (wheel <= pinion) return null;
	return {
		code: 'hardness-reversed',
		text: `The wheel is harder (${wheel} HB) than the pinion (${pinion} HB). Usual is a hard pinion on a softer wheel: check which is which.`,
		values: { pinion, wheel }
	};
}

/** Whole: a difference that rounds away would be told as two equal hardnesses. */
function toldBrinell(material: Material | undefined): number | null {
	return material?.brinell === undefined ? null : Math.round(material.brinell);
}

function wornMate({ worn }: Mate): Reason | null {
	if (!worn) return null;
	return {
		code: 'mate-worn',
		text: 'The mate is worn: a new gear on worn flanks wears fast and runs rough. Consider renewing both.'
	};
}
