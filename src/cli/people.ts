import { databaseFile, openDatabase } from '$lib/server/db/client';
import { migrateDatabase } from '$lib/server/db/migrate';
import { readEnv } from '$lib/server/env';
import { runPeople } from './people/run';

/** `npm run people`: who may sign in, for whoever runs the server. */
const db = openDatabase(databaseFile(readEnv().SEVERALTY_DATA));
try {
  migrateDatabase(db);
  const { code, text } = await runPeople(db, process.argv.slice(2));
  (code === 0 ? process.stdout : process.stderr).write(`${text}\n`);
  process.exitCode = code;
} finally {
  db.$client.close();
}
