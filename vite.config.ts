import { sveltekit } from '@sveltejs/kit/vite';
import tailwindcss from '@tailwindcss/vite';
import { SvelteKitPWA } from '@vite-pwa/sveltekit';
import type { Plugin } from 'vite';
import { defineConfig } from 'vitest/config';

/** The service worker is built after the client; when the client fails, its own error would be hidden by that one. */
const showBuildError: Plugin = {
	name: 'show-build-error',
	enforce: 'pre',
	buildEnd(error) {
		if (error) console.error(error);
	}
};

const pwa = SvelteKitPWA({
	strategies: 'injectManifest',
	srcDir: 'src',
	filename: 'service-worker.ts',
	// A new version waits until no form is open; `autoUpdate` would reload and lose what is typed.
	registerType: 'prompt',
	injectRegister: false,
	manifest: {
		id: '/tablet',
		name: 'Cogmark',
		short_name: 'Cogmark',
		description: 'What gear is it, and will the spare carry the load?',
		start_url: '/tablet',
		scope: '/',
		display: 'standalone',
		background_color: '#FBF8F0',
		theme_color: '#0E3029',
		icons: [
			{ src: '/icon-192.png', sizes: '192x192', type: 'image/png' },
			{ src: '/icon-512.png', sizes: '512x512', type: 'image/png' },
			{ src: '/icon-maskable-512.png', sizes: '512x512', type: 'image/png', purpose: 'maskable' }
		]
	},
	injectManifest: {
		// The default leaves out woff2; pages are named one by one so that no signed-in page is ever kept.
		globPatterns: [
			'client/**/*.{js,css,svg,png,woff2,webmanifest}',
			'prerendered/pages/tablet.html',
			'prerendered/pages/offline.html'
		]
	}
});

export default defineConfig(({ mode }) => ({
	plugins: [showBuildError, tailwindcss(), sveltekit(), ...(mode === 'test' ? [] : [pwa])],
	// The database's own files are none of the development server's business.
	server: { watch: { ignored: ['**/.data*/**'] } },
	test: {
		include: ['tests/{reference,unit,identify,architecture,server,security,sync}/**/*.test.ts'],
		environment: 'node',
		// The server's tests share one PostgreSQL; each file makes plants of its own, so files may run side by side.
		testTimeout: 20_000,
		hookTimeout: 30_000
	}
}));
