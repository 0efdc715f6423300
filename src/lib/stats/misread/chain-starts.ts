import { chainMoments } from './chain-moments';
import type { Chain } from './chain-space';
import { ringEven } from './ring-even';
import { ringMoments } from './ring-moments';

/** All bonds alike, with the mean wanted or the nearest to it that kinks can give. */
export function evenChain(bonds: number, mean: number, rate: number, ring = false): Chain {
  // From p = 0 a ring would never be left: its slope is 0 there, since kinks come in pairs.
  if (ring) return { p: [Math.max(1e-4, ringEven(bonds, mean, rate))], runs: [{ level: 0, trials: bonds }] };
  const toggled = 2 * rate * (1 - rate);
  const p = (mean / bonds - toggled) / (1 - 2 * toggled);
  return { p: [Math.min(1, Math.max(0, p))], runs: [{ level: 0, trials: bonds }] };
}

/**
 * Runs of two levels, `many` bonds of the first: in one stretch each, or with the rarer level in `apart` stretches (as
 * many as it has bonds, at most) spread evenly along the chain.
 */
export function twoLevelRuns(bonds: number, many: number, apart: number): Chain['runs'] {
  const few = bonds - many;
  const stretches = Math.min(many, few, apart);
  if (stretches === 1) {
    return [
      { level: 0, trials: many },
      { level: 1, trials: few }
    ];
  }
  const rare = many <= few ? 0 : 1;
  const share = (total: number, i: number, parts: number) =>
    Math.floor((total * (i + 1)) / parts) - Math.floor((total * i) / parts);
  const runs: Chain['runs'] = [];
  // The common level has one stretch more, so that no rare one lies at an end.
  for (let i = 0; i <= stretches; i++) {
    runs.push({ level: 1 - rare, trials: share(Math.max(many, few), i, stretches + 1) });
    if (i < stretches) runs.push({ level: rare, trials: share(Math.min(many, few), i, stretches) });
  }
  return runs;
}

/**
 * Two levels, the first of `many` bonds and more likely to hold a kink, with the mean wanted and about the variance
 * wanted: spreading m by x (m_1 = m̄ − (N − n)x, m_2 = m̄ + nx) takes n(N − n)N·u²(3u² − 2)x²/4 off it where
 * neighbours are alike.
 *
 * @returns null when the variance wanted is not below that of equal bonds
 */
export function twoLevels(
  bonds: number,
  many: number,
  apart: number,
  moments: { mean: number; variance: number },
  rate: number,
  ring = false
): Chain | null {
  const even = evenChain(bonds, moments.mean, rate, ring).p[0];
  const widest = ring ? ringMoments(bonds, even, rate) : chainMoments([{ p: even, trials: bonds }], rate);
  const excess = widest.variance - moments.variance;
  const square = 1 - 4 * rate * (1 - rate);
  const few = bonds - many;
  if (!(excess > 0) || !(square > 2 / 3) || many < 1 || few < 1) return null;
  const wanted = Math.sqrt(excess / (many * few * bonds * square * (3 * square - 2)));
  // p_1 = p + few·x ≤ 1 and p_2 = p − many·x ≥ 0, both with a little room to move.
  const x = Math.min(wanted, (0.99 * (1 - even)) / few, (0.99 * even) / many);
  return { p: [even + few * x, even - many * x], runs: twoLevelRuns(bonds, many, apart) };
}
