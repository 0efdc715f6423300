import type { Block } from '../blocks/blocks';
import type { Provenance } from '../report-input';
import { cleanText } from '../type/clean-text';
import { sayWhen } from './say-when';

/** Whose report it is and when it was made, over the answer; blind reports say neither. */
export function masthead({ team, madeAt, dataset }: Provenance): Block {
  const line = [team === null ? '' : cleanText(team), madeAt === null ? '' : sayWhen(madeAt)]
    .filter((part) => part !== '')
    .join(', ');
  return { kind: 'masthead', name: dataset, line: line || 'Report on counts of defects' };
}
