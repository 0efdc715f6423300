import { capital } from '$lib/model/capital';
import { columnsOf } from '$lib/charts/columns-of';
import { explanationsPicture } from '$lib/charts/explanations-picture';
import { explanationsTable } from '$lib/charts/explanations-table';
import { explanationsTitle } from '$lib/charts/explanations-title';
import type { Table } from '$lib/charts/table';
import { EXPLANATIONS } from '$lib/model/labels';
import { sayFit } from '$lib/model/report/say-fit';
import { sayOwnNumber } from '$lib/model/report/say-own-number';
import { sayShotsInAll, sayShotsToLead } from '$lib/model/report/say-shots-in-all';
import { sayWeight } from '$lib/model/report/say-weight';
import type { Explanation, ExplanationId, Explanations } from '$lib/stats/explanations/types';
import type { Block, Part } from '../blocks/blocks';
import { noteBlock } from './note-block';
import { NOTES } from './notes';

const TITLE = 'What else it could be';

/** The columns of the page's table behind the chart, over two tables of a page's width. */
const LIKELIHOODS = [
  'explanation',
  'fitted numbers',
  'log-likelihood',
  'AIC',
  'AIC behind',
  'weight',
  'G²',
  'own fit',
  'p of its fit',
  'smallest p',
  'resamples'
];
const NUMBERS = ['explanation', 'base', 'number', 'value', 'low', 'high', 'second number', 'its value'];

/** Stories that would give such counts, as on the page; nothing where none were told. */
export function explanationsParts(explanations: Explanations | undefined, alpha: number): Part[] {
  if (!explanations) return [];
  const { ranked, tied, separate, shotsToLead, notRun, pairs, statement, tieWithin } = explanations;
  const near = ranked.filter(({ id }) => tied.includes(id));
  return [
    {
      title: TITLE,
      rows: [
        {
          blocks: [
            ...said([statement, pairs?.statement ?? '']),
            {
              kind: 'figure',
              what: 'Chart of explanations, best first',
              title: explanationsTitle(explanations, alpha),
              draw: (size) => explanationsPicture(explanations, size, alpha)
            }
          ],
          notes: [NOTES.compared(tieWithin), NOTES.ownNumber]
        },
        {
          blocks: [
            {
              kind: 'table',
              caption: 'Explanations, best first, each with its number',
              table: rankedTable(ranked, tied),
              digits: [0, 3, 0, 2, 0],
              under: ranked.map((one) => underOf(one, alpha))
            },
            {
              kind: 'table',
              caption: 'Their likelihoods in full',
              table: columnsOf(explanationsTable(explanations, alpha), LIKELIHOODS)
            },
            {
              kind: 'table',
              caption: 'Their numbers in full',
              table: columnsOf(explanationsTable(explanations, alpha), NUMBERS)
            },
            ...noteBlock(
              'Base: the probability of one trial, or the mean count when N is unknown, before the story sets in.'
            ),
            ...listed('What the nearest would mean', near.map(meaningOf)),
            ...listed(
              'What would tell them apart',
              separate.map(({ between, measurement, shots }) =>
                `${named(between[0])} or ${EXPLANATIONS[between[1]]}: ${measurement} ${sayShotsInAll(shots)}`.trim()
              )
            ),
            ...said([sayShotsToLead(EXPLANATIONS[ranked[0]?.id], shotsToLead)]),
            ...listed(
              'Not told',
              notRun.map(({ id, reason }) => `${named(id)}: ${reason}`)
            )
          ],
          notes: [
            NOTES.ownFit,
            NOTES.independentListed,
            ...(ranked.some(({ id }) => id === 'two-settings') ? [NOTES.twoSettings] : [])
          ]
        }
      ]
    }
  ];
}

const said = (texts: string[]): Block[] =>
  texts.filter((text) => text !== '').map((text) => ({ kind: 'paragraph', text }));

const listed = (title: string, items: string[]): Block[] =>
  items.length === 0
    ? []
    : [
        { kind: 'paragraph', text: title, look: 'strong' },
        { kind: 'list', items }
      ];

/** What its own fit says against it, and its number. */
const underOf = (one: Explanation, alpha: number): string | null =>
  [capital(sayFit(one, alpha)), sayOwnNumber(one)].filter((words) => words !== '').join('; ') || null;

const named = (id: ExplanationId): string => capital(EXPLANATIONS[id]);

const meaningOf = ({ id, meaning }: Explanation): string => `${named(id)}: ${meaning}`;

/** The table of the page; the number of each stands under it. */
function rankedTable(ranked: Explanation[], tied: ExplanationId[]): Table {
  const near = (id: ExplanationId): string => (tied.includes(id) ? 'with the first' : '–');
  const some = tied.length > 1;
  return {
    columns: [
      { title: 'explanation', kind: 'text' },
      { title: 'AIC behind', kind: 'number' },
      // Per cent, with its sign: flush right.
      { title: 'weight', kind: 'whole' },
      { title: 'p of its fit', kind: 'number' },
      ...(some ? [{ title: 'tied', kind: 'text' } as const] : [])
    ],
    rows: ranked.map(({ id, behind, weight, goodness }) => [
      EXPLANATIONS[id],
      behind,
      sayWeight(weight),
      goodness?.p ?? null,
      ...(some ? [near(id)] : [])
    ])
  };
}
