/**
 * The tools that readings are taken with, and how far each may be trusted: a standard uncertainty, which the plant's
 * rules may change. From memory of shop practice, half of what is stated at k = 2; resolution alone is far finer.
 */
import { z } from 'zod';

export const INSTRUMENTS = [
	'calliper',
	'long-calliper',
	'calliper-tips',
	'micrometer',
	'disc-micrometer',
	'tooth-calliper',
	'pi-tape',
	'rule',
	'tape',
	'rule-over-shafts',
	'protractor'
] as const;
export type Instrument = (typeof INSTRUMENTS)[number];

/** mm; of the protractor, degrees. */
export const USUAL_UNCERTAINTY: Record<Instrument, number> = {
	calliper: 0.025,
	'long-calliper': 0.04,
	'calliper-tips': 0.05,
	micrometer: 0.002,
	'disc-micrometer': 0.004,
	'tooth-calliper': 0.025,
	'pi-tape': 0.015,
	rule: 0.25,
	tape: 0.25,
	'rule-over-shafts': 0.5,
	protractor: 0.5
};

/** Finer than any tool at a machine, and coarser than would tell anything; mm or degrees. */
export const LEAST_UNCERTAINTY = 0.0001;
export const MOST_UNCERTAINTY = 20;

/** What a plant's rules say of its own tools; a tool that they leave out is as good as usual. */
export const instrumentRules = z.partialRecord(
	z.enum(INSTRUMENTS, `The tool must be one of: ${INSTRUMENTS.join(', ')}.`),
	z
		.number('The uncertainty of a tool is a number.')
		.min(LEAST_UNCERTAINTY, `The uncertainty of a tool must be at least ${LEAST_UNCERTAINTY}.`)
		.max(MOST_UNCERTAINTY, `The uncertainty of a tool must be at most ${MOST_UNCERTAINTY}.`)
);
export type InstrumentRules = z.infer<typeof instrumentRules>;

/** Standard uncertainty in mm, or degrees, by the plant's rules. */
export function uncertaintyOf(instrument: Instrument, rules: InstrumentRules | undefined): number {
	return rules?.[instrument] ?? USUAL_UNCERTAINTY[instrument];
}
