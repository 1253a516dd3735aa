/** "Cannot measure this" of a reading that was asked for: an answer, so that another one is asked next. */
import type { NextReading } from '$lib/gear/identify/contract';
import type { CheckAnswers } from '$lib/records/check';

const CANNOT = { cannotMeasure: true } as const;

export function cannotMeasure(
	answers: CheckAnswers,
	{ what, spanTeeth }: NextReading
): Partial<CheckAnswers> {
	if (what !== 'spans') return { [what]: CANNOT };
	const teeth = spanTeeth ?? 2;
	const others = answers.spans.filter((span) => span.teeth !== teeth);
	return { spans: [...others, { teeth, reading: CANNOT }].sort((a, b) => a.teeth - b.teeth) };
}
