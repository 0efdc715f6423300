import { saveRequestSchema } from '$lib/model/team/datasets/save-request';
import { saveDatasets } from '$lib/server/services/datasets/save-datasets';
import { json } from '@sveltejs/kit';
import { askTeamJson } from '../../../../../ask-json';
import { problem } from '../../../../../problem';
import { answering } from '../answers';
import { readJson } from '../read-json';
import { saveRefusal } from '../save-refusal';
import type { RequestHandler } from './$types';

/** Saves datasets of files that were sent to `preview`: SaveRequest gives `{saved: [{id, name}]}`, all or none. */
export const POST: RequestHandler = async (event) => {
  const asked = askTeamJson(event, 'upload');
  if (!asked.ok) return asked.response;
  const read = await readJson(event.request, saveRequestSchema);
  if (!read.ok) return read.response;
  return answering(() => {
    const result = saveDatasets(event.locals.db, asked.actor, read.body);
    return result.ok ? json({ saved: result.saved }, { status: 201 }) : problem(saveRefusal(result));
  });
};
