// The words of the set-up commands: one plain line a step, and for a failure what went wrong and how to mend it.
// Nothing else in scripts/ decides how a failure looks on the terminal.

/** A failure that a person can mend: what went wrong, and what to do about it. */
export class Trouble extends Error {
	/**
	 * @param {string} message what went wrong, one sentence
	 * @param {string} remedy what to do about it
	 * @param {string} [detail] what the failing program itself printed
	 */
	constructor(message, remedy, detail = '') {
		super(message);
		this.name = 'Trouble';
		this.remedy = remedy;
		this.detail = detail;
	}
}

/** @param {string} text */
export function step(text) {
	console.log(text);
}

/** @param {string} text */
export function note(text) {
	console.log(`  ${text}`);
}

/**
 * Prints a failure to standard error. A failure nobody foresaw keeps its stack, since that is all there is.
 * @param {unknown} error
 */
export function report(error) {
	if (error instanceof Trouble) {
		if (error.detail.trim() !== '') console.error(`\n${indented(error.detail)}`);
		console.error(`\n${error.message}\n${error.remedy}`);
		return;
	}
	const known = systemTrouble(error);
	if (known !== null) console.error(`\n${known.message}\n${known.remedy}`);
	else console.error('\nThis should not have happened:\n', error);
}

/**
 * The last lines of a text, for a log of which only the end matters.
 * @param {string} text
 * @param {number} [count]
 */
export function lastLines(text, count = 20) {
	return text.trimEnd().split('\n').slice(-count).join('\n');
}

/** @param {string} text */
function indented(text) {
	return text.trimEnd().replace(/^/gm, '  ');
}

/**
 * File system errors that people meet on a fresh machine, told with the path.
 * @param {unknown} error
 * @returns {Trouble | null}
 */
function systemTrouble(error) {
	if (!(error instanceof Error) || !('code' in error) || !('path' in error)) return null;
	const path = String(error.path);
	if (error.code === 'EACCES' || error.code === 'EPERM') {
		return new Trouble(
			`${path} may not be read or written by this user.`,
			'Start as the user who owns it, or set DATA_DIR to a folder of your own.'
		);
	}
	if (error.code === 'ENOSPC')
		return new Trouble(`The disk is full: ${path}`, 'Free some space and start again.');
	if (error.code === 'EROFS') {
		return new Trouble(
			`${path} cannot be written: the disk is read-only.`,
			'Set DATA_DIR to a writable folder.'
		);
	}
	return null;
}
