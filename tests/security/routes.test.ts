/**
 * Every route of `src/routes` by every principal, with things of their own and of another plant. What a person
 * may not see is refused, what is another plant's is not there, and no answer holds another plant's text.
 */
import { and, eq } from 'drizzle-orm';
import { beforeAll, describe, expect, test, vi } from 'vitest';
import { ROLES } from '$lib/records/protocol';
import { lucia } from '$lib/server/auth/lucia';
import { asOwner, inPlant } from '$lib/server/db/client';
import { quarantine } from '$lib/server/db/schema/checks';
import { memberships } from '$lib/server/db/schema/people';
import { plantCounters } from '$lib/server/db/schema/plants';
import { tablets } from '$lib/server/db/schema/tablets';
import { testDatabases } from '../server/fixtures/database';
import { makePlant, type TestPlant } from '../server/fixtures/plant';
import { fillPlant } from '../server/fixtures/record';
import { ask, SESSION_COOKIE, type Handler } from '../server/fixtures/request';
import { KNOWN_ROUTES, type KnownRoute, type Target } from './known-routes';

vi.mock('$env/dynamic/private', () => ({
	env: { DATABASE_URL: process.env['TEST_DATABASE_URL'], COGMARK_SECRET: 'x'.repeat(32) }
}));

const { web, owner } = testDatabases();

type Place = 'here' | 'there';
const PLACES: Place[] = ['here', 'there'];
const other = (place: Place): Place => (place === 'here' ? 'there' : 'here');

interface Principal {
	name: string;
	/** The person behind the session; null for who has none. */
	person: { place: Place; role: (typeof ROLES)[number] } | null;
	/** The person's right at the plant was taken after signing in. */
	disabled?: true;
}

const PRINCIPALS: Principal[] = [
	{ name: 'anonymous', person: null },
	...PLACES.flatMap((place) =>
		ROLES.map((role): Principal => ({ name: `${role} ${place}`, person: { place, role } }))
	),
	{ name: 'disabled supervisor', person: { place: 'here', role: 'supervisor' }, disabled: true }
];

const METHODS = ['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS', 'fallback'];
type Module = Record<string, unknown> & { actions?: Record<string, Handler> };
const files = import.meta.glob<Module>('/src/routes/**/+{server,page.server,layout.server}.ts');

/** `GET /api/v1/me`, `load /(office)/machines`, `action default /(door)/sign-in`. */
const found = new Map<string, { route: string; handler: Handler }>();
const targets = {} as Record<Place, Target>;
/** A third plant, whose supervisor lost the right after signing in. */
let disabledAt: TestPlant;

beforeAll(async () => {
	for (const [path, load] of Object.entries(files)) {
		const route = path.replace('/src/routes', '').replace(/\/\+[a-z.]+$/, '') || '/';
		const module = await load();
		const add = (name: string, handler: unknown) => found.set(name, { route, handler: handler as Handler });
		for (const method of METHODS) if (module[method]) add(`${method} ${route}`, module[method]);
		if (module['load']) add(`load ${route}`, module['load']);
		for (const [action, handler] of Object.entries(module.actions ?? {})) {
			add(`action ${action} ${route}`, handler);
		}
	}
	for (const place of PLACES) {
		const plant = await makePlant(web, owner);
		targets[place] = { plant, checkId: (await fillPlant(plant)).checkId };
	}
	disabledAt = await makePlant(web, owner);
	await asOwner(owner, disabledAt.id, (tx) =>
		tx
			.update(memberships)
			.set({ disabledAt: new Date() })
			.where(
				and(eq(memberships.plantId, disabledAt.id), eq(memberships.userId, disabledAt.people.supervisor.id))
			)
	);
});

test('the table of known routes is complete, and names none that is gone', () => {
	expect([...found.keys()].sort()).toEqual(Object.keys(KNOWN_ROUTES).sort());
});

function plantOf({ person, disabled }: Principal): TestPlant | null {
	if (disabled) return disabledAt;
	return person && targets[person.place].plant;
}

