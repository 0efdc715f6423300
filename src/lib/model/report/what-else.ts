import type { Diagnosis, Verdict } from '$lib/stats/types';
import { FLAGS } from '../labels';

const UNFLAGGED: Record<Verdict, string> = {
  compatible:
    'Trials that differ from each other, or defects that keep away from each other: free fermions and hard cores on a line give exactly such counts.',
  'ruled-out': 'Anything that ties the defects of a shot together, or makes one shot differ from the next.',
  undecided: 'With these shots, almost anything that keeps the mean: the tests had too little to work on.'
};

/** One cause a line: the flag it belongs to, null when no flag has other causes, and what else it could be. */
export function whatElse({
  answer,
  flags
}: Pick<Diagnosis, 'answer' | 'flags'>): { flag: string | null; words: string }[] {
  const lines = flags
    .filter((flag) => flag.otherCauses.length > 0)
    .map((flag) => ({
      flag: FLAGS[flag.id],
      words: `could also come from ${flag.otherCauses.join('; ')}.`
    }));
  return lines.length > 0 ? lines : [{ flag: null, words: UNFLAGGED[answer.verdict] }];
}
