/**
 * A hint, not an identification: which pitch an outside diameter and a tooth count point to, if the form is as
 * assumed, the teeth are not shifted and their tips not worn.
 */
import type { Pitch } from './contract';
import { moduleOf } from './pitch';
import { COARSE_PITCHES, FINE_PITCHES, STOCK_CUTTER_PITCHES } from './tables/ansi-b6-1-1968';
import { MODULES_SERIES_I, MODULES_SERIES_II } from './tables/iso-54-1996';

export interface PitchHintQuestion {
	teeth: number;
	outsideDiameterMm: number;
	form: 'full-depth' | 'stub';
}

/** A standard pitch, the outside diameter (mm) that it would have, and by how much that is more than measured. */
export interface NearPitch {
	pitch: Pitch;
	outsideDiameter: number;
	difference: number;
}

export interface PitchHint {
	diametralPitch: number;
	module: number;
	/** The three standard pitches nearest in outside diameter, nearest first. */
	nearest: NearPitch[];
}

/** Twice the addendum in modules: of 1 for full depth, of 0.8 for 20 degree stub. */
const TWICE_ADDENDUM = { 'full-depth': 2, stub: 1.6 };

/**
 * Do = m (N + 2) full depth, Do = m (N + 1.6) stub, in mm, of a gear without shift. Sources as of the hint.
 * @example nominalOutsideDiameter({ system: 'diametral', value: 5 }, 25, 'full-depth') // 137.16
 */
export function nominalOutsideDiameter(pitch: Pitch, teeth: number, form: PitchHintQuestion['form']): number {
	return moduleOf(pitch) * (teeth + TWICE_ADDENDUM[form]);
}

const STANDARD_PITCHES: readonly Pitch[] = [
	...[...COARSE_PITCHES, ...FINE_PITCHES, ...STOCK_CUTTER_PITCHES].map((value): Pitch => ({
		system: 'diametral',
		value
	})),
	...[...MODULES_SERIES_I, ...MODULES_SERIES_II].map((value): Pitch => ({ system: 'module', value }))
];

/**
 * Pd = (N + 2) / Do full depth, Pd = (N + 1.6) / Do stub (Do in inches); null while teeth or diameter are no
 * measurement yet (teeth not a whole number from 1, diameter not above 0).
 * Source: Mott, Machine Elements in Mechanical Design, 4th ed., p. 319; stub addendum 0.8 AGMA 201.02A (from memory).
 * @example pitchHint({ teeth: 18, outsideDiameterMm: 42.33418, form: 'full-depth' })?.diametralPitch // 11.99976
 */
export function pitchHint({ teeth, outsideDiameterMm, form }: PitchHintQuestion): PitchHint | null {
	if (!Number.isInteger(teeth) || teeth < 1) return null;
	if (!(outsideDiameterMm > 0 && Number.isFinite(outsideDiameterMm))) return null;
	const modulesAcross = teeth + TWICE_ADDENDUM[form];
	const module = outsideDiameterMm / modulesAcross;
	const nearest = STANDARD_PITCHES.map((pitch): NearPitch => {
		const outsideDiameter = nominalOutsideDiameter(pitch, teeth, form);
		return { pitch, outsideDiameter, difference: outsideDiameter - outsideDiameterMm };
	});
	nearest.sort((a, b) => Math.abs(a.difference) - Math.abs(b.difference));
	return { diametralPitch: 25.4 / module, module, nearest: nearest.slice(0, 3) };
}
