/**
 * What a gear of a kind would show in each reading, as a line in what nobody sees: its profile shift, what its
 * tips have lost and what its teeth have lost in thickness, all in modules, and how far its helix stands off from what
 * was read. Lengths in mm, angles in radians.
 */
import { overPins } from '../measure/over-pins';
import type { Hypothesis, Prediction } from './hypothesis';
import type { Observation } from './observations';
import { spanPrediction } from './span-prediction';

export function predict(observation: Observation, hypothesis: Hypothesis): Prediction {
	const { kind, teeth, helixAngle, mateTeeth, dedendum } = hypothesis;
	const m = kind.module;
	const addendum = kind.form === 'stub' ? 0.8 : 1;
	const angle = (kind.pressureAngle * Math.PI) / 180;
	const cosine = Math.cos(helixAngle);
	/** Pitch diameter in normal modules. */
	const across = teeth / cosine;
	/** What a radian of helix adds to it: the slope of 1 / cos β. */
	const widening = across * Math.tan(helixAngle);
	const machined = 0.004 * m;
	switch (observation.reading) {
		case 'outsideDiameter':
			return outsideDiameter(hypothesis, { m, addendum, across, widening });
		case 'wholeDepth':
			return {
				nominal: m * (addendum + dedendum),
				shift: 0,
				tip: -m,
				thickness: 0,
				helix: 0,
				logChance: 0,
				own: 0.02 * m
			};
		case 'rootDiameter':
			return {
				nominal: m * (across - 2 * dedendum),
				shift: 2 * m,
				tip: 0,
				thickness: 0,
				helix: m * widening,
				logChance: 0,
				own: 0.03 * m
			};
		case 'spans':
			return spanPrediction(observation.spanTeeth ?? 2, hypothesis);
		case 'overPins': {
			const pin = observation.pin ?? 0;
			const at = (thickness: number) =>
				overPins({ teeth, module: m, pressureAngle: angle, thickness: thickness * m }, pin);
			const step = 0.02;
			const perModule = (at(Math.PI / 2 + step) - at(Math.PI / 2 - step)) / (2 * step);
			return {
				nominal: at(Math.PI / 2),
				shift: 2 * Math.tan(angle) * perModule,
				tip: 0,
				thickness: -perModule,
				helix: 0,
				logChance: 0,
				own: machined
			};
		}
		case 'chordalThickness':
			return {
				nominal: m * across * Math.sin(Math.PI / 2 / across),
				shift: 2 * m * Math.tan(angle),
				tip: 0,
				thickness: -m,
				// The arc is the same at any helix, and chord and arc hardly differ.
				helix: 0,
				logChance: 0,
				own: machined
			};
		case 'centreDistance':
			return {
				nominal: (m * (across + (mateTeeth ?? 0) / cosine)) / 2,
				shift: 0.5 * m,
				tip: 0,
				thickness: 0,
				helix: (m * widening * (1 + (mateTeeth ?? 0) / teeth)) / 2,
				logChance: 0,
				// The mate's own shift, and bearings that have worn.
				own: 0.06 * m
			};
		case 'circularPitch':
			return {
				nominal: (Math.PI * m) / cosine,
				shift: 0,
				tip: 0,
				thickness: 0,
				helix: (Math.PI * m * widening) / teeth,
				logChance: 0,
				own: machined
			};
	}
}

interface Size {
	m: number;
	addendum: number;
	across: number;
	widening: number;
}

/**
 * Over two tips of an odd count a chord is read; with a flat jaw over the two tips opposite, its height; and with a
 * point in the gap opposite, down to the bottom.
 */
function outsideDiameter(
	{ teeth, dedendum, taken }: Hypothesis,
	{ m, addendum, across, widening }: Size
): Prediction {
	if (taken === 'tip-to-bottom') {
		const nominal = m * (across + addendum - dedendum);
		return { nominal, shift: 2 * m, tip: -m, thickness: 0, helix: m * widening, logChance: 0, own: 0.02 * m };
	}
	const odd = teeth % 2 === 1;
	const chord = Math.cos(Math.PI / (2 * teeth));
	const share = !odd || taken === 'pi-tape' ? 1 : taken === 'over-tips' ? chord : chord * chord;
	return {
		nominal: share * m * (across + 2 * addendum),
		shift: 2 * m * share,
		tip: -2 * m * share,
		thickness: 0,
		helix: share * m * widening,
		logChance: 0,
		own: 0.004 * m
	};
}
