/** Words of the verdict rooms. */
export const verdict = {} as const satisfies Record<string, readonly [string, string]>;
