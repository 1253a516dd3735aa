/** People, checks and rows for the tests of keeping and sending. All of it is invented. */
import { noAnswers } from '../../src/lib/records/check';
import type { Outcome } from '../../src/lib/gear/contract';
import { newId } from '../../src/lib/records/ids';
import type { CheckToKeep } from '../../src/lib/tablet/store/keep';
import type { Draft, LocalPerson } from '../../src/lib/tablet/store/schema';

export const AT = '2026-03-02T08:00:00.000Z';

export interface Member {
	plantId: string;
	plantName: string;
	personId: string;
	name: string;
}

export function member(over: Partial<Member> = {}): Member {
	return { plantId: newId(), plantName: 'Test Mill', personId: newId(), name: 'Tester', ...over };
}

export function localPerson(of: Member): LocalPerson {
	return { ...of, role: 'millwright', since: AT };
}

export const cannotSayOutcome: Outcome = {
	core: 'test',
	pitchDiameter: null,
	module: null,
	normalModule: null,
	diametralPitch: null,
	circularPitch: null,
	pitchLineVelocity: null,
	velocityLaw: null,
	velocityFactor: null,
	formFactor: null,
	formFactorSource: null,
	formFactorHandbook: null,
	formFactorGeometry: null,
	stressConcentration: null,
	tangentialForce: null,
	designForce: null,
	bendingStress: null,
	allowableBending: null,
	bendingMargin: null,
	bendingMarginLow: null,
	permittedPower: null,
	permittedTorque: null,
	limits: [],
	limitedBy: null,
	wear: null,
	mateBending: null,
	mesh: null,
	original: null,
	verdict: 'cannot-say',
	reasons: [],
	remedies: [],
	working: []
};

export function draftOf(of: Pick<Member, 'plantId' | 'personId'>, over: Partial<Draft> = {}): Draft {
	return {
		id: newId(),
		plantId: of.plantId,
		authorId: of.personId,
		machineId: newId(),
		positionId: newId(),
		answers: structuredClone(noAnswers),
		entry: null,
		step: 'measure',
		startedAt: AT,
		updatedAt: AT,
		...over
	};
}

export function checkOf(draft: Draft, over: Partial<CheckToKeep> = {}): CheckToKeep {
	return {
		draft,
		performedAt: AT,
		materialRevision: null,
		rulesRevision: 1,
		outcome: cannotSayOutcome,
		...over
	};
}

export function machineChange(seq: number, tag: string, id: string = newId()) {
	const row = { id, tag, name: `Machine ${tag}`, area: 'Hall', origin: 'inch' as const };
	return { entity: 'machine' as const, id, seq, row };
}
