/**
 * The plant's rules and the uncertainties, with what counts where a check does not state them.
 * The defaults are those of the calculation contract.
 */
import type { Rules, Uncertainty } from './contract';

const DEFAULT_RULES: Rules = {
	formFactor: 'handbook',
	cutLaw: 1200,
	bendingMargin: 1,
	wearMargin: 1,
	reversingFactor: 0.7,
	speedLimit: { cast: null, cut: null, hobbed: null, ground: null }
};

/** Common practice: a calliper over the face, a nameplate's power, a nameplate's speed. */
const DEFAULT_UNCERTAINTY: Uncertainty = { faceWidth: 0.01, load: 0.1, speed: 0.01 };

export function rulesOf(rules: Partial<Rules> = {}): Rules {
	return {
		formFactor: rules.formFactor ?? DEFAULT_RULES.formFactor,
		cutLaw: rules.cutLaw ?? DEFAULT_RULES.cutLaw,
		bendingMargin: rules.bendingMargin ?? DEFAULT_RULES.bendingMargin,
		wearMargin: rules.wearMargin ?? DEFAULT_RULES.wearMargin,
		reversingFactor: rules.reversingFactor ?? DEFAULT_RULES.reversingFactor,
		speedLimit: rules.speedLimit ?? DEFAULT_RULES.speedLimit
	};
}

export function uncertaintyOf(uncertainty: Partial<Uncertainty> = {}): Uncertainty {
	return {
		faceWidth: uncertainty.faceWidth ?? DEFAULT_UNCERTAINTY.faceWidth,
		load: uncertainty.load ?? DEFAULT_UNCERTAINTY.load,
		speed: uncertainty.speed ?? DEFAULT_UNCERTAINTY.speed
	};
}
