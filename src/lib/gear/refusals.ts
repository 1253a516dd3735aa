/**
 * What the core cannot answer yet, or not from what was given. Each refusal is a coded reason whose sentence says
 * what is missing and what to do; `figures.ts` leaves the figures out that would need it.
 */
import type { EvaluateInput, Finish, Gear, Mate, Reason, Rules } from './contract';
import { basePitch, moduleOf } from './pitch';
import { fromSI } from './quantity';
import type { VelocityLaw } from './velocity';

/** Two gears of the same standard pitch agree far better than this, two of neighbouring pitches far worse. */
const SAME_BASE_PITCH = 0.002;

export function kindRefusal({ kind, helixAngle = 0 }: Gear): Reason | null {
	if (kind === 'spur' && helixAngle === 0) return null;
	const words = kind === 'spur' ? 'spur gear with a helix angle' : kind === 'rack' ? 'rack' : `${kind} gear`;
	return {
		code: 'kind-not-covered',
		text: `This version works out spur gears, not a ${words}. Have it rated by an engineer.`,
		values: { kind }
	};
}

export function formRuleRefusal({ formFactor }: Rules): Reason | null {
	if (formFactor === 'handbook') return null;
	return {
		code: 'form-rule-not-covered',
		text: `The plant's rule asks for the form factor by ${formFactor === 'geometry' ? 'geometry' : 'the lower of both methods'}; this version has the handbook table only. A supervisor can set the rule to the handbook table.`,
		values: { formFactor }
	};
}

/** A mate of another base pitch does not mesh, whatever the strength: that comes before any margin. */
export function mateRefusal(gear: Gear, mate: Mate | undefined): Reason | null {
	if (!mate?.pitch) return null;
	const own = basePitch(moduleOf(gear.pitch), gear.pressureAngle);
	const mates = basePitch(moduleOf(mate.pitch), mate.pressureAngle ?? gear.pressureAngle);
	if (Math.abs(mates / own - 1) <= SAME_BASE_PITCH) return null;
	return {
		code: 'mate-pitch-differs',
		text: `Gear and mate do not mesh: their base pitches are ${own.toFixed(3)} mm and ${mates.toFixed(3)} mm. Check pitch and pressure angle of both.`,
		values: { gear: own, mate: mates }
	};
}

export function missingRefusals({ gear, drive }: EvaluateInput): Reason[] {
	const reasons: Reason[] = [];
	if (gear.teeth === undefined) {
		reasons.push({ code: 'teeth-missing', text: 'The number of teeth is missing. Count them and give it.' });
	}
	if (drive.speed === undefined) {
		reasons.push({ code: 'speed-missing', text: 'The speed of this gear is missing. Give it in rpm.' });
	}
	if (drive.load === 'unknown') {
		reasons.push({
			code: 'load-unknown',
			text: 'The load is not known, so there is no stress to compare. Give power or torque, from the nameplate or measured.'
		});
	}
	return reasons;
}

const FINISH_WORDS: Record<Finish, string> = {
	cast: 'cast',
	cut: 'cut or milled',
	hobbed: 'hobbed or shaped',
	ground: 'shaved or ground'
};

/** Velocities in m/s; `byPlant` when the end is the plant's own limit. */
export function speedRefusal(
	velocity: number,
	end: number,
	{ law, finish, byPlant }: { law: VelocityLaw; finish: Finish; byPlant: boolean }
): Reason | null {
	// The tolerance forgives the arithmetic of a velocity that is meant to be the end itself.
	if (velocity >= 0 && velocity <= end * (1 + 1e-9)) return null;
	const whose = byPlant
		? `the plant allows for ${FINISH_WORDS[finish]} teeth`
		: `the velocity law for ${law === 'non-metallic' ? 'non-metallic' : FINISH_WORDS[finish]} teeth is used to`;
	return {
		code: 'speed-beyond-law',
		text: `The pitch-line velocity of ${velocities(velocity)} is beyond the ${velocities(end)} that ${whose}. Check speed and finish, or have the gear rated by an engineer.`,
		values: { velocity, end, law }
	};
}

function velocities(velocity: number): string {
	return `${velocity.toFixed(2)} m/s (${Math.round(fromSI(velocity, 'ft/min'))} ft/min)`;
}
