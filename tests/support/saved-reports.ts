import type { Database } from '$lib/server/db/client';
import { newId } from '$lib/server/db/new-id';
import { dataset, originalFile } from '$lib/server/db/schema';
import { saveReport } from '$lib/server/services/reports/save-report';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import type { CountData, DiagnoseOptions, Diagnosis } from '$lib/stats/types';

export const inventedCounts: CountData = {
  kind: 'histogram',
  counts: [
    [0, 30],
    [1, 50],
    [2, 20]
  ],
  lump: null
};

/** A dataset of invented counts, with its file. */
export function makeDataset(
  db: Database,
  teamId: string,
  createdBy: string | null = null,
  more: Partial<typeof dataset.$inferInsert> = {}
): string {
  const [id, fileId] = [newId(), newId()];
  db.insert(originalFile)
    .values({ id: fileId, teamId, name: 'f.csv', sha256: fileId, size: 0, bytes: Buffer.of(), createdAt: 1 })
    .run();
  db.insert(dataset)
    .values({
      id,
      teamId,
      fileId,
      createdBy,
      name: 'Invented chain',
      reading: '{}',
      counts: JSON.stringify(inventedCounts),
      kind: 'histogram',
      digest: 'invented',
      shots: 100,
      mean: 0.9,
      largest: 2,
      geometry: 'sites',
      unit: 'defect',
      createdAt: 1,
      updatedAt: 1,
      ...more
    })
    .run();
  return id;
}

/** The invented counts, diagnosed with few resamples. */
export async function diagnoseInvented(
  more: Partial<DiagnoseOptions> = {},
  data: CountData = inventedCounts
): Promise<{ document: Diagnosis; options: DiagnoseOptions }> {
  const options = { ...defaultOptions, trials: 12, resamples: 19, ...more };
  return { document: await diagnose(data, options), options };
}

/** A report of a dataset as the jobs make one. */
export async function makeReport(
  db: Database,
  place: { teamId: string; datasetId: string; createdBy?: string | null },
  more: Partial<DiagnoseOptions> = {},
  now?: number
): Promise<{ id: string; number: number }> {
  const made = await diagnoseInvented(more);
  return db.transaction((tx) => saveReport(tx, { createdBy: null, ...place, ...made }, now));
}
