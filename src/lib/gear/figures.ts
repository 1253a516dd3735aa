/**
 * Every figure of one gear in one drive that the input allows, in the order of a hand calculation. What cannot be
 * computed is null and has its refusal. `evaluate` and the capacity curve both come through here.
 */
import type { EvaluateInput, Gear, Mate, Outcome, Reason, Rules } from './contract';
import {
	bendingMargin,
	lewisBendingStress,
	permittedForce,
	permittedPowerOf,
	permittedTorqueOf,
	reversingAllowable,
	type LewisTooth
} from './bending';
import { handbookRefusal, lewisFormFactor } from './form-factor';
import { designForce, tangentialForce } from './load';
import { circularPitchOf, diametralPitchOf, moduleOf, pitchDiameter } from './pitch';
import { formRuleRefusal, kindRefusal, mateRefusal, missingRefusals, speedRefusal } from './refusals';
import { rulesOf, uncertaintyOf } from './rules';
import { SOURCES } from './sources';
import { lowEnd, stressUncertainty } from './uncertainty';
import {
	barthVelocityFactor,
	pitchLineVelocity,
	velocityEnd,
	velocityFactorShare,
	velocityLawOf
} from './velocity';
import type { Recorder } from './working';

/** The part of the outcome that is worked out here; names and units as there. */
export type Figures = Pick<
	Outcome,
	| 'pitchDiameter'
	| 'module'
	| 'diametralPitch'
	| 'circularPitch'
	| 'pitchLineVelocity'
	| 'velocityLaw'
	| 'velocityFactor'
	| 'formFactor'
	| 'formFactorHandbook'
	| 'tangentialForce'
	| 'designForce'
	| 'bendingStress'
	| 'allowableBending'
	| 'bendingMargin'
	| 'bendingMarginLow'
	| 'permittedPower'
	| 'permittedTorque'
>;

export const NO_FIGURES: Figures = {
	pitchDiameter: null,
	module: null,
	diametralPitch: null,
	circularPitch: null,
	pitchLineVelocity: null,
	velocityLaw: null,
	velocityFactor: null,
	formFactor: null,
	formFactorHandbook: null,
	tangentialForce: null,
	designForce: null,
	bendingStress: null,
	allowableBending: null,
	bendingMargin: null,
	bendingMarginLow: null,
	permittedPower: null,
	permittedTorque: null
};

export interface FiguresAnswer {
	figures: Figures;
	/** Relative standard uncertainty of stress and margin. */
	marginUncertainty: number | null;
	refusals: Reason[];
}

export function figuresOf(input: EvaluateInput, recorder: Recorder): FiguresAnswer {
	const { gear, mate, drive } = input;
	const rules = rulesOf(input.rules);
	const kind = kindRefusal(gear);
	if (kind) return { figures: NO_FIGURES, marginUncertainty: null, refusals: [kind] };

	const figures = { ...NO_FIGURES };
	const refusals: (Reason | null)[] = [
		mateRefusal(gear, mate),
		...missingRefusals(input),
		formRuleRefusal(rules)
	];
	const answer = (marginUncertainty: number | null = null): FiguresAnswer => ({
		figures,
		marginUncertainty,
		refusals: refusals.filter((reason) => reason !== null)
	});

	const module = moduleOf(gear.pitch, recorder);
	figures.module = module;
	figures.diametralPitch = diametralPitchOf(module);
	figures.circularPitch = circularPitchOf(module);
	if (gear.teeth === undefined) return answer();
	const diameter = pitchDiameter(module, gear.teeth, recorder);
	figures.pitchDiameter = diameter;

	const velocity = drive.speed
		? pitchLineVelocity(
				diameter,
				recorder.given({ symbol: 'n', name: 'speed of this gear', unit: 'rpm' }, drive.speed),
				recorder
			)
		: null;
	figures.pitchLineVelocity = velocity;
	figures.tangentialForce = tangentialForce(drive.load, diameter, velocity, recorder);
	if (figures.tangentialForce !== null) {
		figures.designForce = designForce(figures.tangentialForce, drive.serviceFactor, recorder);
	}

	const law = velocityLawOf(gear.finish, gear.material.metallic, rules.cutLaw);
	figures.velocityLaw = law;
	if (velocity !== null) {
		const end = velocityEnd(law, gear.finish, rules.speedLimit);
		const byPlant = rules.speedLimit[gear.finish] !== null;
		const tooFast = speedRefusal(velocity, end, { law, finish: gear.finish, byPlant });
		refusals.push(tooFast);
		if (!tooFast) figures.velocityFactor = barthVelocityFactor(velocity, law, recorder);
	}

	const tooth = { ...gear, teeth: gear.teeth };
	const notInTable = handbookRefusal(tooth);
	if (rules.formFactor === 'handbook') refusals.push(notInTable);
	if (!notInTable) {
		figures.formFactorHandbook = lewisFormFactor(tooth, recorder);
		if (rules.formFactor === 'handbook') figures.formFactor = figures.formFactorHandbook;
	}

	const faceWidth = smallerFaceWidth(gear, mate, recorder);
	const allowable = allowableBending(gear, drive.bending === 'reversing', rules, recorder);
	figures.allowableBending = allowable;

	const { formFactor, velocityFactor } = figures;
	if (formFactor === null || velocityFactor === null || velocity === null) return answer();
	const lewis: LewisTooth = { faceWidth, module, formFactor, velocityFactor };

	const share = velocityFactorShare(velocity, law, recorder);
	const uncertainty = stressUncertainty(uncertaintyOf(input.uncertainty), drive.load, share, recorder);
	if (figures.designForce !== null) {
		figures.bendingStress = lewisBendingStress(figures.designForce, lewis, recorder);
		figures.bendingMargin = bendingMargin(allowable, figures.bendingStress, recorder);
		figures.bendingMarginLow = lowEnd(figures.bendingMargin, uncertainty, recorder);
	}
	const force = permittedForce(allowable, lewis, drive.serviceFactor, rules.bendingMargin, recorder);
	figures.permittedPower = permittedPowerOf(force, velocity, recorder);
	figures.permittedTorque = permittedTorqueOf(force, diameter, recorder);
	return answer(uncertainty);
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

function allowableBending(gear: Gear, reversing: boolean, rules: Rules, recorder: Recorder): number {
	const symbol = reversing ? 'Sa' : 'Sb';
	const line = { symbol, name: 'allowable bending stress of the material', unit: 'MPa' };
	const allowable = recorder.given(line, gear.material.allowableBending);
	return reversing ? reversingAllowable(allowable, rules.reversingFactor, recorder) : allowable;
}
