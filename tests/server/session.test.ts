/** Signing in and out, the session's cookie, the plant in which a person works, and what a guard answers. */
import { eq } from 'drizzle-orm';
import { describe, expect, test, vi } from 'vitest';
import { newId } from '$lib/records/ids';
import { homeOf, localPath } from '$lib/server/auth/guard';
import { hashPassword, passwordMatches } from '$lib/server/auth/password';
import { readSession, signIn } from '$lib/server/auth/session';
import { asOwner } from '$lib/server/db/client';
import { memberships, sessions } from '$lib/server/db/schema/people';
import { actions, load } from '../../src/routes/(door)/sign-in/+page.server';
import { POST as signOutPost } from '../../src/routes/(door)/sign-out/+server';
import { POST as workAtPost } from '../../src/routes/(door)/work-at/+server';
import { GET as me } from '../../src/routes/api/v1/me/+server';
import { testDatabases } from './fixtures/database';
import { makePlant, PASSWORD, type TestPlant } from './fixtures/plant';
import { ask, formInit, SESSION_COOKIE, type Asked, type Handler } from './fixtures/request';

vi.mock('$env/dynamic/private', () => ({ env: { DATABASE_URL: process.env['TEST_DATABASE_URL'] } }));

const { web, owner } = testDatabases();

const SIGN_IN: Asked = { route: '/(door)/sign-in', path: '/sign-in' };
const submit = actions.default as Handler;

function submitSignIn(fields: Record<string, string>, change: Partial<Asked> = {}) {
	return ask(submit, { ...SIGN_IN, init: formInit(fields), ...change });
}

async function signedIn(plant: TestPlant, role: 'millwright' | 'planner' | 'supervisor' = 'millwright') {
	const answer = await signIn(web, plant.people[role].email, PASSWORD);
	if (!answer.ok) throw new Error(answer.code);
	return { [SESSION_COOKIE]: answer.session.id };
}

const disable = (plant: TestPlant, personId: string) =>
	asOwner(owner, plant.id, (tx) =>
		tx.update(memberships).set({ disabledAt: new Date() }).where(eq(memberships.userId, personId))
	);

describe('signing in', () => {
	test('the right password opens a session at the plant, by a cookie no script can read', async () => {
		const plant = await makePlant(web, owner);
		const { email } = plant.people.millwright;
		const answer = await submitSignIn({ email: ` ${email.toUpperCase()} `, password: PASSWORD });
		expect(answer.status).toBe(303);
		expect(answer.headers.get('location')).toBe(homeOf('millwright'));
		expect(answer.cookies.options.get(SESSION_COOKIE)).toMatchObject({
			httpOnly: true,
			sameSite: 'lax',
			path: '/',
			secure: false
		});
		const session = await readSession(web, answer.cookies.get(SESSION_COOKIE) ?? '');
		expect(session).toMatchObject({
			person: { id: plant.people.millwright.id, email },
			member: { plantId: plant.id, plantName: plant.name, role: 'millwright', scopeVersion: 1 }
		});
		expect(JSON.stringify(session)).not.toContain('argon2');
	});

	test('a wrong password and an unknown account are answered alike', async () => {
		const plant = await makePlant(web, owner);
		const { email } = plant.people.planner;
		const wrong = await submitSignIn({ email, password: `${PASSWORD}!` });
		const unknown = await submitSignIn({ email: `x${email}`, password: PASSWORD });
		expect([wrong.status, unknown.status]).toEqual([400, 400]);
		expect(await wrong.json()).toEqual({ code: 'wrong', email, next: null });
		expect(await unknown.json()).toEqual({ code: 'wrong', email: `x${email}`, next: null });
		expect(wrong.cookies.get(SESSION_COOKIE)).toBeUndefined();
	});

	test('an empty form, a password beyond the limit, and an account without a plant', async () => {
		const plant = await makePlant(web, owner);
		const { email, id } = plant.people.planner;
		expect(await (await submitSignIn({ email, password: '' })).json()).toMatchObject({ code: 'incomplete' });
		const long = await submitSignIn({ email, password: 'x'.repeat(10_000) });
		expect(await long.json()).toMatchObject({ code: 'wrong' });
		await disable(plant, id);
		expect(await (await submitSignIn({ email, password: PASSWORD })).json()).toMatchObject({
			code: 'no-plant'
		});
		const stranger = await submitSignIn({ email, password: 'not the password' });
		expect(await stranger.json()).toMatchObject({ code: 'wrong' });
	});

	test('goes on to a page of this application only', async () => {
		const plant = await makePlant(web, owner);
		const { email } = plant.people.planner;
		const to = async (next: string) =>
			(await submitSignIn({ email, password: PASSWORD, next })).headers.get('location');
		expect(await to('/checks?verdict=close')).toBe('/checks?verdict=close');
		for (const next of [
			'https://elsewhere.example/',
			'//elsewhere.example',
			'/\\elsewhere.example',
			'x',
			''
		]) {
			expect(await to(next)).toBe(homeOf('planner'));
		}
		expect(localPath('/\t/elsewhere.example')).toBeNull();
		expect(localPath('/%2F/fine')).toBe('/%2F/fine');
	});

	test('ends the session that was there before', async () => {
		const plant = await makePlant(web, owner);
		const before = await signedIn(plant);
		const { email } = plant.people.planner;
		const answer = await submitSignIn({ email, password: PASSWORD }, { cookies: before });
		expect(await readSession(web, before[SESSION_COOKIE] ?? '')).toBeNull();
		expect(await readSession(web, answer.cookies.get(SESSION_COOKIE) ?? '')).not.toBeNull();
	});

	test('the page sends on who is signed in already', async () => {
		const plant = await makePlant(web, owner);
		const cookies = await signedIn(plant, 'planner');
		const there = await ask(load as Handler, { ...SIGN_IN, path: '/sign-in?next=/materials', cookies });
		expect(there.headers.get('location')).toBe('/materials');
		const stranger = await ask(load as Handler, { ...SIGN_IN, path: '/sign-in?next=//x.example' });
		expect(await stranger.json()).toEqual({ next: null });
	});
});

