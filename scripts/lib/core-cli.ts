/**
 * What `npm run -s core` answers: words in, standard input in, text and exit code out. One question that is invalid, or
 * input that is no JSON, exits 2. In an array each invalid one gets its error object in place, and the exit code
 * stays 0: the answer has the length and the order of the question.
 */
import { evaluate } from '$lib/gear/evaluate';
import { identify } from '$lib/gear/identify/identify';
import { parseEvaluate } from '$lib/records/evaluate';
import { parseIdentify } from '$lib/records/identify';
import { invalidWhole } from '$lib/records/invalid-input';

export interface CoreAnswer {
	stdout: string;
	stderr: string;
	exitCode: 0 | 2;
}

const USAGE = `Usage: npm run -s core -- evaluate < check.json
       npm run -s core -- identify < readings.json

  evaluate   works out one check (a JSON object) or many (a JSON array), and prints the outcome as JSON
  identify   tells which gear made the readings (one JSON object or an array), and prints the answer as JSON

Exit code 0: answered. 2: bad input or command; bad input prints {"error": ...} with the field and the remedy.
`;

type Answer = (question: unknown) => object;

const COMMANDS: Record<string, Answer> = {
	evaluate(question) {
		const parsed = parseEvaluate(question);
		return parsed.ok ? evaluate(parsed.input) : parsed.error;
	},
	identify(question) {
		const parsed = parseIdentify(question);
		return parsed.ok ? identify(parsed.input) : parsed.error;
	}
};

export async function runCore(
	args: readonly string[],
	readInput: () => Promise<string>
): Promise<CoreAnswer> {
	const [command, ...rest] = args;
	if (command === '--help' || command === '-h') return { stdout: '', stderr: USAGE, exitCode: 0 };
	const asked = command !== undefined && Object.hasOwn(COMMANDS, command) ? COMMANDS[command] : undefined;
	if (!asked || rest.length > 0) {
		const problem = command === undefined ? 'A command is missing.' : `Unknown command: ${args.join(' ')}`;
		return { stdout: '', stderr: `${problem}\n\n${USAGE}`, exitCode: 2 };
	}
	return answer(asked, await readInput());
}

function answer(asked: Answer, text: string): CoreAnswer {
	// Editors on Windows put a byte order mark in front; JSON knows none.
	const body = text.replace(/^\uFEFF/, '');
	if (body.trim() === '')
		return refused(invalidWhole('No input: send the question as JSON on standard input.'));
	let input: unknown;
	try {
		input = JSON.parse(body);
	} catch (error) {
		const why = error instanceof Error ? ` (${error.message})` : '';
		return refused(
			invalidWhole(`The input is not JSON${why}. Send one question as an object, or several as an array.`)
		);
	}
	if (Array.isArray(input)) return { stdout: json(input.map(asked)), stderr: '', exitCode: 0 };
	const answered = asked(input);
	return 'error' in answered ? refused(answered) : { stdout: json(answered), stderr: '', exitCode: 0 };
}

function refused(error: object): CoreAnswer {
	return { stdout: json(error), stderr: '', exitCode: 2 };
}

function json(value: unknown): string {
	return `${JSON.stringify(value)}\n`;
}
