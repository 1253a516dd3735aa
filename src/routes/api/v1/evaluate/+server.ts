/** Whether a gear carries its drive, over HTTP: one question or a list of them, as at the shell. */
import { evaluate } from '$lib/gear/evaluate';
import { parseEvaluate } from '$lib/records/evaluate';
import { api } from '$lib/server/api';
import { answerContract } from '$lib/server/contract-route';

export const POST = api((event) =>
	answerContract(event, (question) => {
		const parsed = parseEvaluate(question);
		return parsed.ok ? evaluate(parsed.input) : parsed.error;
	})
);
