import type { SweepOptions, SweepReport } from '$lib/stats/sweep/types';
import { and, eq, isNull } from 'drizzle-orm';
import { createHash } from 'node:crypto';
import type { Database } from '../../db/client';
import { person, sweep } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

/** A dataset as it was when the sweep was made. */
export interface FrozenSwept {
  id: string;
  name: string;
  digest: string;
  device: string | null;
  firmware: string | null;
  group: string | null;
}

export interface SavedSweepRow {
  id: string;
  name: string;
  notes: string | null;
  /** The document, byte for byte. */
  text: string;
  sha256: string;
  options: SweepOptions;
  engineVersion: string;
  datasets: FrozenSwept[];
  createdBy: string | null;
  by: string | null;
  createdAt: number;
}

export type ReadSweep =
  /** `document` is null when the bytes no longer have their sha256; they come in any case. */
  | { ok: true; sweep: SavedSweepRow; document: SweepReport | null }
  /** No such sweep, or none of this team, or put aside. */
  | { ok: false; reason: 'unknown' };

/** One sweep of the actor's team. */
export function readSweep(db: Pick<Database, 'select'>, actor: Actor, id: string): ReadSweep {
  const row = db
    .select({
      id: sweep.id,
      name: sweep.name,
      notes: sweep.notes,
      text: sweep.document,
      sha256: sweep.sha256,
      options: sweep.options,
      engineVersion: sweep.engineVersion,
      datasets: sweep.datasets,
      createdBy: sweep.createdBy,
      by: person.name,
      createdAt: sweep.createdAt
    })
    .from(sweep)
    .leftJoin(person, eq(person.id, sweep.createdBy))
    .where(and(eq(sweep.id, id), mayWhere(actor, 'see', sweep.teamId), isNull(sweep.deletedAt)))
    .get();
  if (!row) return { ok: false, reason: 'unknown' };
  // The database refuses to change a document, but a damaged disk or a hand-made restore does not ask it.
  const whole = createHash('sha256').update(row.text).digest('hex') === row.sha256;
  return {
    ok: true,
    sweep: {
      ...row,
      options: JSON.parse(row.options) as SweepOptions,
      datasets: JSON.parse(row.datasets) as FrozenSwept[]
    },
    document: whole ? (JSON.parse(row.text) as SweepReport) : null
  };
}
