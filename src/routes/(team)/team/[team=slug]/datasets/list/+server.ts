import { readDatasetQuery } from '$lib/model/team/datasets/dataset-query';
import { listDatasets } from '$lib/server/services/datasets/list-datasets';
import { json } from '@sveltejs/kit';
import { askTeamJson } from '../../../../../ask-json';
import type { RequestHandler } from './$types';

/** One page of the table: the query of the page's own address gives DatasetList as JSON. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const list = listDatasets(event.locals.db, asked.actor, readDatasetQuery(event.url.searchParams));
  return json(list, { headers: { 'cache-control': 'no-store' } });
};
