import { csvOfDataset } from '$lib/server/services/datasets/csv-of-dataset';
import { askTeamJson } from '../../../../../../ask-json';
import { problem } from '../../../../../../problem';
import { attachment } from '../../attachment';
import type { RequestHandler } from './$types';

/** The counts of a dataset as CSV. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const found = csvOfDataset(event.locals.db, asked.actor, event.params.id);
  if (!found.ok)
    return problem({ status: 404, code: 'not-found', title: 'There is nothing at this address.' });
  return attachment(found.text, found.name, 'text/csv; charset=utf-8');
};
