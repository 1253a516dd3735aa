/**
 * What the flanks of a pair bear, and the margins it leaves: Hertz at the pitch point and Buckingham's limit load. One
 * answer for both members, since the published limit goes by the mean of their hardnesses. Null where materials,
 * moduli or hardnesses are not known.
 */
import type { Material, Outcome, Reason } from './contract';
import {
	BRINELL_RANGE,
	buckinghamLoadStressFactor,
	buckinghamRatioFactor,
	buckinghamSurfaceStrength,
	buckinghamWearLoad
} from './buckingham';
import {
	elasticCoefficient,
	hertzContactStress,
	hertzLoad,
	pitchPointCurvature,
	type Elastic
} from './hertz';
import type { Member } from './member';
import { toSI } from './quantity';
import { SOURCES } from './sources';
import type { Recorder } from './working';

export interface WearQuestion {
	gear: Member;
	mate: Member;
	/** The smaller of the pair, mm. */
	faceWidth: number;
	gearMaterial: Material;
	mateMaterial: Material | undefined;
	/** N, velocity and service factors in; null where the load is not known. */
	dynamicForce: number | null;
}

export interface WearAnswer {
	/** Dynamic force in N that the flanks bear: the lower of Hertz and Buckingham. */
	strength: number | null;
	figures: Outcome['wear'];
	refusal: Reason | null;
}

export function wearOf(question: WearQuestion, recorder: Recorder): WearAnswer {
	const none: WearAnswer = { strength: null, figures: null, refusal: null };
	const { gear, mate, faceWidth, dynamicForce } = question;
	const point = pitchPointOf(gear, mate);
	const { gearMaterial, mateMaterial } = question;
	if (!point) return none;
	// What no figure more would mend is said first; only then what is missing.
	const refusal = wearRefusal(gearMaterial, mateMaterial);
	if (refusal) return { ...none, refusal };
	const [own, mates] = [surfaceOf(gearMaterial), surfaceOf(mateMaterial)];
	if (!own || !mates) return none;

	const { pinion, teeth, diameter, wheel, internal } = point;
	const allowable = buckinghamSurfaceStrength(own.brinell, mates.brinell, recorder);
	const [elasticOwn, elasticMates] = [elasticOf(own, recorder), elasticOf(mates, recorder.mate())];
	const { normalAngle: angle, helixAngle } = pinion;
	const line = {
		elastic: elasticCoefficient(elasticOwn, elasticMates, recorder),
		faceWidth,
		angle,
		curvature: pitchPointCurvature(
			diameter,
			wheel?.diameter ?? null,
			{ angle, helixAngle, internal },
			recorder
		)
	};
	const byContact = hertzLoad(allowable, line, recorder);
	const wearLoad = buckinghamWearLoad(
		{
			pinion: diameter,
			faceWidth,
			ratioFactor: buckinghamRatioFactor(teeth, wheel?.teeth ?? null, internal, recorder),
			loadStress: buckinghamLoadStressFactor(
				allowable,
				angle,
				elasticOwn.modulus,
				elasticMates.modulus,
				recorder
			),
			helixAngle
		},
		recorder
	);
	const strength = recorder.step(
		{
			symbol: 'Ww',
			name: 'dynamic force that the flanks bear, the lower of both',
			expression: 'min(Wh, Fw)',
			unit: 'N',
			source: SOURCES.definition
		},
		{ Wh: byContact, Fw: wearLoad },
		({ Wh, Fw }) => Math.min(Wh, Fw)
	);
	if (dynamicForce === null) return { strength, figures: null, refusal: null };

	const figures = {
		contactStress: hertzContactStress(dynamicForce, line, recorder),
		allowableContact: allowable,
		contactMargin: recorder.step(BY_CONTACT, { Wh: byContact, W: dynamicForce }, ({ Wh, W }) => Wh / W),
		wearLoad,
		wearLoadMargin: recorder.step(BY_LIMIT_LOAD, { Fw: wearLoad, W: dynamicForce }, ({ Fw, W }) => Fw / W)
	};
	return { strength, figures, refusal: null };
}

