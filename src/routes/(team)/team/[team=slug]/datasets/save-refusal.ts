import type { SavedDatasets } from '$lib/server/services/datasets/save-datasets';
import type { Problem } from '../../../../problem';

const WORDS = {
  'not-allowed': { status: 403, title: 'Your role in this team does not allow that.' },
  'unknown-file': { status: 404, title: 'A file is no longer here. Choose it again.' },
  unreadable: { status: 422, title: 'A file has problems, so nothing of it can be saved yet.' },
  'no-such-dataset': { status: 422, title: 'A dataset is not in its file, or was named twice.' },
  'already-there': { status: 409, title: 'These are saved already, from the same bytes.' },
  'bad-conditions': { status: 422, title: 'Some conditions do not fit the counts.' }
} as const;

/** Why datasets were not saved, with what the page needs to show it: `already` or `troubles`. */
export function saveRefusal(refused: Extract<SavedDatasets, { ok: false }>): Problem {
  const { reason } = refused;
  const more =
    reason === 'already-there'
      ? { already: refused.already }
      : reason === 'bad-conditions'
        ? { troubles: refused.troubles }
        : {};
  return { ...WORDS[reason], code: reason, ...more };
}
