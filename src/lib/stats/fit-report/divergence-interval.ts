import type { FitData } from '../fit/fit-data';
import type { Interval } from '../types';

/** What the plug-in divergence is worth once its bias is known. */
export interface CorrectedDivergence {
  /** D minus its mean under resampling from the fitted law; can be below 0. */
  corrected: number;
  interval: Interval;
}

/**
 * Divergence of the truth from the independent-trial laws, with its 95 % interval, nats a shot.
 *
 * The plug-in D is biased upward: its mean over resamples from the fitted law, where the truth is 0, is taken
 * off. Its variance has two parts: Var(ln(p̂/f))/S, which rules when the truth is far (the refit moves D only
 * in second order), and the variance over the resamples, which rules when it is near.
 *
 * @param logLaw ln f at data.first …
 * @param logLump ln of the probability of the lump, logBelow of the opening row
 * @param nullDivergences KL of each resample from its own refit
 */
export function divergenceInterval(
  data: FitData,
  logLaw: ArrayLike<number>,
  logLump: number,
  plugIn: number,
  nullDivergences: number[],
  logBelow = -Infinity
): CorrectedDivergence {
  const draws = nullDivergences.length;
  const bias = nullDivergences.reduce((sum, value) => sum + value, 0) / draws;
  const noise = nullDivergences.reduce((sum, value) => sum + (value - bias) ** 2, 0) / Math.max(1, draws - 1);
  let squares = 0;
  const add = (shots: number, logF: number) => {
    if (shots > 0) squares += (shots / data.total) * (Math.log(shots / data.total) - logF - plugIn) ** 2;
  };
  data.shots.forEach((shots, i) => add(shots, logLaw[i]));
  if (data.lump) add(data.lump.shots, logLump);
  if (data.below) add(data.below.shots, logBelow);
  const reach = 1.96 * Math.sqrt(squares / data.total + noise);
  const corrected = plugIn - bias;
  const interval = {
    value: Math.max(0, corrected),
    low: Math.max(0, corrected - reach),
    // An over-smooth histogram has a corrected value far below 0; what its shots could hide is still this much.
    high: Math.max(1.96 * Math.sqrt(noise), corrected + reach)
  };
  return { corrected, interval };
}
