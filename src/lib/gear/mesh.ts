/**
 * How two members mesh: ratio, centre distance, operating angle, contact ratio, backlash, hunting tooth, undercut and
 * interference. Lengths in mm, angles in radians inside; the figures of the contract are in mm and degrees.
 */
import { normalBacklash, type BacklashQuestion } from './backlash';
import { contactPath, interferes, type MeshGeometry } from './contact-path';
import type { Outcome, Reason } from './contract';
import { inverseInvolute, involute } from './involute';
import { isUndercut, type Member } from './member';
import {
	basePitchRefusal,
	CENTRES_TOO_CLOSE,
	discontinuousRefusal,
	helixRefusal,
	kindsRefusal
} from './mesh-refusals';
import { meshWarnings } from './mesh-warnings';
import { straightDepth } from './rack';
import { SOURCES } from './sources';
import { OUT_OF_RANGE } from './refusals';
import type { Recorder } from './working';

export interface MeshQuestion {
	gear: Member;
	/** With teeth, or a rack. */
	mate: Member;
	/** Measured, mm; null where it is not known. */
	centreDistance: number | null;
	/** The smaller of the pair, mm. */
	faceWidth: number;
}

export interface MeshAnswer {
	figures: Outcome['mesh'];
	/** They do not mesh. */
	refusals: Reason[];
	warnings: Reason[];
}

const source = SOURCES.mesh;

export function meshOf(question: MeshQuestion, recorder: Recorder): MeshAnswer {
	const { gear, mate } = question;
	const refusals = [basePitchRefusal(gear, mate), helixRefusal(gear, mate), kindsRefusal(gear, mate)].filter(
		(reason) => reason !== null
	);
	if (refusals.length > 0) return { figures: null, refusals, warnings: [] };

	const geometry = operating(question, recorder);
	if (!geometry) return { figures: null, refusals: [CENTRES_TOO_CLOSE], warnings: [] };
	const contactRatio = contactRatioOf(geometry, gear, recorder);
	const backlash: BacklashQuestion = { ...geometry, measured: question.centreDistance !== null };
	const figures = {
		ratio: geometry.ratio,
		standardCentreDistance: geometry.standardCentre,
		operatingPressureAngle: (geometry.operatingAngle * 180) / Math.PI,
		contactRatio,
		overlapRatio: overlapRatio(gear, question.faceWidth, recorder),
		normalBacklash: normalBacklash(backlash, recorder),
		huntingTooth: isHunting(gear.teeth, mate.teeth),
		undercut: {
			gear: isUndercut(gear, straightDepth(gear.rack)),
			mate: isUndercut(mate, straightDepth(mate.rack))
		},
		interference: interferes(geometry)
	};
	if (![figures.operatingPressureAngle, contactRatio, figures.normalBacklash ?? 0].every(Number.isFinite)) {
		return { figures: null, refusals: [OUT_OF_RANGE], warnings: [] };
	}
	const discontinuous = discontinuousRefusal(contactRatio + figures.overlapRatio);
	return {
		figures,
		refusals: discontinuous ? [discontinuous] : [],
		warnings: discontinuous ? [] : meshWarnings(figures, geometry)
	};
}

/**
 * Where the two run. C0 = mt (N1 + N2) / 2; with a measured centre distance C, cos αw = C0 cos αt / C; else from the
 * sum of shifts, inv αw = inv αt + 2 (x1 + x2) tan αn / (N1 + N2). An internal gear counts with a minus.
 * Source: Shigley, Mechanical Engineering Design, 8th ed., ch. 13 (edition from memory). Null where no mesh can be.
 */
