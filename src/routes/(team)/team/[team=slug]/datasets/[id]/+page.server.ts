import type { StaleEdit } from '$lib/model/team/datasets/stale-edit';
import { typedConditions, typedConditionsSchema } from '$lib/model/team/datasets/typed-conditions';
import { readTypedConditions } from '$lib/model/team/datasets/read-typed-conditions';
import { datasetById } from '$lib/server/services/datasets/dataset-by-id';
import { editConditions } from '$lib/server/services/datasets/edit-conditions';
import { putAside } from '$lib/server/services/datasets/put-aside';
import { can } from '$lib/server/access/can';
import { error, fail, redirect } from '@sveltejs/kit';
import { setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { askTeam } from '../../../../../ask';
import { acting } from '../answers';
import { mergeStale } from './merge-stale';
import type { Actions, PageServerLoad } from './$types';

const NOT_HERE = { message: 'There is no page at this address.', code: 'not-found' };

export const load: PageServerLoad = async (event) => {
  const { actor } = askTeam(event, 'see');
  const found = datasetById(event.locals.db, actor, event.params.id);
  if (!found.ok) error(404, NOT_HERE);
  const { dataset } = found;
  const standing = { kind: 'member' as const, personId: actor.personId, role: actor.role };
  const form = await superValidate(typedConditions(dataset.conditions), zod4(typedConditionsSchema), {
    errors: false
  });
  return {
    dataset,
    form,
    may: {
      edit: dataset.deletedAt === null && can(standing, 'edit'),
      diagnose: dataset.deletedAt === null && can(standing, 'diagnose'),
      aside: dataset.deletedAt === null && can(standing, 'delete', { createdBy: dataset.createdBy }),
      restore: dataset.deletedAt !== null && can(standing, 'restore', { createdBy: dataset.createdBy })
    }
  };
};

export const actions: Actions = {
  /** Saves the conditions, unless somebody else has saved others since the form was opened. */
  edit: async (event) => {
    const { team, actor } = askTeam(event, 'edit');
    const data = await event.request.formData();
    const form = await superValidate(data, zod4(typedConditionsSchema));
    const read = readTypedConditions(form.data);
    if (!form.valid || !read.ok) return fail(400, { form });
    const version = Number(data.get('version'));
    return acting({ form }, () => {
      const { db } = event.locals;
      const done = editConditions(db, actor, event.params.id, { version, conditions: read.conditions });
      if (done.ok) redirect(303, `/team/${team.slug}/datasets/${event.params.id}?saved=${done.version}`);
      if (done.reason === 'unknown') error(404, NOT_HERE);
      if (done.reason === 'stale') {
        const merged = mergeStale(form.data, String(data.get('before') ?? ''), done.current);
        form.data = merged.typed;
        const { version, by, at } = done;
        const before = typedConditions(done.current);
        const stale: StaleEdit = { version, before, by, at, others: merged.others };
        return fail(409, { form, stale });
      }
      for (const [name, problem] of Object.entries(done.problems))
        setError(form, name as keyof typeof form.data, problem);
      return fail(422, { form });
    });
  },

  /** Puts the dataset aside; whose it is the service asks of the row. */
  aside: async (event) => {
    const { team, actor } = askTeam(event, 'see');
    const typed = String((await event.request.formData()).get('confirm') ?? '').trim();
    const { db } = event.locals;
    const found = datasetById(db, actor, event.params.id);
    if (!found.ok) error(404, NOT_HERE);
    const { createdBy, conditions } = found.dataset;
    // Asked again with whose it is: an observer, or an experimenter with another's, is refused in words.
    askTeam(event, 'delete', { createdBy });
    if (typed !== conditions.name)
      return fail(400, {
        aside: `Type the name of the dataset, “${conditions.name}”, to put it aside.`,
        typed
      });
    return acting({}, () => {
      const done = putAside(db, actor, event.params.id);
      if (!done.ok) error(404, NOT_HERE);
      redirect(303, `/team/${team.slug}/datasets?aside=${event.params.id}`);
    });
  }
};
