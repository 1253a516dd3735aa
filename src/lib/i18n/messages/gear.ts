/** Words of the gear rooms. */
export const gear = {} as const satisfies Record<string, readonly [string, string]>;
