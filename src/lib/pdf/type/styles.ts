import { DOWNLOAD_INKS } from '$lib/charts/inks';
import type { Ink } from '$lib/charts/picture';
import type { Face } from './fonts';

/** How a piece of text is set; sizes in points. */
export interface Style {
  face: Face;
  size: number;
  /** From one line to the next. */
  leading: number;
  ink: Ink;
  /** How far the piece stands above the line, for raised and lowered signs. */
  rise?: number;
}

const style = (face: Face, size: number, leading: number, ink: Ink = 'ink'): Style => ({
  face,
  size,
  leading,
  ink
});

export const STYLES = {
  body: style('text', 9.4, 13),
  strong: style('bold', 9.4, 13),
  term: style('text', 9, 12),
  termName: style('bold', 9, 12),
  faint: style('text', 9.4, 13, 'faint'),
  small: style('text', 8, 11),
  smallFaint: style('text', 8, 11, 'faint'),
  note: style('text', 7.9, 10.8),
  noteTitle: style('bold', 7.9, 10.8),
  wordmark: style('bold', 9.4, 13),
  verdict: style('bold', 10.5, 14),
  answer: style('bold', 14.2, 17.6),
  section: style('bold', 13, 17),
  heading: style('bold', 10.4, 13.6),
  cell: style('text', 8.2, 11),
  cellHead: style('text', 8.2, 10, 'faint'),
  amount: style('number', 7.7, 11),
  formula: style('text', 10.4, 15),
  foot: style('text', 7.4, 10, 'faint')
} satisfies Record<string, Style>;

/** Day inks on white: light ink for print. */
export const colourOf = (ink: Ink): string => DOWNLOAD_INKS[ink];
