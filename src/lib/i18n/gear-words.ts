/** A known gear or drive in one line of the trade's words. */
import type { Words } from './context.svelte';
import { figure, fixed } from './format';
import type { ChosenPitch, KnownDrive, KnownGear } from '$lib/records/mirror';

export function pitchWords(pitch: ChosenPitch, { t, language }: Pick<Words, 't' | 'language'>): string {
	const value = figure(pitch.value, 5, language);
	switch (pitch.system) {
		case 'diametral':
			return t('gear.diametral-pitch', { value });
		case 'module':
			return t('gear.module', { value });
		case 'circular':
			return t('gear.circular-pitch', { value, unit: pitch.unit });
	}
}

/** A shift below this (modules) is a tolerance of cutting, not a property of the gear. */
const SHOWN_SHIFT = 0.03;

export function isShifted(profileShift: number): boolean {
	return Math.abs(profileShift) >= SHOWN_SHIFT;
}

export interface NamedGear {
	pitch: ChosenPitch;
	pressureAngle: number;
	form: 'full-depth' | 'stub';
	/** In modules. */
	profileShift: number;
}

/** "DP 5, 20°, full depth", and "shifted +0.21" where it is. */
export function gearName({ pitch, pressureAngle, form, profileShift }: NamedGear, words: Words): string {
	const { t, language } = words;
	const named = pitchWords(pitch, words);
	const size = `${profileShift < 0 ? '−' : '+'}${fixed(Math.abs(profileShift), 2, language)}`;
	return [
		named.charAt(0).toUpperCase() + named.slice(1),
		`${pressureAngle}°`,
		t(`gear.form.${form}`),
		...(isShifted(profileShift) ? [t('gear.shifted', { shift: size })] : [])
	].join(', ');
}

/** "DP 5, 20°": where there is little room; what is not full depth says so. */
export function shortGearName(
	{ pitch: { system, value }, pressureAngle, form }: Omit<NamedGear, 'profileShift'>,
	{ t, language }: Words
): string {
	const pitch = t(`gear.short.${system}`, { value: figure(value, 4, language) });
	return `${pitch}, ${pressureAngle}°${form === 'stub' ? ` ${t('gear.form.stub')}` : ''}`;
}

export function gearWords(gear: KnownGear, words: Words): string {
	const { t, language } = words;
	const { faceWidth } = gear;
	return [
		t('gear.teeth-count', { n: gear.teeth }),
		pitchWords(gear.pitch, words),
		t('gear.angle-form', {
			angle: figure(gear.pressureAngle, 3, language),
			form: t(`gear.form.${gear.form}`)
		}),
		t('gear.face', { value: figure(faceWidth.value, 4, language), unit: faceWidth.unit })
	].join(', ');
}

export function driveWords(drive: KnownDrive, { t, language }: Words): string {
	const parts = [
		drive.power ? `${figure(drive.power.value, 4, language)} ${t(`unit.${drive.power.unit}`)}` : null,
		drive.speedRpm ? `${figure(drive.speedRpm, 4, language)} ${t('unit.rpm')}` : null,
		t(`drive.duty.${drive.duty}`)
	];
	return parts.filter((part) => part !== null).join(', ');
}
