/** The plant's tools: a supervisor states them in revisions, and a check is weighed by the revision it was made with. */
import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';
import { firstBrokenAudit } from '$lib/server/audit';
import { reviseTools } from '$lib/server/commands/rules';
import { storeRecords } from '$lib/server/commands/records';
import { inPlant } from '$lib/server/db/client';
import { checkPage } from '$lib/server/db/queries/checks';
import { pullPage } from '$lib/server/db/queries/pull';
import { rulesInForce } from '$lib/server/db/queries/rules';
import { audit } from '$lib/server/db/schema/audit';
import { testDatabases } from './fixtures/database';
import { makePlant } from './fixtures/plant';
import { makeRecord, makeTablet, pushOf, statuses } from './fixtures/record';

const { web, owner } = testDatabases();

test('a revision changes the tools and nothing else, and is told to the tablets', async () => {
	const plant = await makePlant(web, owner);
	const { supervisor, planner } = plant.scope;
	const before = await rulesInForce(planner);
	const instruments = { calliper: 0.05, 'pi-tape': 0.02 };
	expect(await reviseTools(supervisor, { expectedRevision: 1, instruments })).toEqual({
		ok: true,
		revision: 2
	});
	const after = await rulesInForce(planner);
	expect(after).toMatchObject({ revision: 2, createdByName: plant.people.supervisor.name });
	expect(after.rules).toEqual({ ...before.rules, instruments });
	const page = await pullPage(plant.scope.millwright, { cursor: null, secret: 'a secret of this test' });
	const told = page.changes.filter(({ entity }) => entity === 'rules');
	expect(told).toMatchObject([{ row: { revision: 2, rules: { instruments } } }]);
	const trail = await inPlant(supervisor, (tx) =>
		tx.select().from(audit).where(eq(audit.action, 'rules-revised'))
	);
	expect(trail).toMatchObject([{ detail: { revision: 2, instruments } }]);
	expect(await firstBrokenAudit(supervisor)).toBeNull();
});

test('what is out of range, not known, or made against an older revision is refused and keeps nothing', async () => {
	const plant = await makePlant(web, owner);
	const { supervisor } = plant.scope;
	for (const instruments of [{ calliper: 0 }, { calliper: 21 }, { laser: 0.1 }, { rule: '0.2' }, null]) {
		const answer = await reviseTools(supervisor, { expectedRevision: 1, instruments });
		expect(answer).toMatchObject({ ok: false, code: 'invalid-input' });
	}
	expect(await reviseTools(supervisor, { expectedRevision: 1, instruments: {} })).toMatchObject({ ok: true });
	expect(await reviseTools(supervisor, { expectedRevision: 1, instruments: { rule: 0.4 } })).toEqual({
		ok: false,
		code: 'stale',
		revision: 2
	});
	expect((await rulesInForce(supervisor)).revision).toBe(2);
});

test('two supervisors at once: one revision each, or one is told', async () => {
	const plant = await makePlant(web, owner);
	const answers = await Promise.all(
		[0.02, 0.03].map((calliper) =>
			reviseTools(plant.scope.supervisor, { expectedRevision: 1, instruments: { calliper } })
		)
	);
	expect(answers.filter(({ ok }) => ok)).toHaveLength(1);
	expect(answers.filter(({ ok }) => !ok)).toMatchObject([{ code: 'stale', revision: 2 }]);
});

test('nobody but a supervisor states them', async () => {
	const plant = await makePlant(web, owner);
	for (const who of ['planner', 'millwright'] as const) {
		await expect(reviseTools(plant.scope[who], { expectedRevision: 1, instruments: {} })).rejects.toThrow();
	}
	expect((await rulesInForce(plant.scope.supervisor)).revision).toBe(1);
});

test('a check that was left open is answered alike on both sides, gear by gear', async () => {
	const plant = await makePlant(web, owner);
	const tablet = makeTablet();
	const record = await makeRecord(plant, tablet, {
		answers: {
			origin: 'inch',
			teeth: { typed: '25', value: 25, unit: 'teeth', source: 'tally' },
			secondCount: { typed: '25', value: 25, unit: 'teeth', source: 'keypad' },
			outsideDiameter: {
				typed: '5.389',
				value: 5.389,
				unit: 'in',
				source: 'typed',
				instrument: 'calliper',
				earlier: [{ typed: '5.391', value: 5.391, unit: 'in', source: 'keypad' }]
			},
			spans: [{ teeth: 3, reading: { cannotMeasure: true } }],
			severalGears: true,
			pitch: null,
			pressureAngle: null,
			form: null
		}
	});
	const { answers } = await storeRecords(plant.scope.millwright, pushOf(tablet, [record]));
	expect(statuses(answers)).toEqual(['stored']);
	const page = await checkPage(plant.scope.planner, record.id);
	expect(page).toMatchObject({ agrees: true });
	expect(page?.serverOutcome).toEqual(record.body.outcome);
	expect(page?.serverOutcome.gears?.length).toBeGreaterThan(1);
});
