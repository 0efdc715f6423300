import type { Separator } from '../types';

/** Separators that may divide a line, in the order that settles a tie, with their words. */
export const separators: { id: Exclude<Separator, 'none'>; character: string; words: string }[] = [
  { id: 'tab', character: '\t', words: 'tabs' },
  { id: 'semicolon', character: ';', words: 'semicolons' },
  { id: 'comma', character: ',', words: 'commas' },
  { id: 'spaces', character: ' ', words: 'spaces' }
];

/** A character no text holds (control characters are refused before), so that a line stays whole. */
export const wholeLine = '\u001f';
