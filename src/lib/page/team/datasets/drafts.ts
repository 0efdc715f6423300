import type { Preview } from '$lib/model/team/datasets/preview';
import type { ConditionProblems } from '$lib/model/team/datasets/read-typed-conditions';
import { typedConditions, type TypedConditions } from '$lib/model/team/datasets/typed-conditions';

/** A dataset that may be saved, with its conditions as they are typed. */
export interface Draft {
  index: number;
  keep: boolean;
  typed: TypedConditions;
  problems: ConditionProblems;
}

/**
 * Drafts of the datasets of a file. Those that are saved already are not marked. When the file was read again in
 * another way and gave as many datasets, what was typed stays.
 */
export function draftsOf(preview: Preview, before: Draft[] = []): Draft[] {
  if (before.length > 0 && before.length === preview.datasets.length) return before;
  return preview.datasets.map(({ index, conditions, already }) => ({
    index,
    keep: already.length === 0,
    typed: typedConditions(conditions),
    problems: {}
  }));
}
