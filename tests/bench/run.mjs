// npm run bench: the figures of the project, measured here and now. `--only NAME` those whose name begins so,
// `--quick` fewer samples. Prints a table and writes bench.json into the data folder. Times depend on the machine:
// compare within one run only.
import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { readSettings } from '../../scripts/lib/settings.mjs';
import { evaluateFigures } from './core/evaluate.mjs';
import { identifyFigures } from './core/identify.mjs';
import { table, told } from './figure.mjs';

/** By the first part of the names that they measure. */
const BENCHES = { evaluate: evaluateFigures, identify: identifyFigures };

const USAGE = `Usage: npm run bench [-- --only NAME] [--quick]\n\nNames begin with: ${Object.keys(BENCHES).join(', ')}\n`;

/** @param {string[]} args */
function options(args) {
	const asked = { only: '', quick: false };
	for (let i = 0; i < args.length; i++) {
		if (args[i] === '--quick') asked.quick = true;
		else if (args[i] === '--only' && args[i + 1]) asked.only = String(args[++i]);
		else return null;
	}
	return asked;
}

const asked = options(process.argv.slice(2));
const chosen = Object.entries(BENCHES).filter(
	([part]) => asked && (part.startsWith(asked.only) || asked.only.startsWith(part))
);
if (!asked || chosen.length === 0) {
	process.stderr.write(USAGE);
	process.exit(2);
}

/** @type {Record<string, import('./figure.mjs').Told>} */
const figures = {};
for (const [, measure] of chosen) {
	for (const [name, figure] of Object.entries(await measure({ quick: asked.quick }))) {
		if (name.startsWith(asked.only)) figures[name] = told(figure);
	}
}
console.log(table(figures));
const { dataDir } = readSettings(process.env);
mkdirSync(dataDir, { recursive: true });
writeFileSync(join(dataDir, 'bench.json'), `${JSON.stringify(figures, null, '\t')}\n`);
