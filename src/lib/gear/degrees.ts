/** Angles as a working shows them: in degrees. What is computed from the angle shown can be followed by hand. */

export const toDegrees = (radians: number): number => (radians * 180) / Math.PI;
export const toRadians = (degrees: number): number => (degrees * Math.PI) / 180;

/** Of an angle in degrees. */
export const cosine = (degrees: number): number => Math.cos(toRadians(degrees));
export const sine = (degrees: number): number => Math.sin(toRadians(degrees));
export const tangent = (degrees: number): number => Math.tan(toRadians(degrees));
