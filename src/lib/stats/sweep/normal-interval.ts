import { normalQuantile } from '../numerics/normal-quantile';
import type { KnownInterval } from './types';

const reach = normalQuantile(0.975);

/** The 95 % interval of an estimate with a normal error: value ± 1.96 standard errors. */
export const normalInterval = (value: number, error: number): KnownInterval => ({
  value,
  low: value - reach * error,
  high: value + reach * error
});
