import type { RateChange, RateVerdict } from './types';

/** Where the answer changes between neighbours of rates that rise. */
export function changesOf(rates: readonly RateVerdict[]): RateChange[] {
  const out: RateChange[] = [];
  for (let i = 1; i < rates.length; i++) {
    const [a, b] = [rates[i - 1], rates[i]];
    if (a.verdict !== b.verdict) out.push({ above: a.rate, below: b.rate, from: a.verdict, to: b.verdict });
  }
  return out;
}
