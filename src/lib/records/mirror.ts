/**
 * Rows as a tablet holds them: what `pull` sends. A row replaces the one with the same entity and id; a null
 * row is a tombstone.
 */
import { z } from 'zod';
import { uuid } from './ids';
import { materialStatement } from './material';
import { plantRules } from './plant-rules';

const length = z.strictObject({ value: z.number().positive(), unit: z.enum(['mm', 'cm', 'm', 'in', 'ft']) });

export const pitch = z.discriminatedUnion('system', [
	z.strictObject({ system: z.literal('diametral'), value: z.number().positive().max(200) }),
	z.strictObject({ system: z.literal('module'), value: z.number().positive().max(100) }),
	z.strictObject({
		system: z.literal('circular'),
		value: z.number().positive().max(1000),
		unit: z.enum(['in', 'mm'])
	})
]);
export type ChosenPitch = z.infer<typeof pitch>;

export const machineRow = z.object({
	id: uuid,
	tag: z.string(),
	name: z.string(),
	area: z.string(),
	/** Where its gears are likely to come from: decides the unit that is offered first. */
	origin: z.enum(['inch', 'metric'])
});
export type MachineRow = z.infer<typeof machineRow>;

/** The gear last known at a position. Offered with its date, never counted as a reading. */
export const knownGear = z.object({
	teeth: z.number().int().positive(),
	pitch,
	pressureAngle: z.number(),
	form: z.enum(['full-depth', 'stub']),
	faceWidth: length,
	finish: z.enum(['cast', 'cut', 'hobbed', 'ground']),
	materialId: uuid.nullable(),
	asOf: z.iso.date()
});
export type KnownGear = z.infer<typeof knownGear>;

export const knownDrive = z.object({
	power: z.object({ value: z.number().positive(), unit: z.enum(['hp', 'kW', 'W']) }).nullable(),
	speedRpm: z.number().positive().nullable(),
	duty: z.enum(['uniform', 'light-shock', 'medium-shock', 'heavy-shock']),
	reversing: z.boolean()
});
export type KnownDrive = z.infer<typeof knownDrive>;

export const positionRow = z.object({
	id: uuid,
	machineId: uuid,
	name: z.string(),
	ordinal: z.number().int(),
	mateTeeth: z.number().int().positive().nullable(),
	gear: knownGear.nullable(),
	drive: knownDrive.nullable()
});
export type PositionRow = z.infer<typeof positionRow>;

export const materialRow = materialStatement.safeExtend({ id: uuid, revision: z.number().int().positive() });
export type MaterialRow = z.infer<typeof materialRow>;

export const rulesRow = z.object({ revision: z.number().int().positive(), rules: plantRules });
export type RulesRow = z.infer<typeof rulesRow>;

/** A past check, in short: what a millwright is shown at the position. */
export const checkRow = z.object({
	id: uuid,
	positionId: uuid,
	performedAt: z.string(),
	receivedAt: z.string(),
	authorName: z.string(),
	verdict: z.enum(['carries', 'close', 'will-not-carry', 'not-permitted', 'cannot-say']),
	bendingMargin: z.number().nullable(),
	bendingMarginLow: z.number().nullable()
});
export type CheckRow = z.infer<typeof checkRow>;

export const ENTITIES = ['machine', 'position', 'material', 'rules', 'check'] as const;
export type Entity = (typeof ENTITIES)[number];

const seq = z.number().int().positive();
const change = <E extends Entity, R extends z.ZodType>(entity: E, row: R) =>
	z.object({ entity: z.literal(entity), id: uuid, seq, row: row.nullable() });

export const mirrorChange = z.discriminatedUnion('entity', [
	change('machine', machineRow),
	change('position', positionRow),
	change('material', materialRow),
	change('rules', rulesRow),
	change('check', checkRow)
]);
export type MirrorChange = z.infer<typeof mirrorChange>;
