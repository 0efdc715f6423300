import { REFERENCES } from '$lib/model/labels';
import type { Diagnosis } from '$lib/stats/types';
import type { Table } from './table';

/** The best law and the reference laws, judged by the same likelihood. */
export const referencesTable = ({ fit }: Diagnosis): Table => ({
  columns: [
    { title: 'law', kind: 'text' },
    { title: 'log-likelihood', kind: 'number' },
    { title: 'nats a shot', kind: 'number' },
    { title: 'AIC', kind: 'number' }
  ],
  rows: [
    ['best independent-trial law', fit.logLikelihood, fit.divergence, null],
    ...fit.references.map(({ id, logLikelihood, divergence, aic }) => [
      REFERENCES[id],
      logLikelihood,
      divergence,
      aic
    ])
  ]
});
