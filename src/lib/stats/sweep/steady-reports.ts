import type { Unit } from '../types';
import type { CumulantErrors } from './cumulant-errors';
import { factorPair } from './factor-pair';
import { floorChance } from './floor-chance';
import { normalInterval } from './normal-interval';
import { referenceRatios } from './reference-ratios';
import { steadyRatio } from './steady-ratio';
import type { SteadyReport, SweepOptions } from './types';

/**
 * Whether κ2/κ1 and κ3/κ1 are the same at every time, and for hold times whether F2/F1² is: F2 = κ2 − κ1 and F1 = κ1 are
 * factorial cumulants, of which independent loss multiplies the r-th by q^r, so that this factor stays while the mean
 * falls; loss in pairs changes it.
 *
 * Source: factorial cumulants under thinning: Daley & Vere-Jones 2003, An Introduction to the Theory of Point
 * Processes I, ch. 5 (m).
 */
export function steadyReports(
  known: CumulantErrors[],
  { axis, unit, alpha }: { axis: SweepOptions['axis']; unit: Unit; alpha: number }
): SteadyReport[] {
  const references = referenceRatios(unit);
  const ratios = ([1, 2] as const).map((q) => {
    const pairs = known.map(({ shots, cumulants, covariance: v }) => ({
      x: cumulants[0],
      y: cumulants[q],
      varX: v[0],
      varY: v[4 * q],
      covariance: v[q],
      // The error of a cumulant of order q + 1 grows about as the mean to the power (q + 1)/2, over √S.
      weight: shots / cumulants[0] ** q
    }));
    const id = q === 1 ? ('variance-over-mean' as const) : ('third-over-mean' as const);
    return report(
      id,
      pairs,
      references.map((one) => ({ id: one.id, at: q === 1 ? one.variance : one.third })),
      alpha
    );
  });
  if (axis === 'quench-time') return ratios.filter((one) => one !== null);
  const factor = report('pair-factor', known.map(factorPair), [], alpha);
  return [...ratios, factor].filter((one) => one !== null);
}

function report(
  id: SteadyReport['id'],
  pairs: Parameters<typeof steadyRatio>[0],
  references: { id: string; at: [number, number] }[],
  alpha: number
): SteadyReport | null {
  const found = steadyRatio(pairs);
  if (!found) return null;
  const { value, error, chiSquare, freedom, p } = found;
  // What is not one value is not held against the one value of a law.
  const held = p !== null && p <= alpha ? [] : references;
  return {
    id,
    steady: normalInterval(value, error),
    chiSquare,
    freedom,
    p: floorChance(p),
    references: held.map(({ id, at: [reference, own] }) => {
      const { low, high } = normalInterval(value, Math.hypot(error, own));
      return { id, value: reference, error: own, inside: low <= reference && reference <= high };
    })
  };
}
