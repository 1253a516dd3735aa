/**
 * What one member's teeth bear in bending: its form factor by the plant's rule, and the dynamic force that brings it
 * to its allowable stress. The same for the gear, its mate and the original.
 */
import type { Material, Outcome, Reason, Rules, ToothForm } from './contract';
import { bendingMargin, lewisBeamStrength, lewisBendingStress, reversingAllowable } from './bending';
import { fewTeethRefusal, handbookHolds, lewisFormFactor } from './form-factor';
import { lewisFormFactorByGeometry, rackFormFactor } from './form-factor-geometry';
import { virtualTeeth, type Member } from './member';
import { SOURCES } from './sources';
import { stressConcentration } from './stress-concentration';
import { stubRefusal } from './tip-wear';
import type { Recorder } from './working';

type FormFactorFigures = Pick<
	Outcome,
	'formFactor' | 'formFactorSource' | 'formFactorHandbook' | 'formFactorGeometry' | 'stressConcentration'
>;

export interface FormFactorAnswer {
	figures: FormFactorFigures;
	refusal: Reason | null;
}

/**
 * Form factor Y of a member by both methods as far as each reaches, and the one that the rule takes. `handbook` takes
 * the table where it holds the form and the geometry for every other; `lower-of-both` the lower. A rack and an
 * internal gear have the rack's factor: for the internal gear a lower bound, since its teeth widen at the root.
 * A load on a tip that is worn lower bends the tooth less: by layout alone Y would rise without bound. A worn tooth is
 * taken as unworn instead, with the lower of both methods whatever the rule, so that wear never adds to its strength.
 */
export function formFactorOf(
	member: Member,
	form: ToothForm,
	rule: Rules['formFactor'],
	recorder: Recorder
): FormFactorAnswer {
	const asRack = member.teeth === null || member.kind === 'internal';
	const refusedCount = asRack || member.teeth === null ? null : fewTeethRefusal(member.teeth);
	const refused = refusedCount ?? stubRefusal(member);
	if (refused) return { figures: NO_FORM_FACTOR, refusal: refused };
	const teeth =
		asRack || member.teeth === null ? Infinity : virtualTeeth(member.teeth, member.helixAngle, recorder);

	const tooth = {
		teeth,
		pressureAngle: (member.normalAngle * 180) / Math.PI,
		form,
		profileShift: asRack ? 0 : member.profileShift
	};
	const handbook = handbookHolds(tooth) ? lewisFormFactor(tooth, recorder) : null;
	const byGeometry = asRack
		? rackFormFactor(member.rack, 0, recorder)
		: lewisFormFactorByGeometry(
				{ teeth, rack: member.rack, profileShift: member.profileShift, tipWear: 0 },
				recorder
			);
	const section = 'Y' in byGeometry ? byGeometry : null;
	const geometry = section?.Y ?? null;
	const figures = {
		formFactorHandbook: handbook,
		formFactorGeometry: geometry,
		stressConcentration: section && stressConcentration(section, member.normalAngle, recorder)
	};
	const taken = takenHead(member.tipWear > 0 ? 'lower-of-both' : rule, handbook, geometry);
	if (!taken) {
		const refusal = 'code' in byGeometry ? byGeometry : null;
		return { figures: { ...NO_FORM_FACTOR, ...figures }, refusal };
	}
	const terms = { Yh: handbook ?? Infinity, Yg: geometry ?? Infinity };
	const formFactor = recorder.step(taken, terms, ({ Yh, Yg }) =>
		taken === BY_HANDBOOK ? Yh : taken === BY_GEOMETRY ? Yg : Math.min(Yh, Yg)
	);
	const formFactorSource = formFactor === handbook ? 'handbook' : 'geometry';
	return { figures: { ...figures, formFactor, formFactorSource }, refusal: null };
}

const NO_FORM_FACTOR: FormFactorFigures = {
	formFactor: null,
	formFactorSource: null,
	formFactorHandbook: null,
	formFactorGeometry: null,
	stressConcentration: null
};

const DECIDES = {
	symbol: 'Y',
	name: 'Lewis form factor that counts, by the rule of the plant',
	unit: '1',
	source: SOURCES.plantRule
};

const BY_HANDBOOK = { ...DECIDES, expression: 'Yh' };
const BY_GEOMETRY = { ...DECIDES, expression: 'Yg' };
const THE_LOWER = { ...DECIDES, expression: 'min(Yh, Yg)' };

function takenHead(
	rule: Rules['formFactor'],
	handbook: number | null,
	geometry: number | null
): typeof BY_HANDBOOK | null {
	if (rule === 'handbook' && handbook !== null) return BY_HANDBOOK;
	// A rule that asks for the lower of both cannot be met by the table alone.
	if (geometry === null) return null;
	return rule === 'lower-of-both' && handbook !== null ? THE_LOWER : BY_GEOMETRY;
}

export interface BendingAnswer {
	/** Dynamic force in N that the teeth bear; null without a form factor. */
	strength: number | null;
	figures: { allowableBending: number; bendingStress: number | null; bendingMargin: number | null };
}

/** Stress and margin of a member's teeth under the design force (N); null as far as force or factors are not known. */
export function memberBending(
	{ member, material, faceWidth, formFactor }: BendingMember,
	{ rules, reversing, designForce, velocityFactor }: BendingDrive,
	recorder: Recorder
): BendingAnswer {
	const allowable = allowableBending(material, reversing, rules, recorder);
	const none = { allowableBending: allowable, bendingStress: null, bendingMargin: null };
	if (formFactor === null) return { strength: null, figures: none };
	const tooth = { faceWidth, module: member.normalModule, formFactor };
	const strength = lewisBeamStrength(allowable, tooth, recorder);
	if (designForce === null || velocityFactor === null) return { strength, figures: none };
	const stress = lewisBendingStress(designForce, { ...tooth, velocityFactor }, recorder);
	return {
		strength,
		figures: {
			allowableBending: allowable,
			bendingStress: stress,
			bendingMargin: bendingMargin(allowable, stress, recorder)
		}
	};
}

export interface BendingMember {
	member: Member;
	material: Material;
	/** The smaller of the pair, mm. */
	faceWidth: number;
	formFactor: number | null;
}

export interface BendingDrive {
	rules: Rules;
	reversing: boolean;
	/** N, service factor in. */
	designForce: number | null;
	velocityFactor: number | null;
}

/** Less where both flanks are loaded in turn. MPa. */
function allowableBending(
	material: Material,
	reversing: boolean,
	{ reversingFactor }: Rules,
	recorder: Recorder
): number {
	const symbol = reversing ? 'Sa' : 'Sb';
	const line = { symbol, name: 'allowable bending stress of the material', unit: 'MPa' };
	const allowable = recorder.given(line, material.allowableBending);
	return reversing ? reversingAllowable(allowable, reversingFactor, recorder) : allowable;
}
