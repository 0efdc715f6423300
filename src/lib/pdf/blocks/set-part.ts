import type { Flow } from '../page/flow';
import { PAGE } from '../page/geometry';
import { rule } from '../page/rule';
import { tag } from '../page/tags';
import { STYLES } from '../type/styles';
import type { Block, Part, Row } from './blocks';
import { factsHeight } from './set-facts';
import { leastHeight, setBlock } from './set-block';
import { setLines } from './set-lines';
import { notesHeight, setNotes } from './set-notes';

const GAP = 9;

/**
 * One part of the report under its own rule, with an entry in the outline.
 *
 * @param look `last`: the part that follows as the last one, which is short: it begins on the page of this one, or would
 * stand alone on a page of its own
 */
export function setPart(flow: Flow, part: Part, look: { rule: boolean; last?: Part }): void {
  const section = tag(flow.doc, flow.root, 'Sect');
  flow.clearMargin();
  flow.skip(15);
  const head = STYLES.section.leading + 16;
  const least = head + leastRow(flow, part.rows[0], flow.room - head);
  // What does not fit on a page anyway is not held together.
  const together = look.last ? wholeHeight(flow, part) + 15 + head + leastRow(flow, look.last.rows[0]) : 0;
  flow.need(together <= PAGE.bottom - PAGE.top ? Math.max(least, head + together) : least);
  if (look.rule) {
    rule(flow.doc, PAGE.left, flow.y, PAGE.whole, 'line');
    flow.y += 8;
  }
  // From the left edge: pdfkit counts `left` from the right.
  const place = { top: flow.y - 12, left: PAGE.width };
  flow.doc.outline.addItem(part.title, place as { expanded?: boolean });
  if (look.rule) {
    const spans = [{ text: part.title, style: STYLES.section }];
    setLines(flow, tag(flow.doc, section, 'H2'), 'H2', spans, PAGE.left, PAGE.main);
    flow.y += 5;
  }
  part.rows.forEach((row, i) => {
    if (i > 0) flow.skip(GAP + 3);
    setRow(flow, row, section);
  });
}

function setRow(flow: Flow, { blocks, notes }: Row, section: PDFKit.PDFStructureElement): void {
  // Notes of the row before may reach further down than its blocks: these would stand beside what they are not about.
  if (notes?.length) flow.clearMargin();
  // The notes are drawn first, since they may run beside several pages' worth of blocks, but are read out after them.
  flow.need(leastRow(flow, { blocks, notes }));
  const main = tag(flow.doc, section, 'Div');
  if (notes?.length) setNotes(flow, notes, tag(flow.doc, section, 'Div'));
  blocks.forEach((block: Block, i) => {
    if (i > 0) {
      flow.skip(gapBetween(blocks[i - 1], block));
      flow.need(leastHeight(flow, blocks.slice(i)));
    }
    setBlock(flow, block, main, footHeight(flow, block, blocks[i + 1]));
  });
}

/** Room for the foot of a table, which must not begin a page alone: its first two lines, and the gaps around it. */
const footHeight = (flow: Flow, block: Block, next?: Block): number =>
  block.kind === 'table' && next?.kind === 'paragraph' && next.look === 'smallFaint'
    ? leastHeight(flow, [next]) + gapBetween(block, next) + 5
    : 0;

/** Points that a part of facts and short paragraphs takes under its heading, its notes beside them. */
const wholeHeight = (flow: Flow, { rows }: Part): number =>
  rows.reduce((sum, { blocks, notes }) => {
    const set = blocks.reduce(
      (height, block) =>
        height + GAP + (block.kind === 'facts' ? factsHeight(flow, block.facts) : leastHeight(flow, [block])),
      0
    );
    return sum + Math.max(set, notesHeight(notes ?? [], flow.pen));
  }, 0);

/** Room that a row needs: its first blocks, and its notes, which no page may part from what they are about. */
const leastRow = (flow: Flow, row: Row | undefined, room = flow.room): number =>
  Math.max(leastHeight(flow, row?.blocks ?? [], room), notesHeight(row?.notes ?? [], flow.pen));

/** Points between two blocks: headings and leads stand close to what they lead, remarks to what they are on. */
function gapBetween(before: Block, block: Block): number {
  if (['heading', 'space', 'masthead', 'verdict'].includes(before.kind) || block.kind === 'space') return 0;
  if (block.kind === 'paragraph' && block.look === 'smallFaint') return 1;
  if (before.kind !== 'paragraph') return GAP;
  if (before.look === 'strong') return 0;
  return block.kind === 'paragraph' ? 3 : GAP;
}
