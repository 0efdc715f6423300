/** What a planned experiment is to see. */
export type EffectKind = 'excess' | 'pairs' | 'neighbours' | 'misread';

/** An effect of one size on counts of a given mean. */
export interface Effect {
  kind: EffectKind;
  /**
   * excess: of the variance over its ceiling, as a part of it. pairs: mean correlation of two sites. neighbours:
   * correlation c of adjacent sites along a line, c^d at distance d. misread: chance ε to misread a site of an open
   * chain whose bonds are counted.
   */
  size: number;
  /** Mean count as it is counted, misreads included. */
  mean: number;
  /** N; null when unknown, for an excess alone. */
  trials: number | null;
}

/** How sharp a planned test is. */
export interface Sharpness {
  /** Level of the one-sided ceiling test, 0 < α < 0.5. */
  alpha: number;
  /** Chance to see what is there, between α and 1. */
  power: number;
}

/** Most trials for which counts along a chain are stepped through, bond by bond. */
export const longestChain = 2000;

/** Most trials otherwise: from here N might as well be unknown. */
export const mostTrials = 1e6;
