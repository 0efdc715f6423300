import type { Histogram } from '../stats/types';
import { maxCount, maxShots } from './limits';
import type { ProblemList } from './problem-list';
import type { Problem } from './types';

/** Where an entry stands; asked for only when there is something to say about it. */
export type Place = () => { line: number | null; column: number | null };

/** A row for one count, for all counts from it on, or for all counts up to it. */
export type RowKind = 'one' | 'lump' | 'below';

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
  private below: Entry | null = null;
  private sum = 0;

  constructor(
    private readonly problems: ProblemList,
    /** Largest count allowed, and who says so. */
    private readonly limit: { trials: number | null; why: string }
  ) {}

  /** Adds "`count`: `shots`", "`count` or more: `shots`" or "`count` or fewer: `shots`". */
  add(count: number, shots: number, kind: RowKind, place: Place): void {
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
    const before = kind === 'one' ? this.entries.get(count) : this[kind];
    if (before) {
      return refuse(() => ({
        message:
          kind !== 'one'
            ? `A second row lumps all ${kind === 'lump' ? 'larger' : 'smaller'} counts; the first is on ${placed(before, place)}.`
            : `The count ${count} is given twice: here and on ${placed(before, place)}.`,
        fix: 'Keep one row for each count. If these are different devices or settings, name the column that tells them apart.'
      }));
    }
    this.sum += shots;
    if (kind !== 'one') this[kind] = { count, shots, place };
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

  /** The opening row's largest count and line. */
  get opened(): { to: number; line: number } | null {
    return this.below ? { to: this.below.count, line: this.below.place().line ?? 1 } : null;
  }

  /**
   * The histogram, counts ascending; rows of no shots are kept, they change nothing.
   *
   * @param where said of the dataset when it has no shots, such as " for device A".
   * @param complete false when rows were refused: "no shots" would then only confuse.
   */
  finish(where: string, line: Problem['line'], complete: boolean): Histogram {
    const { lump, below } = this;
    const counts = [...this.entries.values()].sort((a, b) => a.count - b.count);
    const above = lump && counts.find(({ count }) => count >= lump.count);
    if (lump && above) {
      this.problems.add(() => ({
        ...lump.place(),
        message: `This row lumps all counts from ${lump.count}, but ${above.count} has a row of its own on line ${above.place().line}.`,
        fix: 'The lump must begin above every other count.'
      }));
    }
    const under = below && counts.find(({ count }) => count <= below.count);
    if (below && under) {
      this.problems.add(() => ({
        ...below.place(),
        message: `This row lumps all counts up to ${below.count}, but ${under.count} has a row of its own on line ${under.place().line}.`,
        fix: 'The lump must end below every other count.'
      }));
    }
    if (below && lump && lump.count <= below.count) {
      this.problems.add(() => ({
        ...lump.place(),
        message: `This row lumps all counts from ${lump.count}, but the row on ${placed(below, lump.place)} those up to ${below.count}: they overlap.`,
        fix: 'Correct one of the two rows, so that each count belongs to one of them.'
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
      lump: lump && lump.shots > 0 ? { from: lump.count, shots: lump.shots } : null,
      ...(below && below.shots > 0 && { below: { to: below.count, shots: below.shots } })
    };
  }
}
