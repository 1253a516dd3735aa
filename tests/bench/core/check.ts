/** The checks that the core is timed with, and the core itself: one entry, bundled as the application is. */
import type { EvaluateInput } from '$lib/gear/contract';

export { evaluate } from '$lib/gear/evaluate';

/** A spur gear in a drive, as the tablet asks for it: handbook form factor, no mate. */
export const spurCheck: EvaluateInput = {
	gear: {
		kind: 'spur',
		teeth: 24,
		pitch: { system: 'diametral', value: 6 },
		pressureAngle: 20,
		form: 'full-depth',
		faceWidth: { value: 1.5, unit: 'in' },
		finish: 'cut',
		material: {
			name: 'steel',
			metallic: true,
			allowableBending: { value: 138, unit: 'MPa' },
			permitted: true
		}
	},
	drive: {
		load: { power: { value: 5, unit: 'hp' } },
		speed: { value: 1150, unit: 'rpm' },
		serviceFactor: 1.25
	}
};

/** The same by geometry; each `shift` is a tooth of its own, which no earlier call has worked out. */
export function geometryCheck(shift: number): EvaluateInput {
	return {
		...spurCheck,
		gear: { ...spurCheck.gear, profileShift: shift },
		rules: { formFactor: 'geometry' }
	};
}
