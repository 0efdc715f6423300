export const NOTATIONS = ['plain', 'latex', 'markdown'] as const;
export type Notation = (typeof NOTATIONS)[number];

export const NOTATION_NAMES: Record<Notation, string> = {
  plain: 'plain text',
  latex: 'LaTeX',
  markdown: 'Markdown'
};
