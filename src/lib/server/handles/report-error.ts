import type { HandleServerError } from '@sveltejs/kit';
import { randomUUID } from 'node:crypto';
import { log } from '../log';
import { storageTrouble } from '../services/datasets/storage-trouble';

const STORAGE_WORDS = {
  busy: 'Another program holds the database just now. Nothing was saved: try again in a moment.',
  full: 'The disk of the server is full. Nothing was saved: tell whoever runs it, and keep your file.'
};

/** Gives an unforeseen error a number that the person can quote and the log can be searched for. */
export const reportError: HandleServerError = ({ error, event, status, message }) => {
  if (status === 404) return { message: 'There is no page at this address.', code: 'not-found' };
  const trouble = storageTrouble(error);
  if (trouble !== null) {
    event.locals.storageTrouble = trouble;
    log('error', `database ${trouble}`, { method: event.request.method, route: event.route.id });
    return { message: STORAGE_WORDS[trouble], code: `database-${trouble}` };
  }
  const errorId = randomUUID().slice(0, 8);
  const stack = error instanceof Error ? error.stack : String(error);
  log('error', message, { errorId, status, method: event.request.method, route: event.route.id, stack });
  return {
    message: `Something went wrong on our side. The log has it under ${errorId}.`,
    code: 'internal',
    errorId
  };
};
