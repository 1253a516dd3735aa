/** With no database to ask: nobody is taken for signed out, pages that need none still come, health says so. */
import { createServer, type AddressInfo, type Server, type Socket } from 'node:net';
import { afterAll, beforeAll, expect, test, vi } from 'vitest';
import { requireMember } from '$lib/server/auth/guard';
import { actions } from '../../src/routes/(door)/sign-in/+page.server';
import { POST as signOut } from '../../src/routes/(door)/sign-out/+server';
import { GET as me } from '../../src/routes/api/v1/me/+server';
import { GET as pull } from '../../src/routes/api/v1/pull/+server';
import { GET as health } from '../../src/routes/health/+server';
import { handleError } from '../../src/hooks.server';
import { ask, formInit, SESSION_COOKIE, type Handler } from './fixtures/request';

const env = vi.hoisted(() => ({}) as Record<string, string>);
vi.mock('$env/dynamic/private', () => ({ env }));

const cookies = { [SESSION_COOKIE]: 'a session that cannot be looked up' };

const portOf = (server: Server) => (server.address() as AddressInfo).port;
const listening = (server: Server) => new Promise<void>((done) => server.listen(0, '127.0.0.1', done));
const addressAt = (port: number) => `postgres://nobody@127.0.0.1:${port}/nothing`;

beforeAll(async () => {
	// A port that was free a moment ago: connections to it are refused.
	const gone = createServer();
	await listening(gone);
	env['DATABASE_URL'] = addressAt(portOf(gone));
	await new Promise((done) => gone.close(done));
});
afterAll(() => vi.restoreAllMocks());

test('health answers 503 with the same keys', async () => {
	const response = await ask(health, { route: '/health', path: '/health' });
	expect(response.status).toBe(503);
	expect(await response.json()).toEqual({
		status: 'failing',
		database: 'unreachable',
		version: expect.stringMatching(/^\d+\.\d+\.\d+/)
	});
});

test('the API says busy, with a time to come back, and keeps the cookie', async () => {
	for (const [handler, route] of [
		[me, '/api/v1/me'],
		[pull, '/api/v1/pull']
	] as const) {
		const response = await ask(handler, { route, path: route, cookies });
		expect(response.status).toBe(503);
		expect(Number(response.headers.get('retry-after'))).toBeGreaterThan(0);
		expect((await response.json()).error.code).toBe('busy');
		expect(response.cookies.get(SESSION_COOKIE)).toBe(cookies[SESSION_COOKIE]);
	}
});

test('a page of the office is 503, not the sign-in page', async () => {
	const load: Handler = (event) => requireMember(event);
	const response = await ask(load, { route: '/(office)/machines', path: '/machines', cookies });
	expect([response.status, (await response.json()).code]).toEqual([503, 'busy']);
});

test("the tablet's pages do not ask the database at all", async () => {
	const page: Handler = ({ locals }) => ({ outage: locals.outage });
	const response = await ask(page, { route: '/(tablet)/tablet', path: '/tablet', cookies });
	expect(await response.json()).toEqual({ outage: false });
});

test('signing in says that it cannot be done now; signing out clears this device', async () => {
	const init = formInit({ email: 'someone@somewhere.example', password: 'whatever it is' });
	const refused = await ask(actions.default as Handler, { route: '/(door)/sign-in', path: '/sign-in', init });
	expect([refused.status, (await refused.json()).code]).toEqual([503, 'busy']);
	const out = await ask(signOut as Handler, {
		route: '/(door)/sign-out',
		path: '/sign-out',
		cookies,
		init: formInit({})
	});
	expect(out.headers.get('location')).toBe('/sign-in');
	expect(out.cookies.get(SESSION_COOKIE)).toBeUndefined();
});

test('an unexpected failure is logged under an id, and neither log nor answer repeats a value', () => {
	const log = vi.spyOn(console, 'error').mockImplementation(() => {});
	const failure = Object.assign(new Error('Failed query: insert … params: hush-hush'), {
		cause: new Error('Key (email)=(hush-hush) already exists.')
	});
	const event = { request: new Request('http://x.test/?q=hush-hush'), route: { id: '/x' } };
	const answer = handleError({ error: failure, event, status: 500, message: 'Internal Error' } as never);
	expect(answer).toMatchObject({ code: 'failed', id: expect.stringMatching(/^[0-9a-f]{8}$/) });
	const line = JSON.parse(String(log.mock.calls[0]?.[0]));
	expect(line).toMatchObject({ id: (answer as { id: string }).id, where: 'GET /x' });
	expect(line.stack.length).toBeGreaterThan(0);
	expect(JSON.stringify([answer, line])).not.toContain('hush-hush');
});

test('health does not wait long for a database that takes the connection and says nothing', async () => {
	const held: Socket[] = [];
	const silent = createServer((socket) => held.push(socket));
	await listening(silent);
	try {
		env['DATABASE_URL'] = addressAt(portOf(silent));
		vi.resetModules();
		const { GET } = await import('../../src/routes/health/+server');
		const started = Date.now();
		const response = await ask(GET, { route: '/health', path: '/health' });
		expect(response.status).toBe(503);
		expect(Date.now() - started).toBeLessThan(4000);
		expect(held).toHaveLength(1);
	} finally {
		for (const socket of held) socket.destroy();
		silent.close();
	}
});
