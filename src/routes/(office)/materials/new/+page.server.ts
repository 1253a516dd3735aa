/** A new material: the supervisor's form and its action. */
import { error, fail, redirect } from '@sveltejs/kit';
import { emptyStatement, readStatementForm } from '$lib/features/materials/statement-form';
import { requireMember } from '$lib/server/auth/guard';
import { addMaterial } from '$lib/server/commands/materials';
import { REFUSAL_TEXT } from '$lib/server/errors';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = (event) => {
	requireMember(event, 'supervisor');
	return { typed: emptyStatement(new Date().toISOString().slice(0, 10)) };
};

export const actions: Actions = {
	default: async (event) => {
		const scope = requireMember(event, 'supervisor');
		const read = readStatementForm(await event.request.formData());
		if (!read.ok) return fail(400, { typed: read.typed, problems: read.problems });
		const answer = await addMaterial(scope, read.statement);
		// The form checks everything that the schema does: a refusal here is a fault of ours, not of the typist.
		if (!answer.ok) error(500, { message: REFUSAL_TEXT.failed, code: 'failed' });
		redirect(303, `/materials/${answer.id}?kept=${answer.revision}`);
	}
};
