/** Remedies in plain sentences, in the units of the plant. */
import type { Finish, Outcome, Quantity, Remedy } from '$lib/gear/contract';
import { fromSI, toSI, type Unit } from '$lib/gear/quantity';
import type { Words } from '$lib/i18n/context.svelte';
import { figure, margin } from '$lib/i18n/format';
import { boundFigure, type Bound } from './bound-figure';

export interface RemedyLine {
	/** What would do, in one sentence without its end. */
	lead: string;
	/** How far: the margins there, or up to where it still needs review. */
	rest: string;
	kind: string;
}

export function remedyLines(outcome: Outcome, metric: boolean, words: Words): RemedyLine[] {
	return (outcome.remedies ?? []).map((remedy) => lineOf(remedy, outcome, metric, words));
}

function lineOf(remedy: Remedy, outcome: Outcome, metric: boolean, words: Words): RemedyLine {
	const { t } = words;
	const { carriesAt, value } = remedy;
	const direction = directionOf(remedy, outcome);
	const bound = direction === 'least' || direction === 'faster' ? 'at-least' : 'at-most';
	const told = (at: Remedy['value']) => valueWords(remedy, at, { metric, bound }, words);
	const lead =
		carriesAt === null
			? t(`remedy.review.${direction}`, { what: told(value) })
			: t(`remedy.carries.${direction}`, { what: told(carriesAt) });
	return {
		lead,
		rest: restOf(remedy, told, words),
		kind: t(remedy.likeForLike ? 'remedy.like-for-like' : 'remedy.change')
	};
}

/** Where value and carriesAt are the same, the margins hold there; else the value is where review begins. */
function restOf(
	{ value, carriesAt, bendingMargin, bendingMarginLow }: Remedy,
	told: (value: Remedy['value']) => string,
	{ t, language }: Words
): string {
	if (carriesAt === null || sameValue(value, carriesAt)) {
		return t('remedy.margins', {
			margin: margin(bendingMargin, language),
			low: margin(bendingMarginLow, language)
		});
	}
	return t('remedy.review-from', { what: told(value) });
}

function sameValue(a: Remedy['value'], b: Remedy['value']): boolean {
	if (typeof a === 'string' || typeof b === 'string') return a === b;
	return a.value === b.value;
}

type Direction = 'most' | 'least' | 'slower' | 'faster' | 'with' | 'in';

function directionOf({ change, value }: Remedy, outcome: Outcome): Direction {
	if (change === 'finish') return 'with';
	if (change === 'material') return 'in';
	if (change === 'power') return 'most';
	if (change === 'faceWidth' || typeof value === 'string') return 'least';
	return speedNow(value, outcome) > value.value ? 'slower' : 'faster';
}

/** Present speed in the unit of the remedy. */
function speedNow({ unit }: Quantity<string>, { pitchLineVelocity, pitchDiameter }: Outcome): number {
	const velocity = pitchLineVelocity ?? NaN;
	return unit === 'rpm' ? (velocity * 60000) / (Math.PI * (pitchDiameter ?? NaN)) : velocity;
}

function valueWords(
	{ change }: Remedy,
	value: Remedy['value'],
	{ metric, bound }: { metric: boolean; bound: Bound },
	{ t, language }: Words
): string {
	if (typeof value === 'string') return change === 'finish' ? t(`gear.finish.${value as Finish}`) : value;
	const si = toSI({ value: value.value, unit: value.unit as Unit });
	const digits = (at: number, count: number) => figure(boundFigure(at, count, bound), count, language);
	const shown = (unit: Unit) => `${digits(fromSI(si, unit), 3)} ${unit}`;
	if (change === 'power') return `${shown(metric ? 'kW' : 'hp')} (${shown(metric ? 'hp' : 'kW')})`;
	if (change === 'faceWidth') return t('remedy.face', { width: shown(metric ? 'mm' : 'in') });
	return `${digits(value.value, 4)} ${value.unit}`;
}
