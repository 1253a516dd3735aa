/** Backlash of a pair, and the range that is recommended for it. Lengths in mm, angles in radians. */
import type { MeshGeometry } from './contact-path';
import { involute } from './involute';
import type { Member } from './member';
import { SOURCES } from './sources';
import { machinerysHandbookRange } from './tables/machinerys-handbook-backlash';
import { arcThickness } from './thickness';
import type { Recorder } from './working';

export interface BacklashQuestion extends MeshGeometry {
	/** Whether the centre distance was measured. */
	measured: boolean;
}

/**
 * Normal backlash jn in mm, across the flanks: what is left of the operating pitch when both teeth are in it.
 * jt = pw - s1 - s2 on the operating pitch circles, sw = 2 rw (s / d + inv αt - inv αw), jn = jt cos αw cos βb.
 * Null with a rack, and where neither centre distance nor a tooth thickness was measured: nominal teeth at the nominal
 * distance have none by definition.
 * Source: Shigley, Mechanical Engineering Design, 8th ed., ch. 13; ISO/TR 10064-2 (both from memory).
 */
export function normalBacklash(question: BacklashQuestion, recorder: Recorder): number | null {
	const { pinion, wheel, centre, operatingAngle, measured } = question;
	const thickness = pinion.toothThickness !== null || wheel.toothThickness !== null;
	if (centre === null || pinion.teeth === null || wheel.teeth === null || !(measured || thickness))
		return null;
	const sign = wheel.kind === 'internal' ? -1 : 1;
	const radius = (centre * pinion.teeth) / (wheel.teeth + sign * pinion.teeth);
	const pitch = (2 * Math.PI * radius) / pinion.teeth;
	const at = (member: Member, rolling: number, sense: number) => {
		const grown = involute(member.transverseAngle) - involute(operatingAngle);
		return 2 * rolling * (arcThickness(member) / (member.pitchDiameter ?? NaN) + sense * grown);
	};
	const transverse = recorder.step(
		{
			symbol: 'jt',
			name: 'backlash on the operating pitch circle',
			expression: 'pw - s1 - s2',
			unit: 'mm',
			source: SOURCES.mesh
		},
		{
			pw: pitch,
			s1: at(pinion, radius, 1),
			s2: at(wheel, (radius * wheel.teeth) / pinion.teeth, sign)
		},
		({ pw, s1, s2 }) => withoutNoise(pw - s1 - s2)
	);
	const baseHelix = Math.asin(Math.sin(pinion.helixAngle) * Math.cos(pinion.normalAngle));
	return recorder.step(
		{
			symbol: 'jn',
			name: 'backlash across the flanks',
			expression: 'jt · cos(αw) · cos(βb)',
			unit: 'mm',
			source: SOURCES.mesh
		},
		{ jt: transverse, αw: (operatingAngle * 180) / Math.PI, βb: (baseHelix * 180) / Math.PI },
		({ jt }) => jt * Math.cos(operatingAngle) * Math.cos(baseHelix)
	);
}

/** A millionth of a millimetre is arithmetic, not backlash. */
function withoutNoise(backlash: number): number {
	return Math.abs(backlash) < 1e-6 ? 0 : backlash;
}

/**
 * Recommended normal backlash in mm for a normal module and a centre distance in mm: at least
 * jn = 2/3 (0.06 + 0.0005 a + 0.03 mn), ISO/TR 10064-2 (from memory); at most the end of the range in Machinery's
 * Handbook (from memory), null where that table has no entry.
 * @example recommendedBacklash(5, 200).least // 0.206667
 */
export function recommendedBacklash(module: number, centre: number): { least: number; most: number | null } {
	const least = (2 / 3) * (0.06 + 0.0005 * centre + 0.03 * module);
	const range = machinerysHandbookRange(25.4 / module, centre / 25.4);
	return { least, most: range && range.most * 25.4 };
}
