/**
 * From answers to gears: the readings as identification takes them, and the gears that a check is answered for. The
 * tablet, the server and the check's page all come through here, so that they speak of the same candidates.
 */
import type { Pitch } from '$lib/gear/contract';
import type {
	IdentifyAnswer,
	IdentifyInput,
	IdentifyReading,
	ReadingName
} from '$lib/gear/identify/contract';
import { identify } from '$lib/gear/identify/identify';
import { isSameGear, pitchOf, survivorsOf } from '$lib/gear/identify/survivors';
import { fromSI } from '$lib/gear/quantity';
import type { CheckAnswers } from './check';
import { uncertaintyOf, type InstrumentRules } from './instruments';
import { isReading, takesOf, type AnsweredReading, type Reading } from './reading';

type LengthAnswer = AnsweredReading<'in' | 'mm'>;

/** The names of readings that answers and identification share. */
const SHARED = [
	'outsideDiameter',
	'wholeDepth',
	'rootDiameter',
	'chordalThickness',
	'circularPitch'
] as const satisfies (ReadingName & keyof CheckAnswers)[];

/** What identification is asked, or null while nothing tells the size of the teeth. */
export function readingsOf(answers: CheckAnswers, tools: InstrumentRules | undefined): IdentifyInput | null {
	const { teeth, secondCount, spans, overPins, pinDiameter, centreDistance, mateTeeth, helixAngle } = answers;
	if (!isReading(teeth)) return null;
	const length = (reading: Reading<'in' | 'mm'>): IdentifyReading => lengthOf(reading, tools);
	const plain = Object.fromEntries(
		SHARED.flatMap((name) => {
			const answer: LengthAnswer = answers[name];
			return isReading(answer) ? [[name, length(answer)]] : [];
		})
	);
	const { outsideDiameter } = plain;
	const sized = {
		...plain,
		...(outsideDiameter && {
			outsideDiameter: {
				...outsideDiameter,
				taken: answers.outsideDiameterTaken,
				tipWorn: answers.tipWorn
			}
		}),
		...(spans.some(({ reading }) => isReading(reading)) && {
			spans: spans.flatMap(({ teeth: over, reading }) =>
				isReading(reading) ? [{ teeth: over, ...length(reading) }] : []
			)
		}),
		...(isReading(overPins) &&
			isReading(pinDiameter) && {
				overPins: {
					...length(overPins),
					pinDiameter: { value: pinDiameter.value, unit: pinDiameter.unit }
				}
			}),
		...(isReading(centreDistance) &&
			isReading(mateTeeth) && { centreDistance: length(centreDistance), mateTeeth: mateTeeth.value })
	};
	if (Object.keys(sized).length === 0) return null;
	const slanted = isReading(helixAngle) && helixAngle.value > 0 ? helixAngle : null;
	const countsDiffer = isReading(secondCount) && secondCount.value !== teeth.value;
	return {
		teeth: teeth.value,
		...(countsDiffer && { teethCertain: false }),
		...sized,
		...(slanted && {
			helixAngle: {
				value: slanted.value,
				uncertainty: uncertaintyOf(slanted.instrument ?? 'protractor', tools)
			}
		}),
		flanksWorn: answers.flanksWorn,
		prior: answers.origin,
		cannotMeasure: cannotMeasureOf(answers)
	};
}

function lengthOf(reading: Reading<'in' | 'mm'>, tools: InstrumentRules | undefined): IdentifyReading {
	const { unit, instrument } = reading;
	return {
		values: takesOf(reading),
		unit,
		...(instrument && { uncertainty: fromSI(uncertaintyOf(instrument, tools), unit) })
	};
}

function cannotMeasureOf(answers: CheckAnswers): ReadingName[] {
	const given = (answer: AnsweredReading) => answer !== null && !isReading(answer);
	const { spans, overPins, pinDiameter, centreDistance, mateTeeth } = answers;
	return [
		...SHARED.filter((name) => given(answers[name])),
		...(spans.some(({ reading }) => given(reading)) ? (['spans'] as const) : []),
		...(given(overPins) || given(pinDiameter) ? (['overPins'] as const) : []),
		...(given(centreDistance) || given(mateTeeth) ? (['centreDistance'] as const) : [])
	];
}

/** A gear that the check is answered for. */
export interface WhichGear {
	teeth: number;
	pitch: Pitch;
	pressureAngle: number;
	form: 'full-depth' | 'stub';
	profileShift: number;
	/** What the readings say for it; null for a gear of which they cannot tell. */
	probability: number | null;
}

export type WhichGears =
	/** Chosen, or left open between several; `identified` is null where no reading tells the size. */
	| { ok: true; gears: WhichGear[]; identified: IdentifyAnswer | null }
	| {
			ok: false;
			missing: ('teeth' | 'pitch' | 'pressureAngle' | 'form')[];
			identified: IdentifyAnswer | null;
	  };

export function whichGears(answers: CheckAnswers, tools: InstrumentRules | undefined): WhichGears {
	const readings = readingsOf(answers, tools);
	const identified = readings && identify(readings);
	if (answers.severalGears) {
		if (!identified) {
			return { ok: false, missing: isReading(answers.teeth) ? ['pitch'] : ['teeth', 'pitch'], identified };
		}
		const gears = survivorsOf(identified).map((candidate): WhichGear => {
			const { teeth, pressureAngle, form, profileShift, probability } = candidate;
			return { teeth, pitch: pitchOf(candidate), pressureAngle, form, profileShift, probability };
		});
		return { ok: true, gears, identified };
	}
	const { pitch, pressureAngle, form, profileShift, gearTeeth } = answers;
	const teeth = gearTeeth ?? (isReading(answers.teeth) ? answers.teeth.value : null);
	if (teeth === null || !pitch || pressureAngle === null || !form) {
		const asked = { teeth, pitch, pressureAngle, form };
		const names = Object.keys(asked) as (keyof typeof asked)[];
		return { ok: false, missing: names.filter((name) => asked[name] === null), identified };
	}
	const named = { pitch, pressureAngle, form };
	const found = identified?.candidates.find((candidate) => isSameGear(candidate, named));
	const probability = identified && (found?.probability ?? 0);
	return { ok: true, gears: [{ ...named, teeth, profileShift, probability }], identified };
}
