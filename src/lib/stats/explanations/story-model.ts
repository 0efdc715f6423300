import type { FitData } from '../fit/fit-data';
import type { Window } from '../laws/window';
import type { Range, Seen, Story } from './story';

/**
 * A story laid over a histogram, in the numbers that are searched: first the base, as its log-odds (its logarithm
 * when N is unknown), then the own parameters as they are.
 */
export interface StoryModel {
  low: number[];
  high: number[];
  starts: number[][];
  window(x: number[]): Window;
  /** The whole support, for drawing from it. */
  whole(x: number[]): Window;
  base(x: number[]): number;
}

/** Log-odds beyond which a probability is 0 or 1 for any count of shots that fits a double. */
const far = 45;

/** Mean, in units of the largest count, beyond which no search goes: a step astray would build laws of any width. */
const manyfold = 20;

/** @param ranges bounds of the own parameters; they belong to the histogram that was observed, not to a resample */
export function storyModel(story: Story, data: FitData, seen: Seen, ranges: Range[]): StoryModel {
  const { trials } = data;
  const last = data.first + data.shots.length - 1;
  const upTo = data.lump ? (trials ?? Infinity) : last;
  const base = ([t]: number[]) => (trials === null ? Math.exp(t) : 1 / (1 + Math.exp(-t)));
  const inward = (p: number) => {
    if (trials === null) return Math.log(Math.max(p, 1e-300));
    const inside = Math.min(1 - 1e-12, Math.max(1e-300, p));
    return Math.log(inside) - Math.log1p(-inside);
  };
  return {
    low: [trials === null ? -700 : -far * 15, ...ranges.map((one) => one.low)],
    high: [trials === null ? Math.log(manyfold * (seen.last + 1)) : far, ...ranges.map((one) => one.high)],
    starts: story.starts(seen, trials).map((own) => {
      const inside = own.map((value, j) => Math.min(ranges[j].high, Math.max(ranges[j].low, value)));
      return [inward(story.base(seen.mean, inside, trials)), ...inside];
    }),
    window: (x) => story.window(base(x), x.slice(1), trials, Number.isFinite(upTo) ? upTo : last),
    whole: (x) => story.window(base(x), x.slice(1), trials, trials ?? last),
    base
  };
}
