import { sayKept } from '$lib/stats/words/say-kept';
import type { Diagnosis } from '$lib/stats/types';
import { ceilingWords } from './ceiling-words';

/** What the answer allows for and the region of the cumulants does not. */
export interface BeyondRegion {
  /** Ends "not allowing for …". */
  what: string;
  /** Why counts of independent trials may lie outside the region, and where their variance stands all the same. */
  why: string;
}

/** Where a report allows for misreads or a declared cut, what the region of the cumulants leaves out; null elsewhere. */
export function beyondRegion(diagnosis: Diagnosis): BeyondRegion | null {
  const { data, nuisances } = diagnosis;
  if (nuisances?.misread?.applied)
    return {
      what: 'misreads',
      why: `The region is that of trials read without error; the answer allows for misreads. A misread site toggles two bonds at once, so defects that form independently can be read with cumulants outside the region. ${ceilingWords(diagnosis)} That ceiling has the misreads in it.`
    };
  if (data.kept)
    return {
      what: 'the cut',
      why: `The region is that of whole counts; the answer allows for the cut to ${sayKept(data.kept)}. A cut changes every cumulant, so counts of independent trials can lie outside the region once cut. ${ceilingWords(diagnosis)} That ceiling is of counts cut so.`
    };
  return null;
}
