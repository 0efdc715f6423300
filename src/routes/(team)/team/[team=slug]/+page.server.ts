import { teamHome } from '$lib/server/services/teams/team-home';
import { askTeam } from '../../../ask';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = (event) => {
  const { actor } = askTeam(event, 'see');
  return { home: teamHome(event.locals.db, actor) };
};
