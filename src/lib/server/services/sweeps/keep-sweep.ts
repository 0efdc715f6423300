import { createHash } from 'node:crypto';
import type { SweepRequest } from '../../../model/team/sweeps/sweep-request';
import { sweepName } from '../../../model/team/sweeps/sweep-name';
import { engineVersion } from '../../../stats/engine-version';
import { mixedConditions } from '../../../stats/sweep/mixed-conditions';
import { sweepReport } from '../../../stats/sweep/sweep-report';
import { BadInput } from '../../../stats/types';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { sweep } from '../../db/schema';
import type { Actor } from '../access/actor';
import { scriptOf } from '../access/script-of';
import { recordEvent } from '../events/record-event';
import { chosenDatasets, type ChosenDataset } from './chosen-datasets';
import { inputsOfDatasets } from './inputs-of-datasets';

export type SavedSweep =
  | { ok: true; id: string }
  /** A dataset is not the team's, is put aside, or the actor may not. */
  | { ok: false; reason: 'unknown' }
  /** The datasets make no sweep: why, in words. */
  | { ok: false; reason: 'refused'; why: string };

/** What saveSweep does, inside a transaction of the caller. */
export function keepSweep(
  db: Pick<Database, 'select' | 'insert'>,
  actor: Actor,
  asked: SweepRequest,
  now: number
): SavedSweep {
  const chosen = chosenDatasets(db, actor, asked.datasets);
  if (!chosen) return { ok: false, reason: 'unknown' };
  const made = documentOf(chosen, asked);
  if (!made.ok) return made;
  const { report, options } = made;
  const id = newId();
  const name = asked.name ?? sweepName(report);
  const text = `${JSON.stringify(report, null, 2)}\n`;
  db.insert(sweep)
    .values({
      id,
      teamId: actor.teamId,
      name,
      notes: asked.notes || null,
      document: text,
      sha256: createHash('sha256').update(text).digest('hex'),
      options: JSON.stringify(options),
      engineVersion,
      datasets: JSON.stringify(chosen.map(frozen)),
      createdBy: actor.personId,
      createdAt: now
    })
    .run();
  const happening = { teamId: actor.teamId, personId: actor.personId, thing: id };
  const detail = { name, datasets: chosen.length, ...scriptOf(actor) };
  recordEvent(db, { ...happening, action: 'sweep.make', detail }, now);
  return { ok: true, id };
}

/** What of a dataset is kept with the sweep: all but its counts, which its digest stands for, and what the document says. */
const frozen = ({ counts: _, dispersion: __, ...kept }: ChosenDataset) => kept;

function documentOf(chosen: ChosenDataset[], { axis, window, transition, alpha }: SweepRequest) {
  try {
    const { inputs, timeUnit, unit } = inputsOfDatasets(chosen, axis);
    const options = { axis, timeUnit, unit, window, transition, alpha };
    return { ok: true as const, options, report: sweepReport(inputs, options, mixedConditions(chosen)) };
  } catch (error) {
    if (!(error instanceof BadInput)) throw error;
    return { ok: false as const, reason: 'refused' as const, why: error.reason };
  }
}
