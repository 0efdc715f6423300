import type { LogDispersion } from './log-dispersion';

/** Three standard deviations of a normal law: 99.73 % inside. */
const WIDE = 3;

/**
 * Limits within which mean and variance/ceiling of a version would lie with 99.73 %, had it the law of the reference: the
 * reference's own error is part of them, and that of the version's number of shots. For each quantity by itself, not for
 * both and not for all cells together: of 1000 quiet cells, some 3 leave each.
 *
 * @param shots of the reference and of the version
 */
export function controlLimits(
  { log, error, mean, meanError }: LogDispersion,
  shots: { reference: number; version: number }
): { mean: [number, number]; dispersion: [number, number] } {
  // Errors go with 1/√S: the version's is that of the reference at other shots.
  const widen = WIDE * Math.sqrt(1 + shots.reference / shots.version);
  return {
    mean: [Math.max(0, mean - widen * meanError), mean + widen * meanError],
    dispersion: [Math.exp(log - widen * error), Math.exp(log + widen * error)]
  };
}
