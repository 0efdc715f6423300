import type { FitData } from './fit-data';

/** Moments of the counts that enter a fit: variance and third about the mean, each divided by S. */
export interface SampleMoments {
  mean: number;
  variance: number;
  third: number;
}

/** Mean, variance and third central moment; a lump counts as its first count, an opening row as its last. */
export function sampleMoments(data: FitData): SampleMoments {
  const { below } = data;
  let sum = (data.lump ? data.lump.shots * data.lump.from : 0) + (below ? below.shots * below.to : 0);
  for (let i = 0; i < data.shots.length; i++) sum += data.shots[i] * (data.first + i);
  const mean = sum / data.total;
  const lumped = data.lump ? data.lump.from - mean : 0;
  let variance = (data.lump?.shots ?? 0) * lumped ** 2;
  let third = (data.lump?.shots ?? 0) * lumped ** 3;
  if (below) {
    variance += below.shots * (below.to - mean) ** 2;
    third += below.shots * (below.to - mean) ** 3;
  }
  for (let i = 0; i < data.shots.length; i++) {
    const away = data.first + i - mean;
    variance += data.shots[i] * away * away;
    third += data.shots[i] * away * away * away;
  }
  return { mean, variance: variance / data.total, third: third / data.total };
}
