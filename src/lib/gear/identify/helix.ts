/** The helix as it was read: its angle and how far that may be off, both in radians. */
import type { IdentifyInput } from './contract';

/** Standard uncertainty in degrees where none is given: a protractor on inked tips (from memory). */
const USUAL_DOUBT = 1;

export interface Helix {
	angle: number;
	/** Standard uncertainty; 0 for a spur gear, whose teeth are straight by design. */
	spread: number;
}

/** A helix is there when its reading says so by more than its doubt. */
export function helixOf({ helixAngle }: IdentifyInput): Helix {
	const doubt = helixAngle?.uncertainty ?? USUAL_DOUBT;
	if (!helixAngle || Math.abs(helixAngle.value) <= 2 * doubt) return { angle: 0, spread: 0 };
	return { angle: (Math.abs(helixAngle.value) * Math.PI) / 180, spread: (doubt * Math.PI) / 180 };
}
