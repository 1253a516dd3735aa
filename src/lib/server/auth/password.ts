/** Passwords: argon2id with 19 MiB, two passes, one lane (OWASP's floor), kept in PHC form. */
import { hash, verify } from '@node-rs/argon2';

const COST = { memoryCost: 19 * 1024, timeCost: 2, parallelism: 1 };

/** Hash of nothing anyone can type, so that an unknown account costs the same work as a known one. */
const NOBODY =
	'$argon2id$v=19$m=19456,t=2,p=1$qq0H2lcz12BW48NhMYiu3A$bqrs+BIaIZn649ILLeH7yuONWkBa3+m3R/a18E7W7Vg';

export function hashPassword(password: string): Promise<string> {
	return hash(prepared(password), COST);
}

/** @param kept the hash of the account, or null where there is no account: then always false, after the same work */
export async function passwordMatches(kept: string | null, password: string): Promise<boolean> {
	const matches = await verify(kept ?? NOBODY, prepared(password));
	return kept !== null && matches;
}

/** Keyboards of different systems give different code points for the same accented letter. */
function prepared(password: string): string {
	return password.normalize('NFKC');
}
