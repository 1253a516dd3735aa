/** The tooth forms to choose from, those of the handbook table first, and when two pitches are the same gear under two names. */
import { moduleOf } from '$lib/gear/pitch';
import type { CheckAnswers } from '$lib/records/check';
import type { ChosenPitch } from '$lib/records/mirror';

type ToothFormChoice = {
	pressureAngle: NonNullable<CheckAnswers['pressureAngle']>;
	form: NonNullable<CheckAnswers['form']>;
};

export const TOOTH_FORMS: readonly ToothFormChoice[] = [
	{ pressureAngle: 20, form: 'full-depth' },
	{ pressureAngle: 14.5, form: 'full-depth' },
	{ pressureAngle: 20, form: 'stub' },
	{ pressureAngle: 25, form: 'full-depth' },
	{ pressureAngle: 22.5, form: 'full-depth' },
	{ pressureAngle: 17.5, form: 'full-depth' },
	{ pressureAngle: 15, form: 'full-depth' }
];

/** How common such teeth are, for a word beside them. */
export function kindOf({ pressureAngle, form }: ToothFormChoice): 'full-depth' | 'old' | 'stub' | 'rare' {
	if (form === 'stub') return 'stub';
	return pressureAngle === 20 ? 'full-depth' : pressureAngle === 14.5 ? 'old' : 'rare';
}

/** DP 4 is module 6.35: one gear. */
export function samePitch(a: ChosenPitch, b: ChosenPitch): boolean {
	return Math.abs(moduleOf(a) / moduleOf(b) - 1) < 1e-9;
}
