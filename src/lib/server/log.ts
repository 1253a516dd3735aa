/**
 * What the server writes down when something fails: an id that the person also sees, where it was, and the
 * codes and lines of the failure. Never a message: messages of the database repeat the values of the row.
 */
import { randomUUID } from 'node:crypto';
import { databaseFault } from './db/postgres-error';

/** @returns the id under which the failure is found */
export function logFailure(where: string, failure: unknown): string {
	const id = randomUUID().slice(0, 8);
	const name = failure instanceof Error ? failure.name : typeof failure;
	const lines = failure instanceof Error ? (failure.stack ?? '').split('\n') : [];
	const code = failure instanceof Error ? (failure as Error & { code?: unknown }).code : undefined;
	console.error(
		JSON.stringify({
			at: new Date().toISOString(),
			level: 'error',
			id,
			where,
			name,
			code: typeof code === 'string' ? code : undefined,
			database: databaseFault(failure) ?? undefined,
			stack: lines.filter((line) => /^\s+at /.test(line)).map((line) => line.trim())
		})
	);
	return id;
}
