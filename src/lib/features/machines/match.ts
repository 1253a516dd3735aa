/** Which machines a typed text points to: every word of it in tag, name or area, tags without their dash too. */
import type { MachineRow } from '$lib/records/mirror';

export function matchMachines(machines: readonly MachineRow[], search: string): MachineRow[] {
	return machines.filter(({ tag, name, area }) => textMatches(`${tag} ${name} ${area}`, search));
}

/** Whether every word of a search stands in a text, in either case, without accents, and tags without their dash. */
export function textMatches(text: string, search: string): boolean {
	const said = plain(text);
	const all = `${said} ${said.replace(/[^\p{L}\p{N}\s]/gu, '')}`;
	return plain(search)
		.split(/\s+/)
		.filter(Boolean)
		.every((word) => all.includes(word));
}

/** Lower case without accents. */
function plain(text: string): string {
	return text.normalize('NFD').replace(/\p{M}/gu, '').toLowerCase();
}
