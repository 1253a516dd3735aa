/** A database of its own for each test, opened as often as a test has tabs, closed after it. */
import 'fake-indexeddb/auto';
import { afterEach } from 'vitest';
import { openStore, type Store, type StoreTrouble } from '../../../src/lib/tablet/store/open';

const open: Store[] = [];
let count = 0;

afterEach(async () => {
	await Promise.all(open.splice(0).map((store) => store.close()));
});

export const freshName = () => `cogmark-test-${process.pid}-${++count}`;

export function tab(name: string, version?: number, tell?: (trouble: StoreTrouble) => void): Store {
	const store = openStore(tell, name, version);
	open.push(store);
	return store;
}
