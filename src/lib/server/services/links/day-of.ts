const DAY = 86_400_000;

/** Beginning of a moment's day in UTC, milliseconds: all that is told of when a hidden referee came. */
export const dayOf = (at: number): number => Math.floor(at / DAY) * DAY;
