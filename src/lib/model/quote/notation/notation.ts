import type { Words } from '../span';
import type { Notation } from './notations';
import { toLatex } from './to-latex';
import { toMarkdown } from './to-markdown';
import { toPlain } from './to-plain';

const WRITERS: Record<Notation, (words: Words) => string> = {
  plain: toPlain,
  latex: toLatex,
  markdown: toMarkdown
};

/** The words in one notation: one paragraph, without a line end. */
export const inNotation = (words: Words, notation: Notation): string => WRITERS[notation](words);
