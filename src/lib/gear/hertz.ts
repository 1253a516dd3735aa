/** Contact of two flanks at the pitch point, by Hertz. Moduli and stresses in MPa, lengths in mm, angles in radians. */
import { cosine, sine, toDegrees } from './degrees';
import { SOURCES } from './sources';
import { unrecorded, type Recorder } from './working';

export interface Elastic {
	/** MPa. */
	modulus: number;
	poisson: number;
}

/**
 * Elastic coefficient Cp in √MPa of two materials. Cp = √(1 / (π ((1 - ν1²) / E1 + (1 - ν2²) / E2))).
 * Source: Shigley, Mechanical Engineering Design, 8th ed., sec. 14-2 (edition from memory); 190 for steel on steel.
 * @example elasticCoefficient({ modulus: 206843, poisson: 0.292 }, { modulus: 206843, poisson: 0.292 }) // 189.71
 */
export function elasticCoefficient(one: Elastic, other: Elastic, recorder: Recorder = unrecorded): number {
	return recorder.step(
		{
			symbol: 'Cp',
			name: 'elastic coefficient of the pair',
			expression: '√(1 / (π · ((1 - ν1²) / E1 + (1 - ν2²) / E2)))',
			unit: '√MPa',
			source: SOURCES.hertz
		},
		{ ν1: one.poisson, E1: one.modulus, ν2: other.poisson, E2: other.modulus },
		({ ν1, E1, ν2, E2 }) => Math.sqrt(1 / (Math.PI * ((1 - ν1 * ν1) / E1 + (1 - ν2 * ν2) / E2)))
	);
}

/**
 * Curvature of the pair at the pitch point, 1 / r1 + 1 / r2 in 1/mm, r = d sin α / 2 (helical: r = d sin αn /
 * (2 cos² β), in the normal plane). A rack has no curvature; an internal mate's counts against the pinion's.
 * Source: Shigley, Mechanical Engineering Design, 8th ed., sec. 14-2 (edition from memory); helical as for virtual
 * cylinders, Khurmi and Gupta, A Textbook of Machine Design (from memory).
 * @example pitchPointCurvature(100, 200, { angle: Math.PI / 9, helixAngle: 0, internal: false }) // 0.0877141
 */
export function pitchPointCurvature(
	pinion: number,
	wheel: number | null,
	{ angle, helixAngle, internal }: { angle: number; helixAngle: number; internal: boolean },
	recorder: Recorder = unrecorded
): number {
	const radius = (symbol: string, name: string, diameter: number) =>
		recorder.step(
			{
				symbol,
				name,
				expression: helixAngle === 0 ? 'd · sin(α) / 2' : 'd · sin(α) / (2 · cos(β)²)',
				unit: 'mm',
				source: SOURCES.hertz
			},
			{ d: diameter, α: toDegrees(angle), β: toDegrees(helixAngle) },
			({ d, α, β }) => (d * sine(α)) / (2 * cosine(β) ** 2)
		);
	return recorder.step(
		{
			symbol: 'cr',
			name: 'curvature of the flanks at the pitch point',
			expression: wheel === null ? '1 / r1' : internal ? '1 / r1 - 1 / r2' : '1 / r1 + 1 / r2',
			unit: '1/mm',
			source: SOURCES.hertz
		},
		{
			r1: radius('r1', "radius of the pinion's flank at the pitch point", pinion),
			r2: wheel === null ? Infinity : radius('r2', "radius of the wheel's flank at the pitch point", wheel)
		},
		({ r1, r2 }) => 1 / r1 + (internal ? -1 : 1) / r2
	);
}

export interface ContactLine {
	/** √MPa. */
	elastic: number;
	/** mm. */
	faceWidth: number;
	/** Normal pressure angle, radians. */
	angle: number;
	/** 1/mm. */
	curvature: number;
}

/**
 * Contact stress Sc in MPa at the pitch point under a dynamic tangential force in N (velocity and service factors in).
 * Sc = Cp √(W cr / (F cos α)).
 * Source: Shigley, Mechanical Engineering Design, 8th ed., sec. 14-2 (edition from memory).
 * @example hertzContactStress(1000, { elastic: 190, faceWidth: 20, angle: 0, curvature: 0.08 }) // 380
 */
export function hertzContactStress(
	force: number,
	line: ContactLine,
	recorder: Recorder = unrecorded
): number {
	return recorder.step(
		{
			symbol: 'Sc',
			name: 'contact stress at the pitch point',
			expression: 'Cp · √(W · cr / (F · cos(α)))',
			unit: 'MPa',
			source: SOURCES.hertz
		},
		{
			Cp: line.elastic,
			W: force,
			cr: line.curvature,
			F: line.faceWidth,
			α: toDegrees(line.angle)
		},
		({ Cp, W, cr, F, α }) => Cp * Math.sqrt((W * cr) / (F * cosine(α)))
	);
}

/**
 * Dynamic force Wh in N at which the contact stress is the allowable one. Wh = (S / Cp)² F cos α / cr.
 * Source: `hertzContactStress` solved for the force.
 * @example hertzLoad(380, { elastic: 190, faceWidth: 20, angle: 0, curvature: 0.08 }) // 1000
 */
export function hertzLoad(allowable: number, line: ContactLine, recorder: Recorder = unrecorded): number {
	return recorder.step(
		{
			symbol: 'Wh',
			name: 'dynamic force that the flanks bear, by contact stress',
			expression: '(Sh / Cp)² · F · cos(α) / cr',
			unit: 'N',
			source: SOURCES.hertz
		},
		{
			Sh: allowable,
			Cp: line.elastic,
			F: line.faceWidth,
			α: toDegrees(line.angle),
			cr: line.curvature
		},
		({ Sh, Cp, F, α, cr }) => ((Sh / Cp) ** 2 * F * cosine(α)) / cr
	);
}
