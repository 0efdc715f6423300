import { logMeanChernoff } from '../bounds/log-mean-chernoff';
import type { FitData } from '../fit/fit-data';
import { windowRate } from '../laws/window-rate';
import { chainFit } from '../misread/chain-fit';
import { inPairs } from '../misread/in-pairs';
import { kinksOf } from '../misread/kinks-of';
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
 * Independent kinks round a ring but for their even total, read with misread sites, counted singly or in pairs: as
 * misreadNull for an open chain. Every count is even, so parity is not tested; certificate and bounds rest on half the
 * count being a sum of independent trials (see ringTail), and are the weaker for it.
 *
 * @param counts in the unit tested; all even where single kinks are counted
 * @param rate ε, as misreadApplies lets through
 */
export function ringNull(
  counts: FitData,
  histogram: Histogram,
  rate: number,
  options: DiagnoseOptions
): NullLaw {
  const ring = options.unit;
  const per = ring === 'pair' ? 2 : 1;
  const { bonds, moments } = kinksOf(counts, ring);
  const { chain, value, even } = chainFit(counts, rate, null, 1e-9, ring);
  const levels = { ...chain, rate, ring };
  const near = value - even.value <= Math.log(counts.total) / 2;
  const ceilingAt = ringCeiling(bonds, rate);
  const most = ceilingAt(moments.mean);
  const blocks = Array.from(most.kinks!, (p) => ({ p, trials: 1 }));
  const window = inPairs(ringWindow(blocks, rate, 1), ring);
  const lost = 4 * rate * (1 - rate);
  const kinks = Math.min(
    bonds,
    Math.max(0, (per * readMoments(levels).mean - (bonds * lost) / 2) / (1 - lost))
  );
  const exactly = { low: kinks, high: kinks };
  const toggled = toggledLaw(bonds, rate, true);
  const found =
    histogram.lump || histogram.below
      ? null
      : misreadCertificate({
          counts: histogram.counts.map(([n, shots]) => [per * n, shots]),
          shots: counts.total,
          bonds,
          rate,
          ring: true
        });
  const fitted = readWindow(levels);
  return {
    levels,
    law: levels,
    logLikelihood: value,
    ...(near && { drawnFrom: { ...even.chain, rate, ring } }),
    ceiling:
      histogram.lump || histogram.below ? clampedVariance(window, histogram) : most.variance / (per * per),
    mostDispersed: { window, ceiling: (mean) => ceilingAt(per * mean).variance / (per * per) },
    // An odd count is as good a threshold as the even one beyond it.
    certificate: found && {
      ...found,
      count: found.side === 'high' ? Math.ceil(found.count / per) : Math.floor(found.count / per),
      mean: found.mean / per
    },
    bounds: {
      meanChernoff: (side, count) =>
        Math.max(
          logMisreadTail(side, per * count, exactly, toggled, ringTail(logMeanChernoff)),
          -windowRate(fitted, count)
        ),
      hoeffding: (side, count) => logMisreadTail(side, per * count, exactly, toggled, ringTail())
    },
    report: (drawn) => misreadFitReport(counts, levels, value, drawn, options, near)
  };
}
