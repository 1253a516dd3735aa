/**
 * The outcome of a check: what is missing, or what the core says. Both sides of the network call this one
 * function, so that "tablet and server agree" compares cores and lists, never two assemblies.
 */
import type { EvaluateInput, Outcome, Reason } from '$lib/gear/contract';
import { evaluate } from '$lib/gear/evaluate';
import type { IdentifyAnswer } from '$lib/gear/identify/contract';
import { SURVIVES } from '$lib/gear/identify/survivors';
import { outcomeOfSeveral, reviewed } from '$lib/gear/several';
import { cannotSay } from '$lib/gear/verdict';
import { assemble, type Missing, type PlantSide } from './assemble';
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

/** The outcome, and the question that it answers: of several gears, that of the weakest. */
export interface AnsweredCheck {
	outcome: Outcome;
	question: EvaluateInput | null;
}

export function answerCheck(answers: CheckAnswers, plantSide: PlantSide, performedAt: string): Outcome {
	return answerWithQuestion(answers, plantSide, performedAt).outcome;
}

export function answerWithQuestion(
	answers: CheckAnswers,
	plantSide: PlantSide,
	performedAt: string
): AnsweredCheck {
	const assembled = assemble(answers, plantSide, performedAt);
	if (!assembled.ok) return { outcome: cannotSay(assembled.missing.map(missingReason)), question: null };
	const { questions, identified } = assembled;
	const tried = questions.map(({ gear, input }) => ({ gear, input, outcome: evaluate(input) }));
	const [first] = tried;
	if (!first) return { outcome: cannotSay([NO_GEAR_FITS]), question: null };
	if (!answers.severalGears) {
		const doubt = choiceDoubt(first.gear.probability, identified);
		return { outcome: doubt ? reviewed(first.outcome, doubt) : first.outcome, question: first.input };
	}
	const several = outcomeOfSeveral(
		tried.map(({ gear, outcome }) => ({ gear, probability: gear.probability ?? 0, outcome }))
	);
	const decides = several.gears?.findIndex((gear) => gear.decides) ?? 0;
	const outcome = (identified?.noneFits ?? 0) > MAY_FIT_NONE ? reviewed(several, MAY_FIT_NO_GEAR) : several;
	return { outcome, question: tried[decides]?.input ?? first.input };
}

function missingReason(field: Missing): Reason {
	return {
		code: 'missing',
		text: `The ${WORDS[field]} is missing: go back to its step and give it.`,
		values: { field }
	};
}

/** As unlikely as the bad end of a margin's uncertainty: from here a doubt goes to review. */
const MAY_FIT_NONE = 0.05;

/** A gear that was chosen although the readings speak against it, or against every gear. */
function choiceDoubt(probability: number | null, identified: IdentifyAnswer | null): Reason | null {
	if (probability === null || !identified) return null;
	if (identified.state === 'none-fits') return MAY_FIT_NO_GEAR;
	return probability > SURVIVES ? null : AGAINST_READINGS;
}

const NO_GEAR_FITS: Reason = {
	code: 'no-gear-fits',
	text: 'No involute gear of the known pitches makes these readings. Look again at the count and the flagged reading, or have the gear identified by the gear shop.'
};

const MAY_FIT_NO_GEAR: Reason = {
	code: 'may-fit-no-gear',
	text: 'The readings may be of no involute gear at all. Take one more reading, or have a second person measure.'
};

const AGAINST_READINGS: Reason = {
	code: 'choice-against-readings',
	text: 'The chosen gear does not fit the readings: less than one in a hundred. Measure again, or say in the note where the choice comes from.'
};
