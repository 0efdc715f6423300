import type { HandleServerError } from '@sveltejs/kit';
import { randomUUID } from 'node:crypto';
import { log } from '../log';

/** Gives an unforeseen error a number that the person can quote and the log can be searched for. */
export const reportError: HandleServerError = ({ error, event, status, message }) => {
  if (status === 404) return { message: 'There is no page at this address.', code: 'not-found' };
  const errorId = randomUUID().slice(0, 8);
  const stack = error instanceof Error ? error.stack : String(error);
  log('error', message, { errorId, status, method: event.request.method, route: event.route.id, stack });
  return {
    message: `Something went wrong on our side. The log has it under ${errorId}.`,
    code: 'internal',
    errorId
  };
};
