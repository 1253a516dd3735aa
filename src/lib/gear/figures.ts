/**
 * Every figure of one gear in one drive that the input allows, in the order of a hand calculation. What cannot be
 * computed is null and has its reason. `evaluate`, the capacity curve, the comparison and the remedies all come
 * through here.
 */
import type { EvaluateInput, Gear, Limit, LimitName, Mate, Outcome, Reason, Rules } from './contract';
import { permittedForce, permittedPowerOf, permittedTorqueOf } from './bending';
import { driveOf, type DriveAnswer } from './drive';
import { memberOf } from './member';
import { pairOf } from './pair';
import { pairUncertainty, type PairLaws } from './pair-law';
import { circularPitchOf, diametralPitchOf, pitchDiameter } from './pitch';
import { kindReview, mateLawTold, missingRefusals } from './refusals';
import { rulesOf, uncertaintyOf } from './rules';
import { SOURCES } from './sources';
import { formFactorOf, memberBending } from './strength';
import { isPower, lowEnd, type MarginUncertainty } from './uncertainty';
import type { Recorder } from './working';

/** The part of the outcome that is worked out here; names and units as there. */
export type Figures = Omit<Outcome, 'core' | 'original' | 'verdict' | 'reasons' | 'remedies' | 'working'>;

export const NO_FIGURES: Figures = {
	pitchDiameter: null,
	module: null,
	normalModule: null,
	diametralPitch: null,
	circularPitch: null,
	pitchLineVelocity: null,
	velocityLaw: null,
	velocityFactor: null,
	formFactor: null,
	formFactorSource: null,
	formFactorHandbook: null,
	formFactorGeometry: null,
	stressConcentration: null,
	tangentialForce: null,
	designForce: null,
	bendingStress: null,
	allowableBending: null,
	bendingMargin: null,
	bendingMarginLow: null,
	permittedPower: null,
	permittedTorque: null,
	limits: [],
	limitedBy: null,
	wear: null,
	mateBending: null,
	mesh: null
};

/** A dynamic force in N (velocity and service factors in) that one of the pair's answers bears, and its margin. */
export interface Strength {
	answer: LimitName;
	force: number;
	needed: number;
}

export interface FiguresAnswer {
	figures: Figures;
	laws: PairLaws;
	strengths: Strength[];
	uncertainty: MarginUncertainty | null;
	/** Make it `cannot-say`. */
	refusals: Reason[];
	/** Send it to review at best. */
	reviews: Reason[];
	/** Are told, and change no verdict. */
	warnings: Reason[];
	/** What a verdict does not cover. */
	scope: Reason[];
}

export function figuresOf(input: EvaluateInput, recorder: Recorder): FiguresAnswer {
	const { gear, mate, drive } = input;
	const rules = rulesOf(input.rules);

	const member = memberOf(gear, recorder);
	const size = {
		module: member.transverseModule,
		normalModule: member.normalModule,
		diametralPitch: diametralPitchOf(member.transverseModule),
		circularPitch: circularPitchOf(member.transverseModule),
		pitchDiameter:
			member.teeth === null ? null : pitchDiameter(member.transverseModule, member.teeth, recorder)
	};
	const onPitchLine = driveOf(input, member, rules, recorder);
	const { velocityFactor, velocityLaw, designForce } = onPitchLine.figures;
	const hasTeeth = gear.kind === 'rack' || member.teeth !== null;
	const form = hasTeeth ? formFactorOf(member, gear.form, rules.formFactor, recorder) : null;

	const faceWidth = smallerFaceWidth(gear, mate, recorder);
	const bending = memberBending(
		{ member, material: gear.material, faceWidth, formFactor: form?.figures.formFactor ?? null },
		{ rules, reversing: drive.bending === 'reversing', designForce, velocityFactor },
		recorder
	);
	const pair = pairOf({ input, rules, gear: member, faceWidth, velocityFactor, designForce }, recorder);

	const strengths = [
		{ answer: 'gear-bending', force: bending.strength, needed: rules.bendingMargin },
		{ answer: 'wear', force: pair.wearStrength, needed: rules.wearMargin },
		{ answer: 'mate-bending', force: pair.mateStrength, needed: rules.bendingMargin }
	].filter((strength): strength is Strength => strength.force !== null);
	const figures = {
		...NO_FIGURES,
		...size,
		...onPitchLine.figures,
		...form?.figures,
		...bending.figures,
		...pair.figures
	};
	const uncertainty = uncertaintyAt(input, onPitchLine, recorder);
	// Of two that do not mesh nothing is carried, so no answer can decide.
	const meshes = pair.refusals.length === 0;
	const review = kindReview(gear.kind, mate?.kind);
	return {
		figures: {
			...figures,
			...marginsOf(figures, { rules, meshes, uncertainty }, recorder),
			...(meshes && permittedOf(strengths, figures, drive.serviceFactor, recorder))
		},
		laws: onPitchLine.laws,
		strengths,
		uncertainty,
		refusals: [
			...pair.refusals,
			...missingRefusals(input),
			...[onPitchLine.refusal, form?.refusal ?? null].filter((reason) => reason !== null)
		],
		reviews: review ? [review, ...pair.reviews] : pair.reviews,
		warnings:
			onPitchLine.byMate && velocityLaw ? [...pair.warnings, mateLawTold(velocityLaw)] : pair.warnings,
		scope: pair.scope
	};
}

