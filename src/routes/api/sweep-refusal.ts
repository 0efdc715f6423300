import type { SavedSweep } from '$lib/server/services/sweeps/save-sweep';
import type { Problem } from '../problem';

/** Why no sweep was made, with the engine's own words where the datasets make none. */
export function sweepRefusal(refused: Extract<SavedSweep, { ok: false }>): Problem {
  if (refused.reason === 'refused')
    return {
      status: 422,
      code: 'no-sweep',
      title: 'These datasets make no sweep. Nothing was saved.',
      detail: refused.why
    };
  return {
    status: 404,
    code: 'unknown-dataset',
    title: 'The team has no dataset of at least one of these ids, or it was put aside. Nothing was saved.'
  };
}
