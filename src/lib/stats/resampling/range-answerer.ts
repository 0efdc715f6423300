import type { DrawRange } from './draw-helper';
import { fittedDraws, type DrawAnswer, type FittedDraws, type FittedJob } from './fitted-draws';

/** What a DrawHelper sends to where the work is done; the job is null when it is that of the range before. */
export interface RangeRequest {
  job: FittedJob | null;
  range: DrawRange;
}

/**
 * The far end of a DrawHelper: a function that answers ranges of draws, and keeps the job between them.
 *
 * @throws RangeError when the first request has no job
 */
export function rangeAnswerer(): (request: RangeRequest) => DrawAnswer[] {
  let draws: FittedDraws | null = null;
  return ({ job, range: { from, to, wanted } }) => {
    if (job !== null) draws = fittedDraws(job);
    if (draws === null) throw new RangeError('no job yet');
    const answers: DrawAnswer[] = [];
    for (let b = from; b < to; b++) answers.push(draws.draw(b, wanted));
    return answers;
  };
}
