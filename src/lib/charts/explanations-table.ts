import { EXPLANATIONS } from '$lib/model/labels';
import type { Explanations } from '$lib/stats/explanations/types';
import type { Table } from './table';

/** Every explanation of the document, best first. */
export const explanationsTable = ({ ranked }: Explanations): Table => ({
  columns: [
    { title: 'explanation', kind: 'text' },
    { title: 'AIC behind', kind: 'number' },
    { title: 'weight', kind: 'number' },
    { title: 'fitted numbers', kind: 'whole' },
    { title: 'number', kind: 'text' },
    { title: 'value', kind: 'number' },
    { title: 'low', kind: 'number' },
    { title: 'high', kind: 'number' },
    { title: 'G²', kind: 'number' },
    { title: 'p of its fit', kind: 'number' }
  ],
  rows: ranked.map(({ id, behind, weight, parameters, parameter, gSquared, goodness }) => [
    EXPLANATIONS[id],
    behind,
    weight,
    parameters,
    parameter?.symbol ?? '–',
    parameter?.value ?? null,
    parameter?.low ?? null,
    parameter?.high ?? null,
    gSquared,
    goodness?.p ?? null
  ])
});
