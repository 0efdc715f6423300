import { readCounts } from '$lib/formats/read-counts';
import { bestLaw } from '$lib/stats/fit/best-law';
import { fitData } from '$lib/stats/fit/fit-data';
import { toLaw } from '$lib/stats/fit/trial-levels';
import { toHistogram } from '$lib/stats/input/to-histogram';
import { lawMoments } from '$lib/stats/laws/law-moments';
import { luckyShot } from '$lib/stats/planning/lucky-shot';
import { BadInput, type Histogram, type Law } from '$lib/stats/types';
import type { Tasks } from './messages';
import type { OddsRequest } from './read-plan';

/** The odds of a lucky shot under the best law of the counts, or under equal trials where only a mean is known. */
export function oddsOf({ trials, mean, most, counts }: OddsRequest): Tasks['odds']['result'] {
  if (mean !== null) {
    const law: Law =
      trials === null
        ? { levels: [], poissonPart: mean }
        : { levels: [{ p: mean / trials, trials }], poissonPart: 0 };
    return { ok: true, odds: { lucky: luckyShot(law, null, most), mean, fitted: false, shots: null } };
  }
  const read = readCounts(counts);
  if (!read.ok) {
    const [{ line, message, fix }] = read.problems;
    return { ok: false, problem: `${line === null ? '' : `Line ${line}: `}${message} ${fix}` };
  }
  if (read.datasets.length > 1)
    return { ok: false, problem: 'These are several histograms: write one of them.' };
  try {
    return fromHistogram(toHistogram(read.datasets[0].data), trials, most);
  } catch (error) {
    if (error instanceof BadInput) return { ok: false, problem: error.reason };
    throw error;
  }
}

function fromHistogram(histogram: Histogram, trials: number | null, most: number): Tasks['odds']['result'] {
  const top = histogram.lump?.from ?? histogram.counts[histogram.counts.length - 1][0];
  if (trials !== null && top > trials)
    return { ok: false, problem: `A shot has ${top} defects, more than N = ${trials} trials can give.` };
  const data = fitData(histogram, trials);
  const law = toLaw(bestLaw(data).levels);
  const odds = {
    lucky: luckyShot(law, histogram, most),
    mean: lawMoments(law).mean,
    fitted: true,
    shots: data.total
  };
  return { ok: true, odds };
}
