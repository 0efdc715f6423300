/** What a word of the report means. */
export interface Term {
  /** As the report writes it. */
  name: string;
  /** Two sentences: what it is; what it is for, or what to mind. */
  words: [string, string];
  /** Lines of readFormula's notation, each short enough for the margin. */
  formula: [string, ...string[]];
  /** Author and year; empty where the word is plain counting. */
  source: string;
  /** Printed with its part of the report, and not only when somebody opened it. */
  printed?: true;
}

/** Terms by their ids. */
export type Terms = Record<string, Term>;
