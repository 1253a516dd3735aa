/**
 * What of the mate cannot be worked out, each with its own sentence: the verdict goes to review at best, since the mate
 * may be the weak one. And what a mate that was described in part would have to be given with.
 */
import type { Reason } from './contract';

/** The refusal of a form factor, said of the mate. */
export function mateToothRefusal({ code, values }: Reason): Reason {
	const said = SENTENCES[code]?.(values ?? {}) ?? NOT_COVERED;
	return { ...said, text: `${said.text} ${LEFT_OUT}`, values };
}

const LEFT_OUT = "Bending of the mate's teeth is not in this verdict.";

const NOT_COVERED: Reason = {
	code: 'mate-tooth-not-covered',
	text: "The mate's teeth are outside the method. Have the mate rated by an engineer."
};

/** By the code of the refusal, from its values. */
const SENTENCES: Readonly<Record<string, (values: NonNullable<Reason['values']>) => Reason>> = {
	'too-few-teeth': ({ fewest, teeth }) => ({
		code: 'mate-too-few-teeth',
		text: `The Lewis method starts at ${fewest} teeth, the mate has ${teeth}. Count them again, or have the mate rated by an engineer.`
	}),
	'angle-not-covered': ({ pressureAngle }) => ({
		code: 'mate-angle-not-covered',
		text: `The mate's pressure angle of ${pressureAngle} degrees in its normal plane is outside what the form factor covers. Check it, or have the mate rated by an engineer.`
	}),
	'rack-tip-too-round': () => ({
		code: 'mate-rack-tip-too-round',
		text: "The tip radius and dedendum of the mate's tooth form leave its rack no tip. Check them."
	}),
	'shift-too-large': () => ({
		code: 'mate-shift-too-large',
		text: "With the mate's profile shift its rack no longer reaches below the pitch circle. Check the mate's shift."
	}),
	'undercut-too-deep': () => ({
		code: 'mate-undercut-too-deep',
		text: "The mate's teeth are undercut so deep that no flank is left below the pitch circle. Check the mate's teeth, angle and shift, or have it rated by an engineer."
	}),
	'tip-worn-away': () => ({
		code: 'mate-tip-worn-away',
		text: "The mate's tips are worn below the beginning of the flank. Check the wear of the mate's tips."
	}),
	'tip-below-pitch-circle': () => ({
		code: 'mate-tip-below-pitch-circle',
		text: "The mate's tips do not stand above its pitch circle: the Lewis method does not hold for such stubs. Check the wear of the mate's tips, its addendum and its shift."
	}),
	'tooth-pointed': () => ({
		code: 'mate-tooth-pointed',
		text: "The flanks of the mate's teeth meet below the tip circle. Check the mate's addendum and profile shift."
	}),
	'tooth-too-short': () => ({
		code: 'mate-tooth-too-short',
		text: "The mate's teeth are so short that the load at the tip does not bend them. Check the mate's addendum and dedendum."
	})
};

export const MATE_TEETH_MISSING: Reason = {
	code: 'mate-teeth-missing',
	text: "The mate's number of teeth is missing, so this is bending of this gear's teeth only. For mesh, wear and the mate's teeth, count them and give it."
};

export const BENDING_ONLY: Reason = {
	code: 'bending-only',
	text: "This is bending of this gear's teeth only. For wear and for the mate's teeth, give the mate with its form, material and hardness."
};

export const WEAR_NOT_KNOWN: Reason = {
	code: 'wear-not-known',
	text: 'Wear is not in this verdict: give modulus and hardness of both materials.'
};

export const MATE_BENDING_NOT_KNOWN: Reason = {
	code: 'mate-bending-not-known',
	text: "Bending of the mate's teeth is not in this verdict: give its tooth form and material."
};
