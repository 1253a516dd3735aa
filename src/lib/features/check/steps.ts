/** The named steps of a check, in the order in which they are offered; any can be visited at any time. */
import type { Missing } from '$lib/records/assemble';
import { isReading } from '$lib/records/reading';
import type { CheckAnswers } from '$lib/records/check';

export const STEPS = [
	'machine',
	'before',
	'look',
	'measure',
	'which-gear',
	'drive',
	'spare',
	'result',
	'keep'
] as const;
export type StepName = (typeof STEPS)[number];

export function isStep(value: string | undefined): value is StepName {
	return STEPS.some((step) => step === value);
}

export function nextStep(step: StepName): StepName {
	return STEPS[Math.min(STEPS.indexOf(step) + 1, STEPS.length - 1)]!;
}

/** What carries the triangle on the rule: the step has its answers ("cannot measure this" is one). */
export function isAnswered(step: StepName, answers: CheckAnswers, kept: boolean): boolean {
	if (kept) return true;
	switch (step) {
		case 'machine':
			return true;
		case 'before':
			return answers.cautionsSeenAt !== null;
		case 'look':
			return answers.note.trim() !== '';
		case 'measure':
			return answers.teeth !== null && answers.outsideDiameter !== null && answers.faceWidth !== null;
		case 'which-gear':
			return (
				answers.severalGears ||
				(answers.pitch !== null && answers.pressureAngle !== null && answers.form !== null)
			);
		case 'drive':
			return loadAnswered(answers) && answers.speed !== null && answers.serviceFactor !== null;
		case 'spare':
			return answers.finish !== null && answers.materialId !== null;
		case 'result':
		case 'keep':
			return false;
	}
}

/** Where each missing answer is given: the step, and the reading of it. */
const PLACES: Record<Missing, string> = {
	teeth: 'measure?reading=teeth',
	faceWidth: 'measure?reading=faceWidth',
	pitch: 'which-gear',
	pressureAngle: 'which-gear',
	form: 'which-gear',
	load: 'drive?reading=load',
	speed: 'drive?reading=speed',
	serviceFactor: 'drive?reading=service',
	finish: 'spare',
	material: 'spare'
};

export function placeOf(field: string): string {
	return PLACES[field as Missing] ?? 'machine';
}

function loadAnswered({ loadKind, power, torque }: CheckAnswers): boolean {
	if (loadKind === 'unknown') return true;
	return loadKind === 'torque' ? isReading(torque) : loadKind === 'power' && isReading(power);
}
