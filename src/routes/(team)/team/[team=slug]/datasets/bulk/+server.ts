import { bulkEditSchema } from '$lib/model/team/datasets/bulk-edit';
import { bulkEdit } from '$lib/server/services/datasets/bulk-edit';
import { json } from '@sveltejs/kit';
import { askTeamJson } from '../../../../../ask-json';
import { problem } from '../../../../../problem';
import { answering } from '../answers';
import { readJson } from '../read-json';
import type { RequestHandler } from './$types';

/** Sets conditions alike on many datasets: BulkEdit gives `{changed}`, all or none. */
export const POST: RequestHandler = async (event) => {
  const asked = askTeamJson(event, 'edit');
  if (!asked.ok) return asked.response;
  const read = await readJson(event.request, bulkEditSchema);
  if (!read.ok) return read.response;
  return answering(() => {
    const result = bulkEdit(event.locals.db, asked.actor, read.body);
    if (result.ok) return json({ changed: result.changed });
    if (result.reason === 'unknown')
      return problem({
        status: 404,
        code: 'unknown',
        title: 'At least one of these datasets is not here. Nothing was changed.'
      });
    return problem({
      status: 422,
      code: result.reason,
      title: 'That does not fit the counts of some of them. Nothing was changed.',
      troubles: result.troubles
    });
  });
};
