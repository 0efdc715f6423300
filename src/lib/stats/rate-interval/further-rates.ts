import type { FitData } from '../fit/fit-data';
import { adjust } from '../multiple/adjust';
import { misreadNull } from '../nulls/misread-null';
import type { DrawHelper } from '../resampling/draw-helper';
import { fittedTests } from '../resampling/fitted-tests';
import type { Pace } from '../resampling/pace';
import type { DiagnoseOptions, Histogram, TestId } from '../types';
import { atRate, partOf, type AtRate, type BareTest } from './at-rate';
import { worstTests } from './worst-tests';

/** Where in the interval is looked further: neither at its ends nor in its middle, where the rate stated mostly lies. */
const shares = [1, 3, 5, 7, 9, 11, 13, 15].map((k) => k / 16);

/** What is asked at further rates. */
export interface Further {
  counts: FitData;
  histogram: Histogram;
  /** With the resamples wanted at a rate. */
  options: DiagnoseOptions;
  limits: { low: number; high: number; miss: number };
  /** Tests at the rate stated, and those that no rate changes. */
  stated: BareTest[];
  order: BareTest[];
  /** Rates at which every test was asked. */
  tried: AtRate[];
}

/**
 * Tests of the fit that would alarm by the rates tried, at eight more across the interval, until none would. Between the
 * four rates tried first p can be larger: on eight sets of counts the largest of 13 was up to 2.4 times that of four,
 * though nowhere did it lift a p out of alarm. The ceiling test grows with the rate and needs no more than the ends.
 *
 * An alarm is far out in nearly every draw, which then needs no refit; so this costs little where it settles nothing. Where
 * no test left would rule out by itself, all are asked.
 */
export async function furtherRates(asked: Further, pace: Pace, helper?: DrawHelper): Promise<AtRate[]> {
  const { counts, histogram, options, limits, stated, order, tried } = asked;
  const { low, high, miss } = limits;
  const found: AtRate[] = [];
  for (const [i, share] of shares.entries()) {
    const worst = worstTests(stated, [...tried, ...found], miss);
    const only = adjust([...worst, ...order])
      .filter(({ id, pAdjusted }) => standsOnFit(id, worst) && pAdjusted <= options.alpha)
      .map(({ id }) => id);
    if (only.length === 0) break;
    const rate = low + share * (high - low);
    if (tried.some((one) => Math.abs(one.rate - rate) < 1e-9 * (high - low))) continue;
    const part = partOf(pace, i / shares.length, (i + 1) / shares.length);
    const tested = misreadNull(counts, histogram, rate, options);
    const drawing = { resamples: options.resamples, seed: options.seed, only };
    const { tests } = await fittedTests(counts, tested, drawing, partOf(part, 0, 0.3), helper);
    const alone = tests.some(({ p }) => (p + miss) * (stated.length + order.length) <= options.alpha);
    found.push(
      alone
        ? { rate, ceiling: tested.ceiling!, tests, certificate: tested.certificate, only }
        : await atRate(counts, histogram, rate, options, partOf(part, 0.3, 1), undefined, helper)
    );
  }
  return found;
}

function standsOnFit(id: TestId, fitted: readonly BareTest[]): boolean {
  return id !== 'ceiling' && fitted.some((test) => test.id === id);
}
