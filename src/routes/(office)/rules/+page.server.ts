/** The plant's rules in force, and the supervisor's action that states its tools. */
import { error, fail, redirect } from '@sveltejs/kit';
import { readToolsForm } from '$lib/features/rules/tools-form';
import { requireMember } from '$lib/server/auth/guard';
import { reviseTools } from '$lib/server/commands/rules';
import { rulesInForce } from '$lib/server/db/queries/rules';
import { REFUSAL_TEXT } from '$lib/server/errors';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async (event) => {
	const scope = requireMember(event, 'planner', 'supervisor');
	return { inForce: await rulesInForce(scope), kept: event.url.searchParams.get('kept') };
};

export const actions: Actions = {
	tools: async (event) => {
		const scope = requireMember(event, 'supervisor');
		const form = await event.request.formData();
		const expectedRevision = Number(form.get('expectedRevision'));
		const read = readToolsForm(form);
		if (!read.ok) return fail(400, { ...read, expectedRevision, newer: null });
		const answer = await reviseTools(scope, { expectedRevision, instruments: read.instruments });
		if (answer.ok) redirect(303, `/rules?kept=${answer.revision}`);
		if (answer.code === 'stale') {
			const { typed } = read;
			return fail(409, { typed, problems: {}, expectedRevision: answer.revision, newer: answer.revision });
		}
		// The form checks everything that the schema does: a refusal here is a fault of ours, not of the typist.
		error(500, { message: REFUSAL_TEXT.failed, code: 'failed' });
	}
};
