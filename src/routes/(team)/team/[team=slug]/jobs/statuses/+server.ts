import { jobStatuses } from '$lib/server/services/jobs/job-statuses';
import { json } from '@sveltejs/kit';
import { askTeamJson } from '../../../../../ask-json';
import type { RequestHandler } from './$types';

/** Datasets asked about at once: as many as a page of the table shows. */
const MOST = 200;

/** `?dataset=ID&dataset=ID…` gives {ID: JobRow}: the latest job of each dataset that has one. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const ids = event.url.searchParams.getAll('dataset').slice(0, MOST);
  const statuses = jobStatuses(event.locals.db, asked.actor, ids);
  return json(statuses, { headers: { 'cache-control': 'no-store' } });
};
