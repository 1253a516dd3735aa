/** Which gear made these readings, over HTTP: one question or a list of them, as at the shell. */
import { identify } from '$lib/gear/identify/identify';
import { parseIdentify } from '$lib/records/identify';
import { api } from '$lib/server/api';
import { answerContract } from '$lib/server/contract-route';

export const POST = api((event) =>
	answerContract(event, (question) => {
		const parsed = parseIdentify(question);
		return parsed.ok ? identify(parsed.input) : parsed.error;
	})
);
