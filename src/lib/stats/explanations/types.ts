/** Stories told when independence is ruled out, each with parameters of its own beside the mean. */
export type StoryId =
  'common-cause' | 'neighbours' | 'two-settings' | 'bursts' | 'dead-shots' | 'pair-loss' | 'misread-sites';

/** Independent trials stand in the same list. */
export type ExplanationId = StoryId | 'equal-trials' | 'best-independent';

/** One fitted story, or one independent law, as it stands in the document. */
export interface Explanation {
  id: ExplanationId;
  logLikelihood: number;
  /** Free numbers that were fitted, the mean among them; what AIC counts. */
  parameters: number;
  /** 2·parameters − 2·log-likelihood. */
  aic: number;
  /** AIC above the best of the list. */
  behind: number;
  /** exp(−behind/2) as a share of the list's sum. */
  weight: number;
  /** Probability of one trial before the story sets in, or the mean count when N is unknown; null for uneven trials. */
  base: number | null;
  /**
   * The story's own number with its profile-likelihood 95 % interval (from the curvature alone for stories over 50 nats
   * behind); null for independent trials.
   */
  parameter: {
    symbol: string;
    value: number;
    low: number;
    high: number;
    /** The end of its range at which the interval stops because there is nothing beyond; null when inside. */
    atBound: 'low' | 'high' | 'both' | null;
  } | null;
  /** A second number that a story needs, or null. */
  second: { symbol: string; value: number } | null;
  /** 2S·KL(counts ‖ story). */
  gSquared: number;
  /** How often the story itself would lie so far from its own counts, by resampling with refitting; null when not asked. */
  goodness: { p: number; smallestP: number; resamples: number } | null;
  /** What it would mean physically, with its numbers. */
  meaning: string;
}

/** Lower limits for how strongly defects go together, with no story at all; null when the variance is not over the ceiling. */
export interface PairLimit {
  /** Least mean covariance of two trials, (s² − ceiling)/(N(N − 1)). */
  covariance: number;
  /** Least mean correlation of two trials, weighted by their standard deviations, (s²/ceiling − 1)/(N − 1). */
  correlation: number;
  /** The same at the lower 95 % limit of s²/ceiling, never below 0; null when the data set no limit. */
  correlationLow: number | null;
  statement: string;
}

/** What else the counts could be, when independent trials are ruled out. */
export interface Explanations {
  /** Best first. */
  ranked: Explanation[];
  /** Stories that cannot be told from the first: AIC less than `tieWithin` behind; the first is among them. */
  tied: ExplanationId[];
  tieWithin: number;
  /**
   * What would tell two of the tied apart, one entry a pair: a measurement, and how many shots in all would do it by
   * the counts alone in four of five repeats, for these two (null when no number would, or when one of the two is
   * independent trials).
   */
  separate: { between: [ExplanationId, ExplanationId]; measurement: string; shots: number | null }[];
  /**
   * Shots in all at which the first, if true as fitted, leads every other story in four of five repeats; null where
   * nothing is tied with it and when no number would do.
   */
  shotsToLead: number | null;
  notRun: { id: StoryId; reason: string }[];
  pairs: PairLimit | null;
  statement: string;
}
