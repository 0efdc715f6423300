import { readWindow } from '$lib/model/team/sweeps/read-window';
import { can } from '$lib/server/access/can';
import { moveWindow } from '$lib/server/services/sweeps/move-window';
import { placesOfSwept } from '$lib/server/services/sweeps/places-of-swept';
import { putSweepAside } from '$lib/server/services/sweeps/put-sweep-aside';
import { readSweep } from '$lib/server/services/sweeps/read-sweep';
import { saveSweep } from '$lib/server/services/sweeps/save-sweep';
import { error, fail, redirect } from '@sveltejs/kit';
import { askTeam } from '../../../../../ask';
import { acting } from '../../datasets/answers';
import type { Actions, PageServerLoad } from './$types';

const gone = (): never => error(404, { message: 'There is no page at this address.', code: 'not-found' });

const NO_WINDOW = 'The window goes from a time above 0 to a later one.';

/** The sweep as it was saved; with `?from=…&to=…` the same with another window, which is not saved. */
export const load: PageServerLoad = (event) => {
  const { actor } = askTeam(event, 'see');
  const read = readSweep(event.locals.db, actor, event.params.id);
  if (!read.ok) return gone();
  const { text, ...sweep } = read.sweep;
  const { document } = read;
  const { searchParams } = event.url;
  const window = readWindow(searchParams);
  const asked = ['from', 'to'].some((name) => searchParams.has(name));
  const moved =
    document && window
      ? moveWindow(event.locals.db, actor, { document, options: sweep.options }, window)
      : null;
  return {
    sweep: { ...sweep, bytes: Buffer.byteLength(text) },
    document: moved?.ok ? moved.document : document,
    places: placesOfSwept(event.locals.db, actor, sweep.datasets),
    moved: moved?.ok === true,
    trouble: asked && !window ? NO_WINDOW : moved && !moved.ok ? moved.why : null,
    may: {
      aside: can({ kind: 'member', ...actor }, 'delete', { createdBy: sweep.createdBy }),
      link: can({ kind: 'member', ...actor }, 'link', { createdBy: sweep.createdBy }),
      make: can({ kind: 'member', ...actor }, 'diagnose')
    }
  };
};

export const actions: Actions = {
  aside: async (event) => {
    const { actor, team } = askTeam(event, 'see');
    // Whose it is decides: the service asks it of the row itself.
    if (!putSweepAside(event.locals.db, actor, event.params.id).ok) return gone();
    redirect(303, `/team/${team.slug}/sweeps?aside=${event.params.id}`);
  },

  /** A moved window as a sweep of its own. */
  save: async (event) => {
    const { actor, team } = askTeam(event, 'see');
    const read = readSweep(event.locals.db, actor, event.params.id);
    if (!read.ok) return gone();
    askTeam(event, 'diagnose');
    const form = await event.request.formData();
    const asked = new URLSearchParams({ from: String(form.get('from')), to: String(form.get('to')) });
    const window = readWindow(asked);
    if (!window) return fail(400, { message: NO_WINDOW });
    const { options, name, datasets } = read.sweep;
    const places = placesOfSwept(event.locals.db, actor, datasets);
    const ids = datasets.map(({ id }) => places[id] ?? id);
    return acting({}, () => {
      const request = { name, datasets: ids, axis: options.axis, window };
      const { transition, alpha } = options;
      const made = saveSweep(event.locals.db, actor, { ...request, transition, alpha });
      if (made.ok) redirect(303, `/team/${team.slug}/sweeps/${made.id}`);
      if (made.reason === 'refused') return fail(422, { message: made.why });
      return fail(404, { message: 'At least one of its datasets is not here any more.' });
    });
  }
};
