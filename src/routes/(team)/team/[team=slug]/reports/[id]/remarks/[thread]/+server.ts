import { json } from '@sveltejs/kit';
import { z } from 'zod';
import { askTeamJson } from '../../../../../../../ask-json';
import { problem } from '../../../../../../../problem';
import { takeSettling } from '../../../../../../../remark-answers';
import { readJson } from '../../../../datasets/read-json';
import type { RequestHandler } from './$types';

/** Settles a thread or opens it again: {settled: true} or {settled: false}. */
export const PATCH: RequestHandler = async (event) => {
  const asked = askTeamJson(event, 'remark');
  if (!asked.ok) return asked.response;
  const sent = await readJson(event.request, z.unknown());
  if (!sent.ok) return sent.response;
  const author = { kind: 'member' as const, actor: asked.actor };
  const place = { db: event.locals.db, author, reportId: event.params.id };
  const taken = takeSettling(place, event.params.thread, sent.body);
  return taken.ok ? json({ changed: taken.changed }) : problem(taken.problem);
};
