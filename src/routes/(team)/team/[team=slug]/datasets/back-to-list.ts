import { readDatasetQuery, writeDatasetQuery } from '$lib/model/team/datasets/dataset-query';

/** The table as it was, by its `list` field, when a button was pressed with nothing marked; the page says so. */
export function backToList(team: string, list: unknown): string {
  const query = readDatasetQuery(new URLSearchParams(typeof list === 'string' ? list : ''));
  const search = writeDatasetQuery(query);
  return `/team/${team}/datasets?${search ? `${search}&` : ''}unmarked`;
}
