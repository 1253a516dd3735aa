/** Language of a request, and what hooks make of a rendered page. */
import type { Handle } from '@sveltejs/kit';
import { expect, test, vi } from 'vitest';
import { handle } from '../../src/hooks.server';
import { ask } from './fixtures/request';

vi.mock('$env/dynamic/private', () => ({ env: {} }));

async function languageFor(cookies: Record<string, string>, accept?: string): Promise<string> {
	const headers: HeadersInit = accept === undefined ? {} : { 'accept-language': accept };
	const response = await ask(({ locals }) => ({ language: locals.language }), {
		route: '/offline',
		path: '/offline',
		cookies,
		init: { headers }
	});
	return (await response.json()).language;
}

test.each([
	[{ language: 'es' }, 'en', 'es'],
	[{ language: 'xx' }, 'es-MX,es;q=0.9', 'es'],
	[{}, 'fr-CA, es;q=0.8, en;q=0.7', 'es'],
	[{}, 'de', 'en'],
	[{}, undefined, 'en']
])('cookie %o and header %s give %s', async (cookies, accept, language) => {
	expect(await languageFor(cookies, accept)).toBe(language);
});

test('a rendered page is marked with its language', async () => {
	const event = {
		cookies: { get: (name: string) => (name === 'language' ? 'es' : undefined) },
		request: new Request('http://cogmark.test/'),
		route: { id: '/' },
		locals: {}
	};
	const resolve: Parameters<Handle>[0]['resolve'] = async (_event, options) =>
		new Response(
			await options?.transformPageChunk?.({ html: '<!doctype html><html lang="en" class="x">', done: true })
		);
	const response = await handle({ event: event as never, resolve });
	expect(await response.text()).toBe('<!doctype html><html lang="es" class="x">');
});
