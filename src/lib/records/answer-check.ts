/**
 * The outcome of a check: what is missing, or what the core says. Both sides of the network call this one
 * function, so that "tablet and server agree" compares cores and lists, never two assemblies.
 */
import type { Outcome } from '$lib/gear/contract';
import { evaluate } from '$lib/gear/evaluate';
import { cannotSay } from '$lib/gear/verdict';
import { assembleInput, type Missing, type PlantSide } from './assemble';
import type { CheckAnswers } from './check';

const WORDS: Record<Missing, string> = {
	teeth: 'number of teeth',
	faceWidth: 'face width',
	pitch: 'pitch',
	pressureAngle: 'pressure angle',
	form: 'tooth form',
	load: 'load of the drive',
	speed: 'speed of this gear',
	serviceFactor: 'service factor',
	finish: 'finish of the teeth',
	material: 'material of the spare'
};

export function answerCheck(answers: CheckAnswers, plantSide: PlantSide, performedAt: string): Outcome {
	const assembled = assembleInput(answers, plantSide, performedAt);
	if (assembled.ok) return evaluate(assembled.input);
	return cannotSay(
		assembled.missing.map((field) => ({
			code: 'missing',
			text: `The ${WORDS[field]} is missing: go back to its step and give it.`,
			values: { field }
		}))
	);
}
