import type { Pen } from './pen';
import type { Style } from './styles';

/** A stretch of a paragraph in one style. */
export interface Span {
  text: string;
  style: Style;
}

/** A piece of a line, `x` points from its start. */
export interface Piece extends Span {
  x: number;
}

export interface Line {
  pieces: Piece[];
  width: number;
}

interface Word {
  text: string;
  style: Style;
  /** Width of the space before it; 0 where none stands. */
  space: number;
  width: number;
}

// Scripts that break between any two signs.
const LOOSE = /[\u2e80-\u9fff\uac00-\ud7af\uf900-\ufaff\uff00-\uffef]/;

/** Neither "p = 0.01" nor "2 × 10" may break over a line. */
export const held = (text: string): string =>
  text.replace(/ ([=≤≥≈×]) /g, '\u00a0$1\u00a0').replace(/(\d) %/g, '$1\u00a0%');

/** Breaks spans into lines of at most `width` points, at plain spaces; a longer word is broken where it must. */
export function breakLines(spans: Span[], width: number, pen: Pen): Line[] {
  const lines: Line[] = [];
  let line: Line = { pieces: [], width: 0 };
  for (const word of wordsOf(spans, pen, width)) {
    const space = line.pieces.length > 0 ? word.space : 0;
    if (line.pieces.length > 0 && line.width + space + word.width > width + 0.01) {
      lines.push(line);
      line = { pieces: [], width: 0 };
    }
    append(line, word);
  }
  lines.push(line);
  return lines;
}

function append(line: Line, word: Word): void {
  const last = line.pieces.at(-1);
  const space = last ? word.space : 0;
  if (last && last.style === word.style) {
    last.text += `${space > 0 ? ' ' : ''}${word.text}`;
    line.width += space + word.width;
  } else {
    // The space between two styles goes with the earlier one, so that copied text keeps it.
    if (last && space > 0) last.text += ' ';
    line.pieces.push({ text: word.text, style: word.style, x: line.width + space });
    line.width += space + word.width;
  }
}

function wordsOf(spans: Span[], pen: Pen, width: number): Word[] {
  const words: Word[] = [];
  let spaced = false;
  for (const { text, style } of spans) {
    for (const part of held(text).split(/( +)/)) {
      if (part === '') continue;
      if (part[0] === ' ') {
        spaced = true;
        continue;
      }
      for (const whole of loosened(part)) {
        for (const fitting of cut(whole, style, pen, width)) {
          const space = spaced ? pen.width(' ', style) : 0;
          words.push({ text: fitting, style, space, width: pen.width(fitting, style) });
          spaced = false;
        }
      }
    }
  }
  return words;
}

function loosened(word: string): string[] {
  return LOOSE.test(word)
    ? (word.match(
        new RegExp(`${LOOSE.source}|[^\u2e80-\u9fff\uac00-\ud7af\uf900-\ufaff\uff00-\uffef]+`, 'gu')
      ) ?? [word])
    : [word];
}

/** Cuts a word that no line can hold. */
function cut(word: string, style: Style, pen: Pen, width: number): string[] {
  if (pen.width(word, style) <= width) return [word];
  const parts: string[] = [];
  let part = '';
  for (const [sign] of word.matchAll(/\P{M}\p{M}*|\p{M}+/gu)) {
    if (part !== '' && pen.width(part + sign, style) > width) {
      parts.push(part);
      part = '';
    }
    part += sign;
  }
  if (part !== '') parts.push(part);
  return parts;
}
