// The calculation core for the benches, and how a call of it is timed.
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { build } from 'vite';

const root = fileURLToPath(new URL('../../..', import.meta.url));

/** The core as it ships: bundled, not one module at a time through a loader. */
export async function bundledCore() {
	const folder = mkdtempSync(join(tmpdir(), 'cogmark-bench-'));
	try {
		await build({
			configFile: false,
			root,
			logLevel: 'error',
			resolve: { alias: { $lib: join(root, 'src/lib') } },
			build: { ssr: join(root, 'tests/bench/core/check.ts'), outDir: folder, emptyOutDir: true }
		});
		return await import(pathToFileURL(join(folder, 'check.js')).href);
	} finally {
		rmSync(folder, { recursive: true, force: true });
	}
}

/**
 * The compiler of the engine settles after about 6,000 checks; until then a call takes up to seven times as long, and a
 * count of batches that suffices for one bench is too small for the next.
 */
const WARM_UP_MS = 1000;

/**
 * Microseconds a call, over batches of calls, once it is warm.
 * @param {number} batches
 * @param {number} calls in each
 * @param {() => unknown} work
 * @returns {{ samples: number[], unit: string }}
 */
export function perCall(batches, calls, work) {
	const warm = performance.now() + WARM_UP_MS;
	while (performance.now() < warm) work();
	const samples = [];
	for (let batch = 0; batch < batches; batch++) {
		const start = performance.now();
		for (let call = 0; call < calls; call++) work();
		samples.push(((performance.now() - start) * 1000) / calls);
	}
	return { samples, unit: 'µs' };
}
