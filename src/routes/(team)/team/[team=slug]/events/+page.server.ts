import { actionLabel } from '$lib/model/team/event-words';
import { eventFilters } from '$lib/server/services/events/event-filters';
import { listEvents } from '$lib/server/services/events/list-events';
import { askTeam } from '../../../../ask';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = (event) => {
  const { actor } = askTeam(event, 'manage');
  const { db } = event.locals;
  const asked = event.url.searchParams;
  const action = asked.get('action') ?? '';
  const personId = asked.get('person') ?? '';
  // An old bookmark with a number that is none starts at the newest.
  const before = Number(asked.get('before')) || undefined;
  const { actions, people } = eventFilters(db, actor);
  const filter = { action: action || undefined, personId: personId || undefined, before };
  return {
    ...listEvents(db, actor, filter),
    action,
    personId,
    later: before !== undefined,
    people,
    actions: actions.map((name) => ({ name, label: actionLabel(name) }))
  };
};
