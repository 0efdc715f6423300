import type { Diagnosis } from '$lib/stats/types';
import { intervalsTable } from './intervals-table';
import type { Table } from './table';

/** The cumulants with their intervals. */
export const cumulantsTable = ({ moments }: Diagnosis): Table =>
  intervalsTable('cumulant', [
    ['κ₁, mean', moments.mean],
    ['κ₂, variance', moments.variance],
    ['κ₃', moments.third],
    ['κ₄', moments.fourth],
    ['κ₂/κ₁, Fano factor', moments.fano]
  ]);
