import type { Handle } from '@sveltejs/kit';
import { database } from '../application';

/** Routes may not import the database; they find it here and hand it to a service. */
export const withDatabase: Handle = ({ event, resolve }) => {
  event.locals.db = database();
  return resolve(event);
};
