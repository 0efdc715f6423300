import { engineFacts } from '$lib/model/report/engine-facts';
import { sayEngine } from '$lib/model/report/say-engine';
import type { Block, Part } from '../blocks/blocks';
import type { ReportInput } from '../report-input';
import { NOTES } from './notes';
import { whoFacts } from './who';

/** Everything needed to get the same result again, and who made it unless the report is blind. */
export function provenancePart({ document, documentSha256, provenance }: ReportInput): Part {
  const { link } = provenance;
  const [counts, ...engine] = engineFacts(document);
  const facts: [string, string][] = [
    counts,
    ['Document', `sha256:${documentSha256.replace(/^sha256:/, '')}`],
    ...engine,
    ...whoFacts(provenance)
  ];
  const engineNote = sayEngine(document.engine.version);
  const other: Block[] = engineNote === '' ? [] : [{ kind: 'paragraph', text: engineNote }];
  const address: Block[] =
    link === null
      ? []
      : [
          { kind: 'paragraph', text: 'This report can be read at', look: 'strong' },
          { kind: 'link', address: link }
        ];
  return {
    title: 'Where this result comes from',
    rows: [{ blocks: [{ kind: 'facts', facts }, ...other, ...address], notes: [NOTES.again] }]
  };
}
