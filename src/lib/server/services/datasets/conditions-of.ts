import { CONDITION_NAMES, type Conditions } from '../../../model/team/datasets/conditions';

/** The conditions among the columns of a dataset. */
export function conditionsOf(row: Conditions): Conditions {
  return Object.fromEntries(CONDITION_NAMES.map((name) => [name, row[name]])) as unknown as Conditions;
}
