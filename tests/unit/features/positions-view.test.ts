import { describe, expect, it } from 'vitest';
import {
	positionsAddress,
	positionsPage,
	readPositionsQuery,
	type Standing
} from '$lib/features/machines/positions-view';

const row = (n: number, standing: Standing, margin: number | null = null) => ({
	position: { id: `p${n}`, ordinal: 1 },
	machine: { tag: `A-${String(200 - n).padStart(3, '0')}`, name: `Stirrer ${n}` },
	standing,
	check: standing === 'no-check' ? null : { margin, receivedAt: new Date(2026, 0, n + 1) }
});
const rows = [
	row(1, 'will-not-carry', 0.74),
	row(2, 'will-not-carry', 0.92),
	row(3, 'not-permitted'),
	row(4, 'no-check'),
	row(5, 'carries', 1.8)
];
const text = ({ machine }: (typeof rows)[number]) => `${machine.tag} ${machine.name}`;
const query = (address: string) => readPositionsQuery(new URL(address, 'http://x.invalid').searchParams);
const ids = (address: string) => positionsPage(rows, query(address), text).rows.map((r) => r.position.id);

describe('the view of the address', () => {
	it('keeps the order of the decision needed', () => {
		expect(ids('/machines')).toEqual(['p1', 'p2', 'p3', 'p4', 'p5']);
	});

	it('filters by standing and finds by tag without its dash', () => {
		expect(ids('/machines?standing=will-not-carry')).toEqual(['p1', 'p2']);
		expect(ids('/machines?find=a199')).toEqual(['p1']);
		expect(ids('/machines?find=STIRRER+3')).toEqual(['p3']);
		expect(ids('/machines?find=nothing')).toEqual([]);
	});

	it('orders by tag, by margin with the lowest first, and by how long it is open', () => {
		expect(ids('/machines?order=tag')).toEqual(['p5', 'p4', 'p3', 'p2', 'p1']);
		expect(ids('/machines?order=margin')).toEqual(['p1', 'p2', 'p5', 'p3', 'p4']);
		expect(ids('/machines?order=open').at(-1)).toBe('p4');
	});

	it('reads nonsense as the plain view', () => {
		expect(ids('/machines?standing=splendid&order=colour&after=none')).toEqual([
			'p1',
			'p2',
			'p3',
			'p4',
			'p5'
		]);
	});

	it('cuts into pages that lose and repeat nothing', () => {
		const many = Array.from({ length: 120 }, (_, n) => row(n, 'close', 1.5));
		const seen: string[] = [];
		let at: string | null = '';
		while (at !== null) {
			const page: ReturnType<typeof positionsPage<(typeof many)[number]>> = positionsPage(
				many,
				{ ...query('/machines'), after: at },
				text
			);
			expect(page.before).toBe(seen.length);
			expect(page.total).toBe(120);
			seen.push(...page.rows.map((r) => r.position.id));
			at = page.next;
		}
		expect(seen).toEqual(many.map((r) => r.position.id));
	});

	it('writes addresses that read back, and starts at the first page when the view changes', () => {
		const now = query('/machines?standing=close&find=stirrer&order=tag&after=p3');
		expect(query(positionsAddress(now, {}))).toEqual({ ...now, after: null });
		expect(query(positionsAddress(now, { after: 'p9' }))).toEqual({ ...now, after: 'p9' });
		expect(positionsAddress(now, { standing: null, find: '', order: 'decision' })).toBe('/machines');
	});
});
