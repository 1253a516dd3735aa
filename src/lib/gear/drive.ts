/** The drive on a member's pitch line: velocity, velocity factor with its law, tangential and design force. */
import type { Drive, Gear, Outcome, Reason, Rules } from './contract';
import { designForce, tangentialForce } from './load';
import type { Member } from './member';
import { speedRefusal } from './refusals';
import {
	barthVelocityFactor,
	pitchLineVelocity,
	velocityEnd,
	velocityLawOf,
	type VelocityLaw
} from './velocity';
import type { Recorder } from './working';

export type DriveFigures = Pick<
	Outcome,
	'pitchLineVelocity' | 'velocityFactor' | 'tangentialForce' | 'designForce'
> & { velocityLaw: VelocityLaw };

/** Velocities in m/s, forces in N; what the input does not allow is null. */
export function driveOf(
	gear: Gear,
	member: Member,
	{ drive, rules }: { drive: Drive; rules: Rules },
	recorder: Recorder
): { figures: DriveFigures; refusal: Reason | null } {
	const velocity = velocityOf(drive, member, recorder);
	const force = tangentialForce(drive.load, member.pitchDiameter, velocity, recorder);
	const law = velocityLawOf(gear.finish, gear.material.metallic, rules.cutLaw);
	const end = velocityEnd(law, gear.finish, rules.speedLimit);
	const byPlant = rules.speedLimit[gear.finish] !== null;
	const refusal =
		velocity === null ? null : speedRefusal(velocity, end, { law, finish: gear.finish, byPlant });
	return {
		figures: {
			pitchLineVelocity: velocity,
			tangentialForce: force,
			designForce: force === null ? null : designForce(force, drive.serviceFactor, recorder),
			velocityLaw: law,
			velocityFactor: velocity === null || refusal ? null : barthVelocityFactor(velocity, law, recorder)
		},
		refusal
	};
}

function velocityOf(drive: Drive, member: Member, recorder: Recorder): number | null {
	if (member.pitchDiameter === null) {
		const line = { symbol: 'V', name: 'velocity of the rack', unit: 'm/s' };
		return drive.velocity ? recorder.given(line, drive.velocity) : null;
	}
	if (!drive.speed) return null;
	const speed = recorder.given({ symbol: 'n', name: 'speed of this gear', unit: 'rpm' }, drive.speed);
	return pitchLineVelocity(member.pitchDiameter, speed, recorder);
}
