import { clopperPearson } from '../numerics/clopper-pearson';
import type { Interval } from '../types';

/** What odd counts of kinks on a ring say of the reading; each with its 95 % interval. */
export interface OddCounts {
  /** Share of shots with an odd count: at least so many shots were read or written down wrongly. */
  share: Interval;
  /** Share of faulty shots, if a fault leaves either parity alike: twice the share, 1 at most. */
  faultyShots: Interval;
  /** Chance that one bond was missed or counted twice, if bonds fail by themselves; null from a share of one half on. */
  faultyBonds: Interval;
}

/**
 * Faults of reading a ring, from its odd counts. Round a ring kinks come in pairs, and a misread site toggles two bonds
 * and keeps the parity; an odd count therefore is a lost site, a bond missed, or a mistake of the file.
 *
 * Bonds that fail by themselves with chance r make the count odd with chance ½(1 − (1 − 2r)^N), which is turned round.
 *
 * @param counts `[count, shots]`
 * @param bonds N of the ring
 */
export function oddCounts(counts: readonly (readonly [number, number])[], bonds: number): OddCounts {
  let odd = 0;
  let shots = 0;
  for (const [count, h] of counts) {
    shots += h;
    if (count % 2 === 1) odd += h;
  }
  const { low, high } = clopperPearson(odd, shots);
  const share = { value: odd / shots, low, high };
  const each = (of: (value: number) => number | null): Interval => ({
    value: of(share.value),
    low: of(low),
    high: of(high)
  });
  return {
    share,
    faultyShots: each((value) => Math.min(1, 2 * value)),
    // −expm1(ln(1 − 2·odd)/N)/2: a share of 1e-6 would lose its digits in 1 − (1 − 2·odd)^{1/N}.
    faultyBonds: each((value) => (value >= 0.5 ? null : -Math.expm1(Math.log1p(-2 * value) / bonds) / 2))
  };
}
