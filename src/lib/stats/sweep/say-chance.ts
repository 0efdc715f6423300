import { formatNumber } from '../words/format-number';
import { LEAST_CHANCE } from './floor-chance';

/** A p-value of a sweep as it is printed, two digits: one below what a document tells, as what it is below; null is "–". */
export const sayChance = (p: number | null): string =>
  p !== null && p <= LEAST_CHANCE ? `under ${formatNumber(LEAST_CHANCE, 1)}` : formatNumber(p, 2);
