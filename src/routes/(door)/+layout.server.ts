/** What the door shows of a visitor: their language, and their name if they are signed in but work nowhere. */
import type { LayoutServerLoad } from './$types';

export const load: LayoutServerLoad = ({ locals }) => ({
	language: locals.language,
	personName: locals.person?.name ?? null
});
