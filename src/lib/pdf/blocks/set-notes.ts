import { NOTE_GAP, type Flow } from '../page/flow';
import { PAGE } from '../page/geometry';
import { mark, tag, type Element } from '../page/tags';
import type { Pen } from '../type/pen';
import { STYLES } from '../type/styles';
import type { MarginNote } from './blocks';
import { notePieces, pieceHeight, type NoteParagraph } from './note-pieces';
import { baseline, placeLine } from './set-lines';

/**
 * Sets notes in the margin, level with the cursor; `parent` is where they are read out. A note that is higher than a
 * page goes on in the margin of the next.
 */
export function setNotes(flow: Flow, notes: MarginNote[], parent: Element): void {
  for (const note of notes) {
    // Made here, so that it is read out in its place also when it is drawn on the next page.
    const contentOf = contents(flow, tag(flow.doc, parent, 'Sect'));
    for (const piece of notePieces(note, flow.pen))
      flow.putInMargin({
        height: pieceHeight(piece),
        draw(x, top) {
          let y = top;
          for (const { paragraph, from, to } of piece) {
            const content = contentOf(paragraph, x, y);
            mark(flow.doc, content, paragraph.tag === 'P' ? 'P' : 'LBody', () => {
              for (const line of paragraph.lines.slice(from, to)) {
                placeLine(line, x + paragraph.indent, y, PAGE.noteWidth - paragraph.indent, flow.pen);
                y += STYLES.note.leading;
              }
            });
            y += paragraph.gap;
          }
        }
      });
  }
}

/** How high notes stand in the margin one below the other, in points; 0 without any. */
export function notesHeight(notes: MarginNote[], pen: Pen): number {
  const heights = notes.flatMap((note) => notePieces(note, pen).map(pieceHeight));
  return heights.reduce((sum, height) => sum + height, 0) + Math.max(0, notes.length - 1) * NOTE_GAP;
}

/** What a paragraph of a note is marked as: made when its first line is drawn, an entry of a list with its dash. */
function contents({ doc, pen }: Flow, note: Element) {
  const made = new Map<NoteParagraph, Element>();
  let list: Element | null = null;
  return (paragraph: NoteParagraph, x: number, y: number): Element => {
    const known = made.get(paragraph);
    if (known) return known;
    let content: Element;
    if (paragraph.tag === 'P') content = tag(doc, note, 'P');
    else {
      list ??= tag(doc, note, 'L');
      const entry = tag(doc, list, 'LI');
      mark(doc, tag(doc, entry, 'Lbl'), 'Lbl', () => {
        pen.place('–', x, y + baseline(STYLES.note), STYLES.note);
      });
      content = tag(doc, entry, 'LBody');
    }
    made.set(paragraph, content);
    return content;
  };
}
