// The stages of npm test. Each sets up what it needs and no more, runs, and gives its counts.
import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { ensureBuild } from './build.mjs';
import { ensureChromium } from './chromium.mjs';
import { startCluster } from './cluster.mjs';
import { localProgram, npm } from './modules.mjs';
import { run } from './processes.mjs';
import { root } from './settings.mjs';
import { playwrightTally, tallyOf, vitestTally } from './tally.mjs';

/** @typedef {import('./tally.mjs').Tally} Tally */

/** Settings of a demonstration or a real installation, which no test may meet. */
const foreign = [
	...['DATABASE_URL', 'DATABASE_OWNER_URL', 'DATA_DIR', 'DEMO', 'COGMARK_SECRET', 'COGMARK_VERSION'],
	...['PORT', 'HOST', 'ORIGIN', 'NODE_ENV']
];

/**
 * @param {object} options
 * @param {string} options.dataDir the tests' own
 * @param {(child: import('./processes.mjs').Known) => void} options.started
 * @returns {Record<string, { title: string, work: (extra: string[]) => Promise<Tally> }>} in their order
 */
export function stagesIn({ dataDir, started }) {
	const env = Object.fromEntries(Object.entries(process.env).filter(([name]) => !foreign.includes(name)));
	const common = { cwd: root, show: true, started };
	/** @type {ReturnType<typeof startCluster> | undefined} */
	let cluster;

	/**
	 * @param {string} name
	 * @param {boolean} seeded
	 */
	async function freshDatabase(name, seeded) {
		cluster ??= startCluster(dataDir, { quick: true, started });
		const { migrateDatabase, openOwnDatabase, seedDatabase } = await import('./database.mjs');
		const addresses = await openOwnDatabase(await cluster, name, { fresh: true });
		await migrateDatabase(addresses);
		if (seeded) await seedDatabase(addresses);
		return addresses;
	}

	/** @param {string} script */
	const script = async (script) => asOne((await npm(['run', '--silent', script], { ...common, env })).code);

	return {
		check: { title: 'Type check', work: () => script('check') },
		lint: { title: 'Format and lint', work: () => script('lint') },
		vitest: {
			title: 'Unit, reference, architecture, server, security and sync tests',
			async work(extra) {
				const { owner, web } = await freshDatabase('cogmark_test', false);
				const report = freshReport('vitest.json');
				const { code } = await run(
					localProgram('vitest'),
					['run', '--reporter=default', '--reporter=json', `--outputFile.json=${report}`, ...extra],
					{ ...common, env: { ...env, TEST_DATABASE_URL: web, TEST_DATABASE_OWNER_URL: owner } }
				);
				return tallyOf(report, vitestTally, code);
			}
		},
		mutation: {
			title: 'Each constant and factor of the formulas changed: some test must fail',
			async work(extra) {
				const report = freshReport('mutation.json');
				const args = [join(root, 'tests/mutation/run.mjs'), '--report', report, ...extra];
				const { code } = await run(process.execPath, args, { ...common, env });
				return tallyOf(report, (/** @type {Tally} */ tally) => tally, code);
			}
		},
		e2e: {
			title: 'Browser tests',
			async work(extra) {
				const chromium = await ensureChromium();
				await ensureBuild();
				const { owner, web } = await freshDatabase('cogmark_e2e', true);
				const report = freshReport('playwright.json');
				const { code } = await run(
					localProgram('playwright'),
					['test', '--config=tests/e2e/playwright.config.ts', '--reporter=list,json', ...extra],
					{
						...common,
						env: {
							...env,
							CHROMIUM: chromium,
							E2E_DATABASE_URL: web,
							E2E_DATABASE_OWNER_URL: owner,
							PLAYWRIGHT_JSON_OUTPUT_FILE: report
						}
					}
				);
				return tallyOf(report, playwrightTally, code);
			}
		}
	};

	/** @param {string} name */
	function freshReport(name) {
		const path = join(dataDir, name);
		rmSync(path, { force: true });
		return path;
	}
}

/**
 * A stage without counts of its own is one test.
 * @param {number} code
 * @returns {Tally}
 */
function asOne(code) {
	return code === 0 ? { passed: 1, failed: 0, remarks: [] } : { passed: 0, failed: 1, remarks: [] };
}
