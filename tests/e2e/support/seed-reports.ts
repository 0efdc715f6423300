import type { DiagnoseOptions } from '$lib/stats/types';
import { makeDataset, makeReport } from '../../support/saved-reports';
import { withDatabaseOf } from './seed-people';
import type { RunningServer } from './start-server';

/** A dataset of invented counts with one report for each set of options, as jobs would have made them. */
export function seedReports(
  server: Pick<RunningServer, 'data'>,
  place: { teamId: string; createdBy: string | null; name: string; device?: string },
  asked: Partial<DiagnoseOptions>[]
): Promise<{ datasetId: string; reports: string[] }> {
  const { teamId, createdBy, name, device } = place;
  return withDatabaseOf(server, async (db) => {
    const datasetId = makeDataset(db, teamId, createdBy, { name, device: device ?? null });
    const reports: string[] = [];
    for (const options of asked)
      reports.push((await makeReport(db, { teamId, datasetId, createdBy }, options)).id);
    return { datasetId, reports };
  });
}
