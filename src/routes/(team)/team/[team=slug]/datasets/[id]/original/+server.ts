import { originalOfDataset } from '$lib/server/services/datasets/original-of-dataset';
import { askTeamJson } from '../../../../../../ask-json';
import { problem } from '../../../../../../problem';
import { attachment } from '../../attachment';
import type { RequestHandler } from './$types';

/** The file that a dataset came from, byte for byte. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const found = originalOfDataset(event.locals.db, asked.actor, event.params.id);
  if (!found.ok)
    return problem({ status: 404, code: 'not-found', title: 'There is nothing at this address.' });
  // Never as what it claims to be: a file that holds a web page must not become one of ours.
  return attachment(new Uint8Array(found.bytes), found.name, 'application/octet-stream');
};
