/** Whether the database answers at all, asked with a limit: a health check must not hang with it. */
import { sql } from 'drizzle-orm';
import type { Database } from './client';

/** @param open called inside, so that a missing address counts as no answer */
export async function databaseAnswers(open: () => Database, patienceMs: number): Promise<boolean> {
	let timer: NodeJS.Timeout | undefined;
	const tooLate = new Promise<boolean>((resolve) => {
		timer = setTimeout(() => resolve(false), patienceMs);
	});
	const asked = Promise.resolve()
		.then(() => open().db.execute(sql`select 1`))
		.then(
			() => true,
			() => false
		);
	try {
		return await Promise.race([asked, tooLate]);
	} finally {
		clearTimeout(timer);
	}
}
