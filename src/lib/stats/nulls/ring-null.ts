import { logMeanChernoff } from '../bounds/log-mean-chernoff';
import type { FitData } from '../fit/fit-data';
import { sampleMoments } from '../fit/sample-moments';
import { windowRate } from '../laws/window-rate';
import { chainFit } from '../misread/chain-fit';
import { logMisreadTail } from '../misread/log-misread-tail';
import { misreadCertificate } from '../misread/misread-certificate';
import { readMoments, readWindow } from '../misread/read-chain';
import { ringCeiling } from '../misread/ring-ceiling';
import { ringTail } from '../misread/ring-tail';
import { ringWindow } from '../misread/ring-window';
import { toggledLaw } from '../misread/toggled-law';
import { clampedVariance } from '../moments/clamped-variance';
import type { DiagnoseOptions, Histogram } from '../types';
import { misreadFitReport } from './misread-fit-report';
import type { NullLaw } from './null-law';

/**
 * Independent kinks round a ring but for their even total, read with misread sites: as
 * misreadNull for an open chain. Every count is even, so parity is not tested; certificate and bounds rest on half the
 * count being a sum of independent trials (see ringTail), and are the weaker for it.
 *
 * Measured with 40 bonds, p = 0.06, ε = 0.01 and 2000 shots: at a nominal 5 % the variance alarmed in 4.9 % of 1500
 * repeats, the fit in 4.7 %, high and low tail in 4.3 % and 4.9 %; empty shots in 5.0 % of 200. Twice the smallest excess
 * was seen by the variance in 67 of 67 repeats.
 *
 * @param counts of single kinks, all even
 * @param rate ε, as misreadApplies lets through
 */
export function ringNull(
  counts: FitData,
  histogram: Histogram,
  rate: number,
  options: DiagnoseOptions
): NullLaw {
  const bonds = counts.trials!;
  const ring = true;
  const { chain, value, even } = chainFit(counts, rate, null, 1e-9, ring);
  const levels = { ...chain, rate, ring };
  const near = value - even.value <= Math.log(counts.total) / 2;
  const ceilingAt = ringCeiling(bonds, rate);
  const most = ceilingAt(sampleMoments(counts).mean);
  const blocks = Array.from(most.kinks!, (p) => ({ p, trials: 1 }));
  const window = ringWindow(blocks, rate, 1);
  const lost = 4 * rate * (1 - rate);
  const kinks = Math.min(bonds, Math.max(0, (readMoments(levels).mean - (bonds * lost) / 2) / (1 - lost)));
  const exactly = { low: kinks, high: kinks };
  const toggled = toggledLaw(bonds, rate, true);
  const fitted = readWindow(levels);
  return {
    levels,
    law: levels,
    logLikelihood: value,
    ...(near && { drawnFrom: { ...even.chain, rate, ring } }),
    ceiling: histogram.lump || histogram.below ? clampedVariance(window, histogram) : most.variance,
    mostDispersed: { window, ceiling: (mean) => ceilingAt(mean).variance },
    certificate:
      histogram.lump || histogram.below
        ? null
        : misreadCertificate({ counts: histogram.counts, shots: counts.total, bonds, rate, ring }),
    bounds: {
      meanChernoff: (side, count) =>
        Math.max(
          logMisreadTail(side, count, exactly, toggled, ringTail(logMeanChernoff)),
          -windowRate(fitted, count)
        ),
      hoeffding: (side, count) => logMisreadTail(side, count, exactly, toggled, ringTail())
    },
    report: (drawn) => misreadFitReport(counts, levels, value, drawn, options, near)
  };
}
