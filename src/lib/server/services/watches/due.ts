import type { Rhythm } from '$lib/model/watches/watch-form';

/** Milliseconds between two mails "at once" of one team: what comes meanwhile is in the next one. */
export const BREATH = 10 * 60_000;
const DAY = 86_400_000;

/** The last moment up to now at which daily mail goes out. */
export function lastDigest(now: number, hour: number): number {
  const today = Math.floor(now / DAY) * DAY + hour * 3_600_000;
  return today <= now ? today : today - DAY;
}

/**
 * Whether a watch may be told something now. Moments in the future are of a clock that was set back, and hold nothing
 * up.
 */
export function isTellingTime(
  { rhythm, lastDigestAt, updatedAt }: { rhythm: Rhythm; lastDigestAt: number | null; updatedAt: number },
  now: number,
  hour: number
): boolean {
  if (rhythm === 'at-once') return lastDigestAt === null || Math.abs(now - lastDigestAt) >= BREATH;
  const since = lastDigestAt ?? updatedAt;
  return since < lastDigest(now, hour) || since > now + DAY;
}
