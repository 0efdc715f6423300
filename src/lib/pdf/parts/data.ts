import { dataFacts } from '$lib/model/report/data-facts';
import type { Part } from '../blocks/blocks';
import type { ReportInput } from '../report-input';
import { conditionFacts, notesBlocks } from './conditions';

/** What was given: the counts, and the conditions they were taken under. */
export function dataPart({ document, provenance }: ReportInput): Part {
  const { dataset, conditions } = provenance;
  const facts = [...dataFacts(document, dataset), ...conditionFacts(conditions)];
  return {
    title: 'What was given',
    rows: [{ blocks: [{ kind: 'facts', facts }, ...notesBlocks(conditions)] }]
  };
}
