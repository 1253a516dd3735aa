/** A known gear or drive in one line of the trade's words. */
import type { Words } from './context.svelte';
import { figure } from './format';
import type { ChosenPitch, KnownDrive, KnownGear } from '$lib/records/mirror';

export function pitchWords(pitch: ChosenPitch, { t, language }: Pick<Words, 't' | 'language'>): string {
	return t(pitch.system === 'diametral' ? 'gear.diametral-pitch' : 'gear.module', {
		value: figure(pitch.value, 5, language)
	});
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
