import { databaseFile, openDatabase, type Database } from './db/client';
import { migrateDatabase } from './db/migrate';
import { readEnv } from './env';
import { startRunner, stopRunner } from './jobs/runner';
import { purgeAside } from './services/aside/purge';
import { saveReportAndSweep } from './services/demo-team/save-report-and-sweep';
import { nameKnownDevices } from './services/devices/name-known-devices';
import { gatesAfterDiagnosis } from './services/gates/gates-after-diagnosis';
import { seedSamples } from './services/seed-samples';
import { startWatches } from './services/watches/start-watches';
import { startDeliveries } from './services/webhooks/start-deliveries';
import { webhookSettings } from './services/webhooks/webhook-settings';

let open: Database | null = null;

/**
 * The database of this process: opened, migrated and given its samples at the first call, closed when the
 * server shuts down. With it start the threads that run diagnoses. Called by `init` in hooks.server.ts, so trouble shows at start and not at a request.
 */
export function database(): Database {
  if (open) return open;
  const db = openDatabase(databaseFile(readEnv().SEVERALTY_DATA));
  migrateDatabase(db);
  seedSamples(db);
  nameKnownDevices(db);
  purgeAside(db);
  // A server runs for months; unref, so that it is not what keeps the process alive.
  const daily = setInterval(() => purgeAside(db), 24 * 60 * 60 * 1000).unref();
  const decideGates = gatesAfterDiagnosis(db);
  startRunner(db, (tx, report, now) => {
    const saved = saveReportAndSweep(tx, report, now);
    decideGates(report.datasetId);
    return saved;
  });
  const env = readEnv();
  const hooks = webhookSettings();
  // start.ts writes the address down before this is loaded; without it this is the server of `npm run dev`.
  const origin = env.ORIGIN ?? 'http://localhost:5173';
  const stopDeliveries = startDeliveries(db, hooks, origin);
  const stopWatches = startWatches(db, { origin, serverSecret: hooks.serverSecret, hour: env.DIGEST_HOUR });
  process.once('sveltekit:shutdown', () => {
    clearInterval(daily);
    stopDeliveries();
    stopWatches();
    void stopRunner();
    db.$client.close();
    open = null;
  });
  open = db;
  return db;
}
