import type { SweepPoint } from './fit-power-laws';

/** Points with only the first of their quantities, and the covariance of those. */
export const firstQuantities = (points: SweepPoint[], quantities: number): SweepPoint[] =>
  points.map(({ logTime, values, covariance }) => ({
    logTime,
    values: values.slice(0, quantities),
    covariance: covariance.filter((_, k) => k % values.length < quantities && k < values.length * quantities)
  }));
