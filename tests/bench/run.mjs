// npm run bench: the figures of the project, measured here and now. `--only NAME` those whose name begins so,
// `--quick` fewer samples. Prints a table and writes bench.json into the data folder. Times depend on the machine:
// compare within one run only.
import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { readSettings } from '../../scripts/lib/settings.mjs';
import { evaluateFigures } from './core/evaluate.mjs';
import { identifyFigures } from './core/identify.mjs';
import { table, told } from './figure.mjs';
import { USAGE, mayMeasure, readOptions } from './options.mjs';

/** By the first part of the names that they measure. */
const BENCHES = { evaluate: evaluateFigures, identify: identifyFigures };

const asked = readOptions(process.argv.slice(2));
if (!asked) refuse();

/** @type {Record<string, import('./figure.mjs').Told>} */
const figures = {};
const chosen = Object.entries(BENCHES).filter(([part]) => mayMeasure(part, asked.only));
for (const [, measure] of chosen) {
	for (const [name, figure] of Object.entries(await measure({ quick: asked.quick }))) {
		if (name.startsWith(asked.only)) figures[name] = told(figure);
	}
}
// A name that nothing answers to must not replace the figures of an earlier run by none.
if (Object.keys(figures).length === 0) refuse();
console.log(table(figures));
const { dataDir } = readSettings(process.env);
mkdirSync(dataDir, { recursive: true });
writeFileSync(join(dataDir, 'bench.json'), `${JSON.stringify(figures, null, '\t')}\n`);

/** @returns {never} */
function refuse() {
	process.stderr.write(`${USAGE}\n\nNames begin with: ${Object.keys(BENCHES).join(', ')}\n`);
	process.exit(2);
}
