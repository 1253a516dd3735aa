/** The plant's rules as they stand, with who stated them. */
import { desc, eq } from 'drizzle-orm';
import type { PlantRules } from '$lib/records/plant-rules';
import { readPlant, type Scope } from '../client';
import { plantRules } from '../schema/materials';
import { users } from '../schema/people';

export interface RulesInForce {
	revision: number;
	rules: PlantRules;
	createdAt: Date;
	createdByName: string;
}

export async function rulesInForce(scope: Scope): Promise<RulesInForce> {
	const [row] = await readPlant(scope, (tx) =>
		tx
			.select({
				revision: plantRules.revision,
				rules: plantRules.rules,
				createdAt: plantRules.createdAt,
				createdByName: users.name
			})
			.from(plantRules)
			.innerJoin(users, eq(users.id, plantRules.createdBy))
			.where(eq(plantRules.plantId, scope.plantId))
			.orderBy(desc(plantRules.revision))
			.limit(1)
	);
	if (!row) throw new Error('This plant has no rules.');
	return row;
}
