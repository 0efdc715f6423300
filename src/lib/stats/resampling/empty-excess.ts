import type { Refitted } from './refitted';

/**
 * Too many empty shots: the root of twice the log-likelihood gained by letting the share of empty shots be
 * free, √(2[L(n ≥ 1) + h_0 ln(h_0/S) + S_+ ln(S_+/S) − L]), where L(n ≥ 1) is the best conditional likelihood of
 * the other shots; 0 when these expect at least as many empty shots as were seen.
 *
 * Why not h_0 − S f_0 alone: the other shots often leave f_0 open by a factor of two, and the best law for
 * them is then no better than many that expect every empty shot. The gain in likelihood is nothing there.
 */
export function emptyExcess(histogram: Refitted): number {
  const rest = histogram.rest();
  if (!rest) return 0;
  const { total } = histogram.data;
  const others = rest.data.total;
  const empty = total - others;
  if (empty <= expectedEmpty(histogram)!) return 0;
  const free = empty * Math.log(empty / total) + others * Math.log(others / total);
  return Math.sqrt(Math.max(0, 2 * (rest.fit.logLikelihood + free - histogram.fit.logLikelihood)));
}

/** Empty shots that the law of the others expects, S_+ f_0/(1 − f_0); null when there are no others. */
export function expectedEmpty(histogram: Refitted): number | null {
  const rest = histogram.rest();
  if (!rest) return null;
  const { window } = rest.fit;
  const f = window.first === 0 ? window.values[0] / window.scale : 0;
  return (rest.data.total * f) / (1 - f);
}
