import { bestLaw } from '../fit/best-law';
import type { FitData } from '../fit/fit-data';
import { refit, type Refit } from '../fit/refit';
import type { TrialLevels } from '../fit/trial-levels';
import type { Workspace } from '../fit/workspace';
import type { ReadChain } from '../misread/read-chain';
import type { KeptCounts } from './truncated-law';
import { truncatedWindow } from './truncated-window';

/**
 * Whether a cut drops the empty shots and no others. The best law then comes from the whole family of independent trials
 * (bestLaw, conditioned on n ≥ 1), and not from a chain of a few levels: of ten modes of uneven probability chains of three
 * fell 1.8 to 4 nats short at 3000 shots and 11 to 19 at 20 000, and looked like a misfit.
 */
export const dropsEmptyOnly = ({ from, to }: KeptCounts, trials: number): boolean =>
  from === 1 && to >= trials;

/** The best law of counts of 1 and more, as a chain without misreads, and how many searches agree on it. */
export function fitWithoutEmpty(
  data: FitData,
  kept: KeptCounts
): { chain: ReadChain; value: number; starts: number; agreeing: number } {
  const { levels, logLikelihood, starts, agreeing } = bestLaw({ ...data, withoutEmpty: true });
  return { chain: chainOf(levels, kept), value: logLikelihood, starts, agreeing };
}

/** The same of a resample, from the law it was drawn from; see refit. */
export function refitWithoutEmpty(
  data: FitData,
  from: ReadChain,
  kept: KeptCounts,
  space: Workspace,
  settled?: number
): Omit<Refit, 'levels'> & { levels: ReadChain } {
  const { levels, logLikelihood, window } = refit(data, levelsOf(from), space, settled);
  return { levels: chainOf(levels, kept), logLikelihood, window: truncatedWindow(window, kept) };
}

/** Without misreads the order of the trials says nothing: one run a level, those at 1 and at 0 among them. */
function chainOf({ p, trials, ones, zeros }: TrialLevels, kept: KeptCounts): ReadChain {
  const all = [
    ...p.map((one, j) => ({ p: one, trials: trials[j] })),
    { p: 1, trials: ones },
    { p: 0, trials: zeros }
  ].filter((level) => level.trials > 0);
  return {
    p: all.map((level) => level.p),
    runs: all.map((level, j) => ({ level: j, trials: level.trials })),
    rate: 0,
    kept
  };
}

function levelsOf({ p, runs }: ReadChain): TrialLevels {
  const at = (wanted: (one: number) => boolean) => runs.filter(({ level }) => wanted(p[level]));
  const count = (some: ReadChain['runs']) => some.reduce((sum, { trials }) => sum + trials, 0);
  const inside = at((one) => one > 0 && one < 1);
  return {
    p: inside.map(({ level }) => p[level]),
    trials: inside.map(({ trials }) => trials),
    ones: count(at((one) => one >= 1)),
    zeros: count(at((one) => one <= 0)),
    poissonPart: 0
  };
}
