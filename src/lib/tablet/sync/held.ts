/**
 * Records that are not tried for a while, so that one which cannot be sent now delays no other. In memory only
 * and by the monotonic clock: after a restart everything is tried again.
 */
export interface Held {
	hold(id: string, forMs: number): void;
	/** Everything may be tried again. */
	clear(): void;
	/** The ids that are held now. */
	ids(): Set<string>;
	/** ms until the next one is free, or null when none is held. */
	nextFree(): number | null;
}

export function holding(monotonic: () => number): Held {
	const until = new Map<string, number>();
	const drop = () => {
		for (const [id, at] of until) if (at <= monotonic()) until.delete(id);
	};
	return {
		hold: (id, forMs) => void until.set(id, monotonic() + forMs),
		clear: () => until.clear(),
		ids() {
			drop();
			return new Set(until.keys());
		},
		nextFree() {
			drop();
			return until.size === 0 ? null : Math.min(...until.values()) - monotonic();
		}
	};
}
