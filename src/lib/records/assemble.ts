/**
 * From answers to the question for the core: the one place where a check's readings, the plant's material and
 * the plant's rules meet. The tablet and the server both come through here.
 */
import type { EvaluateInput, Load, Material } from '$lib/gear/contract';
import type { CheckAnswers } from './check';
import type { MaterialStatement } from './material';
import type { PlantRules } from './plant-rules';
import { isReading, type Reading, type ReadingUnit } from './reading';

/** What a check still lacks before the core can be asked; the words stand in the message catalogue. */
export type Missing =
	| 'teeth'
	| 'faceWidth'
	| 'pitch'
	| 'pressureAngle'
	| 'form'
	| 'load'
	| 'speed'
	| 'serviceFactor'
	| 'finish'
	| 'material';

export type Assembled = { ok: true; input: EvaluateInput } | { ok: false; missing: Missing[] };

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
export function assembleInput(
	answers: CheckAnswers,
	{ material, rules, offered }: PlantSide,
	performedAt: string
): Assembled {
	const teeth = isReading(answers.teeth) ? answers.teeth.value : null;
	const faceWidth = isReading(answers.faceWidth) ? quantity(answers.faceWidth) : null;
	const speed = isReading(answers.speed) ? quantity(answers.speed) : null;
	const serviceFactor = isReading(answers.serviceFactor) ? answers.serviceFactor.value : null;
	const load = loadOf(answers);
	const { pitch, pressureAngle, form, finish } = answers;
	if (
		teeth === null ||
		!faceWidth ||
		!speed ||
		serviceFactor === null ||
		!load ||
		!pitch ||
		!pressureAngle ||
		!form ||
		!finish ||
		!material
	) {
		const asked = {
			teeth,
			faceWidth,
			pitch,
			pressureAngle,
			form,
			load,
			speed,
			serviceFactor,
			finish,
			material
		};
		const missing = (Object.keys(asked) as Missing[]).filter((name) => asked[name] === null);
		return { ok: false, missing };
	}
	const { serviceFactors: _factors, uncertainty, ...coreRules } = rules;
	const on = performedAt.slice(0, 10);
	return {
		ok: true,
		input: {
			gear: {
				kind: 'spur',
				teeth,
				pitch,
				pressureAngle,
				form,
				faceWidth,
				finish,
				material: coreMaterial(material, on)
			},
			drive: { load, speed, serviceFactor, bending: answers.reversing ? 'reversing' : 'one-way' },
			rules: coreRules,
			permittedMaterials: offered.map((row) => coreMaterial(row, on)).filter(({ permitted }) => permitted),
			uncertainty
		}
	};
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
