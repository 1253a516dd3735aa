/// <reference lib="webworker" />
/**
 * The application's files on the tablet, so that it starts with no network. It holds what the build made and
 * nothing else: no answer of /api, no __data.json and no page that was rendered for a person is ever stored.
 */
import {
	cleanupOutdatedCaches,
	createHandlerBoundToURL,
	matchPrecache,
	precacheAndRoute
} from 'workbox-precaching';
import { NavigationRoute, registerRoute } from 'workbox-routing';

declare const self: ServiceWorkerGlobalScope & { __WB_MANIFEST: { url: string; revision: string | null }[] };

precacheAndRoute(self.__WB_MANIFEST, {
	// Only exact addresses: a query on a page is the server's to answer.
	cleanURLs: false,
	directoryIndex: ''
});
cleanupOutdatedCaches();

// The prerendered shell boots the router at whatever address of the tablet it is served for.
registerRoute(
	new NavigationRoute(createHandlerBoundToURL('/tablet'), { allowlist: [/^\/tablet(?:[/?]|$)/] })
);

// Every other page comes from the server; when it does not answer, the page that says so.
registerRoute(
	new NavigationRoute(
		async ({ request }) => {
			try {
				return await fetch(request);
			} catch {
				return (await matchPrecache('/offline')) ?? Response.error();
			}
		},
		{ denylist: [/^\/tablet(?:[/?]|$)/, /^\/api\//, /\/__data\.json/] }
	)
);

self.addEventListener('message', (event) => {
	// Sent by the page when no form is open; until then a new version waits.
	if ((event.data as { type?: string } | null)?.type === 'SKIP_WAITING') void self.skipWaiting();
});
