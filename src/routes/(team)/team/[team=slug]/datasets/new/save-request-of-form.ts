import { CONDITION_NAMES } from '$lib/model/team/datasets/conditions';
import type { Preview } from '$lib/model/team/datasets/preview';
import { readTypedConditions, type ConditionProblems } from '$lib/model/team/datasets/read-typed-conditions';
import type { SaveRequest } from '$lib/model/team/datasets/save-request';
import type { TypedConditions } from '$lib/model/team/datasets/typed-conditions';

interface Draft {
  index: number;
  keep: boolean;
  typed: TypedConditions;
  problems: ConditionProblems;
}

/**
 * What a form without JavaScript wants saved, and all that was typed in it, to be shown again.
 *
 * @returns `wrong` when a field of a marked dataset does not fit; it is told in `drafts`
 */
export function saveRequestOfForm(
  data: FormData,
  previews: Preview[]
): { request: SaveRequest; drafts: Draft[][]; wrong: boolean } {
  const text = (name: string): string => String(data.get(name) ?? '');
  const request: SaveRequest = { files: [] };
  let wrong = false;
  const drafts = previews.map((preview) => {
    const { id: fileId } = preview.file;
    const datasets: SaveRequest['files'][number]['datasets'] = [];
    const list = preview.datasets.map(({ index }): Draft => {
      const prefix = `${fileId}.${index}.`;
      const typed = Object.fromEntries(
        CONDITION_NAMES.map((name) => [name, text(prefix + name)])
      ) as TypedConditions;
      const keep = text(`${prefix}keep`) === 'yes';
      if (!keep) return { index, keep, typed, problems: {} };
      const read = readTypedConditions(typed);
      if (read.ok) datasets.push({ index, conditions: read.conditions });
      else wrong = true;
      return { index, keep, typed, problems: read.ok ? {} : read.problems };
    });
    const again = text(`${fileId}.again`) === 'yes';
    if (datasets.length > 0) request.files.push({ fileId, choices: preview.choices, again, datasets });
    return list;
  });
  return { request, drafts, wrong };
}
