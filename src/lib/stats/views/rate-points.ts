import type { Diagnosis, DistributionPoint } from '../types';
import type { LawTable } from './law-table';

/**
 * Rate function: −ln(h_n/S)/N with its interval, the fitted −ln f_n/N, the large-deviation limit I(n/N), and
 * the central-limit parabola (n−μ)²/(2σ²N). With N unknown nothing is divided (nats a shot).
 *
 * Horizon: ln(S)/N, the largest rate that S shots can show. Silence: −ln(1 − 0.05^{1/S})/N, above which not
 * even an empty count says anything at 95 %. A lump has no single count and no rate.
 */
export function ratePoints(
  points: DistributionPoint[],
  shots: number,
  trials: number | null,
  table: LawTable
): Diagnosis['rate'] {
  const scale = trials ?? 1;
  const { mean, variance } = table;
  const rateOf = (probability: number) => (probability > 0 ? positive(-Math.log(probability) / scale) : null);
  return {
    horizon: Math.log(shots) / scale,
    // −ln(1 − 0.05^{1/S}): expm1 keeps the digits when S is large.
    silence: -Math.log(-Math.expm1(Math.log(0.05) / shots)) / scale,
    scale,
    points: points
      .filter((point) => !point.lump)
      .map((point) => ({
        count: point.count,
        density: point.density,
        empirical: rateOf(point.observed),
        low: rateOf(point.high)!,
        high: rateOf(point.low),
        fitted: finite(-table.logF[point.count - table.first] / scale),
        limit: finite(table.rate(point.count) / scale),
        gaussian: variance > 0 ? (point.count - mean) ** 2 / (2 * variance * scale) : null
      }))
  };
}

function finite(value: number): number | null {
  return Number.isFinite(value) ? positive(value) : null;
}

/** −0 and the last digit of rounding below it read as nothing. */
function positive(value: number): number {
  return value > 0 ? value : 0;
}
