import { sweepSchema } from '$lib/model/api/shapes/sweep';
import { toSweep } from '$lib/model/api/to-sweep';
import { readSweep } from '$lib/server/services/sweeps/read-sweep';
import { askToken } from '../../../../ask-token';
import { problem } from '../../../../problem';
import { NOT_HERE, told } from '../../../answers';
import type { RequestHandler } from './$types';

/** A sweep: its answer, its datasets as they were, and how they were looked at; one that was put aside is not there. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const read = readSweep(event.locals.db, asked.actor, event.params.id);
  if (!read.ok) return problem(NOT_HERE);
  return told(sweepSchema, toSweep(read.sweep, read.document?.statement ?? null));
};
