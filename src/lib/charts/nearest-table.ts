import { givenCumulants, type PublishedCumulants } from '$lib/stats/cumulants-only/published-cumulants';
import type { CumulantsVerdict } from '$lib/stats/cumulants-only/judge-cumulants';
import type { Table } from './table';

const NAMES = ['κ₁, mean', 'κ₂, variance', 'κ₃', 'κ₄'];

/** Printed cumulants beside the nearest ones that independent trials have. */
export const nearestTable = (printed: PublishedCumulants, { nearest, pulls }: CumulantsVerdict): Table => ({
  columns: [
    { title: 'cumulant', kind: 'text' },
    { title: 'printed', kind: 'number' },
    { title: 'error', kind: 'number' },
    { title: 'nearest', kind: 'number' },
    { title: 'off by, in errors', kind: 'number' }
  ],
  rows: givenCumulants(printed).map(({ value, error }, i) => [
    NAMES[i],
    value,
    error,
    nearest.cumulants[i],
    // A thousandth of an error is the rounding of the search.
    Math.abs(pulls[i]) < 1e-3 ? 0 : pulls[i]
  ])
});
