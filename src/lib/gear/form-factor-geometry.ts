/**
 * The Lewis form factor Y from the shape of the generated tooth: for every form, shift, angle and worn tip that the
 * handbook table does not hold, and beside the table where it does.
 */
import type { Reason } from './contract';
import { filletPoint, rackFilletPoint, type FilletPoint } from './fillet';
import { fewTeethRefusal } from './form-factor';
import type { BasicRack } from './rack';
import { SOURCES } from './sources';
import {
	generateTooth,
	halfThicknessAngle,
	pressureAngleAt,
	rackRefusal,
	TOOTH_POINTED,
	type ToothShape
} from './tooth';
import { unrecorded, type Recorder } from './working';

/** The section where the tooth is weakest, in modules; teeth Infinity for a rack. */
export interface WeakestSection {
	/** Thickness of the tooth there, and distance from it to where the load line meets the centre line. */
	thickness: number;
	height: number;
	teeth: number;
	rack: BasicRack;
	profileShift: number;
}

export interface GeometryFormFactor extends WeakestSection {
	Y: number;
}

/**
 * Lewis form factor Y by geometry, load at the tip. The load acts along the flank's normal at the tip corner; where
 * that line meets the tooth's centre line is the vertex of a parabola of uniform strength that is tangent to the
 * fillet. Y = t² / (6 h) in modules, t the tooth's thickness and h the height of the vertex there. Where the parabola
 * would touch the flank instead, the fillet's upper end is the weakest section of the fillet.
 * Range: 10 teeth and more, 14.5 to 25 degrees; outside it the answer is a reason, not a number.
 * Source: Lewis (1892) by layout of the generated tooth, as in the AGMA 225 tables (from memory).
 */
export function lewisFormFactorByGeometry(
	shape: ToothShape,
	recorder: Recorder = unrecorded
): GeometryFormFactor | Reason {
	const few = fewTeethRefusal(shape.teeth);
	if (few) return few;
	return recorded(remembered(shape, weakestOfTooth), recorder);
}

/**
 * The same of a rack's tooth, the limit of many teeth: straight flanks, and a fillet that is the tool's tip circle.
 * `tipWear` in modules.
 */
export function rackFormFactor(
	rack: BasicRack,
	tipWear = 0,
	recorder: Recorder = unrecorded
): GeometryFormFactor | Reason {
	const shape = { teeth: Infinity, rack, profileShift: 0, tipWear };
	return recorded(remembered(shape, weakestOfRack), recorder);
}

const source = SOURCES.generatedTooth;
const READ = { expression: 'from the generated tooth', unit: '1', source };
const THICKNESS = {
	...READ,
	symbol: 'tc',
	name: 'thickness of the tooth at its weakest section, in modules'
};
const HEIGHT = { ...READ, symbol: 'hc', name: 'height of the load above its weakest section, in modules' };
const FACTOR = {
	symbol: 'Yg',
	name: 'Lewis form factor by geometry, load at the tip',
	expression: 'tc² / (6 · hc)',
	unit: '1',
	source
};

function recorded(section: WeakestSection | Reason, recorder: Recorder): GeometryFormFactor | Reason {
	if ('code' in section) return section;
	const { thickness, height, teeth, rack, profileShift } = section;
	const terms = { tc: thickness, hc: height };
	recorder.step(THICKNESS, terms, ({ tc }) => tc);
	recorder.step(HEIGHT, terms, ({ hc }) => hc);
	const Y = recorder.step(FACTOR, terms, ({ tc, hc }) => (tc * tc) / (6 * hc));
	return { thickness, height, teeth, rack, profileShift, Y };
}

