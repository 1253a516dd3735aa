/**
 * Registers the service worker that holds the application's files. A new version waits: it takes over only when
 * the page says so, which it does when no form is open, and then only the page that asked is loaded again.
 */

export interface AppVersion {
	/** Asks the server whether there is a newer version. */
	look(): Promise<void>;
	/** Lets the waiting version take over and loads this page again; nothing when none waits. */
	takeOver(): void;
}

/**
 * @param onWaiting called when a newer version is ready and waits
 * @returns null where the browser has no service worker, or the worker cannot be read now
 */
export async function registerWorker(onWaiting: () => void = () => undefined): Promise<AppVersion | null> {
	if (!('serviceWorker' in navigator)) return null;
	const container = navigator.serviceWorker;
	const registration = await container
		.register('/service-worker.js', { scope: '/', updateViaCache: 'none' })
		.catch(() => null);
	if (!registration) return null;

	const watch = (worker: ServiceWorker | null) => {
		if (!worker) return;
		const ready = () => {
			// Without a controller it is the first version on this tablet, and waits for nobody.
			if (worker.state === 'installed' && container.controller) onWaiting();
		};
		worker.addEventListener('statechange', ready);
		ready();
	};
	watch(registration.waiting);
	watch(registration.installing);
	registration.addEventListener('updatefound', () => watch(registration.installing));

	return {
		look: () =>
			registration.update().then(
				() => undefined,
				() => undefined
			),
		takeOver() {
			if (!registration.waiting) return;
			container.addEventListener('controllerchange', () => location.reload(), { once: true });
			registration.waiting.postMessage({ type: 'SKIP_WAITING' });
		}
	};
}
