/** For whoever watches the server: 200 only while the database answers within two seconds. */
import { json } from '@sveltejs/kit';
import { databaseAnswers } from '$lib/server/db/answers';
import { database, version } from '$lib/server/environment';

const PATIENCE_MS = 2000;

export const GET = async () => {
	const answers = await databaseAnswers(database, PATIENCE_MS);
	return json(
		{ status: answers ? 'ok' : 'failing', database: answers ? 'ok' : 'unreachable', version: version() },
		{ status: answers ? 200 : 503 }
	);
};
