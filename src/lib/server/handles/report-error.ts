import type { HandleServerError } from '@sveltejs/kit';
import { log } from '../log';
import { requestId } from '../running/request-id';
import { seenRequest } from '../running/seen-request';
import { stackOf } from '../running/stack-of';
import { storageTrouble } from '../services/datasets/storage-trouble';

const STORAGE_WORDS = {
  busy: 'Another program holds the database just now. Nothing was saved: try again in a moment.',
  full: 'The disk of the server is full. Nothing was saved: tell whoever runs it, and keep your file.'
};

/** Tells an unforeseen error under the id of its request, which the person can quote and the log can be searched for. */
export const reportError: HandleServerError = ({ error, event, status, message }) => {
  if (status === 404) return { message: 'There is no page at this address.', code: 'not-found' };
  const errorId = seenRequest()?.id ?? requestId(undefined, false);
  const trouble = storageTrouble(error);
  if (trouble !== null) {
    event.locals.storageTrouble = trouble;
    log('error', `database ${trouble}`, { method: event.request.method, route: event.route.id });
    return { message: STORAGE_WORDS[trouble], code: `database-${trouble}`, errorId };
  }
  const { id: route } = event.route;
  log('error', message, { errorId, status, method: event.request.method, route, stack: stackOf(error) });
  return {
    message: `Something went wrong on our side. The log has it under ${errorId}.`,
    code: 'internal',
    errorId
  };
};
