import type { Histogram } from '../stats/types';
import { maxCount, maxShots } from './limits';
import type { ProblemList } from './problem-list';
import type { Problem } from './types';

/** Where an entry stands; asked for only when there is something to say about it. */
export type Place = () => { line: number | null; column: number | null };

interface Entry {
  count: number;
  shots: number;
  place: Place;
}

/** Where an earlier entry stands; with its column when both stand on one line, as in JSON. */
function placed(entry: Entry, here: Place): string {
  const { line, column } = entry.place();
  return line === here().line ? `line ${line}, column ${column ?? 1}` : `line ${line}`;
}

/** Collects the rows of one histogram, and says what is wrong among them. */
export class HistogramBuilder {
  private readonly entries = new Map<number, Entry>();
  private lump: Entry | null = null;
  private sum = 0;

  constructor(
    private readonly problems: ProblemList,
    /** Largest count allowed, and who says so. */
    private readonly limit: { trials: number | null; why: string }
  ) {}

  /** Adds "`count`: `shots`", or "`count` or more: `shots`" when `lump` is set. */
  add(count: number, shots: number, lump: boolean, place: Place): void {
    // The words are built only for problems that are kept: finding a place costs a pass over the text.
    const refuse = (say: () => { message: string; fix: string }) =>
      this.problems.add(() => ({ ...place(), ...say() }));
    const { trials, why } = this.limit;
    if (trials !== null && count > trials) {
      // A table may run on past N; a row that no shot had says nothing against the trials.
      if (shots === 0) return;
      return refuse(() => ({
        message: `The count ${count} is above the ${trials} ${trials === 1 ? 'trial' : 'trials'} ${why}.`,
        fix: 'Correct the count, or the number of trials.'
      }));
    }
    if (count > maxCount) {
      return refuse(() => ({
        message: `The count ${count} is too large.`,
        fix: `Counts go up to ${maxCount}.`
      }));
    }
    if (this.sum > maxShots - shots) {
      return refuse(() => ({
        message: 'With this row the numbers of shots add up to more than 2^53: they are no longer exact.',
        fix: 'Check the numbers of shots.'
      }));
    }
    const before = lump ? this.lump : this.entries.get(count);
    if (before) {
      return refuse(() => ({
        message: lump
          ? `A second row lumps all larger counts; the first is on ${placed(before, place)}.`
          : `The count ${count} is given twice: here and on ${placed(before, place)}.`,
        fix: 'Keep one row for each count. If these are different devices or settings, name the column that tells them apart.'
      }));
    }
    this.sum += shots;
    if (lump) this.lump = { count, shots, place };
    else this.entries.set(count, { count, shots, place });
  }

  /** Shots so far. */
  get shots(): number {
    return this.sum;
  }

  /** The lump's smallest count and line, for the reading. */
  get lumped(): { from: number; line: number } | null {
    return this.lump ? { from: this.lump.count, line: this.lump.place().line ?? 1 } : null;
  }

  /**
   * The histogram, counts ascending; rows of no shots are kept, they change nothing.
   *
   * @param where said of the dataset when it has no shots, such as " for device A".
   * @param complete false when rows were refused: "no shots" would then only confuse.
   */
  finish(where: string, line: Problem['line'], complete: boolean): Histogram {
    const { lump } = this;
    const counts = [...this.entries.values()].sort((a, b) => a.count - b.count);
    const above = lump && counts.find(({ count }) => count >= lump.count);
    if (lump && above) {
      this.problems.add(() => ({
        ...lump.place(),
        message: `This row lumps all counts from ${lump.count}, but ${above.count} has a row of its own on line ${above.place().line}.`,
        fix: 'The lump must begin above every other count.'
      }));
    }
    if (this.sum === 0 && complete) {
      this.problems.whole(
        `There are no shots${where}: every number of shots is zero.`,
        'Give a histogram with at least one shot.',
        line
      );
    }
    return {
      kind: 'histogram',
      counts: counts.map(({ count, shots }) => [count, shots]),
      lump: lump && lump.shots > 0 ? { from: lump.count, shots: lump.shots } : null
    };
  }
}
