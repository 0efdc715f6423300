/**
 * p-value of a resampling test that may end early: feed it one answer per resample, "was its statistic at least
 * the observed one?", until `done`.
 *
 * Sampling stops at the h-th exceedance, after l draws say, and p = h/l; if all B draws come first with g < h
 * exceedances, p = (g + 1)/(B + 1). Either way P(p ≤ x) ≤ x under the null for every x, so the early end costs no
 * validity. h = 100 keeps the standard error of a stopped p below a tenth of it; draws are saved when p > h/B.
 *
 * @throws RangeError when `resamples` or `exceedances` is not a positive integer
 *
 * Source: Besag & Clifford 1991, Biometrika 78:301.
 */
export class SequentialP {
  /** Draws so far, and how many of them were at least as extreme as the data. */
  draws = 0;
  exceeded = 0;

  constructor(
    readonly resamples: number,
    readonly exceedances = 100
  ) {
    for (const size of [resamples, exceedances]) {
      if (!Number.isSafeInteger(size) || size < 1) throw new RangeError(`not a positive integer: ${size}`);
    }
  }

  /** Takes the next draw in order; true while more are wanted. Draws after the end are not counted. */
  push(exceeds: boolean): boolean {
    if (this.done) return false;
    this.draws++;
    if (exceeds) this.exceeded++;
    return !this.done;
  }

  get done(): boolean {
    return this.exceeded >= this.exceedances || this.draws >= this.resamples;
  }

  /** The rule ended the run before all resamples were drawn. */
  get stoppedEarly(): boolean {
    return this.exceeded >= this.exceedances && this.draws < this.resamples;
  }

  /** The p-value at the end; while running, the honest value for the draws so far. */
  get p(): number {
    if (this.exceeded >= this.exceedances) return this.exceeded / this.draws;
    return (this.exceeded + 1) / (this.draws + 1);
  }

  /** Smallest p the full run can show, 1/(B + 1). */
  get smallestP(): number {
    return 1 / (this.resamples + 1);
  }
}
