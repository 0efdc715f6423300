import type { FitData } from '../fit/fit-data';
import { solveSymmetric } from '../numerics/solve-symmetric';
import { scoring } from './scoring';
import type { StoryModel } from './story-model';
import { windowLogLikelihood } from './window-log-likelihood';

/** Where a search ended. */
export interface ScoreFit {
  x: number[];
  logLikelihood: number;
  /** Standard errors from the expected information at the end; Infinity where it has none. */
  errors: number[];
}

/**
 * Greatest likelihood of a story near a start, by Fisher scoring: steps I⁻¹g with the expected information of S shots,
 * halved until the likelihood rises, inside the box of the parameters; one that wants to leave it stays at its end.
 *
 * Scoring and not Newton: the expected information is never negative, also far from the maximum, and needs the first
 * derivatives of the pmf alone, which are taken by differences.
 *
 * @param held parameters that stay where the start has them, by index
 * @param enough nats still to be gained at which the search ends
 * Source: Fisher scoring as in McCullagh & Nelder 1989 (m).
 */
export function scoreFit(
  model: StoryModel,
  data: FitData,
  start: number[],
  held: number[] = [],
  enough = 1e-7
): ScoreFit {
  let x = start.map((value, j) => Math.min(model.high[j], Math.max(model.low[j], value)));
  let value = windowLogLikelihood(data, model.window(x));
  let errors = x.map(() => Infinity);
  for (let round = 0; round < 50 && value > -Infinity; round++) {
    const { gradient, information } = scoring(model, data, x);
    const free = x.map((at, j) => {
      if (held.includes(j) || !(information[j * x.length + j] > 0)) return false;
      return gradient[j] > 0 ? at < model.high[j] : at > model.low[j];
    });
    errors = errorsOf(information, x.length, held);
    const step = solved(information, gradient, free);
    const gain = step.reduce((sum, move, j) => sum + move * gradient[j], 0);
    if (!(gain > 2 * enough)) break;
    let better = false;
    for (let part = 1; part > 1e-6 && !better; part /= 2) {
      const next = x.map((at, j) => Math.min(model.high[j], Math.max(model.low[j], at + part * step[j])));
      const there = windowLogLikelihood(data, model.window(next));
      if (there > value) {
        better = true;
        [x, value] = [next, there];
      }
    }
    if (!better) break;
  }
  return { x, logLikelihood: value, errors };
}

/** Step of the free parameters; the others get 0. */
function solved(information: number[], gradient: number[], free: boolean[]): number[] {
  const size = free.length;
  const matrix = information.map((entry, at) => (free[Math.floor(at / size)] && free[at % size] ? entry : 0));
  return solveSymmetric(
    matrix,
    size,
    gradient.map((slope, j) => (free[j] ? slope : 0))
  );
}

function errorsOf(information: number[], size: number, held: number[]): number[] {
  return Array.from({ length: size }, (_, j) => {
    if (held.includes(j)) return 0;
    const unit = Array.from({ length: size }, (_, k) => (k === j ? 1 : 0));
    const matrix = information.map((entry, at) =>
      held.includes(Math.floor(at / size)) || held.includes(at % size) ? 0 : entry
    );
    const variance = solveSymmetric(matrix, size, unit)[j];
    return variance > 0 ? Math.sqrt(variance) : Infinity;
  });
}
