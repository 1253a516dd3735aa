/** Words of the tablet rooms. */
export const tablet = {} as const satisfies Record<string, readonly [string, string]>;
