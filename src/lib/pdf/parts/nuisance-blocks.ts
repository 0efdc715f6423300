import { batchesTable, driftTable } from '$lib/charts/drift-table';
import { driftPicture } from '$lib/charts/drift-picture';
import { driftTitle } from '$lib/charts/drift-title';
import { emptyAsideTable, emptyAsideTests, REST_CAPTION } from '$lib/charts/empty-aside-table';
import { rateSpreadTable } from '$lib/charts/rate-spread-table';
import { trialsPicture } from '$lib/charts/trials-picture';
import { trialsTable } from '$lib/charts/trials-table';
import { trialsTitle } from '$lib/charts/trials-title';
import { formatNumber } from '$lib/model/format-number';
import { kinkStretches, MOST_STRETCHES } from '$lib/model/report/say-misreads';
import type { DriftPart } from '$lib/stats/drift/types';
import type { TrialsPart } from '$lib/stats/sensitivity/types';
import type { EmptyAside } from '$lib/stats/truncation/empty-aside';
import type { Diagnosis, MisreadPart } from '$lib/stats/types';
import type { Block } from '../blocks/blocks';
import { noteBlock } from './note-block';
import { thinTable } from './thin-table';

/** The charts of what can look like interaction, each with its numbers, and the tables that have no chart. */
export const nuisanceBlocks = (nuisances: Diagnosis['nuisances'] = {}): Block[] => [
  ...misreadBlocks(nuisances.misread),
  ...asideBlocks(nuisances.emptyAside),
  ...driftBlocks(nuisances.drift),
  ...trialsBlocks(nuisances.trials)
];

/** The shots with a defect by themselves: their spread, and each test of them. */
const asideBlocks = (aside: EmptyAside | undefined): Block[] =>
  aside
    ? [
        {
          kind: 'table',
          caption: 'Without empty shots, with the 95\u202f% interval of variance over ceiling',
          table: emptyAsideTable(aside)
        },
        ...(aside.tests.length > 0
          ? [{ kind: 'table' as const, caption: REST_CAPTION, table: emptyAsideTests(aside) }]
          : [])
      ]
    : [];

/** Every rate tried, and every stretch of bonds where the words tell the first alone. */
function misreadBlocks(misread: MisreadPart | undefined): Block[] {
  const kinks = misread?.kinks ?? [];
  return [
    ...(kinks.length > MOST_STRETCHES
      ? [
          { kind: 'paragraph' as const, text: 'Every stretch of the chain', look: 'strong' as const },
          { kind: 'paragraph' as const, text: `${kinkStretches(kinks).join('; ')}.`, look: 'small' as const }
        ]
      : []),
    ...(misread?.spread
      ? [
          {
            kind: 'table' as const,
            caption: 'The answer at each misread rate tried',
            table: rateSpreadTable(misread.spread)
          }
        ]
      : [])
  ];
}

/** Variance over ceiling as N runs. */
const trialsBlocks = (trials: TrialsPart | undefined): Block[] =>
  trials
    ? [
        {
          kind: 'figure',
          what: 'Chart of the variance over its ceiling as N runs',
          title: trialsTitle(trials),
          draw: (size) => trialsPicture(trials, size)
        },
        {
          kind: 'table',
          caption: 'As N runs, with the 95\u202f% interval of variance over ceiling',
          table: trialsTable(trials)
        }
      ]
    : [];

/** Means over time, and the batches one by one, as many as fit on a page. */
function driftBlocks(drift: DriftPart | undefined): Block[] {
  if (!drift || drift.means.length < 2) return [];
  const means = thinTable(driftTable(drift), () => true);
  return [
    {
      kind: 'figure',
      what: 'Chart of the mean over time',
      title: driftTitle(drift),
      draw: (size) => driftPicture(drift, size)
    },
    { kind: 'table', caption: 'Means over time, with limits of three sigma', table: means.table },
    ...noteBlock(means.note),
    ...batchBlocks(drift)
  ];
}

function batchBlocks(drift: DriftPart): Block[] {
  const listed = drift.split?.each.length ?? 0;
  const { p = null, pTogether = null } = drift.split ?? {};
  const batches = thinTable(batchesTable(drift), () => true);
  return [
    ...(listed === 0
      ? []
      : [
          {
            kind: 'table' as const,
            caption:
              'Batches one by one, in the order in which they first come; p before their number is allowed for',
            table: batches.table
          },
          ...noteBlock(batches.note)
        ]),
    ...noteBlock(
      p === null || pTogether === null
        ? ''
        : `All batches pooled: p = ${formatNumber(p, 2)}; with the most telling by itself, both allowed for: p = ${formatNumber(pTogether, 2)}.`
    )
  ];
}