function operating({ gear, mate, centreDistance }: MeshQuestion, recorder: Recorder): MeshGeometry | null {
	const [one, two] = [gear, mate].sort((a, b) => sizeOf(a) - sizeOf(b)) as [Member, Member];
	if (one.teeth === null) return null;
	const module = gear.transverseModule;
	const angle = gear.transverseAngle;
	if (two.teeth === null) {
		return {
			pinion: one,
			wheel: two,
			ratio: null,
			standardCentre: null,
			centre: null,
			operatingAngle: angle
		};
	}
	const sign = two.kind === 'internal' ? -1 : 1;
	const ratio = recorder.step(
		{ symbol: 'i', name: 'ratio', expression: 'N2 / N1', unit: '1', source },
		{ N1: one.teeth, N2: two.teeth },
		({ N1, N2 }) => N2 / N1
	);
	const standardCentre = recorder.step(
		{
			symbol: 'C0',
			name: 'standard centre distance',
			expression: sign === 1 ? 'm · (N2 + N1) / 2' : 'm · (N2 - N1) / 2',
			unit: 'mm',
			source
		},
		{ m: module, N1: one.teeth, N2: two.teeth },
		({ m, N1, N2 }) => (m * (N2 + sign * N1)) / 2
	);
	const common = { pinion: one, wheel: two, ratio, standardCentre };
	const degrees = (radians: number) => (radians * 180) / Math.PI;
	if (centreDistance !== null) {
		const cosine = (standardCentre * Math.cos(angle)) / centreDistance;
		if (!(cosine < 1)) return null;
		recorder.step(
			{
				symbol: 'αw',
				name: 'operating pressure angle at the measured centre distance',
				expression: 'arccos(C0 · cos(αt) / C)',
				unit: '°',
				source
			},
			{ C0: standardCentre, αt: degrees(angle), C: centreDistance },
			() => degrees(Math.acos(cosine))
		);
		// At the standard distance the angle is the standard one, to the last digit.
		const operatingAngle = centreDistance === standardCentre ? angle : Math.acos(cosine);
		return { ...common, centre: centreDistance, operatingAngle };
	}
	const shifts = two.profileShift + sign * one.profileShift;
	const inv = involute(angle) + (2 * shifts * Math.tan(gear.normalAngle)) / (two.teeth + sign * one.teeth);
	if (!(inv > 0)) return null;
	const operatingAngle = shifts === 0 ? angle : inverseInvolute(inv);
	const centre = (standardCentre * Math.cos(angle)) / Math.cos(operatingAngle);
	return { ...common, centre, operatingAngle };
}

function sizeOf({ teeth }: Member): number {
	return teeth ?? Infinity;
}

/**
 * Contact ratio in the transverse plane: path of contact over base pitch.
 * Source: Shigley, Mechanical Engineering Design, 8th ed., sec. 13-6 (edition from memory).
 */
function contactRatioOf(geometry: MeshGeometry, gear: Member, recorder: Recorder): number {
	return recorder.step(
		{
			symbol: 'mp',
			name: 'contact ratio, path of contact over base pitch',
			expression: 'Z / (π · m · cos(αt))',
			unit: '1',
			source
		},
		{
			Z: contactPath(geometry),
			m: gear.transverseModule,
			αt: (gear.transverseAngle * 180) / Math.PI
		},
		({ Z, m }) => Z / (Math.PI * m * Math.cos(gear.transverseAngle))
	);
}

/** What a helix adds to the contact ratio: F sin β / (π mn). Source: as of the contact ratio. */
function overlapRatio({ helixAngle, normalModule }: Member, faceWidth: number, recorder: Recorder): number {
	if (helixAngle === 0) return 0;
	return recorder.step(
		{ symbol: 'mF', name: 'overlap ratio', expression: 'F · sin(β) / (π · mn)', unit: '1', source },
		{ F: faceWidth, β: (helixAngle * 180) / Math.PI, mn: normalModule },
		({ F, mn }) => (F * Math.sin(helixAngle)) / (Math.PI * mn)
	);
}

/** Counts without a common factor: every tooth meets every other before the pattern repeats. A rack's do not repeat. */
function isHunting(one: number | null, other: number | null): boolean {
	let [a, b] = [one ?? 0, other ?? 0];
	while (b > 0) [a, b] = [b, a % b];
	return a === 1;
}
