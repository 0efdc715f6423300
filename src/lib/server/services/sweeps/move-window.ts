import { inUnits } from '$lib/stats/input/in-units';
import { toHistogram } from '$lib/stats/input/to-histogram';
import { refitSweep } from '$lib/stats/sweep/refit-sweep';
import { sweepReport } from '$lib/stats/sweep/sweep-report';
import type { SweepOptions, SweepReport } from '$lib/stats/sweep/types';
import { BadInput, type CountData } from '$lib/stats/types';
import { and, inArray } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

export type MovedWindow =
  | { ok: true; document: SweepReport }
  /** Datasets that are gone for good, or a window that holds too little: why, in words. */
  | { ok: false; why: string };

/**
 * A kept sweep with another window, from the cumulants and covariances that its document keeps. The first documents kept
 * no covariances: for these from the counts of the datasets, which never change, and the times of the document, since
 * those of a dataset may be edited. Nothing is saved.
 */
export function moveWindow(
  db: Pick<Database, 'select'>,
  actor: Actor,
  kept: { document: SweepReport; options: SweepOptions },
  window: { from: number; to: number }
): MovedWindow {
  const { points, unit, mixed } = kept.document;
  const options = { ...kept.options, window };
  if (points.every(({ covariance }) => covariance !== undefined))
    return told(() => refitSweep(points, options, mixed));
  const ids = points.flatMap((point) => point.dataset?.id ?? []);
  const rows = db
    .select({ id: dataset.id, counts: dataset.counts })
    .from(dataset)
    .where(and(inArray(dataset.id, ids), mayWhere(actor, 'see', dataset.teamId)))
    .all();
  const counts = new Map(rows.map((row) => [row.id, row.counts]));
  const gone = points.find((point) => !point.dataset || !counts.has(point.dataset.id));
  if (gone) return { ok: false, why: `The counts of “${gone.label}” are gone: the window cannot be moved.` };
  return told(() =>
    sweepReport(
      points.map(({ label, time, trials, misread, dataset: from }) => {
        const data = JSON.parse(counts.get(from!.id)!) as CountData;
        const { histogram } = inUnits(toHistogram(data), null, unit);
        return { label, time, counts: histogram.counts, trials, misread, dataset: from };
      }),
      options,
      mixed
    )
  );
}

function told(make: () => SweepReport): MovedWindow {
  try {
    return { ok: true, document: make() };
  } catch (error) {
    if (!(error instanceof BadInput)) throw error;
    return { ok: false, why: error.reason };
  }
}
