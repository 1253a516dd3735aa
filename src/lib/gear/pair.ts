/**
 * What the mate adds: whether the two mesh, what the mate's teeth bear in bending, and what the flanks of both bear
 * in wear. Null where the input does not allow it.
 */
import type { EvaluateInput, Gear, Mate, Outcome, Reason, Rules, ToothedPart } from './contract';
import { pairingWarnings } from './hardness-pairing';
import { memberOf, type Member } from './member';
import { meshOf } from './mesh';
import { basePitchRefusal } from './mesh-refusals';
import { toSI } from './quantity';
import { formFactorOf, memberBending } from './strength';
import { wearOf } from './wear';
import type { Recorder } from './working';

export interface PairQuestion {
	input: EvaluateInput;
	rules: Rules;
	gear: Member;
	/** The smaller of the pair, mm. */
	faceWidth: number;
	velocityFactor: number | null;
	/** N; null where the load is not known. */
	designForce: number | null;
}

export interface PairAnswer {
	figures: Pick<Outcome, 'mesh' | 'mateBending' | 'wear'>;
	/** Dynamic forces in N that mate and flanks bear. */
	mateStrength: number | null;
	wearStrength: number | null;
	/** They do not mesh: comes before any margin. */
	refusals: Reason[];
	reviews: Reason[];
	warnings: Reason[];
}

export function pairOf(question: PairQuestion, recorder: Recorder): PairAnswer {
	const { input, gear, faceWidth } = question;
	const answer: PairAnswer = {
		figures: { mesh: null, mateBending: null, wear: null },
		mateStrength: null,
		wearStrength: null,
		refusals: [],
		reviews: [],
		warnings: []
	};
	if (!input.mate) return answer;
	const part = matePart(input.gear, input.mate);
	const mate = memberOf(part);
	if (mate.kind !== 'rack' && mate.teeth === null) {
		const refusal = basePitchRefusal(gear, mate);
		return refusal ? { ...answer, refusals: [refusal] } : answer;
	}

	const centreDistance = input.mate.centreDistance ? toSI(input.mate.centreDistance) : null;
	const { figures: mesh, refusals, warnings } = meshOf({ gear, mate, centreDistance, faceWidth }, recorder);
	answer.figures.mesh = mesh;
	answer.refusals = refusals;
	answer.reviews = warnings.filter(({ code }) => code === 'contact-ratio-low');
	answer.warnings = [
		...warnings.filter(({ code }) => code !== 'contact-ratio-low'),
		...pairingWarnings(input.gear, input.mate)
	];
	if (refusals.length) return answer;

	const bending = mateBending(question, mate, recorder.mate());
	answer.mateStrength = bending.strength;
	answer.figures.mateBending = bending.figures;

	const { designForce, velocityFactor } = question;
	const wear = wearOf(
		{
			gear,
			mate,
			faceWidth,
			gearMaterial: input.gear.material,
			mateMaterial: input.mate.material,
			dynamicForce: designForce === null || velocityFactor === null ? null : designForce * velocityFactor
		},
		recorder
	);
	answer.wearStrength = wear.strength;
	answer.figures.wear = wear.figures;
	if (wear.refusal) answer.reviews.push(wear.refusal);
	return answer;
}

/** Where the mate states nothing it must be as the gear is, or it would not mesh. */
function matePart(gear: Gear, mate: Mate): ToothedPart {
	return {
		kind: mate.kind,
		teeth: mate.teeth,
		pitch: mate.pitch ?? gear.pitch,
		plane: mate.plane ?? gear.plane,
		pressureAngle: mate.pressureAngle ?? gear.pressureAngle,
		form: mate.form ?? gear.form,
		profileShift: mate.profileShift,
		helixAngle: mate.helixAngle ?? gear.helixAngle,
		tipWear: mate.tipWear,
		toothThickness: mate.toothThickness
	};
}

/** Needs the mate's own form and material: an assumed form is good enough to mesh, not to bear a load. */
function mateBending(
	{ input, rules, faceWidth, designForce, velocityFactor }: PairQuestion,
	member: Member,
	recorder: Recorder
): { strength: number | null; figures: Outcome['mateBending'] } {
	const { mate, drive } = input;
	if (!mate?.form || !mate.material) return { strength: null, figures: null };
	const { formFactor } = formFactorOf(member, mate.form, rules.formFactor, recorder).figures;
	if (formFactor === null) return { strength: null, figures: null };

	const { strength, figures } = memberBending(
		{ member, material: mate.material, faceWidth, formFactor },
		{ rules, reversing: drive.bending === 'reversing', designForce, velocityFactor },
		recorder
	);
	const { bendingStress, bendingMargin, allowableBending } = figures;
	if (bendingStress === null || bendingMargin === null) return { strength, figures: null };
	return { strength, figures: { bendingStress, allowableBending, bendingMargin } };
}
