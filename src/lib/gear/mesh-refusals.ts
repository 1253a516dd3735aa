/** Why two members do not mesh at all: it comes before any strength. Lengths in mm. */
import type { Reason } from './contract';
import { basePitch } from './measure/span';
import type { Member } from './member';

/** Two gears of the same standard pitch agree far better than this, two of neighbouring pitches far worse. */
const SAME_BASE_PITCH = 0.002;

/** Radians; half a degree is what a protractor tells apart. */
const SAME_HELIX = (0.5 * Math.PI) / 180;

/** A mate of another base pitch does not mesh, whatever the strength. Compared in the normal plane. */
export function basePitchRefusal(gear: Member, mate: Member): Reason | null {
	const own = basePitch(gear.normalModule, gear.normalAngle);
	const mates = basePitch(mate.normalModule, mate.normalAngle);
	if (Math.abs(mates / own - 1) <= SAME_BASE_PITCH) return null;
	return {
		code: 'mate-pitch-differs',
		text: `Gear and mate do not mesh: their base pitches are ${own.toFixed(3)} mm and ${mates.toFixed(3)} mm. Check pitch and pressure angle of both.`,
		values: { gear: own, mate: mates }
	};
}

export function helixRefusal(gear: Member, mate: Member): Reason | null {
	if (Math.abs(gear.helixAngle - mate.helixAngle) <= SAME_HELIX) return null;
	return {
		code: 'mate-helix-differs',
		text: 'Gear and mate do not mesh on parallel shafts: their helix angles differ. Check the helix angle of both.'
	};
}

export const MATE_HELIX_MISSING: Reason = {
	code: 'mate-helix-missing',
	text: 'The mate is helical, and neither its helix angle nor one of this gear is given. Measure the helix angle of the mate and give it.'
};

/**
 * How far in normal modules the teeth of a pair may seem to jam: both are commonly cut thinner than nominal, by up to
 * about 0.05 modules each, so that much of a jam between nominal teeth can be backlash in truth. Common practice.
 */
const MOST_JAM = 0.1;

/** Teeth that are thicker than the spaces by more than thinning explains do not go into each other. mm. */
export function jamRefusal(normalBacklash: number | null, normalModule: number): Reason | null {
	if (normalBacklash === null || !(-normalBacklash > MOST_JAM * normalModule)) return null;
	return {
		code: 'teeth-jam',
		text: `The teeth are ${(-normalBacklash).toFixed(2)} mm too thick for this centre distance, more than any usual thinning makes up: they do not go into each other. Check the centre distance, the pitch and the tooth thicknesses.`,
		values: { jam: -normalBacklash }
	};
}

export function kindsRefusal(gear: Member, mate: Member): Reason | null {
	const kinds = [gear.kind, mate.kind];
	if (kinds.every((kind) => kind === 'internal' || kind === 'rack')) {
		return {
			code: 'kinds-do-not-mesh',
			text: 'Racks and internal gears mesh with an external gear only. Check the kind of both.'
		};
	}
	const inner = kinds.indexOf('internal');
	if (inner === -1) return null;
	const [internal, pinion] = inner === 0 ? [gear, mate] : [mate, gear];
	// A count that is missing is asked for, not held against the other.
	if (internal.teeth === null || pinion.teeth === null || internal.teeth > pinion.teeth) return null;
	return {
		code: 'internal-too-small',
		text: 'An internal gear has more teeth than the pinion that runs in it. Check both counts.'
	};
}

export const CENTRES_TOO_CLOSE: Reason = {
	code: 'centres-too-close',
	text: 'At this centre distance the two cannot stand: their base circles overlap. Check the centre distance and both counts.'
};

export const SHIFTS_DO_NOT_MESH: Reason = {
	code: 'shifts-do-not-mesh',
	text: 'With these profile shifts there is no centre distance at which the two run. Check both shifts and counts, or measure the centre distance.'
};

export function discontinuousRefusal(contactRatio: number): Reason | null {
	if (contactRatio >= 1) return null;
	return {
		code: 'contact-ratio-below-one',
		text: `One pair of teeth leaves before the next meets: the contact ratio is ${contactRatio.toFixed(2)}, it must be above 1. Check centre distance, tooth form and wear of the tips.`,
		values: { contactRatio }
	};
}
