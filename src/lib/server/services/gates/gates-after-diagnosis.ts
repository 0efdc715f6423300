import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, device } from '../../db/schema';
import { versionsOf } from '../devices/versions-of';
import { decideGate } from './decide-gate';
import { ruleOf } from './rule-of';

/** Diagnoses of one upload end close together: one decision for all of them. */
const WAIT = 1000;

/**
 * Decides the gates that a new report touches, a moment later and one version at a time, so that neither the job's end
 * nor a request waits for it: those of the dataset's version, and of every version where it is of the reference. What a
 * server that ends meanwhile leaves undone is decided when somebody next asks for the gate.
 *
 * @returns what to call with the dataset of each new report
 */
export function gatesAfterDiagnosis(db: Database, wait = WAIT): (datasetId: string) => void {
  const fresh = new Set<string>();
  let timer: NodeJS.Timeout | undefined;
  const decide = () => {
    timer = undefined;
    const touched = new Map<string, () => void>();
    for (const datasetId of fresh) for (const [key, work] of gatesOf(db, datasetId)) touched.set(key, work);
    fresh.clear();
    const next = () => {
      const first = touched.entries().next();
      if (first.done || !db.$client.open) return;
      touched.delete(first.value[0]);
      first.value[1]();
      setImmediate(next);
    };
    next();
  };
  return (datasetId) => {
    fresh.add(datasetId);
    timer ??= setTimeout(() => db.$client.open && decide(), wait).unref();
  };
}

function gatesOf(db: Database, datasetId: string): [string, () => void][] {
  const found = db
    .select({ firmware: dataset.firmware, device })
    .from(dataset)
    .innerJoin(device, and(eq(device.teamId, dataset.teamId), eq(device.name, dataset.device)))
    .where(eq(dataset.id, datasetId))
    .get();
  const rule = found && ruleOf(db, found.device.id);
  if (!rule) return [];
  const all = rule.referenceId !== null && rule.referenceName === found.firmware;
  return versionsOf(db, found.device)
    .filter(({ name, datasets }) => datasets > 0 && (all || name === found.firmware))
    .map((version) => [version.id, () => void decideGate(db, found.device, version)]);
}
