import { formatCount } from '$lib/model/format-number';
import {
  longestChain,
  mostTrials,
  type Effect,
  type EffectKind,
  type Sharpness
} from '$lib/stats/planning/effect';
import { largestEffect } from '$lib/stats/planning/largest-effect';
import { readNumber } from '../read-number';
import { readTrials } from '../read-settings';
import { EFFECTS, type PlanFields, type PlanProblems } from './fields';

/** What the planner is asked: shots for a size, a size for shots, or both. */
export interface PlanRequest extends Omit<Effect, 'size'>, Sharpness {
  size: number | null;
  shots: number | null;
}

/** What is asked of a lucky shot. */
export interface OddsRequest {
  trials: number | null;
  mean: number | null;
  most: number;
  counts: string;
}

type Read<Asked> = { ok: true; asked: Asked } | { ok: false; problems: PlanProblems };

const isKind = (word: string): word is EffectKind => Object.hasOwn(EFFECTS, word);

/** Mean and N, which both questions have. */
function readCounting(fields: PlanFields, problems: PlanProblems): { mean: number; trials: number | null } {
  const mean = readNumber(fields.mean) ?? NaN;
  const trials = readTrials(fields.trials);
  if (trials === undefined) problems.trials = 'Write a whole number from 1 to 1 000 000 000, or “unknown”.';
  if (!(mean > 0 && mean <= 1e6))
    problems.mean = 'Write the mean count, above 0 and up to 1 000 000, such as 4.2.';
  else if (trials && mean >= trials)
    problems.mean = `The mean must be below N = ${formatCount(trials)}: so many defects leave no room to vary.`;
  return { mean, trials: trials ?? null };
}

/** Turns the fields into a question, or says of each field what is wrong. Nothing typed is changed. */
export function readPlan(fields: PlanFields): Read<PlanRequest> {
  const problems: PlanProblems = {};
  const kind = fields.find;
  if (!isKind(kind))
    return {
      ok: false,
      problems: { find: `There is no effect called “${kind}” here. Choose what to find.` }
    };
  const { mean, trials } = readCounting(fields, problems);
  const chain = kind === 'neighbours' || kind === 'misread';
  if (!problems.trials) {
    if (trials === null && kind !== 'excess')
      problems.trials = 'This effect needs N: write how many there are.';
    else if (trials !== null && trials < 2)
      problems.trials = 'One trial has nothing to be correlated with: at least 2.';
    else if (trials !== null && chain && trials > longestChain)
      problems.trials = `A chain is stepped through bond by bond: at most ${longestChain}.`;
    else if (trials !== null && trials > mostTrials)
      problems.trials = 'So many might as well be unknown: at most 1 000 000, or leave it empty.';
  }
  const alpha = readNumber(fields.alpha) ?? NaN;
  if (!(alpha >= 1e-6 && alpha < 0.5))
    problems.alpha = 'Write a level from 0.000001 to below 0.5, such as 0.05.';
  const power = readNumber(fields.power) ?? NaN;
  if (!(power > 0 && power <= 0.9999))
    problems.power = 'Write a chance between the level and 0.9999, such as 0.8.';
  else if (!problems.alpha && power <= alpha)
    problems.power = 'The power must be above the level: guessing alone has that much.';

  const size = fields.size.trim() === '' ? null : (readNumber(fields.size) ?? NaN);
  const shots = fields.shots.trim() === '' ? null : (readNumber(fields.shots) ?? NaN);
  if (size === null && shots === null)
    problems.size = 'Write a size, to learn how many shots it takes; or, below, a number of shots.';
  if (size !== null && !problems.mean && !problems.trials) {
    const largest = largestEffect({ kind, mean, trials });
    if (!(size >= 1e-6)) problems.size = 'Write a number from 0.000001 up.';
    else if (kind === 'misread' && size >= 0.5)
      problems.size = 'A misread rate is below 0.5: at 0.5 the reading says nothing.';
    else if (size >= largest)
      problems.size =
        kind === 'misread'
          ? `Misreads alone would make a larger mean than ${fields.mean.trim()}: below ${rounded(largest)} on these bonds.`
          : `It must be below ${rounded(largest)} here.`;
  }
  if (shots !== null && !(Number.isInteger(shots) && shots >= 20 && shots <= 1e12))
    problems.shots = 'Write a whole number of shots from 20 to 10¹².';
  if (Object.keys(problems).length) return { ok: false, problems };
  return { ok: true, asked: { kind, mean, trials, alpha, power, size, shots } };
}

/** The question of a lucky shot: from counts, or from a mean alone. */
export function readOdds(fields: PlanFields): Read<OddsRequest> {
  const problems: PlanProblems = {};
  const most = readNumber(fields.most) ?? NaN;
  if (!(Number.isInteger(most) && most >= 0 && most <= 1e6))
    problems.most = 'Write a whole number of defects from 0 to 1 000 000.';
  const withCounts = fields.counts.trim() !== '';
  const { mean, trials } = readCounting(fields, problems);
  if (withCounts) delete problems.mean;
  if (Object.keys(problems).length) return { ok: false, problems };
  return { ok: true, asked: { most, trials, mean: withCounts ? null : mean, counts: fields.counts } };
}

const rounded = (value: number): string => String(Number(value.toPrecision(3)));
