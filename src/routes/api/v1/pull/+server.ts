/** A tablet asks what changed in its plant since its cursor (records/protocol.ts). */
import { api } from '$lib/server/api';
import { memberScope } from '$lib/server/auth/guard';
import { pullPage } from '$lib/server/db/queries/pull';
import { secret } from '$lib/server/environment';

export const GET = api(({ locals, url }) =>
	pullPage(memberScope(locals), { cursor: url.searchParams.get('cursor') || null, secret: secret() })
);
