import type { FitData } from '../fit/fit-data';
import { cells } from '../resampling/cells';
import { familyEven, familyWindow, type FittedLaw } from '../resampling/fitted-law';
import type { Evidence } from './evidence';

/**
 * Shots with an even count against the share the law expects, and whether one count makes the difference.
 *
 * Any gross misfit prefers a parity a little, through the one count where it is largest (zeros, mostly). Pairing
 * shows at all counts: with the most telling one left out, more than two standard deviations remain.
 */
export function evenShots(data: FitData, law: FittedLaw): NonNullable<Evidence['even']> {
  const expected = familyEven(law);
  const { law: f } = cells(data, familyWindow(law, 1e-18, 1));
  let seen = 0;
  let excess = 0;
  const parts = Array.from(data.shots, (shots, i) => {
    const sign = (data.first + i) % 2 === 0 ? 1 : -1;
    if (sign > 0) seen += shots;
    const part = sign * (shots - data.total * f[i]);
    excess += part;
    return part;
  });
  const direction = Math.sign(excess);
  const largest = Math.max(...parts.map((part) => direction * part));
  const left = Math.abs(excess) - largest;
  return { seen, expected, oneCountAlone: left < 2 * Math.sqrt(data.total) };
}
