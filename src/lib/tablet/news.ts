/** Tells the screens of this tab and of every other tab of the tablet what changed in the store; no content. */

export type News = 'drafts' | 'records' | 'mirror' | 'person';

export interface NewsBoard {
	tell(about: News): void;
	/** @param listener `elsewhere` is true when another tab changed it @returns the end of it */
	subscribe(listener: (about: News, elsewhere: boolean) => void): () => void;
	close(): void;
}

export function newsBoard(channelName: string): NewsBoard {
	const channel = new BroadcastChannel(channelName);
	const listeners = new Set<(about: News, elsewhere: boolean) => void>();
	const spread = (about: News, elsewhere: boolean) => {
		for (const listener of listeners) listener(about, elsewhere);
	};
	channel.onmessage = (event: MessageEvent<News>) => spread(event.data, true);
	return {
		tell(about) {
			channel.postMessage(about);
			spread(about, false);
		},
		subscribe(listener) {
			listeners.add(listener);
			return () => void listeners.delete(listener);
		},
		close: () => channel.close()
	};
}
