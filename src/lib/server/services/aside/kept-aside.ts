const DAY = 24 * 60 * 60 * 1000;

/** How long what was put aside can be brought back: 30 days. */
export const KEPT_ASIDE = 30 * DAY;

/** Days left, begun ones counted: 30 at first, 1 on the last day, 0 when the time is over. */
export function daysLeft(deletedAt: number, now: number): number {
  return Math.max(0, Math.ceil((deletedAt + KEPT_ASIDE - now) / DAY));
}
