import type { FitData } from '../fit/fit-data';
import { sampleMoments } from '../fit/sample-moments';
import { logNormalTail } from '../numerics/log-normal-tail';

/**
 * Log-likelihood of the Gaussian with the sample's mean and variance, each count taking the probability of
 * n − ½ … n + ½; nats. With a lump, its probability is the upper tail from its first count − ½; with an opening row, the
 * lower tail to its last count + ½.
 *
 * @returns null when every shot had the same count, so that there is no width.
 */
export function gaussian(data: FitData): { logLikelihood: number; mean: number; variance: number } | null {
  const { mean, variance } = sampleMoments(data);
  if (!(variance > 0)) return null;
  const width = Math.sqrt(variance);
  let sum = 0;
  for (let i = 0; i < data.shots.length; i++) {
    if (data.shots[i] > 0) sum += data.shots[i] * logCell((data.first + i - mean) / width, 0.5 / width);
  }
  if (data.lump) sum += data.lump.shots * logNormalTail((data.lump.from - 0.5 - mean) / width);
  if (data.below) sum += data.below.shots * logNormalTail((mean - data.below.to - 0.5) / width);
  return { logLikelihood: sum, mean, variance };
}

/** ln of the probability between x − half and x + half, from the tail on x's side so that nothing cancels. */
function logCell(x: number, half: number): number {
  const away = Math.abs(x);
  const near = logNormalTail(away - half);
  const far = logNormalTail(away + half);
  return near + Math.log(-Math.expm1(far - near));
}
