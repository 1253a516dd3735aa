/** Words of the door rooms. */
export const door = {} as const satisfies Record<string, readonly [string, string]>;
