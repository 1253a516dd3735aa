/** The drive on a pair's pitch line: velocity, velocity factor with its law, tangential and design force. */
import type { Drive, Gear, Mate, Outcome, Reason, Rules } from './contract';
import { designForce, tangentialForce } from './load';
import type { Member } from './member';
import { firstToEnd, harsherLaw, lawsOf, onlyLaw, pairVelocityFactor, type PairLaws } from './pair-law';
import { speedRefusal } from './refusals';
import { pitchLineVelocity, type VelocityLaw } from './velocity';
import type { Recorder } from './working';

export type DriveFigures = Pick<
	Outcome,
	'pitchLineVelocity' | 'velocityFactor' | 'tangentialForce' | 'designForce'
> & { velocityLaw: VelocityLaw | null };

export interface DriveAnswer {
	figures: DriveFigures;
	laws: PairLaws;
	/** The law that counts is the mate's, not this gear's own. */
	byMate: boolean;
	refusal: Reason | null;
}

/** Velocities in m/s, forces in N; what the input does not allow is null. */
export function driveOf(
	{ gear, mate, drive }: { gear: Gear; mate?: Mate | undefined; drive: Drive },
	member: Member,
	rules: Rules,
	recorder: Recorder
): DriveAnswer {
	const velocity = velocityOf(drive, member, recorder);
	const force = tangentialForce(drive.load, member.pitchDiameter, velocity, recorder);
	const laws = lawsOf(gear, mate, rules);
	const refusal = velocity === null ? null : speedRefusal(velocity, firstToEnd(laws));
	const known = velocity !== null && !refusal;
	const counts = known ? harsherLaw(velocity, laws) : null;
	return {
		figures: {
			pitchLineVelocity: velocity,
			tangentialForce: force,
			designForce: force === null ? null : designForce(force, drive.serviceFactor, recorder),
			velocityLaw: counts?.law ?? onlyLaw(laws),
			velocityFactor: known ? pairVelocityFactor(velocity, laws, recorder) : null
		},
		laws,
		byMate: counts?.of === 'mate',
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