function weakestOfTooth(shape: ToothShape): WeakestSection | Reason {
	const tooth = generateTooth(shape);
	if ('code' in tooth) return tooth;
	const { teeth, rack, profileShift, baseRadius, tipRadius } = tooth;
	const load = pressureAngleAt(baseRadius, tipRadius) - halfThicknessAngle(tooth, tipRadius);
	// A flank's normal is tangent to the base circle.
	const vertex = baseRadius / Math.cos(load);
	const at = (psi: number) => filletPoint(rack, teeth, profileShift, psi);
	const weakest = weakestOf(at, vertex, tooth.formAngle);
	return weakest ? { ...weakest, teeth, rack, profileShift } : LOAD_BELOW_FILLET;
}

function weakestOfRack({ rack, tipWear }: ToothShape): WeakestSection | Reason {
	const refused = rackRefusal(rack);
	if (refused) return refused;
	const tangent = Math.tan(rack.pressureAngle);
	const height = rack.addendum - tipWear;
	const halfTip = Math.PI / 4 - height * tangent;
	if (!(halfTip > 0)) return TOOTH_POINTED;
	const vertex = height - halfTip * tangent;
	const weakest = weakestOf((psi) => rackFilletPoint(rack, psi), vertex, rack.pressureAngle);
	return weakest ? { ...weakest, teeth: Infinity, rack, profileShift: 0 } : LOAD_BELOW_FILLET;
}

const LOAD_BELOW_FILLET: Reason = {
	code: 'tooth-too-short',
	text: 'These teeth are so short that the load at the tip does not bend them: the method ends. Check addendum and dedendum.'
};

/**
 * The point of the fillet with the least x² / h, which is where a parabola from the vertex is tangent to it. A coarse
 * search finds the valley, halving finds its floor, where the tangent meets the centre line at height h above the
 * vertex: 2 h = x · slope.
 */
function weakestOf(
	at: (psi: number) => FilletPoint,
	vertex: number,
	from: number
): Pick<WeakestSection, 'thickness' | 'height'> | null {
	const steps = 24;
	const psi = (i: number) => from + ((Math.PI / 2 - from) * i) / steps;
	let lowest = 0;
	let least = Infinity;
	for (let i = 0; i <= steps; i++) {
		const { x, y } = at(psi(i));
		// A short tooth's load line may pass below the top of the fillet; there is no bending above it.
		const strength = y < vertex ? (x * x) / (vertex - y) : Infinity;
		if (strength < least) [lowest, least] = [i, strength];
	}
	if (least === Infinity) return null;
	let [falls, rises] = [psi(Math.max(0, lowest - 1)), psi(Math.min(steps, lowest + 1))];
	const stillFalls = (angle: number) => {
		const { x, y, normal } = at(angle);
		return 2 * (vertex - y) < (x * normal.x) / normal.y;
	};
	if (stillFalls(falls)) {
		for (let halving = 0; halving < 40; halving++) {
			const middle = (falls + rises) / 2;
			if (stillFalls(middle)) falls = middle;
			else rises = middle;
		}
	}
	const { x, y } = at(falls);
	return { thickness: 2 * x, height: vertex - y };
}

/** A check is answered again with every keystroke, and its teeth rarely change: their sections are kept. */
const MOST_REMEMBERED = 32;
const sections: { shape: ToothShape; section: WeakestSection | Reason }[] = [];

function remembered(
	asked: ToothShape,
	work: (shape: ToothShape) => WeakestSection | Reason
): WeakestSection | Reason {
	const known = sections.find((kept) => sameShape(kept.shape, asked));
	if (known) return known.section;
	// A copy: the caller may go on to change its shape.
	const shape = { ...asked, rack: { ...asked.rack } };
	const section = work(shape);
	sections.unshift({ shape, section });
	if (sections.length > MOST_REMEMBERED) sections.pop();
	return section;
}

function sameShape(a: ToothShape, b: ToothShape): boolean {
	return (
		a.teeth === b.teeth &&
		a.profileShift === b.profileShift &&
		a.tipWear === b.tipWear &&
		a.rack.pressureAngle === b.rack.pressureAngle &&
		a.rack.addendum === b.rack.addendum &&
		a.rack.dedendum === b.rack.dedendum &&
		a.rack.tipRadius === b.rack.tipRadius
	);
}
