/** Words of the office rooms. */
export const office = {} as const satisfies Record<string, readonly [string, string]>;