async function sessionOf(principal: Principal): Promise<Record<string, string>> {
	const plant = plantOf(principal);
	if (!plant || !principal.person) return {};
	const { id } = plant.people[principal.person.role];
	const session = await lucia(web).createSession(id, { plantId: plant.id });
	return { [SESSION_COOKIE]: session.id };
}

/** Statuses that are right for a principal, when the request names things of their plant or of another. */
function expected(name: string, known: KnownRoute, principal: Principal, own: boolean): readonly number[] {
	const { who } = known;
	const { person, disabled } = principal;
	if (who === 'anyone') return known.status;
	if (!person) return [name.includes('/api/') ? 401 : 303];
	if (who !== 'person') {
		if (disabled) return [403];
		if (who !== 'member' && !who.includes(person.role)) return [403];
	}
	if (known.foreign !== undefined && (!own || disabled)) return [known.foreign];
	return known.status;
}

/** What would differ if anything had been written in a plant. */
function fingerprint(plant: TestPlant) {
	return inPlant(plant.scope.planner, async (tx) => ({
		counters: await tx.select().from(plantCounters),
		refused: await tx.select({ id: quarantine.id }).from(quarantine),
		tablets: await tx.select({ id: tablets.id }).from(tablets)
	}));
}

describe.each(Object.entries(KNOWN_ROUTES))('%s', (name, known) => {
	const of = known.foreign === undefined ? (['own'] as const) : (['own', 'foreign'] as const);
	const cases = PRINCIPALS.flatMap((principal) => of.map((whose) => ({ principal, whose })));

	test.each(cases)('$principal.name, $whose', async ({ principal, whose }) => {
		const route = found.get(name);
		if (!route) throw new Error('This route is gone: take it out of the table.');
		const home = principal.person?.place ?? 'here';
		const target = targets[whose === 'own' ? home : other(home)];
		const cookies = await sessionOf(principal);
		const asked = { path: '/asked', ...(await known.asked?.(target)), route: route.route, cookies };
		const stranger = plantOf(principal)?.id !== target.plant.id;
		const before = await fingerprint(target.plant);

		const response = await ask(route.handler, asked);

		const text = (await response.text()) + JSON.stringify([...response.headers]);
		expect(expected(name, known, principal, whose === 'own'), text).toContain(response.status);
		if (response.status === 303 && known.who !== 'anyone' && !principal.person) {
			expect(response.headers.get('location')).toMatch(/^\/sign-in/);
		}
		const canaries = [...PLACES.map((place) => targets[place].plant), disabledAt];
		for (const plant of canaries) {
			if (plant.id !== plantOf(principal)?.id) expect(text).not.toContain(plant.canary);
		}
		if (stranger) expect(await fingerprint(target.plant)).toEqual(before);
	});
});

test('a record of another plant leaves nothing at the plant of the sender', async () => {
	const { here, there } = targets;
	const push = found.get('POST /api/v1/push');
	const asked = await KNOWN_ROUTES['POST /api/v1/push']!.asked!(there);
	const cookies = await sessionOf({ name: '', person: { place: 'here', role: 'millwright' } });
	const before = await fingerprint(here.plant);
	const response = await ask(push!.handler, { path: '/', ...asked, route: '/api/v1/push', cookies });
	expect((await response.json()).answers).toMatchObject([{ status: 'retry' }]);
	const after = await fingerprint(here.plant);
	expect(after.refused).toEqual(before.refused);
	expect(after.counters[0]?.head).toBe(before.counters[0]?.head);
});

test('the matrix would notice: rows of both plants are there, with their canaries', async () => {
	for (const place of PLACES) {
		const { plant } = targets[place];
		const cookies = await sessionOf({ name: '', person: { place, role: 'planner' } });
		const pull = found.get('GET /api/v1/pull');
		const response = await ask(pull!.handler, { path: '/', route: '/api/v1/pull', cookies });
		const text = await response.text();
		expect(text.split(plant.canary).length).toBeGreaterThan(8);
	}
});
