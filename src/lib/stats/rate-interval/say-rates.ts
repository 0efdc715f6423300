import { capital } from '../words/capital';
import type { Verdict } from '../types';
import { formatNumber, formatPercent } from '../words/format-number';
import type { RateSpread, RateVerdict } from './types';

type Found = Omit<RateSpread, 'statement'>;

/** The answer as the misread rate runs through its interval, in words. */
export function sayRates(found: Found, rate: number): string {
  const { uncertainty, miss, low, high, cutByCounts } = found;
  const cut = cutByCounts ? ', where a larger rate would show more than was read' : '';
  const interval = `With ${formatPercent(rate, 3)} and a standard uncertainty of ${formatPercent(uncertainty)} a site is misread in ${formatPercent(low, 3)} to ${formatPercent(high, 3)} of readings but for a chance of ${formatNumber(miss, 2)}${cut}. Every p is the largest over that interval, plus that chance (Berger and Boos 1994).`;
  return `${interval} ${sayStretches(found)}`;
}

/** "At rates up to 0.71 % independent trials are ruled out, from 0.74 % on …". */
export function sayStretches({ rates, changes }: Pick<Found, 'rates' | 'changes'>): string {
  if (changes.length === 0) return `At every rate tried ${says[rates[0].verdict]}.`;
  const ends = [...new Set(changes.flatMap(({ above, below }) => [above, below]))];
  // Ends that lie close need a digit more.
  const digits = new Set(ends.map((rate) => formatPercent(rate, 3))).size < ends.length ? 4 : 3;
  const percent = (rate: number) => formatPercent(rate, digits);
  const parts = stretches(rates).map(({ from, to, verdict }, i, all) => {
    const where =
      i === 0
        ? `at rates up to ${percent(to)}`
        : i === all.length - 1
          ? `from ${percent(from)} on`
          : from === to
            ? `at ${percent(from)}`
            : `from ${percent(from)} to ${percent(to)}`;
    return `${where} ${says[verdict]}`;
  });
  const text = parts.join('; ');
  return `${capital(text)}.`;
}

const says: Record<Verdict, string> = {
  'ruled-out': 'independent trials are ruled out',
  compatible: 'the counts are compatible with independent trials',
  undecided: 'the counts cannot tell'
};

/** Rates next to each other with one answer, as stretches. */
function stretches(rates: readonly RateVerdict[]): { from: number; to: number; verdict: Verdict }[] {
  const out: { from: number; to: number; verdict: Verdict }[] = [];
  for (const { rate, verdict } of rates) {
    const last = out[out.length - 1];
    if (last && last.verdict === verdict) last.to = rate;
    else out.push({ from: rate, to: rate, verdict });
  }
  return out;
}
