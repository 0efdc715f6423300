import type { FitData } from '../fit/fit-data';
import type { KeptCounts } from '../truncation/truncated-law';
import { BadInput, type DiagnoseOptions, type Histogram } from '../types';
import { sayKept } from '../words/say-kept';
import type { MisreadUse } from './misread-applies';
import { needTrialsForCut } from './need-trials-for-cut';

/**
 * The counts kept, in the unit tested, when a cut was declared; null when none was.
 *
 * @throws BadInput, in words, where the cut and the counts do not go together or the cut cannot be allowed for
 */
export function keptCounts(
  { kept, unit }: Pick<DiagnoseOptions, 'kept' | 'unit'>,
  { lump, below }: Histogram,
  { first, shots, trials }: FitData,
  misread: MisreadUse
): KeptCounts | null {
  if (!kept) return null;
  const per = unit === 'pair' ? 2 : 1;
  const from = Math.ceil(kept.from / per);
  const to = kept.to === null ? Infinity : Math.floor(kept.to / per);
  const refuse = (reason: string): never => {
    throw new BadInput(reason);
  };
  needTrialsForCut(trials);
  if (lump || below)
    return refuse(
      `${lump ? 'A closing row "or more"' : 'An opening row "or fewer"'} and a cut of the counts cannot both be allowed for.`
    );
  if (misread.applies)
    return refuse('A misread rate and a cut of the counts cannot both be allowed for: give one of them.');
  const last = first + shots.length - 1;
  if (first < from || last > to)
    return refuse(
      `A count of ${(first < from ? first : last) * per} was seen, but only ${sayKept(kept)} are said to be kept.`
    );
  if (Math.min(to, trials) - from < 1)
    return refuse('That cut leaves one count only: nothing is left to test.');
  return { from, to };
}
