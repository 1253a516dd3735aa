/** Reads PostgreSQL's and the driver's own codes out of an error, without their texts: those repeat values. */

export interface DatabaseFault {
	/** SQLSTATE, such as 23505 for a unique violation. */
	state: string;
	constraint: string | null;
	table: string | null;
}

export function databaseFault(error: unknown): DatabaseFault | null {
	for (const at of causes(error)) {
		const { code, constraint_name, table_name } = at as Error & Record<string, unknown>;
		if (typeof code === 'string' && at.name === 'PostgresError') {
			return {
				state: code,
				constraint: typeof constraint_name === 'string' ? constraint_name : null,
				table: typeof table_name === 'string' ? table_name : null
			};
		}
	}
	return null;
}

const NO_CONNECTION = /^(ECONN|EPIPE|ENOTFOUND|ETIMEDOUT|CONNECT|CONNECTION)/;
/** Connection exceptions, too many connections, operator intervention (stopping, starting, statement timeout). */
const UNREACHABLE_STATE = /^(08|53|57)/;

/** Whether the database could not be asked, so that trying again is worth while. */
export function databaseUnreachable(error: unknown): boolean {
	const fault = databaseFault(error);
	if (fault) return UNREACHABLE_STATE.test(fault.state);
	return causes(error).some((at) => NO_CONNECTION.test(String((at as Error & { code?: unknown }).code)));
}

function causes(error: unknown): Error[] {
	const found: Error[] = [];
	for (let at = error; at instanceof Error && found.length < 10; at = at.cause) found.push(at);
	return found;
}
