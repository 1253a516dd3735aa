/**
 * The planner's view of the plant's gear positions: filtered, searched, put in order and cut into pages, all from
 * the page's address. Promise: whatever the address says, it is read as the nearest view that exists.
 */
import type { Verdict } from '$lib/gear/contract';
import { textMatches } from './match';

export type Standing = Verdict | 'no-check';
/** In the order of the decision they need. */
export const STANDINGS: readonly Standing[] = [
	'will-not-carry',
	'not-permitted',
	'close',
	'cannot-say',
	'no-check',
	'carries'
];

export const ORDERS = ['decision', 'tag', 'margin', 'open'] as const;
export type Order = (typeof ORDERS)[number];

export interface PositionsQuery {
	standing: Standing | null;
	find: string;
	order: Order;
	/** Identifier of the last position of the page before. */
	after: string | null;
}

interface Row {
	position: { id: string; ordinal: number };
	machine: { tag: string };
	standing: Standing;
	check: { margin: number | null; receivedAt: Date } | null;
}

export interface PositionsPage<R> {
	rows: R[];
	/** How many stand before this page, and how many fit the view in all. */
	before: number;
	total: number;
	/** `after` of the next page. */
	next: string | null;
}

const PAGE = 50;

export function readPositionsQuery(params: URLSearchParams): PositionsQuery {
	const standing = params.get('standing');
	const order = params.get('order');
	return {
		standing: STANDINGS.find((known) => known === standing) ?? null,
		find: (params.get('find') ?? '').trim().slice(0, 80),
		order: ORDERS.find((known) => known === order) ?? 'decision',
		after: params.get('after')
	};
}

/** The same view with something changed, as a query of the address; what is the usual case is left out. */
export function positionsAddress(query: PositionsQuery, change: Partial<PositionsQuery>): string {
	const { standing, find, order, after } = { ...query, after: null, ...change };
	const params = new URLSearchParams();
	if (standing) params.set('standing', standing);
	if (find) params.set('find', find);
	if (order !== 'decision') params.set('order', order);
	if (after) params.set('after', after);
	const text = params.toString();
	return text ? `/machines?${text}` : '/machines';
}

/**
 * @param rows in the order of the decision they need
 * @param textOf what a search looks in
 */
export function positionsPage<R extends Row>(
	rows: readonly R[],
	{ standing, find, order, after }: PositionsQuery,
	textOf: (row: R) => string
): PositionsPage<R> {
	const found = rows.filter(
		(row) => (!standing || row.standing === standing) && textMatches(textOf(row), find)
	);
	const ordered = order === 'decision' ? found : found.toSorted(COMPARE[order]);
	const before = ordered.findIndex((row) => row.position.id === after) + 1;
	const page = ordered.slice(before, before + PAGE);
	const more = before + PAGE < ordered.length;
	return {
		rows: page,
		before,
		total: ordered.length,
		next: more ? (page.at(-1)?.position.id ?? null) : null
	};
}

const COMPARE: Record<Exclude<Order, 'decision'>, (a: Row, b: Row) => number> = {
	tag: (a, b) => a.machine.tag.localeCompare(b.machine.tag) || a.position.ordinal - b.position.ordinal,
	// Lowest first; what has no margin or no check comes last.
	margin: (a, b) => (a.check?.margin ?? Infinity) - (b.check?.margin ?? Infinity) || 0,
	open: (a, b) => since(a) - since(b) || 0
};

function since({ check }: Row): number {
	return check?.receivedAt.getTime() ?? Infinity;
}
