/** Backlash of a pair, and the range that is recommended for it. Lengths in mm, angles in radians. */
import type { MeshGeometry } from './contact-path';
import { cosine, toDegrees } from './degrees';
import { involuteOf } from './involute-line';
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
	const internal = wheel.kind === 'internal';
	const counts = { N1: pinion.teeth, N2: wheel.teeth };
	const rolling = rollingRadii({ ...counts, C: centre }, internal, recorder);
	const pitch = recorder.step(
		{ ...LENGTH, symbol: 'pw', name: 'pitch on the operating pitch circle', expression: '2 · π · rw1 / N1' },
		{ ...counts, rw1: rolling.rw1 },
		({ rw1, N1 }) => (2 * Math.PI * rw1) / N1
	);
	const invw = involuteOf(operatingAngle, 'w', recorder);
	const transverse = recorder.step(
		{
			...LENGTH,
			symbol: 'jt',
			name: 'backlash on the operating pitch circle',
			expression: 'pw - s1 - s2'
		},
		{
			pw: pitch,
			s1: rollingThickness(pinion, { place: 1, rolling: rolling.rw1, invw }, recorder),
			s2: rollingThickness(wheel, { place: 2, rolling: rolling.rw2, invw }, recorder)
		},
		({ pw, s1, s2 }) => withoutNoise(pw - s1 - s2)
	);
	const baseHelix = Math.asin(Math.sin(pinion.helixAngle) * Math.cos(pinion.normalAngle));
	return recorder.step(
		{
			...LENGTH,
			symbol: 'jn',
			name: 'backlash across the flanks',
			expression: 'jt · cos(αw) · cos(βb)'
		},
		{ jt: transverse, αw: toDegrees(operatingAngle), βb: toDegrees(baseHelix) },
		({ jt, αw, βb }) => jt * cosine(αw) * cosine(βb)
	);
}

const LENGTH = { unit: 'mm', source: SOURCES.mesh };

/** Operating pitch radii in mm: the centre distance shared out by the teeth. Source: definition. */
function rollingRadii(
	terms: { N1: number; N2: number; C: number },
	internal: boolean,
	recorder: Recorder
): { rw1: number; rw2: number } {
	const teeth = internal ? 'N2 - N1' : 'N2 + N1';
	const rw1 = recorder.step(
		{
			...LENGTH,
			symbol: 'rw1',
			name: 'operating pitch radius of the pinion',
			expression: `C · N1 / (${teeth})`
		},
		terms,
		({ C, N1, N2 }) => (C * N1) / (internal ? N2 - N1 : N2 + N1)
	);
	const rw2 = recorder.step(
		{ ...LENGTH, symbol: 'rw2', name: 'operating pitch radius of the wheel', expression: 'rw1 · N2 / N1' },
		{ ...terms, rw1 },
		({ N1, N2, rw1 }) => (rw1 * N2) / N1
	);
	return { rw1, rw2 };
}

/** sw = 2 rw (st / d + inv αt - inv αw) in mm, an internal gear's with the involutes the other way round. */
function rollingThickness(
	member: Member,
	{ place, rolling, invw }: { place: 1 | 2; rolling: number; invw: number },
	recorder: Recorder
): number {
	const who = place === 1 ? 'of the pinion' : 'of the wheel';
	const [st, rw, inv, d] = [`st${place}`, `rw${place}`, `inv${place}`, `d${place}`];
	const internal = member.kind === 'internal';
	const thickness = recorder.step(
		{
			...LENGTH,
			symbol: st,
			name: `arc thickness on the reference circle ${who}`,
			expression:
				member.toothThickness === null
					? `mn · (π / 2 ${internal ? '-' : '+'} 2 · x · tan(αn)) / cos(β)`
					: 'sn / cos(β)'
		},
		{
			mn: member.normalModule,
			x: member.profileShift,
			αn: toDegrees(member.normalAngle),
			sn: member.toothThickness ?? NaN,
			β: toDegrees(member.helixAngle)
		},
		() => arcThickness(member)
	);
	const own = involuteOf(member.transverseAngle, place, recorder);
	return recorder.step(
		{
			...LENGTH,
			symbol: `s${place}`,
			name: `arc thickness on the operating pitch circle ${who}`,
			expression: `2 · ${rw} · (${st} / ${d} ${internal ? `- ${inv} + invw` : `+ ${inv} - invw`})`
		},
		{ [rw]: rolling, [st]: thickness, [d]: member.pitchDiameter ?? NaN, [inv]: own, invw },
		() => 2 * rolling * (thickness / (member.pitchDiameter ?? NaN) + (internal ? -1 : 1) * (own - invw))
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