const BY_CONTACT = {
	symbol: 'Mc',
	name: 'margin in wear by contact stress',
	expression: 'Wh / W',
	unit: '1',
	source: SOURCES.definition
};

const BY_LIMIT_LOAD = {
	symbol: 'Mw',
	name: 'margin in wear by limit load',
	expression: 'Fw / W',
	unit: '1',
	source: SOURCES.definition
};

interface PitchPoint {
	pinion: Member;
	/** The pinion's. */
	teeth: number;
	/** The pinion's, mm. */
	diameter: number;
	/** Null for a rack. */
	wheel: { teeth: number; diameter: number } | null;
	internal: boolean;
}

/**
 * Pinion and wheel of a pair, whichever of them is asked about. Null where the two cannot roll on each other, and where
 * the teeth of one are not known. Angles and modules of the two differ only where they agree in base pitch alone: the
 * pinion's count then, so that the answer is the same from either side and the wheel's circle is in the ratio of the teeth.
 */
function pitchPointOf(gear: Member, mate: Member): PitchPoint | null {
	const [pinion, other] = [gear, mate].sort(bySize) as [Member, Member];
	const { teeth, pitchDiameter: diameter, transverseModule } = pinion;
	if (pinion.kind === 'internal' || teeth === null || diameter === null) return null;
	if (other.kind === 'rack') return { pinion, teeth, diameter, wheel: null, internal: false };
	const internal = other.kind === 'internal';
	if (other.teeth === null || (internal && other.teeth === teeth)) return null;
	const wheel = { teeth: other.teeth, diameter: transverseModule * other.teeth };
	return { pinion, teeth, diameter, wheel, internal };
}

/** The fewer teeth come first, what has none to count last; of equal counts the smaller circle, to be the same each time. */
function bySize(one: Member, other: Member): number {
	const teeth = (member: Member) => member.teeth ?? Number.MAX_VALUE;
	return teeth(one) - teeth(other) || (one.pitchDiameter ?? 0) - (other.pitchDiameter ?? 0);
}

interface Surface {
	brinell: number;
	/** MPa. */
	modulus: number;
	poisson: number | undefined;
}

function surfaceOf(material: Material | undefined): Surface | null {
	if (!material?.modulus || material.brinell === undefined) return null;
	const { brinell, modulus, poisson } = material;
	return { brinell, modulus: toSI(modulus), poisson };
}

/** Common practice: metals lie between 0.21 (grey iron) and 0.35 (bronze), and the square of it counts. */
const COMMON_POISSON = 0.3;

function elasticOf({ modulus, poisson }: Surface, recorder: Recorder): Elastic {
	if (poisson !== undefined) return { modulus, poisson };
	const common = recorder.step(
		{
			symbol: 'ν',
			name: "Poisson's ratio, taken as common for metals",
			expression: '0.3',
			unit: '1',
			source: SOURCES.commonPractice
		},
		{},
		() => COMMON_POISSON
	);
	return { modulus, poisson: common };
}

/** Needs no modulus, and of a material that is not metallic no hardness either. */
function wearRefusal(own: Material, mates: Material | undefined): Reason | null {
	if (!own.metallic || mates?.metallic === false) {
		return {
			code: 'wear-not-for-plastics',
			text: 'The wear limit is for metal on metal; one of these is not metallic. Have the wear judged by an engineer.'
		};
	}
	if (own.brinell === undefined || mates?.brinell === undefined) return null;
	const brinell = (own.brinell + mates.brinell) / 2;
	if (brinell >= BRINELL_RANGE.from && brinell <= BRINELL_RANGE.to) return null;
	return {
		code: 'wear-out-of-range',
		text: `The wear limit holds for a mean Brinell hardness of ${BRINELL_RANGE.from} to ${BRINELL_RANGE.to}; of this pair it is ${Number(brinell.toFixed(1))}. Check both hardnesses, or have the wear judged by an engineer.`,
		values: { brinell, from: BRINELL_RANGE.from, to: BRINELL_RANGE.to }
	};
}
