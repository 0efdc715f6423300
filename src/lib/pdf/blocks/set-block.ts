import type { Flow } from '../page/flow';
import type { Element } from '../page/tags';
import { STYLES } from '../type/styles';
import type { Block } from './blocks';
import { figureHeight, setFigure } from './set-figure';
import { setFacts } from './set-facts';
import { setFormulas } from './set-formulas';
import { setHeading } from './set-heading';
import { setLink } from './set-link';
import { setList } from './set-list';
import { setMasthead } from './set-masthead';
import { setParagraph } from './set-paragraph';
import { setStatement } from './set-statement';
import { setTable } from './set-table';
import { setTerms } from './set-terms';
import { setVerdict } from './set-verdict';

/** Sets one block at the cursor. `after`: points of what stands under a table and must not be parted from its last row. */
export function setBlock(flow: Flow, block: Block, parent: Element, after = 0): void {
  switch (block.kind) {
    case 'heading':
      return setHeading(flow, block, parent);
    case 'paragraph':
      return setParagraph(flow, block, parent);
    case 'list':
      return setList(flow, block.items, parent);
    case 'terms':
      return setTerms(flow, block, parent);
    case 'facts':
      return setFacts(flow, block.facts, parent);
    case 'table':
      return setTable(flow, block, parent, after);
    case 'figure':
      return setFigure(flow, block, parent);
    case 'formulas':
      return setFormulas(flow, block.formulas, parent);
    case 'link':
      return setLink(flow, block.address, parent);
    case 'masthead':
      return setMasthead(flow, block, parent);
    case 'verdict':
      return setVerdict(flow, block.document, parent);
    case 'statement':
      return setStatement(flow, block.text, parent);
    case 'space':
      return flow.skip(block.height);
  }
}

/** Room that the first of these blocks needs on a page with `room` left, with what must not be parted from it. */
export function leastHeight(flow: Flow, blocks: Block[], room = flow.room): number {
  const [first, ...rest] = blocks;
  const line = STYLES.body.leading;
  switch (first?.kind) {
    case undefined:
      return 0;
    case 'heading':
      return 2 * STYLES.heading.leading + leastHeight(flow, rest, room - 2 * STYLES.heading.leading);
    case 'space':
      return first.height + leastHeight(flow, rest, room - first.height);
    case 'figure':
      return figureHeight(flow, first, room);
    case 'table':
      return Math.min(first.table.rows.length + 3, 7) * 16;
    case 'facts':
    case 'terms':
    case 'formulas':
    case 'verdict':
    case 'statement':
      return 4 * line;
    case 'paragraph': {
      // A short paragraph that stands over something, such as a heading of a list, stays with it.
      const leads = first.look === 'strong';
      return leads ? line + leastHeight(flow, rest, room - line) : 2 * line;
    }
    default:
      return 2 * line;
  }
}
