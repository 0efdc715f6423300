import { ANSWERS } from './answers';
import { DATA } from './data';
import { DISTANCE } from './distance';
import { FLAG_TERMS } from './flags';
import { LAWS } from './laws';
import { MOMENTS } from './moments';
import { PLANNING } from './planning';
import { RATES } from './rates';
import { STORIES } from './stories';
import { SWEEPS } from './sweeps';
import type { Term } from './term';
import { TEST_TERMS } from './tests';

const ALL = {
  ...DATA,
  ...ANSWERS,
  ...LAWS,
  ...DISTANCE,
  ...RATES,
  ...MOMENTS,
  ...TEST_TERMS,
  ...FLAG_TERMS,
  ...STORIES,
  ...PLANNING,
  ...SWEEPS
};

export type TermId = keyof typeof ALL;

/** Every word of the report that has a note, by its id. */
export const TERMS: Readonly<Record<TermId, Term>> = ALL;
