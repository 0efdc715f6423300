import type { Span, Words } from '../span';
import { escapeMarkdown } from './escape-markdown';
import { oneLine } from './one-line';
import { plainNumber } from './to-plain';

/** The words for Markdown: symbols and stressed words in *…*, digests in `…`; no HTML, no dialect. */
export const toMarkdown = (words: Words): string => words.map(markdownSpan).join('');

function markdownSpan(span: Span): string {
  switch (span.kind) {
    case 'text':
      return ours(span.text);
    case 'emphasis':
      return `*${ours(span.text)}*`;
    case 'name':
      return escapeMarkdown(oneLine(span.text));
    case 'code':
      return `\`${span.text.replaceAll('`', '')}\``;
    case 'math':
      return formula(span.text);
    case 'number':
      return plainNumber(span.number);
    case 'equation':
      return `${formula(span.left)} ${span.sign} ${plainNumber(span.number)}`;
  }
}

/** The program's own words hold nothing that could begin markup but these. */
const ours = (text: string): string => text.replace(/[\\`*_[\]<>#|~$&]/g, '\\$&');

/** Letters of a formula are symbols, and slanted. */
const formula = (plain: string): string => plain.replace(/\p{L}+/gu, '*$&*');
