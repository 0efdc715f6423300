import { tailThresholds } from '../bounds/tail-thresholds';
import type { Certificate } from '../types';
import { kinkMeanLimits } from './kink-mean-limits';
import { logMisreadTail } from './log-misread-tail';
import { ringTail } from './ring-tail';
import { toggledLaw } from './toggled-law';

/** Chance that the interval for the mean misses, β; as in the plain certificate. */
const miss = 1e-6;

export interface MisreadCertificateInput {
  /** `[count, shots]`, counts ascending and distinct; no lump. */
  counts: [number, number][];
  shots: number;
  bonds: number;
  /** ε of one site, (1 − 2ε)² ≥ 2/3. */
  rate: number;
  /** The chain closes to a ring, and every count is even. */
  ring?: boolean;
}

/**
 * Exact certificate against independent kinks read with misread sites: as the plain one (see certificate), with the
 * bounds of logMisreadTail and the limits of kinkMeanLimits in the place of Hoeffding's and Clopper and Pearson's.
 *
 * T_n shots beyond n are stochastically below Bin(S, B_n), and p = min(1, m·min_n P(Bin(S, B_n) ≥ T_n) + β) over the
 * thresholds n from one count beyond the largest mean the limits allow outward to the first with S·B_n < 1e-9.
 *
 * @returns null when there is no threshold to try
 */
export function misreadCertificate({
  counts,
  shots,
  bonds,
  rate,
  ring = false
}: MisreadCertificateInput): Certificate | null {
  const mean = counts.reduce((sum, [n, h]) => sum + n * h, 0) / shots;
  const kinks = kinkMeanLimits(mean, shots, bonds, rate, miss, ring);
  const toggled = toggledLaw(bonds, rate, ring);
  // Mean count read for a mean number of kinks.
  const read = (kappa: number) => kappa * (1 - 4 * rate * (1 - rate)) + bonds * 2 * rate * (1 - rate);
  // One count in the unit of the bound, which is the pair on a ring.
  const step = ring ? 2 : 1;
  const known = new Map<string, number>();
  const findings = (['high', 'low'] as const).map((side) => {
    const logBound = (n: number) => {
      const key = `${side}${n}`;
      const value = known.get(key) ?? logMisreadTail(side, n, kinks, toggled, ring ? ringTail() : undefined);
      known.set(key, value);
      return value;
    };
    const first = side === 'high' ? Math.ceil(read(kinks.high) + step) : Math.floor(read(kinks.low) - step);
    return tailThresholds({ side, first, last: side === 'high' ? bonds : 0, logBound, counts, shots });
  });
  const found = findings.filter((finding) => finding !== null);
  if (found.length === 0) return null;
  const best = found.reduce((a, b) => (b.logP < a.logP ? b : a));
  const thresholds = found.reduce((sum, one) => sum + one.thresholds, 0);
  return {
    p: Math.min(1, thresholds * Math.exp(best.logP) + miss),
    side: best.side,
    count: best.count,
    thresholds,
    bound: Math.exp(best.logBound),
    shots: best.tail,
    mean: read(best.side === 'high' ? kinks.high : kinks.low)
  };
}
