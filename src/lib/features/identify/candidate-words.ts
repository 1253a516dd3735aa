/**
 * Candidates for people: their names, both names of their pitch, and how each reading lies against them in plain words:
 * not a residual, but "0.9 mm low: worn tip?".
 */
import type {
	Candidate,
	IdentifyAnswer,
	Misfit,
	NextReading,
	ReadingName
} from '$lib/gear/identify/contract';
import { pitchOf } from '$lib/gear/identify/survivors';
import { fromSI } from '$lib/gear/quantity';
import type { MessageKey } from '$lib/i18n/catalogue';
import type { Words } from '$lib/i18n/context.svelte';
import { figure, fixed } from '$lib/i18n/format';
import { gearName, isShifted, pitchWords, shortGearName } from '$lib/i18n/gear-words';
import type { ChosenPitch } from '$lib/records/mirror';

export type LengthUnit = 'in' | 'mm';

/** "DP 5, 20°, full depth" */
export function candidateName(candidate: Candidate, words: Words): string {
	return gearName({ ...candidate, pitch: pitchOf(candidate) as ChosenPitch }, words);
}

/** "DP 5, 20°": where there is little room. */
export function shortName(candidate: Candidate, words: Words): string {
	return shortGearName({ ...candidate, pitch: pitchOf(candidate) as ChosenPitch }, words);
}

/** The same pitch by its other names: "module 5.08 · circular pitch 0.628 in". */
export function otherNames(candidate: Candidate, counted: number, words: Words): string {
	const { t, language } = words;
	const { system, module, diametralPitch, teeth } = candidate;
	const circular = Math.PI * module;
	const metric = system === 'module';
	return [
		...(system === 'module' ? [] : [t('gear.module', { value: figure(module, 4, language) })]),
		...(system === 'diametral'
			? []
			: [t('gear.diametral-pitch', { value: figure(diametralPitch, 4, language) })]),
		...(system === 'circular'
			? []
			: [
					t('gear.circular-pitch', {
						value: metric ? figure(circular, 4, language) : fixed(circular / 25.4, 3, language),
						unit: metric ? 'mm' : 'in'
					})
				]),
		...(teeth === counted ? [] : [t('gears.other-count', { teeth, counted })])
	].join(' · ');
}

/** Whole per cent, "<1" below one; what is not certain never reads as if it were. */
export function percent(probability: number): string {
	return probability < 0.01 ? '<1' : String(Math.min(99, Math.round(probability * 100)));
}

/** How far off, in widths of the doubt, counts as lying off at all. */
const OFF = 2;
/** Explained by wear or shift from here up, in modules. */
const EXPLAINED = 0.05;

export function misfitWords(misfit: Misfit, candidate: Candidate, unit: LengthUnit, words: Words): string {
	const { t, language } = words;
	const reading = readingName(misfit.reading, misfit.teeth, words);
	const size = (mm: number) =>
		`${fixed(fromSI(Math.abs(mm), unit), unit === 'in' ? 3 : 2, language)} ${t(`unit.${unit}`)}`;
	const way = (mm: number) => t(mm < 0 ? 'misfit.low' : 'misfit.high', { size: size(mm) });
	if (misfit.flagged) return t('misfit.look-again', { reading, way: way(misfit.residual) });
	if (Math.abs(misfit.sigmas) >= OFF) return t('misfit.off', { reading, way: way(misfit.residual) });
	const cause = causeOf(misfit, candidate);
	if (cause === 'shift') return t('misfit.shift', { reading });
	if (cause) return t(`misfit.${cause}`, { reading, way: way(misfit.offNominal) });
	return t('misfit.fits', { reading });
}

/** What explains that a reading fits although it lies off a new gear without shift. */
function causeOf({ reading, offNominal }: Misfit, candidate: Candidate): 'tip' | 'flank' | 'shift' | null {
	const { module, profileShift, tipLoss, thicknessLoss } = candidate;
	const least = EXPLAINED * module;
	if (Math.abs(offNominal) < least) return null;
	if (isShifted(profileShift)) return 'shift';
	const atTip = reading === 'outsideDiameter' || reading === 'wholeDepth';
	if (offNominal < 0 && atTip && tipLoss >= least / 2) return 'tip';
	const atFlank = reading === 'spans' || reading === 'overPins' || reading === 'chordalThickness';
	return offNominal < 0 && atFlank && thicknessLoss >= least ? 'flank' : null;
}

/** "Span over 4", "Outside diameter". */
export function readingName(reading: ReadingName, spanTeeth: number | undefined, { t }: Words): string {
	const key: MessageKey = reading === 'spans' ? 'field.span' : `field.${reading}`;
	return spanTeeth === undefined ? t(key) : t('field.span-over', { n: spanTeeth });
}

/** "Span over 3, then 4 teeth" where two belong together. */
export function nextName({ what, spanTeeth, thenSpanTeeth }: NextReading, words: Words): string {
	if (spanTeeth === undefined || thenSpanTeeth === undefined) return readingName(what, spanTeeth, words);
	return words.t('next.two-spans', { one: spanTeeth, two: thenSpanTeeth });
}

/** What the next reading would tell apart: "tells 20° from 14.5°". */
export function tellsWords({ expected }: NextReading, { candidates }: IdentifyAnswer, words: Words): string {
	const { t } = words;
	const [one, two] = expected
		.map(({ candidate }) => candidates[candidate])
		.filter((candidate) => candidate !== undefined)
		.sort((a, b) => b.probability - a.probability);
	if (!one || !two) return t('next.best');
	const [a, b] =
		one.pressureAngle !== two.pressureAngle
			? [`${one.pressureAngle}°`, `${two.pressureAngle}°`]
			: one.form !== two.form
				? [t(`gear.form.${one.form}`), t(`gear.form.${two.form}`)]
				: [pitchWords(pitchOf(one) as ChosenPitch, words), pitchWords(pitchOf(two) as ChosenPitch, words)];
	return t('next.tells', { a, b });
}
