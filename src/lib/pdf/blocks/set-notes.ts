import { NOTE_GAP, type Flow } from '../page/flow';
import { PAGE } from '../page/geometry';
import { mark, tag, type Element } from '../page/tags';
import { breakLines, type Line } from '../type/break-lines';
import { cleanText } from '../type/clean-text';
import type { Pen } from '../type/pen';
import { STYLES } from '../type/styles';
import type { MarginNote } from './blocks';
import { baseline, placeLine } from './set-lines';

const INDENT = 8;

interface SetNote {
  title: Line[];
  paragraphs: SetParagraph[];
  height: number;
}

interface SetParagraph {
  lines: Line[];
  indent: number;
  tag: 'P' | 'LI';
}

/** Sets notes in the margin, level with the cursor; `parent` is where they are read out. */
export function setNotes(flow: Flow, notes: MarginNote[], parent: Element): void {
  for (const note of notes) {
    const { title, paragraphs, height } = laidOut(note, flow.pen);
    const leading = STYLES.note.leading;
    // Made here, so that it is read out in its place also when it is drawn on the next page.
    const element = tag(flow.doc, parent, 'Sect');
    flow.putInMargin({
      height,
      draw(x, top) {
        let y = top;
        const place = (part: Line[], indent: number): void => {
          for (const line of part) {
            placeLine(line, x + indent, y, PAGE.noteWidth - indent, flow.pen);
            y += leading;
          }
        };
        mark(flow.doc, tag(flow.doc, element, 'P'), 'P', () => place(title, 0));
        const list = note.items?.length ? tag(flow.doc, element, 'L') : null;
        for (const paragraph of paragraphs) {
          if (paragraph.tag === 'P')
            mark(flow.doc, tag(flow.doc, element, 'P'), 'P', () => place(paragraph.lines, 0));
          else if (list) {
            const entry = tag(flow.doc, list, 'LI');
            mark(flow.doc, tag(flow.doc, entry, 'Lbl'), 'Lbl', () => {
              flow.pen.place('–', x, y + baseline(STYLES.note), STYLES.note);
            });
            mark(flow.doc, tag(flow.doc, entry, 'LBody'), 'LBody', () => place(paragraph.lines, INDENT));
          }
          y += 2;
        }
      }
    });
  }
}

/** How high notes stand in the margin one below the other, in points; 0 without any. */
export function notesHeight(notes: MarginNote[], pen: Pen): number {
  const heights = notes.map((note) => laidOut(note, pen).height);
  return heights.reduce((sum, height) => sum + height, 0) + Math.max(0, notes.length - 1) * NOTE_GAP;
}

function laidOut(note: MarginNote, pen: Pen): SetNote {
  const title = breakLines([{ text: note.title, style: STYLES.noteTitle }], PAGE.noteWidth, pen);
  const paragraphs = paragraphsOf(note, pen);
  const lines = title.length + paragraphs.reduce((sum, { lines }) => sum + lines.length, 0);
  return { title, paragraphs, height: lines * STYLES.note.leading + (paragraphs.length - 1) * 2 };
}

function paragraphsOf({ paragraphs = [], items = [] }: MarginNote, pen: Pen): SetParagraph[] {
  const broken = (text: string, indent: number): Line[] =>
    breakLines([{ text: cleanText(text), style: STYLES.note }], PAGE.noteWidth - indent, pen);
  return [
    ...paragraphs.map((text): SetParagraph => ({ lines: broken(text, 0), indent: 0, tag: 'P' })),
    ...items.map((text): SetParagraph => ({ lines: broken(text, INDENT), indent: INDENT, tag: 'LI' }))
  ];
}
