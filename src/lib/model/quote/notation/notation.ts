import type { Words } from '../span';
import { toLatex } from './to-latex';
import { toMarkdown } from './to-markdown';
import { toPlain } from './to-plain';

export const NOTATIONS = ['plain', 'latex', 'markdown'] as const;
export type Notation = (typeof NOTATIONS)[number];

export const NOTATION_NAMES: Record<Notation, string> = {
  plain: 'plain text',
  latex: 'LaTeX',
  markdown: 'Markdown'
};

const WRITERS: Record<Notation, (words: Words) => string> = {
  plain: toPlain,
  latex: toLatex,
  markdown: toMarkdown
};

/** The words in one notation: one paragraph, without a line end. */
export const inNotation = (words: Words, notation: Notation): string => WRITERS[notation](words);
