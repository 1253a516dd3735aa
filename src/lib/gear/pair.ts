/**
 * What the mate adds: whether the two mesh, what the mate's teeth bear in bending, and what the flanks of both bear
 * in wear. Null where the input does not allow it, with the reason why.
 */
import type { EvaluateInput, Gear, Mate, Outcome, Reason, Rules, ToothedPart } from './contract';
import { pairingWarnings } from './hardness-pairing';
import {
	BENDING_ONLY,
	MATE_BENDING_NOT_KNOWN,
	MATE_TEETH_MISSING,
	mateToothRefusal,
	WEAR_NOT_KNOWN
} from './mate-refusals';
import { memberOf, type Member } from './member';
import { meshOf } from './mesh';
import {
	basePitchRefusal,
	helixRefusal,
	jamRefusal,
	kindsRefusal,
	MATE_HELIX_MISSING
} from './mesh-refusals';
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
	/** Send it to review at best. */
	reviews: Reason[];
	warnings: Reason[];
	/** What a verdict does not cover, because the input does not tell enough of the mate. */
	scope: Reason[];
}

/** Of what a mesh is told: these leave too much in doubt for a verdict that stands alone. */
const REVIEWED: readonly string[] = ['contact-ratio-low', 'no-backlash', 'interference'];

export function pairOf(question: PairQuestion, recorder: Recorder): PairAnswer {
	const { input, gear, faceWidth } = question;
	const none: PairAnswer = {
		figures: { mesh: null, mateBending: null, wear: null },
		mateStrength: null,
		wearStrength: null,
		refusals: [],
		reviews: [],
		warnings: [],
		scope: [BENDING_ONLY]
	};
	if (!input.mate) return none;
	if (lacksHelix(input.gear, input.mate)) return { ...none, refusals: [MATE_HELIX_MISSING] };
	const mate = memberOf(matePart(input.gear, input.mate));
	const warnings = pairingWarnings(input.gear, input.mate);
	if (!hasTeeth(gear) || !hasTeeth(mate)) {
		const refusals = [basePitchRefusal, helixRefusal, kindsRefusal].map((refusal) => refusal(gear, mate));
		const scope = hasTeeth(mate) ? none.scope : [MATE_TEETH_MISSING];
		const said = refusals.filter((reason) => reason !== null);
		return { ...none, refusals: withoutEcho(said, input.mate), warnings, scope };
	}

	const centreDistance = input.mate.centreDistance ? toSI(input.mate.centreDistance) : null;
	const mesh = meshOf({ gear, mate, centreDistance, faceWidth }, recorder);
	const jam = jamRefusal(mesh.figures?.normalBacklash ?? null, gear.normalModule);
	const refused = withoutEcho(mesh.refusals, input.mate);
	const meshing = {
		...none,
		figures: { ...none.figures, mesh: mesh.figures },
		refusals: jam ? [...refused, jam] : refused,
		reviews: mesh.warnings.filter(({ code }) => REVIEWED.includes(code)),
		warnings: [...mesh.warnings.filter(({ code }) => !REVIEWED.includes(code)), ...warnings]
	};
	if (meshing.refusals.length > 0) return meshing;

	const bending = mateBending(question, mate, recorder.mate());
	const wear = wearOf(wearQuestion(question, mate), recorder);
	return {
		...meshing,
		figures: { mesh: mesh.figures, mateBending: bending.figures, wear: wear.figures },
		mateStrength: bending.strength,
		wearStrength: wear.strength,
		reviews: [...meshing.reviews, ...[bending.refusal, wear.refusal].filter((reason) => reason !== null)],
		scope: scopeOf(isUnknown(wear), isUnknown(bending))
	};
}

/** A spur mate has no helix; where another states nothing it must be as the gear is, or it would not mesh. */
function matePart(gear: Gear, mate: Mate): ToothedPart {
	return {
		kind: mate.kind,
		teeth: mate.teeth,
		pitch: mate.pitch ?? gear.pitch,
		plane: mate.plane ?? gear.plane,
		pressureAngle: mate.pressureAngle ?? gear.pressureAngle,
		form: mate.form ?? gear.form,
		profileShift: mate.profileShift,
		helixAngle: mate.helixAngle ?? (mate.kind === 'spur' ? 0 : gear.helixAngle),
		tipWear: mate.tipWear,
		toothThickness: mate.toothThickness
	};
}

/** A helical mate can take over the helix of the gear, where that has one. */
function lacksHelix({ helixAngle = 0 }: Gear, mate: Mate): boolean {
	return mate.kind === 'helical' && mate.helixAngle === undefined && helixAngle === 0;
}

/** A pitch that a mate took over from its gear differs in the normal plane by the helix alone: that is said already. */
function withoutEcho(refusals: Reason[], { pitch, pressureAngle }: Mate): Reason[] {
	const stated = pitch !== undefined || pressureAngle !== undefined;
	const helix = refusals.some(({ code }) => code === 'mate-helix-differs');
	return stated || !helix ? refusals : refusals.filter(({ code }) => code !== 'mate-pitch-differs');
}

function hasTeeth({ kind, teeth }: Member): boolean {
	return kind === 'rack' || teeth !== null;
}

function isUnknown({ strength, refusal }: { strength: number | null; refusal: Reason | null }): boolean {
	return strength === null && refusal === null;
}

function scopeOf(wearUnknown: boolean, bendingUnknown: boolean): Reason[] {
	if (wearUnknown && bendingUnknown) return [BENDING_ONLY];
	if (wearUnknown) return [WEAR_NOT_KNOWN];
	return bendingUnknown ? [MATE_BENDING_NOT_KNOWN] : [];
}

function wearQuestion({ input, gear, faceWidth, designForce, velocityFactor }: PairQuestion, mate: Member) {
	return {
		gear,
		mate,
		faceWidth,
		gearMaterial: input.gear.material,
		mateMaterial: input.mate?.material,
		dynamicForce: designForce === null || velocityFactor === null ? null : designForce * velocityFactor
	};
}

interface MateBending {
	strength: number | null;
	figures: Outcome['mateBending'];
	refusal: Reason | null;
}

/** Needs the mate's own form and material: an assumed form is good enough to mesh, not to bear a load. */
function mateBending(
	{ input, rules, faceWidth, designForce, velocityFactor }: PairQuestion,
	member: Member,
	recorder: Recorder
): MateBending {
	const { mate, drive } = input;
	const none: MateBending = { strength: null, figures: null, refusal: null };
	if (!mate?.form || !mate.material) return none;
	const { figures: form, refusal } = formFactorOf(member, mate.form, rules.formFactor, recorder);
	if (form.formFactor === null) return { ...none, refusal: refusal && mateToothRefusal(refusal) };

	const { strength, figures } = memberBending(
		{ member, material: mate.material, faceWidth, formFactor: form.formFactor },
		{ rules, reversing: drive.bending === 'reversing', designForce, velocityFactor },
		recorder
	);
	const { bendingStress, bendingMargin, allowableBending } = figures;
	if (bendingStress === null || bendingMargin === null) return { ...none, strength };
	return { ...none, strength, figures: { bendingStress, allowableBending, bendingMargin } };
}
