import { FLAGS, TESTS } from '$lib/model/labels';
import { sayNoFlags } from '$lib/model/report/say-no-flags';
import type { Diagnosis, Flag } from '$lib/stats/types';
import type { Block, MarginNote, Part, Row } from '../blocks/blocks';

/** What the counts point to, what else could cause it, and what would tell them apart. */
export function flagsPart({ flags, answer }: Pick<Diagnosis, 'flags' | 'answer'>): Part {
  const none: Row = { blocks: [{ kind: 'paragraph', text: sayNoFlags(answer.verdict) }] };
  return { title: 'What the counts point to', rows: flags.length === 0 ? [none] : flags.map(flagRow) };
}

function flagRow(flag: Flag): Row {
  const blocks: Block[] = [
    {
      kind: 'heading',
      text: FLAGS[flag.id],
      sign: flag.id === 'regular' ? 'fewer' : 'more',
      after: flag.grade === 'shown' ? 'shown' : 'hinted at'
    },
    { kind: 'paragraph', text: flag.statement }
  ];
  if (flag.size) blocks.push({ kind: 'paragraph', text: flag.size });
  if (flag.next.length > 0)
    blocks.push(
      { kind: 'space', height: 4 },
      { kind: 'paragraph', text: 'What would tell them apart', look: 'strong' },
      { kind: 'list', items: flag.next }
    );
  const notes: MarginNote[] = [];
  if (flag.otherCauses.length > 0) notes.push({ title: 'What else could cause it', items: flag.otherCauses });
  if (flag.tests.length > 0)
    notes.push({ title: 'Seen by', paragraphs: [flag.tests.map((id) => TESTS[id]).join(', ')] });
  return { blocks, notes };
}
