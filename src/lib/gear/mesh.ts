/**
 * How two members mesh: ratio, centre distance, operating angle, contact ratio, backlash, hunting tooth, undercut and
 * interference. Lengths in mm, angles in radians inside; the figures of the contract are in mm and degrees.
 */
import { normalBacklash, type BacklashQuestion } from './backlash';
import { isUndercut, pathOnFlanks } from './contact-on-flanks';
import { contactPath, interferes, type MeshGeometry } from './contact-path';
import type { Outcome, Reason } from './contract';
import { cosine, sine, toDegrees } from './degrees';
import { tipsFoul } from './internal-tips';
import type { Member } from './member';
import {
	basePitchRefusal,
	CENTRES_TOO_CLOSE,
	SHIFTS_DO_NOT_MESH,
	discontinuousRefusal,
	helixRefusal,
	kindsRefusal
} from './mesh-refusals';
import { meshWarnings, shortenedWarnings } from './mesh-warnings';
import { operatingOf } from './operating';
import { SOURCES } from './sources';
import { OUT_OF_RANGE } from './refusals';
import { tipsOfPairRefusal } from './tip-wear';
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
	const refusals = [
		basePitchRefusal(gear, mate),
		helixRefusal(gear, mate),
		kindsRefusal(gear, mate),
		tipsOfPairRefusal(gear, mate)
	].filter((reason) => reason !== null);
	if (refusals.length > 0) return { figures: null, refusals, warnings: [] };

	const geometry = operatingOf(question, recorder);
	if (!geometry) {
		const refusal = question.centreDistance === null ? SHIFTS_DO_NOT_MESH : CENTRES_TOO_CLOSE;
		return { figures: null, refusals: [refusal], warnings: [] };
	}
	const { contactRatio, contactRatioUndercut, refusal } = contactRatiosOf(geometry, recorder);
	const backlash: BacklashQuestion = { ...geometry, measured: question.centreDistance !== null };
	const figures = {
		ratio: geometry.ratio,
		standardCentreDistance: geometry.standardCentre,
		operatingPressureAngle: toDegrees(geometry.operatingAngle),
		contactRatio,
		contactRatioUndercut,
		overlapRatio: overlapRatio(geometry.pinion, question.faceWidth, recorder),
		normalBacklash: normalBacklash(backlash, recorder),
		huntingTooth: isHunting(gear.teeth, mate.teeth),
		undercut: { gear: isUndercut(gear), mate: isUndercut(mate) },
		interference: interferes(geometry) || tipsFoul(geometry)
	};
	if (Object.values(figures).some((value) => typeof value === 'number' && !Number.isFinite(value))) {
		return { figures: null, refusals: [OUT_OF_RANGE], warnings: [] };
	}
	const judged = (contactRatioUndercut ?? contactRatio) + figures.overlapRatio;
	const refused = refusal ?? discontinuousRefusal(judged);
	return refused
		? { figures, refusals: [refused], warnings: shortenedWarnings(figures) }
		: { figures, refusals: [], warnings: meshWarnings(figures, geometry) };
}

/**
 * Contact ratios in the transverse plane, path of contact over base pitch: by the published path from tip to tip, and by
 * what the roots leave of it. The second is null where it is not known.
 * Source: Shigley, Mechanical Engineering Design, 8th ed., sec. 13-6 (edition from memory).
 */
function contactRatiosOf(
	geometry: MeshGeometry,
	recorder: Recorder
): { contactRatio: number; contactRatioUndercut: number | null; refusal: Reason | null } {
	const { transverseModule, transverseAngle } = geometry.pinion;
	const path = contactPath(geometry, recorder);
	const pitch = recorder.step(
		{ symbol: 'pb', name: 'base pitch', expression: 'π · m · cos(αt)', unit: 'mm', source },
		{ m: transverseModule, αt: toDegrees(transverseAngle) },
		({ m, αt }) => Math.PI * m * cosine(αt)
	);
	const ratio = { symbol: 'mp', unit: '1', source };
	const contactRatio = recorder.step(
		{ ...ratio, name: 'contact ratio, path of contact over base pitch', expression: 'Z / pb' },
		{ Z: path, pb: pitch },
		({ Z, pb }) => Z / pb
	);
	const onFlanks = pathOnFlanks(geometry, recorder);
	if (onFlanks.path === null || onFlanks.path >= path) {
		const contactRatioUndercut = onFlanks.path === null ? null : contactRatio;
		return { contactRatio, contactRatioUndercut, refusal: onFlanks.refusal };
	}
	const contactRatioUndercut = recorder.step(
		{
			...ratio,
			symbol: 'mu',
			name: 'contact ratio between the beginnings of the flanks: it is judged',
			expression: 'Zu / pb'
		},
		{ Zu: onFlanks.path, pb: pitch },
		({ Zu, pb }) => Zu / pb
	);
	return { contactRatio, contactRatioUndercut, refusal: null };
}

/** What a helix adds to the contact ratio: F sin β / (π mn). Source: as of the contact ratio. */
function overlapRatio({ helixAngle, normalModule }: Member, faceWidth: number, recorder: Recorder): number {
	if (helixAngle === 0) return 0;
	return recorder.step(
		{ symbol: 'mF', name: 'overlap ratio', expression: 'F · sin(β) / (π · mn)', unit: '1', source },
		{ F: faceWidth, β: toDegrees(helixAngle), mn: normalModule },
		({ F, β, mn }) => (F * sine(β)) / (Math.PI * mn)
	);
}

/** Counts without a common factor: every tooth meets every other before the pattern repeats. A rack's do not repeat. */
function isHunting(one: number | null, other: number | null): boolean {
	if (one === null || other === null) return false;
	let [a, b] = [one, other];
	while (b > 0) [a, b] = [b, a % b];
	return a === 1;
}
