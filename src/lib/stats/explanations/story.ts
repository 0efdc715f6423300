import type { Window } from '../laws/window';
import type { Geometry, Unit } from '../types';
import type { StoryId } from './types';

/** What decides whether a story can be told of the data at all. */
export interface Setting {
  trials: number | null;
  unit: Unit;
  geometry: Geometry;
  /** Largest count seen, a lump's first among them. */
  last: number;
  lump: boolean;
  allEven: boolean;
}

/** What starts are made from. */
export interface Seen {
  mean: number;
  /** Divided by S. */
  variance: number;
  last: number;
  /** Share of the shots with count 0. */
  empty: number;
}

/** Range of an own parameter; the story has no meaning outside. */
export interface Range {
  symbol: string;
  low: number;
  high: number;
}

/**
 * A law of counts with a base, the probability p of a trial (or the mean λ when N is unknown), and own parameters, of
 * which the first is the one reported. At its lower end the story is equal trials.
 */
export interface Story {
  id: StoryId;
  /** Why it cannot be told, in words; null when it can. */
  refuses(setting: Setting): string | null;
  own(trials: number | null, seen: Seen): Range[];
  /** Places in the own parameters to start a search from. */
  starts(seen: Seen, trials: number | null): number[][];
  /** Base at which the story has about the mean seen; need not be exact. */
  base(mean: number, own: number[], trials: number | null): number;
  /**
   * The pmf, summing to its scale when `upTo` takes in the support.
   * @param upTo counts above it may be left out
   */
  window(base: number, own: number[], trials: number | null, upTo: number): Window;
  /** What it would mean physically. `span` says a number with its interval. */
  meaning(told: Told): string;
}

/** A fitted story, for words. */
export interface Told {
  trials: number | null;
  base: number;
  own: number[];
  /** The first parameter with its interval, in words: "0.004 (95 %: 0.003 to 0.005)". */
  span: string;
  /** The same as per cent. */
  percent: string;
}
