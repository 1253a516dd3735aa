/**
 * What cannot be answered from what was given, and what sends an answer to review. Each is a coded reason whose
 * sentence says what is missing and what to do; `figures.ts` leaves out the figures that would need it.
 */
import type { EvaluateInput, Finish, GearKind, Reason } from './contract';
import type { MemberLaw } from './pair-law';
import { fromSI } from './quantity';
import type { VelocityLaw } from './velocity';

export function missingRefusals({ gear, drive }: EvaluateInput): Reason[] {
	const reasons: Reason[] = [];
	const rack = gear.kind === 'rack';
	if (!rack && gear.teeth === undefined) {
		reasons.push({ code: 'teeth-missing', text: 'The number of teeth is missing. Count them and give it.' });
	}
	if (rack && drive.velocity === undefined) {
		reasons.push({
			code: 'velocity-missing',
			text: 'The velocity of the rack is missing. Give it in m/s or ft/min.'
		});
	}
	if (!rack && drive.speed === undefined) {
		reasons.push({ code: 'speed-missing', text: 'The speed of this gear is missing. Give it in rpm.' });
	}
	if (drive.load === 'unknown') {
		reasons.push({
			code: 'load-unknown',
			text: 'The load is not known, so there is no stress to compare. Give power or torque, from the nameplate or measured.'
		});
	} else if (rack && 'torque' in drive.load) {
		reasons.push({
			code: 'torque-on-rack',
			text: 'A rack turns no shaft, so a torque gives no force on it. Give the power, or the force along the rack.'
		});
	}
	return reasons;
}

/** The velocity law that counts is the mate's: not what was said of this gear's own teeth. */
export function mateLawTold(law: VelocityLaw): Reason {
	return {
		code: 'mate-law-counts',
		text: `The velocity factor is that of the mate's ${LAW_WORDS[law]} teeth: both bear one dynamic load, and the mate's law gives the higher.`,
		values: { law }
	};
}

/** What the method knows only as a lower bound, or only for the common case, goes to review at best. */
export function kindReview(gear: GearKind, mate: GearKind | undefined): Reason | null {
	const kind = gear !== 'spur' ? gear : mate;
	if (kind === undefined || kind === 'spur') return null;
	const words = kind === 'rack' ? 'a rack' : kind === 'internal' ? 'an internal gear' : 'a helical gear';
	return {
		code: 'kind-needs-review',
		text: `The method is for spur gears; for ${words} it gives a first look only. An engineer should review it.`,
		values: { kind }
	};
}

const FINISH_WORDS: Record<Finish, string> = {
	cast: 'cast',
	cut: 'cut or milled',
	hobbed: 'hobbed or shaped',
	ground: 'shaved or ground'
};

export const LAW_WORDS: Record<VelocityLaw, string> = {
	...FINISH_WORDS,
	'cut-600': FINISH_WORDS.cut,
	'non-metallic': 'non-metallic'
};

/** Velocity in m/s, against the law of the member that ends first. */
export function speedRefusal(velocity: number, { law, finish, end, byPlant, of }: MemberLaw): Reason | null {
	// The tolerance forgives the arithmetic of a velocity that is meant to be the end itself.
	if (velocity >= 0 && velocity <= end * (1 + 1e-9)) return null;
	const owner = of === 'mate' ? "the mate's " : '';
	const whose =
		byPlant && finish
			? `the plant allows for ${owner}${FINISH_WORDS[finish]} teeth`
			: `the velocity law for ${owner}${LAW_WORDS[law]} teeth is used to`;
	const beyond = `The pitch-line velocity of ${velocities(velocity)} is beyond the ${velocities(end)} that ${whose}.`;
	const values = { velocity, end, law };
	return of === 'mate'
		? {
				code: 'mate-speed-beyond-law',
				text: `${beyond} Check the speed and the mate's finish, or have the pair rated by an engineer.`,
				values
			}
		: {
				code: 'speed-beyond-law',
				text: `${beyond} Check speed and finish, or have the gear rated by an engineer.`,
				values
			};
}

function velocities(velocity: number): string {
	return `${velocity.toFixed(2)} m/s (${Math.round(fromSI(velocity, 'ft/min'))} ft/min)`;
}

export const OUT_OF_RANGE: Reason = {
	code: 'out-of-range',
	text: 'These values lead to a figure too large or too small to compute with. Check the readings and their units.'
};
