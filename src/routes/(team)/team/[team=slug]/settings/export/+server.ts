import { exportTeam } from '$lib/server/services/transfer/export-team';
import { error } from '@sveltejs/kit';
import { askTeam } from '../../../../../ask';
import type { RequestHandler } from './$types';

/** The team as one zip. By POST, since the events tell of it and no link that is fetched ahead may. */
export const POST: RequestHandler = (event) => {
  const { actor } = askTeam(event, 'manage');
  const made = exportTeam(event.locals.db, actor);
  if (!made.ok) {
    if (made.reason === 'not-allowed')
      error(403, { message: 'Your role in this team does not allow that.', code: 'not-allowed' });
    error(409, {
      message: 'This team has more than 30 000 datasets or reports, which is more than one archive holds.',
      code: 'too-many'
    });
  }
  return new Response(made.stream, {
    headers: {
      'content-type': 'application/zip',
      'content-disposition': `attachment; filename="${made.fileName}"`,
      'cache-control': 'no-store'
    }
  });
};
