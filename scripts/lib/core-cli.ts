/**
 * What `npm run -s core` answers: words in, standard input in, text and exit code out. One check that is invalid, or
 * input that is no JSON, exits 2. In an array each invalid check gets its error object in place, and the exit code
 * stays 0: the answer has the length and the order of the question.
 */
import type { InvalidInput, Outcome } from '$lib/gear/contract';
import { evaluate } from '$lib/gear/evaluate';
import { parseEvaluate } from '$lib/records/evaluate';
import { invalidWhole } from '$lib/records/invalid-input';

export interface CoreAnswer {
	stdout: string;
	stderr: string;
	exitCode: 0 | 2;
}

const USAGE = `Usage: npm run -s core -- evaluate < check.json

  evaluate   works out one check (a JSON object) or many (a JSON array), and prints the outcome as JSON

Exit code 0: answered. 2: bad input or command; bad input prints {"error": ...} with the field and the remedy.
`;

const NO_IDENTIFY =
	'identify is not in this version: it cannot tell yet which gear the readings belong to. Give the pitch by hand and use evaluate.';

export async function runCore(
	args: readonly string[],
	readInput: () => Promise<string>
): Promise<CoreAnswer> {
	const [command, ...rest] = args;
	if (command === '--help' || command === '-h') return { stdout: '', stderr: USAGE, exitCode: 0 };
	if (command === 'identify') {
		const error = { code: 'not-available', issues: [{ path: '', message: NO_IDENTIFY }] };
		return { stdout: json({ error }), stderr: `${NO_IDENTIFY}\n`, exitCode: 2 };
	}
	if (command !== 'evaluate' || rest.length > 0) {
		const problem = command === undefined ? 'A command is missing.' : `Unknown command: ${args.join(' ')}`;
		return { stdout: '', stderr: `${problem}\n\n${USAGE}`, exitCode: 2 };
	}
	return answer(await readInput());
}

function answer(text: string): CoreAnswer {
	// Editors on Windows put a byte order mark in front; JSON knows none.
	const body = text.replace(/^\uFEFF/, '');
	if (body.trim() === '') return refused(invalidWhole('No input: send the check as JSON on standard input.'));
	let input: unknown;
	try {
		input = JSON.parse(body);
	} catch (error) {
		const why = error instanceof Error ? ` (${error.message})` : '';
		return refused(
			invalidWhole(`The input is not JSON${why}. Send one check as an object, or several as an array.`)
		);
	}
	if (Array.isArray(input)) return { stdout: json(input.map(outcomeOf)), stderr: '', exitCode: 0 };
	const outcome = outcomeOf(input);
	return 'error' in outcome ? refused(outcome) : { stdout: json(outcome), stderr: '', exitCode: 0 };
}

function outcomeOf(input: unknown): Outcome | InvalidInput {
	const parsed = parseEvaluate(input);
	return parsed.ok ? evaluate(parsed.input) : parsed.error;
}

function refused(error: InvalidInput): CoreAnswer {
	return { stdout: json(error), stderr: '', exitCode: 2 };
}

function json(value: unknown): string {
	return `${JSON.stringify(value)}\n`;
}
