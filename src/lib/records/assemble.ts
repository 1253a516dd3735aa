/**
 * From answers to the questions for the core, one a gear that may be it: the one place where a check's readings, the
 * plant's material and the plant's rules meet. The tablet and the server both come through here.
 */
import type { EvaluateInput, Load, Material } from '$lib/gear/contract';
import type { IdentifyAnswer } from '$lib/gear/identify/contract';
import type { CheckAnswers } from './check';
import type { MaterialStatement } from './material';
import type { PlantRules } from './plant-rules';
import { isReading, meanOf, type Reading, type ReadingUnit } from './reading';
import { whichGears, type WhichGear } from './which-gear';

/** What a check can lack before the core can be asked; the words stand in the message catalogue. */
export const MISSING = [
	'teeth',
	'faceWidth',
	'pitch',
	'pressureAngle',
	'form',
	'load',
	'speed',
	'serviceFactor',
	'finish',
	'material'
] as const;
export type Missing = (typeof MISSING)[number];

/** The question for each gear that the check is answered for; none where no involute gear fits the readings. */
export type Assembled =
	| { ok: true; questions: { gear: WhichGear; input: EvaluateInput }[]; identified: IdentifyAnswer | null }
	| { ok: false; missing: Missing[] };

/**
 * The material as the core takes it on a day (ISO date): permitted only from the day its revision is valid.
 * Hardness is the middle of the stated range.
 */
export function coreMaterial(row: MaterialStatement, on: string): Material {
	const { brinellLow: low, brinellHigh: high } = row;
	return {
		name: row.name,
		metallic: row.metallic,
		allowableBending: row.allowableBending,
		brinell: low !== null && high !== null ? (low + high) / 2 : undefined,
		modulus: row.modulus ?? undefined,
		poisson: row.poisson ?? undefined,
		permitted: row.permitted && row.validFrom <= on
	};
}

/** What the plant brings to a check. */
export interface PlantSide {
	/** Of the spare, in the revision that the check is made with. */
	material: MaterialStatement | null;
	rules: PlantRules;
	/** The plant's list as it stands: remedies are offered from its permitted ones. */
	offered: readonly MaterialStatement[];
}

/** @param performedAt ISO 8601 moment of the check, which decides whether a permission was valid */
export function assemble(
	answers: CheckAnswers,
	{ material, rules, offered }: PlantSide,
	performedAt: string
): Assembled {
	const which = whichGears(answers, rules.instruments);
	const faceWidth = isReading(answers.faceWidth) ? meanOf(answers.faceWidth) : null;
	const speed = isReading(answers.speed) ? quantity(answers.speed) : null;
	const serviceFactor = isReading(answers.serviceFactor) ? answers.serviceFactor.value : null;
	const load = loadOf(answers);
	const { finish } = answers;
	if (!which.ok || !faceWidth || !speed || serviceFactor === null || !load || !finish || !material) {
		const asked = { faceWidth, load, speed, serviceFactor, finish, material };
		const names = Object.keys(asked) as (keyof typeof asked)[];
		const given = names.filter((name) => asked[name] === null);
		return { ok: false, missing: inOrder([...(which.ok ? [] : which.missing), ...given]) };
	}
	const { serviceFactors: _factors, instruments: _tools, uncertainty, ...coreRules } = rules;
	const on = performedAt.slice(0, 10);
	const spare = { faceWidth, finish, material: coreMaterial(material, on) };
	const shared = {
		drive: { load, speed, serviceFactor, bending: answers.reversing ? 'reversing' : 'one-way' } as const,
		rules: coreRules,
		permittedMaterials: offered.map((row) => coreMaterial(row, on)).filter(({ permitted }) => permitted),
		uncertainty
	};
	const questions = which.gears.map((gear) => ({
		gear,
		input: { gear: { ...toothed(gear, answers), ...spare }, ...shared }
	}));
	return { ok: true, questions, identified: which.identified };
}

/** Teeth, pitch and form of one gear, its helix as read; on a slanted gear pitch and angle are the cutter's. */
function toothed({ teeth, pitch, pressureAngle, form, profileShift }: WhichGear, answers: CheckAnswers) {
	const helix = isReading(answers.helixAngle) ? answers.helixAngle.value : 0;
	return {
		teeth,
		pitch,
		pressureAngle,
		form,
		...(profileShift !== 0 && { profileShift }),
		...(helix > 0
			? ({ kind: 'helical', plane: 'normal', helixAngle: helix } as const)
			: ({ kind: 'spur' } as const))
	};
}

/** As they are asked on the way through a check. */
function inOrder(missing: readonly Missing[]): Missing[] {
	return MISSING.filter((name) => missing.includes(name));
}

function loadOf({ loadKind, power, torque }: CheckAnswers): Load | null {
	if (loadKind === 'unknown') return 'unknown';
	if (loadKind === 'power' && isReading(power)) return { power: quantity(power) };
	if (loadKind === 'torque' && isReading(torque)) return { torque: quantity(torque) };
	return null;
}

function quantity<U extends ReadingUnit>({ value, unit }: Reading<U>): { value: number; unit: U } {
	return { value, unit };
}
