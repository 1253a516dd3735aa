/**
 * How two members mesh: ratio, centre distance, operating angle, contact ratio, backlash, hunting tooth, undercut and
 * interference. Lengths in mm, angles in radians inside; the figures of the contract are in mm and degrees.
 */
import { normalBacklash, type BacklashQuestion } from './backlash';
import { contactPath, interferes, type MeshGeometry } from './contact-path';
import type { Outcome, Reason } from './contract';
import { tipsFoul } from './internal-tips';
import { isUndercut, type Member } from './member';
import {
	basePitchRefusal,
	CENTRES_TOO_CLOSE,
	SHIFTS_DO_NOT_MESH,
	discontinuousRefusal,
	helixRefusal,
	kindsRefusal
} from './mesh-refusals';
import { meshWarnings } from './mesh-warnings';
import { operatingOf } from './operating';
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

	const geometry = operatingOf(question, recorder);
	if (!geometry) {
		const refusal = question.centreDistance === null ? SHIFTS_DO_NOT_MESH : CENTRES_TOO_CLOSE;
		return { figures: null, refusals: [refusal], warnings: [] };
	}
	const contactRatio = contactRatioOf(geometry, recorder);
	const backlash: BacklashQuestion = { ...geometry, measured: question.centreDistance !== null };
	const figures = {
		ratio: geometry.ratio,
		standardCentreDistance: geometry.standardCentre,
		operatingPressureAngle: (geometry.operatingAngle * 180) / Math.PI,
		contactRatio,
		overlapRatio: overlapRatio(geometry.pinion, question.faceWidth, recorder),
		normalBacklash: normalBacklash(backlash, recorder),
		huntingTooth: isHunting(gear.teeth, mate.teeth),
		undercut: {
			gear: isUndercut(gear, straightDepth(gear.rack)),
			mate: isUndercut(mate, straightDepth(mate.rack))
		},
		interference: interferes(geometry) || tipsFoul(geometry)
	};
	if (Object.values(figures).some((value) => typeof value === 'number' && !Number.isFinite(value))) {
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
 * Contact ratio in the transverse plane: path of contact over base pitch.
 * Source: Shigley, Mechanical Engineering Design, 8th ed., sec. 13-6 (edition from memory).
 */
function contactRatioOf(geometry: MeshGeometry, recorder: Recorder): number {
	const { transverseModule, transverseAngle } = geometry.pinion;
	return recorder.step(
		{
			symbol: 'mp',
			name: 'contact ratio, path of contact over base pitch',
			expression: 'Z / (π · m · cos(αt))',
			unit: '1',
			source
		},
		{ Z: contactPath(geometry, recorder), m: transverseModule, αt: (transverseAngle * 180) / Math.PI },
		({ Z, m }) => Z / (Math.PI * m * Math.cos(transverseAngle))
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
	if (one === null || other === null) return false;
	let [a, b] = [one, other];
	while (b > 0) [a, b] = [b, a % b];
	return a === 1;
}
