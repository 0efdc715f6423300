import type { FitData } from '../fit/fit-data';
import { sampleMoments } from '../fit/sample-moments';
import { readMoments } from '../misread/read-chain';
import { keptEqual } from '../truncation/kept-equal';
import { truncatedFit } from '../truncation/truncated-fit';
import type { KeptCounts } from '../truncation/truncated-law';
import { windowMoments } from '../truncation/window-moments';
import type { Window } from '../laws/window';
import type { DiagnoseOptions } from '../types';
import { keptFitReport } from './kept-fit-report';
import type { NullLaw } from './null-law';

/**
 * Independent trials of which only the counts kept are left: the best such law found (see truncatedFit), the variance of
 * equal trials so cut as the ceiling (see keptEqual), and the bounds that their convex order gives. No certificate: with
 * shots dropped nothing bounds the mean before the cut.
 *
 * Resamples are drawn from equal trials so cut unless the counts tell the best law from them by ½ ln S, as for kinks on
 * an open chain (see misreadNull): the best law follows its own counts, and what is drawn from it varies less.
 * Forty trials, empty shots dropped, 300 shots, alarms at 5 % in 900 repeats: low tail 6.6 % from the best law and 5.8 %
 * so, parity 6.6 and 5.7 %, fit 5.3 and 4.4 %; twice the smallest excess was seen as often.
 */
export function keptNull(counts: FitData, kept: KeptCounts, options: DiagnoseOptions): NullLaw {
  const trials = counts.trials!;
  const { chain: levels, value, even, how } = truncatedFit(counts, kept);
  const near = value - even.value <= Math.log(counts.total) / 2;
  const window = keptEqual(trials, kept, sampleMoments(counts).mean);
  const widest = keptEqual(trials, kept, readMoments(levels).mean);
  const bound = (side: 'high' | 'low', count: number) => logTiltBound(widest, side, count);
  return {
    levels,
    law: levels,
    logLikelihood: value,
    ...(near && { drawnFrom: even.chain }),
    ceiling: windowMoments(window).variance,
    mostDispersed: {
      window,
      ceiling: (mean) => windowMoments(keptEqual(trials, kept, mean)).variance
    },
    certificate: null,
    bounds: { meanChernoff: bound, hoeffding: bound },
    report: (fitted) => keptFitReport(counts, levels, { value, how, drawnEven: near }, fitted, options)
  };
}

/** min over θ of ln E e^{θ(X − count)}, θ ≥ 0 for the high side: holds for every law below X in the convex order. */
function logTiltBound({ first, values, scale }: Window, side: 'high' | 'low', count: number): number {
  const sign = side === 'high' ? 1 : -1;
  const at = (theta: number): { log: number; mean: number } => {
    let most = -Infinity;
    for (let i = 0; i < values.length; i++)
      if (values[i] > 0) most = Math.max(most, Math.log(values[i] / scale) + theta * (first + i - count));
    let sum = 0;
    let weighed = 0;
    for (let i = 0; i < values.length; i++) {
      if (!(values[i] > 0)) continue;
      const term = Math.exp(Math.log(values[i] / scale) + theta * (first + i - count) - most);
      sum += term;
      weighed += term * (first + i - count);
    }
    return { log: most + Math.log(sum), mean: weighed / sum };
  };
  let near = 0;
  let far = 40 * sign;
  for (let step = 0; step < 50; step++) {
    const middle = (near + far) / 2;
    if (sign * at(middle).mean < 0) near = middle;
    else far = middle;
  }
  return Math.min(0, at(far).log, at(near).log);
}
