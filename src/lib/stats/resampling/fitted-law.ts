import type { FitData } from '../fit/fit-data';
import { refit, type Refit } from '../fit/refit';
import { toLaw, type TrialLevels } from '../fit/trial-levels';
import { workspace, type Workspace } from '../fit/workspace';
import { lawMoments } from '../laws/law-moments';
import { lawWindow } from '../laws/law-window';
import type { Window } from '../laws/window';
import { mostLevels, mostLevelsCut } from '../misread/chain-fit';
import { chainRefit } from '../misread/chain-refit';
import { chainSpace, type ChainSpace } from '../misread/chain-space';
import { isReadChain, readEven, readMoments, readWindow, type ReadChain } from '../misread/read-chain';
import { dropsEmptyOnly, refitWithoutEmpty } from '../truncation/without-empty';
import type { Law } from '../types';
import { evenProbability } from './even-probability';

/** What histograms are drawn from and refitted within: independent trials, or kinks read with misread sites. Plain. */
export type FittedLevels = TrialLevels | ReadChain;
/** The same as a law. */
export type FittedLaw = Law | ReadChain;
/** A refit within either family. */
export type FamilyRefit = Omit<Refit, 'levels'> & { levels: FittedLevels };

/** Buffers that the refits of one resample leave to those of the next, whose pmf then overwrites theirs. */
export interface Buffers {
  whole?: Workspace;
  rest?: Workspace;
  chain?: ChainSpace;
}

export function asLaw(levels: FittedLevels): FittedLaw {
  return isReadChain(levels) ? levels : toLaw(levels);
}

export function familyWindow(law: FittedLaw, trim = 0, scale?: number): Window {
  return isReadChain(law) ? readWindow(law, trim, scale) : lawWindow(law, trim, scale);
}

export function familyMoments(law: FittedLaw): { mean: number; variance: number } {
  return isReadChain(law) ? readMoments(law) : lawMoments(law);
}

export function familyEven(law: FittedLaw): number {
  return isReadChain(law) ? readEven(law) : evenProbability(law);
}

/** The best law of a resample within the family of the law it was drawn from; see refit and chainRefit. */
export function familyRefit(
  data: FitData,
  from: FittedLevels,
  buffers: Buffers,
  part: 'whole' | 'rest',
  settled?: number
): FamilyRefit {
  if (isReadChain(from)) {
    const { kept } = from;
    if (kept && dropsEmptyOnly(kept, data.trials!)) {
      const rest = { ...data, withoutEmpty: true };
      return refitWithoutEmpty(rest, from, kept, (buffers[part] = workspace(rest, buffers[part])), settled);
    }
    buffers.chain ??= chainSpace(data.trials!, kept ? mostLevelsCut : mostLevels);
    return chainRefit(data, from, buffers.chain, settled);
  }
  return refit(data, from, (buffers[part] = workspace(data, buffers[part])), settled);
}
