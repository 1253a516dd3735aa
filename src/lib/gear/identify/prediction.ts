/**
 * What a gear of a kind would show in each reading, as a line in three things that nobody sees: its profile shift, what
 * its tips have lost and what its teeth have lost in thickness, all in modules. Lengths in mm, angles in radians.
 */
import { involute } from '../involute';
import { overPins } from '../measure/over-pins';
import { basePitch } from '../measure/span';
import type { Kind } from './candidates';
import type { OutsideDiameterReading } from './contract';
import type { Observation } from './observations';

/** A gear of a kind with a tooth count, seen at a helix angle. */
export interface Hypothesis {
	kind: Kind;
	teeth: number;
	/** Radians. */
	helixAngle: number;
	mateTeeth: number | null;
	/** In modules: of the two that full depth is met with. */
	dedendum: number;
	taken: NonNullable<OutsideDiameterReading['taken']> | 'tip-to-bottom';
}

/** Value at nominal, and what a module of shift, tip loss and thickness loss would add, mm. */
export interface Prediction {
	nominal: number;
	shift: number;
	tip: number;
	thickness: number;
	/** How far gears of this kind differ from each other in this reading, mm. */
	own: number;
}

export function predict(observation: Observation, hypothesis: Hypothesis): Prediction {
	const { kind, teeth, helixAngle, mateTeeth, dedendum } = hypothesis;
	const m = kind.module;
	const addendum = kind.form === 'stub' ? 0.8 : 1;
	const angle = (kind.pressureAngle * Math.PI) / 180;
	const cosine = Math.cos(helixAngle);
	/** Pitch diameter in normal modules. */
	const across = teeth / cosine;
	const machined = 0.004 * m;
	switch (observation.reading) {
		case 'outsideDiameter':
			return outsideDiameter(hypothesis, { m, addendum, across });
		case 'wholeDepth':
			return { nominal: m * (addendum + dedendum), shift: 0, tip: -m, thickness: 0, own: 0.02 * m };
		case 'rootDiameter':
			return { nominal: m * (across - 2 * dedendum), shift: 2 * m, tip: 0, thickness: 0, own: 0.03 * m };
		case 'spans': {
			const transverse = Math.atan(Math.tan(angle) / cosine);
			const k = observation.spanTeeth ?? 2;
			return {
				nominal: basePitch(m, angle) * (k - 0.5) + m * Math.cos(angle) * teeth * involute(transverse),
				shift: 2 * m * Math.sin(angle),
				tip: 0,
				thickness: -m * Math.cos(angle),
				own: machined
			};
		}
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
				own: machined
			};
		}
		case 'chordalThickness':
			return {
				nominal: m * across * Math.sin(Math.PI / 2 / across),
				shift: 2 * m * Math.tan(angle),
				tip: 0,
				thickness: -m,
				own: machined
			};
		case 'centreDistance':
			return {
				nominal: (m * (across + (mateTeeth ?? 0) / cosine)) / 2,
				shift: 0.5 * m,
				tip: 0,
				thickness: 0,
				// The mate's own shift, and bearings that have worn.
				own: 0.06 * m
			};
		case 'circularPitch':
			return { nominal: (Math.PI * m) / cosine, shift: 0, tip: 0, thickness: 0, own: machined };
	}
}

interface Size {
	m: number;
	addendum: number;
	across: number;
}

/**
 * Over two tips of an odd count a chord is read; with a flat jaw over the two tips opposite, its height; and with a
 * point in the gap opposite, down to the bottom.
 */
function outsideDiameter({ teeth, dedendum, taken }: Hypothesis, { m, addendum, across }: Size): Prediction {
	if (taken === 'tip-to-bottom') {
		const nominal = m * (across + addendum - dedendum);
		return { nominal, shift: 2 * m, tip: -m, thickness: 0, own: 0.02 * m };
	}
	const odd = teeth % 2 === 1;
	const chord = Math.cos(Math.PI / (2 * teeth));
	const share = !odd || taken === 'pi-tape' ? 1 : taken === 'over-tips' ? chord : chord * chord;
	return {
		nominal: share * m * (across + 2 * addendum),
		shift: 2 * m * share,
		tip: -2 * m * share,
		thickness: 0,
		own: 0.004 * m
	};
}
