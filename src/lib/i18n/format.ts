/**
 * Figures and times for people. Both languages write a decimal point here: a comma on one screen and a point on
 * the next is how a gear gets cut ten times too large.
 */
import type { Language } from './language';

const LOCALE: Record<Language, string> = { en: 'en-US', es: 'es-MX' };

/** A figure with a number of significant digits, never in powers of ten. */
export function figure(value: number, digits: number, language: Language): string {
	return new Intl.NumberFormat(LOCALE[language], {
		maximumSignificantDigits: digits,
		minimumSignificantDigits: 1
	}).format(value);
}

/** A figure with a fixed number of decimals: margins, lengths. */
export function fixed(value: number, decimals: number, language: Language): string {
	return new Intl.NumberFormat(LOCALE[language], {
		minimumFractionDigits: decimals,
		maximumFractionDigits: decimals
	}).format(value);
}

/** A margin is cut, not rounded, to two decimals: 1.499 must not read as the 1.50 that the plant needs. */
export function margin(value: number, language: Language): string {
	return fixed(Math.floor(value * 100 + 1e-9) / 100, 2, language);
}

export function day(moment: string | Date, language: Language): string {
	return new Intl.DateTimeFormat(LOCALE[language], {
		day: 'numeric',
		month: 'short',
		year: 'numeric'
	}).format(new Date(moment));
}

export function clock(moment: string | Date | number, language: Language): string {
	return new Intl.DateTimeFormat(LOCALE[language], {
		hour: '2-digit',
		minute: '2-digit',
		hour12: false
	}).format(new Date(moment));
}

/** The time of today, else the day and the time. */
export function moment(at: string | Date, language: Language, now: Date = new Date()): string {
	const date = new Date(at);
	if (date.toDateString() === now.toDateString()) return clock(date, language);
	const days = new Intl.DateTimeFormat(LOCALE[language], {
		day: 'numeric',
		month: 'short',
		...(date.getFullYear() === now.getFullYear() ? {} : { year: 'numeric' })
	});
	return `${days.format(date)}, ${clock(date, language)}`;
}

/** How long ago, in the largest whole unit: minutes, hours, days. */
export function ago(ms: number, language: Language): string {
	const minutes = Math.max(0, Math.floor(ms / 60_000));
	const [value, unit] =
		minutes < 60
			? [minutes, 'minute']
			: minutes < 48 * 60
				? [Math.floor(minutes / 60), 'hour']
				: [Math.floor(minutes / 1440), 'day'];
	return new Intl.NumberFormat(LOCALE[language], { style: 'unit', unit, unitDisplay: 'long' }).format(value);
}
