import { powerCurve } from '$lib/stats/planning/power-curve';
import { repeatsFor } from '$lib/stats/planning/repeats-for';
import { shotsToSee } from '$lib/stats/planning/shots-to-see';
import { simulatePower } from '$lib/stats/planning/simulate-power';
import { smallestEffect } from '$lib/stats/planning/smallest-effect';
import type { Planned, TaskAnswer, TaskRequest, Tasks } from './messages';
import { oddsOf } from './odds-of';
import type { PlanRequest } from './read-plan';

const say = (answer: TaskAnswer): void => self.postMessage(answer);

const SEED = 20_817;

/** One question a worker; the page ends the worker to cancel it. */
self.onmessage = ({ data }: MessageEvent<TaskRequest>) => {
  try {
    say({ kind: 'done', result: resultOf(data) });
  } catch (error) {
    say({ kind: 'failed', message: error instanceof Error ? error.message : String(error) });
  }
};

function resultOf(task: TaskRequest): Tasks[keyof Tasks]['result'] {
  if (task.kind === 'plan') return planned(task.asked);
  if (task.kind === 'odds') return oddsOf(task.asked);
  const { effect, shots, alpha } = task.asked;
  const repeats = repeatsFor(alpha);
  return (
    repeats && simulatePower(effect, shots, alpha, repeats, SEED, (share) => say({ kind: 'progress', share }))
  );
}

function planned({ size, shots, alpha, power, ...effect }: PlanRequest): Planned {
  const sharpness = { alpha, power };
  const found: Planned = {};
  if (size !== null) {
    found.needed = shotsToSee({ ...effect, size }, sharpness);
    if (found.needed?.shots) found.curve = powerCurve({ ...effect, size }, alpha, 2.5 * found.needed.shots);
  }
  if (shots !== null) found.smallest = smallestEffect(effect, shots, sharpness);
  return found;
}
