// What npm run bench is asked for: which benches, and how long.

export const USAGE = 'Usage: npm run bench [-- --only NAME] [--quick]';

/**
 * @param {string[]} args
 * @returns {{ only: string, quick: boolean } | null} null: not understood
 */
export function readOptions(args) {
	const asked = { only: '', quick: false };
	for (let i = 0; i < args.length; i++) {
		const name = args[i + 1];
		if (args[i] === '--quick') asked.quick = true;
		else if (args[i] === '--only' && name && !name.startsWith('--')) {
			asked.only = name;
			i++;
		} else return null;
	}
	return asked;
}

/**
 * Whether a bench may measure a name that begins so.
 * @param {string} part that all its names begin with, before the first point
 * @param {string} only
 */
export function mayMeasure(part, only) {
	return `${part}.`.startsWith(only) || only.startsWith(`${part}.`);
}
