import type { FitData } from '../fit/fit-data';
import { generator } from '../random/generator';
import type { TestId } from '../types';
import { saturated } from './divergence';
import { asLaw, familyWindow, type Buffers, type FittedLevels } from './fitted-law';
import { gSquaredLeft } from './g-squared-left';
import { largestGSquared } from './largest-g-squared';
import { redraw } from './redraw';
import { refitted, type Refitted } from './refitted';
import { chooseStatistics, type Statistic, type StatisticId } from './statistics';
import { settledAt } from './settled-at';
import { stream } from './streams';

/** All that the draws of the fitted tests depend on; plain, so that it can be sent to another thread. */
export interface FittedJob {
  data: FitData;
  levels: FittedLevels;
  logLikelihood: number;
  /** Law to draw from, of the same family; left out: the best one, `levels`. */
  drawnFrom?: FittedLevels;
  seed: number;
  /** First draws that are refitted whole, for their divergences; left out: divergencesKept. */
  whole?: number;
}

/** What one resample says. */
export interface DrawAnswer {
  /** Bit i: the statistic of question i is at least the observed one. */
  exceeds: number;
  /** KL of the resample from its own refit, nats a shot; of the first few resamples alone. */
  divergence: number | null;
}

/** A statistic, its observed value, and the least value that counts as being as large. */
export interface Question {
  id: StatisticId;
  statistic: Statistic;
  value: number;
  bar: number;
}

export interface FittedDraws {
  observed: Refitted;
  questions: Question[];
  notRun: { id: TestId; reason: string }[];
  /** Resample b, whose answer depends on the job and b alone; only the questions whose bit is set in `wanted` are asked. */
  draw(b: number, wanted: number): DrawAnswer;
}

/** So many draws are refitted whole, for their divergences. Their mean is then known to a twelfth of their standard deviation, and later draws need no refit for it. */
export const divergencesKept = 149;

/**
 * Histograms drawn from the fitted law, or from another of its family, each refitted, and whether their statistics reach those observed.
 *
 * A draw that no refit could bring near an observed value is answered without one (see Statistic.needs), and a refit
 * ends once it has come so close that no statistic asked for can still reach its own. The answers are the same.
 */
export function fittedDraws(job: FittedJob): FittedDraws {
  const { data, levels, logLikelihood, drawnFrom, seed, whole = divergencesKept } = job;
  const fitted = familyWindow(asLaw(levels), 1e-18, 1);
  const observed = refitted(data, levels, { levels, logLikelihood, window: fitted });
  const from = drawnFrom ?? levels;
  const window = drawnFrom ? familyWindow(asLaw(drawnFrom), 1e-18, 1) : fitted;
  const { statistics, notRun } = chooseStatistics(observed);
  const questions = [...statistics].map(([id, statistic]) => {
    const value = statistic.of(observed);
    return { id, statistic, value, bar: barOf(value, statistic.root) };
  });
  // A root that is 0 in the data is reached by every draw.
  const certain = questions.reduce((bits, { statistic, bar }, i) => {
    return statistic.root && bar === 0 ? bits | (1 << i) : bits;
  }, 0);
  const needed = new Float64Array(questions.length);
  const source = redraw(window, data, data.total);
  const buffers: Buffers = {};
  return {
    observed,
    questions,
    notRun,
    draw(b, wanted) {
      const resample = source.draw(generator(seed, stream('fitted law', b)));
      const keep = b < whole;
      const most = largestGSquared(resample, window);
      let least = Infinity;
      for (let i = 0; i < questions.length; i++) {
        const { statistic, bar } = questions[i];
        needed[i] = wanted & ~certain & (1 << i) ? statistic.needs(resample, bar) : Infinity;
        if (needed[i] <= most) least = Math.min(least, needed[i]);
      }
      let exceeds = wanted & certain;
      if (least === Infinity && !keep) return { exceeds, divergence: null };
      const itself = saturated(resample);
      const settled = keep ? Infinity : settledAt(itself, least, resample.total);
      const drawn = refitted(resample, from, undefined, buffers, settled);
      const left = gSquaredLeft(itself, drawn.fit.logLikelihood, resample.total);
      for (let i = 0; i < questions.length; i++) {
        const { statistic, bar } = questions[i];
        if (needed[i] <= left && statistic.of(drawn) >= bar) exceeds |= 1 << i;
      }
      return { exceeds, divergence: keep ? drawn.divergence : null };
    }
  };
}

/** The least value that counts as equal to the observed one up to rounding: a resample that repeats the data must count. */
function barOf(value: number, root: boolean): number {
  const kept = root ? value * value : value;
  const bar = kept - 1e-9 * Math.max(1, Math.abs(kept));
  return root ? Math.sqrt(Math.max(0, bar)) : bar;
}
