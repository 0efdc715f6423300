import { askTeam } from '../../../ask';
import type { LayoutServerLoad } from './$types';

/** Team, role and person for every page below; each page asks for itself what its own action needs. */
export const load: LayoutServerLoad = (event) => {
  const { team, actor } = askTeam(event, 'see');
  return { team, role: actor.role };
};
