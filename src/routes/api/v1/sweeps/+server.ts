import { sweepPageSchema, sweepsQuery } from '$lib/model/api/operations/sweeps';
import { isoMoment } from '$lib/model/api/shapes/moment';
import { newSweepSchema } from '$lib/model/api/shapes/sweep';
import { toSweep } from '$lib/model/api/to-sweep';
import { pageOfSweeps } from '$lib/server/services/sweeps/page-of-sweeps';
import { readSweep } from '$lib/server/services/sweeps/read-sweep';
import { saveSweep } from '$lib/server/services/sweeps/save-sweep';
import { askToken } from '../../../ask-token';
import { problem } from '../../../problem';
import { BAD_CURSOR, nextPage, NOT_HERE, readQuery, told } from '../../answers';
import { posted } from '../../posted';
import { jsonOf } from '../../json-of';
import { sweepRefusal } from '../../sweep-refusal';
import type { RequestHandler } from './$types';

/** A page of the team's sweeps. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const read = readQuery(event.url, sweepsQuery);
  if (!read.ok) return read.response;
  const found = pageOfSweeps(event.locals.db, asked.actor, read.query);
  if (!found.ok) return problem(BAD_CURSOR);
  const { entries, next } = found.page;
  const data = entries.map((entry) => ({ ...entry, createdAt: isoMoment(entry.createdAt) }));
  return told(sweepPageSchema, { data, next }, { headers: nextPage(event.url, next) });
};

/** Makes a sweep of saved datasets, and keeps it. */
export const POST: RequestHandler = async (event) => {
  const asked = await askToken(event, 'diagnose');
  if (!asked.ok) return asked.response;
  const { db } = event.locals;
  const { actor } = asked;
  return posted(event, asked, (bytes, type) => {
    const read = jsonOf(bytes, type, newSweepSchema);
    if (!read.ok) return { refused: read.refused };
    const saved = saveSweep(db, actor, read.body);
    if (!saved.ok) return { refused: sweepRefusal(saved) };
    const made = readSweep(db, actor, saved.id);
    if (!made.ok) return { refused: NOT_HERE };
    const body = JSON.stringify(toSweep(made.sweep, made.document?.statement ?? null));
    return { done: { status: 201, location: `/api/v1/sweeps/${saved.id}`, body } };
  });
};
