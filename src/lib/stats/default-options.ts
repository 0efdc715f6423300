import type { DiagnoseOptions } from './types';

/** What is assumed when nothing is said. */
export const defaultOptions: DiagnoseOptions = {
  trials: null,
  unit: 'defect',
  alpha: 0.01,
  tolerance: 0.1,
  resamples: 1999,
  seed: 1,
  misread: null,
  geometry: 'sites',
  supplied: null
};
