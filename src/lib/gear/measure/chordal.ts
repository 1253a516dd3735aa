/**
 * What a gear-tooth vernier reads, and other chords across teeth. Lengths in mm, angles in radians; spur gears, or the
 * normal plane of a helical one by its virtual teeth.
 */
import { nominalThickness } from '../thickness';

export interface ChordalGear {
	teeth: number;
	module: number;
	/** In modules. */
	profileShift: number;
	pressureAngle: number;
	addendum: number;
}

/**
 * Chordal thickness and chordal addendum in mm on the reference circle, half-angle ψ = s / d.
 * t = d sin ψ, h = (ha + x) m + d / 2 (1 - cos ψ), s = m (π / 2 + 2 x tan α).
 * Source: Machinery's Handbook, gear-tooth calliper table (from memory); P. C. Sharma, Production Engineering,
 * Ex. 16.1, p. 648.
 * @example chordal({ teeth: 34, module: 5, profileShift: 0, pressureAngle: Math.PI / 9, addendum: 1 }).thickness // 7.85119
 */
export function chordal(gear: ChordalGear): { thickness: number; addendum: number } {
	const { teeth, module, profileShift, pressureAngle, addendum } = gear;
	const d = module * teeth;
	const half = nominalThickness(1, profileShift, pressureAngle) / teeth;
	return {
		thickness: d * Math.sin(half),
		addendum: (addendum + profileShift) * module + (d / 2) * (1 - Math.cos(half))
	};
}

/**
 * Constant chord c and its height h below the tip in mm: the same for every number of teeth.
 * c = m (π / 2 cos² α + x sin 2α), h = m (ha + x) - c / 2 tan α.
 * Source: metric gear handbooks (from memory).
 * @example constantChord({ teeth: 20, module: 1, profileShift: 0, pressureAngle: Math.PI / 9, addendum: 1 }).chord // 1.38705
 */
export function constantChord(gear: Omit<ChordalGear, 'teeth'>): { chord: number; height: number } {
	const { module, profileShift, pressureAngle, addendum } = gear;
	const chord =
		module * ((Math.PI / 2) * Math.cos(pressureAngle) ** 2 + profileShift * Math.sin(2 * pressureAngle));
	return { chord, height: module * (addendum + profileShift) - (chord / 2) * Math.tan(pressureAngle) };
}

/**
 * Chord in mm from tooth to tooth on the reference circle: a rule across one space of a large wheel reads it.
 * pc = d sin(180° / N). Source: geometry of a chord (definition).
 * @example chordalPitch(480, 48) // 31.39350
 */
export function chordalPitch(pitchDiameter: number, teeth: number): number {
	return pitchDiameter * Math.sin(Math.PI / teeth);
}

/**
 * Helix angle in radians at the reference cylinder from the angle that inked tips leave on paper.
 * tan β = (d / da) tan βa. Source: geometry of a helix (definition).
 * @example helixFromTips((25 * Math.PI) / 180, 100, 110) // 0.400952
 */
export function helixFromTips(atTips: number, pitchDiameter: number, tipDiameter: number): number {
	return Math.atan((pitchDiameter / tipDiameter) * Math.tan(atTips));
}