function uncertaintyAt(
	{ drive, uncertainty }: EvaluateInput,
	{ figures: { pitchLineVelocity, velocityFactor }, laws }: DriveAnswer,
	recorder: Recorder
): MarginUncertainty | null {
	if (pitchLineVelocity === null || velocityFactor === null) return null;
	const doubt = { uncertainty: uncertaintyOf(uncertainty), byPower: isPower(drive.load) };
	return pairUncertainty(pitchLineVelocity, laws, doubt, recorder);
}

function marginsOf(
	figures: Figures,
	{ rules, meshes, uncertainty }: { rules: Rules; meshes: boolean; uncertainty: MarginUncertainty | null },
	recorder: Recorder
): Pick<Figures, 'bendingMarginLow' | 'limits' | 'limitedBy'> {
	if (!uncertainty) return { bendingMarginLow: null, limits: [], limitedBy: null };
	const { badEnd } = uncertainty;
	const limits = meshes ? limitsOf(figures, rules, badEnd) : [];
	return {
		bendingMarginLow: figures.bendingMargin === null ? null : lowEnd(figures.bendingMargin, badEnd, recorder),
		limits,
		limitedBy: decidingOf(limits)?.answer ?? null
	};
}

const DECIDES = {
	symbol: 'Wb',
	name: 'dynamic force that the answer that decides bears',
	unit: 'N',
	source: SOURCES.definition
};
const BY_TOOTH = { ...DECIDES, expression: 'WL' };
const BY_FLANKS = { ...DECIDES, expression: 'Ww' };

/** Where the gear's own teeth cannot be judged, nothing can be stated of the pair. */
function permittedOf(
	strengths: Strength[],
	{ velocityFactor, pitchLineVelocity: velocity, pitchDiameter: diameter }: Figures,
	serviceFactor: number,
	recorder: Recorder
): Pick<Figures, 'permittedPower' | 'permittedTorque'> {
	const weakest = leastOf(strengths, ({ force, needed }) => force / needed);
	const judged = strengths.some(({ answer }) => answer === 'gear-bending');
	if (!weakest || !judged || velocityFactor === null || velocity === null) {
		return { permittedPower: null, permittedTorque: null };
	}
	const factors = { needed: weakest.needed, serviceFactor, velocityFactor };
	const { answer, force: bears } = weakest;
	const borne =
		answer === 'wear'
			? recorder.step(BY_FLANKS, { Ww: bears }, ({ Ww }) => Ww)
			: (answer === 'mate-bending' ? recorder.mate() : recorder).step(
					BY_TOOTH,
					{ WL: bears },
					({ WL }) => WL
				);
	const force = permittedForce(borne, factors, recorder);
	return {
		permittedPower: permittedPowerOf(force, velocity, recorder),
		permittedTorque: diameter === null ? null : permittedTorqueOf(force, diameter, recorder)
	};
}

/** The answer with the least of what it needs: it decides. */
export function decidingOf(limits: Limit[]): Limit | null {
	return leastOf(limits, ({ margin, needed }) => margin / needed);
}

function leastOf<T>(of: T[], measure: (one: T) => number): T | null {
	return of.reduce<T | null>((found, one) => (found && measure(found) <= measure(one) ? found : one), null);
}

/** Wear is limited twice, by Hertz and by Buckingham: the lower margin counts. */
function limitsOf({ bendingMargin, wear, mateBending }: Figures, needed: Rules, badEnd: number): Limit[] {
	const limit = (answer: LimitName, margin: number | undefined | null, needed: number): Limit[] =>
		margin === undefined || margin === null
			? []
			: [{ answer, margin, marginLow: lowEnd(margin, badEnd), needed }];
	return [
		...limit('gear-bending', bendingMargin, needed.bendingMargin),
		...limit('wear', wear && Math.min(wear.contactMargin, wear.wearLoadMargin), needed.wearMargin),
		...limit('mate-bending', mateBending?.bendingMargin, needed.bendingMargin)
	];
}

/** The load is carried only where both gears have teeth: the smaller face width counts. */
function smallerFaceWidth(gear: Gear, mate: Mate | undefined, recorder: Recorder): number {
	if (!mate?.faceWidth)
		return recorder.given({ symbol: 'F', name: 'face width', unit: 'mm' }, gear.faceWidth);
	const own = recorder.given({ symbol: 'F1', name: 'face width of this gear', unit: 'mm' }, gear.faceWidth);
	const mates = recorder.given({ symbol: 'F2', name: 'face width of the mate', unit: 'mm' }, mate.faceWidth);
	return recorder.step(
		{
			symbol: 'F',
			name: 'face width that carries, the smaller of the pair',
			expression: 'min(F1, F2)',
			unit: 'mm',
			source: SOURCES.lewis
		},
		{ F1: own, F2: mates },
		({ F1, F2 }) => Math.min(F1, F2)
	);
}
