/** The edge of the API: what is refused before anything is read, the sizes, the contract's errors, the headers. */
import { beforeAll, describe, expect, test, vi } from 'vitest';
import {
	PUSH_MAX_BYTES,
	PUSH_MAX_RECORDS,
	pullResponse,
	pushResponse,
	wholeError
} from '$lib/records/protocol';
import { signIn } from '$lib/server/auth/session';
import { inPlant } from '$lib/server/db/client';
import { checks } from '$lib/server/db/schema/checks';
import { GET as health } from '../../src/routes/health/+server';
import { POST as evaluate } from '../../src/routes/api/v1/evaluate/+server';
import { GET as pull } from '../../src/routes/api/v1/pull/+server';
import { POST as push } from '../../src/routes/api/v1/push/+server';
import { testDatabases } from './fixtures/database';
import { makePlant, PASSWORD, type TestPlant } from './fixtures/plant';
import { makeRecord, makeTablet, pushOf, statuses } from './fixtures/record';
import { ask, jsonInit, ORIGIN, SESSION_COOKIE } from './fixtures/request';

vi.mock('$env/dynamic/private', () => ({
	env: {
		DATABASE_URL: process.env['TEST_DATABASE_URL'],
		COGMARK_SECRET: 'a secret of thirty-two characters',
		COGMARK_VERSION: '1.2.3'
	}
}));

const { web, owner } = testDatabases();
let plant: TestPlant;
let cookies: Record<string, string>;

beforeAll(async () => {
	plant = await makePlant(web, owner);
	const answer = await signIn(web, plant.people.millwright.email, PASSWORD);
	cookies = { [SESSION_COOKIE]: answer.ok ? answer.session.id : '' };
});

const pushing = (init: RequestInit) =>
	ask(push, { route: '/api/v1/push', path: '/api/v1/push', cookies, init });
const evaluating = (body: unknown) =>
	ask(evaluate, { route: '/api/v1/evaluate', path: '/api/v1/evaluate', cookies, init: jsonInit(body) });
const codeOf = async (response: Response) => wholeError.parse(await response.json()).error.code;

describe('push', () => {
	test('takes records in and answers each', async () => {
		const tablet = makeTablet();
		const record = await makeRecord(plant, tablet);
		const response = await pushing(jsonInit(pushOf(tablet, [record, 'bad'])));
		expect(response.status).toBe(200);
		expect(statuses(pushResponse.parse(await response.json()).answers)).toEqual(['stored', 'bad-content']);
		expect(response.headers.get('cache-control')).toBe('no-store');
	});

	test('refuses what a page of another site could send', async () => {
		const tablet = makeTablet();
		const body = JSON.stringify(pushOf(tablet, []));
		const good = { 'content-type': 'application/json', 'x-cogmark': '1' };
		const send = (headers: Record<string, string>) => pushing({ method: 'POST', headers, body });
		expect((await send({ ...good, origin: ORIGIN })).status).toBe(200);
		for (const headers of [
			{ 'content-type': 'application/json' },
			{ ...good, 'x-cogmark': '2' },
			{ ...good, origin: 'https://elsewhere.example' },
			{ ...good, origin: 'http://cogmark.test.elsewhere.example' },
			{ ...good, origin: 'null' }
		]) {
			const response = await send(headers);
			expect([response.status, await codeOf(response)]).toEqual([403, 'not-allowed']);
		}
		for (const type of ['text/plain', 'application/x-www-form-urlencoded', 'application/jsonx', '']) {
			const response = await send({ ...good, 'content-type': type });
			expect([response.status, await codeOf(response)]).toEqual([422, 'invalid-input']);
		}
	});

	test('says what is wrong with a body, field by field', async () => {
		const tablet = makeTablet();
		for (const [body, path] of [
			['{"tabletId":', ''],
			['null', ''],
			[{ ...pushOf(tablet, []), tabletId: 'x' }, 'tabletId'],
			[{ ...pushOf(tablet, []), drawn: [{ authorId: tablet.id, highest: -1 }] }, 'drawn.0.highest'],
			[{ ...pushOf(tablet, []), records: {} }, 'records']
		] as const) {
			const response = await pushing(jsonInit(body));
			expect(response.status).toBe(422);
			const { error } = wholeError.parse(await response.json());
			expect(error.issues?.map((issue) => issue.path)).toEqual([path]);
			expect(error.issues?.[0]?.message).toMatch(/\w{3}/);
		}
		const notText = await pushing({ ...jsonInit(''), body: new Uint8Array([0x22, 0xff, 0x22]) });
		expect(notText.status).toBe(422);
	});

	test('asks for less when it is too much, by count and by bytes, and stores nothing of it', async () => {
		const tablet = makeTablet();
		const record = await makeRecord(plant, tablet);
		const before = await inPlant(plant.scope.planner, (tx) => tx.select().from(checks));
		const many = pushOf(tablet, [record, ...Array.from({ length: PUSH_MAX_RECORDS }, () => null)]);
		const long = JSON.stringify({ ...pushOf(tablet, [record]), padding: 'x'.repeat(PUSH_MAX_BYTES) });
		const unannounced = new ReadableStream({
			pull(controller) {
				controller.enqueue(new TextEncoder().encode('"'.padEnd(64 * 1024, 'x')));
			}
		});
		const streamed = { ...jsonInit(''), body: unannounced, duplex: 'half' } as RequestInit;
		for (const init of [jsonInit(many), jsonInit(long), streamed]) {
			const response = await pushing(init);
			expect([response.status, await codeOf(response)]).toEqual([413, 'too-large']);
		}
		const after = await inPlant(plant.scope.planner, (tx) => tx.select().from(checks));
		expect(after).toHaveLength(before.length);
	});

	test('takes the largest batch that is allowed', async () => {
		const tablet = makeTablet();
		const records = Array.from({ length: PUSH_MAX_RECORDS }, () => null);
		expect((await pushing(jsonInit(pushOf(tablet, records)))).status).toBe(200);
	});
});

