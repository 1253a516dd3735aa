/**
 * The tablet as the screens see it: started once by the group's layout, handed down as a context. It turns the
 * store's news into runes, so that a screen re-reads what changed, in this tab or another.
 */
import { getContext, setContext } from 'svelte';
import type { LocalPerson, News, SyncStatus, Tablet, Trouble } from '$lib/tablet/start';
import { startTablet } from '$lib/tablet/start';

const KEY = Symbol('tablet');

export class TabletHost {
	tablet: Tablet | null = $state.raw(null);
	person: LocalPerson | null = $state.raw(null);
	/** False until the store has been asked who works here. */
	ready = $state(false);
	status: SyncStatus | null = $state.raw(null);
	trouble: Trouble | null = $state(null);
	/** Counts the news of each kind; a screen that reads one re-reads its rows when it moves. */
	news: Record<News, number> = $state({ drafts: 0, records: 0, mirror: 0, person: 0 });
	#undo: (() => void)[] = [];

	async start(): Promise<void> {
		try {
			const tablet = await startTablet({ onTrouble: (trouble) => (this.trouble = trouble) });
			this.#undo.push(
				tablet.subscribe((about) => {
					this.news[about] += 1;
					if (about === 'person') void this.readPerson();
				}),
				tablet.sync.subscribe((status) => (this.status = status)),
				() => tablet.stop()
			);
			this.tablet = tablet;
			await this.readPerson();
			this.ready = true;
			// Who is signed in decides for whom records are made; without a network the last person stays.
			await tablet.whoAmI();
			await this.readPerson();
		} catch (failure) {
			console.error(failure);
			this.trouble ??= 'unavailable';
		}
	}

	async readPerson(): Promise<void> {
		this.person = (await this.tablet?.person()) ?? null;
	}

	stop(): void {
		for (const undo of this.#undo) undo();
		this.#undo = [];
	}
}

export function provideTablet(): TabletHost {
	return setContext(KEY, new TabletHost());
}

export function useTablet(): TabletHost {
	return getContext<TabletHost>(KEY);
}
