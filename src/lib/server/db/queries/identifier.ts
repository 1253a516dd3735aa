/** Whether a text from an address can be an identifier at all; PostgreSQL would raise an error on others. */
import { uuid } from '$lib/records/ids';

export function isId(text: string): boolean {
	return uuid.safeParse(text).success;
}
