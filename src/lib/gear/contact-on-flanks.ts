/**
 * What is left of the path of contact where both members have a flank: an undercut root, or a fillet that begins high,
 * takes the involute away before the line of action leaves the base circle. The limits of contact are judged by this.
 */
import { pathEnds, type MeshGeometry } from './contact-path';
import type { Reason } from './contract';
import { sine, toDegrees } from './degrees';
import { baseDiameter, type Member } from './member';
import { straightDepth, type BasicRack } from './rack';
import { rackApart } from './rack-reach';
import { SOURCES } from './sources';
import { flankStart, isUndercutBy } from './tooth';
import type { Recorder } from './working';

export interface FlankContact {
	/** Length in mm; null where the beginning of a flank is not known, as on an internal wheel that a shaper cut. */
	path: number | null;
	/** Teeth that are undercut further than their shape can be worked out. */
	refusal: Reason | null;
}

/**
 * Length Zu of the path of contact in mm between the beginnings of both flanks, √(rf² - rb²) from where the line of
 * action leaves each base circle, rf the radius at which the generated fillet ends. It is written into the working where it
 * is shorter than the published path from tip to tip.
 * Range: external gears and racks; an internal wheel's own root is not counted.
 * Source: generation by the rack (`flankStart`); Bevan, The Theory of Machines, Ex. 10.4, p. 334, for the line of action.
 */
export function pathOnFlanks(geometry: MeshGeometry, recorder: Recorder): FlankContact {
	const { pinion, wheel, operatingAngle } = geometry;
	const own = flankOf(pinion);
	const wheels = wheel.teeth === null || wheel.kind === 'internal' ? null : flankOf(wheel);
	if (own === 'not-known' || wheels === 'not-known') {
		const refusal = [pinion, wheel].some(isUndercut) ? UNDERCUT_OF_PAIR_TOO_DEEP : null;
		return { path: null, refusal };
	}
	const { begins, ends, wheelTangent, pitchPoint } = pathEnds(geometry);
	const αw = toDegrees(operatingAngle);
	const depth =
		wheel.teeth === null
			? straightDepth(wheel.rack) * wheel.normalModule + rackApart(pinion, wheel)
			: Infinity;
	const wheelsEnd = wheels ? wheelTangent - wheels.reach : pitchPoint + depth / sine(αw);
	const path = Math.max(0, Math.min(ends, wheelsEnd) - Math.max(begins, own.reach));
	if (path >= ends - begins) return { path, refusal: null };

	const [Zf1, Zf2] = [written(own, 1, recorder), wheels ? written(wheels, 2, recorder) : 0];
	const rackDepth = 'min(Ze, A + hf / sin(αw))';
	const end = wheels ? 'min(Ze, A - Zf2)' : depth === Infinity ? 'Ze' : rackDepth;
	recorder.step(
		{
			symbol: 'Zu',
			name: 'path of contact between the beginnings of the flanks',
			expression: `max(0, ${end} - max(Zb, Zf1))`,
			unit: 'mm',
			source: SOURCES.generatedFlank
		},
		{
			Ze: ends,
			Zb: begins,
			Zf1,
			Zf2,
			A: wheels ? wheelTangent : pitchPoint,
			hf: depth,
			αw
		},
		() => path
	);
	return { path, refusal: null };
}

/** Whether the rack that generates the member cuts into its involute at the root. */
export function isUndercut(member: Member): boolean {
	const { kind, teeth } = member;
	if (teeth === null || kind === 'internal') return false;
	const { rack, profileShift } = transverse(member);
	return isUndercutBy(rack, teeth, profileShift);
}

/** Radii in mm, and the distance between them along the line of action. */
interface Flank {
	form: number;
	base: number;
	reach: number;
}

function flankOf(member: Member): Flank | 'not-known' {
	const start = flankStart({ teeth: member.teeth ?? NaN, ...transverse(member) });
	if ('code' in start) return 'not-known';
	const form = start.formRadius * member.transverseModule;
	const base = (baseDiameter(member) ?? 0) / 2;
	return { form, base, reach: Math.sqrt(Math.max(0, form - base) * (form + base)) };
}

/**
 * The rack of a member in its transverse plane, in transverse modules. A helical rack's tip is there an ellipse; the circle
 * taken for it is as deep and leaves the flank at the same depth.
 */
function transverse({ rack, normalModule, transverseModule, transverseAngle, profileShift }: Member): {
	rack: BasicRack;
	profileShift: number;
} {
	const share = normalModule / transverseModule;
	const rounded = (rack.dedendum - straightDepth(rack)) * share;
	return {
		rack: {
			addendum: rack.addendum * share,
			dedendum: rack.dedendum * share,
			tipRadius: rounded / (1 - Math.sin(transverseAngle)),
			pressureAngle: transverseAngle
		},
		profileShift: profileShift * share
	};
}

function written({ form, base }: Flank, place: 1 | 2, recorder: Recorder): number {
	const who = place === 1 ? 'of the pinion' : 'of the wheel';
	const [rf, rb] = [`rf${place}`, `rb${place}`];
	recorder.step(
		{
			symbol: rf,
			name: `radius where the flank begins ${who}`,
			expression: 'from the generated tooth',
			unit: 'mm',
			source: SOURCES.generatedFlank
		},
		{},
		() => form
	);
	return recorder.step(
		{
			symbol: `Zf${place}`,
			name: `from the base circle to where the flank begins ${who}, along the line of action`,
			expression: `√(max(0, ${rf} - ${rb}) · (${rf} + ${rb}))`,
			unit: 'mm',
			source: SOURCES.mesh
		},
		{ [rf]: form, [rb]: base },
		() => Math.sqrt(Math.max(0, form - base) * (form + base))
	);
}

const UNDERCUT_OF_PAIR_TOO_DEEP: Reason = {
	code: 'contact-not-known',
	text: 'The teeth of one of the two are undercut so deep that no flank is left below its pitch circle: what contact remains cannot be worked out. Check counts, angle and shifts of both, or have the pair rated by an engineer.'
};
