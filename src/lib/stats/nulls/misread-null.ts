import { logMeanChernoff } from '../bounds/log-mean-chernoff';
import type { FitData } from '../fit/fit-data';
import { sampleMoments } from '../fit/sample-moments';
import { chainBlocks } from '../misread/chain-blocks';
import { chainFit } from '../misread/chain-fit';
import { chainRate } from '../misread/chain-rate';
import { chainWindow } from '../misread/chain-window';
import { logMisreadTail } from '../misread/log-misread-tail';
import { misreadCeiling } from '../misread/misread-ceiling';
import { misreadCertificate } from '../misread/misread-certificate';
import { readMoments } from '../misread/read-chain';
import { toggledLaw } from '../misread/toggled-law';
import { clampedVariance } from '../moments/clamped-variance';
import type { DiagnoseOptions, Histogram } from '../types';
import { misreadFitReport } from './misread-fit-report';
import type { NullLaw } from './null-law';
import { ringNull } from './ring-null';

/**
 * Independent kinks on an open chain, read with misread sites: the best chain, the misread ceiling with the kinks that
 * reach it, a certificate and bounds that hold for all such kinks.
 *
 * @param rate ε, as misreadApplies lets through
 *
 * Resamples are drawn from equal bonds, which vary about as much as kinks can, unless the best chain is more than ½ ln S
 * nats better: a limit that is not clearly far is taken to bind (Andrews & Soares 2010, κ = √ln S (m)). Drawn from the
 * best chain whenever the variance happens to lie below its ceiling, they can follow their counts both ways, as counts
 * at the ceiling cannot: at a nominal 5 % the low tail alarmed in 7.5 % of 1072 repeats of equal bonds.
 */
export function misreadNull(
  counts: FitData,
  histogram: Histogram,
  rate: number,
  options: DiagnoseOptions
): NullLaw {
  if (options.geometry === 'ring-bonds') return ringNull(counts, histogram, rate, options);
  const bonds = counts.trials!;
  const { chain, value, even } = chainFit(counts, rate);
  const levels = { ...chain, rate };
  const near = value - even.value <= Math.log(counts.total) / 2;
  const ceilingAt = misreadCeiling(bonds, rate);
  const most = ceilingAt(sampleMoments(counts).mean);
  const window = chainWindow(
    Array.from(most.kinks!, (p) => ({ p, trials: 1 })),
    rate,
    1e-18,
    1
  );
  const lost = 4 * rate * (1 - rate);
  const kinks = Math.max(0, (readMoments(levels).mean - (bonds * lost) / 2) / (1 - lost));
  const exactly = { low: kinks, high: kinks };
  const toggled = toggledLaw(bonds, rate);
  return {
    levels,
    law: levels,
    logLikelihood: value,
    ...(near && { drawnFrom: { ...even.chain, rate } }),
    ceiling: histogram.lump || histogram.below ? clampedVariance(window, histogram) : most.variance,
    mostDispersed: { window, ceiling: (mean) => ceilingAt(mean).variance },
    // Shots in a lump leave the mean open on one side.
    certificate:
      histogram.lump || histogram.below
        ? null
        : misreadCertificate({ counts: histogram.counts, shots: counts.total, bonds, rate }),
    bounds: {
      // Given the flips it can fall below Chernoff's bound of the fitted law; from the mean alone no more is claimed.
      meanChernoff: (side, count) =>
        Math.max(
          logMisreadTail(side, count, exactly, toggled, logMeanChernoff),
          -chainRate(chainBlocks(levels), rate, count)
        ),
      hoeffding: (side, count) => logMisreadTail(side, count, exactly, toggled)
    },
    report: (fitted) => misreadFitReport(counts, levels, value, fitted, options, near)
  };
}
