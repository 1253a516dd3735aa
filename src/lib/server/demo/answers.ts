/** What a millwright of the demonstration typed on the day: readings as the keypad leaves them. */
import { noAnswers, type CheckAnswers } from '$lib/records/check';
import type { Reading, ReadingUnit } from '$lib/records/reading';
import { DEMO_SERVICE_FACTORS, type DemoCheck, type DemoPlant, type DemoPosition } from './scenario';

const CANNOT = { cannotMeasure: true } as const;
/** Roots of the permit numbers and the wear of a tip come from here, so that no two checks look copied. */
type Random = () => number;

export function answersOf(
	plant: DemoPlant,
	{ gear, drive }: DemoPosition,
	check: DemoCheck,
	made: { materialId: string; performedAt: Date; random: Random }
): CheckAnswers {
	if (!gear || !drive) throw new Error('A check of the demonstration needs a gear and a drive.');
	const inch = plant.origin === 'inch';
	const { unknown } = check;
	const power = check.power ?? drive.power;
	const factor = DEMO_SERVICE_FACTORS.find((given) => given.duty === drive.duty)?.factor ?? 1;
	const face = check.face ?? gear.face;
	return {
		...noAnswers,
		permit: `${inch ? 'LO' : 'KH'}-${Math.floor(1000 + made.random() * 9000)}`,
		cautionsSeenAt: new Date(made.performedAt.getTime() - 11 * 60_000).toISOString(),
		teeth: reading(gear.teeth, 'teeth'),
		outsideDiameter: outsideDiameter(gear, inch, made.random),
		faceWidth:
			unknown === 'face' ? CANNOT : reading(face, inch ? 'in' : 'mm', inch ? inchFraction(face) : undefined),
		pitch: gear.pitch,
		pressureAngle: gear.angle,
		form: gear.form,
		loadKind: unknown === 'load' || power === null ? 'unknown' : 'power',
		loadBasis: unknown === 'load' || power === null ? null : 'nameplate',
		power: unknown === 'load' || power === null ? null : reading(power, inch ? 'hp' : 'kW'),
		speed: unknown === 'speed' ? CANNOT : reading(drive.rpm, 'rpm'),
		duty: drive.duty,
		serviceFactor: reading(factor, 'x'),
		reversing: drive.reversing ?? false,
		finish: check.finish ?? gear.finish,
		materialId: made.materialId
	};
}

function reading<U extends ReadingUnit>(value: number, unit: U, typed = String(value)): Reading<U> {
	return { typed, value, unit, source: 'keypad' };
}

/** Over the tips of a full depth or stub gear, worn by a few thousandths. */
function outsideDiameter(gear: NonNullable<DemoPosition['gear']>, inch: boolean, random: Random) {
	const { teeth, pitch, form } = gear;
	const modules = teeth + (form === 'stub' ? 1.6 : 2);
	const diameter = pitch.system === 'diametral' ? modules / pitch.value : modules * pitch.value;
	const worn = diameter * (1 - 0.002 * random());
	const value = Number(worn.toFixed(inch ? 3 : 2));
	return reading(value, inch ? 'in' : 'mm');
}

/** 2.5 as `2 1/2`, to the sixteenth. */
function inchFraction(value: number): string {
	const sixteenths = Math.round(value * 16);
	const whole = Math.floor(sixteenths / 16);
	let [part, of] = [sixteenths % 16, 16];
	if (part === 0) return String(whole);
	while (part % 2 === 0) [part, of] = [part / 2, of / 2];
	return whole ? `${whole} ${part}/${of}` : `${part}/${of}`;
}
