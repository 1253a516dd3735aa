/** Whether the tips of a pinion and of the internal gear it runs in foul each other beside the mesh. */
import type { MeshGeometry } from './contact-path';
import { involute } from './involute';
import { baseDiameter, tipDiameter, type Member } from './member';
import { pressureAngleAt } from './tooth';

/**
 * With counts that differ little, the pinion's tips meet those of the internal gear before they come into its spaces or
 * after they have left them. They stay clear if N1 / N2 θ1 + inv αw - inv αa2 >= θ2, with
 * cos θ2 = (C² + ra2² - ra1²) / (2 C ra2) and θ1 = arccos((ra2² - ra1² - C²) / (2 C ra1)) + inv αa1 - inv αw: the angles
 * at both centres from the line of centres to where the tip circles cross. Without backlash, which would give some room.
 * Source: metric gear handbooks, trochoid interference (from memory); the tests turn such pairs step by step.
 */
export function tipsFoul({ pinion, wheel, centre, operatingAngle }: MeshGeometry): boolean {
	if (wheel.kind !== 'internal' || centre === null || pinion.teeth === null || wheel.teeth === null)
		return false;
	const [own, ring] = [tipOf(pinion), tipOf(wheel)];
	// A pinion that stays within the ring's tip circle does not reach its teeth at all.
	if (centre + own.radius <= ring.radius) return false;
	// Tip circles that do not cross: the pinion is as large as the ring, or stands beside it.
	if (own.radius - centre >= ring.radius || centre - own.radius >= ring.radius) return true;
	const running = involute(operatingAngle);
	const cross = (ring.radius ** 2 - own.radius ** 2 - centre ** 2) / (2 * centre * own.radius);
	const pinions = Math.acos(cross) + own.involute - running;
	const rings = Math.acos((centre ** 2 + ring.radius ** 2 - own.radius ** 2) / (2 * centre * ring.radius));
	return (pinion.teeth / wheel.teeth) * pinions + running - ring.involute < rings;
}

function tipOf(member: Member): { radius: number; involute: number } {
	const radius = (tipDiameter(member) ?? NaN) / 2;
	return { radius, involute: involute(pressureAngleAt((baseDiameter(member) ?? NaN) / 2, radius)) };
}
