/** Words of the sync rooms. */
export const sync = {} as const satisfies Record<string, readonly [string, string]>;
