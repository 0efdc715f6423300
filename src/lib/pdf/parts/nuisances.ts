import { NUISANCES_TITLE, sayNuisances } from '$lib/model/report/say-nuisances';
import type { Summary } from '$lib/model/link/summary';
import { summaryNuisances } from '$lib/model/link/summary-nuisances';
import type { Part } from '../blocks/blocks';
import type { Provenance, ReportInput } from '../report-input';
import { nuisanceBlocks } from './nuisance-blocks';

/** What can mimic interaction, and what is known of it here. */
export const nuisancesPart = ({ document, provenance }: ReportInput): Part => ({
  title: NUISANCES_TITLE,
  rows: [
    {
      blocks: [
        { kind: 'facts', facts: sayNuisances(document, provenance.conditions) },
        ...nuisanceBlocks(document.nuisances)
      ]
    }
  ]
});

/** The same where the counts are kept back. */
export const summaryNuisancesPart = (summary: Summary, { conditions }: Provenance): Part => ({
  title: NUISANCES_TITLE,
  rows: [{ blocks: [{ kind: 'facts', facts: summaryNuisances(summary, conditions) }] }]
});
