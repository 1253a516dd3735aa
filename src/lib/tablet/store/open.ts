/**
 * The connection to the tablet's database. It is opened on first use and again when the browser closed it;
 * an old connection never stands in the way of a newer version, and what happened is told to the screens.
 */
import { openDB } from 'idb';
import { adderFor, UPGRADES, type CogmarkDb, type CogmarkSchema } from './schema';

export const DATABASE = 'cogmark';

/**
 * blocked: another tab holds an older version open, close it. outdated: a newer version took over in another
 * tab, reload this one. terminated: the browser closed the store; the next call opens it again.
 */
export type StoreTrouble = 'blocked' | 'outdated' | 'terminated';

export interface Store {
	db(): Promise<CogmarkDb>;
	close(): Promise<void>;
}

/** @param version for tests of upgrades: how many of the released steps are taken */
export function openStore(
	tell: (trouble: StoreTrouble) => void = () => undefined,
	name: string = DATABASE,
	version: number = UPGRADES.length
): Store {
	let opened: Promise<CogmarkDb> | null = null;

	async function open(): Promise<CogmarkDb> {
		const db = await openDB<CogmarkSchema>(name, version, {
			upgrade(db, from, _to, tx) {
				const add = adderFor(db, tx);
				for (const step of UPGRADES.slice(from, version)) step(add);
			},
			blocked: () => tell('blocked'),
			blocking() {
				opened = null;
				db.close();
				tell('outdated');
			},
			terminated() {
				opened = null;
				tell('terminated');
			}
		});
		return db;
	}

	return {
		db() {
			opened ??= open().catch((error: unknown) => {
				// A failed opening is not remembered: the next call tries again.
				opened = null;
				if (error instanceof DOMException && error.name === 'VersionError') tell('outdated');
				throw error;
			});
			return opened;
		},
		async close() {
			const db = await opened?.catch(() => null);
			opened = null;
			db?.close();
		}
	};
}
