/** The checks that the core is timed with, and the core itself: one entry, bundled as the application is. */
import type { EvaluateInput } from '$lib/gear/contract';
import type { IdentifyInput } from '$lib/gear/identify/contract';

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

export { identify } from '$lib/gear/identify/identify';

/** The readings of a usual visit: teeth, outside diameter, whole depth and two spans. */
export const usualReadings: IdentifyInput = {
	teeth: 26,
	prior: 'either',
	outsideDiameter: { value: 5.597, unit: 'in', uncertainty: 0.001, taken: 'over-tips' },
	wholeDepth: { value: 0.448, unit: 'in', uncertainty: 0.002 },
	spans: [
		{ teeth: 3, value: 1.549, unit: 'in', uncertainty: 0.001 },
		{ teeth: 4, value: 2.139, unit: 'in', uncertainty: 0.001 }
	]
};
