import type { FitData } from '../fit/fit-data';
import { lawRate } from '../laws/law-rate';
import { logPmf } from '../laws/log-pmf';
import type { Window } from '../laws/window';
import { windowRate } from '../laws/window-rate';
import { chainBlocks } from '../misread/chain-blocks';
import { chainRate } from '../misread/chain-rate';
import { isReadChain, type ReadChain } from '../misread/read-chain';
import { familyMoments, familyWindow, type FittedLaw } from '../resampling/fitted-law';

/** The fitted law over the counts a report shows. */
export interface LawTable {
  mean: number;
  variance: number;
  first: number;
  /** f_n and ln f_n for first, first+1, …; ln f_n is exact where f_n underflows. */
  f: number[];
  logF: number[];
  /** P(X ≥ n) and P(X ≤ n), for any n. */
  upper(n: number): number;
  lower(n: number): number;
  /** Large-deviation rate sup_θ [θn − Λ(θ)], nats a shot. */
  rate(n: number): number;
}

/** Up to this N every count is shown; beyond, those seen and nine standard deviations of the law. */
const fullTable = 60;
/** Rows shown beyond the counts seen, at most, on either side. */
const margin = 500;

/** Counts shown and the law there, with relative error under 1e-10 down to 1e-300. */
export function lawTable(data: FitData, law: FittedLaw): LawTable {
  const { mean, variance } = familyMoments(law);
  const window = familyWindow(law);
  const spread = Math.sqrt(variance);
  const last = data.first + data.shots.length - 1;
  const most = data.trials ?? Infinity;
  const whole = most <= fullTable;
  const seen = Math.max(last, data.lump?.from ?? 0);
  const lowest = Math.max(data.first - margin, Math.min(data.first, Math.floor(mean - 9 * spread)) - 1);
  const highest = Math.min(seen + margin, Math.max(seen, Math.ceil(mean + 9 * spread)) + 1);
  const first = whole ? 0 : Math.max(0, lowest);
  const end = whole ? most : Math.min(most, highest);
  const f: number[] = [];
  const logF: number[] = [];
  for (let n = first; n <= end; n++) {
    const k = n - window.first;
    const value = k >= 0 && k < window.values.length ? window.values[k] / window.scale : 0;
    f.push(value);
    logF.push(value > 1e-300 ? Math.log(value) : far(law, window, n));
  }
  const upward = cumulative(window.values, window.scale, true);
  const downward = cumulative(window.values, window.scale, false);
  return {
    mean,
    variance,
    first,
    f,
    logF,
    upper: (n) => (n <= window.first ? 1 : (upward[n - window.first] ?? 0)),
    lower: (n) =>
      n < window.first ? 0 : Math.min(1, downward[Math.min(n - window.first, downward.length - 1)]),
    rate: (n) => (isReadChain(law) ? readRate(law, n, mean, window) : lawRate(law, n))
  };
}

/**
 * Rate of a chain; cut to the counts kept, I(n) + ln P(kept), which keeps Chernoff's bound one: P(X ≥ n | kept) ≤
 * P(X ≥ n)/P(kept). Between the mean before the cut and after it nothing is known, and the rate is 0.
 */
function readRate(law: ReadChain, n: number, mean: number, window: Window): number {
  if (law.ring) return windowRate(window, n);
  const { kept, ...before } = law;
  const rate = chainRate(chainBlocks(law), law.rate, n);
  if (!kept) return rate;
  const whole = familyMoments(before).mean;
  if (n < kept.from || n > kept.to) return Infinity;
  if ((n - mean) * (n - whole) < 0) return 0;
  const { first, values, scale } = familyWindow(before);
  let share = 0;
  for (let i = 0; i < values.length; i++)
    if (first + i >= kept.from && first + i <= kept.to) share += values[i] / scale;
  return Math.max(0, rate + Math.log(share));
}

/** ln f_n where f_n is too small for a double. Of a chain as far as its window goes, to 1e-590. */
function far(law: FittedLaw, window: Window, n: number): number {
  if (!isReadChain(law)) return logPmf(law, n);
  const value = window.values[n - window.first] ?? 0;
  return value > 0 ? Math.log(value) - Math.log(window.scale) : -Infinity;
}

/** Tail sums, smallest terms first. */
function cumulative(values: Float64Array, scale: number, fromTop: boolean): Float64Array {
  const out = new Float64Array(values.length);
  let sum = 0;
  for (let i = 0; i < values.length; i++) {
    const k = fromTop ? values.length - 1 - i : i;
    sum += values[k];
    out[k] = Math.min(1, sum / scale);
  }
  return out;
}
