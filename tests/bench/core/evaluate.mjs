// evaluate.*: one check worked out by the calculation core, with its working and its words, in microseconds.
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { build } from 'vite';

const root = fileURLToPath(new URL('../../..', import.meta.url));

/** @typedef {import('../figure.mjs').Figure} Figure */

/** @returns {Promise<Record<string, Figure>>} */
export async function evaluateFigures({ quick = false } = {}) {
	const { evaluate, spurCheck, geometryCheck } = await bundledCore();
	const batches = quick ? 60 : 300;
	/** No two calls of one run get the same shift, so no tooth is remembered. */
	let next = 0;
	return {
		'evaluate.handbook.us': {
			...perCall(batches, 100, () => evaluate(spurCheck)),
			limit: 30,
			of: 'one check by the handbook table'
		},
		'evaluate.geometry.us': {
			...perCall(batches, 20, () => evaluate(geometryCheck(1e-6 * ++next))),
			limit: 300,
			of: 'one check by the geometry of a tooth that was not met before'
		},
		'evaluate.geometry.cached.us': {
			...perCall(batches, 100, () => evaluate(geometryCheck(0.25))),
			limit: 60,
			of: 'one check by geometry, the tooth met before'
		}
	};
}

/** The core as it ships: bundled, not one module at a time through a loader. */
async function bundledCore() {
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
 * Microseconds a call, over batches of calls; the first batches warm up and do not count.
 * @param {number} batches
 * @param {number} calls in each
 * @param {() => unknown} work
 * @returns {{ samples: number[], unit: string }}
 */
function perCall(batches, calls, work) {
	const samples = [];
	for (let batch = -20; batch < batches; batch++) {
		const start = performance.now();
		for (let call = 0; call < calls; call++) work();
		const each = ((performance.now() - start) * 1000) / calls;
		if (batch >= 0) samples.push(each);
	}
	return { samples, unit: 'µs' };
}
