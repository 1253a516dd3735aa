/** Where the candidates lead to: the reading that would tell most, and the true-scale strip. */
import { readingId } from '$lib/features/check/reading/reading-id';
import type { Candidate, NextReading } from '$lib/gear/identify/contract';
import type { Words } from '$lib/i18n/context.svelte';
import type { CheckAnswers } from '$lib/records/check';
import { candidateName } from './candidate-words';

/** The measuring step at a reading. */
export function readingAddress(
	check: string,
	wanted: Pick<NextReading, 'what' | 'spanTeeth'>,
	answers: CheckAnswers
): string {
	return `/tablet/check/${check}/measure?reading=${readingId(wanted, answers)}`;
}

/** The strip with the leading gears, and the way back. */
export function stripAddress(
	check: string,
	candidates: readonly Candidate[],
	counted: number,
	words: Words
): string {
	const address = new URLSearchParams();
	for (const candidate of candidates.slice(0, 3)) {
		const { module, teeth, pressureAngle, form, profileShift } = candidate;
		const shift = Number(profileShift.toFixed(4));
		address.append(
			'gear',
			[module, teeth || counted, pressureAngle, form, shift, candidateName(candidate, words)].join(',')
		);
	}
	address.set('back', `/tablet/check/${check}/which-gear`);
	return `/tablet/strip?${address}`;
}
