/** Which pinions run in an internal gear: against the handbooks' limit, and against turning the pair step by step. */
import { expect, test } from 'vitest';
import { memberOf, type Member } from '$lib/gear/member';
import { meshOf } from '$lib/gear/mesh';
import { unrecorded } from '$lib/gear/working';

interface Of {
	angle: number;
	/** In modules. */
	addendum: number;
	kind?: 'spur' | 'internal';
}

const gear = (teeth: number, { angle, addendum, kind = 'spur' }: Of): Member =>
	memberOf({
		kind,
		teeth,
		pitch: { system: 'module', value: 1 },
		pressureAngle: angle,
		form: { addendum, dedendum: addendum, tipRadius: 0 }
	});

function interference(pinion: Member, ring: Member): boolean | undefined {
	const question = { gear: pinion, mate: ring, centreDistance: null, faceWidth: 10 };
	return meshOf(question, unrecorded).figures?.interference;
}

// N1 / N2 >= 1 - tan αa2 / tan αw, αa2 at the ring's tips (metric gear handbooks, from memory).
test.each([
	[20, 40],
	[20, 60],
	[20, 100],
	[25, 40],
	[14.5, 80]
])('%d degrees: the fewest teeth of a pinion in a ring of %d', (angle, ring) => {
	const alpha = (angle * Math.PI) / 180;
	const atTips = Math.acos((ring * Math.cos(alpha)) / (ring - 2));
	const fewest = Math.ceil(ring * (1 - Math.tan(atTips) / Math.tan(alpha)));
	// The pinion's own tips are short, so that they do not foul the ring's.
	const wheel = gear(ring, { angle, addendum: 1, kind: 'internal' });
	expect(interference(gear(fewest, { angle, addendum: 0.3 }), wheel)).toBe(false);
	expect(interference(gear(fewest - 1, { angle, addendum: 0.3 }), wheel)).toBe(true);
});

// Fewest teeth that ring and pinion must differ by (recomputed): the pair is turned in small steps, and each tip of
// the pinion looked for in the ring's teeth.
test.each([
	[20, 1, 60],
	[20, 1, 100],
	[20, 0.8, 60],
	[25, 1, 60],
	[14.5, 1, 100]
])(
	'%d degrees, addendum %d: tips foul a ring of %d just where turning the pair shows it',
	(angle, addendum, ring) => {
		for (let difference = 4; difference <= 16; difference++) {
			const pinion = gear(ring - difference, { angle, addendum });
			const wheel = gear(ring, { angle, addendum, kind: 'internal' });
			expect(interference(pinion, wheel), `difference ${difference}`).toBe(
				foulsWhenTurned(ring, difference, angle, addendum)
			);
		}
	}
);

/** Whether a tip corner of the pinion ever lies within a tooth of the ring; module 1, no backlash. */
function foulsWhenTurned(ring: number, difference: number, degrees: number, addendum: number): boolean {
	const pinion = ring - difference;
	const angle = (degrees * Math.PI) / 180;
	const inv = (at: number) => Math.tan(at) - at;
	const centre = difference / 2;
	const tip = pinion / 2 + addendum;
	const halfTip = Math.PI / 2 / pinion + inv(angle) - inv(Math.acos(((pinion / 2) * Math.cos(angle)) / tip));
	const ringPitch = (2 * Math.PI) / ring;
	const halfRing = (radius: number) =>
		Math.PI / 2 / ring - inv(angle) + inv(Math.acos(((ring / 2) * Math.cos(angle)) / radius));
	const steps = 4000;
	for (let step = -steps; step <= steps; step++) {
		const turned = (Math.PI * step) / steps;
		for (const side of [-halfTip, halfTip]) {
			const [x, y] = [tip * Math.sin(turned + side), centre + tip * Math.cos(turned + side)];
			const radius = Math.hypot(x, y);
			if (radius < ring / 2 - addendum) continue;
			// A space of the ring stands before the pinion's tooth, so its teeth are half a pitch away.
			const places = (Math.atan2(x, y) - (turned * pinion) / ring) / ringPitch;
			const fromTooth = Math.abs(places - Math.floor(places) - 0.5) * ringPitch;
			if (fromTooth < halfRing(radius) - 1e-6) return true;
		}
	}
	return false;
}
