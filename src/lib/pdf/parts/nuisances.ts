import { driftPicture } from '$lib/charts/drift-picture';
import { batchesTable } from '$lib/charts/drift-table';
import { driftTitle } from '$lib/charts/drift-title';
import { trialsPicture } from '$lib/charts/trials-picture';
import { trialsTitle } from '$lib/charts/trials-title';
import type { TrialsPart } from '$lib/stats/sensitivity/types';
import type { DriftPart } from '$lib/stats/drift/types';
import { NUISANCES_TITLE, sayNuisances } from '$lib/model/report/say-nuisances';
import type { Summary } from '$lib/model/link/summary';
import { summaryNuisances } from '$lib/model/link/summary-nuisances';
import type { Block, Part } from '../blocks/blocks';
import type { Provenance, ReportInput } from '../report-input';

/** What can mimic interaction, and what is known of it here. */
export const nuisancesPart = ({ document, provenance }: ReportInput): Part => ({
  title: NUISANCES_TITLE,
  rows: [
    {
      blocks: [
        { kind: 'facts', facts: sayNuisances(document, provenance.conditions) },
        ...driftBlocks(document.nuisances?.drift),
        ...trialsBlocks(document.nuisances?.trials)
      ]
    }
  ]
});

/** The same where the counts are kept back. */
export const summaryNuisancesPart = (summary: Summary, { conditions }: Provenance): Part => ({
  title: NUISANCES_TITLE,
  rows: [{ blocks: [{ kind: 'facts', facts: summaryNuisances(summary, conditions) }] }]
});

/** Variance over ceiling as N runs. */
const trialsBlocks = (trials: TrialsPart | undefined): Block[] =>
  trials
    ? [
        {
          kind: 'figure',
          what: 'Chart of the variance over its ceiling as N runs',
          title: trialsTitle(trials),
          draw: (size) => trialsPicture(trials, size)
        }
      ]
    : [];

/** Means over time, and the batches one by one where they fit on a page. */
function driftBlocks(drift: DriftPart | undefined): Block[] {
  if (!drift || drift.means.length < 2) return [];
  const listed = drift.split ? drift.split.each.length : 0;
  return [
    {
      kind: 'figure',
      what: 'Chart of the mean over time',
      title: driftTitle(drift),
      draw: (size) => driftPicture(drift, size)
    },
    ...(listed > 0 && listed <= 40
      ? [
          {
            kind: 'table' as const,
            caption:
              'Batches one by one, in the order in which they first come; p before their number is allowed for',
            table: batchesTable(drift)
          }
        ]
      : [])
  ];
}
