/** The gear of a check in two short lines of a table: what it is, and how it was made of what. */
import type { Finish } from '$lib/gear/contract';
import type { Words } from '$lib/i18n/context.svelte';
import { figure } from '$lib/i18n/format';
import type { ChosenPitch } from '$lib/records/mirror';
import { pitchWords } from '$lib/i18n/gear-words';

/** What a check has of its gear; null where it was not given. */
export interface GearOfCheck {
	teeth: number | null;
	pitch: ChosenPitch | null;
	pressureAngle: number | null;
	form: 'full-depth' | 'stub' | null;
	finish: Finish | null;
	materialName: string | null;
}

export interface GearInShort {
	what: string;
	/** Material alone, for narrow rows. */
	material: string;
	made: string;
}

export function gearInShort(gear: GearOfCheck, words: Pick<Words, 't' | 'language'>): GearInShort {
	const { t, language } = words;
	const { teeth, pitch, pressureAngle, form, finish, materialName } = gear;
	const angle = pressureAngle === null ? '' : `${figure(pressureAngle, 3, language)}°`;
	return {
		what: joined(
			teeth === null ? '' : t('gear.teeth-count', { n: teeth }),
			pitch ? pitchWords(pitch, words) : '',
			// Full depth is the usual case and goes without saying in a row.
			form === 'stub' ? `${angle} ${t('gear.form.stub')}`.trim() : angle
		),
		material: materialName ?? '',
		made: joined(materialName ?? '', finish ? t(`gear.finish.${finish}`) : '')
	};
}

function joined(...parts: string[]): string {
	return parts.filter(Boolean).join(', ');
}
