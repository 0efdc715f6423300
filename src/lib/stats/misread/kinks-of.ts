import type { FitData } from '../fit/fit-data';
import { sampleMoments } from '../fit/sample-moments';
import type { Unit } from '../types';

/** Bonds, and mean and variance in single kinks, of counts that may be told in pairs. */
export function kinksOf(
  data: FitData,
  unit: Unit = 'defect'
): { bonds: number; moments: { mean: number; variance: number } } {
  const per = unit === 'pair' ? 2 : 1;
  const { mean, variance } = sampleMoments(data);
  return { bonds: data.trials! * per, moments: { mean: mean * per, variance: variance * per * per } };
}
