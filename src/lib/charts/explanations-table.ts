import { EXPLANATIONS } from '$lib/model/labels';
import { rejected } from '$lib/stats/explanations/rejected';
import type { Explanations } from '$lib/stats/explanations/types';
import type { Table } from './table';

/**
 * Every explanation of the document, best first.
 *
 * @param alpha level at which one is rejected by its own fit
 */
export const explanationsTable = ({ ranked }: Explanations, alpha: number): Table => ({
  columns: [
    { title: 'explanation', kind: 'text' },
    { title: 'AIC behind', kind: 'number' },
    { title: 'weight', kind: 'number' },
    { title: 'fitted numbers', kind: 'whole' },
    { title: 'log-likelihood', kind: 'number' },
    { title: 'AIC', kind: 'number' },
    { title: 'G²', kind: 'number' },
    { title: 'p of its fit', kind: 'number' },
    { title: 'smallest p', kind: 'number' },
    { title: 'resamples', kind: 'whole' },
    { title: 'base', kind: 'number' },
    { title: 'number', kind: 'text' },
    { title: 'value', kind: 'number' },
    { title: 'low', kind: 'number' },
    { title: 'high', kind: 'number' },
    { title: 'second number', kind: 'text' },
    { title: 'its value', kind: 'number' },
    { title: 'own fit', kind: 'text' }
  ],
  rows: ranked.map((one) => [
    EXPLANATIONS[one.id],
    one.behind,
    one.weight,
    one.parameters,
    one.logLikelihood,
    one.aic,
    one.gSquared,
    one.goodness?.p ?? null,
    one.goodness?.smallestP ?? null,
    one.goodness?.resamples ?? null,
    one.base,
    one.parameter?.symbol ?? '–',
    one.parameter?.value ?? null,
    one.parameter?.low ?? null,
    one.parameter?.high ?? null,
    one.second?.symbol ?? '–',
    one.second?.value ?? null,
    one.goodness === null ? 'not asked' : rejected(one, alpha) ? 'rejected' : 'not rejected'
  ])
});
