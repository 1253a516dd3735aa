/** Which candidates the readings leave standing, and how likely they make a gear that somebody named. */
import { moduleOf } from '../pitch';
import type { Pitch } from '../contract';
import type { Candidate, IdentifyAnswer } from './contract';

/** A candidate that is less likely than one in a hundred no longer has a say in the verdict. */
export const SURVIVES = 0.01;

/** Likeliest first; none where no involute gear fits. */
export function survivorsOf({ candidates, state }: IdentifyAnswer): Candidate[] {
	return state === 'none-fits' ? [] : candidates.filter(({ probability }) => probability > SURVIVES);
}

/** The gear's own pitch, as a question to `evaluate` states it. */
export function pitchOf({ system, value }: Pick<Candidate, 'system' | 'value'>): Pitch {
	return system === 'circular' ? { system, value, unit: 'in' } : { system, value };
}

export interface NamedGear {
	pitch: Pitch;
	/** Degrees. */
	pressureAngle: number;
	form: 'full-depth' | 'stub';
}

/** One part in a thousand: 4.2333 mm typed for 6 DP is the same gear. */
const SAME_MODULE = 1e-3;

export function isSameGear(candidate: Candidate, { pitch, pressureAngle, form }: NamedGear): boolean {
	return (
		Math.abs(candidate.module / moduleOf(pitch) - 1) < SAME_MODULE &&
		candidate.pressureAngle === pressureAngle &&
		candidate.form === form
	);
}
