export type Standing = 'within' | 'more' | 'fewer';

/**
 * Where a law stands against an observed share: inside its 95 % interval, or seen more or less often
 * than the law says. About one interval in twenty misses a true law by chance.
 */
export function standing(point: { low: number; high: number; fitted: number }): Standing {
  if (point.low > point.fitted) return 'more';
  if (point.high < point.fitted) return 'fewer';
  return 'within';
}
