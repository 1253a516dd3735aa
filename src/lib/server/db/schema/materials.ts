/**
 * The plant's materials and rules, in revisions that are only ever added: a record keeps the revision it was
 * made with, and that revision can always be read again.
 */
import { foreignKey, integer, jsonb, pgTable, primaryKey, uuid } from 'drizzle-orm/pg-core';
import type { MaterialStatement } from '$lib/records/material';
import type { PlantRules } from '$lib/records/plant-rules';
import { memberships } from './people';
import { moment, plants } from './plants';

export const materials = pgTable(
	'materials',
	{
		plantId: uuid()
			.notNull()
			.references(() => plants.id),
		id: uuid().notNull()
	},
	(t) => [primaryKey({ name: 'materials_pk', columns: [t.plantId, t.id] })]
);

export const materialRevisions = pgTable(
	'material_revisions',
	{
		plantId: uuid().notNull(),
		materialId: uuid().notNull(),
		revision: integer().notNull(),
		statement: jsonb().$type<MaterialStatement>().notNull(),
		createdBy: uuid().notNull(),
		createdAt: moment().notNull()
	},
	(t) => [
		primaryKey({ name: 'material_revisions_pk', columns: [t.plantId, t.materialId, t.revision] }),
		foreignKey({
			name: 'material_revisions_material_fk',
			columns: [t.plantId, t.materialId],
			foreignColumns: [materials.plantId, materials.id]
		}),
		foreignKey({
			name: 'material_revisions_created_by_fk',
			columns: [t.plantId, t.createdBy],
			foreignColumns: [memberships.plantId, memberships.userId]
		})
	]
);

export const plantRules = pgTable(
	'plant_rules',
	{
		plantId: uuid()
			.notNull()
			.references(() => plants.id),
		revision: integer().notNull(),
		rules: jsonb().$type<PlantRules>().notNull(),
		createdBy: uuid().notNull(),
		createdAt: moment().notNull()
	},
	(t) => [
		primaryKey({ name: 'plant_rules_pk', columns: [t.plantId, t.revision] }),
		foreignKey({
			name: 'plant_rules_created_by_fk',
			columns: [t.plantId, t.createdBy],
			foreignColumns: [memberships.plantId, memberships.userId]
		})
	]
);
