import { METHOD_FORMULAS } from '$lib/model/report/method-formulas';
import { METHOD_SOURCES } from '$lib/model/report/method-sources';
import type { Diagnosis } from '$lib/stats/types';
import type { Formula, Part } from '../blocks/blocks';
import { NOTES } from './notes';

const FORMULAS: Formula[] = METHOD_FORMULAS.map(({ name, printed, alt, words }) => ({
  name,
  formula: printed,
  alt,
  words
}));

/** How it was done: formulas and their sources. */
export const methodPart = (): Part => ({
  title: 'Method',
  rows: [
    {
      blocks: [{ kind: 'formulas', formulas: FORMULAS }],
      notes: [
        { title: 'Sources', paragraphs: METHOD_SOURCES.map(([what, sources]) => `${what}. ${sources}`) },
        NOTES.notIndependent
      ]
    }
  ]
});

/** What this report must not be used for. */
export const cautionsPart = ({ cautions }: Pick<Diagnosis, 'cautions'>): Part => ({
  title: 'Cautions',
  rows: [{ blocks: [{ kind: 'list', items: cautions }] }]
});
