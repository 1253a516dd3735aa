/** For whoever watches the server: 200 only while the database answers within two seconds. */
import { json } from '@sveltejs/kit';
import { sql } from 'drizzle-orm';
import { database, version } from '$lib/server/environment';

const PATIENCE_MS = 2000;

export const GET = async () => {
	const answers = await databaseAnswers();
	return json(
		{ status: answers ? 'ok' : 'failing', database: answers ? 'ok' : 'unreachable', version: version() },
		{ status: answers ? 200 : 503 }
	);
};

async function databaseAnswers(): Promise<boolean> {
	let timer: NodeJS.Timeout | undefined;
	const tooLate = new Promise<boolean>((resolve) => {
		timer = setTimeout(() => resolve(false), PATIENCE_MS);
	});
	const asked = Promise.resolve()
		.then(() => database().db.execute(sql`select 1`))
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
