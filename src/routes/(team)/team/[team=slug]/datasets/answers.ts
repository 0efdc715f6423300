import { storageTrouble } from '$lib/server/services/datasets/storage-trouble';
import { fail, isHttpError, isRedirect } from '@sveltejs/kit';
import { problem, type Problem } from '../../../../problem';

const STORAGE: Record<'busy' | 'full', Problem> = {
  busy: {
    status: 503,
    code: 'busy',
    title: 'The database is busy. Nothing was saved; try again in a moment.'
  },
  full: {
    status: 507,
    code: 'full',
    title: 'The disk of the server is full. Nothing was saved; tell who runs it.'
  }
};

export const TOO_LARGE: Problem = {
  status: 413,
  code: 'too-large',
  title: 'That is more than the server takes at once: 20 MB.',
  detail: 'Send the files one by one, or sum shots of equal count into a histogram.'
};

export const BROKEN_OFF: Problem = {
  status: 400,
  code: 'broken-off',
  title: 'The upload did not arrive whole. Nothing was saved; send it again.'
};

/** The answer to a body that could not be read: over the limit, or broken off on its way. */
export function bodyTrouble(error: unknown): Problem {
  const status = (thing: unknown): unknown =>
    typeof thing === 'object' && thing !== null && 'status' in thing ? thing.status : undefined;
  const cause = error instanceof Error ? error.cause : undefined;
  return status(error) === 413 || status(cause) === 413 ? TOO_LARGE : BROKEN_OFF;
}

/** What a JSON route gives, or problem details when the database cannot be written. */
export function answering(work: () => Response): Response {
  try {
    return work();
  } catch (error) {
    const trouble = storageTrouble(error);
    if (!trouble) throw error;
    return problem(STORAGE[trouble]);
  }
}

/** What a form action gives, or its words when the database cannot be written; `kept` goes back into the form. */
export function acting<Kept extends object, Result>(kept: Kept, work: () => Result) {
  try {
    return work();
  } catch (error) {
    const trouble = isRedirect(error) || isHttpError(error) ? null : storageTrouble(error);
    if (!trouble) throw error;
    return fail(STORAGE[trouble].status, { ...kept, message: STORAGE[trouble].title });
  }
}
