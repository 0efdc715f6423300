import type { Summary } from '$lib/model/link/summary';
import { infoOf } from './page/metadata';
import { conditionFacts, notesBlocks } from './parts/conditions';
import { flagsPart } from './parts/flags';
import { cautionsPart, methodPart } from './parts/method';
import { summaryNuisancesPart } from './parts/nuisances';
import { summaryAnswerPart } from './parts/summary-answer';
import { summaryCumulantsPart, summaryLawPart, summaryTestsPart } from './parts/summary-numbers';
import { summaryProvenancePart } from './parts/summary-provenance';
import { summaryFacts } from '$lib/model/link/summary-facts';
import type { Provenance } from './report-input';
import type { FontSource } from './type/fonts';
import { writeParts, type WriteOptions } from './write-parts';

/** What a link shows that keeps the counts back. */
export interface SummaryInput {
  summary: Summary;
  provenance: Provenance;
}

/**
 * A report without its counts as a PDF: what the page of such a link shows, and nothing else; no charts, since those
 * draw the counts, no digests and no seed, in the metadata neither.
 */
export function summaryPdf(
  { summary, provenance }: SummaryInput,
  fonts: FontSource,
  options?: WriteOptions
): Promise<Uint8Array<ArrayBuffer>> {
  const facts = [
    ...(provenance.dataset ? [['Name', provenance.dataset] as [string, string]] : []),
    ...summaryFacts(summary),
    ...conditionFacts(provenance.conditions)
  ];
  return writeParts(
    {
      info: infoOf(summary, provenance, ' Without the counts'),
      answer: summaryAnswerPart(summary, provenance),
      parts: [
        {
          title: 'What was given',
          rows: [{ blocks: [{ kind: 'facts', facts }, ...notesBlocks(provenance.conditions)] }]
        },
        summaryLawPart(summary),
        summaryCumulantsPart(summary),
        summaryTestsPart(summary),
        flagsPart(summary),
        summaryNuisancesPart(summary, provenance),
        methodPart(),
        summaryProvenancePart(summary, provenance),
        cautionsPart(summary)
      ],
      foot: `Severalty ${summary.engine.version}. Without the counts.`,
      said: [provenance, summary]
    },
    fonts,
    options
  );
}
