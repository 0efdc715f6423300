import { remarksOf } from '$lib/server/services/remarks/remarks-of';
import { readReport } from '$lib/server/services/reports/read-report';
import { json } from '@sveltejs/kit';
import { z } from 'zod';
import { askTeamJson } from '../../../../../../ask-json';
import { problem } from '../../../../../../problem';
import { takeRemark } from '../../../../../../remark-answers';
import { readJson } from '../../../datasets/read-json';
import type { RequestHandler } from './$types';

/** The threads of a report: ThreadView[] as JSON. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  const { db } = event.locals;
  const reportId = event.params.id;
  if (!readReport(db, asked.actor, reportId).ok)
    return problem({ status: 404, code: 'not-found', title: 'There is nothing at this address.' });
  const threads = remarksOf(db, { reportId, via: 'team', actor: asked.actor });
  return json(threads, { headers: { 'cache-control': 'no-store' } });
};

/** Adds a remark: {section, body} begins a thread, {section, threadId, body} answers in one. */
export const POST: RequestHandler = async (event) => {
  const asked = askTeamJson(event, 'remark');
  if (!asked.ok) return asked.response;
  const sent = await readJson(event.request, z.unknown());
  if (!sent.ok) return sent.response;
  const reportId = event.params.id;
  const address = `${event.url.origin}/team/${asked.team.slug}/reports/${reportId}`;
  const author = { kind: 'member' as const, actor: asked.actor };
  const taken = await takeRemark({ db: event.locals.db, author, reportId, address }, sent.body);
  if (!taken.ok) return problem(taken.problem);
  const { id, threadId, missed } = taken;
  return json({ id, threadId, missed }, { status: 201 });
};
