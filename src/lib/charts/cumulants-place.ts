import { sayUnknownCumulants } from '$lib/model/report/say-unknown-cumulants';
import { lumpsOf, lumpWords } from '$lib/model/lump-words';
import { carefulThird } from '$lib/stats/claim/careful-third';
import { thirdOverMean } from '$lib/stats/claim/third-over-mean';
import { reachesBody } from '$lib/stats/bounds/reaches-body';
import { lawMoments } from '$lib/stats/laws/law-moments';
import type { Diagnosis, Interval } from '$lib/stats/types';
import { beyondRegion, type BeyondRegion } from './beyond-region';

/** The counts in the plane of κ2/κ1 and κ3/κ1, from the document's own numbers. */
export interface CumulantsPlace {
  /** μ/N, 0 when N is unknown. */
  share: number;
  fano: Interval & { value: number };
  third: Interval & { value: number };
  /** The best law's point, or that of another law, which then has a name. */
  law: { fano: number; third: number; name?: string };
  /** Whether independent trials reach the point itself or, failing that, its intervals. */
  standing: 'inside' | 'near' | 'outside' | 'more';
  /** Where the answer allows for more than the region does, so that lying outside it is no evidence; null elsewhere. */
  beyond: BeyondRegion | null;
}

/** Where the counts lie, or why they have no place in the plane. */
export function cumulantsPlace(diagnosis: Diagnosis): CumulantsPlace | { reason: string } {
  const { moments, data, fit } = diagnosis;
  const { mean, variance, fano } = moments;
  if (data.lump || data.below)
    return {
      reason: `${lumpWords(lumpsOf(data)).rows}, so the cumulants are those of the counts as lumped: no place among those of independent trials can be told.${sayUnknownCumulants(diagnosis)}`
    };
  if (!mean.value || variance.value === null || fano.value === null || moments.third.value === null)
    return {
      reason:
        mean.value === 0
          ? 'No shot has a defect: ratios of cumulants to a mean of 0 do not exist.'
          : 'Too few shots for a variance and a third cumulant: the counts have no place in the plane of cumulants.'
    };
  if (variance.value === 0)
    return { reason: 'Every shot has the same count: without spread there are no cumulants to compare.' };
  const trials = data.trials === null ? Infinity : data.trials / (data.unit === 'pair' ? 2 : 1);
  const share = mean.value / trials;
  const third = thirdOverMean({ ...moments, third: carefulThird(moments.third, data.shots) }, data.shots);
  const law = lawMoments(fit);
  const at = (interval: Interval, value: number) => ({ ...interval, value });
  const place = {
    share,
    fano: at(fano, fano.value),
    third: at(third, third.value ?? 0),
    law: { fano: law.variance / law.mean, third: law.third / law.mean }
  };
  return { ...place, standing: standingOf(place), beyond: beyondRegion(diagnosis) };
}

function standingOf({
  fano,
  third,
  share
}: Omit<CumulantsPlace, 'standing' | 'beyond'>): CumulantsPlace['standing'] {
  const exact = (value: number) => ({ low: value, high: value });
  if (reachesBody(exact(fano.value), exact(third.value), share)) return 'inside';
  if (reachesBody(fano, third, share)) return 'near';
  return fano.low !== null && fano.low > 1 - share ? 'more' : 'outside';
}
