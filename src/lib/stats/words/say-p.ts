import { formatCount, formatNumber } from './format-number';

/**
 * A p-value in words, number second: "would turn up once in 3 400 repeats of the experiment (p = 0.00029,
 * 1 999 resamples)". At the smallest p that could be shown it says "at most once in".
 *
 * @param resamples draws behind the p-value; 0 for an exact one, which is then not mentioned
 */
export function sayP(p: number, smallestP: number, resamples: number): string {
  const drawn = resamples > 0 ? `, ${formatCount(resamples)} resamples` : '';
  return `${sayHowOften(p, smallestP)} (p ${p <= smallestP && resamples > 0 ? '≤' : '='} ${formatNumber(p, 2)}${drawn})`;
}

/** "would turn up once in 3 400 repeats of the experiment", or "in 36 of 100 repeats" when common. */
export function sayHowOften(p: number, smallestP = 0): string {
  if (p >= 0.995) return 'would turn up in practically every repeat of the experiment';
  const atMost = p <= smallestP ? 'at most ' : '';
  if (p > 0.1) return `would turn up in ${atMost}${Math.round(100 * p)} of 100 repeats of the experiment`;
  return `would turn up ${atMost}once in ${rounded(1 / p)} repeats of the experiment`;
}

/** Two significant digits: more would pretend to a precision that p-values do not have. */
function rounded(value: number): string {
  if (value >= 1e9) return formatNumber(value, 2);
  const unit = 10 ** Math.max(0, Math.floor(Math.log10(value)) - 1);
  return formatCount(Math.round(value / unit) * unit);
}