describe('passwords', () => {
	test('are kept as argon2id with 19 MiB and two passes, and match in any Unicode form', async () => {
		const kept = await hashPassword('caf\u00e9 on the winder');
		expect(kept).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
		expect(await passwordMatches(kept, 'cafe\u0301 on the winder')).toBe(true);
		expect(await passwordMatches(kept, 'cafe on the winder')).toBe(false);
		expect(await passwordMatches(null, 'anything')).toBe(false);
	});
});

describe('sessions', () => {
	const ME: Asked = { route: '/api/v1/me', path: '/api/v1/me' };

	test('tell who is here, and end by signing out', async () => {
		const plant = await makePlant(web, owner);
		const cookies = await signedIn(plant);
		const here = await ask(me, { ...ME, cookies });
		expect(await here.json()).toEqual({
			person: {
				id: plant.people.millwright.id,
				name: plant.people.millwright.name,
				email: plant.people.millwright.email,
				locale: 'en'
			},
			plant: {
				id: plant.id,
				name: plant.name,
				note: `Note of ${plant.canary}`,
				role: 'millwright',
				scopeVersion: 1
			},
			memberships: [{ plantId: plant.id, plantName: plant.name, role: 'millwright' }]
		});
		const out = await ask(signOutPost as Handler, {
			route: '/(door)/sign-out',
			path: '/sign-out',
			cookies,
			init: formInit({})
		});
		expect(out.headers.get('location')).toBe('/sign-in');
		expect(out.cookies.get(SESSION_COOKIE)).toBeUndefined();
		expect((await ask(me, { ...ME, cookies })).status).toBe(401);
	});

	test('end with time, and are renewed by use', async () => {
		const plant = await makePlant(web, owner);
		const cookies = await signedIn(plant);
		const id = cookies[SESSION_COOKIE] ?? '';
		const ends = (inDays: number) =>
			web.db
				.update(sessions)
				.set({ expiresAt: new Date(Date.now() + inDays * 24 * 60 * 60 * 1000) })
				.where(eq(sessions.id, id));
		await ends(3);
		const renewed = await ask(me, { ...ME, cookies });
		expect(renewed.status).toBe(200);
		expect(renewed.cookies.options.get(SESSION_COOKIE)?.['expires']).toBeInstanceOf(Date);
		await ends(-1);
		const late = await ask(me, { ...ME, cookies });
		expect(late.status).toBe(401);
		expect(late.cookies.get(SESSION_COOKIE)).toBeUndefined();
		expect((await ask(me, { ...ME, cookies: { [SESSION_COOKIE]: 'made up' } })).status).toBe(401);
	});

	test('lose the plant when the right is taken, without another one stepping in', async () => {
		const plant = await makePlant(web, owner);
		const other = await makePlant(web, owner);
		const personId = plant.people.millwright.id;
		await asOwner(owner, other.id, (tx) =>
			tx.insert(memberships).values({ plantId: other.id, userId: personId, role: 'planner' })
		);
		const cookies = await signedIn(plant);
		const id = cookies[SESSION_COOKIE] ?? '';
		const before = (await readSession(web, id))?.member?.plantId;
		const [taken, left] = before === plant.id ? [plant, other] : [other, plant];
		await disable(taken, personId);
		const after = await readSession(web, id);
		expect(after).toMatchObject({ member: null, memberships: [{ plantId: left.id }] });
	});

	test('move to another plant of the person, and to no other', async () => {
		const plant = await makePlant(web, owner);
		const second = await makePlant(web, owner);
		const foreign = await makePlant(web, owner);
		const personId = plant.people.millwright.id;
		await asOwner(owner, second.id, (tx) =>
			tx.insert(memberships).values({ plantId: second.id, userId: personId, role: 'planner' })
		);
		const cookies = await signedIn(plant);
		const move = (to: string) =>
			ask(workAtPost as Handler, {
				route: '/(door)/work-at',
				path: '/work-at',
				cookies,
				init: formInit({ plant: to })
			});
		const there = async () => (await readSession(web, cookies[SESSION_COOKIE] ?? ''))?.member;
		expect((await move(second.id)).headers.get('location')).toBe(homeOf('planner'));
		expect(await there()).toMatchObject({ plantId: second.id, role: 'planner' });
		expect((await move(plant.id)).headers.get('location')).toBe(homeOf('millwright'));
		for (const to of [foreign.id, newId(), 'nonsense']) expect((await move(to)).status).toBe(404);
		expect(await there()).toMatchObject({ plantId: plant.id, role: 'millwright' });
	});
});
