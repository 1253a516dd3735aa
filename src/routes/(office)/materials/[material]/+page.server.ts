/** One material with all its revisions, and the supervisor's action that makes the next one. */
import { error, fail, redirect } from '@sveltejs/kit';
import { readStatementForm, typedFrom } from '$lib/features/materials/statement-form';
import { requireMember } from '$lib/server/auth/guard';
import { reviseMaterial } from '$lib/server/commands/materials';
import { materialPage } from '$lib/server/db/queries/materials';
import { REFUSAL_TEXT } from '$lib/server/errors';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async (event) => {
	const scope = requireMember(event, 'planner', 'supervisor');
	const material = await materialPage(scope, event.params.material);
	if (!material) error(404, { message: REFUSAL_TEXT['not-found'], code: 'not-found' });
	return { material, kept: event.url.searchParams.get('kept') };
};

export const actions: Actions = {
	default: async (event) => {
		const scope = requireMember(event, 'supervisor');
		const { material: id } = event.params;
		const form = await event.request.formData();
		const read = readStatementForm(form);
		const expectedRevision = Number(form.get('expectedRevision'));
		if (!read.ok) {
			return fail(400, { typed: read.typed, problems: read.problems, expectedRevision, newer: null });
		}
		const answer = await reviseMaterial(scope, { id, expectedRevision, statement: read.statement });
		if (answer.ok) redirect(303, `/materials/${id}?kept=${answer.revision}`);
		if (answer.code === 'stale') {
			const latest = (await materialPage(scope, id))?.revisions[0];
			if (latest) {
				const newer = {
					revision: latest.revision,
					name: latest.createdByName,
					typed: typedFrom(latest.statement)
				};
				return fail(409, { typed: read.typed, problems: {}, expectedRevision: latest.revision, newer });
			}
		}
		if (answer.code === 'invalid-input') {
			// The form checks everything that the schema does: a refusal here is a fault of ours, not of the typist.
			error(500, { message: REFUSAL_TEXT.failed, code: 'failed' });
		}
		error(404, { message: REFUSAL_TEXT['not-found'], code: 'not-found' });
	}
};
