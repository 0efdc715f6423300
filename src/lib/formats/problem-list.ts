import type { Problem } from './types';

/** Problems named to the person; more than a screenful helps nobody. */
export const problemsShown = 20;

/** Collects problems: keeps the first {@link problemsShown}, counts the rest. */
export class ProblemList {
  readonly kept: Problem[] = [];
  more = 0;

  /** True once at least one problem was found. */
  get any(): boolean {
    return this.kept.length > 0;
  }

  /**
   * Adds a problem. It is built only if it will be kept: a file of a million bad lines must not
   * cost a million sentences.
   */
  add(build: () => Problem): void {
    if (this.kept.length < problemsShown) this.kept.push(build());
    else this.more += 1;
  }

  /** Adds a problem that has no place in the file. */
  whole(message: string, fix: string, line: number | null = null): void {
    this.add(() => ({ line, column: null, message, fix }));
  }
}