test('pull goes on from its own cursor and starts anew from another', async () => {
	const pulling = (query: string) =>
		ask(pull, { route: '/api/v1/pull', path: `/api/v1/pull${query}`, cookies });
	const first = pullResponse.parse(await (await pulling('')).json());
	expect(first.reset).toBe('start');
	const next = await pulling(`?cursor=${encodeURIComponent(first.cursor)}`);
	expect(pullResponse.parse(await next.json())).toMatchObject({ reset: null, changes: [] });
	expect((await (await pulling('?cursor=')).json()).reset).toBe('start');
	expect((await (await pulling('?cursor=x.y')).json()).reset).toBe('cursor');
});

describe('evaluate', () => {
	const question = {
		gear: {
			kind: 'spur',
			teeth: 24,
			pitch: { system: 'diametral', value: 6 },
			pressureAngle: 20,
			form: 'full-depth',
			faceWidth: { value: 1.5, unit: 'in' },
			finish: 'cut',
			material: {
				name: 'Iron',
				metallic: true,
				allowableBending: { value: 8500, unit: 'psi' },
				permitted: true
			}
		},
		drive: {
			load: { power: { value: 2, unit: 'hp' } },
			speed: { value: 600, unit: 'rpm' },
			serviceFactor: 1
		}
	};
	const bad = { ...question, gear: { ...question.gear, teeth: 2.5 } };

	test('answers a question as the core does', async () => {
		const response = await evaluating(question);
		expect(response.status).toBe(200);
		const outcome = await response.json();
		expect(outcome).toMatchObject({ verdict: 'carries', pitchDiameter: expect.closeTo(101.6, 6) });
	});

	test('answers bad input with the error of the contract and nothing else', async () => {
		const response = await evaluating(bad);
		expect(response.status).toBe(422);
		const body = await response.json();
		expect(body).toEqual({ error: { code: 'invalid-input', issues: [expect.anything()] } });
		expect(body.error.issues[0].path).toBe('gear.teeth');
	});

	test('answers a list in its order, errors in place', async () => {
		const response = await evaluating([question, bad, question]);
		expect(response.status).toBe(200);
		const answers = await response.json();
		expect(answers.map((answer: object) => 'error' in answer)).toEqual([false, true, false]);
	});
});

test('health tells state and version, and every answer carries the protecting headers', async () => {
	const response = await ask(health, { route: '/health', path: '/health' });
	expect(response.status).toBe(200);
	expect(await response.json()).toEqual({ status: 'ok', database: 'ok', version: '1.2.3' });
	expect(Object.fromEntries(response.headers)).toMatchObject({
		'x-content-type-options': 'nosniff',
		'x-frame-options': 'DENY',
		'content-security-policy': "frame-ancestors 'none'",
		'referrer-policy': 'same-origin',
		'permissions-policy': expect.stringContaining('camera=(self)'),
		'cache-control': 'no-store'
	});
});
