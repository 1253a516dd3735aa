/**
 * A check of a spur gear as a textbook states one: only what the example gives, the rest does not enter its answer.
 * The margin needed is 1 and the service factor 1 unless the example has another.
 */
import type { EvaluateInput, Gear, Load, Pitch, Quantity, Rules } from '$lib/gear/contract';

export interface TextbookCheck {
	teeth: number;
	pitch: Pitch;
	angle?: number;
	form?: 'full-depth' | 'stub';
	face?: Gear['faceWidth'];
	finish?: Gear['finish'];
	metallic?: boolean;
	allowable?: Gear['material']['allowableBending'];
	load?: Load;
	rpm?: number;
	serviceFactor?: number;
	rules?: Partial<Rules>;
}

export function spurCheck(check: TextbookCheck): EvaluateInput {
	return {
		gear: {
			kind: 'spur',
			teeth: check.teeth,
			pitch: check.pitch,
			pressureAngle: check.angle ?? 20,
			form: check.form ?? 'full-depth',
			faceWidth: check.face ?? { value: 25, unit: 'mm' },
			finish: check.finish ?? 'cut',
			material: {
				name: 'steel of the example',
				metallic: check.metallic ?? true,
				allowableBending: check.allowable ?? { value: 150, unit: 'MPa' },
				permitted: true
			}
		},
		drive: {
			load: check.load ?? { power: { value: 1, unit: 'kW' } },
			speed: { value: check.rpm ?? 100, unit: 'rpm' },
			serviceFactor: check.serviceFactor ?? 1
		},
		rules: check.rules
	};
}

export const diametral = (value: number): Pitch => ({ system: 'diametral', value });
export const module = (value: number): Pitch => ({ system: 'module', value });
export const inches = (value: number) => ({ value, unit: 'in' }) satisfies Quantity<'in'>;
