/** The permission check inside a command: whatever a route let through, the command looks again. */
import { ROLES, type Role } from '$lib/records/protocol';
import type { Scope } from '../db/client';
import { Refused } from '../errors';

/** No roles named: any role of the plant. */
export function allow(scope: Pick<Scope, 'role'>, ...roles: Role[]): void {
	if (!(roles.length ? roles : ROLES).includes(scope.role)) throw new Refused({ code: 'not-allowed' });
}
