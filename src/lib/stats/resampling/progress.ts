import type { SequentialP } from '../multiple/sequential-p';

/** How far a sequential run is: by draws or by exceedances, whichever is nearer its end. */
export function progress(sequence: SequentialP): number {
  return Math.max(sequence.draws / sequence.resamples, sequence.exceeded / sequence.exceedances);
}
