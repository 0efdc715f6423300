import { violations } from '$lib/stats/calibration/violations';
import type { CalibrateArguments } from './arguments';
import type { Job } from './job';

/** One line of the result: a truth, or a violation of one strength, at one number of shots. */
export interface Row {
  id: string;
  strength: number | null;
  shots: number;
  repeats: number;
}

const repeatsInAJob = 5;

/** Rows asked for, and the jobs that fill them. */
export function plan(asked: CalibrateArguments): { rows: Row[]; jobs: Job[] } {
  const rows: Row[] = asked.shots.flatMap((shots) =>
    asked.truths.map((id) => ({ id, strength: null, shots, repeats: asked.repeats(shots) }))
  );
  for (const id of asked.violations) {
    const { strengths } = violations.find((violation) => violation.id === id)!;
    for (const strength of strengths) {
      for (const shots of asked.shots.slice(0, 2))
        rows.push({ id, strength, shots, repeats: Math.ceil(asked.repeats(shots) / 3) });
    }
  }
  for (const id of asked.nuisances) {
    for (const shots of asked.shots) {
      const repeats = asked.repeats(shots);
      rows.push({ id, strength: null, shots, repeats });
      rows.push({ id, strength: 2, shots, repeats: Math.ceil(repeats / 3) });
    }
  }
  const { resamples, full, seed } = asked;
  const options = { resamples, full: Math.max(full, resamples), alpha: 0.01, seed };
  const jobs = rows.flatMap((row, index) =>
    Array.from({ length: Math.ceil(row.repeats / repeatsInAJob) }, (_, part): Job => {
      const from = part * repeatsInAJob;
      const { id, strength, shots } = row;
      const to = Math.min(row.repeats, from + repeatsInAJob);
      return { row: index, id, strength, shots, from, to, options };
    })
  );
  return { rows, jobs };
}
