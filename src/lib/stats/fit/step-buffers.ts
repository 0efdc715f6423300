/** What a step works in that has an entry for each level, or for each pair, row by row. */
export interface StepBuffers {
  size: number;
  /** See Slopes. */
  gradient: Float64Array;
  hessian: Float64Array;
  fisher: Float64Array;
  /** Σ bent·f^{(−j)} and Σ bent·f^{(−j−j)}. */
  bend: Float64Array;
  doubled: Float64Array;
  /** First and second derivative of each level in its angle. */
  first: Float64Array;
  second: Float64Array;
  /** Gradient and minus the Hessian in angles, then what is left of it. */
  pull: Float64Array;
  bowl: Float64Array;
  lower: Float64Array;
  vectors: Float64Array;
  /** The step itself. */
  angles: Float64Array;
}

/**
 * Buffers for `size` levels out of `kept`, made at first use. One set for each number of levels, so that their lengths
 * are right; typed, because arrays that begin as whole numbers and turn into fractions cost more than the sums in them.
 */
export function stepBuffers(kept: StepBuffers[], size: number): StepBuffers {
  while (kept.length <= size) {
    const levels = kept.length;
    const each = () => new Float64Array(levels);
    const pairs = () => new Float64Array(levels * levels);
    kept.push({
      size: levels,
      gradient: each(),
      hessian: pairs(),
      fisher: pairs(),
      bend: each(),
      doubled: each(),
      first: each(),
      second: each(),
      pull: each(),
      bowl: pairs(),
      lower: pairs(),
      vectors: pairs(),
      angles: each()
    });
  }
  return kept[size];
}
