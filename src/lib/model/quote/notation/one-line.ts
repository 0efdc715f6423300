import { unturned } from '../../unturned';

/**
 * Typed text as part of one paragraph: what breaks a line, or cannot be seen, becomes a space or goes. An empty line
 * in a name would end a paragraph in LaTeX and Markdown, and marks of direction would turn the words behind it round.
 */
export const oneLine = (text: string): string =>
  unturned(text)
    .replace(/[\p{Zl}\p{Zp}\p{Cc}]+/gu, ' ')
    .replace(/[\u200e\u200f\ufeff]/gu, '')
    .toWellFormed()
    .replace(/ {2,}/g, ' ')
    .trim();
