import type { Source } from './source';
import type { FormatId, Outcome } from './types';

/** One way to read a text. */
export interface Format {
  id: FormatId;
  /** In words, for a list to choose from. */
  label: string;
  /** Whether a text is in this format; the first format of the registry that says so reads it. */
  claims(source: Source): boolean;
  /** Reads the text; what is wrong goes into `source.problems`. */
  read(source: Source): Outcome;
}
