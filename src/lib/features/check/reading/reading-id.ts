/** The name in the address of the reading that identification asks for; what it rests on comes first. */
import type { NextReading } from '$lib/gear/identify/contract';
import type { CheckAnswers } from '$lib/records/check';

export function readingId(
	{ what, spanTeeth }: Pick<NextReading, 'what' | 'spanTeeth'>,
	answers: CheckAnswers
): string {
	if (what === 'spans') return `span-${spanTeeth ?? 2}`;
	if (what === 'overPins' && answers.pinDiameter === null) return 'pinDiameter';
	if (what === 'centreDistance' && answers.mateTeeth === null) return 'mateTeeth';
	return what;
}
