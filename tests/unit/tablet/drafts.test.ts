/** Every keystroke outlives the tab. */
import { describe, expect, it } from 'vitest';
import {
	discardDraft,
	listDrafts,
	readDraft,
	saveDraft,
	startDraft
} from '../../../src/lib/tablet/store/drafts';
import { keepCheck } from '../../../src/lib/tablet/store/keep';
import { signOut } from '../../../src/lib/tablet/store/person';
import { checkOf, draftOf, member } from '../../sync/samples';
import { freshName, tab } from './database';

const NOW = new Date('2026-03-02T09:00:00Z');

describe('a draft', () => {
	it('is there with the text of the open field when the tab was killed', async () => {
		const name = freshName();
		const who = member();
		const first = tab(name);
		const draft = await startDraft(
			first,
			{ plantId: who.plantId, authorId: who.personId, machineId: 'm', positionId: 'p', step: 'teeth' },
			NOW
		);
		const entry = { field: 'outsideDiameter', unit: 'mm', source: 'keypad', again: false } as const;
		for (const text of ['2', '24', '24.', '24.5']) {
			await saveDraft(first, { ...draft, entry: { ...entry, text } }, NOW);
		}
		await first.close();
		expect((await readDraft(tab(name), draft.id))?.entry).toEqual({ ...entry, text: '24.5' });
	});

	it('may be a reactive object of a screen', async () => {
		const store = tab(freshName());
		const draft = draftOf(member());
		// Like a proxy of the user interface: structured cloning refuses it.
		const reactive = new Proxy({ ...draft, answers: new Proxy(draft.answers, {}) }, {});
		expect(() => structuredClone(reactive)).toThrow();
		expect(await saveDraft(store, reactive, NOW)).toBe('saved');
		expect(await readDraft(store, draft.id)).toEqual({ ...draft, updatedAt: NOW.toISOString() });
	});

	it('does not come back by a late keystroke after it was kept', async () => {
		const store = tab(freshName());
		const draft = draftOf(member());
		await saveDraft(store, draft, NOW);
		await keepCheck(store, checkOf(draft), NOW);
		expect(await saveDraft(store, { ...draft, step: 'late' }, NOW)).toBe('already-kept');
		expect(await readDraft(store, draft.id)).toBeUndefined();
	});

	it('is listed for its author at its plant only, the last touched first, and survives a sign-out', async () => {
		const store = tab(freshName());
		const who = member();
		const [old, young] = [draftOf(who), draftOf(who)];
		await saveDraft(store, old, new Date('2026-03-02T07:00:00Z'));
		await saveDraft(store, young, NOW);
		await saveDraft(store, draftOf({ ...who, plantId: member().plantId }), NOW);
		await saveDraft(store, draftOf({ ...who, personId: member().personId }), NOW);
		await signOut(store);
		const listed = await listDrafts(store, who.plantId, who.personId);
		expect(listed.map(({ id }) => id)).toEqual([young.id, old.id]);
		await discardDraft(store, young.id);
		expect(await listDrafts(store, who.plantId, who.personId)).toHaveLength(1);
	});
});
