import { PAGE } from '../page/geometry';
import { breakLines, type Line } from '../type/break-lines';
import { cleanText } from '../type/clean-text';
import type { Pen } from '../type/pen';
import { STYLES } from '../type/styles';
import type { MarginNote } from './blocks';

export interface NoteParagraph {
  lines: Line[];
  indent: number;
  tag: 'P' | 'LI';
  /** Points below it. */
  gap: number;
}

/** Some lines of a paragraph, which stand on one page. */
export interface Stretch {
  paragraph: NoteParagraph;
  from: number;
  to: number;
}

const INDENT = 8;
const GAP = 2;
const { leading } = STYLES.note;

/** A note as it is broken into lines, the title first: in one piece, or in as many as it needs pages. */
export function notePieces({ title, paragraphs = [], items = [] }: MarginNote, pen: Pen): Stretch[][] {
  const set = (text: string, tag: 'P' | 'LI', indent: number): NoteParagraph => {
    const spans = [{ text: cleanText(text), style: STYLES.note }];
    return { lines: breakLines(spans, PAGE.noteWidth - indent, pen), indent, tag, gap: GAP };
  };
  const heading = breakLines([{ text: title, style: STYLES.noteTitle }], PAGE.noteWidth, pen);
  const all: NoteParagraph[] = [
    { lines: heading, indent: 0, tag: 'P', gap: 0 },
    ...paragraphs.map((text) => set(text, 'P', 0)),
    ...items.map((text) => set(text, 'LI', INDENT))
  ];
  const pieces: Stretch[][] = [[]];
  let room = PAGE.bottom - PAGE.top;
  for (const paragraph of all)
    for (let from = 0; from < paragraph.lines.length;) {
      const fit = Math.floor((room + 0.01) / leading);
      if (fit < 1) {
        pieces.push([]);
        room = PAGE.bottom - PAGE.top;
        continue;
      }
      const to = Math.min(paragraph.lines.length, from + fit);
      pieces[pieces.length - 1].push({ paragraph, from, to });
      room -= (to - from) * leading + (to === paragraph.lines.length ? paragraph.gap : 0);
      from = to;
    }
  return pieces;
}

/** Height of a piece of a note, in points; no gap below its last line. */
export function pieceHeight(piece: Stretch[]): number {
  const lines = piece.reduce((sum, { from, to }) => sum + to - from, 0);
  const gaps = piece.slice(0, -1).reduce((sum, { paragraph }) => sum + paragraph.gap, 0);
  return lines * leading + gaps;
}
