/** A pair of which all is known, in an ordinary drive: 24 cut teeth on 61, module 4. */
import type { EvaluateInput, Gear, Mate } from '$lib/gear/contract';

export const steel = (brinell: number, allowable = 200): Gear['material'] => ({
	name: `steel of ${brinell}`,
	metallic: true,
	allowableBending: { value: allowable, unit: 'MPa' },
	brinell,
	modulus: { value: 207, unit: 'GPa' },
	poisson: 0.3,
	permitted: true
});

export const gear: Gear = {
	kind: 'spur',
	teeth: 24,
	pitch: { system: 'module', value: 4 },
	pressureAngle: 20,
	form: 'full-depth',
	faceWidth: { value: 40, unit: 'mm' },
	finish: 'cut',
	material: steel(300)
};

export const mate: Mate = {
	kind: 'spur',
	teeth: 61,
	form: 'full-depth',
	faceWidth: { value: 36, unit: 'mm' },
	material: steel(220)
};

export const check = (change: Partial<EvaluateInput> = {}): EvaluateInput => ({
	gear,
	mate,
	drive: {
		load: { power: { value: 5, unit: 'kW' } },
		speed: { value: 400, unit: 'rpm' },
		serviceFactor: 1.25
	},
	...change
});
