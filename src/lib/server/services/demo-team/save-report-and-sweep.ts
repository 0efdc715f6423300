import { and, asc, eq, isNotNull, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, person, sweep, team } from '../../db/schema';
import type { Actor } from '../access/actor';
import { lastVerdict } from '../datasets/report-columns';
import { saveReport, type NewReport } from '../reports/save-report';
import { keepSweep } from '../sweeps/keep-sweep';
import { DEMO_PEOPLE, DEMO_TEAM } from './demo-people';

type Some = Pick<Database, 'select' | 'insert'>;
const MAKER = DEMO_PEOPLE.find(({ role }) => role === 'experimenter')!;

/**
 * saveReport; and when the last of the invented team's ramps has its first answer, their sweep is made, which is to show
 * answers along its axis. Of what no invented person asked for it costs one look at who asked.
 */
export function saveReportAndSweep(
  db: Some,
  made: NewReport,
  now = Date.now()
): { id: string; number: number } {
  const report = saveReport(db, made, now);
  if (report.number === 1 && made.createdBy !== null)
    sweepOfRamps(db, { ...made, createdBy: made.createdBy }, now);
  return report;
}

function sweepOfRamps(
  db: Some,
  { teamId, datasetId, createdBy }: NewReport & { createdBy: string },
  now: number
): void {
  const invented = db
    .select({ id: person.id })
    .from(person)
    .innerJoin(team, and(eq(team.id, teamId), eq(team.slug, DEMO_TEAM.slug)))
    .where(and(eq(person.id, createdBy), eq(person.email, MAKER.email)))
    .get();
  if (!invented || db.select({ id: sweep.id }).from(sweep).where(eq(sweep.teamId, teamId)).limit(1).get())
    return;
  const file = db.select({ id: dataset.fileId }).from(dataset).where(eq(dataset.id, datasetId)).get();
  if (!file?.id) return;
  const ramps = db
    .select({ id: dataset.id, verdict: lastVerdict })
    .from(dataset)
    // Alone in a query, its id would be written without its table, and mean that of the report in `lastVerdict`.
    .innerJoin(team, eq(team.id, dataset.teamId))
    .where(
      and(
        eq(dataset.teamId, teamId),
        eq(dataset.fileId, file.id),
        isNotNull(dataset.quenchTime),
        isNull(dataset.deletedAt)
      )
    )
    .orderBy(asc(dataset.quenchTime))
    .all();
  if (ramps.length < 2 || ramps.some(({ verdict }) => verdict === null)) return;
  const actor: Actor = { personId: createdBy, teamId, role: MAKER.role };
  keepSweep(
    db,
    actor,
    {
      name: 'Kelp, invented: six quench times',
      datasets: ramps.map(({ id }) => id),
      axis: 'quench-time',
      window: null,
      transition: { dimension: 1, correlation: 1, dynamic: 1 },
      alpha: 0.05
    },
    now
  );
}
