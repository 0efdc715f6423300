/** Least chance that a document tells: what lies below is told as this, and said as "under". */
export const LEAST_CHANCE = 1e-300;

/** A chance as a document tells it: never 0, which no test can give. */
export const floorChance = <P extends number | null>(p: P): P =>
  p === null ? p : (Math.max(p, LEAST_CHANCE) as P);
