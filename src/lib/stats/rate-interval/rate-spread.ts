import { decide } from '../answer/decide';
import { smallestExcess } from '../answer/smallest-excess';
import type { FitData } from '../fit/fit-data';
import { adjust } from '../multiple/adjust';
import type { NullLaw } from '../nulls/null-law';
import type { DrawHelper } from '../resampling/draw-helper';
import type { Pace } from '../resampling/pace';
import type { Certificate, DiagnoseOptions, Diagnosis, Histogram, Interval } from '../types';
import { atRate, partOf, type AtRate, type BareTest } from './at-rate';
import { bestRate } from './best-rate';
import { changesOf } from './changes-of';
import { furtherRates } from './further-rates';
import type { RateLimits } from './rate-limits';
import { sayRates } from './say-rates';
import type { RateSpread, RateVerdict } from './types';
import { worstCertificate, worstTests } from './worst-tests';

/** What is known at the rate stated when the rest of its interval is looked at. */
export interface Stated {
  counts: FitData;
  histogram: Histogram;
  options: DiagnoseOptions;
  limits: RateLimits;
  moments: Pick<Diagnosis['moments'], 'mean' | 'ceiling' | 'dispersion'>;
  tested: Pick<NullLaw, 'certificate'>;
  /** Tests that depend on the rate, at the rate stated. */
  tests: BareTest[];
  /** Tests of order and batches, which do not. */
  order: BareTest[];
}

/** Tests and certificate that hold for every rate of the interval, and the answer as the rate runs. */
export interface OverRates {
  tests: BareTest[];
  certificate: Certificate | null;
  spread: RateSpread;
}

/** Rates tried beyond those, to find where the answer changes. */
const mostSought = 6;
/** Ends once it is known to this share of the interval. */
const fineness = 1 / 24;
/** Resamples at other rates than the one stated, of those with which a smallest p reaches α: refits of a bad rate take long. */
const spare = 1.5;

/**
 * The answer where a misread rate is known with an uncertainty (Berger and Boos): every p is the largest over an interval
 * that holds the rate but for the chance β, plus β. The largest is taken over both ends of the interval, the rate stated,
 * the rate that fits best within and, for tests of the fit that alarm at all of these, eight rates more (see
 * furtherRates). That no p peaks between them is not proved; the false alarms are held by repeats (`npm run calibrate --
 * --nuisance all`).
 *
 * @param helper makes some of the draws elsewhere; the answers are the same with and without
 */
export async function rateSpread(stated: Stated, pace: Pace, helper?: DrawHelper): Promise<OverRates> {
  const { counts, histogram, options, limits, moments, order } = stated;
  const { rate, low, high, miss } = limits;
  const excess = smallestExcess(moments.mean.value!, counts.trials, counts.total);
  const verdictOf = (at: AtRate): RateVerdict => {
    const factor = moments.ceiling / at.ceiling;
    const dispersion = scaled(moments.dispersion, factor);
    const found = decide(
      {
        certificate: worstCertificate([at.certificate], miss),
        tests: adjust([...worstTests(at.tests, [], miss), ...order]),
        moments: { dispersion },
        options,
        misread: { applies: true, rate: at.rate },
        shots: counts.total
      },
      excess
    );
    return { rate: at.rate, ceiling: at.ceiling, dispersion, verdict: found };
  };
  const known: AtRate = {
    rate,
    ceiling: moments.ceiling,
    tests: stated.tests,
    certificate: stated.tested.certificate
  };
  const ring = options.geometry === 'ring-bonds';
  const others = [...new Set([low, high, bestRate(counts, low, high, ring)])].filter((one) => one !== rate);
  const many = stated.tests.length + order.length;
  const fewer = {
    ...options,
    resamples: Math.min(options.resamples, Math.ceil((spare * many) / options.alpha))
  };
  const tried = [known];
  for (const [i, one] of others.entries())
    tried.push(
      await atRate(counts, histogram, one, fewer, partOf(pace, i / 6, (i + 1) / 6), undefined, helper)
    );
  const asked = { counts, histogram, options: fewer, limits, stated: stated.tests, order, tried };
  tried.push(...(await furtherRates(asked, partOf(pace, 0.5, 0.7), helper)));
  const tests = worstTests(stated.tests, tried, miss);
  const certificate = worstCertificate(
    tried.map((one) => one.certificate),
    miss
  );
  const rates = tried.map(verdictOf).sort((a, b) => a.rate - b.rate);
  // Holm's first step: a ceiling test so small settles the answer at that rate whatever the others say.
  const settles = (ceiling: BareTest) => (ceiling.p + miss) * many <= options.alpha;
  for (let sought = 0; sought < mostSought; sought++) {
    const widest = changesOf(rates).sort((a, b) => b.below - b.above - (a.below - a.above))[0];
    if (!widest || widest.below - widest.above <= (high - low) * fineness) break;
    const middle = (widest.above + widest.below) / 2;
    const from = 0.7 + (0.3 * sought) / mostSought;
    const at = await atRate(
      counts,
      histogram,
      middle,
      fewer,
      partOf(pace, from, from + 0.3 / mostSought),
      settles,
      helper
    );
    rates.push(settledOr(at, verdictOf, settles));
    rates.sort((a, b) => a.rate - b.rate);
  }
  const changes = changesOf(rates);
  const { uncertainty, cutByCounts } = limits;
  const found = { uncertainty, miss, low, high, cutByCounts, rates, changes };
  return { tests, certificate, spread: { ...found, statement: sayRates(found, options.misread ?? rate) } };
}

/** The verdict of a rate at which only the ceiling test may have run. */
function settledOr(
  at: AtRate,
  verdictOf: (at: AtRate) => RateVerdict,
  settles: (ceiling: BareTest) => boolean
): RateVerdict {
  const found = verdictOf(at);
  return settles(at.tests[0]) ? { ...found, verdict: 'ruled-out' } : found;
}

function scaled({ value, low, high }: Interval, factor: number): Interval {
  const by = (one: number | null) => (one === null ? null : one * factor);
  return { value: by(value), low: by(low), high: by(high) };
}
