import { bulkEditSchema, MOST_IN_BULK } from '$lib/model/team/datasets/bulk-edit';
import { CONDITION_NAMES, type ConditionName } from '$lib/model/team/datasets/conditions';
import { readTypedConditions, type ConditionProblems } from '$lib/model/team/datasets/read-typed-conditions';
import { bulkEdit } from '$lib/server/services/datasets/bulk-edit';
import { namesOfDatasets } from '$lib/server/services/datasets/names-of-datasets';
import { error, fail, redirect } from '@sveltejs/kit';
import { askTeam } from '../../../../../ask';
import { acting } from '../answers';
import { backToList } from '../back-to-list';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = (event) => {
  const { team, actor } = askTeam(event, 'edit');
  const ids = [...new Set(event.url.searchParams.getAll('dataset'))];
  const list = event.url.searchParams.get('list');
  if (ids.length === 0 && list !== null) redirect(303, backToList(team.slug, list));
  if (ids.length > MOST_IN_BULK)
    error(400, { message: `Choose at most ${MOST_IN_BULK} datasets at once.`, code: 'too-many' });
  const datasets = namesOfDatasets(event.locals.db, actor, ids);
  if (datasets.length < ids.length)
    error(404, { message: 'At least one of these datasets is not here.', code: 'not-found' });
  return { datasets };
};

export const actions: Actions = {
  default: async (event) => {
    const { team, actor } = askTeam(event, 'edit');
    const data = await event.request.formData();
    const text = (name: string) => String(data.get(name) ?? '');
    const typed = Object.fromEntries(CONDITION_NAMES.map((name) => [name, text(name)]));
    const wanted = data.getAll('change').map(String) as ConditionName[];
    const kept = { typed, wanted };
    const read = readTypedConditions({
      geometry: 'sites',
      unit: 'defect',
      ...onlyOf(typed, wanted),
      name: '-'
    });
    if (!read.ok)
      return fail(400, { ...kept, problems: read.problems, message: 'Some of that does not fit.' });
    const set = onlyOf(read.conditions, wanted);
    const edit = bulkEditSchema.safeParse({ datasets: data.getAll('dataset').map(String), set });
    if (!edit.success) {
      const problems: ConditionProblems = {};
      return fail(400, { ...kept, problems, message: edit.error.issues[0].message });
    }
    return acting({ ...kept, problems: {} as ConditionProblems }, () => {
      const done = bulkEdit(event.locals.db, actor, edit.data);
      if (done.ok) redirect(303, `/team/${team.slug}/datasets?changed=${done.changed}`);
      if (done.reason === 'unknown')
        return fail(404, { ...kept, problems: {}, message: 'At least one of these datasets is not here.' });
      const [{ name, problems }] = done.troubles;
      const message = `Nothing was changed: it does not fit the counts of ${name}${done.troubles.length > 1 ? ` and ${done.troubles.length - 1} more` : ''}.`;
      return fail(422, { ...kept, problems, message });
    });
  }
};

/** The chosen conditions alone; names stay each its own. */
function onlyOf<T extends object>(all: T, wanted: ConditionName[]): Partial<T> {
  const kept = Object.entries(all).filter(
    ([name]) => name !== 'name' && wanted.includes(name as ConditionName)
  );
  return Object.fromEntries(kept) as Partial<T>;
}
